import { SteadfoldError } from '../errors'
import type { Body } from './body'
import { beddingWaterKg, boxOf } from './box'
import { compartmentOf, type Compartment } from './compartment'
import type { Box, Outer } from './crate'
import type { Excitement } from './excitement'
import type { Journey } from './journey'
import { saturationDensityKgM3 } from './psychrometrics'
import type { Failure } from './run'
import type { ControlledAir, Crate, CrateOnLeg, EnclosedSpace, Leg, OpenAir } from './scenario'
import type { Store } from './store'
import { flowFactor } from './variants'
import { controlledNode, driftNodes, openAirNodes, type WeatherNode } from './weather'
import { excitementOn } from './excitement'
import { startAnimal } from './start-animal'

/** A leg taken apart into what the integrator needs; `legModelOf` puts it together. */
export interface Built {
  leg: Leg
  fromS: number
  toS: number
  nodes: WeatherNode[]
  spaces: Compartment[]
  boxes: Box[]
  crates: Crate[]
  onLegs: (CrateOnLeg | undefined)[]
  exposedM2: number[]
  albedo: number
  anySun: boolean
  sunlitSpace: { space: Compartment; apertureM2: number; transmittance: number } | undefined
  excitement: Excitement[]
  switches: Switch[]
  drinks: Drink[]
}

export interface Switch {
  kind: 'fan' | 'conditioning' | 'door'
  space: Compartment
  fromS: number
  toS: number
  openAreaM2: number
}

export interface Drink {
  body: Body
  fromS: number
  toS: number
  /** Settled when it starts; negative until then. */
  kgS: number
}

const DRINK_S = 300
const DOOR_M2 = 2

/** Compiles leg `index` over [fromS, toS] and gives every crate, animal and space not yet in the store its first state. */
export function buildLeg(
  journey: Journey,
  store: Store,
  index: number,
  fromS: number,
  toS: number,
  failure: Failure | undefined,
): Built {
  const leg = journey.legs[index] as Leg
  const chain = enclosedChain(leg)
  const factor = flowFactor(journey.variant)
  const nodes = weatherNodes(journey, leg, chain.outermost, fromS, toS, failure)
  const spaces = chain.spaces.map((space, depth) =>
    compartmentOf(spaceId(leg, space, depth), space, leg.pressureKPa, factor),
  )
  startSpaces(journey, store, index, chain.spaces, spaces, nodes[0] as WeatherNode)
  const aboard = journey.crates.filter(({ fromLeg, toLeg }) => fromLeg <= index && index <= toLeg)
  const boxes = aboard.map(({ crate, bodies, mammals }) => boxOf(crate, bodies, leg, mammals, factor))
  for (const { bodies } of aboard) {
    for (const body of bodies) {
      // Neither a drink nor the sun of the leg before goes on into this one.
      body.drinkKgS = 0
      body.sunW = 0
    }
  }
  const around = airAround(store, spaces, nodes[0] as WeatherNode)
  aboard.forEach(({ crate, bodies }, i) => {
    startCrate(store, crate, around)
    bodies.forEach((body, j) => startAnimal(store, crate, crate.occupants[j], body, boxes[i] as Box, around))
  })
  const outermostSpace = chain.spaces[chain.spaces.length - 1]
  const sunlit =
    outermostSpace !== undefined && chain.outermost.type === 'open-air' && outermostSpace.solarApertureM2 > 0
  return {
    leg,
    fromS,
    toS,
    nodes,
    spaces,
    boxes,
    crates: aboard.map(({ crate }) => crate),
    onLegs: aboard.map(({ crate }) => crate.byLeg.find((entry) => entry.legId === leg.id)),
    exposedM2: boxes.map((box) => box.bodies.reduce((sum, body) => sum + body.exposedM2 * body.count, 0)),
    albedo: chain.outermost.type === 'open-air' ? chain.outermost.groundAlbedo : 0,
    anySun: nodes.some((node) => node.sun.globalWm2 > 0) && (spaces.length === 0 || sunlit),
    sunlitSpace: sunlit
      ? {
          space: spaces[spaces.length - 1] as Compartment,
          apertureM2: outermostSpace.solarApertureM2,
          transmittance: outermostSpace.solarTransmittance,
        }
      : undefined,
    excitement: aboard.flatMap(({ crate, bodies, fromLeg }) =>
      bodies.map((body, j) => excitementOn(journey, crate.occupants[j], body, fromLeg, index, fromS)),
    ),
    switches: switchesOf(journey, leg, index, spaces[0], failure),
    drinks: aboard.flatMap(({ crate, bodies }) =>
      bodies.flatMap((body, j) =>
        (crate.occupants[j]?.waterOfferedMin ?? []).map((minute) => ({
          body,
          fromS: minute * 60,
          toS: minute * 60 + DRINK_S,
          kgS: -1,
        })),
      ),
    ),
  }
}

/** Enclosed spaces from the crates outward, and the air outside the last. */
function enclosedChain(leg: Leg): { spaces: EnclosedSpace[]; outermost: ControlledAir | OpenAir } {
  const spaces: EnclosedSpace[] = []
  let surroundings = leg.surroundings
  while (surroundings.type === 'enclosed') {
    spaces.push(surroundings)
    if (spaces.length > 2)
      throw new SteadfoldError('invalid', `Leg "${leg.id}" nests enclosed spaces more than twice.`)
    surroundings = surroundings.outside
  }
  return { spaces, outermost: surroundings }
}

function spaceId(leg: Leg, space: EnclosedSpace, depth: number): string {
  return space.compartmentId ?? `${leg.id}${depth === 0 ? '' : ':outside'}`
}

function weatherNodes(
  journey: Journey,
  leg: Leg,
  air: ControlledAir | OpenAir,
  fromS: number,
  toS: number,
  failure: Failure | undefined,
): WeatherNode[] {
  if (air.type === 'open-air') {
    if (air.series.length === 0) throw new SteadfoldError('invalid', `Leg "${leg.id}" has no weather.`)
    return openAirNodes(air, leg.place, journey.departureMs, fromS, toS)
  }
  const held = controlledNode(air, fromS)
  const failedS = failure?.kind === 'climate' ? Math.max(fromS, failure.fromMin * 60) : Infinity
  if (leg.surroundings.type !== 'controlled' || !air.outside || failedS >= toS) return [held]
  const outside = openAirNodes(air.outside, leg.place, journey.departureMs, failedS, toS)
  return [...(failedS > fromS ? [held] : []), ...driftNodes(held, outside, failedS, toS)]
}

function startSpaces(
  journey: Journey,
  store: Store,
  index: number,
  declared: readonly EnclosedSpace[],
  spaces: readonly Compartment[],
  weather: WeatherNode,
): void {
  let around: Outer = weather
  for (let depth = spaces.length - 1; depth >= 0; depth--) {
    const { id } = spaces[depth] as Compartment
    const space = declared[depth] as EnclosedSpace
    const handed = depth === 0 ? handedOver(journey, index) : undefined
    const known = store.spaces.get(id)
    if (handed) {
      store.spaces.set(id, handed)
    } else if (!known) {
      const airC = space.initialAirTempC ?? around.airTempC
      const humidity = space.initialRelHumidityPct
      const full = saturationDensityKgM3(airC)
      store.spaces.set(id, {
        airC,
        massC: space.wallTempC ?? airC,
        waterKgM3: humidity === undefined ? Math.min(0.99 * full, around.waterKgM3) : (humidity / 100) * full,
        co2Ppm: around.co2Ppm,
      })
    }
    const state = store.spaces.get(id)
    if (state) around = { ...around, airTempC: state.airC, waterKgM3: state.waterKgM3, co2Ppm: state.co2Ppm }
  }
}

/** An airborne hold kept at a set-point hands its air to the doors-shut leg after it. */
function handedOver(journey: Journey, index: number) {
  const before = journey.legs[index - 1]
  const now = journey.legs[index]
  if (before?.kind !== 'flight' || now?.kind !== 'flight' || before.surroundings.type !== 'controlled')
    return undefined
  const { airTempC, surfaceTempC, relHumidityPct, outsideCo2Ppm } = before.surroundings
  return {
    airC: airTempC,
    massC: surfaceTempC,
    waterKgM3: (relHumidityPct / 100) * saturationDensityKgM3(airTempC),
    co2Ppm: outsideCo2Ppm,
  }
}

function airAround(store: Store, spaces: readonly Compartment[], weather: WeatherNode): Outer {
  const inner = spaces[0]
  const state = inner && store.spaces.get(inner.id)
  if (!inner || !state) return weather
  return {
    airTempC: state.airC,
    surfaceTempC: state.massC,
    deckTempC: state.massC,
    waterKgM3: state.waterKgM3,
    co2Ppm: state.co2Ppm,
    speedMs: inner.crateAirSpeedMs,
  }
}

function startCrate(store: Store, crate: Crate, around: Outer): void {
  if (store.crates.has(crate.id)) return
  const airC = crate.initialAirTempC ?? around.airTempC
  const full = saturationDensityKgM3(airC)
  const humidity = crate.initialRelHumidityPct
  store.crates.set(crate.id, {
    airC,
    wallC: airC,
    bedC: airC,
    waterKgM3: humidity === undefined ? Math.min(0.99 * full, around.waterKgM3) : (humidity / 100) * full,
    co2Ppm: around.co2Ppm,
    bedWaterKg: beddingWaterKg(crate),
    sums: [0, 0, 0],
  })
}

/** Interruptions: a fan or conditioning event is the time it is off, a door event the time it stands open. */
function switchesOf(
  journey: Journey,
  leg: Leg,
  index: number,
  space: Compartment | undefined,
  failure: Failure | undefined,
): Switch[] {
  if (!space) return []
  const legStartS = (journey.startsMin[index] as number) * 60
  const planned = leg.events.map((event): Switch => {
    const fromS = legStartS + event.minute * 60
    return {
      kind: event.kind,
      space,
      fromS,
      toS: fromS + event.durationMin * 60,
      openAreaM2: event.openAreaM2 ?? DOOR_M2,
    }
  })
  if (!failure) return planned
  const kind = failure.kind === 'climate' ? 'conditioning' : 'fan'
  return [...planned, { kind, space, fromS: failure.fromMin * 60, toS: Number.MAX_VALUE, openAreaM2: 0 }]
}
