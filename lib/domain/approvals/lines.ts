import 'server-only'
import type { ApprovalLine } from '@/lib/views/desk-page'
import { models } from '@/models'
import type { Approval, Consignment } from '@/models'
import { deskMoment } from '../firm'
import { signedMarks } from './signed-marks'

/** Every decision of a vet on this consignment, newest first, with what became of it and why. */
export async function approvalLines(row: Consignment): Promise<ApprovalLine[]> {
  const approvals = await models.Approval.findAll({
    where: { consignmentId: row.id },
    order: [['id', 'DESC']],
  })
  const marks = await signedMarks(approvals)
  return approvals.map((approval) => ({
    approvalId: approval.id,
    revision: approval.revision,
    crateMark: marks.get(approval.id) ?? '',
    decision: approval.decision,
    signerName: approval.signerName,
    registration: `${approval.registrationNumber}, ${approval.registrationCountry}`,
    signedAt: deskMoment(approval.signedAt),
    examined: approval.examined,
    statement: approval.statement,
    reasons: approval.reasons,
    conditions: approval.conditions.map(({ text }) => text),
    stands:
      approval.voidedAt === null && approval.decision !== 'returned' && approval.planHash === row.planHash,
    voided: voidedOf(approval),
  }))
}

function voidedOf({ voidedAt, voidedReason, withdrawn }: Approval): ApprovalLine['voided'] {
  return voidedAt === null ? null : { at: deskMoment(voidedAt), reason: voidedReason ?? '', withdrawn }
}
