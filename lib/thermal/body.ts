import { airDensityKgM3 } from './air'
import { AIR_HEAT_JKGK, BODY_HEAT_JKGK, STANDARD_KPA } from './constants'
import { filmLength, filmWm2K, setFilm, type FilmLength } from './convection'
import type { Drive } from './controller'
import { cbrt, ln, pow } from './elementary'
import { insulationOf, type Insulation } from './insulation'
import { ectothermBaseW, ectothermSlope, lineHeatW } from './metabolism'
import { radiantFilmWm2K } from './radiation'
import { breathPerWatt } from './respiration'
import type { Animal, ControlBands, CoreLimits, ProfileValues, Variant } from './scenario'
import { smoothstep } from './smooth'
import { metabolicMultiple, pantingGain } from './variants'

/** One animal (or one of `count` alike), every figure the integrator needs worked out before it starts. */
export interface Body {
  id: string
  count: number
  massKg: number
  endotherm: boolean
  coreHeatJK: number
  shellHeatJK: number
  /** Skin, m²; the parts of it in air and on the floor. */
  areaM2: number
  exposedM2: number
  contactM2: number
  length: FilmLength
  insulation: Insulation
  setPointC: number
  bands: ControlBands
  /** The line's heat, W; rest before any excitement, W; ceiling of thermogenesis, W. */
  basalW: number
  restW: number
  ceilingW: number
  /** Share of the room between rest and ceiling a young animal can use. */
  thermogenesisShare: number
  /** ln(Q10)/10, and the error at which the exponent is held so that a runaway stays finite. */
  q10PerK: number
  heldErrorK: number
  ectothermSlope: number
  wetBase: number
  wetRange: number
  /** Limit of the sweat glands, W; 0 = no glands to limit. */
  sweatCapW: number
  breathPerWatt: number
  exhaled: 'mammal' | 'small'
  /** Extra breath at full panting, multiple of the breath at rest. */
  pantGain: number
  pantCostW: number
  respiratoryQuotient: number
  coatMayBeWet: boolean
  solarAbsorptance: number
  /** Set by the run as time goes: excitement over rest (0 = none), sun on the coat in W, drinking in kg/s. */
  excess: number
  sunW: number
  drinkKgS: number
  /** 1 where a cool drink is counted as cooling, 0 in the heat-prone. */
  drinkCools: number
  limits: CoreLimits | undefined
  drive: Drive
  flux: AnimalFlux
}

/** What one animal does at one instant. Heat terms in W, gains positive. */
export interface AnimalFlux {
  metabolismW: number
  conductionW: number
  convectionW: number
  radiationW: number
  evaporationW: number
  /** Given to the air, the crate's walls, what is seen through its openings, and the floor, W. */
  toAirW: number
  toWallW: number
  toSurroundW: number
  toFloorW: number
  vapourKgS: number
  co2M3S: number
  coreRate: number
  shellRate: number
  lossRate: number
  pantRate: number
  coatRate: number
}

export interface BodySetting {
  variant: Variant
  /** All animals in the crate, for what they hide of each other. */
  cratemates: number
  coatMayBeWet: boolean
}

export function bodyOf(animal: Animal, row: ProfileValues, setting: BodySetting): Body {
  const { massKg } = animal
  const endotherm = row.thermoregulation === 'endotherm'
  const areaM2 = row.surface.meehCoefficient * pow(massKg, row.surface.exponent)
  const contact = contactShare(animal, row)
  const group = groupFactor(row, setting)
  const lengthM = cbrt(massKg / 1000)
  const length = filmLength(lengthM)
  const heatJK = massKg * (row.specificHeatJkgK ?? BODY_HEAT_JKGK)
  const basalW = endotherm
    ? lineHeatW(row.metabolism.line, massKg)
    : ectothermBaseW(row.metabolism.line, massKg)
  const multiple = metabolicMultiple(row, setting.variant)
  const coldShare = setting.variant === 'cold-prone' ? 0.8 : 1
  const criticalHighC = row.limits?.criticalHighC ?? row.setPointC + 3
  return {
    id: animal.id,
    count: animal.count,
    massKg,
    endotherm,
    coreHeatJK: heatJK * (1 - row.shellShare),
    shellHeatJK: heatJK * row.shellShare,
    areaM2,
    exposedM2: areaM2 * (1 - contact) * group,
    contactM2: areaM2 * contact,
    length,
    insulation: insulationOf(row, animal, setting, areaM2, referenceFilmWm2K(length)),
    setPointC: row.setPointC,
    bands: row.bands,
    basalW,
    restW: multiple * basalW,
    ceilingW: (row.metabolism.maxOverBasal ?? 0) * basalW * coldShare,
    thermogenesisShare: thermogenesisShare(animal, row),
    q10PerK: ln(row.metabolism.q10) / 10,
    heldErrorK: criticalHighC + 2 - row.setPointC,
    ectothermSlope: ectothermSlope(row.metabolism.line),
    wetBase: row.skin.wettednessBase,
    wetRange: row.skin.wettednessMax - row.skin.wettednessBase,
    sweatCapW: ((row.skin.sweatCapGm2h ?? 0) / 3.6e6) * 2.42e6 * areaM2,
    breathPerWatt: breathPerWatt(row.respiration.oxygenExtraction),
    exhaled: row.respiration.exhaled,
    pantGain: pantingGain(animal, row),
    pantCostW: row.respiration.pantingCost * basalW,
    respiratoryQuotient: row.metabolism.respiratoryQuotient,
    coatMayBeWet: setting.coatMayBeWet,
    solarAbsorptance: row.solarAbsorptance ?? 0.7,
    excess: 0,
    sunW: 0,
    drinkKgS: 0,
    drinkCools: setting.variant === 'heat-prone' ? 0 : 1,
    limits: row.limits,
    drive: { vasomotor: 0, cold: 0, pant: 0, wet: 0 },
    flux: emptyFlux(),
  }
}

/** Film plus long-wave at 20 °C, 0.1 m/s, skin warmer by 8 K: the surroundings the published conductance lines were measured in. */
function referenceFilmWm2K(length: FilmLength): number {
  const film = { forced: 0, free: 0, still: 0 }
  setFilm(film, 20, 0.1, STANDARD_KPA)
  return filmWm2K(film, length, 8) + radiantFilmWm2K(28, 20)
}

/** Share of the skin on the floor: standing 0.05, lying 0.15–0.25 (from memory). */
function contactShare(animal: Animal, row: ProfileValues): number {
  const posture = animal.posture ?? row.posture ?? 'lying'
  switch (posture) {
    case 'standing':
      return 0.05
    case 'curled':
      return 0.12
    case 'lying':
      return 0.18
  }
}

/**
 * Share of the skin that n animals together show to the air, n^-0.25 and not under 0.4 (from memory). No credit for huddling is given to
 * the cold-prone; rows measured per bird in a group carry it already.
 */
function groupFactor(row: ProfileValues, setting: BodySetting): number {
  const grouped = row.conductance.model === 'line' && row.conductance.line === 'chick-group'
  if (grouped || setting.variant === 'cold-prone' || row.thermoregulation === 'ectotherm') return 1
  return Math.max(0.4, pow(setting.cratemates, -0.25))
}

/** Altricial young make little extra heat: 0.12 of an adult's room to day 5, 0.42 from day 11 to 21, all of it at 28 (puppies). */
function thermogenesisShare(animal: Animal, row: ProfileValues): number {
  if (!row.altricial || animal.ageDays === undefined) return 1
  const second = 0.3 * smoothstep(5, 11, animal.ageDays)
  return 0.12 + second + 0.58 * smoothstep(21, 28, animal.ageDays)
}

/** Heat capacity of a litre of air, J/m³K. */
export function airHeatJM3K(tempC: number, pressureKPa: number): number {
  return airDensityKgM3(tempC, pressureKPa) * AIR_HEAT_JKGK
}

function emptyFlux(): AnimalFlux {
  return {
    metabolismW: 0,
    conductionW: 0,
    convectionW: 0,
    radiationW: 0,
    evaporationW: 0,
    toAirW: 0,
    toWallW: 0,
    toSurroundW: 0,
    toFloorW: 0,
    vapourKgS: 0,
    co2M3S: 0,
    coreRate: 0,
    shellRate: 0,
    lossRate: 0,
    pantRate: 0,
    coatRate: 0,
  }
}
