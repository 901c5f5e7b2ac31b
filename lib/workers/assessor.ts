import 'server-only'
import { fileURLToPath } from 'node:url'
import { MessageChannel } from 'node:worker_threads'
import { Piscina } from 'piscina'
import { assess } from '@/lib/rules/assess'
import type { Progress } from '@/lib/rules/progress'
import type { Assessment } from '@/lib/rules/result'
import type { Scenario } from '@/lib/thermal/scenario'
import { SteadfoldError } from '@/lib/errors'
import type { AssessOrder, AssessReply } from './assess-thread'

/** Runs the engine over a scenario and says how far it is. The scenario carries the species rows it is judged by. */
export interface Assessor {
  assess(
    scenario: Scenario,
    onProgress: (progress: Progress) => void,
    signal: AbortSignal,
  ): Promise<Assessment>
  close(): Promise<void>
}

/** Assessments in threads of their own, so that the worker can keep its leases alive meanwhile. */
export function threadedAssessor({ threads }: { threads: number }): Assessor {
  const pool = new Piscina<AssessOrder, AssessReply>({
    // Beside the worker's own bundle, wherever that was started from.
    filename: fileURLToPath(new URL('assess-thread.mjs', import.meta.url)),
    minThreads: 0,
    maxThreads: threads,
    idleTimeout: 30_000,
  })
  return {
    async assess(scenario, onProgress, signal) {
      const { port1, port2 } = new MessageChannel()
      port1.on('message', onProgress)
      try {
        const reply = await pool.run({ scenario, port: port2 }, { transferList: [port2], signal })
        if (reply.ok) return reply.result
        throw new SteadfoldError(reply.code, reply.message, { details: reply.details })
      } finally {
        port1.close()
      }
    },
    close: () => pool.destroy(),
  }
}

/** The same in this very thread, for one-off work such as filling a demo. */
export function plainAssessor(): Assessor {
  return {
    async assess(scenario, onProgress) {
      return assess(scenario, scenario.profiles ?? {}, { onProgress })
    },
    async close() {},
  }
}
