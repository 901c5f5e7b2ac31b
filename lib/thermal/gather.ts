import type { Simulation } from './result'
import type { Run } from './run'
import { VARIANTS } from './scenario'
import { ENGINE_VERSION } from './version'

/** Several runs of one scenario as the one document others store and draw: sorted by id, variant, then schedule. */
export function gather(runs: readonly Run[]): Simulation {
  const byKey = (a: Keyed, b: Keyed) =>
    compare(a.id, b.id) ||
    VARIANTS.indexOf(a.variant) - VARIANTS.indexOf(b.variant) ||
    compare(a.scheduleId, b.scheduleId)
  const compartmentKey = (track: Simulation['compartments'][number]) => ({ ...track, id: track.legId })
  const schedules = [...new Map(runs.map((run) => [run.schedule.id, run.schedule])).values()]
  return {
    engineVersion: ENGINE_VERSION,
    schedules,
    crates: runs.flatMap((run) => run.crates).sort(byKey),
    animals: runs.flatMap((run) => run.animals).sort(byKey),
    compartments: runs
      .flatMap((run) => run.compartments)
      .sort((a, b) => byKey(compartmentKey(a), compartmentKey(b))),
    closure: {
      maxResidualW: Math.max(0, ...runs.map((run) => run.closure.maxResidualW)),
      energyErrorPct: Math.max(0, ...runs.map((run) => run.closure.energyErrorPct)),
    },
    finalState: runs.filter((run) => run.schedule.id === 'on-time').map((run) => run.finalState),
  }
}

interface Keyed {
  id: string
  variant: (typeof VARIANTS)[number]
  scheduleId: string
}

/** Code-point order: the same in every engine and locale. */
function compare(a: string, b: string): number {
  return a < b ? -1 : a > b ? 1 : 0
}
