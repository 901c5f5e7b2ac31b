import 'server-only'
import type { Transaction } from 'sequelize'
import { cameOutWorse } from '@/lib/rules/came-out-worse'
import type { Outcome } from '@/lib/rules/came-out-worse'
import type { Plan } from '@/lib/schemas/plan'
import { models } from '@/models'
import type { Approval, Consignment } from '@/models'
import { readResult } from '../assessments/read-result'
import { overridesOf } from '../consignments/effective-figures'
import { signedCrates } from './signed-crates'
import { voidApprovals } from './void'

/**
 * After the same plan was run again with other species rows, weather or rules: ends every approval whose crate set-up came
 * out worse than what was signed. One that came out no worse goes on standing. True where any was ended.
 */
export async function voidWorsened(
  tx: Transaction,
  row: Consignment,
  later: { plan: Plan; assessmentId: number; result: Outcome },
  now: Date,
): Promise<boolean> {
  const worse: Approval[] = []
  for (const [crateId, approval] of await signedCrates(tx, row)) {
    if (approval.assessmentId === later.assessmentId) continue
    const occupants = later.plan.crates.find(({ id }) => id === crateId)?.occupants ?? []
    const signed = await resultOf(tx, approval)
    const crate = { crateId, occupants, overrides: overridesOf(approval) }
    if (signed === null || cameOutWorse(crate, signed, later.result)) worse.push(approval)
  }
  if (worse.length === 0) return false
  await voidApprovals(tx, row, worse, {
    at: now,
    key: `assessment-${later.assessmentId}`,
    voidedReason: 'The plan was assessed again and came out worse than what was signed.',
    because: 'the plan was assessed again and came out worse than what was signed',
  })
  return true
}

async function resultOf(tx: Transaction, { assessmentId }: Approval) {
  const assessment = await models.Assessment.findByPk(assessmentId, { transaction: tx })
  return assessment && readResult(assessment, tx)
}
