import 'server-only'
import type { Transaction } from 'sequelize'
import { isDuplicate, transaction } from '@/lib/db/transaction'
import { SteadfoldError, isSteadfoldError } from '@/lib/errors'
import type { ErrorCode } from '@/lib/errors'
import type { Actor } from '@/lib/policies/actor'
import type { Verb } from '@/lib/policies/can'
import { models } from '@/models'
import { record } from './audit/record'
import type { Happening } from './audit/record'

export interface Deed {
  actor: Actor
  verb: Verb
  requestId: string
  now: Date
  /** What it is about, as far as known before anything is loaded; for the trail of refusals. */
  about: { type: Happening['subject']['type']; id: number | null; consignmentId?: number }
}

/** What a verb did: its answer, and the line for the audit trail. */
export interface Done<T> {
  result: T
  subjectId?: number | string | null
  consignmentId?: number | null
  before?: Record<string, unknown>
  after?: Record<string, unknown>
  note?: string
}

/**
 * Runs one verb as one transaction with its audit line. The same request id does it once: a second press gets the first
 * answer, whether it comes later or at the same moment (the unique key of the trail lets one of two win). What is refused
 * for want of permission leaves a line too. `work` may run again after a deadlock, so it touches nothing but the database.
 */
export async function act<T>(deed: Deed, work: (tx: Transaction) => Promise<Done<T>>): Promise<T> {
  const earlier = await earlierAnswer<T>(deed)
  if (earlier) return earlier.result
  try {
    return await transaction(async (tx) => {
      const done = await work(tx)
      await record(tx, lineOf(deed, done))
      return done.result
    })
  } catch (error) {
    // Of two presses at one moment the second waits, and then finds the deed done: it gets the answer of the first.
    if (isDuplicate(error) || isSteadfoldError(error)) {
      const first = await earlierAnswer<T>(deed)
      if (first) return first.result
    }
    if (isSteadfoldError(error) && REFUSALS.includes(error.code)) await recordRefusal(deed, error)
    throw error
  }
}

const REFUSALS: readonly ErrorCode[] = ['not_allowed', 'not_found', 'refused']

function lineOf<T>(deed: Deed, done: Done<T>): Happening {
  return {
    actor: deed.actor,
    verb: deed.verb,
    at: deed.now,
    requestId: deed.requestId,
    subject: { type: deed.about.type, id: done.subjectId ?? deed.about.id },
    consignmentId: done.consignmentId ?? deed.about.consignmentId ?? null,
    before: done.before ?? null,
    after: { ...done.after, answer: done.result ?? null },
    note: done.note ?? '',
  }
}

async function earlierAnswer<T>({ actor, verb, requestId }: Deed): Promise<{ result: T } | null> {
  const line = await models.AuditEvent.findOne({ where: { requestId, verb } })
  if (line === null) return null
  // A request id is minted by one page for one person: in other hands it is a forgery or a fault.
  if (line.actorId !== actor.id)
    throw new SteadfoldError('invalid', 'This page is out of step: load it again.')
  return { result: line.after?.['answer'] as T }
}

/** A consignment the actor may not see is told as not found, so the trail keeps what was asked for in words alone. */
async function recordRefusal(deed: Deed, error: SteadfoldError) {
  await record(null, {
    actor: deed.actor,
    verb: `${deed.verb}.refused`,
    at: deed.now,
    subject: { type: deed.about.type, id: deed.about.id },
    note: `${error.code}: ${error.message}`,
  })
}
