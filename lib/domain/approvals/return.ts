import 'server-only'
import { crateMark } from '@/lib/planning/crate-mark'
import type { Actor } from '@/lib/policies/actor'
import type { ReturnCrates } from '@/lib/schemas/approval'
import type { ConsignmentState } from '@/lib/states/consignment'
import { models } from '@/models'
import { act } from '../act'
import type { Done } from '../act'
import { authorize } from '../authorize'
import { latestAssessment } from '../consignments/current-assessment'
import { move } from '../consignments/move'
import { findConsignment } from '../consignments/visible'
import { mailReturned } from '../mail/work-mails'
import { chosenCrates } from './crate-findings'
import { registrationOf } from './signer'

/**
 * The vet sends crate set-ups back to the desk with the reason, which the desk gets by mail too. One returned crate returns
 * the consignment.
 */
export function returnCrates(
  actor: Actor,
  input: ReturnCrates,
  now: Date,
): Promise<{ state: ConsignmentState }> {
  const { consignmentId, requestId, reason } = input
  const about = { type: 'approval', id: null, consignmentId } as const
  return act(
    { actor, verb: 'approval.return', requestId, now, about },
    async (tx): Promise<Done<{ state: ConsignmentState }>> => {
      const { row } = await findConsignment(actor, consignmentId, { tx, lock: true })
      authorize(actor, 'approval.return')
      const state = await move(tx, row, 'return')
      const registration = await registrationOf(tx, actor, now)
      const { assessment, plan } = await latestAssessment(tx, row)
      const crates = chosenCrates(plan, input.crateIds)
      for (const crate of crates) {
        await models.Approval.create(
          {
            consignmentId,
            revision: row.revision,
            crateRef: crate.id,
            planHash: row.planHash ?? '',
            assessmentId: assessment.id,
            decision: 'returned',
            conditions: [],
            reasons: reason,
            examined: false,
            statement: '',
            signerId: actor.id,
            ...registration,
            signedAt: now,
            voidedAt: null,
            voidedReason: null,
          },
          { transaction: tx },
        )
      }
      const crateMarks = crates.map(({ letter }) => crateMark(row.mark, letter))
      await mailReturned(tx, row, { now, key: requestId, by: actor.name, crateMarks, reason })
      return { result: { state }, after: { state, crateIds: input.crateIds }, note: reason }
    },
  )
}
