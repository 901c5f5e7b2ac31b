import { SteadfoldError } from '../errors'
import type { Schedule } from './result'
import type { ControlledAir, EnclosedSpace, Leg, OpenAir, Scenario, Surroundings } from './scenario'

/**
 * Every schedule a journey is judged on: on time, all legs at their typical delay, and each leg in turn at its worst
 * with all others typical. A delay lengthens its leg and moves every later one. Schedules equal to an earlier one are left out.
 */
export function schedulesOf(scenario: Scenario): Schedule[] {
  const ids = ['on-time', 'typical', ...scenario.legs.map((leg) => `worst:${leg.id}`)]
  const seen = new Set<string>()
  const schedules: Schedule[] = []
  for (const id of ids) {
    const legStartMin = startsOf(withDelays(scenario, id).legs)
    const times = legStartMin.join(' ')
    if (seen.has(times)) continue
    seen.add(times)
    schedules.push({ id, legStartMin })
  }
  return schedules
}

/** The same journey with the delays of one schedule written into its durations. Throws `invalid` for an unknown schedule. */
export function withDelays(scenario: Scenario, scheduleId: string): Scenario {
  if (scheduleId === 'on-time') return scenario
  const worstLegId = scheduleId.startsWith('worst:') ? scheduleId.slice('worst:'.length) : undefined
  if (worstLegId === undefined && scheduleId !== 'typical') throw unknown('schedule', scheduleId)
  if (worstLegId !== undefined) legIndex(scenario, worstLegId)
  const legs = scenario.legs.map((leg) => {
    const delayMin = leg.id === worstLegId ? leg.delay.worstMin : leg.delay.typicalMin
    return { ...leg, durationMin: leg.durationMin + delayMin }
  })
  return { ...scenario, legs }
}

/** Leg starts in minutes from departure, one entry more than legs: the last is the arrival. */
export function startsOf(legs: readonly Leg[]): number[] {
  const starts = [0]
  let minute = 0
  for (const leg of legs) {
    minute += leg.durationMin
    starts.push(minute)
  }
  return starts
}

/** The same journey with one leg lasting `extraMin` longer and every later leg moved. */
export function lengthenLeg(scenario: Scenario, legId: string, extraMin: number): Scenario {
  return replaceLeg(scenario, legId, (leg) => ({ ...leg, durationMin: leg.durationMin + extraMin }))
}

/** The same journey with steady air outside the crates on one leg: what a stop limit asks. */
export function holdLegAt(
  scenario: Scenario,
  legId: string,
  air: { airTempC: number; relHumidityPct: number; airSpeedMs?: number },
): Scenario {
  return replaceLeg(scenario, legId, (leg) => ({
    ...leg,
    events: [],
    surroundings: {
      type: 'controlled',
      airTempC: air.airTempC,
      relHumidityPct: air.relHumidityPct,
      airSpeedMs: air.airSpeedMs ?? airSpeedOf(leg.surroundings),
      surfaceTempC: air.airTempC,
      outsideCo2Ppm: 420,
    },
  }))
}

/** All air, surfaces, set-points and initial air `deltaC` warmer at the same relative humidity. */
export function shiftAir(scenario: Scenario, deltaC: number): Scenario {
  if (deltaC === 0) return scenario
  const legs = scenario.legs.map((leg) => ({ ...leg, surroundings: shifted(leg.surroundings, deltaC) }))
  const crates = scenario.crates.map((crate) =>
    crate.initialAirTempC === undefined
      ? crate
      : { ...crate, initialAirTempC: crate.initialAirTempC + deltaC },
  )
  return { ...scenario, legs, crates }
}

function shifted(surroundings: Surroundings, deltaC: number): Surroundings {
  switch (surroundings.type) {
    case 'controlled':
      return shiftedControlled(surroundings, deltaC)
    case 'open-air':
      return shiftedOpenAir(surroundings, deltaC)
    case 'enclosed':
      return shiftedEnclosed(surroundings, deltaC)
  }
}

function shiftedControlled(air: ControlledAir, deltaC: number): ControlledAir {
  return {
    ...air,
    airTempC: air.airTempC + deltaC,
    surfaceTempC: air.surfaceTempC + deltaC,
    ...(air.outside && { outside: shiftedOpenAir(air.outside, deltaC) }),
  }
}

function shiftedOpenAir(air: OpenAir, deltaC: number): OpenAir {
  const series = air.series.map((point) => ({
    ...point,
    airTempC: point.airTempC + deltaC,
    ...(point.skyTempC !== undefined && { skyTempC: point.skyTempC + deltaC }),
  }))
  return { ...air, series, ...(air.groundTempC !== undefined && { groundTempC: air.groundTempC + deltaC }) }
}

function shiftedEnclosed(space: EnclosedSpace, deltaC: number): EnclosedSpace {
  const { initialAirTempC, wallTempC, conditioning } = space
  return {
    ...space,
    ...(initialAirTempC !== undefined && { initialAirTempC: initialAirTempC + deltaC }),
    ...(wallTempC !== undefined && { wallTempC: wallTempC + deltaC }),
    ...(conditioning && { conditioning: { ...conditioning, setPointC: conditioning.setPointC + deltaC } }),
    outside: shifted(space.outside, deltaC),
  }
}

function airSpeedOf(surroundings: Surroundings): number {
  switch (surroundings.type) {
    case 'controlled':
      return surroundings.airSpeedMs
    case 'enclosed':
      return surroundings.crateAirSpeedMs
    case 'open-air':
      // A standing crate in shelter: the stop limit must not count on wind.
      return 0.1
  }
}

function replaceLeg(scenario: Scenario, legId: string, change: (leg: Leg) => Leg): Scenario {
  const index = legIndex(scenario, legId)
  return { ...scenario, legs: scenario.legs.map((leg, i) => (i === index ? change(leg) : leg)) }
}

function legIndex(scenario: Scenario, legId: string): number {
  const index = scenario.legs.findIndex((leg) => leg.id === legId)
  if (index < 0) throw unknown('leg', legId)
  return index
}

function unknown(what: string, id: string): SteadfoldError {
  return new SteadfoldError('invalid', `No ${what} "${id}" in this journey.`)
}
