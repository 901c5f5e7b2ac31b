import 'server-only'
import type { Actor } from '@/lib/policies/actor'
import type { CancelConsignment } from '@/lib/schemas/act'
import type { ConsignmentState } from '@/lib/states/consignment'
import { SteadfoldError } from '@/lib/errors'
import { act } from '../act'
import type { Done } from '../act'
import { authorize } from '../authorize'
import { voidDocuments } from '../documents/document-state'
import { move } from './move'
import { findConsignment } from './visible'

/** Calls a consignment off before it is under way; papers already out become void. */
export function cancelConsignment(
  actor: Actor,
  input: CancelConsignment,
  now: Date,
): Promise<{ state: ConsignmentState }> {
  const { consignmentId, requestId, reason } = input
  const about = { type: 'consignment', id: consignmentId, consignmentId } as const
  return act(
    { actor, verb: 'consignment.cancel', requestId, now, about },
    async (tx): Promise<Done<{ state: ConsignmentState }>> => {
      const { row, facts } = await findConsignment(actor, consignmentId, { tx, lock: true })
      authorize(actor, 'consignment.cancel', facts)
      if (row.inForceState !== null && row.inForceState !== 'released') {
        throw new SteadfoldError(
          'wrong_state',
          'The animals are on their way: a journey is stopped, not cancelled.',
        )
      }
      const before = { state: row.state, inForceRevision: row.inForceRevision }
      const state = await move(tx, row, 'cancel', {
        inForceRevision: null,
        inForceState: null,
        inForceSnapshotHash: null,
      })
      await voidDocuments(tx, row.id, { at: now, reason: `Cancelled: ${reason}` })
      return { result: { state }, before, after: { state }, note: reason }
    },
  )
}
