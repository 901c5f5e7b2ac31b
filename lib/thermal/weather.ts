import type { Outer } from './crate'
import { KELVIN } from './constants'
import { exp, pow } from './elementary'
import { saturationDensityKgM3 } from './psychrometrics'
import type { ControlledAir, LegPlace, OpenAir, WeatherPoint } from './scenario'
import { sunParts, sunVector, type SunParts } from './sun'

/** Outermost air at one moment: what lies around the crates, or around the outermost enclosed space. */
export interface WeatherNode extends Outer {
  /** Seconds from departure. */
  s: number
  sun: SunParts
}

const AMBIENT_CO2_PPM = 420
/** Crates stand a metre high. */
const CRATE_HEIGHT_M = 1
const NODE_SPACING_S = 3600
const FAILURE_SPACING_S = 600
/** A space that loses its climate control drifts as fast as a parked car (τ 21.6 min, McLaren 2005): the quickest on record here. */
const DRIFT_S = 1296

const NO_SUN: SunParts = { beamWm2: 0, diffuseWm2: 0, globalWm2: 0, vector: undefined }

/** Nodes of open air over [fromS, toS]: its own points, and enough between for sun and humidity to be straight lines. */
export function openAirNodes(
  air: OpenAir,
  place: LegPlace | undefined,
  departureMs: number,
  fromS: number,
  toS: number,
): WeatherNode[] {
  const { series } = air
  const only = series.length === 1 ? series[0] : undefined
  if (only && only.solarWm2 === 0) return [openAirNode(air, only, fromS, undefined)]
  const moments = new Set<number>([fromS, toS])
  for (const point of series)
    if (point.minute * 60 > fromS && point.minute * 60 < toS) moments.add(point.minute * 60)
  const ordered = [...moments].sort((a, b) => a - b)
  return spread(ordered, NODE_SPACING_S).map((s) =>
    openAirNode(air, pointAt(series, s / 60), s, sunVector(departureMs + s * 1000, place)),
  )
}

export function controlledNode(air: ControlledAir, fromS: number): WeatherNode {
  return {
    s: fromS,
    airTempC: air.airTempC,
    surfaceTempC: air.surfaceTempC,
    deckTempC: air.surfaceTempC,
    waterKgM3: (air.relHumidityPct / 100) * saturationDensityKgM3(air.airTempC),
    co2Ppm: air.outsideCo2Ppm,
    speedMs: air.airSpeedMs,
    sun: NO_SUN,
  }
}

/** A held space from the moment its climate control fails: it drifts to the air outside, sheltered from sun and wind. */
export function driftNodes(
  held: WeatherNode,
  outside: WeatherNode[],
  failedS: number,
  toS: number,
): WeatherNode[] {
  const before: WeatherNode = { ...held, s: failedS }
  const moments = spread([failedS, toS], FAILURE_SPACING_S)
  const drifted = moments.slice(1).map((s) => {
    const out = interpolate(outside, s)
    const left = decay((s - failedS) / DRIFT_S)
    const mix = (from: number, to: number) => to + (from - to) * left
    return {
      ...before,
      s,
      airTempC: mix(before.airTempC, out.airTempC),
      surfaceTempC: mix(before.surfaceTempC, out.airTempC),
      deckTempC: mix(before.deckTempC, out.airTempC),
      waterKgM3: mix(before.waterKgM3, out.waterKgM3),
    }
  })
  return [before, ...drifted]
}

function decay(times: number): number {
  return exp(-times)
}

function spread(ordered: readonly number[], spacingS: number): number[] {
  const all: number[] = []
  ordered.forEach((moment, index) => {
    const previous = ordered[index - 1]
    if (previous !== undefined) {
      const pieces = Math.ceil((moment - previous) / spacingS)
      for (let i = 1; i < pieces; i++) all.push(previous + ((moment - previous) * i) / pieces)
    }
    all.push(moment)
  })
  return all
}

function openAirNode(
  air: OpenAir,
  point: WeatherPoint,
  s: number,
  vector: ReturnType<typeof sunVector>,
): WeatherNode {
  const open = 1 - air.shadePct / 100
  const sun = sunParts(
    point.solarWm2 * open,
    point.diffuseWm2 === undefined ? undefined : point.diffuseWm2 * open,
    vector,
  )
  const { airTempC } = point
  // Between a clear sky (Swinbank 1963) and an overcast one at air temperature, as far as the place is open to it.
  const clearSkyC = 0.0552 * pow(airTempC + KELVIN, 1.5) - KELVIN
  const skyTempC = point.skyTempC ?? 0.5 * (clearSkyC + airTempC)
  const groundTempC = air.groundTempC ?? airTempC + GROUND_K_PER_WM2 * sun.globalWm2
  return {
    s,
    airTempC,
    surfaceTempC: 0.5 * groundTempC + 0.5 * (airTempC + open * (skyTempC - airTempC)),
    deckTempC: groundTempC,
    waterKgM3: (point.relHumidityPct / 100) * saturationDensityKgM3(airTempC),
    co2Ppm: AMBIENT_CO2_PPM,
    speedMs: point.windMs * Math.min(1, pow(CRATE_HEIGHT_M / air.windHeightM, 0.25)),
    sun,
  }
}

/** Asphalt in full sun stands some 20 K over the air (judgement): 0.025 K per W/m². */
const GROUND_K_PER_WM2 = 0.025

function pointAt(series: readonly WeatherPoint[], minute: number): WeatherPoint {
  const first = series[0] as WeatherPoint
  const last = series[series.length - 1] as WeatherPoint
  if (minute <= first.minute || series.length === 1) return first
  if (minute >= last.minute) return last
  const next = series.findIndex((point) => point.minute > minute)
  const a = series[next - 1] as WeatherPoint
  const b = series[next] as WeatherPoint
  const share = (minute - a.minute) / (b.minute - a.minute)
  const mix = (x: number, y: number) => x + (y - x) * share
  return {
    minute,
    airTempC: mix(a.airTempC, b.airTempC),
    relHumidityPct: mix(a.relHumidityPct, b.relHumidityPct),
    windMs: mix(a.windMs, b.windMs),
    solarWm2: mix(a.solarWm2, b.solarWm2),
    ...(a.diffuseWm2 !== undefined &&
      b.diffuseWm2 !== undefined && { diffuseWm2: mix(a.diffuseWm2, b.diffuseWm2) }),
    ...(a.skyTempC !== undefined && b.skyTempC !== undefined && { skyTempC: mix(a.skyTempC, b.skyTempC) }),
  }
}

/** Straight line between nodes, steady beyond them. Sun is kept from the nearer node: callers turn it into watts first. */
export function interpolate(nodes: readonly WeatherNode[], s: number): WeatherNode {
  const first = nodes[0] as WeatherNode
  const next = nodes.findIndex((node) => node.s > s)
  if (next === 0 || nodes.length === 1) return { ...first, s }
  if (next < 0) return { ...(nodes[nodes.length - 1] as WeatherNode), s }
  const a = nodes[next - 1] as WeatherNode
  const b = nodes[next] as WeatherNode
  const share = (s - a.s) / (b.s - a.s)
  const mix = (x: number, y: number) => x + (y - x) * share
  return {
    s,
    airTempC: mix(a.airTempC, b.airTempC),
    surfaceTempC: mix(a.surfaceTempC, b.surfaceTempC),
    deckTempC: mix(a.deckTempC, b.deckTempC),
    waterKgM3: mix(a.waterKgM3, b.waterKgM3),
    co2Ppm: mix(a.co2Ppm, b.co2Ppm),
    speedMs: mix(a.speedMs, b.speedMs),
    sun: a.sun,
  }
}
