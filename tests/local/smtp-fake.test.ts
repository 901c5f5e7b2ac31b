import { mkdtempSync, rmSync } from 'node:fs'
import { tmpdir } from 'node:os'
import path from 'node:path'
import { createTransport } from 'nodemailer'
import { afterAll, beforeAll, beforeEach, describe, expect, test } from 'vitest'
import { startMailFake } from '@/lib/local/smtp-fake.mjs'

const folder = mkdtempSync(path.join(tmpdir(), 'steadfold-mail-'))
let fake: Awaited<ReturnType<typeof startMailFake>>

beforeAll(async () => {
  fake = await startMailFake({ folder })
})
beforeEach(async () => {
  await ask('DELETE', '/mails')
  fake.failWith('none')
})
afterAll(async () => {
  await fake.stop()
  rmSync(folder, { recursive: true })
})

const send = () => {
  const { port } = new URL(fake.smtpUrl)
  const transport = createTransport({
    host: '127.0.0.1',
    port: Number(port),
    ignoreTLS: true,
    connectionTimeout: 2000,
  })
  return transport.sendMail({
    from: 'Corran <desk@corran.example>',
    to: 'j.strand@example.org',
    bcc: 'vet@example.org',
    subject: 'Manifest 2417, Łódź',
    text: 'Grüße <b>',
    html: '<p>Grüße</p>',
    attachments: [{ filename: 'manifest.pdf', content: Buffer.from('%PDF-1.7 ÿ', 'latin1') }],
  })
}
const ask = async (method: string, place: string, body?: unknown) =>
  fetch(`${fake.webUrl}${place}`, { method, ...(body === undefined ? {} : { body: JSON.stringify(body) }) })
const mails = async () =>
  (await (await ask('GET', '/mails')).json()) as { id: string; to: string; subject: string }[]

describe('the mail server of one machine', () => {
  test('keeps a letter whole: envelope, both bodies, the file to the byte', async () => {
    await send()
    const [mail] = await mails()
    expect(mail).toMatchObject({
      to: 'j.strand@example.org, vet@example.org',
      subject: 'Manifest 2417, Łódź',
      attachments: [{ filename: 'manifest.pdf', contentType: 'application/pdf', size: 10 }],
    })
    const whole = await (await ask('GET', `/mails/${mail?.id}`)).json()
    expect(whole).toMatchObject({ text: 'Grüße <b>', html: '<p>Grüße</p>' })
    const file = await (await ask('GET', `/mails/${mail?.id}/attachments/0`)).arrayBuffer()
    expect(Buffer.from(file)).toEqual(Buffer.from('%PDF-1.7 ÿ', 'latin1'))
  })

  test('shows letters as a page, with nothing of them run as markup', async () => {
    await send()
    const [mail] = await mails()
    expect(await (await ask('GET', '/')).text()).toContain('Manifest 2417, Łódź')
    expect(await (await ask('GET', `/read/${mail?.id}`)).text()).toContain('Grüße &lt;b&gt;')
  })

  test('refuses for good, refuses for now, and hangs up after the last byte, as often as told', async () => {
    await ask('POST', '/failure', { mode: 'refuse', times: 1 })
    await expect(send()).rejects.toMatchObject({ responseCode: 550 })
    await ask('POST', '/failure', { mode: 'later', times: 1 })
    await expect(send()).rejects.toMatchObject({ responseCode: 451 })
    expect(await mails()).toHaveLength(0)
    await ask('POST', '/failure', { mode: 'drop', times: 1 })
    await expect(send()).rejects.toThrow()
    expect(await mails()).toHaveLength(1)
    await send()
    expect(await mails()).toHaveLength(2)
  })

  test('answers loopback names alone, and knows no other files', async () => {
    const { hostname, port } = new URL(fake.webUrl)
    const { request } = await import('node:http')
    const status = await new Promise((resolve) => {
      request({ hostname, port, path: '/mails', headers: { host: 'rebound.example' } }, (answer) =>
        resolve(answer.statusCode),
      ).end()
    })
    expect(status).toBe(403)
    expect((await ask('GET', '/mails/..%2f..%2fsecrets.json')).status).toBe(404)
    expect((await ask('GET', '/mails/00000000000001-0001/raw')).status).toBe(404)
  })
})
