import { KELVIN, OXYGEN_ENERGY_JM3, OXYGEN_SHARE } from './constants'
import { smoothMin, positivePart } from './smooth'

/**
 * Breath at rest, m³/s per W of metabolism, at body temperature and ambient pressure. Thin air makes an animal move more of it (the
 * pressure ratio); panting is a matter of anatomy and does not scale.
 */
export function breathPerWatt(oxygenExtraction: number): number {
  return 1 / (OXYGEN_ENERGY_JM3 * OXYGEN_SHARE * oxygenExtraction * KELVIN)
}

/**
 * Temperature of the exhaled air, °C. Cold noses save heat: 20 + 0.45 Ta in mammals, 10 + 0.72 Ta in birds and small mammals (from memory,
 * after Schmidt-Nielsen); never under the air, never above the body; panting brings it to a degree under the body.
 */
export function exhaledTempC(
  kind: 'mammal' | 'small',
  airTempC: number,
  coreTempC: number,
  pant: number,
): number {
  const nose = kind === 'mammal' ? 20 + 0.45 * airTempC : 10 + 0.72 * airTempC
  const atLeastAir = airTempC + positivePart(nose - airTempC, 0.4)
  const quiet = smoothMin(atLeastAir, coreTempC, 0.4)
  return quiet + (coreTempC - 1 - quiet) * pant
}
