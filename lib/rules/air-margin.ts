import { GO_MARGIN_C, type BaseRuns, foundIn } from './base-runs'
import type { BodyJudgement } from './body-judgement'
import { type Runner, type Steps, extremesOf } from './runner'

const STEP_C = 0.5
const REACH_STEPS = 30
const GO_STEPS = GO_MARGIN_C / STEP_C

/**
 * The largest uniform shift of all air, °C, at which this leg still keeps the limit: warmer for a high limit, colder for
 * a low one, negative where the plan as it stands does not. Searched in steps of 0.5 from −15 to +15 on the deciding
 * schedule; a margin of 3 or more is held against the shifted runs of every schedule.
 */
export function* outsideAirMargin(judged: BodyJudgement, base: BaseRuns, runner: Runner): Steps<number> {
  const { subject, leg, side, limit, scheduleId, variant } = judged
  const sign = side === 'high' ? 1 : -1
  function* keeps(steps: number): Steps<boolean> {
    const airShiftC = sign * steps * STEP_C
    const run = yield* runner.journey({ scheduleId, variant, airShiftC, throughLegId: leg.id })
    const extremes = extremesOf(run, subject.animal.id, leg.id)
    return extremes === undefined || limit.pastFrom(extremes) === undefined
  }
  if (judged.status === 'breach') return (yield* largestKept(keeps, -REACH_STEPS, 0)) * STEP_C
  if (!(yield* keeps(GO_STEPS))) return (yield* largestKept(keeps, 0, GO_STEPS)) * STEP_C
  const shifted = foundIn(side === 'high' ? base.warmer : base.colder, subject.animal.id, leg.id)
  if (shifted.some(({ extremes }) => limit.pastFrom(extremes) !== undefined)) return (GO_STEPS - 1) * STEP_C
  if (yield* keeps(REACH_STEPS)) return REACH_STEPS * STEP_C
  return (yield* largestKept(keeps, GO_STEPS, REACH_STEPS)) * STEP_C
}

/** Halves the span between a kept and a lost step; `from` is reported even where nothing is kept, being the end of the search. */
function* largestKept(keeps: (steps: number) => Steps<boolean>, from: number, lost: number): Steps<number> {
  let [low, high] = [from, lost]
  while (high - low > 1) {
    const middle = Math.floor((low + high) / 2)
    if (yield* keeps(middle)) low = middle
    else high = middle
  }
  return low
}
