import 'server-only'
import { SteadfoldError } from '@/lib/errors'
import type { Actor } from '@/lib/policies/actor'
import type { ConfirmAir } from '@/lib/schemas/act'
import { CLOSED_STATES } from '@/lib/states/consignment'
import { models } from '@/models'
import { act } from '../act'
import type { Done } from '../act'
import { authorize } from '../authorize'
import { findConsignment } from './visible'

/**
 * The dispatcher has looked again and the typed air of these legs (none named: all) still holds. Only the stamp changes,
 * so nothing that was assessed or signed is touched.
 */
export function confirmAir(actor: Actor, input: ConfirmAir, now: Date): Promise<{ legs: number }> {
  const { consignmentId, requestId, legIds } = input
  const about = { type: 'consignment', id: consignmentId, consignmentId } as const
  return act(
    { actor, verb: 'consignment.confirm-air', requestId, now, about },
    async (tx): Promise<Done<{ legs: number }>> => {
      const { row, facts } = await findConsignment(actor, consignmentId, { tx, lock: true })
      authorize(actor, 'consignment.confirm-air', facts)
      if (CLOSED_STATES.includes(row.state)) {
        throw new SteadfoldError('wrong_state', 'This consignment is closed.')
      }
      const [legs] = await models.Leg.update(
        { airEnteredAt: now, airEnteredBy: actor.id },
        { where: { consignmentId, ...(legIds.length === 0 ? {} : { ref: legIds }) }, transaction: tx },
      )
      return { result: { legs }, after: { legIds } }
    },
  )
}
