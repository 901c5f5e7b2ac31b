import type { Leg, LegExtremes, Variant } from '@/lib/thermal'
import { type BaseRuns, type Found, PRONE, type Side, foundIn, proneOf, worstBy } from './base-runs'
import {
  type BodyLimit,
  COLD_EFFORT,
  COLD_EFFORT_CONDITION_PCT,
  bodyPast,
  decidingLimits,
} from './body-limits'
import type { Subject } from './subject'

/** What one limit says of one animal on one leg, before its margins are known. */
export interface BodyJudgement {
  subject: Subject
  leg: Leg
  side: Side
  limit: BodyLimit
  status: 'met' | 'condition' | 'breach'
  /** The schedule that decides, and the variant on it. */
  scheduleId: string
  variant: Variant
  extremes: LegExtremes
  /** Over all schedules and both prone variants; 0 while kept. */
  minutesPast: number
  worstBodyC: number
}

/**
 * Judges one side of one leg: critical where passed, else alarm where passed, and in the cold the effort besides.
 * Where all are kept there is one judgement, of the limit that would be met first. Breaches are looked for on all
 * schedules and in both prone variants.
 */
export function judgeBody(subject: Subject, leg: Leg, side: Side, base: BaseRuns): BodyJudgement[] {
  const found = foundIn(proneOf(base.planned), subject.animal.id, leg.id)
  const { critical, alarm, kept } = decidingLimits(side, subject)
  const judged = (limit: BodyLimit, status: BodyJudgement['status'], deciding: Found): BodyJudgement => ({
    subject,
    leg,
    side,
    limit,
    status,
    ...deciding,
    minutesPast:
      status === 'breach' ? Math.max(0, ...found.map(({ extremes }) => limit.minutesPast(extremes))) : 0,
    worstBodyC:
      side === 'high'
        ? Math.max(...found.map(({ extremes }) => extremes.peakCoreC))
        : Math.min(...found.map(({ extremes }) => extremes.lowestCoreC)),
  })
  const breaches: BodyJudgement[] = []
  for (const limit of [critical, alarm]) {
    const past = found.filter(({ extremes }) => limit.pastFrom(extremes) !== undefined)
    const worst = worstBy(past, ({ extremes }) => bodyPast(limit, subject, extremes))
    if (worst === undefined) continue
    breaches.push(judged(limit, 'breach', worst))
    break
  }
  if (kept === COLD_EFFORT) {
    const past = found.filter(({ extremes }) => extremes.coldEffort.breachMin !== undefined)
    const worst = worstBy(past, ({ extremes }) => extremes.coldEffort.longestOver60Min)
    if (worst !== undefined) breaches.push(judged(COLD_EFFORT, 'breach', worst))
  }
  if (breaches.length > 0) return breaches
  const deciding = decidingWhenKept(subject, leg, side, kept, base, found)
  if (deciding === undefined) return []
  const strained = kept === COLD_EFFORT && deciding.extremes.coldEffort.maxPct >= COLD_EFFORT_CONDITION_PCT
  return [judged(kept, strained ? 'condition' : 'met', deciding)]
}

/** A body that regulates hides how near it is to losing: the run 3 °C to the bad side tells which schedule is worst. */
function decidingWhenKept(
  subject: Subject,
  leg: Leg,
  side: Side,
  kept: BodyLimit,
  base: BaseRuns,
  found: Found[],
): Found | undefined {
  if (kept === COLD_EFFORT) {
    const strained = found.filter(({ extremes }) => extremes.coldEffort.maxPct >= COLD_EFFORT_CONDITION_PCT)
    const worst = worstBy(strained, ({ extremes }) => extremes.coldEffort.maxPct)
    if (worst !== undefined) return worst
  }
  const shifted = foundIn(side === 'high' ? base.warmer : base.colder, subject.animal.id, leg.id)
  const hardest = worstBy(shifted, ({ extremes }) =>
    kept === COLD_EFFORT
      ? extremes.coldEffort.maxPct + (kept.pastFrom(extremes) === undefined ? 0 : 1_000)
      : bodyPast(kept, subject, extremes),
  )
  return found.find(
    ({ scheduleId, variant }) => scheduleId === hardest?.scheduleId && variant === PRONE[side],
  )
}
