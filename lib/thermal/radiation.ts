import { EMISSIVITY, KELVIN, STEFAN_BOLTZMANN } from './constants'

/** Long-wave film, W/m²K, linearised about the mean: within 1.1 % of the fourth powers up to 60 K apart. */
export function radiantFilmWm2K(surfaceC: number, aroundC: number, emissivity = EMISSIVITY): number {
  const mean = 0.5 * (surfaceC + aroundC) + KELVIN
  return 4 * emissivity * STEFAN_BOLTZMANN * mean * mean * mean
}

/** Exchange between a body and the enclosure around it, W, grey and diffuse. */
export function enclosureExchangeW(
  body: { areaM2: number; tempC: number; emissivity: number },
  around: { areaM2: number; tempC: number; emissivity: number },
): number {
  const a = body.tempC + KELVIN
  const b = around.tempC + KELVIN
  const resistance = 1 / body.emissivity + (body.areaM2 / around.areaM2) * (1 / around.emissivity - 1)
  return (body.areaM2 * STEFAN_BOLTZMANN * (a * a * a * a - b * b * b * b)) / resistance
}
