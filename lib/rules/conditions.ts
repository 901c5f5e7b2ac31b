import { controlOf } from '@/lib/planning/climate-control'
import type { EnclosedSpace, Leg, Scenario, Surroundings } from '@/lib/thermal'
import { GO_MARGIN_C } from './base-runs'
import type { Assessment, Finding } from './result'
import { compare, degrees, list, minutes, signed } from './wording'

/** What a verdict asks of somebody so that it holds; the record of asking and answering is kept elsewhere. */
export interface DerivedCondition {
  /** Counted from 1 in the order of the journey. */
  number: number
  origin: 'narrow_margin' | 'rule'
  text: string
  /** In the order of the journey; empty: the whole journey. */
  legIds: string[]
  animalIds: string[]
  rules: string[]
  /** "ours": our own checklist item is the confirmation. Else the party in charge confirms, and release waits for it. */
  askedOf: 'ours' | 'party-in-charge'
  /** Name of the party as the plan gives it; empty for ours or where none is named. */
  party: string
}

/** Names the plan holds of each leg's party in charge, by leg id. */
export type PartiesInCharge = Readonly<Record<string, string>>

/** The conditions an assessment carries: those of narrow margins, then those of rules, alike ones told once. */
export function conditionsOf(
  assessment: Pick<Assessment, 'findings' | 'stopLimits'>,
  scenario: Scenario,
  parties: PartiesInCharge = {},
): DerivedCondition[] {
  const drafts = [
    ...scenario.legs.flatMap((leg) => narrowMarginDrafts(assessment, leg, parties)),
    ...assessment.findings.filter(asksSomething).map((finding) => ruleDraft(finding, scenario, parties)),
  ]
  return grouped(drafts, scenario)
}

/** True where a finding alone makes a leg hold on a narrow margin. */
export function isNarrow({ status, marginOutsideAirC }: Finding): boolean {
  return (
    (status === 'met' || status === 'condition') &&
    marginOutsideAirC !== undefined &&
    marginOutsideAirC < GO_MARGIN_C
  )
}

type Draft = Omit<DerivedCondition, 'number'>

const READ_EVERY_MIN = 30

function narrowMarginDrafts(
  { findings, stopLimits }: Pick<Assessment, 'findings' | 'stopLimits'>,
  leg: Leg,
  parties: PartiesInCharge,
): Draft[] {
  const narrow = findings.filter((finding) => finding.legId === leg.id && isNarrow(finding))
  if (narrow.length === 0) return []
  const animalIds = unique(narrow.flatMap(({ animalId }) => animalId ?? []))
  const own = stopLimits.filter(({ legId, animalId }) => legId === leg.id && animalIds.includes(animalId))
  const shared = {
    origin: 'narrow_margin' as const,
    legIds: [leg.id],
    animalIds,
    rules: unique(narrow.map(({ rule }) => rule)),
  }
  const ours = { ...shared, askedOf: 'ours' as const, party: '' }
  const theirs = { ...shared, askedOf: 'party-in-charge' as const, party: parties[leg.id] ?? '' }
  const present = leg.attended
    ? [{ ...ours, text: readingText(leg, limitsWords(own)) }]
    : [{ ...theirs, text: `${heldText(leg.surroundings)} Confirmed in writing.` }]
  const open =
    leg.surroundings.type === 'open-air'
      ? [{ ...(leg.attended ? ours : theirs), text: openAirText(leg, narrow) }]
      : []
  return [...present, ...open]
}

function readingText(leg: Leg, limits: string): string {
  const moving = leg.kind === 'road' || leg.kind === 'rail'
  if (moving)
    return `A display or alarm in the cab set to the stop limit${limits}, and a reading at every stop; without one, a stop each hour stands in the plan.`
  return `Read the air outside the crate at the start and every ${READ_EVERY_MIN} minutes; stop limit${limits}.`
}

/** What whoever holds the air confirms: the set-point and the fresh air the plan counts on. */
function heldText(surroundings: Surroundings): string {
  switch (surroundings.type) {
    case 'controlled':
      return `Air held at ${degrees(surroundings.airTempC)} throughout.`
    case 'enclosed': {
      const setPoint = heldSetPoint(surroundings)
      // Fresh air nobody stated is asked for by a condition of its own.
      const air =
        surroundings.ventilationM3h === undefined
          ? 'Doors shut no longer than planned.'
          : `Fresh air ${signed(surroundings.ventilationM3h, 0)} m³/h kept running.`
      return `${setPoint}${air}`
    }
    case 'open-air':
      return 'Somebody stays with the crates in the open and reads the air at the start and every 30 minutes.'
  }
}

function heldSetPoint({ conditioning }: EnclosedSpace): string {
  if (conditioning === undefined) return ''
  const setPoint = degrees(conditioning.setPointC)
  switch (controlOf(conditioning)) {
    case 'both':
      return `Set-point ${setPoint} held throughout. `
    case 'cooling':
      return `Cooled to at most ${setPoint} throughout. `
    case 'heating':
      return `Heated to at least ${setPoint} throughout. `
    case 'none':
      return ''
  }
}

function openAirText(leg: Leg, narrow: readonly Finding[]): string {
  const spare = Math.max(0, Math.min(...narrow.map(({ marginMin = 0 }) => marginMin)))
  const most = Math.floor(leg.durationMin + leg.delay.worstMin + spare)
  const cold = narrow.every(({ side }) => side === 'low')
  return `At most ${minutes(most)} in the open, ${cold ? 'out of wind and wet' : 'in shade'}, and first off.`
}

function limitsWords(stops: readonly Assessment['stopLimits'][number][]): string {
  const above = stops.flatMap(({ aboveC }) => aboveC ?? [])
  const below = stops.flatMap(({ belowC }) => belowC ?? [])
  const parts = [
    above.length > 0 && `above ${signed(Math.min(...above), 0)} °C`,
    below.length > 0 && `below ${signed(Math.max(...below), 0)} °C`,
  ].filter((part) => part !== false)
  return parts.length === 0 ? '' : ` (${parts.join(', ')})`
}

/** Conditions of the body besides the narrow margin (cold effort, carbon dioxide, water), and of rules. */
function asksSomething(finding: Finding): boolean {
  return finding.rule === 'ventilation-unknown' || (finding.status === 'condition' && !isNarrow(finding))
}

/** What somebody can do about a strain of the body: the finding itself states a fact, which nobody can confirm. */
const WHAT_TO_DO: Readonly<Record<string, string>> = {
  'cold-effort': 'Out of wind and wet, bedding dry, and no longer in the cold than planned.',
  'carbon-dioxide': 'Openings of the crates kept free, nothing set against them, and fresh air kept running.',
  'water-loss': 'Water offered at every stop planned, and who drank written down.',
  'ventilation-unknown': 'Fresh air of the space stated in m³/h; until then leakage alone is counted.',
}

function ruleDraft(
  { rule, asked, legId, animalId, citation, basis }: Finding,
  { legs }: Scenario,
  parties: PartiesInCharge,
): Draft {
  const leg = legs.find(({ id }) => id === legId)
  const ours = leg === undefined || leg.attended
  return {
    origin: 'rule',
    text:
      WHAT_TO_DO[rule] ??
      (basis === 'physiology' || citation === undefined ? asked : `${asked} ${citation}.`),
    legIds: legId === undefined ? [] : [legId],
    animalIds: animalId === undefined ? [] : [animalId],
    rules: [rule],
    askedOf: ours ? 'ours' : 'party-in-charge',
    party: ours ? '' : (parties[leg.id] ?? ''),
  }
}

/** Same words to the same party are one condition, with all its legs and animals. */
function grouped(drafts: readonly Draft[], { legs }: Scenario): DerivedCondition[] {
  const order = new Map(legs.map(({ id }, index) => [id, index]))
  const byText = new Map<string, Draft>()
  for (const draft of drafts) {
    const key = [draft.askedOf, draft.party, draft.text].join('\n')
    const held = byText.get(key)
    byText.set(key, held === undefined ? draft : joined(held, draft))
  }
  return [...byText.values()].map((draft, index) => ({
    number: index + 1,
    ...draft,
    legIds: [...draft.legIds].sort((a, b) => (order.get(a) ?? 0) - (order.get(b) ?? 0)),
    animalIds: [...draft.animalIds].sort(compare),
  }))
}

function joined(a: Draft, b: Draft): Draft {
  return {
    ...a,
    legIds: unique([...a.legIds, ...b.legIds]),
    animalIds: unique([...a.animalIds, ...b.animalIds]),
    rules: unique([...a.rules, ...b.rules]),
  }
}

function unique(names: readonly string[]): string[] {
  return [...new Set(names)]
}

/** "Legs ramp-1 and flight-2", for a page without names of its own. */
export function legWords({ legIds }: Pick<DerivedCondition, 'legIds'>): string {
  return legIds.length === 0 ? 'Whole journey' : `${legIds.length === 1 ? 'Leg' : 'Legs'} ${list(legIds)}`
}
