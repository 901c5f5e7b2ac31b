import type { Crate, CrateOnLeg, Face, Leg } from './scenario'
import { faceSunWm2, type SunParts } from './sun'
import { WALLS } from './materials'
import { faceAreas, seenByFace } from './ventilation'

/** Sun a crate takes up: in its walls and bedding, W, and on each m² of exposed animal, W. */
export interface CrateSun {
  wallW: number
  bedW: number
  bodyWm2: number
}

const TO_ANIMALS = 0.7
const BED_ABSORPTANCE = 0.7
const FACES: readonly Face[] = ['front', 'back', 'left', 'right', 'top']

export function crateSun(
  crate: Crate,
  onLeg: CrateOnLeg | undefined,
  leg: Leg,
  sun: SunParts,
  exposedM2: number,
  groundAlbedo: number,
): CrateSun {
  if (sun.globalWm2 <= 0) return { wallW: 0, bedW: 0, bodyWm2: 0 }
  const lit = 1 - (onLeg?.shadePct ?? 0) / 100
  const headingDeg = onLeg?.headingDeg ?? leg.place?.headingDeg
  const material = crate.wall?.material ?? 'plywood'
  const absorptance = crate.wall?.solarAbsorptance ?? WALLS[material].solarAbsorptance
  const areas = faceAreas(crate)
  const open = seenByFace(crate, onLeg)
  let wallW = 0
  let openingsW = 0
  for (const face of FACES) {
    // A stack or net beside a face shades it as far as it blocks it.
    const clear = 1 - (onLeg?.blockedPct[face] ?? 0) / 100
    const onFaceWm2 = faceSunWm2(face, sun, headingDeg, groundAlbedo) * lit
    wallW += absorptance * Math.max(0, areas[face] - open[face]) * clear * onFaceWm2
    openingsW += open[face] * onFaceWm2
  }
  const bodyWm2 = exposedM2 > 0 ? Math.min((TO_ANIMALS * openingsW) / exposedM2, bodySunWm2(sun) * lit) : 0
  return { wallW, bedW: BED_ABSORPTANCE * Math.max(0, openingsW - bodyWm2 * exposedM2), bodyWm2 }
}

/** Sun on a body standing free, per m² of its skin: a quarter sees the beam, half the sky. */
export function bodySunWm2(sun: SunParts): number {
  return 0.25 * sun.beamWm2 + 0.5 * sun.diffuseWm2
}
