import type { ControlBands } from './scenario'
import { smoothstep } from './smooth'

/** How far each effector is driven, 0 to 1. */
export interface Drive {
  vasomotor: number
  cold: number
  pant: number
  wet: number
}

/**
 * One error, core less set-point, drives four overlapping smooth bands. The skin does not enter: a skin term overheats an animal in cold
 * air. Steady-state searches step from effector to effector and make jagged time series; this does not.
 */
export function setDrive(drive: Drive, bands: ControlBands, errorK: number): void {
  const { vasomotor, cold, pant, wet } = bands
  drive.vasomotor = smoothstep(vasomotor[0], vasomotor[1], errorK)
  drive.cold = 1 - smoothstep(cold[0], cold[1], errorK)
  drive.pant = smoothstep(pant[0], pant[1], errorK)
  drive.wet = smoothstep(wet[0], wet[1], errorK)
}

/**
 * Share of panting capacity left after hours of panting and with water lost: each takes up to half, over 6–18 h of full panting and
 * 5–12 % of body mass (judgement).
 */
export function pantingCapacity(pantingMin: number, waterLossShare: number): number {
  const tired = 1 - 0.5 * smoothstep(360, 1080, pantingMin)
  const dry = 1 - 0.5 * smoothstep(0.05, 0.12, waterLossShare)
  return tired * dry
}

/** Rate of the panting integral, min per min: it fills with effort and drains with a time constant of 2 h at rest. */
export function pantingRate(pantingMin: number, pant: number): number {
  return pant - (pantingMin / 120) * (1 - smoothstep(0, 0.1, pant))
}
