import type { MessagePort } from 'node:worker_threads'
import type { ErrorCode } from '@/lib/errors'
import { isSteadfoldError } from '@/lib/errors'
import { assess } from '@/lib/rules/assess'
import type { Assessment } from '@/lib/rules/result'
import type { Scenario } from '@/lib/thermal/scenario'

export interface AssessOrder {
  scenario: Scenario
  /** Progress goes out here. */
  port: MessagePort
}

/** An expected error as data: a thread's border keeps an error's message and loses its fields. */
export type AssessReply =
  | { ok: true; result: Assessment }
  | { ok: false; code: ErrorCode; message: string; details: Record<string, unknown> }

/** What a thread of the pool does: the pure engine over one scenario. */
export default function assessInThread({ scenario, port }: AssessOrder): AssessReply {
  try {
    const onProgress = (progress: unknown) => port.postMessage(progress)
    return { ok: true, result: assess(scenario, scenario.profiles ?? {}, { onProgress }) }
  } catch (error) {
    if (!isSteadfoldError(error)) throw error
    return { ok: false, code: error.code, message: error.message, details: error.details }
  } finally {
    port.close()
  }
}
