import type { Animal, AnimalFlag, ProfileValues, Variant } from './scenario'

/*
 * The same animal three ways. Heat-prone: an eighth more heat. Cold-prone: quiet and fasted, thinner coat, weaker shivering.
 * Openings and leakage give three quarters in the first, five quarters in the second (judgement throughout).
 */

/** Multiplier on the metabolic line at rest. */
export function metabolicMultiple(row: ProfileValues, variant: Variant): number {
  const atRest = row.metabolism.activityAtRest
  if (row.thermoregulation === 'ectotherm') {
    return variant === 'heat-prone' ? atRest * 1.2 : variant === 'cold-prone' ? atRest * 0.8 : atRest
  }
  switch (variant) {
    case 'typical':
      return atRest
    case 'heat-prone':
      return atRest * 1.125
    case 'cold-prone': {
      const fedLine = row.metabolism.line === 'farm-horse' || row.metabolism.line === 'chick'
      return Math.max(0.9, Math.min(atRest, fedLine ? 0.9 : 1.1))
    }
  }
}

/** Factor on flow through openings and on leakage. */
export function flowFactor(variant: Variant): number {
  return variant === 'heat-prone' ? 0.75 : variant === 'cold-prone' ? 1.25 : 1
}

/** Factor on the least conductance of a line row. */
export function conductanceFactor(variant: Variant): number {
  return variant === 'cold-prone' ? 1.3 : 1
}

/** Factor on the depth of a coat-model row. */
export function coatFactor(variant: Variant): number {
  return variant === 'cold-prone' ? 0.7 : 1
}

const WEAKENING: readonly AnimalFlag[] = ['elderly', 'ill', 'obese', 'juvenile', 'unacclimated']

/** Extra breath at full panting; each weakening flag takes 15 %, a snub nose on a cat 30 % (judgement; flags multiply). */
export function pantingGain(animal: Animal, row: ProfileValues): number {
  let gain = row.respiration.pantingMultiple - 1
  for (const flag of WEAKENING) if (animal.flags.includes(flag)) gain *= 0.85
  if (animal.flags.includes('snub-nosed') && row.snubNosedFactor !== undefined) gain *= row.snubNosedFactor
  return gain
}
