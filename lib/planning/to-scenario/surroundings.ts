import type { PlanLeg, PlanOpenAir, PlanSurroundings } from '@/lib/schemas/plan'
import type {
  ControlledAir,
  EnclosedSpace,
  OpenAir,
  Surroundings,
  WeatherPoint,
} from '@/lib/thermal/scenario'

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
      return openAir(air, minutes)
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
    ...(air.outside === null ? {} : { outside: openAir(air.outside, minutes) }),
  }
}

function openAir(air: PlanOpenAir, { startMin, untilMin }: LegMinutes): OpenAir {
  const series = air.rows.map((row): WeatherPoint => ({
    minute: startMin + row.minute,
    airTempC: known(row.airTempC),
    relHumidityPct: known(row.relHumidityPct),
    windMs: row.windMs ?? 0,
    // Empty sun counts as none; by day the rules then say that nobody gave it.
    solarWm2: row.solarWm2 ?? 0,
  }))
  const last = series.at(-1)
  const held = last !== undefined && series.length > 1 && last.minute < untilMin
  return {
    type: 'open-air',
    series: held ? [...series, { ...last, minute: untilMin }] : series,
    source: 'typed',
    shadePct: air.shadePct,
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
    ...startOf(legs[index - 1]?.surroundings, space),
    ...conditioningOf(space),
    outside: openAir(space.outside, minutes),
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
function startOf(before: PlanSurroundings | undefined, space: PlanEnclosed) {
  if (space.initialAirTempC !== null) return { initialAirTempC: space.initialAirTempC }
  if (before?.type !== 'controlled' || space.spaceName === '') return {}
  const airTempC = known(before.airTempC)
  return {
    initialAirTempC: airTempC,
    initialRelHumidityPct: known(before.relHumidityPct),
    wallTempC: airTempC,
  }
}

/**
 * Only neighbouring legs in one space share its air. A van that comes back two flights later is another van, whatever it
 * is called.
 */
function compartment(legs: readonly PlanLeg[], index: number, { spaceName }: PlanEnclosed) {
  if (spaceName === '') return {}
  let first = index
  while (sameSpace(legs[first - 1], spaceName)) first -= 1
  return { compartmentId: `space-${legs[first]?.id ?? ''}` }
}

function sameSpace(leg: PlanLeg | undefined, spaceName: string): boolean {
  return leg?.surroundings.type === 'enclosed' && leg.surroundings.spaceName === spaceName
}

/** Global mean of outdoor air; NOAA Global Monitoring Laboratory gives 422 to 425 ppm for 2023 to 2024. */
const OUTDOOR_CO2_PPM = 420

function known(value: number | null): number {
  if (value === null) throw new RangeError('An air figure is missing.')
  return value
}
