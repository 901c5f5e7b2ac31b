import type { Finding } from '@/lib/rules/result'
import type { PlanAnimal } from '@/lib/schemas/plan'
import { resolveLocalTime } from '@/lib/planning/local-time'
import { dayDateYear, figure, kilograms } from '../format'
import type { AnimalView, Moment, Stamp } from '../sheet'
import type { Assessed } from './assessed'
import type { ProfileFact, SheetFacts } from './facts'
import type { JourneyLeg } from './journey'
import { legsInWords, limitWords, marginOf, narrowest, trackWords } from './words'

export interface AnimalContext {
  facts: SheetFacts
  assessed: Assessed | null
  journey: JourneyLeg[]
  /** Conditions that speak of one of these legs, or of the whole journey. */
  conditionsOn: (legIds: readonly string[]) => number
}

/** Every animal in the order of its crate's letter, with its verdict and what decides it. */
export function animalViews(context: AnimalContext): AnimalView[] {
  const { plan } = context.facts
  const byId = new Map(plan.animals.map((animal) => [animal.id, animal]))
  return [...plan.crates]
    .sort((a, b) => (a.letter < b.letter ? -1 : 1))
    .flatMap((crate) =>
      crate.occupants.flatMap((animalId) => {
        const animal = byId.get(animalId)
        return animal === undefined ? [] : [animalView(animal, crate, context)]
      }),
    )
}

function animalView(
  animal: PlanAnimal,
  crate: { id: string; letter: string },
  context: AnimalContext,
): AnimalView {
  const { facts, assessed, journey, conditionsOn } = context
  const profile = facts.profiles.find(({ key }) => key === animal.profileKey)
  const verdict = assessed?.effective.animalVerdicts.find(({ animalId }) => animalId === animal.id)
  const finding =
    verdict?.decidedBy === undefined ? undefined : assessed?.effective.findings[verdict.decidedBy]
  const decidedLegs =
    finding === undefined || assessed === null ? [] : legsOfFinding(finding, animal.id, assessed, journey)
  const shown = finding?.marginMin === undefined ? (narrowestOf(animal.id, assessed) ?? finding) : finding
  const firstZone = journey[0]?.start.zone ?? facts.firm.zone
  return {
    animalId: animal.id,
    crateId: crate.id,
    crateLetter: crate.letter,
    name: animal.name,
    count: animal.count,
    speciesName: profile?.commonName ?? animal.profileKey,
    breedNote: animal.breedNote,
    sexWords: animal.sex === 'unknown' ? 'sex not known' : animal.sex,
    ageWords: ageWords(animal.ageDays),
    massKg: animal.massKg,
    identification: animal.identification,
    describes: describes(animal, profile),
    coatWords: coatWords(animal),
    flagWords: animal.flags.length === 0 ? 'None' : animal.flags.join(', '),
    medicines: animal.medicines,
    mannerWords: mannerWords(animal),
    examinedWords: examinedWords(animal),
    lastFed: momentOf(animal.lastFedLocal, firstZone),
    lastWatered: momentOf(animal.lastWateredLocal, firstZone),
    bodyLimits: profile?.limits ?? null,
    stamp: stampOf(verdict?.verdict, context, conditionsOn(conditionalLegs(animal.id, assessed))),
    margin: marginOf(shown),
    decidedWords: decidedWords(finding, shown, decidedLegs, journey),
    decidedLegs,
    variant: shown?.variant ?? null,
    trackWords: trackWords(shown),
    decidedAt: decidedAt(finding, assessed, journey),
    overridden: isOverridden(animal.id, assessed),
  }
}

function narrowestOf(animalId: string, assessed: Assessed | null): Finding | undefined {
  return narrowest((assessed?.effective.findings ?? []).filter((one) => one.animalId === animalId))
}

/** "alarm, leg 2"; what decides without a margin of its own is named after the limit the figures are to. */
function decidedWords(
  finding: Finding | undefined,
  shown: Finding | undefined,
  decidedLegs: number[],
  journey: JourneyLeg[],
): string {
  if (finding === undefined) return ''
  const where = (words: string, ordinals: number[]) =>
    [words, legsInWords(ordinals)].filter(Boolean).join(', ')
  const decides = where(limitWords(finding), decidedLegs)
  if (shown === finding || shown === undefined) return decides
  const ordinals = journey.filter(({ leg }) => leg.id === shown.legId).map(({ ordinal }) => ordinal)
  return `${where(limitWords(shown), ordinals)}. By ${decides}`
}

/** The verdict as a stamp; conditions count only where the verdict holds on them. */
export function stampOf(
  verdict: AnimalView['stamp']['verdict'] | undefined,
  { assessed }: Pick<AnimalContext, 'assessed'>,
  conditions: number,
): Stamp {
  if (assessed === null || verdict === undefined) return { verdict: 'none', conditions: 0, outOfDate: false }
  return {
    verdict,
    conditions: verdict === 'conditional' ? conditions : 0,
    outOfDate: assessed.fact.outOfDate,
  }
}

/** Legs on which the same limit decides alike: a breach of one rule on two legs is told once. */
function legsOfFinding(
  finding: Finding,
  animalId: string,
  { effective }: Assessed,
  journey: JourneyLeg[],
): number[] {
  const alike = effective.findings.filter(
    (one) =>
      one === finding ||
      (one.status === 'breach' &&
        finding.status === 'breach' &&
        one.rule === finding.rule &&
        one.side === finding.side &&
        one.animalId === animalId),
  )
  const legIds = new Set(alike.map(({ legId }) => legId))
  return journey.filter(({ leg }) => legIds.has(leg.id)).map(({ ordinal }) => ordinal)
}

function conditionalLegs(animalId: string, assessed: Assessed | null): string[] {
  const verdicts = assessed?.effective.verdicts ?? []
  return verdicts
    .filter((one) => one.animalId === animalId && one.verdict === 'conditional')
    .map(({ legId }) => legId)
}

function isOverridden(animalId: string, assessed: Assessed | null): boolean {
  return (assessed?.effective.overridden ?? []).some(
    ({ findingIndex }) => assessed?.original[findingIndex]?.animalId === animalId,
  )
}

/** When the finding happens, on its own schedule, told in the zone of the leg it happens on. */
export function decidedAt(
  finding: Finding | undefined,
  assessed: Assessed | null,
  journey: JourneyLeg[],
): Moment | null {
  const departureMs = journey[0]?.start.ms
  if (finding?.minute === undefined || departureMs === undefined || assessed === null) return null
  const zone =
    journey.find(({ leg }) => leg.id === finding.legId)?.start.zone ?? journey[0]?.start.zone ?? 'UTC'
  return { ms: departureMs + Math.round(finding.minute) * 60_000, zone }
}

/** "Beagle, female, 4 y, 11.2 kg" */
function describes(animal: PlanAnimal, profile: ProfileFact | undefined): string {
  const kind = animal.breedNote === '' ? (profile?.commonName ?? animal.profileKey) : animal.breedNote
  const mass = animal.massKg === null ? '' : `${kilograms(animal.massKg)}${animal.count > 1 ? ' each' : ''}`
  const sex = animal.sex === 'unknown' ? '' : animal.sex
  return [kind, sex, ageWords(animal.ageDays), mass].filter(Boolean).join(', ')
}

/** "4 y", "7 months", "12 days"; empty where nobody said. */
export function ageWords(ageDays: number | null): string {
  if (ageDays === null) return ''
  if (ageDays >= 730) return `${Math.floor(ageDays / 365.25)}\u00a0y`
  return ageDays >= 90 ? `${Math.floor(ageDays / 30.44)}\u00a0months` : `${ageDays}\u00a0days`
}

function coatWords({ coat }: PlanAnimal): string {
  const depth = coat.depthMm === null ? '' : `${figure(coat.depthMm)}\u00a0mm`
  const wet = coat.wetPct === 0 ? 'dry' : `${figure(coat.wetPct)}\u00a0% wet`
  return [depth, coat.clipped ? 'clipped' : '', wet].filter(Boolean).join(', ')
}

function momentOf(local: string, zone: string): Moment | null {
  const time = resolveLocalTime(local, zone, null)
  if (time.kind === 'instant') return { ms: time.instantMs, zone }
  return time.kind === 'doubled' && time.choices[0] !== undefined
    ? { ms: time.choices[0].instantMs, zone }
    : null
}

function mannerWords({ temperament, crateTrained }: PlanAnimal): string {
  const temper = temperament === 'unknown' ? 'temperament not known' : temperament
  return `${temper}, ${crateTrained ? 'crate-trained' : 'not crate-trained'}`
}

function examinedWords({ examinedOn, examinedBy }: PlanAnimal): string {
  const day = examinedOn === '' ? '' : dayDateYear(Date.parse(`${examinedOn}T12:00Z`), 'UTC')
  return [day, examinedBy === '' ? '' : `by ${examinedBy}`].filter(Boolean).join(' ')
}
