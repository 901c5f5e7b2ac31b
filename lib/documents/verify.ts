import { createHash, createVerify } from 'node:crypto'
import forge from 'node-forge'

/** What the last signature of a PDF says. Reads the form our own seal writes; another form is `found: false`. */
export interface SealCheck {
  found: boolean
  /** The signature covers every byte but itself: nothing was appended. */
  coversAll: boolean
  digestMatches: boolean
  signatureMatches: boolean
  signerName: string
  /** Lower-case hexadecimal. */
  serial: string
  signedAtMs: number | null
}

const NOTHING: SealCheck = {
  found: false,
  coversAll: false,
  digestMatches: false,
  signatureMatches: false,
  signerName: '',
  serial: '',
  signedAtMs: null,
}

/**
 * Checks the last detached signature of a PDF by its bytes: range, digest, and the key in the certificate it carries.
 * Says nothing of trust: whether that certificate is ours is the caller's comparison (or a reader's).
 */
export function checkSeal(pdf: Uint8Array): SealCheck {
  const bytes = Buffer.from(pdf)
  const range = lastByteRange(bytes)
  if (!range) return NOTHING
  const [start, length, resume, rest] = range
  const gap = bytes.subarray(start + length, resume).toString('latin1')
  const hex = /^<([0-9A-Fa-f]+)>$/.exec(gap)?.[1]
  if (start !== 0 || hex === undefined || resume + rest > bytes.length) return NOTHING
  const covered = Buffer.concat([bytes.subarray(0, length), bytes.subarray(resume, resume + rest)])
  try {
    return {
      ...readCms(Buffer.from(hex, 'hex'), covered),
      found: true,
      coversAll: resume + rest === bytes.length,
    }
  } catch {
    return NOTHING
  }
}

/** The document code a PDF of ours carries in its information dictionary; null where there is none. */
export function readDocumentCode(pdf: Uint8Array): string | null {
  const found = /Document code ([A-HJ-NP-Z2-9]{4})-([A-HJ-NP-Z2-9]{4})/.exec(
    Buffer.from(pdf).toString('latin1'),
  )
  return found?.[1] !== undefined && found[2] !== undefined ? found[1] + found[2] : null
}

function lastByteRange(bytes: Buffer): [number, number, number, number] | null {
  const at = bytes.lastIndexOf('/ByteRange')
  if (at < 0) return null
  const found = /^\/ByteRange\s*\[\s*(\d+)\s+(\d+)\s+(\d+)\s+(\d+)\s*\]/.exec(
    bytes.subarray(at, at + 200).toString('latin1'),
  )
  if (!found) return null
  const [start, length, resume, rest] = found.slice(1).map(Number)
  if (start === undefined || length === undefined || resume === undefined || rest === undefined) return null
  return [start, length, resume, rest]
}

/** The pieces forge keeps of a SignedData it has read (RFC 5652, 5.3). */
interface RawSignedData {
  digestAlgorithm: string
  authenticatedAttributes: forge.asn1.Asn1[]
  signature: string
}

function readCms(der: Buffer, covered: Buffer): Omit<SealCheck, 'found' | 'coversAll'> {
  // The placeholder is longer than the signature: zeros follow the DER.
  const asn1 = forge.asn1.fromDer(forge.util.createBuffer(der.toString('binary')), {
    parseAllBytes: false,
  } as never)
  const message = forge.pkcs7.messageFromAsn1(asn1) as forge.pkcs7.PkcsSignedData & {
    rawCapture: RawSignedData
  }
  const { authenticatedAttributes, signature, digestAlgorithm } = message.rawCapture
  if (forge.asn1.derToOid(digestAlgorithm) !== forge.pki.oids.sha256) throw new Error('Not SHA-256')

  // What was signed is the attributes as a SET, whatever tag they carry in the message (RFC 5652, 5.4).
  const { UNIVERSAL } = forge.asn1.Class
  const attributes = forge.asn1.create(UNIVERSAL, forge.asn1.Type.SET, true, authenticatedAttributes)
  const signed = Buffer.from(forge.asn1.toDer(attributes).getBytes(), 'binary')
  const signatureBytes = Buffer.from(signature, 'binary')
  const holder = message.certificates.find((certificate) =>
    createVerify('sha256')
      .update(signed)
      .verify(forge.pki.publicKeyToPem(certificate.publicKey), signatureBytes),
  )
  const digest = attributeValue(authenticatedAttributes, forge.pki.oids.messageDigest)
  const time = attributeValue(authenticatedAttributes, forge.pki.oids.signingTime)
  const name: unknown = holder?.subject.getField('CN')?.value
  return {
    digestMatches: digest === createHash('sha256').update(covered).digest('binary'),
    signatureMatches: holder !== undefined,
    signerName: typeof name === 'string' ? name : '',
    serial: holder?.serialNumber ?? '',
    signedAtMs: time === null ? null : forge.asn1.utcTimeToDate(time).getTime(),
  }
}

function attributeValue(attributes: forge.asn1.Asn1[], oid: string | undefined): string | null {
  for (const attribute of attributes) {
    const [type, values] = attribute.value as forge.asn1.Asn1[]
    if (!type || !values || typeof type.value !== 'string' || forge.asn1.derToOid(type.value) !== oid)
      continue
    const value = (values.value as forge.asn1.Asn1[])[0]?.value
    return typeof value === 'string' ? value : null
  }
  return null
}
