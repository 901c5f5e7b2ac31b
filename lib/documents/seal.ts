import { plainAddPlaceholder } from '@signpdf/placeholder-plain'
import { SignPdf } from '@signpdf/signpdf'
import { Signer as PdfSigner, SUBFILTER_ADOBE_PKCS7_DETACHED } from '@signpdf/utils'

/** Whoever holds a key: gives back a detached CMS signature (DER) over the bytes. lib/signing.ts makes the one we use. */
export interface Signer {
  /** The certificate's common name, shown by a reader beside the signature. */
  name: string
  sign(bytes: Uint8Array, at: Date): Promise<Buffer>
}

export interface SealReason {
  reason: string
  contact: string
  location: string
  at: Date
}

/** Room for the CMS in bytes: RSA 3072 with a chain of two needs about 3,000. */
const SIGNATURE_ROOM = 12_288

/**
 * The PDF with a detached CMS signature (ISO 32000-1, 12.8; adbe.pkcs7.detached) over every byte of it. The placeholder is
 * appended, so that a file signed before keeps its earlier signatures valid.
 */
export async function seal(
  bytes: Uint8Array,
  signer: Signer,
  { reason, contact, location, at }: SealReason,
): Promise<Buffer> {
  const prepared = plainAddPlaceholder({
    pdfBuffer: Buffer.from(bytes),
    reason: pdfSafe(reason),
    contactInfo: pdfSafe(contact),
    location: pdfSafe(location),
    name: pdfSafe(signer.name),
    signingTime: at,
    signatureLength: SIGNATURE_ROOM,
    subFilter: SUBFILTER_ADOBE_PKCS7_DETACHED,
    widgetRect: [0, 0, 0, 0],
  })
  return new SignPdf().sign(prepared, new CmsSigner(signer), at)
}

class CmsSigner extends PdfSigner {
  constructor(private readonly holder: Signer) {
    super()
  }

  override async sign(pdfBuffer: Buffer, signingTime?: Date): Promise<Buffer> {
    return this.holder.sign(pdfBuffer, signingTime ?? new Date(0))
  }
}

/** The placeholder writes literal strings without escaping: keep to plain letters, the certificate holds the full name. */
function pdfSafe(text: string): string {
  return text
    .normalize('NFKD')
    .replace(/[\u0300-\u036f]/g, '')
    .replace(/[^\x20-\x7e]|[()\\]/g, '')
}
