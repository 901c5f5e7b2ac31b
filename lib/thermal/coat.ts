import type { Coat } from './scenario'

export interface CoatValues {
  depthM: number
  conductivityWmK: number
}

const CLIPPED_DEPTH_MM = 3

/** The coat an animal wears: the row's, unless the plan says otherwise. */
export function coatOf(
  row: { depthMm: number; conductivityWmK: number },
  worn: Coat | undefined,
): CoatValues {
  const depthMm = worn?.depthMm ?? row.depthMm
  return {
    depthM: (worn?.clipped ? Math.min(depthMm, CLIPPED_DEPTH_MM) : depthMm) / 1000,
    conductivityWmK: worn?.conductivityWmK ?? row.conductivityWmK,
  }
}

/** Water a coat holds when soaked, kg/m² (0.1–0.6 after wetting; judgement). */
export const SOAKED_KG_M2 = 0.6

/** Water on the coat at the start, kg/m². */
export function coatWaterKgM2(worn: Coat | undefined): number {
  if (worn?.waterKgM2 !== undefined) return worn.waterKgM2
  return ((worn?.wetPct ?? 0) / 100) * SOAKED_KG_M2
}

/** What is left of a coat's resistance with water in it: 0.4 half wet, 0.25 soaked (rain-soaked coats, from memory). */
export function wetCoatFactor(waterKgM2: number): number {
  return 1 / (1 + (3 * waterKgM2) / SOAKED_KG_M2)
}

/** Share of the surface that evaporates as a free water surface; vanishes smoothly as the coat dries. */
export function wetSurfaceShare(waterKgM2: number): number {
  return waterKgM2 / (waterKgM2 + 0.05)
}
