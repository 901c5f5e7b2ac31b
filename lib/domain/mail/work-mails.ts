import 'server-only'
import type { Transaction } from 'sequelize'
import { env } from '@/lib/env'
import type { WrittenLetter } from '@/lib/mail/letters/letter'
import {
  approvalVoidedLetter,
  changeAskedLetter,
  returnedLetter,
  submittedLetter,
} from '@/lib/mail/letters/work-letters'
import { enqueue } from '@/lib/mail/outbox'
import type { Role } from '@/lib/policies/actor'
import { models } from '@/models'
import type { Consignment, User } from '@/models'
import { FIRM_ZONE, deskMoment, firm } from '../firm'

/*
 * Letters that move work on. Each is put in the outbox inside the transaction of the verb that decided it: one row for
 * each reader, under a key made from what was asked, so that a second press writes none again.
 */

/** When it happened, and what makes its mails its own: the id of the request, or of the run. */
export interface Occasion {
  now: Date
  key: string
}

/** To every vet with an account: a plan waits for review. */
export async function mailSubmitted(
  tx: Transaction,
  row: Consignment,
  { now, key, by }: Occasion & { by: string },
): Promise<void> {
  const leaves = row.departsAt && { ms: row.departsAt.getTime(), zone: row.departsZone ?? FIRM_ZONE }
  const letter = submittedLetter({ ...workOf(row, `/review/${row.id}`), submittedBy: by, leaves })
  await post(tx, row, await enabled(tx, 'vet'), letter, { now, key: `submitted:${key}` })
}

/** To the desk: a vet has sent crate set-ups back. */
export async function mailReturned(
  tx: Transaction,
  row: Consignment,
  { now, key, by, crateMarks, reason }: Occasion & { by: string; crateMarks: string[]; reason: string },
): Promise<void> {
  const work = workOf(row, `/consignments/${row.id}/plan`)
  const letter = returnedLetter({ ...work, returnedBy: by, crateMarks, reason })
  await post(tx, row, await deskOf(tx, row), letter, { now, key: `returned:${key}` })
}

export interface Ended {
  signerId: number
  crateMark: string
}

/** To each vet whose approval ended, of that vet's crates, and to the desk, of all of them. */
export async function mailApprovalsVoid(
  tx: Transaction,
  row: Consignment,
  ended: readonly Ended[],
  { now, key, because, reason, byId }: Occasion & { because: string; reason: string; byId: number | null },
): Promise<void> {
  if (ended.length === 0) return
  const occasion = { now, key: `approval-void:${key}` }
  const letter = (some: readonly Ended[]) =>
    approvalVoidedLetter({
      ...workOf(row, `/consignments/${row.id}`),
      crateMarks: some.map(({ crateMark }) => crateMark),
      because,
      reason,
      voidedAt: deskMoment(now),
    })
  // Whoever took an own signature back need not be told of it.
  const signerIds = [...new Set(ended.map(({ signerId }) => signerId))].filter((id) => id !== byId)
  const signers = await models.User.findAll({
    where: { id: signerIds, disabledAt: null },
    order: ['id'],
    transaction: tx,
  })
  for (const signer of signers) {
    const own = ended.filter(({ signerId }) => signerId === signer.id)
    await post(tx, row, [signer], letter(own), occasion)
  }
  await post(tx, row, await deskOf(tx, row), letter(ended), occasion)
}

/** To the desk's own address: the shipper asks for a change. */
export async function mailChangeAsked(
  tx: Transaction,
  row: Consignment,
  { now, key, ...asked }: Occasion & { askedBy: string; about: string; text: string; revision: number },
): Promise<void> {
  const letter = changeAskedLetter({ ...workOf(row, `/consignments/${row.id}`), ...asked })
  await post(tx, row, [DESK], letter, { now, key: `change-request:${key}` })
}

type Reader = Pick<User, 'id' | 'email'> | typeof DESK
const DESK = 'desk'

async function post(
  tx: Transaction,
  { id }: Consignment,
  readers: readonly Reader[],
  letter: WrittenLetter,
  { now, key }: Occasion,
): Promise<void> {
  for (const reader of readers) {
    const [to, who] = reader === DESK ? [deskAddress(), DESK] : [reader.email, reader.id]
    await enqueue(tx, { to, ...letter, consignmentId: id, dedupeKey: `${key}:${who}` }, now)
  }
}

/** Whoever sent it for review; every dispatcher where that is unknown or has left; the desk's address where there is none. */
async function deskOf(tx: Transaction, row: Consignment): Promise<Reader[]> {
  const dispatchers = await enabled(tx, 'dispatcher')
  const sent = await models.AuditEvent.findOne({
    where: { consignmentId: row.id, verb: 'consignment.submit' },
    attributes: ['actorId'],
    order: [['id', 'DESC']],
    transaction: tx,
  })
  const sender = dispatchers.filter(({ id }) => id === sent?.actorId)
  if (sender.length > 0) return sender
  return dispatchers.length > 0 ? dispatchers : [DESK]
}

function enabled(tx: Transaction, role: Role): Promise<User[]> {
  return models.User.findAll({ where: { role, disabledAt: null }, order: ['id'], transaction: tx })
}

function workOf(row: Consignment, path: string) {
  const { mark, revision, fromPlaceName, toPlaceName, animalsSummary } = row
  const journey = [`${fromPlaceName ?? ''} to ${toPlaceName ?? ''}`, animalsSummary]
    .filter(Boolean)
    .join(', ')
  const { name, town } = firm()
  return {
    mark,
    revision,
    journey,
    firm: [name, town].filter(Boolean).join(', '),
    url: `${env().appUrl}${path}`,
  }
}

/** The desk reads the address that mails come from. */
function deskAddress(): string {
  const { mailFrom } = env()
  return /<([^>]+)>/.exec(mailFrom)?.[1] ?? mailFrom
}
