import type { Leg } from '@/lib/thermal'
import { type BaseRuns, type Side, foundIn } from './base-runs'
import type { BodyJudgement } from './body-judgement'
import type { BodyLimit } from './body-limits'
import type { Finding } from './result'
import { degrees, minutes, percent, rowWords, scheduleWords, signed } from './wording'

export interface BodyMargins {
  /** Minutes the leg could last longer; only asked for a limit that is kept. */
  spareMin: number | undefined
  outsideAirC: number
  /** Why the kind of finding that could be overridden may not be. */
  overrideRefused: string | undefined
  /** The journey, for naming its legs. */
  legs: readonly Leg[]
}

/** A judgement of the body with its margins, as a finding. */
export function bodyFinding(judged: BodyJudgement, margins: BodyMargins): Finding {
  const { subject, leg, side, limit, status, scheduleId, variant, extremes } = judged
  const breached = status === 'breach'
  const mayOverride = breached && limit.kind !== 'critical'
  const bound = limit.limit(subject)
  return {
    rule: limit.rule,
    basis: 'physiology',
    status,
    limitKind: limit.kind,
    side,
    animalId: subject.animal.id,
    crateId: subject.crate.id,
    legId: leg.id,
    scheduleId,
    variant,
    limit: bound,
    value: limit.value(extremes),
    unit: limit.unit,
    marginMin: breached ? Math.floor(-judged.minutesPast) : margins.spareMin,
    marginOutsideAirC: margins.outsideAirC,
    marginBodyC: bodyMargin(judged),
    minute: minuteOf(judged),
    asked: askedOf(limit, side, bound),
    note: noteOf(judged, margins),
    sourceTag: 'judgement',
    citation: rowWords({ profile: subject.animal.profile, version: subject.row.version }),
    overridable: mayOverride && margins.overrideRefused === undefined,
    ...(mayOverride &&
      margins.overrideRefused !== undefined && { overrideRefusedBecause: margins.overrideRefused }),
    ...(breached && { minutesPast: Math.ceil(judged.minutesPast), worstBodyC: judged.worstBodyC }),
  }
}

/**
 * Whether the journey 3 °C warmer (colder) takes this animal past critical: then nobody may override its alarm.
 * Undefined where it does not.
 */
export function overrideRefusal(
  animalId: string,
  legIds: readonly string[],
  side: Side,
  base: BaseRuns,
): string | undefined {
  const runs = side === 'high' ? base.warmer : base.colder
  const key = side === 'high' ? 'criticalHigh' : 'criticalLow'
  const lost = legIds.some((legId) =>
    foundIn(runs, animalId, legId).some(({ extremes }) => extremes.crossedMin[key] !== undefined),
  )
  return lost
    ? `The journey ${side === 'high' ? '3 °C warmer' : '3 °C colder'} passes the critical limit.`
    : undefined
}

function bodyMargin({ limit, subject, side, worstBodyC }: BodyJudgement): number {
  if (limit.kind === 'cold-effort') return worstBodyC - subject.limits.alarmLowC
  return side === 'high' ? limit.limit(subject) - worstBodyC : worstBodyC - limit.limit(subject)
}

function minuteOf({ limit, side, status, extremes }: BodyJudgement): number {
  const past = status === 'breach' ? limit.pastFrom(extremes) : undefined
  if (past !== undefined) return past
  if (limit.kind === 'cold-effort') return extremes.coldEffort.maxMin
  return side === 'high' ? extremes.peakCoreMin : extremes.lowestCoreMin
}

function askedOf(limit: BodyLimit, side: Side, bound: number): string {
  if (limit.kind === 'cold-effort')
    return `Keeping warm takes under ${percent(bound)} of what the animal can do, never an hour on end above it.`
  return `Body ${side === 'high' ? 'at most' : 'at least'} ${degrees(bound)}, ${limit.kind} limit.`
}

function noteOf(judged: BodyJudgement, margins: BodyMargins): string {
  const { limit, side, status, scheduleId, variant, extremes } = judged
  const figure =
    limit.kind === 'cold-effort'
      ? `Keeping warm takes up to ${percent(extremes.coldEffort.maxPct)}, body down to ${degrees(extremes.lowestCoreC)}`
      : `Body ${side === 'high' ? 'up to' : 'down to'} ${degrees(limit.value(extremes))}`
  const where = `${variant} animal, ${scheduleWords(scheduleId, margins.legs)}`
  if (status === 'breach')
    return `${figure} (${where}): ${minutes(Math.ceil(judged.minutesPast))} of the leg past the limit.`
  const air = `${signed(margins.outsideAirC, 1)} °C ${side === 'high' ? 'warmer' : 'colder'}`
  return `${figure} (${where}); holds with all air ${air}.`
}
