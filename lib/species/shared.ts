import { fitted, judged, memory } from './figures'

/*
 * Figures several rows share, written once.
 */

/** Bands of the controller for dogs, cats and horses, K from the set-point. */
export const MAMMAL_BANDS = fitted(
  {
    vasomotor: [-0.2, 0.4] as const,
    cold: [-1.2, -0.2] as const,
    pant: [-0.1, 1.1] as const,
    wet: [0.3, 1.5] as const,
  },
  'K',
  'fitted to beagle heat trials (Besch 1984; FAA AM-87/8) and dog calorimetry together',
)

export const RODENT_BANDS = judged(
  {
    vasomotor: [-0.3, 0.8] as const,
    cold: [-1.2, -0.2] as const,
    pant: [0.4, 2] as const,
    wet: [0.3, 1.5] as const,
  },
  'K',
  'rabbits and rodents let core rise before they pant',
)

/** Set-point at the day value, so that a bird awake neither shivers nor pants at it. */
export const BIRD_BANDS = judged(
  {
    vasomotor: [-0.4, 0.6] as const,
    cold: [-1.6, -0.3] as const,
    pant: [0.3, 2] as const,
    wet: [0.3, 2] as const,
  },
  'K',
  'bands fitted to budgerigars (Weathers & Schoenbaechler 1976), moved to a day set-point',
)

/** Reptiles regulate nothing inside a crate: the engine does not read these. */
export const NO_BANDS = judged(
  {
    vasomotor: [98, 99] as const,
    cold: [-99, -98] as const,
    pant: [98, 99] as const,
    wet: [98, 99] as const,
  },
  'K',
  'no controller: body temperature follows the surroundings',
)

export const KLEIBER = memory('kleiber' as const, '', 'Kleiber 1947, 70 kcal/d kg^0.75')
export const Q10_MAMMAL = fitted(2.3, '', 'fitted with the dog row; 2.0–2.5 is usual')
export const MIXED_RQ = memory(0.8, '', 'mixed diet, 0.80–0.85')
export const TWO_THIRDS = memory(0.667, '', 'Meeh')
export const SHELL = judged(0.15, '', 'share of tissue near skin temperature, 0.10–0.20 (Gagge form)')
export const EXTRACTION_MAMMAL = memory(0.22, '', '0.20–0.25 of inspired oxygen')
export const NOSE_MAMMAL = memory('mammal' as const, '', 'exhaled air 20 + 0.45 Ta, after Schmidt-Nielsen')
export const NOSE_SMALL = memory('small' as const, '', 'exhaled air 10 + 0.72 Ta, after Schmidt-Nielsen')
export const WIND_SHORT = memory(
  0.15,
  's/m',
  'conductance of a short coat +15 % per m/s (Campbell, McArthur forms)',
)
export const WIND_DENSE = memory(0.05, 's/m', 'dense coat or plumage +5 % per m/s')
