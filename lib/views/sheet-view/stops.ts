import type { StopLimit } from '@/lib/rules/result'
import { crateMark } from '@/lib/planning/crate-mark'
import type { AirStop, EnduranceView, StopLimitView } from '../sheet'
import type { Assessed } from './assessed'
import type { SheetFacts } from './facts'
import type { JourneyLeg, PlannedAir } from './journey'
import { capital, legsInWords } from './words'

/**
 * Stop limits of each crate: the strictest of its occupants on every leg, and over the legs whose planned air lies inside
 * their own limit. A leg planned outside its limit has its own line and doesn't narrow the others.
 */
export function stopLimitViews(
  { plan, consignment }: SheetFacts,
  assessed: Assessed | null,
  journey: JourneyLeg[],
): StopLimitView[] {
  if (assessed === null) return []
  const { stopLimits } = assessed.fact.result
  return [...plan.crates]
    .sort((a, b) => (a.letter < b.letter ? -1 : 1))
    .flatMap((crate) => {
      const own = stopLimits.filter(({ animalId }) => crate.occupants.includes(animalId))
      if (own.length === 0) return []
      const byLeg = journey.flatMap(({ leg, ordinal, air }) => {
        const onLeg = own.filter(({ legId }) => legId === leg.id)
        if (onLeg.length === 0) return []
        const counted = onLeg.map((limit) => afterOverride(limit, assessed))
        const stop = strictest(counted)
        const overridden = counted.some((limit, index) => limit !== onLeg[index])
        return [{ legId: leg.id, ordinal, ...stop, plannedInside: isInside(air, stop), overridden }]
      })
      const inside = byLeg.filter(({ plannedInside }) => plannedInside)
      return [
        {
          crateId: crate.id,
          crateLetter: crate.letter,
          crateMark: crateMark(consignment.mark, crate.letter),
          strictest: strictest(inside.length > 0 ? inside : byLeg),
          byLeg,
        },
      ]
    })
}

/** Where a vet has overridden the alarm of a side, the driver's limit there keeps the critical one instead. */
function afterOverride(limit: StopLimit, { effective, fact }: Assessed): StopLimit {
  const { ifOverridden } = limit
  if (ifOverridden === undefined) return limit
  const sides = effective.overridden.flatMap(({ findingIndex }) => {
    const finding = fact.result.findings[findingIndex]
    const here = finding?.animalId === limit.animalId && finding.legId === limit.legId
    return here && finding.side !== undefined ? [finding.side] : []
  })
  if (sides.length === 0) return limit
  return {
    ...limit,
    ...(sides.includes('high') && ifOverridden.aboveC !== undefined && { aboveC: ifOverridden.aboveC }),
    ...(sides.includes('low') && ifOverridden.belowC !== undefined && { belowC: ifOverridden.belowC }),
  }
}

/** Said under limits that an override moved; empty where none did. */
export function overriddenLimitWords({ byLeg }: Pick<StopLimitView, 'byLeg'>): string {
  const moved = byLeg.filter(({ overridden }) => overridden).map(({ ordinal }) => ordinal)
  return moved.length === 0
    ? ''
    : `${capital(legsInWords(moved))} overridden by the vet: 3\u00a0°C inside what keeps the critical limit.`
}

/** null on a side means that no air in the range keeps the limit; then there is no figure to print for that leg. */
function strictest(stops: readonly Pick<StopLimit, 'aboveC' | 'belowC'>[]): AirStop {
  const above = stops.flatMap(({ aboveC }) => aboveC ?? [])
  const below = stops.flatMap(({ belowC }) => belowC ?? [])
  const aboveC = above.length === stops.length && above.length > 0 ? Math.min(...above) : null
  const belowC = below.length === stops.length && below.length > 0 ? Math.max(...below) : null
  return {
    aboveC,
    belowC,
    // Rounded to the safe side: an upper limit down, a lower limit up.
    aboveF: aboveC === null ? null : Math.floor(aboveC * 1.8 + 32 + 1e-9),
    belowF: belowC === null ? null : Math.ceil(belowC * 1.8 + 32 - 1e-9),
  }
}

function isInside({ minC, maxC }: PlannedAir, { aboveC, belowC }: AirStop): boolean {
  if (minC === null || maxC === null || aboveC === null || belowC === null) return false
  return minC >= belowC && maxC <= aboveC
}

/** Minutes to a limit after a failure, worst moment first told with its time. */
export function enduranceViews(
  { plan }: SheetFacts,
  assessed: Assessed | null,
  journey: JourneyLeg[],
): EnduranceView[] {
  if (assessed === null) return []
  const letterOf = new Map(
    plan.crates.flatMap((crate) => crate.occupants.map((id) => [id, crate.letter] as const)),
  )
  const departureMs = journey[0]?.start.ms ?? 0
  return assessed.fact.result.endurance.flatMap(
    ({ animalId, legId, kind, worstMinute, toAlarmMin, toCriticalMin }) => {
      const at = journey.find(({ leg }) => leg.id === legId)
      if (at === undefined) return []
      return [
        {
          animalId,
          crateLetter: letterOf.get(animalId) ?? '',
          legId,
          ordinal: at.ordinal,
          kind,
          worstAt:
            worstMinute === null
              ? null
              : { ms: departureMs + Math.round(worstMinute) * 60_000, zone: at.start.zone },
          toAlarmMin,
          toCriticalMin,
        },
      ]
    },
  )
}
