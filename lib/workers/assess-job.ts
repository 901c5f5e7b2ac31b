import 'server-only'
import { z } from 'zod'
import { recordAssessment, recordAssessmentFailure } from '@/lib/domain/assessments/record'
import { recordProgress, startAssessment } from '@/lib/domain/assessments/start'
import { isSteadfoldError } from '@/lib/errors'
import type { SteadfoldError } from '@/lib/errors'
import type { Progress } from '@/lib/rules/progress'
import { legWords } from '@/lib/rules/wording'
import type { Scenario } from '@/lib/thermal/scenario'
import type { Assessor } from './assessor'

const payloadSchema = z.object({ assessmentId: z.number().int().positive() })

/** Writing every step down would cost more than the step: progress is stored twice a second at most. */
const PROGRESS_EVERY_MS = 500

/**
 * Runs one queued assessment and records what it found. An engine that cannot follow the plan is recorded as the
 * assessment's failure, for trying again would end the same; anything else is thrown, and tried again.
 */
export async function assessJob(payload: unknown, assessor: Assessor, clock: () => Date): Promise<void> {
  const { assessmentId } = payloadSchema.parse(payload)
  const task = await startAssessment(assessmentId, clock())
  if (task === null) return
  const superseded = new AbortController()
  const progress = throttled((at) => {
    void recordProgress(assessmentId, at).then(
      (running) => running || superseded.abort(),
      // A missed line of progress is no reason to stop.
      () => undefined,
    )
  })
  try {
    const result = await assessor.assess(task.scenario, progress, superseded.signal)
    // The hash the plan was judged under also speaks of names and parties, which the engine never sees.
    await recordAssessment({ assessmentId, result: { ...result, inputHash: task.inputHash } }, clock())
  } catch (error) {
    if (superseded.signal.aborted) return
    if (!isFinal(error)) throw error
    await recordAssessmentFailure({ assessmentId, error: failureOf(error, task.scenario) }, clock())
  }
}

function isFinal(error: unknown): error is SteadfoldError {
  return isSteadfoldError(error) && ['not_converged', 'invalid', 'refused'].includes(error.code)
}

/** The engine names a leg by its id; people know it by its place in the journey. */
function failureOf({ code, message, details }: SteadfoldError, { legs }: Scenario) {
  const { legId, minute } = details
  const place = typeof legId === 'string' ? legWords(legId, legs) : 'a leg'
  return {
    code,
    message:
      code === 'not_converged'
        ? `The simulation does not converge on ${place} at minute ${String(minute)}.`
        : message,
    ...(typeof legId === 'string' && { legId }),
    ...(typeof minute === 'number' && { minute }),
  }
}

function throttled(tell: (progress: Progress) => void): (progress: Progress) => void {
  let told = -Infinity
  return (progress) => {
    const now = performance.now()
    if (now - told < PROGRESS_EVERY_MS && progress.done < progress.total) return
    told = now
    tell(progress)
  }
}
