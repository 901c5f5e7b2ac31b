import { type LegExtremes, type Run, type Schedule, type Variant, VARIANTS, schedulesOf } from '@/lib/thermal'
import { type Runner, type Steps, extremesOf } from './runner'
import type { Prepared } from './subject'

export type Side = 'high' | 'low'

/** A run with what it stands for. */
export interface NamedRun {
  scheduleId: string
  variant: Variant
  run: Run
}

export interface Found {
  scheduleId: string
  variant: Variant
  extremes: LegExtremes
}

/** The runs every assessment starts from: each schedule in three variants, and the prone ones 3 °C to their bad side. */
export interface BaseRuns {
  schedules: Schedule[]
  planned: NamedRun[]
  warmer: NamedRun[]
  colder: NamedRun[]
}

/** Shift of all air at which a GO must still hold, °C: at least the model's proven error. */
export const GO_MARGIN_C = 3

/** The variant that is prone to each side. */
export const PRONE: Record<Side, Variant> = { high: 'heat-prone', low: 'cold-prone' }

/**
 * `readsAir`: somebody reads the computed air of enclosed spaces on every schedule, so the prone runs keep their tracks.
 * On time tracks are always kept.
 */
export function* makeBaseRuns(prepared: Prepared, runner: Runner, readsAir: boolean): Steps<BaseRuns> {
  const schedules = schedulesOf(prepared.scenario)
  runner.stage('Typical and prone animals', schedules.length * (VARIANTS.length + 2))
  const planned: NamedRun[] = []
  const warmer: NamedRun[] = []
  const colder: NamedRun[] = []
  for (const [index, { id: scheduleId }] of schedules.entries()) {
    runner.at('schedule', index + 1, schedules.length)
    for (const variant of VARIANTS) {
      const tracks = scheduleId === 'on-time' || (readsAir && variant !== 'typical')
      planned.push({ scheduleId, variant, run: yield* runner.journey({ scheduleId, variant, tracks }) })
    }
    const heat = { scheduleId, variant: PRONE.high, airShiftC: GO_MARGIN_C }
    warmer.push({ scheduleId, variant: PRONE.high, run: yield* runner.journey(heat) })
    const cold = { scheduleId, variant: PRONE.low, airShiftC: -GO_MARGIN_C }
    colder.push({ scheduleId, variant: PRONE.low, run: yield* runner.journey(cold) })
  }
  return { schedules, planned, warmer, colder }
}

/** What these runs say of one animal on one leg. */
export function foundIn(runs: readonly NamedRun[], animalId: string, legId: string): Found[] {
  return runs.flatMap(({ scheduleId, variant, run }) => {
    const extremes = extremesOf(run, animalId, legId)
    return extremes === undefined ? [] : [{ scheduleId, variant, extremes }]
  })
}

/** The prone ones among planned runs: the susceptible animal is the worse of the two at each finding. */
export function proneOf(runs: readonly NamedRun[]): NamedRun[] {
  return runs.filter(({ variant }) => variant !== 'typical')
}

/** The entry with the largest figure; the first one where several are equal. */
export function worstBy<T>(items: readonly T[], figure: (item: T) => number): T | undefined {
  let worst: T | undefined
  let most = -Infinity
  for (const item of items) {
    const value = figure(item)
    if (worst === undefined || value > most) {
      worst = item
      most = value
    }
  }
  return worst
}
