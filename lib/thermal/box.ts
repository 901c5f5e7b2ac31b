import type { Body } from './body'
import { airHeatJM3K } from './body'
import { INSIDE_FILM, type Box } from './crate'
import { BEDDINGS, FLOORS, WALLS } from './materials'
import type { Crate, CrateOnLeg, Leg } from './scenario'
import { faceAreas, openShareOf, seenByFace, ventPathOf } from './ventilation'

/** Bedding, hair and the surface of everything share the air's temperature within seconds: the air node carries twice the air's heat. */
const AIR_MASS_FACTOR = 2
const BED_AIR_FILM = 4
const BED_RADIANT_FILM = 2.5
/** Urine, kg per kg of body mass a day, at rest and without free water (20–60 mL; from memory). */
const URINE_PER_DAY = 0.02
/** Bedding at this much water per m² still wets half its surface (judgement). */
const HALF_WET_KGM2 = 0.1
/** Under the floor: m²K/W on a deck, on slats, over an air gap (usual surface resistances). */
const UNDER_FLOOR = { deck: 0.05, slats: 0.1, air: 0.17 } as const

/** A crate on a leg as the integrator sees it. `factor` is the variant's on openings. */
export function boxOf(crate: Crate, bodies: Body[], leg: Leg, mammals: boolean, factor: number): Box {
  const onLeg = crate.byLeg.find((entry) => entry.legId === leg.id)
  const { lengthM, widthM, heightM } = crate
  const volume = lengthM * widthM * heightM
  const massKg = bodies.reduce((sum, body) => sum + body.massKg * body.count, 0)
  return {
    id: crate.id,
    bodies,
    outOfCrate: leg.outOfCrate,
    pressureKPa: leg.pressureKPa,
    airVolumeM3: airVolumeM3(crate),
    airHeatJK: AIR_MASS_FACTOR * airHeatJM3K(20, leg.pressureKPa) * volume,
    crossSectionM2: widthM * heightM,
    openShare: openShareOf(crate, onLeg),
    // Over a stall or pen the air moves as it does around it.
    blownShare: crate.form === 'crate' ? openShareOf(crate, onLeg) : 1,
    vent: ventPathOf(crate, onLeg, factor),
    ...wallFigures(crate, onLeg),
    ...floorFigures(crate, bodies),
    urineKgS: mammals && !leg.outOfCrate ? (URINE_PER_DAY * massKg) / 86400 : 0,
    sunOnWallW: 0,
    sunOnBedW: 0,
    air: {
      airTempC: 20,
      vapourKgM3: 0,
      rhoCp: 1200,
      speedMs: 0.1,
      diffusivityM2S: 2.5e-5,
      thinness: 1,
      film: { forced: 0, free: 0, still: 0 },
      wallTempC: 20,
      surroundTempC: 20,
      openShare: 0,
      floorTempC: 20,
      floorM2KW: 0,
    },
    flowM3S: 0,
    rhoCp: 1200,
    rates: {
      air: 0,
      wall: 0,
      bed: 0,
      water: 0,
      co2: 0,
      bedWater: 0,
      waterGiven: 0,
      waterVented: 0,
      waterCondensed: 0,
      outAirW: 0,
      outMassW: 0,
      outWaterKgS: 0,
      outCo2M3S: 0,
    },
    sums: { toAirW: 0, toWallW: 0, toSurroundW: 0, toFloorW: 0, vapourKgS: 0, co2M3S: 0 },
  }
}

/** Air beside the animals, m³; a fifth of the crate at least. */
export function airVolumeM3(crate: Crate): number {
  const volume = crate.lengthM * crate.widthM * crate.heightM
  const massKg = crate.occupants.reduce((sum, animal) => sum + animal.massKg * animal.count, 0)
  return Math.max(0.2 * volume, volume - massKg / 1000)
}

/** Water the bedding holds at the start, kg. */
export function beddingWaterKg(crate: Crate): number {
  const { bedding } = crate
  if (!bedding) return 0
  const holdsKg = BEDDINGS[bedding.material].holdsKgM2PerMm * bedding.depthMm * crate.lengthM * crate.widthM
  return (bedding.wetPct / 100) * holdsKg
}

function wallFigures(crate: Crate, onLeg: CrateOnLeg | undefined) {
  const material = WALLS[crate.wall?.material ?? 'plywood']
  const thicknessM = (crate.wall?.thicknessMm ?? 12) / 1000
  const areas = faceAreas(crate)
  const open = seenByFace(crate, onLeg)
  let opaqueM2 = 0
  let outsideM2 = 0
  for (const face of ['front', 'back', 'left', 'right', 'top'] as const) {
    if (face === 'top' && crate.form !== 'crate') continue
    const opaque = Math.max(0.02 * areas[face], areas[face] - open[face])
    opaqueM2 += opaque
    // Another crate or a wall close by is about as warm: half the exchange of a blocked face is lost (judgement).
    outsideM2 += opaque * (1 - 0.5 * ((onLeg?.blockedPct[face] ?? 0) / 100))
  }
  const massKg = crate.wall?.massKg ?? opaqueM2 * thicknessM * material.densityKgM3
  return {
    wallHeatJK: Math.max(200, massKg * material.heatJkgK),
    wallInsideWK: INSIDE_FILM * opaqueM2,
    wallOutsideM2: outsideM2,
    wallHalfM2KW: thicknessM / 2 / material.conductivityWmK,
    condensingM2: opaqueM2,
  }
}

function floorFigures(crate: Crate, bodies: readonly Body[]) {
  const areaM2 = crate.lengthM * crate.widthM
  const bedding = crate.bedding ?? { material: 'none' as const, depthMm: 0, wetPct: 0 }
  const bed = BEDDINGS[bedding.material]
  const floor = crate.floor ?? { material: 'plywood' as const, thicknessMm: 9, onto: 'deck' as const }
  const board = FLOORS[floor.material]
  const depthM = bedding.material === 'none' ? 0 : bedding.depthMm / 1000
  // Wet bedding conducts two to four times as well (from memory).
  const bedM2KW = depthM / (bed.conductivityWmK * (1 + (2 * bedding.wetPct) / 100))
  const boardM2KW = floor.thicknessMm / 1000 / board.conductivityWmK
  const gapM2KW = floor.onto === 'air' && floor.airGapMm === 0 ? UNDER_FLOOR.deck : UNDER_FLOOR[floor.onto]
  const bedKg = bedding.massKg ?? areaM2 * depthM * bed.densityKgM3
  const boardJK = areaM2 * (floor.thicknessMm / 1000) * board.densityKgM3 * board.heatJkgK
  const coveredM2 = Math.min(
    0.8 * areaM2,
    bodies.reduce((sum, body) => sum + body.contactM2 * body.count, 0),
  )
  return {
    bedHeatJK: Math.max(500, bedKg * bed.heatJkgK + boardJK + beddingWaterKg(crate) * 4186),
    bedAirWK: BED_AIR_FILM * (areaM2 - coveredM2),
    bedWallWK: BED_RADIANT_FILM * (areaM2 - coveredM2),
    // The node lies half-way through bedding and board together.
    bedDeckWK: areaM2 / ((bedM2KW + boardM2KW) / 2 + gapM2KW),
    bedM2: areaM2 - coveredM2,
    bedHalfKg: HALF_WET_KGM2 * areaM2,
    floorM2KW: (bedM2KW + boardM2KW) / 2,
  }
}
