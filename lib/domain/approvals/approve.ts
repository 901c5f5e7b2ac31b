import 'server-only'
import type { Transaction } from 'sequelize'
import { SteadfoldError } from '@/lib/errors'
import { crateMark } from '@/lib/planning/crate-mark'
import type { Actor } from '@/lib/policies/actor'
import { can } from '@/lib/policies/can'
import { signedFigures } from '@/lib/rules/effective-verdict'
import type { ApproveCrates } from '@/lib/schemas/approval'
import { approvalStatement } from '@/lib/schemas/approval-statement'
import type { Plan } from '@/lib/schemas/plan'
import type { ConsignmentState } from '@/lib/states/consignment'
import { overrideInFull } from '@/lib/views/override-words'
import { models } from '@/models'
import type { Approval, Consignment } from '@/models'
import { act } from '../act'
import type { Done } from '../act'
import { authorize } from '../authorize'
import { currentAssessment } from '../consignments/current-assessment'
import { move, wrongState } from '../consignments/move'
import { writeEffectiveVerdict } from '../consignments/effective-figures'
import { findConsignment } from '../consignments/visible'
import { chosenCrates, signedOverrides } from './crate-findings'
import type { SignedOverride } from './crate-findings'
import { confirmPassword, registrationOf } from './signer'
import type { Registration } from './signer'
import { signedCrates } from './signed-crates'

export interface SignedApprovals {
  approvalIds: number[]
  /** "approved" once the last crate is signed. */
  state: ConsignmentState
}

/**
 * One signature over one or several crate set-ups. The password is asked again, the registration comes from the checked
 * record, and the plan must be the one the page showed. A breach is overridden by name with a reason, or not at all:
 * critical limits, law and carriers' rules never.
 */
export async function approveCrates(actor: Actor, input: ApproveCrates, now: Date): Promise<SignedApprovals> {
  const { consignmentId, requestId } = input
  // Outside the transaction: checking a password takes time, and a lock must not wait for it.
  if (can(actor, 'approval.approve')) await confirmPassword(actor, input.password, now)
  const about = { type: 'approval', id: null, consignmentId } as const
  return act(
    { actor, verb: 'approval.approve', requestId, now, about },
    async (tx): Promise<Done<SignedApprovals>> => {
      const { row } = await findConsignment(actor, consignmentId, { tx, lock: true })
      authorize(actor, 'approval.approve')
      if (input.overrides.length > 0) authorize(actor, 'approval.override')
      if (row.state !== 'in_review') throw wrongState(row.state, 'approve')
      if (row.planHash !== input.planHash) {
        throw new SteadfoldError(
          'out_of_date',
          'The plan has changed since this page was loaded. Look at it again.',
        )
      }
      const registration = await registrationOf(tx, actor, now)
      const { assessment, findings, plan } = await currentAssessment(tx, row)
      const crates = chosenCrates(plan, input.crateIds)
      const signed = await signedCrates(tx, row)
      const again = crates.find(({ id }) => signed.has(id))
      if (again) throw new SteadfoldError('conflict', `Crate ${again.letter} is signed already.`)
      const overrides = signedOverrides(findings, crates, input.overrides)
      const statement = approvalStatement({
        examined: input.examined,
        crateMarks: crates.map(({ letter }) => crateMark(row.mark, letter)),
        overridden: findings
          .filter((finding) => overrides.some((one) => one.finding === finding))
          .map((finding) => overrideInFull(finding, plan)),
      })

      const approvals: Approval[] = []
      for (const crate of crates) {
        const facts = {
          row,
          assessmentId: assessment.id,
          crateRef: crate.id,
          signerId: actor.id,
          statement,
          now,
        }
        approvals.push(await insertApproval(tx, input, registration, facts))
      }
      await insertOverrides(tx, approvals, overrides)
      await insertConditions(tx, row, plan, approvals, input.conditions, now)
      const all = plan.crates.every(({ id }) => signed.has(id) || input.crateIds.includes(id))
      const state = all ? await move(tx, row, 'approve') : row.state
      await writeEffectiveVerdict(tx, row)
      return {
        result: { approvalIds: approvals.map(({ id }) => id), state },
        subjectId: approvals[0]?.id ?? null,
        after: {
          state,
          crateIds: input.crateIds,
          planHash: row.planHash,
          overrides: overrides.map(({ finding, reason }) => ({ rule: finding.rule, reason })),
        },
      }
    },
  )
}

async function insertApproval(
  tx: Transaction,
  input: ApproveCrates,
  registration: Registration,
  facts: {
    row: Consignment
    assessmentId: number
    crateRef: string
    signerId: number
    statement: string
    now: Date
  },
): Promise<Approval> {
  const { row, assessmentId, crateRef, signerId, statement, now } = facts
  return models.Approval.create(
    {
      consignmentId: row.id,
      revision: row.revision,
      crateRef,
      planHash: input.planHash,
      assessmentId,
      decision: input.conditions.length > 0 ? 'approved_with_conditions' : 'approved',
      conditions: input.conditions,
      earlySigns: (input.earlySigns ?? [])
        .filter(({ crateId }) => crateId === crateRef)
        .map(({ text }) => text),
      examined: input.examined,
      statement,
      signerId,
      ...registration,
      signedAt: now,
      voidedAt: null,
      voidedReason: null,
    },
    { transaction: tx },
  )
}

/** The figures an override was signed for: a later run beyond either ends it. */
async function insertOverrides(
  tx: Transaction,
  approvals: readonly Approval[],
  overrides: readonly SignedOverride[],
) {
  for (const { crateRef, finding, reason } of overrides) {
    const approval = approvals.find((one) => one.crateRef === crateRef)
    if (approval === undefined) continue
    await models.Override.create(
      {
        approvalId: approval.id,
        findingRule: finding.rule,
        animalRef: finding.animalId ?? null,
        legRef: finding.legId ?? null,
        reason,
        ...signedFigures(finding),
      },
      { transaction: tx },
    )
  }
}

async function insertConditions(
  tx: Transaction,
  row: Consignment,
  plan: Plan,
  approvals: readonly Approval[],
  conditions: ApproveCrates['conditions'],
  now: Date,
) {
  const approvalId = approvals[0]?.id ?? null
  await models.Condition.bulkCreate(
    conditions.map((condition) => {
      const leg = plan.legs.find(({ id }) => id === condition.legId)
      return {
        consignmentId: row.id,
        revision: row.revision,
        planHash: row.planHash ?? '',
        origin: 'vet' as const,
        approvalId,
        findingRule: null,
        legRef: condition.legId,
        party: condition.party === '' ? (leg?.partyInCharge ?? '') : condition.party,
        text: condition.text,
        ours: leg?.attended ?? false,
        askedAt: now,
        answer: null,
        answeredBy: null,
        answeredHow: null,
        answeredAt: null,
        recordedBy: null,
        kept: null,
      }
    }),
    { transaction: tx },
  )
}
