import { judged, memory } from './figures'
import type { Figure } from './profile'

/** From when to when an animal of a species is neither young nor old; a side nobody can name is left out. */
export interface AgeMarks {
  youngUnderDays?: Figure
  oldFromDays?: Figure
}

const YEAR_DAYS = 365.25
const years = (count: number) => Math.round(count * YEAR_DAYS)

const FOUR_MONTHS = memory(
  112,
  'days',
  'sixteen weeks, under which 9 CFR 3.17 feeds dogs and cats twice as often',
)
const DOG_OLD = judged(
  years(8),
  'days',
  'last quarter of a life of 11 years (life tables of UK dogs, Teng and others 2022, from memory)',
)

/**
 * Ages at which a body defends itself less well against heat and cold, by species key. Where a species is missing (reptiles,
 * chicks sold by the day) its age says nothing here, and a person judges.
 */
export const AGE_MARKS: Readonly<Record<string, AgeMarks>> = {
  dog: { youngUnderDays: FOUR_MONTHS, oldFromDays: DOG_OLD },
  'snub-nosed-dog': { youngUnderDays: FOUR_MONTHS, oldFromDays: DOG_OLD },
  cat: {
    youngUnderDays: FOUR_MONTHS,
    oldFromDays: memory(years(10), 'days', 'senior from ten years: AAHA and AAFP feline life stages, 2021'),
  },
  rabbit: {
    youngUnderDays: judged(56, 'days', 'weaned, and sold, at eight weeks'),
    oldFromDays: judged(years(5), 'days', 'last third of a life of eight years'),
  },
  'guinea-pig': {
    youngUnderDays: judged(21, 'days', 'weaned at three weeks'),
    oldFromDays: judged(years(4), 'days', 'last third of a life of six years'),
  },
  horse: {
    youngUnderDays: judged(183, 'days', 'weaned at six months'),
    oldFromDays: judged(years(20), 'days', 'called geriatric from twenty years in most equine writing'),
  },
  pigeon: {
    youngUnderDays: judged(28, 'days', 'leaves the nest at four weeks'),
    oldFromDays: judged(years(10), 'days', 'last third of a life of fifteen years in a loft'),
  },
}
