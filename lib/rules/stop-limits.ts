import { type Run, type Variant, holdLegAt, stateAt, withDelays, lengthenLeg } from '@/lib/thermal'
import { GO_MARGIN_C, PRONE, type Side } from './base-runs'
import { type BodyLimit, decidingLimits } from './body-limits'
import { worstScheduleOf } from './minutes-to-spare'
import type { Finding, StopLimit } from './result'
import { type Runner, type Steps, extremesOf } from './runner'
import { type Prepared, type Subject, isAboard } from './subject'

/** A leg may run this much past its worst delay and the stop limit still holds. */
const BEYOND_WORST_MIN = 60
const COLDEST_C = -40
const WARMEST_C = 55

/**
 * Per animal: the highest and the lowest whole °C of steady air outside the crate, at the leg's humidity, at which the
 * susceptible animal, from its state at the leg's start, keeps its alarm (60 % cold effort) to the leg's end at worst
 * delay plus an hour. null where no air does. Where a vet may override the alarm, also what then takes its place.
 */
export function* stopLimitsOf(
  prepared: Prepared,
  runner: Runner,
  legIndex: number,
  findings: readonly Finding[],
): Steps<StopLimit[]> {
  const leg = prepared.scenario.legs[legIndex]
  if (leg === undefined) return []
  const holds = {
    high: yield* holding(prepared, runner, legIndex, 'high'),
    low: yield* holding(prepared, runner, legIndex, 'low'),
  }
  const limits: StopLimit[] = []
  for (const subject of prepared.subjects.filter((one) => isAboard(one, legIndex))) {
    const { kept: upper, critical: hottest } = decidingLimits('high', subject)
    const { kept: lower, critical: coldest } = decidingLimits('low', subject)
    const at = { animalId: subject.animal.id, legId: leg.id }
    const aboveC = yield* extreme(subject, leg.id, upper, holds.high)
    const belowC = yield* extreme(subject, leg.id, lower, holds.low)
    const ifOverridden = {
      ...(mayBeOverridden(findings, at, 'high') && {
        aboveC: yield* withMargin(subject, leg.id, hottest, holds.high),
      }),
      ...(mayBeOverridden(findings, at, 'low') && {
        belowC: yield* withMargin(subject, leg.id, coldest, holds.low),
      }),
    }
    const some = Object.keys(ifOverridden).length > 0
    limits.push({ ...at, aboveC, belowC, ...(some && { ifOverridden }) })
  }
  return limits
}

function mayBeOverridden(
  findings: readonly Finding[],
  { animalId, legId }: Pick<StopLimit, 'animalId' | 'legId'>,
  side: Side,
): boolean {
  return findings.some(
    (finding) =>
      finding.animalId === animalId &&
      finding.legId === legId &&
      finding.side === side &&
      finding.status === 'breach' &&
      finding.overridable,
  )
}

/** The air that keeps the limit, moved by the model's proven error to the safe side. */
function* withMargin(subject: Subject, legId: string, limit: BodyLimit, hold: Holding): Steps<number | null> {
  const airTempC = yield* extreme(subject, legId, limit, hold)
  if (airTempC === null) return null
  return limit.side === 'high' ? airTempC - GO_MARGIN_C : airTempC + GO_MARGIN_C
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
function* extreme(subject: Subject, legId: string, limit: BodyLimit, hold: Holding): Steps<number | null> {
  const { side } = limit
  function* keeps(airTempC: number): Steps<boolean> {
    const extremes = extremesOf(yield* hold(airTempC), subject.animal.id, legId)
    return extremes !== undefined && limit.pastFrom(extremes) === undefined
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
