import { type AnimalFlag, type Leg, type Scenario, type Surroundings } from '@/lib/thermal'
import { sunVector } from '@/lib/thermal/sun'
import type { BaseRuns } from './base-runs'
import type { Finding } from './result'
import { type Subject, isAboard } from './subject'

/** What the figures cannot answer and a person must: never silence. */
export function judgements(scenario: Scenario, subjects: readonly Subject[], base: BaseRuns): Finding[] {
  return [
    ...subjects.flatMap(flagJudgements),
    ...scenario.legs.flatMap((leg, index) =>
      subjects.some((one) => isAboard(one, index)) ? legJudgements(scenario, leg, index, base) : [],
    ),
  ]
}

const shared = { basis: 'house', status: 'judgement', sourceTag: 'judgement', overridable: false } as const

/** Flags whose effect on heat and cold has no measured coefficient; the snub-nosed rows have one of their own. */
const FLAG_WORDS: Record<AnimalFlag, string> = {
  'snub-nosed': 'Snub-nosed: how much less it can pant is our estimate for this species.',
  elderly: 'Elderly: reserves are our estimate.',
  juvenile: 'Juvenile: reserves are our estimate.',
  pregnant: 'Pregnant: no figure covers the added heat and the risk.',
  sedated: 'Sedated: no figure covers how a drug blunts the defence against heat and cold.',
  obese: 'Obese: reserves are our estimate.',
  unacclimated: 'Not acclimated: reserves are our estimate.',
  ill: 'Ill: no figure covers what the illness takes away.',
}

function flagJudgements({ animal, crate }: Subject): Finding[] {
  return animal.flags
    .filter((flag) => !(flag === 'snub-nosed' && animal.profile.startsWith('snub-nosed-')))
    .map((flag) => ({
      ...shared,
      rule: `flag-${flag}`,
      animalId: animal.id,
      crateId: crate.id,
      asked: 'A vet’s judgement of what the figures cannot say.',
      note: FLAG_WORDS[flag],
    }))
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
      asked: 'Sunshine for a leg in the open by day.',
      note: 'No sun was given for this leg in the open, and it is not known to be night.',
    })
  return findings
}

function hasUnknownVentilation(surroundings: Surroundings): boolean {
  if (surroundings.type !== 'enclosed') return false
  return surroundings.ventilationM3h === undefined || hasUnknownVentilation(surroundings.outside)
}

/** All figures of sun zero on some schedule's stretch of the leg during which the sun is up, or may be. */
function isSunMissing(scenario: Scenario, leg: Leg, legIndex: number, base: BaseRuns): boolean {
  const { surroundings, place } = leg
  if (surroundings.type !== 'open-air' || surroundings.shadePct >= 100) return false
  if (surroundings.series.some(({ solarWm2 }) => solarWm2 > 0)) return false
  if (place?.latitudeDeg === undefined || place.longitudeDeg === undefined) return true
  return base.schedules.some(({ legStartMin }) => {
    const fromMin = legStartMin[legIndex] ?? 0
    const toMin = legStartMin[legIndex + 1] ?? fromMin
    const moments = [fromMin, (fromMin + toMin) / 2, toMin]
    return moments.some((minute) => (sunVector(scenario.departureMs + minute * 60_000, place)?.up ?? 1) > 0)
  })
}
