import { readFile, readdir, stat, writeFile } from 'node:fs/promises'
import path from 'node:path'
import { Document, Page, renderToBuffer, Text } from '@react-pdf/renderer'
import forge from 'node-forge'
import { beforeAll, describe, expect, it, vi } from 'vitest'
import { seal } from '@/lib/documents/seal'
import { checkSeal } from '@/lib/documents/verify'
import { checkOwnKey, signer, type SigningAddress, signingIdentity } from '@/lib/signing'
import { inFolder, pdfsig } from './support/pdf-tools'

const FIRM = 'Corran Animal Couriers'
const AT = new Date()

function addressIn(folder: string, more: Partial<SigningAddress> = {}): SigningAddress {
  return {
    p12Path: undefined,
    p12Password: '',
    folder: path.join(folder, 'signing'),
    firmName: FIRM,
    ...more,
  }
}

async function sealedPage(address: SigningAddress) {
  const bytes = await renderToBuffer(
    <Document>
      <Page size="A4">
        <Text>Łódź, 2433-A</Text>
      </Page>
    </Document>,
  )
  return seal(bytes, await signer(address), {
    reason: 'Manifest 2433, revision 5',
    contact: '+44 141 496 0388',
    location: 'Glasgow',
    at: AT,
  })
}

describe('a sealed document', () => {
  let sealed: Buffer
  let rootPem: string | null

  beforeAll(async () => {
    await inFolder(async (folder) => {
      sealed = await sealedPage(addressIn(folder))
      rootPem = (await signingIdentity(addressIn(folder))).rootPem
    })
  }, 60_000)

  it('is valid, whole and trusted to a reader that knows the root', async () => {
    const said = await pdfsig(sealed, rootPem)
    expect(said).toContain('Signature Validation: Signature is Valid.')
    expect(said).toContain('Certificate Validation: Certificate is Trusted.')
    expect(said).toContain('Total document signed')
    expect(said).not.toContain('Not total document signed')
    expect(said).toContain('SHA-256')
    expect(said).toContain(`Signer Certificate Common Name: ${FIRM}`)
  })

  it('is valid and not trusted to a reader that does not know the root', async () => {
    const said = await pdfsig(sealed, null)
    expect(said).toContain('Signature is Valid.')
    expect(said).not.toContain('Certificate is Trusted')
  })

  it('is told as changed after one byte is flipped, by the reader and by us', async () => {
    const changed = Buffer.from(sealed)
    // The version in the first line: every parser still reads the file.
    changed.writeUInt8(changed.readUInt8(7) ^ 1, 7)
    expect(await pdfsig(changed, rootPem)).toContain('Digest Mismatch')
    expect(checkSeal(changed)).toMatchObject({
      found: true,
      coversAll: true,
      digestMatches: false,
      signatureMatches: true,
    })
  })

  it('is told as not whole after bytes are appended', async () => {
    const longer = Buffer.concat([sealed, Buffer.from('\n% more\n')])
    expect(await pdfsig(longer, rootPem)).toContain('Not total document signed')
    expect(checkSeal(longer)).toMatchObject({ found: true, coversAll: false, digestMatches: true })
  })

  it('is read back by us: range, digest, key, name and time', async () => {
    const { serial, ...said } = checkSeal(sealed)
    expect(said).toEqual({
      found: true,
      coversAll: true,
      digestMatches: true,
      signatureMatches: true,
      signerName: FIRM,
      signedAtMs: Math.floor(AT.getTime() / 1000) * 1000,
    })
    expect(serial).toMatch(/^4[0-9a-f]{31}$/)
  })

  it('keeps an earlier signature valid when sealed again by another key', async () => {
    const twice = await inFolder(async (folder) =>
      seal(sealed, await signer(addressIn(folder, { firmName: 'Second Firm' })), {
        reason: 'counter',
        contact: '',
        location: '',
        at: AT,
      }),
    )
    const said = await pdfsig(twice, rootPem)
    expect(said.match(/Signature is Valid\./g)).toHaveLength(2)
    expect(said).not.toContain('Digest Mismatch')
  }, 30_000)

  it('finds no seal in a file without one, in rubbish, and in a range that lies', () => {
    expect(checkSeal(Buffer.from('%PDF-1.4 nothing here')).found).toBe(false)
    expect(checkSeal(Buffer.from('/ByteRange [0 5 9 99999]<00>')).found).toBe(false)
    expect(checkSeal(Buffer.alloc(0)).found).toBe(false)
  })
})

describe('the signing key', () => {
  it('is made once, though two processes start at once, and only its own user can read it', async () => {
    await inFolder(async (folder) => {
      // Two spellings of one folder are two processes to the cache.
      const both = [addressIn(folder), addressIn(folder, { folder: `${folder}/./signing` })]
      const [one, two] = await Promise.all(both.map((address) => signingIdentity(address)))
      expect(one?.serial).toBe(two?.serial)
      expect(one).toMatchObject({ subject: FIRM, issuer: `${FIRM}, self-issued root`, selfIssued: true })
      expect(await readdir(folder)).toEqual(['signing'])
      for (const file of await readdir(path.join(folder, 'signing'))) {
        expect((await stat(path.join(folder, 'signing', file))).mode & 0o777, file).toBe(0o600)
      }
    })
  }, 60_000)

  it('is refused with a reason while the file named is not there or no PKCS#12, and never replaced by one of ours', async () => {
    await inFolder(async (folder) => {
      const brought = addressIn(folder, { p12Path: path.join(folder, 'brought.p12') })
      const asked = () => signingIdentity(brought)
      await expect(asked()).rejects.toMatchObject({
        code: 'unavailable',
        message: 'The signing key (SIGNING_P12_PATH) cannot be read: there is no such file.',
      })
      await writeFile(brought.p12Path ?? '', 'not a key')
      await expect(asked()).rejects.toMatchObject({
        code: 'unavailable',
        message: expect.stringContaining('it is no PKCS#12 file') as string,
      })
      expect(await readdir(folder)).toEqual(['brought.p12'])
      // Read again once it is put right.
      await writeFile(brought.p12Path ?? '', await ownKey(folder, 'desk'))
      await expect(asked()).rejects.toMatchObject({
        code: 'unavailable',
        message: expect.stringContaining('the password (SIGNING_P12_PASSWORD) does not open it') as string,
      })
      expect(await signingIdentity({ ...brought, p12Password: 'desk' })).toMatchObject({
        subject: FIRM,
        selfIssued: false,
        rootPem: null,
      })
    })
  }, 60_000)

  it('is refused before anything is sealed where the firm’s own certificate has run out', async () => {
    await inFolder(async (folder) => {
      const p12Path = path.join(folder, 'brought.p12')
      vi.useFakeTimers({ toFake: ['Date'], now: new Date('2010-06-01') })
      try {
        await writeFile(p12Path, await ownKey(folder, ''))
      } finally {
        vi.useRealTimers()
      }
      const brought = addressIn(folder, { p12Path })
      await expect(checkOwnKey(AT, brought)).rejects.toMatchObject({
        code: 'unavailable',
        message:
          'The signing certificate (SIGNING_P12_PATH) is valid from 2010-05-30 to 2015-05-30, not now.',
      })
      await checkOwnKey(new Date('2012-01-01'), brought)
      // Nothing to check where none was brought, and nothing made by looking.
      await checkOwnKey(AT, addressIn(folder, { folder: path.join(folder, 'nowhere') }))
      expect((await readdir(folder)).sort()).toEqual(['brought.p12', 'signing'])
    })
  }, 60_000)

  it('refuses to sign outside its validity', async () => {
    await inFolder(async (folder) => {
      const key = await signer(addressIn(folder))
      await expect(key.sign(Buffer.from('x'), new Date('2001-01-01'))).rejects.toMatchObject({
        code: 'unavailable',
      })
    })
  }, 60_000)
})

/** A key and its certificates under a password, as a firm might bring them. */
async function ownKey(folder: string, password: string): Promise<Buffer> {
  const own = addressIn(folder)
  await signingIdentity(own)
  const bytes = await readFile(path.join(own.folder, 'signing.p12'))
  const p12 = forge.pkcs12.pkcs12FromAsn1(forge.asn1.fromDer(bytes.toString('binary')), '')
  const { certBag = '', pkcs8ShroudedKeyBag = '' } = forge.pki.oids
  const key = p12.getBags({ bagType: pkcs8ShroudedKeyBag })[pkcs8ShroudedKeyBag]?.[0]?.key
  const chain = (p12.getBags({ bagType: certBag })[certBag] ?? []).flatMap(({ cert }) => (cert ? [cert] : []))
  if (!key) throw new Error('The pair made here holds no key.')
  const again = forge.pkcs12.toPkcs12Asn1(key, chain, password, { algorithm: 'aes256' })
  return Buffer.from(forge.asn1.toDer(again).getBytes(), 'binary')
}
