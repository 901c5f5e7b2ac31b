import type { Plan, PlanLeg, PlanPlace } from '@/lib/schemas/plan'
import { localMoment, resolveLocalTime } from './local-time'
import type { LocalMoment, ResolvedTime } from './local-time'

export interface TimedLeg {
  legId: string
  /** null while the place is not chosen or not known. */
  from: PlanPlace | null
  to: PlanPlace | null
  start: ResolvedTime
  end: ResolvedTime
  /** null until the wall time names one instant. */
  startMs: number | null
  endMs: number | null
}

export interface Timeline {
  legs: TimedLeg[]
  departureMs: number | null
  arrivalMs: number | null
  departureZone: string | null
  arrivalZone: string | null
}

/** The legs of a plan on one clock: each start read at its from-place, each end at its to-place. */
export function timelineOf(plan: Pick<Plan, 'legs'>, places: readonly PlanPlace[]): Timeline {
  const byId = new Map(places.map((place) => [place.id, place]))
  const legs = plan.legs.map((leg) => timedLeg(leg, byId))
  const first = legs[0]
  const last = legs.at(-1)
  return {
    legs,
    departureMs: first?.startMs ?? null,
    arrivalMs: last?.endMs ?? null,
    departureZone: first?.from?.zone ?? null,
    arrivalZone: last?.to?.zone ?? null,
  }
}

/** A minute of the journey on the clock where it began and on the clock where it ends. */
export function bothLocalTimes(
  journey: { departureMs: number; departureZone: string; arrivalZone: string },
  minute: number,
): { departure: LocalMoment; arrival: LocalMoment } {
  const instantMs = journey.departureMs + minute * 60_000
  return {
    departure: localMoment(instantMs, journey.departureZone),
    arrival: localMoment(instantMs, journey.arrivalZone),
  }
}

function timedLeg(leg: PlanLeg, places: ReadonlyMap<number, PlanPlace>): TimedLeg {
  const from = placeOf(leg.fromPlaceId, places)
  const to = placeOf(leg.toPlaceId, places)
  const start = resolveLocalTime(leg.startLocal, from?.zone ?? '', leg.startOffsetMin)
  const end = resolveLocalTime(leg.endLocal, to?.zone ?? '', leg.endOffsetMin)
  return { legId: leg.id, from, to, start, end, startMs: instantOf(start), endMs: instantOf(end) }
}

function placeOf(id: number | null, places: ReadonlyMap<number, PlanPlace>): PlanPlace | null {
  return id === null ? null : (places.get(id) ?? null)
}

function instantOf(time: ResolvedTime): number | null {
  return time.kind === 'instant' ? time.instantMs : null
}
