import type { RuleSource } from '../pack'

/*
 * 9 CFR Part 3 Subpart A (dogs and cats) and what stands around it. A section on veterinary care for dogs was inserted by
 * the rule printed at 85 FR 28798 (13 May 2020), which moved old 3.13–3.19 to 3.14–3.20: each rule keeps a name of its
 * own and cites the number in force on the day of departure.
 */
const RENUMBERED = '2020-11-09'
const ANY_DAY = '1900-01-01'

const moved = (before: string, after: string) => [
  { from: ANY_DAY, text: `9 CFR ${before}` },
  { from: RENUMBERED, text: `9 CFR ${after}` },
]
const always = (text: string) => [{ from: ANY_DAY, text }]

export const SOURCES = {
  surface: { rule: 'us-9cfr-3.16e-temperature', citations: moved('3.15(e)', '3.16(e)'), tag: 'seen' },
  surfaceVentilation: {
    rule: 'us-9cfr-3.16e-ventilation',
    citations: moved('3.15(e)', '3.16(e)'),
    tag: 'seen',
  },
  aircraft: { rule: 'us-9cfr-3.16d-aircraft', citations: moved('3.15(d)', '3.16(d)'), tag: 'seen' },
  holding: { rule: 'us-9cfr-3.19d-temperature', citations: moved('3.18(d)', '3.19(d)'), tag: 'second-hand' },
  holdingVentilation: {
    rule: 'us-9cfr-3.19c-ventilation',
    citations: moved('3.18(c)', '3.19(c)'),
    tag: 'memory',
  },
  moving: { rule: 'us-9cfr-3.20a-temperature', citations: moved('3.19(a)', '3.20(a)'), tag: 'second-hand' },
  cover: { rule: 'us-9cfr-3.20a3-cover', citations: moved('3.19(a)(3)', '3.20(a)(3)'), tag: 'memory' },
  acclimation: { rule: 'us-9cfr-3.14e-acclimation', citations: moved('3.13(e)', '3.14(e)'), tag: 'seen' },
  openings: { rule: 'us-9cfr-3.15-openings', citations: moved('3.14', '3.15'), tag: 'second-hand' },
  openingsUpperHalf: {
    rule: 'us-9cfr-3.15-openings-upper-half',
    citations: moved('3.14', '3.15'),
    tag: 'second-hand',
  },
  openingsByFace: { rule: 'us-9cfr-3.15-openings-by-face', citations: moved('3.14', '3.15'), tag: 'memory' },
  rims: { rule: 'us-9cfr-3.15-rims', citations: moved('3.14', '3.15'), tag: 'second-hand' },
  numbersAir: { rule: 'us-9cfr-3.15-numbers-air', citations: moved('3.14', '3.15'), tag: 'second-hand' },
  numbersSurface: { rule: 'us-9cfr-3.15-numbers-surface', citations: moved('3.14', '3.15'), tag: 'memory' },
  company: { rule: 'us-9cfr-3.15-company', citations: moved('3.14', '3.15'), tag: 'memory' },
  litter: { rule: 'us-9cfr-3.15-litter', citations: moved('3.14', '3.15'), tag: 'seen' },
  age: { rule: 'us-9cfr-2.130-age', citations: always('9 CFR 2.130'), tag: 'second-hand' },
  food: { rule: 'us-9cfr-3.17a-food', citations: moved('3.16(a)', '3.17(a)'), tag: 'second-hand' },
  water: { rule: 'us-9cfr-3.17a-water', citations: moved('3.16(a)', '3.17(a)'), tag: 'second-hand' },
  observation: {
    rule: 'us-9cfr-3.18a-observation',
    citations: moved('3.17(a)', '3.18(a)'),
    tag: 'second-hand',
  },
  observationAir: {
    rule: 'us-9cfr-3.18b-observation-air',
    citations: moved('3.17(b)', '3.18(b)'),
    tag: 'memory',
  },
  acceptance: {
    rule: 'us-9cfr-3.14a-acceptance',
    citations: moved('3.13(a)', '3.14(a)'),
    tag: 'second-hand',
  },
  foodWaterCertificate: {
    rule: 'us-9cfr-3.14c-food-water-certificate',
    citations: moved('3.13(c)', '3.14(c)'),
    tag: 'second-hand',
  },
  healthCertificate: {
    rule: 'us-9cfr-2.78-health-certificate',
    citations: always('9 CFR 2.78(a)'),
    tag: 'seen',
  },
  handling: {
    rule: 'us-9cfr-2.131-handling',
    citations: always('9 CFR 2.131 (63 FR 10493, in force 3 April 1998)'),
    tag: 'seen',
  },
} as const satisfies Record<string, RuleSource>

export type SourceKey = keyof typeof SOURCES

export const DOGS: readonly string[] = ['dog', 'snub-nosed-dog']
export const CATS: readonly string[] = ['cat', 'snub-nosed-cat']

export const FOUR_MONTHS_DAYS = 112
export const SIX_MONTHS_DAYS = 182
export const EIGHT_WEEKS_DAYS = 56
