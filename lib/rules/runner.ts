import { SteadfoldError } from '@/lib/errors'
import {
  type LegExtremes,
  type Run,
  type SimulateOptions,
  type Variant,
  type Waypoint,
  simulate,
  type Scenario,
  schedulesOf,
} from '@/lib/thermal'
import { type Progress, type StagePart, stageWords } from './progress'
import type { Prepared } from './subject'

/** Work in steps: each yielded value tells how far it has come, so that a worker can report and a page can breathe. */
export type Steps<T> = Generator<Progress, T, undefined>

export interface JourneyRun {
  scheduleId: string
  variant: Variant
  airShiftC?: number
  /** Minute tracks cost as much again as the run itself: asked for only where they are drawn or read. */
  tracks?: boolean
  /** Last leg anybody looks at, by id. Default: the last of the journey. */
  throughLegId?: string
}

export interface Runner {
  /** The journey, at least as far as asked; made once for each combination and kept. */
  journey(asked: JourneyRun): Steps<Run>
  /** Part of a journey or a rewritten one; made once for each key, and at least as far as `throughLegId`. */
  part(key: string, scenario: Scenario, options: PartOptions): Steps<Run>
  /** A failure looked at through the engine's own `endure`; counted as a run. */
  count(): Steps<void>
  stage(name: string, expectedRuns: number): void
  /** The leg or the schedule of this stage that is in hand now, counted from 1. */
  at(part: StagePart, number: number, of: number): void
  runs(): number
}

export type PartOptions = Omit<SimulateOptions, 'profiles' | 'limits' | 'waypoints' | 'from'>

/** A run as far as it has come, and the waypoints behind its legs by the leg that comes next. */
interface Kept {
  run: Run
  throughLeg: number
  waypoints: Map<number, Waypoint>
}

/** Spacing of stored states: endurance starts from them, and is told for moments this far apart. */
export const SNAPSHOT_EVERY_MIN = 10

export function createRunner(prepared: Prepared, shouldStop: () => boolean = () => false): Runner {
  const kept = new Map<string, Kept>()
  const progress: Progress = { stage: '', done: 0, total: 0 }
  let stage = ''
  const { scenario: planned, profiles, limits } = prepared
  const legIndex = new Map(planned.legs.map(({ id }, index) => [id, index]))
  // Where a leg is at its worst delay, all others are at their typical one.
  const stem = schedulesOf(planned).some(({ id }) => id === 'typical') ? 'typical' : 'on-time'

  function* count(): Steps<void> {
    if (shouldStop()) throw new SteadfoldError('unavailable', 'The assessment was stopped before its end.')
    progress.done += 1
    yield { ...progress, total: Math.max(progress.total, progress.done) }
  }

  /** The run under a key. One that did not come so far goes on from where it ended, a new one from `branch`. */
  function reach(key: string, scenario: Scenario, options: PartOptions, branch?: Waypoint): Kept {
    const throughLeg = legIndex.get(options.throughLegId ?? '') ?? planned.legs.length - 1
    const known = kept.get(key)
    if (known && known.throughLeg >= throughLeg) return known
    const from = known?.waypoints.get(known.throughLeg + 1) ?? branch
    const waypoints = options.tracks !== true || options.scheduleId === stem
    const run = simulate(scenario, { ...options, profiles, limits, waypoints, ...(from && { from }) })
    const behind = new Map(known?.waypoints)
    for (const waypoint of run.waypoints) behind.set(waypoint.nextLeg, waypoint)
    const now = { run, throughLeg, waypoints: behind }
    kept.set(key, now)
    return now
  }

  function* part(key: string, scenario: Scenario, options: PartOptions, branch?: Waypoint): Steps<Run> {
    const isNew = !kept.has(key)
    const { run } = reach(key, scenario, options, branch)
    if (isNew) yield* count()
    return run
  }

  /** Where a schedule with one late leg leaves the stem that all of them have in common up to that leg. */
  function branchOf({
    scheduleId,
    variant,
    airShiftC = 0,
    tracks = false,
  }: JourneyRun): Waypoint | undefined {
    const late = scheduleId.startsWith('worst:') ? legIndex.get(scheduleId.slice('worst:'.length)) : undefined
    if (late === undefined || late === 0) return undefined
    const asked = { scheduleId: stem, variant, airShiftC }
    const tracked = kept.get(keyOf({ ...asked, tracks: true }))?.waypoints.get(late)
    if (tracked || tracks) return tracked
    const throughLegId = planned.legs[late - 1]?.id
    const options = optionsOf({ ...asked, ...(throughLegId !== undefined && { throughLegId }) })
    return reach(keyOf(asked), planned, options).waypoints.get(late)
  }

  return {
    part,
    count,
    *journey(asked) {
      const tracked = kept.get(keyOf({ ...asked, tracks: true }))
      if (tracked) return tracked.run
      const key = keyOf(asked)
      return yield* part(key, planned, optionsOf(asked), kept.has(key) ? undefined : branchOf(asked))
    },
    stage(name, expectedRuns) {
      stage = name
      progress.stage = name
      progress.total = progress.done + expectedRuns
    },
    at(part, number, of) {
      progress.stage = stageWords(stage, part, number, of)
    },
    runs: () => progress.done,
  }
}

function keyOf({ scheduleId, variant, airShiftC = 0, tracks = false }: JourneyRun): string {
  return `journey ${scheduleId} ${variant} ${airShiftC}${tracks ? ' tracked' : ''}`
}

function optionsOf({ airShiftC = 0, tracks = false, ...asked }: JourneyRun): PartOptions {
  return {
    ...asked,
    airShiftC,
    tracks,
    ...(airShiftC === 0 && { snapshotEveryMin: SNAPSHOT_EVERY_MIN }),
  }
}

/** The extremes of one animal on one leg of a run; undefined where it was not aboard. */
export function extremesOf(run: Run, animalId: string, legId: string): LegExtremes | undefined {
  return run.extremes.find((extreme) => extreme.animalId === animalId && extreme.legId === legId)
}
