import 'server-only'
import type { CreationAttributes, Transaction } from 'sequelize'
import { conditionsOf } from '@/lib/rules/conditions'
import type { Assessment } from '@/lib/rules/result'
import type { Plan } from '@/lib/schemas/plan'
import type { Scenario } from '@/lib/thermal/scenario'
import { models } from '@/models'
import type { Condition, Consignment } from '@/models'
import { signedCrates } from '../approvals/signed-crates'

/**
 * Writes down what the assessment asks of whom, leg by leg. What was asked already for this very plan keeps its answer: a
 * second run of the same plan asks nobody twice.
 */
export async function writeConditions(
  tx: Transaction,
  row: Consignment,
  { plan, scenario, result }: { plan: Plan; scenario: Scenario; result: Assessment },
  now: Date,
): Promise<void> {
  const planHash = row.planHash ?? ''
  const parties = Object.fromEntries(plan.legs.map(({ id, partyInCharge }) => [id, partyInCharge]))
  const asked = await models.Condition.findAll({
    where: { consignmentId: row.id, planHash },
    transaction: tx,
  })
  const known = new Set(asked.map((condition) => keyOf(condition)))
  const derived = conditionsOf(result, scenario, parties).flatMap((condition) => {
    const legs = condition.legIds.length === 0 ? [null] : condition.legIds
    return legs.map((legRef): CreationAttributes<Condition> => ({
      consignmentId: row.id,
      revision: row.revision,
      planHash,
      origin: condition.origin,
      approvalId: null,
      findingRule: condition.rules[0] ?? null,
      legRef,
      party: condition.party.slice(0, 120),
      text: condition.text.slice(0, 500),
      ours: condition.askedOf === 'ours',
      askedAt: now,
      answer: null,
      answeredBy: null,
      answeredHow: null,
      answeredAt: null,
      recordedBy: null,
      kept: null,
    }))
  })
  await models.Condition.bulkCreate(
    derived.filter((condition) => !known.has(keyOf(condition))),
    { transaction: tx },
  )
}

function keyOf({ text, legRef, party }: { text: string; legRef?: string | null; party: string }): string {
  return JSON.stringify([text, legRef ?? null, party])
}

/** A condition that counts for the working plan, with the crates it is about; null: all of them. */
export interface StandingCondition {
  row: Condition
  crateRefs: string[] | null
}

/** The conditions of the working plan. A vet's count only while an approval that put them stands. */
export async function standingConditions(
  tx: Transaction | undefined,
  row: Pick<Consignment, 'id' | 'planHash'>,
): Promise<StandingCondition[]> {
  if (row.planHash === null) return []
  const approvals = [...(await signedCrates(tx, row)).values()]
  const rows = await models.Condition.findAll({
    where: { consignmentId: row.id, planHash: row.planHash },
    order: ['id'],
    transaction: tx ?? null,
  })
  return rows.flatMap((condition): StandingCondition[] => {
    if (condition.origin !== 'vet') return [{ row: condition, crateRefs: null }]
    const crateRefs = approvals
      .filter(({ conditions }) =>
        conditions.some(({ text, legId }) => text === condition.text && legId === condition.legRef),
      )
      .map(({ crateRef }) => crateRef)
    return crateRefs.length === 0 ? [] : [{ row: condition, crateRefs }]
  })
}

/** Conditions that hold release: asked of somebody outside the firm and not confirmed. */
export function holdsRelease({ row }: StandingCondition): boolean {
  return !row.ours && row.answer !== 'confirmed'
}
