import { newLeg, newFlight } from '@/lib/planning/new-plan'
import { offeredLeg } from '@/lib/planning/offers'
import type { Plan, PlanLeg, PlanSurroundings } from '@/lib/schemas/plan'

/*
 * Changes to the row of legs that touch more than one of them. Neighbours that were joined stay joined.
 */

/** A new leg after the one at `index` (−1: first), going on where and when that one ends. */
export function withLegAfter(legs: readonly PlanLeg[], index: number, kind: PlanLeg['kind']): PlanLeg[] {
  return insertAfter(legs, index, (before) => [newLeg(before, kind)])
}

/** The three legs of a flight after the leg at `index`. */
export function withFlightAfter(legs: readonly PlanLeg[], index: number): PlanLeg[] {
  return insertAfter(legs, index, newFlight)
}

/** Without one leg; of a flight, without all of its legs. */
export function withoutLeg(legs: readonly PlanLeg[], index: number): PlanLeg[] {
  const [first, last] = flightAround(legs, index) ?? [index, index]
  return legs.filter((_, place) => place < first || place > last)
}

/** First and last leg of the flight the leg belongs to; null where it belongs to none. */
export function flightAround(legs: readonly PlanLeg[], index: number): [first: number, last: number] | null {
  if (legs[index]?.kind !== 'flight') return null
  let first = index
  while (continuesFlight(legs[first - 1], legs[first])) first -= 1
  let last = index
  while (continuesFlight(legs[last], legs[last + 1])) last += 1
  return [first, last]
}

const PHASE_ORDER = ['doors-shut-departure', 'airborne', 'doors-shut-arrival']

function continuesFlight(before: PlanLeg | undefined, after: PlanLeg | undefined): boolean {
  if (before?.kind !== 'flight' || after?.kind !== 'flight') return false
  return PHASE_ORDER.indexOf(after.flightPhase ?? '') === PHASE_ORDER.indexOf(before.flightPhase ?? '') + 1
}

function insertAfter(
  legs: readonly PlanLeg[],
  index: number,
  make: (plan: Pick<Plan, 'legs'>) => PlanLeg | PlanLeg[],
): PlanLeg[] {
  const before = legs.slice(0, index + 1)
  // Ids count on from all legs, places and times from the one before.
  const highest = legs.reduce((max, { id }) => Math.max(max, Number(/-(\d+)$/.exec(id)?.[1] ?? 0)), 0)
  const made = [make({ legs: before })].flat()
  const added = made.map((leg, place) => ({ ...leg, id: `leg-${highest + 1 + place}` }))
  return [...before, ...added, ...legs.slice(index + 1)]
}

type Edge = 'start' | 'end'
type Touch = Pick<
  PlanLeg,
  'startLocal' | 'startOffsetMin' | 'endLocal' | 'endOffsetMin' | 'fromPlaceId' | 'toPlaceId'
>

/**
 * What follows for the neighbour when one end of a leg moves: where both met before, they meet again. null: they did not
 * meet, so the neighbour stays and the gap is said.
 */
export function joinedNeighbour(
  legs: readonly PlanLeg[],
  index: number,
  edge: Edge,
  before: Touch,
): { index: number; change: Partial<Touch> } | null {
  const leg = legs[index]
  const other = edge === 'end' ? index + 1 : index - 1
  const neighbour = legs[other]
  if (leg === undefined || neighbour === undefined) return null
  if (edge === 'end') {
    if (neighbour.startLocal !== before.endLocal || neighbour.fromPlaceId !== before.toPlaceId) return null
    return {
      index: other,
      change: { startLocal: leg.endLocal, startOffsetMin: leg.endOffsetMin, fromPlaceId: leg.toPlaceId },
    }
  }
  if (neighbour.endLocal !== before.startLocal || neighbour.toPlaceId !== before.fromPlaceId) return null
  return {
    index: other,
    change: { endLocal: leg.startLocal, endOffsetMin: leg.startOffsetMin, toPlaceId: leg.fromPlaceId },
  }
}

const OFFERED_FIELDS = {
  volumeM3: 'volume',
  heatTransferWK: 'heat through walls',
  interiorMassKJK: 'inside mass',
  ventilationM3h: 'fresh air',
  leakageM3h: 'leakage',
  solarApertureM2: 'sunlit glass',
  crateAirSpeedMs: 'air speed at the crates',
  airSpeedMs: 'air speed at the crates',
} as const

/** Names of the figures that still stand as they were offered: nobody has measured or asked for them. */
export function stillOffered(leg: PlanLeg): string[] {
  const offered = offeredLeg(leg.kind, leg.flightPhase)
  const here = leg.surroundings as Record<string, unknown>
  const there = offered.surroundings as Record<string, unknown>
  const figures =
    here['type'] !== there['type']
      ? []
      : Object.entries(OFFERED_FIELDS)
          .filter(([field]) => typeof here[field] === 'number' && here[field] === there[field])
          .map(([, words]) => words)
  const delays =
    leg.delayTypicalMin === offered.delayTypicalMin && leg.delayWorstMin === offered.delayWorstMin
      ? ['delays']
      : []
  return [...figures, ...delays]
}

/** True while nobody has typed into the surroundings: another kind of leg may then bring its own. */
export function surroundingsUntouched(leg: PlanLeg): boolean {
  return (
    JSON.stringify(leg.surroundings) === JSON.stringify(offeredLeg(leg.kind, leg.flightPhase).surroundings)
  )
}

/** Empty surroundings of a type, for a leg of this kind. */
export function surroundingsOf(type: PlanSurroundings['type'], leg: PlanLeg): PlanSurroundings {
  const own = offeredLeg(leg.kind, leg.flightPhase).surroundings
  if (own.type === type) return own
  const kinds: Record<PlanSurroundings['type'], PlanLeg['kind']> = {
    controlled: 'shed',
    'open-air': 'ramp',
    enclosed: 'road',
  }
  return offeredLeg(kinds[type], null).surroundings
}
