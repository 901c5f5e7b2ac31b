import type { Plan, PlanLeg, PlanPlace } from '@/lib/schemas/plan'
import type { Leg, LegPlace } from '@/lib/thermal/scenario'
import type { Timeline } from '../timeline'
import { scenarioSurroundings } from './surroundings'

/** The legs with minutes counted from departure, in the order of the journey. */
export function scenarioLegs(plan: Plan, timeline: Timeline, departureMs: number): Leg[] {
  const heldMin = heldBeyondMin(plan)
  return plan.legs.map((leg, index) => {
    const timed = timeline.legs[index]
    if (timed?.startMs == null || timed.endMs === null || timed.from === null || timed.to === null) {
      throw new RangeError(`Leg ${index + 1} has no time or place.`)
    }
    const startMin = (timed.startMs - departureMs) / 60_000
    const endMin = (timed.endMs - departureMs) / 60_000
    return {
      id: leg.id,
      kind: leg.kind,
      ...(leg.flightPhase === null ? {} : { flightPhase: leg.flightPhase }),
      durationMin: endMin - startMin,
      surroundings: scenarioSurroundings(plan.legs, index, { startMin, untilMin: endMin + heldMin }),
      pressureKPa: leg.pressureKPa,
      delay: { typicalMin: leg.delayTypicalMin, worstMin: leg.delayWorstMin },
      outOfCrate: leg.outOfCrate,
      attended: leg.attended,
      place: legPlace(timed.from, timed.to),
      events: [],
    }
  })
}

/** A failure or a stop limit looks 240 and 60 minutes past a leg's latest end. */
const LOOK_PAST_MIN = 300

/** How long the last weather row is held past a leg's planned end: all worst delays together and what is looked at beyond. */
function heldBeyondMin({ legs }: { legs: readonly PlanLeg[] }): number {
  return legs.reduce((sum, { delayWorstMin }) => sum + delayWorstMin, 0) + LOOK_PAST_MIN
}

/** The sun stands where the leg begins; the law of both ends is read. */
function legPlace(from: PlanPlace, to: PlanPlace): LegPlace {
  return {
    latitudeDeg: from.latitudeDeg,
    longitudeDeg: from.longitudeDeg,
    fromCountry: from.country,
    toCountry: to.country,
  }
}
