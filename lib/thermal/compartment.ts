import { airHeatJM3K } from './body'
import { latentHeatJKg } from './psychrometrics'
import { saturatedVapour, vapourOf } from './saturation'
import type { EnclosedSpace } from './scenario'
import { positivePart, smoothAbs, smoothstep } from './smooth'
import { cbrt } from './elementary'
import { GRAVITY, KELVIN } from './constants'
import type { Outer } from './crate'

/**
 * An enclosed space on one leg: air with vapour and CO2, and an inner mass (lining, seats, load) that holds most of the heat and takes
 * most of the sun. The stated UA runs from the air: sun of Q watts raises it by Q/UA in the end.
 */
export interface Compartment {
  id: string
  pressureKPa: number
  volumeM3: number
  airHeatJK: number
  massHeatJK: number
  /** Air to inner mass, and the stated UA from air to outside, W/K. */
  insideWK: number
  outsideWK: number
  condensingM2: number
  ventilationM3S: number
  leakageM3S: number
  crateAirSpeedMs: number
  setPointC: number
  coolingW: number
  heatingW: number
  otherW: number
  otherKgS: number
  otherCo2M3S: number
  /** Switched by events and failures. */
  fanOn: boolean
  conditioningOn: boolean
  doorM2: number
  sunW: number
  rates: CompartmentRates
  /** What crates (and an inner compartment) give it at this instant. */
  load: CompartmentLoad
}

export interface CompartmentLoad {
  airW: number
  massW: number
  waterKgS: number
  co2M3S: number
}

export interface CompartmentRates {
  air: number
  mass: number
  water: number
  co2: number
  /** To its own outside. */
  outAirW: number
  outMassW: number
  outWaterKgS: number
  outCo2M3S: number
}

/** Film inside the shell with its long-wave part, W/m²K. */
const SHELL_FILM = 8
/** Film between air and inner surfaces of a vehicle or hold, W/m²K, convective. */
const INNER_FILM = 4
/** Sun through the glass falls on the inside; a share warms the air within minutes (judgement). */
const SUN_TO_AIR = 0.3
/** How much colder the air leaves a cooling coil (judgement); the stated capacity is the sensible part. */
const COIL_K = 10
/** A thermostat goes from idle to full over half a kelvin. */
const THERMOSTAT_K = 0.5

export function compartmentOf(
  id: string,
  space: EnclosedSpace,
  pressureKPa: number,
  leakFactor: number,
): Compartment {
  const side = cbrt(space.volumeM3)
  const innerM2 = 6 * side * side
  return {
    id,
    pressureKPa,
    volumeM3: space.volumeM3,
    airHeatJK: 2 * airHeatJM3K(20, pressureKPa) * space.volumeM3,
    massHeatJK: Math.max(1000, space.interiorMassKJK * 1000),
    insideWK: INNER_FILM * innerM2,
    outsideWK: space.heatTransferWK,
    condensingM2: innerM2,
    ventilationM3S: (space.ventilationM3h ?? 0) / 3600,
    leakageM3S: (space.leakageM3h * leakFactor) / 3600,
    crateAirSpeedMs: space.crateAirSpeedMs,
    setPointC: space.conditioning?.setPointC ?? 0,
    coolingW: space.conditioning?.coolingW ?? 0,
    heatingW: space.conditioning?.heatingW ?? 0,
    otherW: space.otherLoad?.sensibleW ?? 0,
    otherKgS: (space.otherLoad?.moistureGh ?? 0) / 3.6e6,
    otherCo2M3S: (space.otherLoad?.co2Lh ?? 0) / 3.6e6,
    fanOn: true,
    conditioningOn: true,
    doorM2: 0,
    sunW: 0,
    rates: { air: 0, mass: 0, water: 0, co2: 0, outAirW: 0, outMassW: 0, outWaterKgS: 0, outCo2M3S: 0 },
    load: { airW: 0, massW: 0, waterKgS: 0, co2M3S: 0 },
  }
}

/** Rates of the compartment's states with `outer` around it and `load` inside it. */
export function rateCompartment(
  space: Compartment,
  outer: Outer,
  airC: number,
  massC: number,
  waterKgM3: number,
  co2Ppm: number,
): void {
  const { rates, load } = space
  const rhoCp = airHeatJM3K(airC, space.pressureKPa)
  const flow = flowM3S(space, airC, outer)
  const ventedW = rhoCp * flow * (airC - outer.airTempC)
  const insideW = space.insideWK * (airC - massC)
  const outsideW = space.outsideWK * (airC - outer.airTempC)
  // Inside of the shell, where water condenses first: the share of the drop that its film takes.
  const shellC = airC - outsideW / (SHELL_FILM * space.condensingM2)
  const vapour = vapourOf(waterKgM3, saturatedVapour(airC))
  const beta = INNER_FILM / (0.93 * rhoCp)
  const condensed = beta * space.condensingM2 * positivePart(vapour - saturatedVapour(shellC), 1e-6)
  const cooledW = coolingW(space, airC)
  // Air leaves the coil 10 K colder and no wetter than saturated there; the rest drips off.
  const wrungOut = (cooledW / (rhoCp * COIL_K)) * positivePart(vapour - saturatedVapour(airC - COIL_K), 1e-5)
  const vented = flow * (waterKgM3 - outer.waterKgM3)
  const ventedCo2 = flow * (co2Ppm - outer.co2Ppm)
  rates.air =
    (load.airW +
      space.otherW +
      SUN_TO_AIR * space.sunW +
      heatingW(space, airC) -
      cooledW -
      insideW -
      outsideW -
      ventedW +
      latentHeatJKg(airC) * condensed) /
    space.airHeatJK
  rates.mass = (load.massW + (1 - SUN_TO_AIR) * space.sunW + insideW) / space.massHeatJK
  rates.water = (load.waterKgS + space.otherKgS - vented - condensed - wrungOut) / space.volumeM3
  rates.co2 = ((load.co2M3S + space.otherCo2M3S) * 1e6 - ventedCo2) / space.volumeM3
  rates.outAirW = ventedW
  rates.outMassW = outsideW
  rates.outWaterKgS = vented
  rates.outCo2M3S = ventedCo2 * 1e-6
}

/** Outside air through fans, leaks and an open door, m³/s. */
function flowM3S(space: Compartment, airC: number, outer: Outer): number {
  const steady = space.leakageM3S + (space.fanOn ? space.ventilationM3S : 0)
  if (space.doorM2 <= 0) return steady
  // One tall opening: (Cd/3) A √(g H ΔT/T), and one-sided wind 0.025 A u.
  const height = Math.min(2, Math.sqrt(space.doorM2) * 1.2)
  const buoyancy = smoothAbs(airC - outer.airTempC, 0.02) / (airC + KELVIN)
  const door = 0.2 * space.doorM2 * Math.sqrt(GRAVITY * height * buoyancy)
  const wind = 0.025 * space.doorM2 * outer.speedMs
  return steady + Math.sqrt(door * door + wind * wind)
}

function coolingW(space: Compartment, airC: number): number {
  return space.conditioningOn ? space.coolingW * smoothstep(0, THERMOSTAT_K, airC - space.setPointC) : 0
}

function heatingW(space: Compartment, airC: number): number {
  return space.conditioningOn ? space.heatingW * smoothstep(0, THERMOSTAT_K, space.setPointC - airC) : 0
}
