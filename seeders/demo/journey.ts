import { formatInTimeZone } from 'date-fns-tz'
import { offeredLeg } from '@/lib/planning/offers'
import type { PlanLeg, PlanOpenAir, PlanSurroundings } from '@/lib/schemas/plan'
import type { DemoPlaceKey } from './places'
import { DEMO_PLACES } from './places'

export type PlaceIds = Readonly<Record<DemoPlaceKey, number>>

/** One leg of a demo journey, in minutes; the builder turns it into the local times of its places. */
export interface Step {
  kind: PlanLeg['kind']
  phase?: PlanLeg['flightPhase']
  from: DemoPlaceKey
  to: DemoPlaceKey
  minutes: number
  surroundings: PlanSurroundings
  inCharge: readonly [name: string, telephone: string]
  hours?: string
  driverId?: number
  carrier?: string
  service?: string
  delay?: readonly [typicalMin: number, worstMin: number]
  stops?: PlanLeg['stops']
  lastPointOfReturn?: string
  fallback?: string
  note?: string
}

/** The legs of a journey that starts at one instant, each ending where and when the next begins. */
export function journey(start: Date, ids: PlaceIds, steps: readonly Step[]): PlanLeg[] {
  let at = start.getTime()
  return steps.map((step, index) => {
    const begin = new Date(at)
    at += step.minutes * 60_000
    const end = new Date(at)
    const phase = step.phase ?? null
    const offered = offeredLeg(step.kind, phase)
    return {
      id: `leg-${index + 1}`,
      kind: step.kind,
      flightPhase: phase,
      fromPlaceId: ids[step.from],
      toPlaceId: ids[step.to],
      startLocal: local(begin, step.from),
      startOffsetMin: null,
      endLocal: local(end, step.to),
      endOffsetMin: null,
      carrier: step.carrier ?? '',
      serviceNumber: step.service ?? '',
      surroundings: step.surroundings,
      pressureKPa: offered.pressureKPa,
      outOfCrate: false,
      partyInCharge: step.inCharge[0],
      partyTelephone: step.inCharge[1],
      partyHours: step.hours ?? 'at all hours',
      attended: step.driverId !== undefined,
      driverId: step.driverId ?? null,
      delayTypicalMin: step.delay?.[0] ?? offered.delayTypicalMin,
      delayWorstMin: step.delay?.[1] ?? offered.delayWorstMin,
      stops: [...(step.stops ?? [])],
      lastPointOfReturn: step.lastPointOfReturn ?? '',
      fallback: step.fallback ?? '',
      note: step.note ?? '',
    }
  })
}

function local(instant: Date, place: DemoPlaceKey) {
  return formatInTimeZone(instant, DEMO_PLACES[place].zone, "yyyy-MM-dd'T'HH:mm")
}

/** Steady outside air: °C, %, m/s, W/m². */
export function outside(
  airTempC: number,
  relHumidityPct: number,
  windMs = 2,
  solarWm2 = 0,
  shadePct = 0,
): PlanOpenAir {
  return { type: 'open-air', rows: [{ minute: 0, airTempC, relHumidityPct, windMs, solarWm2 }], shadePct }
}

/** A van with its fan running; with a set-point it is an insulated, climate-controlled one. */
export function van(around: PlanOpenAir, setPointC: number | null = null): PlanSurroundings {
  return {
    type: 'enclosed',
    spaceName: 'van',
    volumeM3: 12,
    heatTransferWK: 45,
    interiorMassKJK: 150,
    ventilationM3h: 240,
    leakageM3h: 6,
    solarApertureM2: 0.6,
    crateAirSpeedMs: 0.15,
    initialAirTempC: setPointC,
    conditioning: setPointC === null ? null : { setPointC, coolingW: 3_500, heatingW: 4_000 },
    outside: around,
  }
}

/** A hold with its doors shut on the ground: nobody says whether its fans run, so leakage alone counts. */
export function holdShut(around: PlanOpenAir, startC: number | null): PlanSurroundings {
  return {
    type: 'enclosed',
    spaceName: 'hold',
    volumeM3: 40,
    heatTransferWK: 80,
    interiorMassKJK: 200,
    ventilationM3h: null,
    leakageM3h: 12,
    solarApertureM2: 0,
    crateAirSpeedMs: 0.05,
    initialAirTempC: startC,
    conditioning: null,
    outside: around,
  }
}

/** Air held by somebody else's machine. */
export function held(
  airTempC: number,
  relHumidityPct: number,
  airSpeedMs = 0.15,
  around: PlanOpenAir | null = null,
): PlanSurroundings {
  return { type: 'controlled', airTempC, relHumidityPct, airSpeedMs, outside: around }
}
