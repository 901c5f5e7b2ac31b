import type { Leg } from '@/lib/thermal'

/** Where the law sees a dog or cat on a leg: each place has its own section and its own clock. */
export type LegalPlace = 'surface' | 'aircraft' | 'holding' | 'moving'

/** undefined where the animal is out of its enclosure. A flight with doors shut is the aircraft's cargo area. */
export function legalPlace(leg: Leg): LegalPlace | undefined {
  switch (leg.kind) {
    case 'road':
    case 'rail':
    case 'sea':
      return 'surface'
    case 'flight':
      return 'aircraft'
    case 'ramp':
      return 'moving'
    case 'shed':
    case 'border':
      return 'holding'
    case 'rest':
      return leg.outOfCrate ? undefined : 'holding'
  }
}
