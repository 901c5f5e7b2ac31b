import { GRAVITY, KELVIN } from './constants'
import type { Crate, CrateOnLeg, Face, Opening } from './scenario'
import { smoothAbs } from './smooth'

/*
 * Natural flow through a crate's openings: buoyancy in each opening and between high and low ones, wind, and a floor of diffusion, joined as
 * the root of squares. Conventions, each worth 1–2 K of crate air: an opening of unknown height has min(0.6 crate height, √area); Cd 0.6;
 * wind 0.35 on half the area of two or more faces, 0.025 on one face; the larger of an opening's and a leg's blocked share.
 */

/** What of the flow depends on the crate alone, this leg. */
export interface VentPath {
  /** m³/s per √(K/K): two-way flow in single openings, and from low to high openings. */
  singleM3S: number
  throughM3S: number
  /** m³/s per m/s of wind. */
  windM2: number
  diffusionM3S: number
  /** Everything times this (variant). */
  factor: number
}

const CD = 0.6
const CROSS_WIND = 0.35
const ONE_SIDED_WIND = 0.025
/** Air changes an hour that diffusion and leaks give any crate. */
const DIFFUSION_PER_H = 0.3

export function ventPathOf(crate: Crate, onLeg: CrateOnLeg | undefined, factor: number): VentPath {
  const openings = effectiveOpenings(crate, onLeg)
  const faces = new Set(openings.filter((opening) => opening.areaM2 > 1e-6).map((opening) => opening.face))
  const area = openings.reduce((sum, opening) => sum + opening.areaM2, 0)
  let single = 0
  for (const { areaM2, heightM } of openings) single += (CD / 3) * areaM2 * Math.sqrt(GRAVITY * heightM)
  const volume = crate.lengthM * crate.widthM * crate.heightM
  return {
    singleM3S: single,
    throughM3S: throughFlow(openings),
    windM2: faces.size >= 2 ? CROSS_WIND * 0.5 * area : ONE_SIDED_WIND * area,
    diffusionM3S: (DIFFUSION_PER_H * volume) / 3600,
    factor,
  }
}

/** Flow of air through the crate, m³/s. */
export function ventFlowM3S(path: VentPath, insideC: number, outsideC: number, windMs: number): number {
  const buoyancy = smoothAbs(insideC - outsideC, 0.02) / (insideC + KELVIN)
  const wind = path.windM2 * windMs
  const squares =
    (path.singleM3S * path.singleM3S + path.throughM3S * path.throughM3S) * buoyancy + wind * wind
  return path.factor * (Math.sqrt(squares) + path.diffusionM3S)
}

/** Flow through one opening of `areaM2` one way by buoyancy, m³/s (ASHRAE Fundamentals 1997, 25.13). */
export function stackFlowM3S(
  cd: number,
  areaM2: number,
  neutralHeightM: number,
  excessK: number,
  insideK: number,
): number {
  return cd * areaM2 * Math.sqrt((2 * GRAVITY * neutralHeightM * excessK) / insideK)
}

/** What a mesh of free share φ leaves of an opening: 1/√(1 + K Cd²), K = 1.3(1−φ) + (1/φ−1)² (Idelchik, from memory). */
export function meshFactor(freeShare: number): number {
  return 1 / Math.sqrt(1 + meshLoss(freeShare) * CD * CD)
}

export function meshLoss(freeShare: number): number {
  const back = 1 / freeShare - 1
  return 1.3 * (1 - freeShare) + back * back
}

/** Share of the inside surface through which an animal sees the surroundings. */
export function openShareOf(crate: Crate, onLeg: CrateOnLeg | undefined): number {
  const { lengthM: l, widthM: w, heightM: h } = crate
  const inside = 2 * (l * w + l * h + w * h) - l * w
  const open = seenOpenings(crate, onLeg).reduce(
    (sum, opening) => sum + opening.areaM2 * opening.freeShare,
    0,
  )
  return Math.min(0.95, open / inside)
}

interface FreeOpening {
  face: Face
  areaM2: number
  heightM: number
  /** Height of its middle over the floor. */
  middleM: number
}

function effectiveOpenings(crate: Crate, onLeg: CrateOnLeg | undefined): FreeOpening[] {
  return seenOpenings(crate, onLeg).map((opening) => ({
    ...opening,
    areaM2: opening.areaM2 * meshFactor(opening.freeShare),
  }))
}

function seenOpenings(crate: Crate, onLeg: CrateOnLeg | undefined): (FreeOpening & { freeShare: number })[] {
  const open = allOpenings(crate).filter((opening) => opening.areaM2 > 1e-6)
  return open.map((opening) => {
    const heightM = opening.heightM ?? Math.min(0.6 * crate.heightM, Math.sqrt(opening.areaM2))
    const sillM = opening.sillHeightM ?? (crate.heightM - heightM) / 2
    const free = Math.max(0.01, opening.meshOpenPct / 100)
    return {
      face: opening.face,
      areaM2: clearArea(opening, heightM, onLeg),
      heightM,
      middleM: opening.face === 'top' ? crate.heightM : sillM + heightM / 2,
      freeShare: free,
    }
  })
}

/** A stall or pen is open at the top; a wall of open mesh is an opening on every face. */
function allOpenings(crate: Crate): Opening[] {
  const openings = [...crate.openings]
  const plain = { meshOpenPct: 100, blockedPct: 0 }
  if (crate.form !== 'crate') openings.push({ face: 'top', areaM2: crate.lengthM * crate.widthM, ...plain })
  const openPct = crate.wall?.openPct ?? 0
  if (openPct > 0) {
    for (const [face, areaM2] of Object.entries(faceAreas(crate))) {
      if (face === 'top' && crate.form !== 'crate') continue
      openings.push({ face: face as Face, areaM2, meshOpenPct: openPct, blockedPct: 0 })
    }
  }
  return openings
}

export function faceAreas(crate: Crate): Record<Face, number> {
  const { lengthM: l, widthM: w, heightM: h } = crate
  return { front: w * h, back: w * h, left: l * h, right: l * h, top: l * w }
}

/**
 * What is left of an opening with a stack, wall or blanket before it. A rim or a known clearance leaves a gap around it; a gap under half
 * the opening's height limits even an unblocked one.
 */
function clearArea(opening: Opening, heightM: number, onLeg: CrateOnLeg | undefined): number {
  const blocked = Math.max(opening.blockedPct, onLeg?.blockedPct[opening.face] ?? 0) / 100
  const widthM = opening.widthM ?? opening.areaM2 / heightM
  const perimeterM = 2 * (widthM + heightM)
  const rimM = (opening.rimMm ?? 0) / 1000
  const clearanceM = onLeg?.clearanceMm === undefined ? undefined : onLeg.clearanceMm / 1000
  const throughRim = Math.min(opening.areaM2, Math.max(rimM, clearanceM ?? 0) * perimeterM)
  const free = opening.areaM2 * (1 - blocked) + throughRim * blocked
  const limited = clearanceM !== undefined && clearanceM < heightM / 2
  return limited ? Math.min(free, Math.max(clearanceM, rimM) * perimeterM) : free
}

/** Flow from the lower half of the openings to the upper half, per √(ΔT/T). */
function throughFlow(openings: readonly FreeOpening[]): number {
  const total = openings.reduce((sum, opening) => sum + opening.areaM2, 0)
  if (total <= 0) return 0
  const neutral = openings.reduce((sum, opening) => sum + opening.areaM2 * opening.middleM, 0) / total
  const low = group(openings, (opening) => opening.middleM < neutral - 1e-9)
  const high = group(openings, (opening) => opening.middleM > neutral + 1e-9)
  if (low.areaM2 <= 0 || high.areaM2 <= 0) return 0
  const series = (low.areaM2 * high.areaM2) / Math.sqrt(low.areaM2 * low.areaM2 + high.areaM2 * high.areaM2)
  return CD * series * Math.sqrt(2 * GRAVITY * (high.middleM - low.middleM))
}

function group(openings: readonly FreeOpening[], belongs: (opening: FreeOpening) => boolean) {
  const members = openings.filter(belongs)
  const areaM2 = members.reduce((sum, opening) => sum + opening.areaM2, 0)
  const moment = members.reduce((sum, opening) => sum + opening.areaM2 * opening.middleM, 0)
  return { areaM2, middleM: areaM2 > 0 ? moment / areaM2 : 0 }
}

/** Open area by face through which light falls, m². */
export function seenByFace(crate: Crate, onLeg: CrateOnLeg | undefined): Record<Face, number> {
  const open = { front: 0, back: 0, left: 0, right: 0, top: 0 }
  for (const opening of seenOpenings(crate, onLeg)) open[opening.face] += opening.areaM2 * opening.freeShare
  return open
}
