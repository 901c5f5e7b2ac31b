import { type Run, type Variant, holdLegAt, stateAt, withDelays, lengthenLeg } from '@/lib/thermal'
import { PRONE, type Side } from './base-runs'
import { decidingLimits } from './body-limits'
import { worstScheduleOf } from './minutes-to-spare'
import type { StopLimit } from './result'
import { type Runner, type Steps, extremesOf } from './runner'
import { type Prepared, type Subject, isAboard } from './subject'

/** A leg may run this much past its worst delay and the stop limit still holds. */
const BEYOND_WORST_MIN = 60
const COLDEST_C = -40
const WARMEST_C = 55

/**
 * Per animal: the highest and the lowest whole °C of steady air outside the crate, at the leg's humidity, at which the
 * susceptible animal, from its state at the leg's start, keeps its alarm (60 % cold effort) to the leg's end at worst
 * delay plus an hour. null where no air does.
 */
export function* stopLimitsOf(prepared: Prepared, runner: Runner, legIndex: number): Steps<StopLimit[]> {
  const leg = prepared.scenario.legs[legIndex]
  if (leg === undefined) return []
  const holds = {
    high: yield* holding(prepared, runner, legIndex, 'high'),
    low: yield* holding(prepared, runner, legIndex, 'low'),
  }
  const limits: StopLimit[] = []
  for (const subject of prepared.subjects.filter((one) => isAboard(one, legIndex))) {
    const aboveC = yield* extreme(subject, leg.id, 'high', holds.high)
    const belowC = yield* extreme(subject, leg.id, 'low', holds.low)
    limits.push({ animalId: subject.animal.id, legId: leg.id, aboveC, belowC })
  }
  return limits
}

type Holding = (airTempC: number) => Steps<Run>

function* holding(prepared: Prepared, runner: Runner, legIndex: number, side: Side): Steps<Holding> {
  const leg = prepared.scenario.legs[legIndex]
  const variant: Variant = PRONE[side]
  const scheduleId = leg === undefined ? 'on-time' : worstScheduleOf(prepared.scenario, leg)
  const planned = yield* runner.journey({ scheduleId, variant })
  const startMin = planned.schedule.legStartMin[legIndex] ?? 0
  const endMin = planned.schedule.legStartMin[legIndex + 1] ?? startMin
  const relHumidityPct = planned.extremes.find(({ legId }) => legId === leg?.id)?.outsideHumidityMeanPct ?? 50
  return function* hold(airTempC) {
    const legId = leg?.id ?? ''
    const longer = lengthenLeg(withDelays(prepared.scenario, scheduleId), legId, BEYOND_WORST_MIN)
    return yield* runner.part(
      `held ${legId} ${variant} ${airTempC}`,
      holdLegAt(longer, legId, { airTempC, relHumidityPct }),
      {
        scheduleId: 'on-time',
        variant,
        start: stateAt(planned, startMin),
        untilMin: endMin + BEYOND_WORST_MIN,
        tracks: false,
        stopOncePast: 'critical',
      },
    )
  }
}

/** Halves the span between an air that is kept and one that is not, from the middle of the range outward. */
function* extreme(subject: Subject, legId: string, side: Side, hold: Holding): Steps<number | null> {
  const { kept } = decidingLimits(side, subject)
  function* keeps(airTempC: number): Steps<boolean> {
    const extremes = extremesOf(yield* hold(airTempC), subject.animal.id, legId)
    return extremes !== undefined && kept.pastFrom(extremes) === undefined
  }
  const outward = side === 'high' ? 1 : -1
  const far = side === 'high' ? WARMEST_C : COLDEST_C
  const near = side === 'high' ? COLDEST_C : WARMEST_C
  if (yield* keeps(far)) return far
  let [held, lost] = [near, far]
  while (Math.abs(lost - held) > 1) {
    const middle = held + outward * Math.floor(Math.abs(lost - held) / 2)
    if (yield* keeps(middle)) held = middle
    else lost = middle
  }
  // The near end was never tried itself: it stands for "no air in the range".
  return held === near ? null : held
}
