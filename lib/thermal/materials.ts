import type { Bedding, CrateFloor, WallMaterial } from './scenario'

/*
 * Conductivity W/mK, density kg/m³, heat J/kgK: CIBSE Guide A table 3.36 and usual handbook ranges (from memory where the
 * table lacks the board). For thin metal the films and the mass below decide, not the metal.
 */
export interface Material {
  conductivityWmK: number
  densityKgM3: number
  heatJkgK: number
}

export const WALLS: Record<WallMaterial, Material & { emissivity: number; solarAbsorptance: number }> = {
  plywood: {
    conductivityWmK: 0.12,
    densityKgM3: 600,
    heatJkgK: 1700,
    emissivity: 0.92,
    solarAbsorptance: 0.6,
  },
  plastic: {
    conductivityWmK: 0.2,
    densityKgM3: 950,
    heatJkgK: 1900,
    emissivity: 0.92,
    solarAbsorptance: 0.4,
  },
  fibreboard: {
    conductivityWmK: 0.0625,
    densityKgM3: 200,
    heatJkgK: 1400,
    emissivity: 0.92,
    solarAbsorptance: 0.6,
  },
  'metal-mesh': {
    conductivityWmK: 45,
    densityKgM3: 7850,
    heatJkgK: 480,
    emissivity: 0.5,
    solarAbsorptance: 0.7,
  },
  'insulated-foam': {
    conductivityWmK: 0.035,
    densityKgM3: 40,
    heatJkgK: 1500,
    emissivity: 0.92,
    solarAbsorptance: 0.4,
  },
}

export const FLOORS: Record<CrateFloor['material'], Material> = {
  ...WALLS,
  steel: { conductivityWmK: 45, densityKgM3: 7850, heatJkgK: 480 },
  aluminium: { conductivityWmK: 230, densityKgM3: 2700, heatJkgK: 900 },
  rubber: { conductivityWmK: 0.17, densityKgM3: 1200, heatJkgK: 1800 },
}

/** Dry bedding; `holdsKgM2PerMm` is the water it takes up when full, per millimetre of depth (judgement). */
export const BEDDINGS: Record<Bedding['material'], Material & { holdsKgM2PerMm: number }> = {
  none: { conductivityWmK: 1, densityKgM3: 0, heatJkgK: 1500, holdsKgM2PerMm: 0 },
  newspaper: { conductivityWmK: 0.08, densityKgM3: 150, heatJkgK: 1400, holdsKgM2PerMm: 0.3 },
  'wood-shavings': { conductivityWmK: 0.058, densityKgM3: 100, heatJkgK: 1500, holdsKgM2PerMm: 0.2 },
  straw: { conductivityWmK: 0.052, densityKgM3: 60, heatJkgK: 1500, holdsKgM2PerMm: 0.12 },
  'absorbent-pad': { conductivityWmK: 0.05, densityKgM3: 120, heatJkgK: 1400, holdsKgM2PerMm: 0.8 },
  foam: { conductivityWmK: 0.04, densityKgM3: 30, heatJkgK: 1400, holdsKgM2PerMm: 0.1 },
}

/** Heat transmittance of a panel between an inside and an outside film, W/m²K. */
export function panelUWm2K(
  thicknessMm: number,
  conductivity: number,
  insideFilm: number,
  outsideFilm: number,
): number {
  return 1 / (1 / insideFilm + thicknessMm / 1000 / conductivity + 1 / outsideFilm)
}
