import 'server-only'
import type { Transaction } from 'sequelize'
import { SteadfoldError } from '@/lib/errors'
import { isOverridable } from '@/lib/rules/effective-verdict'
import type { Finding } from '@/lib/rules/result'
import type { Plan } from '@/lib/schemas/plan'
import { models } from '@/models'
import type { Assessment, Consignment } from '@/models'
import { planningKnowledge } from '../catalogue/knowledge'
import { judgePlan } from './judge-plan'
import { readPlan } from './read-plan'

export interface CurrentAssessment {
  assessment: Assessment
  findings: Finding[]
  plan: Plan
}

/**
 * The finished assessment of the working plan, checked against the plan, the species rows and the versions of now. Throws
 * `out_of_date` where any of them has moved on, `wrong_state` where there is none.
 */
export async function currentAssessment(tx: Transaction, row: Consignment): Promise<CurrentAssessment> {
  const { assessment, plan } = await latestAssessment(tx, row)
  if (assessment.status !== 'done') {
    throw new SteadfoldError('wrong_state', 'The assessment of this plan is not finished.')
  }
  const judged = judgePlan(plan, row.mark, await planningKnowledge(plan, tx))
  if (row.outOfDate || !judged.assessable || judged.inputHash !== assessment.inputHash) {
    throw new SteadfoldError('out_of_date', 'The assessment is out of date: assess the plan again.')
  }
  const findings = await findingsOf(assessment.id, tx)
  return { assessment, findings, plan }
}

/** The newest assessment asked for on the working plan, whether or not it still speaks of it. */
export async function latestAssessment(
  tx: Transaction,
  row: Consignment,
): Promise<Omit<CurrentAssessment, 'findings'>> {
  const assessment =
    row.assessmentId === null ? null : await models.Assessment.findByPk(row.assessmentId, { transaction: tx })
  if (assessment === null) throw new SteadfoldError('wrong_state', 'This plan has not been assessed.')
  return { assessment, plan: await readPlan(row, tx) }
}

/** The findings of an assessment in their order: an override or a verdict names one by its place. */
export async function findingsOf(assessmentId: number, tx?: Transaction): Promise<Finding[]> {
  const rows = await models.Finding.findAll({
    where: { assessmentId },
    order: ['ordinal'],
    transaction: tx ?? null,
  })
  return rows.map(({ body }) => body)
}

/** Breaches nobody may approve or release: law, a carrier's rule, a critical limit, and whatever the rules hold absolute. */
export function absoluteBreaches(findings: readonly Finding[]): Finding[] {
  return findings.filter(isAbsolute)
}

export function isAbsolute(finding: Finding): boolean {
  return finding.status === 'breach' && !isOverridable(finding)
}
