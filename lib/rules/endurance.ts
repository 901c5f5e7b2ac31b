import { type EnclosedSpace, type Endured, type Leg, endure, VARIANTS } from '@/lib/thermal'
import { SPARE_MIN, lengthening, worstScheduleOf } from './minutes-to-spare'
import type { Endurance, EnduranceKind } from './result'
import { type Runner, SNAPSHOT_EVERY_MIN, type Steps, extremesOf } from './runner'
import { type Prepared, type Subject, isAboard } from './subject'

const PRONE_VARIANTS = VARIANTS.filter((variant) => variant !== 'typical')

/** Minutes to a limit after a failure on this leg, from the leg's worst moment, for each animal aboard and each kind. */
export function* enduranceOf(prepared: Prepared, runner: Runner, legIndex: number): Steps<Endurance[]> {
  const leg = prepared.scenario.legs[legIndex]
  if (leg === undefined) return []
  const aboard = prepared.subjects.filter((subject) => isAboard(subject, legIndex))
  const stays = yield* ifItStays(prepared, runner, leg, aboard)
  const failures: Endurance[] = []
  for (const kind of ['climate', 'ventilation'] as const) {
    const nothingToLose = leg.surroundings.type === 'enclosed' && !hasMachine(leg.surroundings, kind)
    if (nothingToLose) failures.push(...stays.map((one) => ({ ...one, kind })))
    else failures.push(...(yield* afterFailure(prepared, runner, leg, aboard, kind)))
  }
  return aboard.flatMap(({ animal }) =>
    [...failures, ...stays].filter(({ animalId }) => animalId === animal.id),
  )
}

/** Where a space has no such machine, its failure is the leg going on as it is. */
function hasMachine(space: EnclosedSpace, kind: 'climate' | 'ventilation'): boolean {
  return kind === 'climate' ? space.conditioning !== undefined : (space.ventilationM3h ?? 0) > 0
}

/** The leg goes on as it is: from any moment on the animal meets its limit at the same minute, so the leg's end is the worst moment. */
function* ifItStays(
  prepared: Prepared,
  runner: Runner,
  leg: Leg,
  aboard: readonly Subject[],
): Steps<Endurance[]> {
  const soonest = new Map<string, { alarmMin: number; criticalMin: number }>()
  let legEndMin = 0
  for (const variant of PRONE_VARIANTS) {
    const longer = yield* lengthening(prepared, runner, leg, variant)
    legEndMin = longer.legEndMin
    const run = yield* longer.by(SPARE_MIN, leg.id)
    for (const { animal } of aboard) {
      const { crossedMin = {} } = extremesOf(run, animal.id, leg.id) ?? {}
      const held = soonest.get(animal.id) ?? { alarmMin: Infinity, criticalMin: Infinity }
      soonest.set(animal.id, {
        alarmMin: Math.min(held.alarmMin, crossedMin.alarmHigh ?? Infinity, crossedMin.alarmLow ?? Infinity),
        criticalMin: Math.min(
          held.criticalMin,
          crossedMin.criticalHigh ?? Infinity,
          crossedMin.criticalLow ?? Infinity,
        ),
      })
    }
  }
  return aboard.map(({ animal }) => {
    const { alarmMin = Infinity, criticalMin = Infinity } = soonest.get(animal.id) ?? {}
    return entry(animal.id, leg.id, 'stays', legEndMin, alarmMin - legEndMin, criticalMin - legEndMin)
  })
}

interface Moment {
  minute: number
  /** Soonest of both prone variants, by animal id; Infinity where the limit is not met within 240 minutes. */
  alarmMin: Map<string, number>
  criticalMin: Map<string, number>
}

/** Moments lie every 10 minutes; those looked at close in on the worst, from five spread over the leg. */
function* afterFailure(
  prepared: Prepared,
  runner: Runner,
  leg: Leg,
  aboard: readonly Subject[],
  kind: 'climate' | 'ventilation',
): Steps<Endurance[]> {
  const scheduleId = worstScheduleOf(prepared.scenario, leg)
  const planned = yield* runner.journey({ scheduleId, variant: 'heat-prone' })
  const index = prepared.scenario.legs.indexOf(leg)
  const startMin = planned.schedule.legStartMin[index] ?? 0
  const endMin = planned.schedule.legStartMin[index + 1] ?? startMin
  const count = Math.floor((endMin - startMin) / SNAPSHOT_EVERY_MIN)
  const looked = new Map<number, Moment | undefined>()
  function* look(step: number): Steps<Moment | undefined> {
    if (!looked.has(step))
      looked.set(
        step,
        yield* momentOf(prepared, runner, leg, kind, scheduleId, startMin + step * SNAPSHOT_EVERY_MIN),
      )
    return looked.get(step)
  }
  for (const share of [0, 0.25, 0.5, 0.75, 1])
    if ((yield* look(Math.round(share * count))) === undefined)
      return aboard.map(({ animal }) => unknown(animal.id, leg.id, kind))
  for (let reach = Math.ceil(count / 8); reach >= 1; reach = reach === 1 ? 0 : Math.ceil(reach / 2)) {
    const worst = worstStep(looked)
    for (const step of [worst - reach, worst + reach]) if (step >= 0 && step <= count) yield* look(step)
  }
  return aboard.map(({ animal }) =>
    worstFor(
      animal.id,
      leg.id,
      kind,
      [...looked.values()].filter((moment) => moment !== undefined),
    ),
  )
}

function* momentOf(
  prepared: Prepared,
  runner: Runner,
  leg: Leg,
  kind: 'climate' | 'ventilation',
  scheduleId: string,
  minute: number,
): Steps<Moment | undefined> {
  const moment: Moment = { minute, alarmMin: new Map(), criticalMin: new Map() }
  for (const variant of PRONE_VARIANTS) {
    const planned = yield* runner.journey({ scheduleId, variant })
    const { profiles, limits, scenario } = prepared
    const endured: Endured[] | undefined = endure(scenario, planned, {
      kind,
      legId: leg.id,
      minute,
      scheduleId,
      variant,
      profiles,
      limits,
      horizonMin: SPARE_MIN,
    })
    if (endured === undefined) return undefined
    yield* runner.count()
    for (const { animalId, toAlarmMin = Infinity, toCriticalMin = Infinity } of endured) {
      moment.alarmMin.set(animalId, Math.min(moment.alarmMin.get(animalId) ?? Infinity, toAlarmMin))
      moment.criticalMin.set(animalId, Math.min(moment.criticalMin.get(animalId) ?? Infinity, toCriticalMin))
    }
  }
  return moment
}

/** The step at which the first animal meets a limit soonest. */
function worstStep(looked: ReadonlyMap<number, Moment | undefined>): number {
  let worst = 0
  let soonest = Infinity
  for (const [step, moment] of looked) {
    const least =
      Math.min(...(moment?.criticalMin.values() ?? [])) + Math.min(...(moment?.alarmMin.values() ?? []))
    if (least < soonest) [worst, soonest] = [step, least]
  }
  return worst
}

function worstFor(
  animalId: string,
  legId: string,
  kind: EnduranceKind,
  moments: readonly Moment[],
): Endurance {
  const alarmAt = (moment: Moment) => moment.alarmMin.get(animalId) ?? Infinity
  const criticalAt = (moment: Moment) => moment.criticalMin.get(animalId) ?? Infinity
  const [first, ...others] = moments
  if (first === undefined) return unknown(animalId, legId, kind)
  const worst = others.reduce(
    (held, one) =>
      alarmAt(one) < alarmAt(held) || (alarmAt(one) === alarmAt(held) && criticalAt(one) < criticalAt(held))
        ? one
        : held,
    first,
  )
  return entry(animalId, legId, kind, worst.minute, alarmAt(worst), Math.min(...moments.map(criticalAt)))
}

function entry(
  animalId: string,
  legId: string,
  kind: EnduranceKind,
  worstMinute: number,
  alarmMin: number,
  criticalMin: number,
): Endurance {
  return {
    animalId,
    legId,
    kind,
    worstMinute,
    toAlarmMin: whole(alarmMin),
    toCriticalMin: whole(criticalMin),
  }
}

/** A failure that means nothing to the engine here is unknown, never "240 or more". */
function unknown(animalId: string, legId: string, kind: EnduranceKind): Endurance {
  return { animalId, legId, kind, worstMinute: null, toAlarmMin: null, toCriticalMin: null }
}

function whole(minutes: number): number {
  return Math.min(SPARE_MIN, Math.max(0, Math.floor(minutes)))
}
