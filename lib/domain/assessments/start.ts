import 'server-only'
import type { Scenario } from '@/lib/thermal/scenario'
import type { Progress } from '@/lib/rules/progress'
import { SteadfoldError } from '@/lib/errors'
import { models } from '@/models'
import { readSnapshot } from '../snapshot'

/** What the worker runs. */
export interface AssessmentTask {
  assessmentId: number
  consignmentId: number
  inputHash: string
  scenario: Scenario
}

/**
 * Takes an assessment up: marks it running and gives its scenario, exactly as it was kept. Null where it is done, failed
 * or superseded by a later save: there is nothing left to do. A worker that died leaves it running, and the next may take
 * it up again.
 */
export async function startAssessment(assessmentId: number, now: Date): Promise<AssessmentTask | null> {
  const [count] = await models.Assessment.update(
    { status: 'running', startedAt: now, stage: 'Starting', doneCount: 0, totalCount: 0 },
    { where: { id: assessmentId, status: ['queued', 'running'] } },
  )
  if (count === 0) return null
  const row = await models.Assessment.findByPk(assessmentId)
  if (row === null) return null
  const scenario = await readSnapshot(row.scenarioHash)
  if (scenario === null)
    throw new SteadfoldError('unavailable', 'The scenario of this assessment is missing.')
  // Kept by us in its final form under its own hash: what is read back is what was parsed then.
  return {
    assessmentId,
    consignmentId: row.consignmentId,
    inputHash: row.inputHash,
    scenario: scenario as Scenario,
  }
}

/** How far the run is, for whoever waits. False: it was superseded meanwhile, so stop. */
export async function recordProgress(assessmentId: number, progress: Progress): Promise<boolean> {
  const [count] = await models.Assessment.update(
    { stage: progress.stage.slice(0, 60), doneCount: progress.done, totalCount: progress.total },
    { where: { id: assessmentId, status: 'running' } },
  )
  return count === 1
}
