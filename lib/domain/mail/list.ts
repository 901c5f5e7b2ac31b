import 'server-only'
import { Op, col, fn } from 'sequelize'
import type { WhereOptions } from 'sequelize'
import { SteadfoldError } from '@/lib/errors'
import { printedCode } from '@/lib/documents/code'
import type { Actor } from '@/lib/policies/actor'
import { MAIL_STATES } from '@/lib/schemas/administration'
import type { MailQuery } from '@/lib/schemas/administration'
import type { MailDetail, MailRow, MailState } from '@/lib/views/administration'
import { PAPER_KIND_WORDS } from '@/lib/views/verification'
import { models } from '@/models'
import type { OutboxMessage } from '@/models'
import { authorize } from '../authorize'
import { deskMoment } from '../firm'

export interface MailLines {
  rows: MailRow[]
  /** Of all mails, whatever the filters. */
  counts: Record<MailState, number>
  /** Give it as `before` for older mails; null at the end. */
  before: number | null
}

/** The mail queue, newest first, a page at a time; never the letters themselves. */
export async function listMail(actor: Actor, query: MailQuery): Promise<MailLines> {
  authorize(actor, 'mail.list')
  const mails = await models.OutboxMessage.findAll({
    where: await filterOf(query),
    attributes: { exclude: ['text', 'html'] },
    order: [['id', 'DESC']],
    limit: query.limit + 1,
  })
  const shown = mails.slice(0, query.limit)
  const marks = await marksOf(shown)
  return {
    rows: shown.map((mail) => mailRow(mail, marks)),
    counts: await countStates(),
    before: mails.length > query.limit ? (shown.at(-1)?.id ?? null) : null,
  }
}

/** One mail as it was written. */
export async function loadMail(actor: Actor, { mailId }: { mailId: number }): Promise<MailDetail> {
  authorize(actor, 'mail.list')
  const mail = await models.OutboxMessage.findByPk(mailId)
  if (mail === null) throw new SteadfoldError('not_found', 'There is no such mail.')
  const papers = await models.Document.findAll({ where: { id: mail.attachments } })
  return {
    ...mailRow(mail, await marksOf([mail])),
    messageId: mail.messageId,
    text: mail.text,
    attachments: papers.map(({ id, kind, revision, code }) => ({
      documentId: id,
      words: `${PAPER_KIND_WORDS[kind]}, revision ${revision}, ${printedCode(code)}`,
    })),
  }
}

async function filterOf({ find, states, before }: MailQuery): Promise<WhereOptions<OutboxMessage>> {
  return {
    ...(states.length === 0 ? {} : { state: states }),
    ...(before === null ? {} : { id: { [Op.lt]: before } }),
    ...(await findFilter(find)),
  }
}

async function findFilter(find: string): Promise<WhereOptions<OutboxMessage>> {
  if (find === '') return {}
  if (!/^\d{4}$/.test(find)) {
    return { toAddress: { [Op.like]: `%${find.replace(/[\\%_]/g, '\\$&')}%` } }
  }
  const consignments = await models.Consignment.findAll({ where: { mark: find }, attributes: ['id'] })
  return { consignmentId: consignments.map(({ id }) => id) }
}

async function marksOf(mails: readonly OutboxMessage[]): Promise<Map<number, string>> {
  const ids = [...new Set(mails.flatMap(({ consignmentId }) => consignmentId ?? []))]
  const rows = await models.Consignment.findAll({ where: { id: ids }, attributes: ['id', 'mark'] })
  return new Map(rows.map(({ id, mark }) => [id, mark]))
}

async function countStates(): Promise<MailLines['counts']> {
  const rows = (await models.OutboxMessage.findAll({
    attributes: ['state', [fn('COUNT', col('id')), 'rows']],
    group: ['state'],
    raw: true,
  })) as unknown as { state: MailState; rows: number }[]
  const counted = new Map(rows.map(({ state, rows: count }) => [state, Number(count)]))
  const counts = { waiting: 0, sending: 0, sent: 0, uncertain: 0, failed: 0 }
  for (const state of MAIL_STATES) counts[state] = counted.get(state) ?? 0
  return counts
}

function mailRow(mail: OutboxMessage, marks: ReadonlyMap<number, string>): MailRow {
  const { consignmentId, state } = mail
  return {
    id: mail.id,
    state,
    at: deskMoment(momentOf(mail)),
    written: deskMoment(mail.createdAt),
    mark: consignmentId === null ? null : (marks.get(consignmentId) ?? null),
    consignmentId,
    to: mail.toAddress,
    subject: mail.subject,
    attempts: mail.attempts,
    lastWord: mail.lastError ?? (state === 'sent' ? 'taken by the server' : ''),
  }
}

function momentOf({ state, sentAt, nextAttemptAt, updatedAt }: OutboxMessage): Date {
  if (state === 'sent') return sentAt ?? updatedAt
  return state === 'waiting' ? nextAttemptAt : updatedAt
}
