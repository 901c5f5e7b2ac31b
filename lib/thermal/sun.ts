import { cos, sin } from './elementary'
import type { Face, LegPlace } from './scenario'

const RADIANS = Math.PI / 180

/** Where the sun stands, as a unit vector of the place: north, east, up. */
export interface SunVector {
  north: number
  east: number
  up: number
}

/**
 * Low-precision solar position of the Astronomical Almanac (0.01° between 1950 and 2050), as a vector, so that no inverse function is
 * needed. Without a place: 45° high, azimuth unknown.
 */
export function sunVector(msSinceEpoch: number, place: LegPlace | undefined): SunVector | undefined {
  if (place?.latitudeDeg === undefined || place.longitudeDeg === undefined) return undefined
  const days = msSinceEpoch / 86400000 - 10957.5
  const anomaly = (357.528 + 0.9856003 * days) * RADIANS
  const longitude = (280.46 + 0.9856474 * days + 1.915 * sin(anomaly) + 0.02 * sin(2 * anomaly)) * RADIANS
  const obliquity = (23.439 - 4e-7 * days) * RADIANS
  const x = cos(longitude)
  const y = cos(obliquity) * sin(longitude)
  const z = sin(obliquity) * sin(longitude)
  const sidereal = ((18.697374558 + 24.06570982441908 * days) * 15 + place.longitudeDeg) * RADIANS
  const meridian = x * cos(sidereal) + y * sin(sidereal)
  const west = x * sin(sidereal) - y * cos(sidereal)
  const latitude = place.latitudeDeg * RADIANS
  return {
    north: cos(latitude) * z - sin(latitude) * meridian,
    east: -west,
    up: sin(latitude) * z + cos(latitude) * meridian,
  }
}

/** Beam (normal to itself) and diffuse parts of global horizontal sun, W/m². */
export interface SunParts {
  beamWm2: number
  diffuseWm2: number
  globalWm2: number
  vector: SunVector | undefined
}

/** Share of clear-sky global sun that is diffuse when nobody gives it (0.1–0.25; judgement). */
const DIFFUSE_SHARE = 0.2
const UNKNOWN_HEIGHT = Math.SQRT1_2

export function sunParts(
  globalWm2: number,
  diffuseWm2: number | undefined,
  vector: SunVector | undefined,
): SunParts {
  const diffuse = Math.min(globalWm2, diffuseWm2 ?? DIFFUSE_SHARE * globalWm2)
  const up = vector ? vector.up : UNKNOWN_HEIGHT
  // Near the horizon the quotient explodes; beam sun through that much air is under the solar constant at any rate.
  const beam = up > 0.02 ? Math.min(1100, (globalWm2 - diffuse) / Math.max(up, 0.05)) : 0
  return { beamWm2: beam, diffuseWm2: up > 0.02 ? diffuse : globalWm2, globalWm2, vector }
}

/** Cosine between the sun and a face's outward normal; the average over headings when heading or place is unknown. */
export function faceCosine(face: Face, parts: SunParts, headingDeg: number | undefined): number {
  const up = parts.vector ? Math.max(0, parts.vector.up) : UNKNOWN_HEIGHT
  if (face === 'top') return up
  if (!parts.vector || headingDeg === undefined) return Math.sqrt(1 - up * up) / Math.PI
  const turned = { front: 0, right: 90, back: 180, left: 270 }[face]
  const angle = (headingDeg + turned) * RADIANS
  return Math.max(0, parts.vector.north * cos(angle) + parts.vector.east * sin(angle))
}

/** Sun on a face, W/m²: beam, sky, and what the ground sends back to upright faces. */
export function faceSunWm2(
  face: Face,
  parts: SunParts,
  headingDeg: number | undefined,
  groundAlbedo: number,
): number {
  const beam = parts.beamWm2 * faceCosine(face, parts, headingDeg)
  if (face === 'top') return beam + parts.diffuseWm2
  return beam + 0.5 * parts.diffuseWm2 + 0.5 * groundAlbedo * parts.globalWm2
}
