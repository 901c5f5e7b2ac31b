import type { Leg, Paper, Scenario } from '@/lib/thermal'
import type { BaseRuns } from '../base-runs'
import type { Finding } from '../result'
import { type Subject, isAboard } from '../subject'

/** What a pack reads: the plan, who is in it, and the runs behind it. Pure data. */
export interface LawView {
  scenario: Scenario
  context: NonNullable<Scenario['context']>
  subjects: Subject[]
  base: BaseRuns
  /** True where this animal keeps its alarm on this leg with all air 3 °C warmer and colder. */
  holdsWithMargin(subject: Subject, legId: string): boolean
}

/** Published rules of one authority: dated data and small checks, each answering with findings that carry their citation. */
export interface RulePack {
  id: string
  title: string
  /** Day the pack was last compared with its sources, ISO date. */
  asOf: string
  /** Where it is law, in words: "the European Union". */
  placeWords: string
  /** Country codes whose legs it reads. */
  countries: readonly string[]
  /** Species profiles it speaks of. */
  profiles: readonly string[]
  evaluate(view: LawView): Finding[]
}

/** A rule's stable name with the places in the text that hold it, by the date from which they do. */
export interface RuleSource {
  rule: string
  citations: readonly { from: string; text: string }[]
  tag: Finding['sourceTag']
}

/** Citation in force at a moment; a rule that is not from the text itself says so. */
export function citationAt({ citations, tag }: RuleSource, atMs: number): string {
  const inForce = citations.filter(({ from }) => epochMs(from) <= atMs).at(-1) ?? citations[0]
  const caution = {
    seen: '',
    'second-hand': ' (second-hand: check against the official text)',
    memory: ' (from memory: check against the official text)',
    judgement: '',
  }[tag]
  return `${inForce?.text ?? ''}${caution}`
}

/** A breach as its source allows: memory alone never decides as law. */
export function breachAs(source: RuleSource): 'breach' | 'judgement' {
  return source.tag === 'memory' ? 'judgement' : 'breach'
}

/** Indexes of the legs a country's law reads: legs that touch it, or all where the code was added by hand. */
export function legsUnder({ scenario, context }: LawView, countries: readonly string[]): number[] {
  const byHand = context.jurisdictions.some((code) => countries.includes(code))
  const touches = (leg: Leg) =>
    [leg.place?.fromCountry, leg.place?.toCountry].some(
      (code) => code !== undefined && countries.includes(code),
    )
  return scenario.legs.flatMap((leg, index) => (byHand || touches(leg) ? [index] : []))
}

/** Subjects of these species aboard on any of these legs. */
export function subjectsUnder(
  { subjects }: LawView,
  profiles: readonly string[],
  legIndexes: readonly number[],
): Subject[] {
  return subjects.filter(
    (subject) =>
      profiles.includes(subject.animal.profile) && legIndexes.some((index) => isAboard(subject, index)),
  )
}

/** Papers of a kind that speak of this animal; a paper without animals speaks of all. */
export function papersFor({ context }: LawView, animalId: string, kind: string): Paper[] {
  return context.papers.filter(
    (paper) => paper.kind === kind && (paper.animalIds.length === 0 || paper.animalIds.includes(animalId)),
  )
}

/** Calendar days, UTC, from the day a paper was issued to the departure; undefined without a date. */
export function daysOld(paper: Paper, departureMs: number): number | undefined {
  if (paper.issuedMs === undefined) return undefined
  return Math.floor(departureMs / DAY_MS) - Math.floor(paper.issuedMs / DAY_MS)
}

const DAY_MS = 86_400_000

/** Milliseconds of a day's start from "yyyy-mm-dd", by the civil calendar and without a clock. */
export function epochMs(day: string): number {
  const [year = 1970, month = 1, date = 1] = day.split('-').map(Number)
  const shifted = month <= 2 ? year - 1 : year
  const era = Math.floor(shifted / 400)
  const yearOfEra = shifted - era * 400
  const dayOfYear = Math.floor((153 * (month + (month > 2 ? -3 : 9)) + 2) / 5) + date - 1
  const dayOfEra = yearOfEra * 365 + Math.floor(yearOfEra / 4) - Math.floor(yearOfEra / 100) + dayOfYear
  return (era * 146_097 + dayOfEra - 719_468) * DAY_MS
}
