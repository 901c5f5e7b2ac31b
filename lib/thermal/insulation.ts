import { SteadfoldError } from '../errors'
import type { BodySetting } from './body'
import { coatOf } from './coat'
import { pow } from './elementary'
import { conductanceLineWK } from './metabolism'
import type { Animal, ProfileValues } from './scenario'
import { coatFactor, conductanceFactor } from './variants'

/**
 * Resistance between core and coat surface. Line rows: a published whole-body conductance less the film it was measured in, split between
 * tissue and coat by a share that slides with vasomotion. Coat rows (large animals): tissue and coat in series, beside a bare
 * share of the skin that opens with vasomotion. One smooth formula each: a branch in a resistance stops the integrator.
 */
export interface Insulation {
  isLine: boolean
  /** Line rows: whole-body conductance W/K at rest of the vessels and its range; film of reference K/W; share of tissue and its range. */
  conductanceMin: number
  conductanceRange: number
  filmResistance: number
  tissueShare: number
  tissueShareRange: number
  /** This animal's coat over the row's nominal one. */
  coatScale: number
  /** Coat rows: tissue W/K and its range, coat m²K/W, bare share of the skin. */
  tissueMin: number
  tissueRange: number
  coatM2KW: number
  bareShare: number
  windPenalty: number
  coatDepthM: number
}

export function insulationOf(
  row: ProfileValues,
  animal: Animal,
  setting: BodySetting,
  areaM2: number,
  referenceFilm: number,
): Insulation {
  const coat = coatOf(row.coat, animal.coat)
  const nominalM2KW = row.coat.depthMm / 1000 / row.coat.conductivityWmK
  const coatM2KW = coat.depthM / coat.conductivityWmK
  const shared = {
    coatScale: nominalM2KW > 0 ? coatM2KW / nominalM2KW : 1,
    coatM2KW: Math.max(coatM2KW, 1e-3),
    windPenalty: row.coat.windPenalty,
    coatDepthM: coat.depthM,
  }
  const unused = {
    conductanceMin: 0,
    conductanceRange: 0,
    filmResistance: 0,
    tissueShare: 0,
    tissueShareRange: 0,
  }
  const { conductance } = row
  switch (conductance.model) {
    case 'line': {
      const line =
        conductanceLineWK(conductance.line, animal.massKg) * groupShare(conductance.line, animal.count)
      const conductanceMin = line * conductance.minMultiple * conductanceFactor(setting.variant)
      const conductanceMax = Math.max(conductanceMin, line * conductance.maxMultiple)
      const filmResistance = 1 / (areaM2 * referenceFilm)
      if (1 / conductanceMax <= filmResistance) {
        throw new SteadfoldError(
          'refused',
          `The conductance of profile "${animal.profile}" leaves no room for the film of air.`,
        )
      }
      const resting = 1 / conductanceMin - filmResistance
      const tissueShare = Math.min(0.9, Math.max(0.15, 1 - nominalM2KW / areaM2 / resting))
      return {
        ...shared,
        isLine: true,
        conductanceMin,
        conductanceRange: conductanceMax - conductanceMin,
        filmResistance,
        tissueShare,
        tissueShareRange: 0.5 - tissueShare,
        tissueMin: 0,
        tissueRange: 0,
        bareShare: 0,
      }
    }
    case 'coat':
      return {
        ...shared,
        ...unused,
        isLine: false,
        coatM2KW: shared.coatM2KW * coatFactor(setting.variant),
        tissueMin: conductance.tissueMinWm2K * areaM2,
        tissueRange: (conductance.tissueMaxWm2K - conductance.tissueMinWm2K) * areaM2,
        bareShare: conductance.bareShare,
      }
    case 'ectotherm': {
      const prone = setting.variant === 'typical' ? 1 : 1.2
      return {
        ...shared,
        ...unused,
        isLine: false,
        coatM2KW: 2e-3,
        tissueMin: conductance.wholeBodyWm2K * areaM2 * prone,
        tissueRange: 0,
        bareShare: 0,
      }
    }
  }
}

/** Day-old chicks lose to each other what they do not lose to the air: n^-0.25, not under 0.45 (from Xin & Harmon 1996). */
function groupShare(line: 'mammal' | 'bird' | 'chick-group', count: number): number {
  return line === 'chick-group' ? Math.max(0.45, pow(count, -0.25)) : 1
}
