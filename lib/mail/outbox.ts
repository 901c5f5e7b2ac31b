import 'server-only'
import { randomUUID } from 'node:crypto'
import { Op, type Transaction } from 'sequelize'
import { isDuplicate, transaction } from '@/lib/db/transaction'
import { record } from '@/lib/domain/audit/record'
import { env } from '@/lib/env'
import { SteadfoldError } from '@/lib/errors'
import { type Document, models, type OutboxMessage } from '@/models'
import type { OutboxState } from '@/models/outbox-message'
import type { Letter, Outcome, Transport } from './transport'

/*
 * Mails are rows first. A row is written in the transaction that decided it, claimed in a transaction of its own, and only
 * then sent: nothing is lost when a process dies, and nothing goes twice by itself. Where a letter may have arrived, the
 * row says "uncertain" and waits for a person.
 */

export interface NewMail {
  to: string
  subject: string
  text: string
  html: string
  /** Ids of documents to attach, as issued. */
  attachments?: number[]
  consignmentId: number | null
  /** One mail for one key, ever: asking again changes nothing. */
  dedupeKey: string
}

/** Longer than any sending can take (transport.ts); a lease that ran out means that the sender died. */
const LEASE_MS = 5 * 60_000
const BACK_OFF_MIN = [1, 5, 15, 60, 180, 360, 720]
export const MAIL_ATTEMPTS = BACK_OFF_MIN.length + 1

/** Puts a mail in the outbox, in the transaction that decided it. Its Message-ID is made here and stays through every try. */
export async function enqueue(tx: Transaction, mail: NewMail, now: Date): Promise<void> {
  try {
    await models.OutboxMessage.create(
      {
        messageId: `<${randomUUID()}@${mailDomain()}>`,
        consignmentId: mail.consignmentId,
        toAddress: mail.to,
        subject: mail.subject.slice(0, 250),
        text: mail.text,
        html: mail.html,
        attachments: mail.attachments ?? [],
        dedupeKey: mail.dedupeKey,
        nextAttemptAt: now,
        leaseUntil: null,
        leasedBy: null,
        lastError: null,
        sentAt: null,
        // The letter's own date: when it was decided, however long it waits.
        createdAt: now,
      },
      { transaction: tx },
    )
  } catch (error) {
    if (!isDuplicate(error)) throw error
  }
}

/** Takes the mail that has been due longest for this worker; null where there is none. The claim is committed on return. */
export function claim(worker: string, now: Date): Promise<OutboxMessage | null> {
  return transaction(async (tx) => {
    const mail = await models.OutboxMessage.findOne({
      where: { state: 'waiting', nextAttemptAt: { [Op.lte]: now } },
      order: [
        ['nextAttemptAt', 'ASC'],
        ['id', 'ASC'],
      ],
      lock: tx.LOCK.UPDATE,
      skipLocked: true,
      transaction: tx,
    })
    if (mail === null) return null
    const leaseUntil = new Date(now.getTime() + LEASE_MS)
    return mail.update(
      { state: 'sending', attempts: mail.attempts + 1, leasedBy: worker, leaseUntil },
      { transaction: tx },
    )
  })
}

export interface Delivery {
  transport: Transport
  from: string
  worker: string
  clock: () => Date
}

/** Sends one mail if one is due. Returns its state afterwards, or null where nothing was due. */
export async function deliverNext({ transport, from, worker, clock }: Delivery): Promise<OutboxState | null> {
  const mail = await claim(worker, clock())
  if (mail === null) return null
  return settle(mail, await handOver(mail, from, transport), worker, clock())
}

async function handOver(mail: OutboxMessage, from: string, transport: Transport): Promise<Outcome> {
  let letter: Letter | { missing: number }
  try {
    letter = await letterOf(mail, from)
  } catch (error) {
    // Nothing has left the house: it waits for the next try instead of standing as uncertain.
    return { kind: 'unsent', reason: error instanceof Error ? error.message : String(error) }
  }
  if ('missing' in letter) {
    return {
      kind: 'refused',
      forGood: true,
      reason: `Document ${letter.missing} to be attached is not there.`,
    }
  }
  return transport.send(letter)
}

/** Rows whose sender died while sending: nobody knows whether they arrived. Returns how many. */
export async function giveUpOnSilent(now: Date): Promise<number> {
  const [count] = await models.OutboxMessage.update(
    { state: 'uncertain', leaseUntil: null, leasedBy: null, lastError: 'The sender stopped while sending.' },
    { where: { state: 'sending', leaseUntil: { [Op.lt]: now } } },
  )
  return count
}

/** A person sends an uncertain or failed mail again, in the transaction of that verb. The Message-ID stays the same. */
export async function resend(tx: Transaction, mailId: number, now: Date): Promise<void> {
  const [count] = await models.OutboxMessage.update(
    { state: 'waiting', attempts: 0, nextAttemptAt: now, lastError: null },
    { where: { id: mailId, state: ['uncertain', 'failed'] }, transaction: tx },
  )
  if (count === 0)
    throw new SteadfoldError('wrong_state', 'Only a mail that is uncertain or failed can be sent again.')
}

async function letterOf(mail: OutboxMessage, from: string): Promise<Letter | { missing: number }> {
  const attachments: Letter['attachments'] = []
  for (const id of mail.attachments) {
    const document = await models.Document.unscoped().findByPk(id, {
      include: [{ association: 'consignment', attributes: ['mark'] }],
    })
    if (document === null) return { missing: id }
    attachments.push({
      filename: attachmentName(document),
      content: document.bytes,
      contentType: 'application/pdf',
    })
  }
  const { messageId, toAddress, subject, text, html, createdAt } = mail
  return { messageId, from, to: toAddress, subject, text, html, date: createdAt, attachments }
}

/** "2433-revision-5.pdf" */
function attachmentName({ consignment, revision }: Document): string {
  return `${consignment?.mark ?? 'document'}-revision-${revision}.pdf`
}

function settle(
  mail: OutboxMessage,
  outcome: Outcome,
  worker: string,
  now: Date,
): Promise<OutboxState | null> {
  const next = nextRow(mail, outcome, now)
  return transaction(async (tx) => {
    const [count] = await models.OutboxMessage.update(
      { ...next, leaseUntil: null, leasedBy: null },
      { where: { id: mail.id, state: 'sending', leasedBy: worker }, transaction: tx },
    )
    if (count === 0) return null
    if (next.state !== 'waiting') {
      await record(tx, {
        actor: null,
        verb: `mail.${next.state}`,
        subject: { type: 'mail', id: mail.id },
        consignmentId: mail.consignmentId,
        at: now,
        after: {
          to: mail.toAddress,
          subject: mail.subject,
          messageId: mail.messageId,
          attempts: mail.attempts,
        },
        note: next.lastError ?? '',
      })
    }
    return next.state
  })
}

interface NextRow {
  state: OutboxState
  lastError: string | null
  nextAttemptAt?: Date
  sentAt?: Date
}

function nextRow({ attempts }: OutboxMessage, outcome: Outcome, now: Date): NextRow {
  switch (outcome.kind) {
    case 'sent':
      return { state: 'sent', sentAt: now, lastError: null }
    case 'uncertain':
      return { state: 'uncertain', lastError: clipped(outcome.reason) }
    case 'unsent':
    case 'refused': {
      const lastError = clipped(outcome.reason)
      const waitMin = BACK_OFF_MIN[attempts - 1]
      const forGood = outcome.kind === 'refused' && outcome.forGood
      if (forGood || waitMin === undefined) return { state: 'failed', lastError }
      return { state: 'waiting', lastError, nextAttemptAt: new Date(now.getTime() + waitMin * 60_000) }
    }
  }
}

/** "corran.example", of "Corran Animal Couriers <desk@corran.example>". */
function mailDomain(): string {
  return /@([A-Za-z0-9.-]+)>?\s*$/.exec(env().mailFrom)?.[1] ?? 'steadfold.invalid'
}

function clipped(reason: string): string {
  return reason.slice(0, 2000)
}
