import 'server-only'
import { Op } from 'sequelize'
import type { Transaction } from 'sequelize'
import { models } from '@/models'
import type { Approval, Consignment } from '@/models'
import { mailApprovalsVoid } from '../mail/work-mails'
import { signedMarks } from './signed-marks'

/** What ended an approval, as its row and its mails say it. */
export interface Ending {
  at: Date
  /** The id of the request or run that ended it: the mails' own key. */
  key: string
  /** Stands on the approval: "The plan was changed after it was signed." */
  voidedReason: string
  /** Goes on a sentence of the mail: "Isla Quennell changed the plan" */
  because: string
  /** A vet's own words, where a vet took it back. */
  withdrawn?: { byId: number; reason: string }
}

/** Ends approvals that stand, and tells their vets and the desk by mail. */
export async function voidApprovals(
  tx: Transaction,
  row: Consignment,
  approvals: readonly Approval[],
  { at, key, voidedReason, because, withdrawn }: Ending,
): Promise<void> {
  await models.Approval.update(
    { voidedAt: at, voidedReason: voidedReason.slice(0, 500), withdrawn: withdrawn !== undefined },
    { where: { id: approvals.map(({ id }) => id), voidedAt: null }, transaction: tx },
  )
  const marks = await signedMarks(approvals, tx)
  const ended = approvals.map(({ id, signerId }) => ({ signerId, crateMark: marks.get(id) ?? '' }))
  const reason = withdrawn?.reason ?? ''
  await mailApprovalsVoid(tx, row, ended, { now: at, key, because, reason, byId: withdrawn?.byId ?? null })
}

/** The approvals of the working revision that stand, whatever plan they were signed for. */
export function standingApprovals(tx: Transaction, { id, revision }: Consignment): Promise<Approval[]> {
  return models.Approval.findAll({
    where: { consignmentId: id, revision, voidedAt: null, decision: { [Op.ne]: 'returned' } },
    order: ['id'],
    transaction: tx,
  })
}
