import 'server-only'
import type { Transaction } from 'sequelize'
import { SteadfoldError } from '@/lib/errors'
import type { Actor } from '@/lib/policies/actor'
import type { WithdrawApproval } from '@/lib/schemas/approval'
import { nextState } from '@/lib/states/consignment'
import type { ConsignmentState } from '@/lib/states/consignment'
import { models } from '@/models'
import type { Approval, Consignment } from '@/models'
import { act } from '../act'
import type { Done } from '../act'
import { authorize } from '../authorize'
import { writeEffectiveVerdict } from '../consignments/effective-figures'
import { move } from '../consignments/move'
import { findConsignment } from '../consignments/visible'
import { writeRow } from '../consignments/write-row'
import { voidDocuments } from '../documents/document-state'
import { voidApprovals } from './void'

/**
 * A vet takes an approval back before the journey starts: the manifest that rests on it is void, and the consignment goes
 * back to the desk, which gets a mail.
 */
export async function withdrawApproval(
  actor: Actor,
  input: WithdrawApproval,
  now: Date,
): Promise<{ state: ConsignmentState }> {
  const { approvalId, requestId, reason } = input
  const about = { type: 'approval', id: approvalId } as const
  return act(
    { actor, verb: 'approval.withdraw', requestId, now, about },
    async (tx): Promise<Done<{ state: ConsignmentState }>> => {
      authorize(actor, 'approval.withdraw')
      const approval = await models.Approval.findByPk(approvalId, { transaction: tx })
      if (approval === null || approval.decision === 'returned') {
        throw new SteadfoldError('not_found', 'There is no such approval.')
      }
      const { row } = await findConsignment(actor, approval.consignmentId, { tx, lock: true })
      await approval.reload({ transaction: tx })
      if (approval.voidedAt !== null)
        throw new SteadfoldError('wrong_state', 'This approval is void already.')
      if (row.inForceState !== null && row.inForceState !== 'released') {
        throw new SteadfoldError(
          'wrong_state',
          'The journey has started: an approval can no longer be withdrawn.',
        )
      }
      await voidApprovals(tx, row, [approval], {
        at: now,
        key: requestId,
        voidedReason: reason,
        because: `${actor.name} withdrew it`,
        withdrawn: { byId: actor.id, reason },
      })
      const before = { state: row.state, inForceRevision: row.inForceRevision }
      const state = await takeBack(tx, row, approval, { at: now, reason: `Approval withdrawn: ${reason}` })
      await writeEffectiveVerdict(tx, row)
      return {
        result: { state },
        consignmentId: row.id,
        before,
        after: { state, crateRef: approval.crateRef, planHash: approval.planHash },
        note: reason,
      }
    },
  )
}

async function takeBack(
  tx: Transaction,
  row: Consignment,
  approval: Approval,
  why: { at: Date; reason: string },
): Promise<ConsignmentState> {
  // The revision in force may rest on this signature while the next one is being worked on.
  const inForceFalls = row.inForceRevision !== null && (await restsOn(tx, row, approval))
  if (inForceFalls) await voidDocuments(tx, row.id, why)
  const none = inForceFalls ? { inForceRevision: null, inForceState: null, inForceSnapshotHash: null } : {}
  const own = approval.planHash === row.planHash
  if (own && nextState(row.state, 'withdraw') !== undefined) return move(tx, row, 'withdraw', none)
  if (inForceFalls) await writeRow(tx, row, none)
  return row.state
}

/** Papers in force carry the plan hash they were issued for. */
async function restsOn(tx: Transaction, row: Consignment, approval: Approval): Promise<boolean> {
  const paper = await models.Document.findOne({
    where: { consignmentId: row.id, revision: row.inForceRevision ?? 0, planHash: approval.planHash },
    attributes: ['id'],
    transaction: tx,
  })
  return paper !== null || (row.inForceRevision === row.revision && approval.planHash === row.planHash)
}
