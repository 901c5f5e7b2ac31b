import type { PlanLeg, PlanOpenAir, PlanSurroundings } from '@/lib/schemas/plan'

/*
 * What the form puts where nobody knows better. Every figure here is offered, not measured: a judgement of ours, to be
 * replaced by what the vehicle's owner or the carrier says. Air is never offered: an air nobody asked about stays empty,
 * and a plan with an empty air cannot be assessed.
 */

export const OFFERED_MARK = 'offered, not measured'

export interface OfferedLeg {
  surroundings: PlanSurroundings
  pressureKPa: number
  delayTypicalMin: number
  delayWorstMin: number
  mark: typeof OFFERED_MARK
}

/** Surroundings, pressure and delays for a leg of this kind. The carrier's own figures replace them. */
export function offeredLeg(kind: PlanLeg['kind'], flightPhase: PlanLeg['flightPhase']): OfferedLeg {
  const [delayTypicalMin, delayWorstMin] = offeredDelay(kind, flightPhase)
  return {
    surroundings: offeredSurroundings(kind, flightPhase),
    pressureKPa: kind === 'flight' && flightPhase === 'airborne' ? CABIN_PRESSURE_KPA : SEA_LEVEL_KPA,
    delayTypicalMin,
    delayWorstMin,
    mark: OFFERED_MARK,
  }
}

/** Standard atmosphere at sea level, and at 2,438 m (8,000 ft), the highest cabin altitude of 14 CFR 25.841. */
export const SEA_LEVEL_KPA = 101.325
export const CABIN_PRESSURE_KPA = 75.3

export function offeredSurroundings(
  kind: PlanLeg['kind'],
  flightPhase: PlanLeg['flightPhase'],
): PlanSurroundings {
  switch (kind) {
    case 'road':
    case 'sea':
    case 'rail':
      return offeredVan()
    case 'ramp':
      return offeredOpenAir()
    case 'flight':
      return flightPhase === 'airborne' ? offeredControlled(HOLD_AIR_SPEED_MS) : offeredHold()
    case 'shed':
    case 'border':
    case 'rest':
      return offeredControlled(STILL_AIR_MS)
  }
}

const STILL_AIR_MS = 0.1
const VAN_AIR_SPEED_MS = 0.1
const HOLD_AIR_SPEED_MS = 0.05

function offeredVan(): PlanSurroundings {
  return {
    type: 'enclosed',
    spaceName: 'van',
    volumeM3: 12,
    heatTransferWK: 45,
    interiorMassKJK: 150,
    ventilationM3h: 60,
    leakageM3h: 6,
    solarApertureM2: 1,
    crateAirSpeedMs: VAN_AIR_SPEED_MS,
    initialAirTempC: null,
    conditioning: null,
    outside: offeredOpenAir(),
  }
}

/** A hold on the ground with its doors shut: the fans are unknown, so leakage alone is counted. */
function offeredHold(): PlanSurroundings {
  return {
    type: 'enclosed',
    spaceName: 'hold',
    volumeM3: 40,
    heatTransferWK: 80,
    interiorMassKJK: 200,
    ventilationM3h: null,
    leakageM3h: 4,
    solarApertureM2: 0,
    crateAirSpeedMs: HOLD_AIR_SPEED_MS,
    initialAirTempC: null,
    conditioning: null,
    outside: offeredOpenAir(),
  }
}

function offeredControlled(airSpeedMs: number): PlanSurroundings {
  return { type: 'controlled', airTempC: null, relHumidityPct: null, airSpeedMs, outside: null }
}

export function offeredOpenAir(): PlanOpenAir {
  return {
    type: 'open-air',
    rows: [{ minute: 0, airTempC: null, relHumidityPct: null, windMs: null, solarWm2: null }],
    shadePct: 0,
  }
}

/** Minutes, typical and worst. A judgement of ours throughout: ask the party in charge. */
function offeredDelay(kind: PlanLeg['kind'], flightPhase: PlanLeg['flightPhase']): [number, number] {
  switch (kind) {
    case 'road':
      return [15, 60]
    case 'shed':
      return [30, 180]
    case 'ramp':
      return [10, 45]
    case 'flight':
      return flightPhase === 'airborne' ? [10, 60] : [10, 45]
    case 'sea':
      return [30, 240]
    case 'rail':
      return [20, 120]
    case 'border':
      return [30, 180]
    case 'rest':
      return [0, 60]
  }
}
