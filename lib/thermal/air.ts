import { DRY_AIR_GAS, KELVIN } from './constants'
import { pow } from './elementary'

/*
 * Dry air. Viscosity by Sutherland's law as in DRYAIR (Tracy, Welch & Porter 1980), conductivity and vapour diffusivity likewise.
 */

/** Dynamic viscosity, Pa s. */
export function viscosityPaS(tempC: number): number {
  const t = tempC + KELVIN
  const ratio = t / 296.16
  return ((1.8325e-5 * 416.16) / (t + 120)) * ratio * Math.sqrt(ratio)
}

/** Thermal conductivity, W/mK. */
export function conductivityWmK(tempC: number): number {
  return 0.02425 + 7.038e-5 * tempC
}

/** Diffusivity of water vapour, m²/s. */
export function vapourDiffusivityM2S(tempC: number, pressureKPa: number): number {
  return 2.26e-5 * pow((tempC + KELVIN) / KELVIN, 1.81) * (100 / pressureKPa)
}

/** Density of dry air, kg/m³. */
export function airDensityKgM3(tempC: number, pressureKPa: number): number {
  return (1000 * pressureKPa) / (DRY_AIR_GAS * (tempC + KELVIN))
}

/** Prandtl number of air, −20 to 60 °C within 1 %. */
export const PRANDTL = 0.71
