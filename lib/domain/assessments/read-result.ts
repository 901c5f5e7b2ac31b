import 'server-only'
import type { Transaction } from 'sequelize'
import type { Assessment } from '@/lib/rules/result'
import type { Assessment as AssessmentRow } from '@/models'
import { readSnapshot } from '../snapshot'
import type { Tracks } from './tracks'

/** Everything an assessment found but its long tracks. */
export type AssessmentResult = Omit<Assessment, keyof Tracks>

/** The stored result of a finished assessment, or null while it has none. */
export async function readResult(
  { resultHash }: Pick<AssessmentRow, 'resultHash'>,
  tx?: Transaction,
): Promise<AssessmentResult | null> {
  if (resultHash === null) return null
  // Kept by us under its own hash: its bytes are checked, its shape is the one recordAssessment gave it.
  return (await readSnapshot(resultHash, tx)) as AssessmentResult | null
}
