import 'server-only'
import type { Transaction } from 'sequelize'
import type { Scenario } from '@/lib/thermal/scenario'
import { models } from '@/models'
import type { Approval } from '@/models'
import { readSnapshot } from '../snapshot'

/**
 * The crate mark each decision was signed under, by approval id: read from the scenario that was signed, because the plan
 * may have given the crate another letter since, or have it no more.
 */
export async function signedMarks(
  approvals: readonly Pick<Approval, 'id' | 'crateRef' | 'assessmentId'>[],
  tx?: Transaction,
): Promise<Map<number, string>> {
  const marks = new Map<number, string>()
  const assessments = await models.Assessment.findAll({
    where: { id: [...new Set(approvals.map(({ assessmentId }) => assessmentId))] },
    attributes: ['id', 'scenarioHash'],
    transaction: tx ?? null,
  })
  for (const { id, scenarioHash } of assessments) {
    const scenario = (await readSnapshot(scenarioHash, tx)) as Pick<Scenario, 'crates'> | null
    for (const approval of approvals.filter(({ assessmentId }) => assessmentId === id)) {
      const crate = scenario?.crates.find((one) => one.id === approval.crateRef)
      marks.set(approval.id, crate?.mark ?? 'a crate set-up')
    }
  }
  return marks
}
