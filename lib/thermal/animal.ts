import type { Body } from './body'
import { pantingCapacity, pantingRate, setDrive } from './controller'
import { KELVIN, OXYGEN_ENERGY_JM3, WATER_HEAT_JKGK } from './constants'
import { filmWm2K, type Film } from './convection'
import { wetCoatFactor, wetSurfaceShare } from './coat'
import { exp } from './elementary'
import { latentHeatJKg } from './psychrometrics'
import { radiantFilmWm2K } from './radiation'
import { exhaledTempC } from './respiration'
import { saturatedVapour } from './saturation'
import { boundaryResistanceSM, coatResistanceSM, skinEvaporationW } from './skin'
import { positivePart, smoothMin } from './smooth'

/** The air and surfaces an animal stands in. */
export interface AirAround {
  airTempC: number
  vapourKgM3: number
  rhoCp: number
  speedMs: number
  diffusivityM2S: number
  /** 101.325 over the pressure in kPa. */
  thinness: number
  film: Film
  wallTempC: number
  /** What is seen through openings, and how much of the view that is. */
  surroundTempC: number
  openShare: number
  floorTempC: number
  floorM2KW: number
}

/** Water drunk on the road, °C. */
const DRINK_C = 15
/** Between coat and floor, m²K/W (judgement). */
const CONTACT_M2KW = 0.02

/**
 * The heat balance of one animal at one instant: two nodes (core, shell), coat surface solved without a state of its own in two passes
 * that always start from the same films, so that the result depends on the state alone. Its states lie in `y` from `at`: core, shell, water
 * lost, panting so far, water on the coat. Writes `body.flux` and `body.drive`.
 */
export function evaluateAnimal(body: Body, air: AirAround, y: Float64Array, at: number): void {
  // Read here rather than passed: numbers handed to a function that is not inlined are boxed, and this is the innermost loop.
  const coreC = y[at] as number
  const shellC = y[at + 1] as number
  const lostKg = y[at + 2] as number
  const pantingMin = y[at + 3] as number
  const coatWaterKgM2 = body.coatMayBeWet ? (y[at + 4] as number) : 0
  const { drive, flux, insulation: wrap } = body
  const airC = air.airTempC
  let metabolismW: number
  let capacity = 1
  if (body.endotherm) {
    setDrive(drive, body.bands, coreC - body.setPointC)
    capacity = pantingCapacity(pantingMin, lostKg / body.massKg)
    metabolismW = endothermHeatW(body, coreC - body.setPointC, capacity)
  } else {
    metabolismW = body.restW * (1 + body.excess) * exp(body.ectothermSlope * Math.min(50, Math.max(1, coreC)))
  }
  const v = drive.vasomotor

  // Core to skin, and skin to coat surface per m² of it.
  const wetFactor = body.coatMayBeWet ? wetCoatFactor(coatWaterKgM2) : 1
  const wind = 1 + wrap.windPenalty * air.speedMs
  let tissueWK: number
  let coatWm2K: number
  if (wrap.isLine) {
    const inner = 1 / (wrap.conductanceMin + wrap.conductanceRange * v) - wrap.filmResistance
    const share = wrap.tissueShare + wrap.tissueShareRange * v
    tissueWK = 1 / (share * inner)
    coatWm2K = wind / ((1 - share) * inner * wrap.coatScale * wetFactor * body.areaM2)
  } else {
    tissueWK = wrap.tissueMin + wrap.tissueRange * v
    coatWm2K = wind / (wrap.coatM2KW * (1 - 0.3 * v) * wetFactor)
  }

  // Coat surface: a first guess with fixed films, then once with the films that guess gives.
  const coated = body.exposedM2 * (1 - wrap.bareShare)
  const bare = body.exposedM2 * wrap.bareShare * (0.1 + 0.9 * v)
  const seenC = air.wallTempC + (air.surroundTempC - air.wallTempC) * air.openShare
  const sunWm2 = body.sunW / coated
  const guessC = (coatWm2K * shellC + 4 * airC + 6 * seenC + sunWm2) / (coatWm2K + 10)
  const filmC = filmWm2K(air.film, body.length, guessC - airC)
  const filmR = radiantFilmWm2K(guessC, seenC)
  const latent = latentHeatJKg(shellC)
  let surfaceC: number
  let coatWm2 = 0
  if (body.coatMayBeWet) {
    // Water on the coat: linearised about the dry guess, then about its own result.
    const beta = (latent * wetSurfaceShare(coatWaterKgM2) * filmC) / (0.93 * air.rhoCp)
    const known = coatWm2K * shellC + filmC * airC + filmR * seenC + sunWm2
    const sum = coatWm2K + filmC + filmR
    surfaceC = guessC
    for (let pass = 0; pass < 3; pass++) {
      const at = surfaceC
      const slope = beta * (saturatedVapour(at + 0.05) - saturatedVapour(at - 0.05)) * 10
      const level = beta * (saturatedVapour(at) - air.vapourKgM3)
      surfaceC = (known - level + slope * at) / (sum + slope)
      coatWm2 = level + slope * (surfaceC - at)
    }
  } else {
    surfaceC = (coatWm2K * shellC + filmC * airC + filmR * seenC + sunWm2) / (coatWm2K + filmC + filmR)
  }
  const dryAirW = coated * filmC * (surfaceC - airC) + bare * filmC * (shellC - airC)
  const wallShare = filmR * (1 - air.openShare)
  const toWallW = wallShare * (coated * (surfaceC - air.wallTempC) + bare * (shellC - air.wallTempC))
  const surroundShare = filmR * air.openShare
  const toSurroundW =
    surroundShare * (coated * (surfaceC - air.surroundTempC) + bare * (shellC - air.surroundTempC))
  const wetCoatW = coated * coatWm2

  // Floor, in place of part of the film: the whole-body lines come from animals lying on floors, so a second path would count it twice.
  const floorWK = body.contactM2 / (1 / coatWm2K + CONTACT_M2KW + air.floorM2KW)
  const toFloorW = floorWK * (shellC - air.floorTempC)

  // Skin.
  const wetted = body.wetBase + body.wetRange * drive.wet
  const boundary = boundaryResistanceSM(air.rhoCp, filmC)
  const throughCoat = boundary + coatResistanceSM(wrap.coatDepthM, air.diffusivityM2S)
  const perResistance = (1 - wrap.bareShare) / throughCoat + wrap.bareShare / boundary
  const deficit = saturatedVapour(shellC) - air.vapourKgM3
  const conductanceW = latent * body.exposedM2 * wetted * perResistance
  const skinW =
    body.sweatCapW > 0 ? skinEvaporationW(conductanceW, deficit, body.sweatCapW) : conductanceW * deficit

  // Breath.
  const panting = body.pantGain * drive.pant * capacity
  const breathM3S = metabolismW * body.breathPerWatt * (coreC + KELVIN) * (air.thinness + panting)
  const exhaledC = exhaledTempC(body.exhaled, airC, coreC, drive.pant)
  const breathLatentW = latent * breathM3S * (saturatedVapour(exhaledC) - air.vapourKgM3)
  const breathSensibleW = air.rhoCp * breathM3S * (exhaledC - airC)

  const drinkW = body.drinkCools * body.drinkKgS * WATER_HEAT_JKGK * (coreC - DRINK_C)
  const throughTissueW = tissueWK * (coreC - shellC)
  const skinDryW = dryAirW + toWallW + toSurroundW - body.sunW + wetCoatW

  flux.metabolismW = metabolismW
  flux.conductionW = -toFloorW - drinkW
  flux.convectionW = -dryAirW - breathSensibleW
  flux.radiationW = body.sunW - toWallW - toSurroundW
  flux.evaporationW = -skinW - breathLatentW - wetCoatW
  flux.toAirW = dryAirW + breathSensibleW
  flux.toWallW = toWallW
  flux.toSurroundW = toSurroundW
  flux.toFloorW = toFloorW
  flux.vapourKgS = (skinW + breathLatentW + wetCoatW) / latent
  flux.co2M3S =
    ((body.respiratoryQuotient * metabolismW) / OXYGEN_ENERGY_JM3) * ((airC + KELVIN) / KELVIN) * air.thinness
  flux.coreRate = (metabolismW - breathLatentW - breathSensibleW - throughTissueW - drinkW) / body.coreHeatJK
  flux.shellRate = (throughTissueW - skinDryW - toFloorW - skinW) / body.shellHeatJK
  flux.lossRate = (skinW + breathLatentW) / latent - body.drinkKgS
  flux.pantRate = body.endotherm ? pantingRate(pantingMin, drive.pant) / 60 : 0
  flux.coatRate = body.coatMayBeWet ? -coatWm2 / latent : 0
}

/**
 * Rest (quickened by Q10 in hyperthermia, slowed only more than 2 K under the set-point), what cold asks for, and the work of panting.
 * Far above critical the exponent is held, or a runaway would leave the numbers; the run reports it.
 */
function endothermHeatW(body: Body, errorK: number, capacity: number): number {
  const { drive } = body
  const rest = body.restW * (1 + body.excess)
  const room = Math.max(0, body.ceilingW - rest) * body.thermogenesisShare
  const above = positivePart(smoothMin(errorK, body.heldErrorK, 0.05), 0.01)
  const below = -positivePart(-errorK - 2, 0.01)
  const quickened = exp(body.q10PerK * (above + below))
  return (rest + room * drive.cold) * quickened + body.pantCostW * drive.pant * capacity
}
