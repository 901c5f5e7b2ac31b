import 'server-only'
import { isDuplicate, transaction } from '@/lib/db/transaction'
import { SteadfoldError, isSteadfoldError } from '@/lib/errors'
import type { Actor } from '@/lib/policies/actor'
import { runEntrySchema } from '@/lib/schemas/run-entry'
import type { RunEntry, StoreEntries } from '@/lib/schemas/run-entry'
import { models } from '@/models'
import { record } from '../audit/record'
import { authorize } from '../authorize'
import { planInForce } from '../consignments/plan-in-force'
import type { ReleasedPlan } from '../consignments/plan-in-force'
import { findConsignment } from '../consignments/visible'

/** What became of a device's queue. What is in neither list is to be sent again. */
export interface StoredEntries {
  stored: string[]
  refused: { clientId: string; message: string }[]
}

/**
 * Stores what a driver wrote down on own legs, oldest first, one by one: an entry sent twice is stored once, and one that
 * can never be stored says why without holding up the rest.
 */
export async function storeEntries(actor: Actor, input: StoreEntries, now: Date): Promise<StoredEntries> {
  const { row } = await findConsignment(actor, input.consignmentId)
  const released = await planInForce(row)
  if (released === null)
    throw new SteadfoldError('wrong_state', 'No revision of this consignment is released.')
  const answer: StoredEntries = { stored: [], refused: [] }
  for (const sent of input.entries) {
    const clientId = clientIdOf(sent)
    const parsed = runEntrySchema.safeParse(sent)
    if (!parsed.success) {
      answer.refused.push({
        clientId,
        message: parsed.error.issues[0]?.message ?? 'This entry cannot be read.',
      })
      continue
    }
    const trouble = await store(actor, row.id, released, parsed.data, now)
    if (trouble === null) answer.stored.push(clientId)
    else answer.refused.push({ clientId, message: trouble })
  }
  return answer
}

async function store(
  actor: Actor,
  consignmentId: number,
  released: ReleasedPlan,
  entry: RunEntry,
  now: Date,
): Promise<string | null> {
  try {
    const leg = released.plan.legs.find(({ id }) => id === entry.legId)
    if (entry.legId !== null && leg === undefined) return 'This leg is not in the revision in force.'
    const driverId = leg === undefined ? (drivesAny(released, actor) ? actor.id : null) : leg.driverId
    authorize(actor, entry.kind === 'handover' ? 'run.hand-over' : 'run.enter', { driverId })
    await insert(actor, consignmentId, released.revision, entry, now)
    return null
  } catch (error) {
    if (isDuplicate(error))
      return (await isOwn(actor, consignmentId, entry)) ? null : 'This entry’s number is taken.'
    if (isSteadfoldError(error)) return error.message
    throw error
  }
}

function insert(actor: Actor, consignmentId: number, revision: number, entry: RunEntry, now: Date) {
  return transaction(async (tx) => {
    const { clientId, legId, atMs, ...rest } = entry
    await models.ChecklistEntry.create(
      {
        ...rest,
        clientId,
        consignmentId,
        revision,
        legRef: legId,
        at: new Date(atMs),
        userId: actor.id,
        receivedAt: now,
      },
      { transaction: tx },
    )
    await record(tx, {
      actor,
      verb: entry.kind === 'handover' ? 'run.hand-over' : 'run.enter',
      at: now,
      subject: { type: 'run', id: consignmentId },
      consignmentId,
      requestId: clientId,
      after: { kind: entry.kind, itemKey: entry.itemKey, legId, at: new Date(atMs).toISOString() },
    })
  })
}

/** The number was stored before: by this very person for this consignment, or by somebody else. */
async function isOwn(actor: Actor, consignmentId: number, { clientId }: RunEntry): Promise<boolean> {
  const stored = await models.ChecklistEntry.findOne({ where: { clientId } })
  return stored?.userId === actor.id && stored.consignmentId === consignmentId
}

function drivesAny({ plan }: ReleasedPlan, actor: Actor): boolean {
  return plan.legs.some(({ driverId }) => driverId === actor.id)
}

function clientIdOf(sent: unknown): string {
  if (typeof sent !== 'object' || sent === null || !('clientId' in sent)) return ''
  return typeof sent.clientId === 'string' ? sent.clientId : ''
}
