import { vapourDiffusivityM2S } from './air'
import type { AirAround } from './animal'
import type { Body } from './body'
import { airHeatJM3K } from './body'
import { STANDARD_KPA } from './constants'
import { setFilm } from './convection'
import { latentHeatJKg } from './psychrometrics'
import { saturatedVapour, vapourOf } from './saturation'
import { positivePart } from './smooth'
import { ventFlowM3S, type VentPath } from './ventilation'

/** One crate on one leg, ready for the integrator. */
export interface Box {
  id: string
  bodies: Body[]
  outOfCrate: boolean
  pressureKPa: number
  airVolumeM3: number
  airHeatJK: number
  wallHeatJK: number
  bedHeatJK: number
  crossSectionM2: number
  openShare: number
  /** Share of the outside air speed felt inside. */
  blownShare: number
  vent: VentPath
  /** Wall: inside film × area, area to the outside, half its resistance m²K/W. */
  wallInsideWK: number
  wallOutsideM2: number
  wallHalfM2KW: number
  condensingM2: number
  bedAirWK: number
  bedWallWK: number
  bedDeckWK: number
  bedM2: number
  /** Bedding water at which half the surface still evaporates freely, kg. */
  bedHalfKg: number
  urineKgS: number
  floorM2KW: number
  /** Set by the weather as time goes, W. */
  sunOnWallW: number
  sunOnBedW: number
  /** The air inside, and what an animal let out stands in. */
  air: AirAround
  /** Derived at the present instant. */
  flowM3S: number
  rhoCp: number
  rates: BoxRates
  /** Sum of what the animals give, W and kg/s and m³/s. */
  sums: BoxSums
}

export interface BoxSums {
  toAirW: number
  toWallW: number
  toSurroundW: number
  toFloorW: number
  vapourKgS: number
  co2M3S: number
}

export interface BoxRates {
  air: number
  wall: number
  bed: number
  water: number
  co2: number
  bedWater: number
  /** Water balance, kg/s: given off in the crate, vented, condensed. */
  waterGiven: number
  waterVented: number
  waterCondensed: number
  /** To the surroundings, W: with the air and by convection; by radiation and to the deck. Water kg/s, CO2 m³/s. */
  outAirW: number
  outMassW: number
  outWaterKgS: number
  outCo2M3S: number
}

/** What lies outside the crates at this instant. */
export interface Outer {
  airTempC: number
  surfaceTempC: number
  deckTempC: number
  waterKgM3: number
  co2Ppm: number
  speedMs: number
}

/** Convective film inside the walls, W/m²K: long-wave from the animals is counted apart. */
export const INSIDE_FILM = 3
const BED_FILM = 4
/** Long-wave part of the outside film 8.3 + 2.2 u. */
const OUTSIDE_RADIANT = 5.3

/** Sets flow, films and vapour for the crate's present state (in `y` from `at`); animals are evaluated after it. */
export function prepareBox(box: Box, outer: Outer, y: Float64Array, at: number): void {
  const airC = y[at] as number
  const wallC = y[at + 1] as number
  const bedC = y[at + 2] as number
  const waterKgM3 = y[at + 3] as number
  const { air } = box
  box.rhoCp = airHeatJM3K(airC, box.pressureKPa)
  box.flowM3S = ventFlowM3S(box.vent, airC, outer.airTempC, outer.speedMs)
  const stirred = box.flowM3S / box.crossSectionM2
  const blown = box.blownShare * outer.speedMs
  const insideC = box.outOfCrate ? outer.airTempC : airC
  air.airTempC = insideC
  air.speedMs = box.outOfCrate
    ? Math.sqrt(0.0025 + outer.speedMs * outer.speedMs)
    : Math.sqrt(0.0025 + stirred * stirred + blown * blown)
  air.rhoCp = box.outOfCrate ? airHeatJM3K(insideC, box.pressureKPa) : box.rhoCp
  air.vapourKgM3 = vapourOf(box.outOfCrate ? outer.waterKgM3 : waterKgM3, saturatedVapour(insideC))
  air.thinness = STANDARD_KPA / box.pressureKPa
  setFilm(air.film, insideC, air.speedMs, box.pressureKPa)
  air.wallTempC = box.outOfCrate ? outer.surfaceTempC : wallC
  air.surroundTempC = outer.surfaceTempC
  air.openShare = box.outOfCrate ? 0 : box.openShare
  air.floorTempC = box.outOfCrate ? outer.deckTempC : bedC
  air.floorM2KW = box.outOfCrate ? 0.05 : box.floorM2KW
}

/** Rates of the crate's own states and what it gives its surroundings; linear in the animals' sums. */
export function rateBox(box: Box, outer: Outer, sums: BoxSums, y: Float64Array, at: number): void {
  const airC = y[at] as number
  const wallC = y[at + 1] as number
  const bedC = y[at + 2] as number
  const waterKgM3 = y[at + 3] as number
  const co2Ppm = y[at + 4] as number
  const bedWaterKg = y[at + 5] as number
  const { rates, flowM3S, rhoCp } = box
  const vapour = vapourOf(waterKgM3, saturatedVapour(airC))
  const toAirW = box.outOfCrate ? 0 : sums.toAirW
  const toWallW = box.outOfCrate ? 0 : sums.toWallW
  const toFloorW = box.outOfCrate ? 0 : sums.toFloorW
  const vapourKgS = box.outOfCrate ? 0 : sums.vapourKgS
  const co2M3S = box.outOfCrate ? 0 : sums.co2M3S

  const ventedW = rhoCp * flowM3S * (airC - outer.airTempC)
  const insideW = box.wallInsideWK * (airC - wallC)
  const bedAirW = box.bedAirWK * (bedC - airC)
  const bedWallW = box.bedWallWK * (bedC - wallC)
  const bedDeckW = box.bedDeckWK * (bedC - outer.deckTempC)
  const outsideFilm = 8.3 + 2.2 * outer.speedMs
  const outsideWK = box.wallOutsideM2 / (box.wallHalfM2KW + 1 / outsideFilm)
  const radiantShare = OUTSIDE_RADIANT / outsideFilm
  const outsideC = outer.airTempC + radiantShare * (outer.surfaceTempC - outer.airTempC)
  const outsideW = outsideWK * (wallC - outsideC)
  // What leaves through the wall reaches air and surfaces in the proportion of the two films.
  const outConvectedW = outsideWK * (1 - radiantShare) * (wallC - outer.airTempC)

  const beta = INSIDE_FILM / (0.93 * rhoCp)
  const condensed = beta * box.condensingM2 * positivePart(vapour - saturatedVapour(wallC), 1e-6)
  const bedBeta = BED_FILM / (0.93 * rhoCp)
  const wet = bedWaterKg / (bedWaterKg + box.bedHalfKg)
  const bedEvaporated = bedBeta * box.bedM2 * wet * positivePart(saturatedVapour(bedC) - vapour, 1e-5)
  const latent = latentHeatJKg(bedC)

  rates.air = (toAirW - insideW + bedAirW - ventedW) / box.airHeatJK
  rates.wall =
    (toWallW + insideW - outsideW + box.sunOnWallW + bedWallW + latent * condensed) / box.wallHeatJK
  rates.bed =
    (toFloorW + box.sunOnBedW - bedAirW - bedWallW - bedDeckW - latent * bedEvaporated) / box.bedHeatJK
  const vented = flowM3S * (waterKgM3 - outer.waterKgM3)
  rates.water = (vapourKgS + bedEvaporated - vented - condensed) / box.airVolumeM3
  const ventedCo2 = flowM3S * (co2Ppm - outer.co2Ppm)
  rates.co2 = (co2M3S * 1e6 - ventedCo2) / box.airVolumeM3
  rates.bedWater = box.urineKgS - bedEvaporated
  rates.waterGiven = vapourKgS + box.urineKgS
  rates.waterVented = vented
  rates.waterCondensed = condensed
  rates.outAirW = ventedW + outConvectedW + (box.outOfCrate ? sums.toAirW : 0)
  rates.outMassW =
    outsideW -
    outConvectedW +
    bedDeckW +
    sums.toSurroundW +
    (box.outOfCrate ? sums.toWallW + sums.toFloorW : 0)
  rates.outWaterKgS = vented + (box.outOfCrate ? sums.vapourKgS : 0)
  rates.outCo2M3S = ventedCo2 * 1e-6 + (box.outOfCrate ? sums.co2M3S : 0)
}

/** Diffusivity hardly moves within a leg: set once. */
export function legDiffusivity(tempC: number, pressureKPa: number): number {
  return vapourDiffusivityM2S(tempC, pressureKPa)
}
