import 'server-only'
import { SteadfoldError } from '@/lib/errors'
import type { Actor } from '@/lib/policies/actor'
import type { AskChange } from '@/lib/schemas/act'
import { models } from '@/models'
import { act } from '../act'
import type { Done } from '../act'
import { authorize } from '../authorize'
import { findConsignment } from '../consignments/visible'
import { mailChangeAsked } from '../mail/work-mails'

/** A shipper asks the desk for a change: kept with the consignment, and mailed to the desk. */
export function askChange(actor: Actor, input: AskChange, now: Date): Promise<{ requestId: number }> {
  const { consignmentId, requestId, subject, text } = input
  const about = { type: 'consignment', id: consignmentId, consignmentId } as const
  return act(
    { actor, verb: 'consignment.ask-change', requestId, now, about },
    async (tx): Promise<Done<{ requestId: number }>> => {
      const { row, facts } = await findConsignment(actor, consignmentId, { tx, lock: true })
      authorize(actor, 'consignment.ask-change', facts)
      const state = row.inForceState ?? row.state
      if (state === 'delivered' || state === 'stopped' || state === 'cancelled') {
        throw new SteadfoldError('wrong_state', 'This consignment is closed: ring the desk.')
      }
      const revision = row.inForceRevision ?? row.revision
      const asked = await models.ChangeRequest.create(
        { consignmentId, revision, userId: actor.id, subject, text, at: now },
        { transaction: tx },
      )
      const occasion = { now, key: String(asked.id) }
      await mailChangeAsked(tx, row, { ...occasion, askedBy: actor.name, about: subject, text, revision })
      return { result: { requestId: asked.id }, after: { subject, revision } }
    },
  )
}
