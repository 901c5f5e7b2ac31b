import type { PlanLeg, PlanOpenAir, PlanSurroundings } from '@/lib/schemas/plan'
import type {
  ControlledAir,
  EnclosedSpace,
  OpenAir,
  Surroundings,
  WeatherPoint,
} from '@/lib/thermal/scenario'
import { airStart, firstInSpace } from '../spaces'

type PlanEnclosed = Extract<PlanSurroundings, { type: 'enclosed' }>
type PlanControlled = Extract<PlanSurroundings, { type: 'controlled' }>

export interface LegMinutes {
  startMin: number
  /** Weather must be known until here. */
  untilMin: number
}

/** The air of one leg as the engine takes it. Throws a RangeError where an air figure is missing. */
export function scenarioSurroundings(
  legs: readonly PlanLeg[],
  index: number,
  minutes: LegMinutes,
): Surroundings {
  const air = legs[index]?.surroundings
  if (air === undefined) throw new RangeError(`There is no leg ${index + 1}.`)
  switch (air.type) {
    case 'open-air':
      return openAir(air, minutes, { wind: true, sun: true })
    case 'controlled':
      return controlled(air, minutes)
    case 'enclosed':
      return enclosed(legs, index, air, minutes)
  }
}

function controlled(air: PlanControlled, minutes: LegMinutes): ControlledAir {
  const airTempC = known(air.airTempC)
  return {
    type: 'controlled',
    airTempC,
    relHumidityPct: known(air.relHumidityPct),
    airSpeedMs: air.airSpeedMs,
    surfaceTempC: airTempC,
    outsideCo2Ppm: OUTDOOR_CO2_PPM,
    ...(air.outside === null ? {} : { outside: openAir(air.outside, minutes, { wind: false, sun: false }) }),
  }
}

/**
 * Round a closed space no wind is felt, and round a room held at a set-point no sun either: the form does not ask for them
 * there, and what is left over from other surroundings does not count.
 */
function openAir(
  air: PlanOpenAir,
  { startMin, untilMin }: LegMinutes,
  counts: { wind: boolean; sun: boolean },
): OpenAir {
  const series = air.rows.map((row): WeatherPoint => ({
    minute: startMin + row.minute,
    airTempC: known(row.airTempC),
    relHumidityPct: known(row.relHumidityPct),
    windMs: counts.wind ? (row.windMs ?? 0) : 0,
    // Empty sun counts as none; by day the rules then say that nobody gave it.
    solarWm2: counts.sun ? (row.solarWm2 ?? 0) : 0,
  }))
  const last = series.at(-1)
  const held = last !== undefined && series.length > 1 && last.minute < untilMin
  return {
    type: 'open-air',
    series: held ? [...series, { ...last, minute: untilMin }] : series,
    source: 'typed',
    shadePct: counts.sun ? air.shadePct : 0,
    groundAlbedo: 0.2,
    windHeightM: 10,
  }
}

function enclosed(
  legs: readonly PlanLeg[],
  index: number,
  space: PlanEnclosed,
  minutes: LegMinutes,
): EnclosedSpace {
  return {
    type: 'enclosed',
    volumeM3: space.volumeM3,
    heatTransferWK: space.heatTransferWK,
    interiorMassKJK: space.interiorMassKJK,
    ...(space.ventilationM3h === null ? {} : { ventilationM3h: space.ventilationM3h }),
    leakageM3h: space.leakageM3h,
    solarApertureM2: space.solarApertureM2,
    solarTransmittance: 0.6,
    crateAirSpeedMs: space.crateAirSpeedMs,
    ...startOf(legs, index, space),
    ...conditioningOf(space),
    outside: openAir(space.outside, minutes, { wind: false, sun: true }),
    ...compartment(legs, index, space),
  }
}

function conditioningOf({ conditioning }: PlanEnclosed) {
  if (conditioning === null) return {}
  const [setPointC, coolingW, heatingW] = [
    known(conditioning.setPointC),
    known(conditioning.coolingW),
    known(conditioning.heatingW),
  ]
  if (coolingW <= 0 && heatingW <= 0) throw new RangeError('A set-point has no watts to hold it.')
  return { conditioning: { setPointC, coolingW, heatingW } }
}

/** A hold that was kept at a set-point in the air begins its wait on the ground at that set-point, walls too. */
function startOf(legs: readonly PlanLeg[], index: number, { initialAirTempC }: PlanEnclosed) {
  const before = legs[index - 1]?.surroundings
  switch (airStart(legs, index)) {
    case 'own':
      return initialAirTempC === null ? {} : { initialAirTempC }
    case 'carried':
      return {}
    case 'flight': {
      if (before?.type !== 'controlled') return {}
      const airTempC = known(before.airTempC)
      return {
        initialAirTempC: airTempC,
        initialRelHumidityPct: known(before.relHumidityPct),
        wallTempC: airTempC,
      }
    }
  }
}

function compartment(legs: readonly PlanLeg[], index: number, { spaceName }: PlanEnclosed) {
  return spaceName === '' ? {} : { compartmentId: `space-${legs[firstInSpace(legs, index)]?.id ?? ''}` }
}

/** Global mean of outdoor air; NOAA Global Monitoring Laboratory gives 422 to 425 ppm for 2023 to 2024. */
const OUTDOOR_CO2_PPM = 420

function known(value: number | null): number {
  if (value === null) throw new RangeError('An air figure is missing.')
  return value
}
