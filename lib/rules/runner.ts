import { SteadfoldError } from '@/lib/errors'
import {
  type LegExtremes,
  type Run,
  type SimulateOptions,
  type Variant,
  simulate,
  type Scenario,
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
}

export interface Runner {
  /** The whole journey; made once for each combination and kept. */
  journey(asked: JourneyRun): Steps<Run>
  /** Part of a journey or a rewritten one; made once for each key. */
  part(key: string, scenario: Scenario, options: Omit<SimulateOptions, 'profiles' | 'limits'>): Steps<Run>
  /** A failure looked at through the engine's own `endure`; counted as a run. */
  count(): Steps<void>
  stage(name: string, expectedRuns: number): void
  /** The leg or the schedule of this stage that is in hand now, counted from 1. */
  at(part: StagePart, number: number, of: number): void
  runs(): number
}

/** Spacing of stored states: endurance starts from them, and is told for moments this far apart. */
export const SNAPSHOT_EVERY_MIN = 10

export function createRunner(prepared: Prepared, shouldStop: () => boolean = () => false): Runner {
  const kept = new Map<string, Run>()
  const progress: Progress = { stage: '', done: 0, total: 0 }
  let stage = ''

  function* count(): Steps<void> {
    if (shouldStop()) throw new SteadfoldError('unavailable', 'The assessment was stopped before its end.')
    progress.done += 1
    yield { ...progress, total: Math.max(progress.total, progress.done) }
  }

  function* part(
    key: string,
    scenario: Scenario,
    options: Omit<SimulateOptions, 'profiles' | 'limits'>,
  ): Steps<Run> {
    const known = kept.get(key)
    if (known) return known
    const run = simulate(scenario, { ...options, profiles: prepared.profiles, limits: prepared.limits })
    kept.set(key, run)
    yield* count()
    return run
  }

  return {
    part,
    count,
    *journey({ scheduleId, variant, airShiftC = 0, tracks = false }) {
      const key = `journey ${scheduleId} ${variant} ${airShiftC}`
      const tracked = kept.get(`${key} tracked`)
      if (tracked) return tracked
      return yield* part(tracks ? `${key} tracked` : key, prepared.scenario, {
        scheduleId,
        variant,
        airShiftC,
        tracks,
        ...(airShiftC === 0 && { snapshotEveryMin: SNAPSHOT_EVERY_MIN }),
      })
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

/** The extremes of one animal on one leg of a run; undefined where it was not aboard. */
export function extremesOf(run: Run, animalId: string, legId: string): LegExtremes | undefined {
  return run.extremes.find((extreme) => extreme.animalId === animalId && extreme.legId === legId)
}
