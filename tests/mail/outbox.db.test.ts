import { afterEach, beforeEach, describe, expect, it } from 'vitest'
import { transaction } from '@/lib/db/transaction'
import {
  claim,
  deliverNext,
  enqueue,
  giveUpOnSilent,
  MAIL_ATTEMPTS,
  type NewMail,
  resend,
} from '@/lib/mail/outbox'
import { smtpTransport, type Transport } from '@/lib/mail/transport'
import { models } from '@/models'
import { answer, type MailServer, mailServer } from './support/mail-server'

const NOON = new Date('2026-06-11T12:00:00Z')
const FROM = 'Corran Animal Couriers <desk@corran.example>'
const SHORT = { connectMs: 500, greetMs: 500, silenceMs: 400 }

const mail = (key: string, more: Partial<NewMail> = {}): NewMail => ({
  to: 'j.strand@example.org',
  subject: `2433, revision 5: ${key}`,
  text: 'Least to spare: 26 min',
  html: '<p>Least to spare: 26 min</p>',
  consignmentId: null,
  dedupeKey: key,
  ...more,
})

const put = (...mails: NewMail[]) =>
  transaction(async (tx) => {
    for (const each of mails) await enqueue(tx, each, NOON)
  })

const later = (minutes: number) => new Date(NOON.getTime() + minutes * 60_000)
const deliver = (transport: Transport, at = NOON, worker = 'worker-1') =>
  deliverNext({ transport, from: FROM, worker, clock: () => at })
const only = () => models.OutboxMessage.findOne({ order: [['id', 'DESC']] })

let server: MailServer | undefined
beforeEach(async () => {
  // The application may delete no mail, so what an earlier test left is put aside.
  await models.OutboxMessage.update({ state: 'sent' }, { where: {} })
})
afterEach(async () => {
  await server?.close()
  server = undefined
})

describe('putting a mail in the outbox', () => {
  it('happens with its transaction or not at all', async () => {
    await expect(
      transaction(async (tx) => {
        await enqueue(tx, mail('lost'), NOON)
        throw new Error('the verb failed')
      }),
    ).rejects.toThrow('the verb failed')
    expect(await models.OutboxMessage.count({ where: { dedupeKey: 'lost' } })).toBe(0)
  })

  it('happens once for one key, and leaves the transaction usable', async () => {
    await put(mail('manifest-5'), mail('manifest-5', { subject: 'again' }), mail('manifest-6'))
    const subjects = (
      await models.OutboxMessage.findAll({ where: { state: 'waiting' }, order: [['id', 'ASC']] })
    ).map(({ subject }) => subject)
    expect(subjects).toEqual(['2433, revision 5: manifest-5', '2433, revision 5: manifest-6'])
  })
})

describe('delivering', () => {
  it('dates a letter by when it was decided, however late it goes', async () => {
    server = await mailServer()
    await put(mail('late'))
    expect(await only()).toMatchObject({ createdAt: NOON })
    await deliver(smtpTransport(server.url), later(300))
    expect(server.taken.map(({ date }) => date)).toEqual([NOON])
    expect(await only()).toMatchObject({ sentAt: later(300) })
  })

  it('sends what is due, keeps the Message-ID, and writes the trail', async () => {
    server = await mailServer()
    await put(mail('one'))
    const id = (await only())?.messageId
    expect(await deliver(smtpTransport(server.url))).toBe('sent')
    expect(await only()).toMatchObject({
      state: 'sent',
      attempts: 1,
      sentAt: NOON,
      leasedBy: null,
      lastError: null,
    })
    expect(server.taken.map(({ messageId }) => messageId)).toEqual([id])
    expect(id).toMatch(/^<[0-9a-f-]{36}@[a-z.]+>$/)
    expect(await models.AuditEvent.count({ where: { verb: 'mail.sent' } })).toBeGreaterThan(0)
    expect(await deliver(smtpTransport(server.url))).toBeNull()
  })

  it('never sends one twice, with two deliverers at once and many mails', async () => {
    server = await mailServer()
    await put(...Array.from({ length: 24 }, (_, index) => mail(`many-${index}`)))
    const transport = smtpTransport(server.url)
    const emptyOut = async (worker: string) => {
      let sent = 0
      while ((await deliver(transport, NOON, worker)) !== null) sent += 1
      return sent
    }
    const counts = await Promise.all([emptyOut('worker-1'), emptyOut('worker-2')])
    const ids = server.taken.map(({ messageId }) => messageId)
    expect(ids).toHaveLength(24)
    expect(new Set(ids).size).toBe(24)
    // Both took part, or the test has shown nothing.
    expect(Math.min(...counts)).toBeGreaterThan(0)
  })

  it('tries again later, ever later, and fails for good after the last try', async () => {
    const closed = await mailServer()
    await closed.close()
    const transport = smtpTransport(closed.url)
    await put(mail('stubborn'))
    let at = NOON
    const waits: number[] = []
    for (let attempt = 1; attempt < MAIL_ATTEMPTS; attempt += 1) {
      expect(await deliver(transport, at)).toBe('waiting')
      const next = (await only())?.nextAttemptAt ?? NOON
      waits.push((next.getTime() - at.getTime()) / 60_000)
      expect(await deliver(transport, new Date(next.getTime() - 1))).toBeNull()
      at = next
    }
    expect(waits).toEqual([...waits].sort((a, b) => a - b))
    expect(await deliver(transport, at)).toBe('failed')
    expect(await only()).toMatchObject({
      state: 'failed',
      attempts: MAIL_ATTEMPTS,
      lastError: expect.stringContaining('ECONNREFUSED') as string,
    })
  })

  it('fails at once where the server refuses for good', async () => {
    server = await mailServer({ onRcptTo: (_address, _session, done) => done(answer(550, 'No such person')) })
    await put(mail('unknown'))
    expect(await deliver(smtpTransport(server.url))).toBe('failed')
    expect((await only())?.lastError).toContain('No such person')
  })

  it('leaves a mail uncertain when the line broke after it was handed over, and never sends it again by itself', async () => {
    server = await mailServer({
      onData: (stream) => {
        stream.resume()
        stream.on('end', () => server?.cut())
      },
    })
    await put(mail('perhaps'))
    expect(await deliver(smtpTransport(server.url, SHORT))).toBe('uncertain')
    expect(await deliver(smtpTransport(server.url, SHORT), later(10_000))).toBeNull()
    expect((await only())?.state).toBe('uncertain')
  })

  it('leaves a mail uncertain whose sender died while sending', async () => {
    await put(mail('orphan'))
    await claim('worker-that-dies', NOON)
    expect(await giveUpOnSilent(later(1))).toBe(0)
    expect(await giveUpOnSilent(later(6))).toBe(1)
    expect((await only())?.state).toBe('uncertain')
  })

  it('does not overwrite what was decided meanwhile', async () => {
    await put(mail('slow'))
    const slow: Transport = {
      send: async () => {
        await giveUpOnSilent(later(6))
        return { kind: 'sent', response: '250' }
      },
    }
    expect(await deliver(slow)).toBeNull()
    expect((await only())?.state).toBe('uncertain')
  })

  it('fails a mail whose document is not there', async () => {
    server = await mailServer()
    await put(mail('empty-handed', { attachments: [999_999] }))
    expect(await deliver(smtpTransport(server.url))).toBe('failed')
    expect(server.taken).toHaveLength(0)
  })
})

describe('sending again', () => {
  it('is for a person, for a mail that is uncertain or failed, under the same Message-ID', async () => {
    await put(mail('once-more'))
    const first = await claim('worker-that-dies', NOON)
    await giveUpOnSilent(later(6))
    await transaction((tx) => resend(tx, first?.id ?? 0, later(7)))
    server = await mailServer()
    expect(await deliver(smtpTransport(server.url), later(7))).toBe('sent')
    expect(server.taken[0]?.messageId).toBe(first?.messageId)
    await expect(transaction((tx) => resend(tx, first?.id ?? 0, later(8)))).rejects.toMatchObject({
      code: 'wrong_state',
    })
  })
})
