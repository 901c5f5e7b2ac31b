import 'server-only'
import { constants, createPrivateKey, generateKeyPairSync, privateEncrypt, randomBytes } from 'node:crypto'
import type { KeyObject } from 'node:crypto'
import { existsSync } from 'node:fs'
import { mkdir, mkdtemp, readFile, rename, rm, writeFile } from 'node:fs/promises'
import path from 'node:path'
import forge from 'node-forge'
import type { Signer } from '@/lib/documents/seal'
import { env } from '@/lib/env'
import { SteadfoldError } from '@/lib/errors'

/*
 * The key that seals documents, and the one place that touches it. An installation brings a PKCS#12 file; one that brings
 * none gets a root and a leaf made once, in DATA_DIR/signing, readable by its own user only. RSA, because PKCS#12 readers
 * for PDF sealing take nothing else.
 */

export interface SigningIdentity {
  /** Common name of the certificate that signs. */
  subject: string
  issuer: string
  /** Upper-case hexadecimal, two by two: "5B 0E 71 C4". */
  serial: string
  validFromMs: number
  validToMs: number
  /** Made here at first start: a reader trusts it only once its root is installed. */
  selfIssued: boolean
  /** The root's certificate, for whoever wants to install it; null where the installation brought its own chain. */
  rootPem: string | null
}

export interface SigningAddress {
  /** The firm's own file; undefined: it has none. A file that is named and cannot be used is an error, never replaced. */
  p12Path: string | undefined
  p12Password: string
  /** Where the self-issued pair of an installation without a file lives. */
  folder: string
  firmName: string
}

interface Keyring {
  key: KeyObject
  leaf: forge.pki.Certificate
  chain: forge.pki.Certificate[]
  selfIssued: boolean
}

const shared = globalThis as { steadfoldKeyrings?: Map<string, Promise<Keyring>> }

/** The signer for lib/documents/seal. Throws "unavailable" where the key cannot be read or its certificate has run out. */
export async function signer(address: SigningAddress = fromEnv()): Promise<Signer> {
  const keyring = await keyringOf(address)
  return {
    name: commonName(keyring.leaf.subject),
    sign: async (bytes, at) => {
      checkValidity(keyring, at)
      return detachedCms(bytes, keyring, at)
    },
  }
}

/** Who signs, and until when. */
export async function signingIdentity(address: SigningAddress = fromEnv()): Promise<SigningIdentity> {
  const { leaf, chain, selfIssued } = await keyringOf(address)
  const root = chain.find((certificate) => certificate.isIssuer(certificate))
  return {
    subject: commonName(leaf.subject),
    issuer: commonName(leaf.issuer),
    serial: (leaf.serialNumber.toUpperCase().match(/../g) ?? []).join(' '),
    validFromMs: leaf.validity.notBefore.getTime(),
    validToMs: leaf.validity.notAfter.getTime(),
    selfIssued,
    rootPem: selfIssued && root ? forge.pki.certificateToPem(root) : null,
  }
}

/** Throws "unavailable" where the firm's own key is named and cannot seal now; a self-issued one is made when needed. */
export async function checkOwnKey(now: Date, address: SigningAddress = fromEnv()): Promise<void> {
  if (address.p12Path === undefined) return
  checkValidity(await keyringOf(address), now)
}

function checkValidity({ leaf, selfIssued }: Keyring, at: Date): void {
  const { notBefore, notAfter } = leaf.validity
  if (at >= notBefore && at <= notAfter) return
  throw new SteadfoldError(
    'unavailable',
    `The signing certificate${selfIssued ? '' : ' (SIGNING_P12_PATH)'} is valid from ${day(notBefore)} to ${day(notAfter)}, not now.`,
  )
}

function fromEnv(): SigningAddress {
  const { signing, dataDir, firm } = env()
  return { ...signing, folder: path.join(dataDir, 'signing'), firmName: firm.name }
}

function keyringOf(address: SigningAddress): Promise<Keyring> {
  const keyrings = (shared.steadfoldKeyrings ??= new Map())
  const place = `${address.p12Path ?? ''}\n${address.folder}`
  const known = keyrings.get(place)
  if (known) return known
  const loading = loadKeyring(address)
  keyrings.set(place, loading)
  // A failure is not kept: the admin may put the file right while the server runs.
  loading.catch(() => keyrings.delete(place))
  return loading
}

async function loadKeyring({ p12Path, p12Password, folder, firmName }: SigningAddress): Promise<Keyring> {
  const selfIssued = p12Path === undefined
  const file = p12Path ?? path.join(folder, OWN_FILE)
  if (selfIssued && !existsSync(file)) await issueOwn(folder, firmName)
  try {
    const bytes = await readFile(/*turbopackIgnore: true*/ file)
    return { ...openP12(bytes, selfIssued ? '' : p12Password), selfIssued }
  } catch (error) {
    const name = selfIssued ? '' : ' (SIGNING_P12_PATH)'
    throw new SteadfoldError('unavailable', `The signing key${name} cannot be read: ${reasonOf(error)}.`)
  }
}

/** In plain words, and without the path: people at the desk read it too. */
function reasonOf(error: unknown): string {
  const { code, message } =
    error instanceof Error ? (error as NodeJS.ErrnoException) : { message: String(error) }
  if (code === 'ENOENT') return 'there is no such file'
  if (code !== undefined) return `the file cannot be opened (${code})`
  return /password/i.test(message) ? 'the password (SIGNING_P12_PASSWORD) does not open it' : plain(message)
}

function plain(message: string): string {
  return message.startsWith('it holds') ? message : `it is no PKCS#12 file (${message.replace(/\.$/, '')})`
}

function openP12(bytes: Buffer, password: string): Omit<Keyring, 'selfIssued'> {
  const p12 = forge.pkcs12.pkcs12FromAsn1(forge.asn1.fromDer(bytes.toString('binary')), false, password)
  const { certBag = '', pkcs8ShroudedKeyBag = '', keyBag = '' } = forge.pki.oids
  const keys = [pkcs8ShroudedKeyBag, keyBag].flatMap((type) => p12.getBags({ bagType: type })[type] ?? [])
  const key = keys[0]?.key
  if (!key || !('n' in key)) throw new Error('it holds no RSA key')
  const chain = (p12.getBags({ bagType: certBag })[certBag] ?? []).flatMap(({ cert }) => (cert ? [cert] : []))
  const leaf = chain.find(({ publicKey }) => 'n' in publicKey && publicKey.n.compareTo(key.n) === 0)
  if (!leaf) throw new Error('it holds no certificate of its key')
  return { key: createPrivateKey(forge.pki.privateKeyToPem(key)), leaf, chain }
}

const OWN_FILE = 'signing.p12'
const ROOT_FILE = 'root.pem'
const ROOT_YEARS = 20
const LEAF_YEARS = 5

/** Web server and worker may start at once: the pair is made beside its place and moved there whole; the first one stays. */
async function issueOwn(folder: string, firmName: string): Promise<void> {
  await mkdir(path.dirname(folder), { recursive: true })
  const making = await mkdtemp(`${folder}-`)
  try {
    const { p12, rootPem } = ownChain(firmName)
    await writeFile(path.join(making, OWN_FILE), p12, { mode: 0o600 })
    await writeFile(path.join(making, ROOT_FILE), rootPem, { mode: 0o600 })
    await rename(making, folder)
  } catch (error) {
    await rm(making, { recursive: true, force: true })
    if (!existsSync(path.join(folder, OWN_FILE))) throw error
  }
}

function ownChain(firmName: string) {
  const rootKeys = rsaPair()
  const leafKeys = rsaPair()
  const rootName = nameOf(`${firmName}, self-issued root`, firmName)
  const root = certificate(rootKeys.publicKey, rootName, rootName, ROOT_YEARS, [
    { name: 'basicConstraints', cA: true, critical: true },
    { name: 'keyUsage', keyCertSign: true, cRLSign: true, critical: true },
    { name: 'subjectKeyIdentifier' },
  ])
  root.sign(rootKeys.privateKey, forge.md.sha256.create())
  const leaf = certificate(leafKeys.publicKey, nameOf(firmName, firmName), rootName, LEAF_YEARS, [
    { name: 'basicConstraints', cA: false, critical: true },
    { name: 'keyUsage', digitalSignature: true, nonRepudiation: true, critical: true },
    { name: 'subjectKeyIdentifier' },
  ])
  leaf.sign(rootKeys.privateKey, forge.md.sha256.create())
  // The file is its own user's alone; a password beside it would protect nothing.
  const p12 = forge.pkcs12.toPkcs12Asn1(leafKeys.privateKey, [leaf, root], '', { algorithm: 'aes256' })
  return {
    p12: Buffer.from(forge.asn1.toDer(p12).getBytes(), 'binary'),
    rootPem: forge.pki.certificateToPem(root),
  }
}

function rsaPair() {
  const pair = generateKeyPairSync('rsa', {
    modulusLength: 3072,
    publicKeyEncoding: { type: 'spki', format: 'pem' },
    privateKeyEncoding: { type: 'pkcs8', format: 'pem' },
  })
  return {
    publicKey: forge.pki.publicKeyFromPem(pair.publicKey) as forge.pki.rsa.PublicKey,
    privateKey: forge.pki.privateKeyFromPem(pair.privateKey) as forge.pki.rsa.PrivateKey,
  }
}

function nameOf(commonName: string, organization: string): forge.pki.CertificateField[] {
  const utf8 = forge.asn1.Type.UTF8 as unknown as forge.asn1.Class
  return [
    { name: 'commonName', value: forge.util.encodeUtf8(commonName), valueTagClass: utf8 },
    { name: 'organizationName', value: forge.util.encodeUtf8(organization), valueTagClass: utf8 },
    { name: 'organizationalUnitName', value: 'Self-issued for document sealing', valueTagClass: utf8 },
  ]
}

function certificate(
  publicKey: forge.pki.PublicKey,
  subject: forge.pki.CertificateField[],
  issuer: forge.pki.CertificateField[],
  years: number,
  extensions: object[],
): forge.pki.Certificate {
  const made = forge.pki.createCertificate()
  made.publicKey = publicKey
  // Positive and 16 bytes: RFC 5280 4.1.2.2 allows 20.
  made.serialNumber = `4${randomBytes(16).toString('hex').slice(1)}`
  // Two days back: clocks lag, and the papers of a demo are dated back to when its journeys were prepared.
  made.validity.notBefore = new Date(Date.now() - 2 * 86_400_000)
  made.validity.notAfter = new Date(made.validity.notBefore.getTime() + years * 365.25 * 86_400_000)
  made.setSubject(subject)
  made.setIssuer(issuer)
  made.setExtensions(extensions)
  return made
}

/** CMS SignedData, detached, SHA-256, with content type, signing time and message digest as signed attributes (RFC 5652). */
function detachedCms(bytes: Uint8Array, { key, leaf, chain }: Keyring, at: Date): Buffer {
  const cms = forge.pkcs7.createSignedData()
  cms.content = forge.util.createBuffer(Buffer.from(bytes).toString('binary'))
  for (const each of chain) cms.addCertificate(each)
  const { sha256 = '', contentType = '', data = '', signingTime = '', messageDigest = '' } = forge.pki.oids
  cms.addSigner({
    // The types ask for the library's own key; all it is asked for is this.
    key: {
      sign: (digest: forge.md.MessageDigest) => signed(digest, key),
    } as unknown as forge.pki.rsa.PrivateKey,
    certificate: leaf,
    digestAlgorithm: sha256,
    authenticatedAttributes: [
      { type: contentType, value: data },
      // The types ask for a string; forge writes UTCTime only from a Date.
      { type: signingTime, value: at as unknown as string },
      { type: messageDigest },
    ],
  })
  cms.sign({ detached: true })
  return Buffer.from(forge.asn1.toDer(cms.toAsn1()).getBytes(), 'binary')
}

/** Before a SHA-256 digest in what RSASSA-PKCS1-v1_5 pads and signs (RFC 8017, 9.2, note 1). */
const SHA256_INFO = Buffer.from('3031300d060960864801650304020105000420', 'hex')

/** By the system's own library: in JavaScript alone each signature takes a tenth of a second and more. */
function signed(digest: forge.md.MessageDigest, key: KeyObject): string {
  const info = Buffer.concat([SHA256_INFO, Buffer.from(digest.digest().getBytes(), 'binary')])
  return privateEncrypt({ key, padding: constants.RSA_PKCS1_PADDING }, info).toString('binary')
}

function commonName(name: { getField(field: string): { value?: unknown } | null }): string {
  const value = name.getField('CN')?.value
  return typeof value === 'string' ? decodeName(value) : ''
}

/** forge hands a name back as raw bytes where it was UTF-8. */
function decodeName(value: string): string {
  try {
    return forge.util.decodeUtf8(value)
  } catch {
    return value
  }
}

function day(date: Date): string {
  return date.toISOString().slice(0, 10)
}
