import type { LegExtremes } from '@/lib/thermal'
import type { Side } from './base-runs'
import type { Subject } from './subject'

/** A limit of the body a leg is judged by, with what keeping it means. */
export interface BodyLimit {
  rule: 'core-critical-high' | 'core-critical-low' | 'core-alarm-high' | 'core-alarm-low' | 'cold-effort'
  side: Side
  kind: 'critical' | 'alarm' | 'cold-effort'
  unit: '°C' | '%'
  limit: (subject: Subject) => number
  value: (extremes: LegExtremes) => number
  /** First minute past it on this leg; undefined while kept. */
  pastFrom: (extremes: LegExtremes) => number | undefined
  minutesPast: (extremes: LegExtremes) => number
}

/** Share of the power to make heat that counts as a condition, and that counts as a breach after so many minutes in a row. [judgement] */
export const COLD_EFFORT_CONDITION_PCT = 40
export const COLD_EFFORT_BREACH_PCT = 60
export const COLD_EFFORT_BREACH_MIN = 60

const core = (kind: 'critical' | 'alarm', side: Side): BodyLimit => {
  const key = side === 'high' ? (`${kind}High` as const) : (`${kind}Low` as const)
  return {
    rule: `core-${kind}-${side}`,
    side,
    kind,
    unit: '°C',
    limit: ({ limits }) => limits[`${key}C`],
    value: (extremes) => (side === 'high' ? extremes.peakCoreC : extremes.lowestCoreC),
    pastFrom: (extremes) => extremes.crossedMin[key],
    minutesPast: (extremes) => extremes.minutesPast[key],
  }
}

export const CRITICAL_HIGH = core('critical', 'high')
export const CRITICAL_LOW = core('critical', 'low')
export const ALARM_HIGH = core('alarm', 'high')
export const ALARM_LOW = core('alarm', 'low')

/**
 * A cold animal holds its core until its reserves are gone, so the core says no far too late: the effort of keeping
 * warm decides. A leg also loses it where the core meets its alarm first.
 */
export const COLD_EFFORT: BodyLimit = {
  rule: 'cold-effort',
  side: 'low',
  kind: 'cold-effort',
  unit: '%',
  limit: () => COLD_EFFORT_BREACH_PCT,
  value: ({ coldEffort }) => coldEffort.maxPct,
  pastFrom: ({ coldEffort, crossedMin }) => earliest(coldEffort.breachMin, crossedMin.alarmLow),
  minutesPast: ({ coldEffort, crossedMin, minutesPast, fromMin, toMin }) => {
    const effortMin =
      coldEffort.breachMin === undefined ? 0 : Math.min(coldEffort.longestOver60Min, toMin - fromMin)
    return Math.max(effortMin, crossedMin.alarmLow === undefined ? 0 : minutesPast.alarmLow)
  },
}

/** The limit that decides on a side: critical once passed, else alarm, and in the cold the effort where the animal makes heat. */
export function decidingLimits(
  side: Side,
  { row }: Subject,
): { critical: BodyLimit; alarm: BodyLimit; kept: BodyLimit } {
  if (side === 'high') return { critical: CRITICAL_HIGH, alarm: ALARM_HIGH, kept: ALARM_HIGH }
  return {
    critical: CRITICAL_LOW,
    alarm: ALARM_LOW,
    kept: row.values.thermoregulation === 'endotherm' ? COLD_EFFORT : ALARM_LOW,
  }
}

/** How far past (positive) or inside (negative) a limit the leg came, °C of body; used to find the worst schedule. */
export function bodyPast(limit: BodyLimit, subject: Subject, extremes: LegExtremes): number {
  const sign = limit.side === 'high' ? 1 : -1
  if (limit.kind !== 'cold-effort') return sign * (limit.value(extremes) - limit.limit(subject))
  return subject.limits.alarmLowC - extremes.lowestCoreC
}

function earliest(a: number | undefined, b: number | undefined): number | undefined {
  if (a === undefined || b === undefined) return a ?? b
  return Math.min(a, b)
}
