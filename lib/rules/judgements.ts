import {
  type Animal,
  type AnimalFlag,
  type EnclosedSpace,
  type Leg,
  type OpenAir,
  type Scenario,
  type Surroundings,
} from '@/lib/thermal'
import { sunVector } from '@/lib/thermal/sun'
import type { BaseRuns } from './base-runs'
import type { Finding } from './result'
import { type Subject, isAboard } from './subject'

/** What the figures cannot answer and a person must: never silence. */
export function judgements(scenario: Scenario, subjects: readonly Subject[], base: BaseRuns): Finding[] {
  return [
    ...subjects.flatMap(animalJudgements),
    ...scenario.legs.flatMap((leg, index) =>
      subjects.some((one) => isAboard(one, index)) ? legJudgements(scenario, leg, index, base) : [],
    ),
  ]
}

const shared = { basis: 'house', status: 'judgement', sourceTag: 'judgement', overridable: false } as const

/** Flags whose effect on heat and cold has no measured coefficient, or one that differs from animal to animal. */
const FLAG_WORDS: Record<AnimalFlag, string> = {
  'snub-nosed': 'Snub-nosed: how much less it can pant differs from animal to animal.',
  elderly: 'Elderly: reserves are our estimate.',
  juvenile: 'Young: reserves are our estimate.',
  pregnant: 'Pregnant: no figure covers the added heat and the risk.',
  sedated: 'Sedated: no figure covers how a drug blunts the defence against heat and cold.',
  obese: 'Obese: reserves are our estimate.',
  unacclimated: 'Not acclimated: reserves are our estimate.',
  ill: 'Ill: no figure covers what the illness takes away.',
}

/** Snub-nosed, young, old, ill, pregnant, and whatever was given: always for a vet, however wide the margin. */
function animalJudgements({ animal, crate }: Subject): Finding[] {
  const snubNosed = animal.profile.startsWith('snub-nosed-') && !animal.flags.includes('snub-nosed')
  const flags = snubNosed ? ['snub-nosed' as const, ...animal.flags] : animal.flags
  const about = {
    ...shared,
    animalId: animal.id,
    crateId: crate.id,
    asked: 'A vet’s judgement of what the figures cannot say.',
  }
  return [
    ...flags.map((flag) => ({
      ...about,
      rule: `flag-${flag}`,
      note: `${FLAG_WORDS[flag]}${ageWords(animal, flag)}`,
    })),
    ...(animal.medicines === undefined
      ? []
      : [
          {
            ...about,
            rule: 'medicines',
            note: `Given: ${animal.medicines}. No figure covers what a drug does to heat and cold.`,
          },
        ]),
  ]
}

function ageWords({ ageDays }: Animal, flag: AnimalFlag): string {
  return ageDays !== undefined && (flag === 'juvenile' || flag === 'elderly')
    ? ` It is ${ageDays} days old.`
    : ''
}

function legJudgements(scenario: Scenario, leg: Leg, legIndex: number, base: BaseRuns): Finding[] {
  const findings: Finding[] = []
  if (hasUnknownVentilation(leg.surroundings))
    findings.push({
      ...shared,
      rule: 'ventilation-unknown',
      legId: leg.id,
      asked: 'The carrier’s figure for fresh air in the space.',
      note: 'Nobody said how much fresh air this space gets: leakage alone was counted.',
    })
  if (isSunMissing(scenario, leg, legIndex, base))
    findings.push({
      ...shared,
      rule: 'sun-missing',
      legId: leg.id,
      asked: 'Sunshine for a leg by day.',
      note: 'No sun was given for this leg, and it is not known to be night.',
    })
  if (isSunUncounted(leg.surroundings))
    findings.push({
      ...shared,
      rule: 'sun-not-counted',
      legId: leg.id,
      asked: 'Sun on a closed space counted as sunlit glass.',
      note: 'Sun was given for this leg, but the space has no sunlit glass: none of it was counted.',
    })
  return findings
}

function hasUnknownVentilation(surroundings: Surroundings): boolean {
  if (surroundings.type !== 'enclosed') return false
  return surroundings.ventilationM3h === undefined || hasUnknownVentilation(surroundings.outside)
}

/** All figures of sun zero on some schedule's stretch of the leg during which the sun is up, or may be, and would count. */
function isSunMissing(scenario: Scenario, leg: Leg, legIndex: number, base: BaseRuns): boolean {
  const { place } = leg
  const sky = skyOver(leg.surroundings)
  if (sky === undefined || !sky.takesSun || hasSun(sky.air)) return false
  if (place?.latitudeDeg === undefined || place.longitudeDeg === undefined) return true
  return base.schedules.some(({ legStartMin }) => {
    const fromMin = legStartMin[legIndex] ?? 0
    const toMin = legStartMin[legIndex + 1] ?? fromMin
    const moments = [fromMin, (fromMin + toMin) / 2, toMin]
    return moments.some((minute) => (sunVector(scenario.departureMs + minute * 60_000, place)?.up ?? 1) > 0)
  })
}

/** A wall in the sun is warmer than its air; only glass is counted, and a space without any takes no sun at all. */
function isSunUncounted(surroundings: Surroundings): boolean {
  const sky = skyOver(surroundings)
  return sky !== undefined && !sky.takesSun && hasSun(sky.air)
}

const hasSun = ({ series }: OpenAir) => series.some(({ solarWm2 }) => solarWm2 > 0)

/** The open air over a leg, and whether its sun reaches what is computed; undefined indoors and in full shade. */
function skyOver(surroundings: Surroundings): { air: OpenAir; takesSun: boolean } | undefined {
  let outermost: EnclosedSpace | undefined
  let around = surroundings
  while (around.type === 'enclosed') {
    outermost = around
    around = around.outside
  }
  if (around.type !== 'open-air' || around.shadePct >= 100) return undefined
  return { air: around, takesSun: outermost === undefined || outermost.solarApertureM2 > 0 }
}
