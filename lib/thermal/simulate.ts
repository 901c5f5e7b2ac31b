import { SteadfoldError } from '../errors'
import type { Run, SimulateOptions } from './run'
import type { Scenario } from './scenario'

/** One run: every animal in one variant, on one schedule. Throws `not_converged` (details: legId, minute). */
export function simulate(scenario: Scenario, options: SimulateOptions): Run {
  throw new SteadfoldError(
    'unavailable',
    `The engine is not complete yet (${scenario.schema}, ${options.variant}).`,
  )
}
