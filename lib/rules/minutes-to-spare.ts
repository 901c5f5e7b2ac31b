import {
  type Leg,
  type Run,
  type Scenario,
  type Surroundings,
  type Variant,
  lengthenLeg,
  schedulesOf,
  stateAt,
  withDelays,
} from '@/lib/thermal'
import { PRONE, type Side } from './base-runs'
import { type BodyLimit, COLD_EFFORT_BREACH_MIN, decidingLimits } from './body-limits'
import { type Runner, type Steps, extremesOf } from './runner'
import { type Prepared, type Subject, isAboard } from './subject'

/** How far a leg is lengthened; as much or more reads "240 or more". */
export const SPARE_MIN = 240

/**
 * How much longer this leg could last, at its worst delay and all else as planned, before the susceptible animal meets
 * the limit that decides, on that leg or a later one. Whole minutes, rounded down, by animal id; only animals aboard.
 */
export function* minutesToSpare(
  prepared: Prepared,
  runner: Runner,
  legIndex: number,
  side: Side,
): Steps<Map<string, number>> {
  const leg = prepared.scenario.legs[legIndex]
  const spare = new Map<string, number>()
  if (leg === undefined) return spare
  const lengthened = yield* lengthening(prepared, runner, leg, PRONE[side])
  for (const subject of prepared.subjects.filter((one) => isAboard(one, legIndex))) {
    const { kept } = decidingLimits(side, subject)
    spare.set(subject.animal.id, yield* spareOf(subject, legIndex, kept, lengthened, prepared.scenario))
  }
  return spare
}

/** The journey with one leg longer, from shortly before that leg on. */
export interface Lengthening {
  leg: Leg
  legEndMin: number
  /** At least as far as a leg. */
  by(extraMin: number, throughLegId: string): Steps<Run>
}

/** Runs of the same leg are shared by both questions asked of them: minutes to spare, and endurance of a leg that stays. */
export function* lengthening(
  prepared: Prepared,
  runner: Runner,
  leg: Leg,
  variant: Variant,
): Steps<Lengthening> {
  const scheduleId = worstScheduleOf(prepared.scenario, leg)
  const planned = yield* runner.journey({ scheduleId, variant })
  const index = prepared.scenario.legs.indexOf(leg)
  const legStartMin = planned.schedule.legStartMin[index] ?? 0
  const legEndMin = planned.schedule.legStartMin[index + 1] ?? legStartMin
  const delayed = withDelays(prepared.scenario, scheduleId)
  // Effort counts minutes in a row across legs, so the run must see the hour before this one.
  const start = stateAt(
    planned,
    Math.max(planned.snapshots[0]?.minute ?? 0, legStartMin - COLD_EFFORT_BREACH_MIN),
  )
  function* by(extraMin: number, throughLegId: string): Steps<Run> {
    if (extraMin === 0) return planned
    return yield* runner.part(
      `lengthened ${leg.id} ${variant} ${extraMin}`,
      lengthenLeg(delayed, leg.id, extraMin),
      {
        scheduleId: 'on-time',
        variant,
        start,
        tracks: false,
        throughLegId,
      },
    )
  }
  return { leg, legEndMin, by }
}

/** The schedule with this leg at its worst delay; another name where the schedules are the same. */
export function worstScheduleOf(scenario: Scenario, leg: Leg): string {
  const ids = new Set(schedulesOf(scenario).map(({ id }) => id))
  const wanted = [`worst:${leg.id}`, 'typical'].find((id) => ids.has(id))
  return wanted ?? 'on-time'
}

function* spareOf(
  subject: Subject,
  legIndex: number,
  limit: BodyLimit,
  { leg, legEndMin, by }: Lengthening,
  scenario: Scenario,
): Steps<number> {
  const id = subject.animal.id
  const longest = extremesOf(yield* by(SPARE_MIN, leg.id), id, leg.id)
  const pastFrom = longest && limit.pastFrom(longest)
  const onLegMin = pastFrom === undefined ? SPARE_MIN : Math.max(0, Math.floor(pastFrom - legEndMin))
  const later = scenario.legs.filter((_, index) => index > legIndex && isAboard(subject, index))
  function* laterKept(extraMin: number): Steps<boolean> {
    for (const one of later) {
      const extremes = extremesOf(yield* by(extraMin, one.id), id, one.id)
      if (extremes !== undefined && limit.pastFrom(extremes) !== undefined) return false
    }
    return true
  }
  if (later.length === 0 || onLegMin === 0) return onLegMin
  if (!(yield* laterKept(0))) return 0
  let keptMin = 0
  for (const extraMin of trials(onLegMin, scenario, legIndex)) {
    if (yield* laterKept(extraMin)) keptMin = extraMin
    else return yield* bisect(laterKept, keptMin, extraMin)
  }
  return onLegMin
}

/** Later is not always worse: a leg moved into the noon sun may fail at one hour and hold at four. */
function trials(onLegMin: number, scenario: Scenario, legIndex: number): number[] {
  const changing = scenario.legs.slice(legIndex).some(({ surroundings }) => changes(surroundings))
  return [...(changing ? [60, 120, 180] : []).filter((minutes) => minutes < onLegMin), onLegMin]
}

function changes(surroundings: Surroundings): boolean {
  if (surroundings.type === 'open-air') return surroundings.series.length > 1
  return surroundings.outside !== undefined && changes(surroundings.outside)
}

function* bisect(keeps: (minutes: number) => Steps<boolean>, kept: number, lost: number): Steps<number> {
  let [low, high] = [kept, lost]
  while (high - low > 1) {
    const middle = Math.floor((low + high) / 2)
    if (yield* keeps(middle)) low = middle
    else high = middle
  }
  return low
}
