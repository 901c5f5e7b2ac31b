import { createServer } from 'node:net'
import { Readable } from 'node:stream'
import { afterEach, describe, expect, it } from 'vitest'
import { type Letter, type Outcome, smtpTransport } from '@/lib/mail/transport'
import { answer, type MailServer, mailServer } from './support/mail-server'

const SHORT = { connectMs: 500, greetMs: 500, silenceMs: 400 }

const letter: Letter = {
  messageId: '<one@corran.example>',
  from: 'Corran Animal Couriers <desk@corran.example>',
  to: 'j.strand@example.org',
  subject: '2433, revision 5: GO WITH CONDITIONS. Łódź, 26 °C',
  text: 'Least to spare: 26 min, or 3 °C of outside air.\n.\nA line that begins with a full stop.',
  html: '<p>Least to spare: <b>26 min</b></p>',
  date: new Date('2026-06-11T08:12:06Z'),
  attachments: [
    {
      filename: '2433-revision-5.pdf',
      content: Buffer.from('%PDF-1.7 bytes \x00\xff', 'latin1'),
      contentType: 'application/pdf',
    },
  ],
}

let server: MailServer | undefined
afterEach(async () => {
  await server?.close()
  server = undefined
})

const send = (url: string): Promise<Outcome> => smtpTransport(url, SHORT).send(letter)

describe('a letter by SMTP', () => {
  it('arrives whole: id, date, letters beyond ASCII, both parts, the attachment to the byte', async () => {
    server = await mailServer()
    expect(await send(server.url)).toMatchObject({ kind: 'sent' })
    const [mail] = server.taken
    expect(mail?.messageId).toBe(letter.messageId)
    expect(mail?.date).toEqual(letter.date)
    expect(mail?.subject).toBe(letter.subject)
    expect(mail?.text?.trim()).toBe(letter.text)
    expect(mail?.html).toBe(letter.html)
    expect(mail?.attachments[0]?.filename).toBe('2433-revision-5.pdf')
    expect(mail?.attachments[0]?.content.equals(letter.attachments[0]?.content ?? Buffer.alloc(0))).toBe(true)
  })

  it('signs in with the name and password of the address', async () => {
    const seen: string[] = []
    server = await mailServer({
      authOptional: false,
      onAuth: ({ username = '', password = '' }, _session, done) => {
        seen.push(`${username} ${password}`)
        done(null, { user: username })
      },
    })
    expect(await send(server.url.replace('smtp://', 'smtp://desk%40corran.example:p%3Ass@'))).toMatchObject({
      kind: 'sent',
    })
    expect(seen).toEqual(['desk@corran.example p:ss'])
  })

  it('stays unsent when the password is wrong: the fault is not the letter’s', async () => {
    server = await mailServer({
      authOptional: false,
      onAuth: (_auth, _session, done) => done(answer(535, 'Wrong password')),
    })
    expect(await send(server.url.replace('smtp://', 'smtp://a:b@'))).toMatchObject({ kind: 'unsent' })
  })

  it('stays unsent when nobody listens', async () => {
    const closed = await mailServer()
    await closed.close()
    expect(await send(closed.url)).toMatchObject({ kind: 'unsent' })
  })

  it('stays unsent when the server answers the connection with silence', async () => {
    const mute = createServer(() => undefined)
    await new Promise<void>((ready) => mute.listen(0, '127.0.0.1', ready))
    const address = mute.address()
    const port = typeof address === 'object' && address !== null ? address.port : 0
    expect(await send(`smtp://127.0.0.1:${port}`)).toMatchObject({ kind: 'unsent' })
    mute.close()
  })

  it('is refused for now by a 4xx to the recipient, and for good by a 5xx', async () => {
    server = await mailServer({ onRcptTo: (_address, _session, done) => done(answer(450, 'Mailbox busy')) })
    expect(await send(server.url)).toMatchObject({ kind: 'refused', forGood: false })
    await server.close()
    server = await mailServer({ onRcptTo: (_address, _session, done) => done(answer(550, 'No such person')) })
    expect(await send(server.url)).toMatchObject({
      kind: 'refused',
      forGood: true,
      reason: expect.stringContaining('No such person') as string,
    })
  })

  it('is refused by an answer to the letter itself, which is certain', async () => {
    for (const [code, forGood] of [
      [451, false],
      [552, true],
    ] as const) {
      server = await mailServer({
        onData: (stream, _session, done) => {
          stream.resume()
          stream.on('end', () => done(answer(code, 'Not taken')))
        },
      })
      expect(await send(server.url)).toMatchObject({ kind: 'refused', forGood })
      await server.close()
    }
    server = undefined
  })

  it('is uncertain when the line breaks after the letter was handed over', async () => {
    server = await mailServer({
      onData: (stream) => {
        stream.resume()
        stream.on('end', () => server?.cut())
      },
    })
    expect(await send(server.url)).toMatchObject({ kind: 'uncertain' })
  })

  it('is uncertain when the server takes the letter and says nothing', async () => {
    server = await mailServer({ onData: (stream) => void stream.resume() })
    expect(await send(server.url)).toMatchObject({ kind: 'uncertain' })
  })

  it('stays unsent when the line breaks before the letter was asked for', async () => {
    server = await mailServer({ onRcptTo: () => server?.cut() })
    expect(await send(server.url)).toMatchObject({ kind: 'unsent' })
  })

  it('stays unsent when it cannot even be packed, or the address of the server cannot be read', async () => {
    server = await mailServer()
    const content = new Readable({ read: () => content.destroy(new Error('The disk is gone.')) })
    const attachments = [
      { filename: 'a.pdf', content: content as unknown as Buffer, contentType: 'application/pdf' },
    ]
    expect(await smtpTransport(server.url, SHORT).send({ ...letter, attachments })).toEqual({
      kind: 'unsent',
      reason: 'The disk is gone.',
    })
    expect(await send(server.url.replace('smtp://', 'smtp://desk:50%@'))).toMatchObject({
      kind: 'unsent',
      reason: expect.stringContaining('URI malformed') as string,
    })
    expect(server.taken).toEqual([])
  })
})
