import 'server-only'
import { SteadfoldError } from '@/lib/errors'
import type { Actor } from '@/lib/policies/actor'
import type { ReviewView, SignerView } from '@/lib/views/review'
import { buildReviewView } from '@/lib/views/review-view/build-review-view'
import type { DecisionFact } from '@/lib/views/review-view/build-review-view'
import { dayDateYear } from '@/lib/views/format'
import { models } from '@/models'
import type { Approval } from '@/models'
import { authorize } from '../authorize'
import { sheetFacts } from '../consignments/sheet-facts'
import { findConsignment } from '../consignments/visible'
import { FIRM_ZONE } from '../firm'
import { signedMarks } from './signed-marks'
import { registrationTrouble } from './signer'

/** One crate set-up under review, with the pictures, the findings and everything signed before. */
export async function loadReview(
  actor: Actor,
  { consignmentId, crateId }: { consignmentId: number; crateId: string | null },
  now: Date,
): Promise<ReviewView> {
  authorize(actor, 'approval.queue')
  const { row } = await findConsignment(actor, consignmentId)
  const approvals = await models.Approval.findAll({ where: { consignmentId }, order: ['id'] })
  const marks = await signedMarks(approvals)
  const view = buildReviewView({
    sheet: await sheetFacts(row, { which: 'working', tracks: true, now }),
    chosenCrateId: crateId,
    signer: await signerView(actor, now),
    decisions: approvals.map((approval) => decisionFact(approval, marks.get(approval.id) ?? '')),
    travelling: row.inForceState !== null && row.inForceState !== 'released',
  })
  if (view === null) throw new SteadfoldError('not_found', 'This consignment has no crate.')
  return view
}

async function signerView(actor: Actor, now: Date): Promise<SignerView> {
  const user = await models.User.findByPk(actor.id)
  if (user === null) throw new SteadfoldError('not_allowed', 'You may not do this.')
  const checker =
    user.registrationCheckedBy === null
      ? null
      : await models.User.findByPk(user.registrationCheckedBy, { attributes: ['name'] })
  const checkedAt = user.registrationCheckedAt
  return {
    name: user.name,
    registration: user.registrationNumber ?? '',
    country: user.registrationCountry ?? '',
    expiresOn: user.registrationExpiresOn ?? '',
    checkedWords:
      checkedAt === null
        ? ''
        : `checked by ${checker?.name ?? 'an admin'}, ${dayDateYear(checkedAt.getTime(), FIRM_ZONE)}`,
    cannot: registrationTrouble(user, now) ?? '',
  }
}

function decisionFact(approval: Approval, crateMark: string): DecisionFact {
  return {
    approvalId: approval.id,
    revision: approval.revision,
    crateId: approval.crateRef,
    crateMark,
    decision: approval.decision,
    statement: approval.statement,
    reasons: approval.reasons,
    examined: approval.examined,
    signerName: approval.signerName,
    registrationNumber: approval.registrationNumber,
    registrationCountry: approval.registrationCountry,
    registrationExpiresOn: approval.registrationExpiresOn,
    signedAtMs: approval.signedAt.getTime(),
    voidedAtMs: approval.voidedAt?.getTime() ?? null,
    voidedReason: approval.voidedReason ?? '',
    withdrawn: approval.withdrawn,
    conditionCount: approval.conditions.length,
    earlySigns: approval.earlySigns,
  }
}
