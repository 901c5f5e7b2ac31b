import { isNarrow } from '@/lib/rules/conditions'
import type { Finding, FindingStatus } from '@/lib/rules/result'
import type { Plan } from '@/lib/schemas/plan'
import { findingInFull } from '../override-words'
import type { ConditionView, FindingView, OverrideView } from '../sheet'
import type { Assessed } from './assessed'
import { BASIS_WORDS, legsInWords, listed, marginOf, spareWords, valueWords } from './words'

/** What the words of a finding are made with. */
export interface Naming {
  letterOf: (animalId: string) => string
  crateLetterOf: (crateId: string) => string
  ordinalOf: (legId: string) => number | undefined
}

interface Numbered {
  finding: Finding
  index: number
}

/**
 * All findings as rows: the same rule with the same answer on several legs or animals is one row, told at its narrowest.
 * What decides comes first, then what is asked for or unknown, then what was met by the least.
 */
export function findingViews({ assessed, naming, conditions }: FindingContext): FindingView[] {
  const { effective, original } = assessed
  const deciding = new Set([
    effective.verdict.decidedBy,
    ...effective.animalVerdicts.map(({ decidedBy }) => decidedBy),
  ])
  const overriders = new Map(effective.overridden.map(({ findingIndex, by }) => [findingIndex, by.signedBy]))
  // An overridden finding counts as a condition now; its row tells what it was.
  const findings = effective.findings.map((finding, index) => original[index] ?? finding)
  return grouped(findings, overriders)
    .sort((a, b) => compareGroups(a, b, deciding))
    .map((group, index) => findingView(group, index + 1, { deciding, overriders, naming, conditions }))
}

export interface FindingContext {
  assessed: Assessed
  naming: Naming
  conditions: ConditionView[]
}

function grouped(findings: readonly Finding[], overriders: ReadonlyMap<number, string>): Numbered[][] {
  const groups = new Map<string, Numbered[]>()
  findings.forEach((finding, index) => {
    const { rule, status, side, asked, citation, limitKind } = finding
    const key = JSON.stringify([rule, status, side, asked, citation, limitKind, overriders.get(index)])
    groups.set(key, [...(groups.get(key) ?? []), { finding, index }])
  })
  return [...groups.values()].map((group) => [...group].sort(byMargin))
}

function byMargin(a: Numbered, b: Numbered): number {
  const minutes = (a.finding.marginMin ?? 999) - (b.finding.marginMin ?? 999)
  return (
    minutes || (a.finding.marginOutsideAirC ?? 99) - (b.finding.marginOutsideAirC ?? 99) || a.index - b.index
  )
}

const RANK: Record<FindingStatus, number> = {
  breach: 0,
  condition: 2,
  unknown: 3,
  judgement: 4,
  met: 5,
  note: 6,
}

function rankOf(group: Numbered[]): number {
  const finding = group[0]?.finding
  if (finding === undefined) return 9
  const absolute = finding.status === 'breach' && !finding.overridable
  return absolute ? 0 : finding.status === 'breach' ? 1 : RANK[finding.status]
}

function compareGroups(a: Numbered[], b: Numbered[], deciding: ReadonlySet<number | undefined>): number {
  const decides = (group: Numbered[]) => (group.some(({ index }) => deciding.has(index)) ? 0 : 1)
  const [first, second] = [a[0], b[0]]
  if (first === undefined || second === undefined) return 0
  const ranks = rankOf(a) - rankOf(b)
  return ranks || decides(a) - decides(b) || byMargin(first, second)
}

interface Context {
  deciding: ReadonlySet<number | undefined>
  overriders: ReadonlyMap<number, string>
  naming: Naming
  conditions: ConditionView[]
}

function findingView(group: Numbered[], number: number, context: Context): FindingView {
  const { deciding, overriders, naming, conditions } = context
  const [narrowest] = group
  if (narrowest === undefined) throw new RangeError('A row of findings holds at least one.')
  const { finding, index } = narrowest
  const overrider = overriders.get(index) ?? null
  const animalIds = distinct(group.map((one) => one.finding.animalId))
  const legIds = distinct(group.map((one) => one.finding.legId))
  return {
    number,
    index,
    indexes: group.map((one) => one.index).sort((a, b) => a - b),
    rule: finding.rule,
    basis: finding.basis,
    basisWords: BASIS_WORDS[finding.basis],
    status: overrider === null ? finding.status : 'overridden',
    ...statusOf(finding, overrider, conditionNumbers(group, conditions)),
    whoLegWords: whoAndLeg(group, animalIds, legIds, naming),
    animalIds,
    legIds,
    asked: finding.asked,
    citation: finding.citation ?? '',
    sourceWords: SOURCE_WORDS[finding.sourceTag],
    givesWords: valueWords(finding),
    spareWords: spareWords(marginOf(finding)) || spareOf(finding),
    margin: marginOf(finding),
    note: finding.note,
    overridable: finding.overridable,
    decides: group.some((one) => deciding.has(one.index)),
  }
}

const SOURCE_WORDS: Record<Finding['sourceTag'], string> = {
  seen: '',
  'second-hand': 'second-hand, check it',
  memory: 'from memory, check it',
  judgement: 'judgement',
}

function statusOf(
  finding: Finding,
  overrider: string | null,
  numbers: number[],
): Pick<FindingView, 'statusBold' | 'statusWords'> {
  if (overrider !== null) return { statusBold: 'Overridden', statusWords: `by ${overrider}` }
  switch (finding.status) {
    case 'breach':
      return { statusBold: 'Breach.', statusWords: breachWords(finding) }
    case 'condition':
      return {
        statusBold: '',
        statusWords: numbers.length === 0 ? 'Condition' : `Condition ${listed(numbers)}`,
      }
    case 'unknown':
      return {
        statusBold: 'Unknown.',
        statusWords: finding.basis === 'carrier' ? 'Ask the carrier' : 'Check with the authority',
      }
    case 'judgement':
      return { statusBold: '', statusWords: 'For the vet to judge' }
    case 'met':
      if (isNarrow(finding)) return { statusBold: 'Narrow.', statusWords: 'Met, with under 3 °C to spare' }
      return {
        statusBold: '',
        statusWords: finding.limitKind === 'critical' ? 'Met. Nobody may override it' : 'Met',
      }
    case 'note':
      return { statusBold: '', statusWords: 'Note' }
  }
}

function breachWords({ overridable, basis, overrideRefusedBecause }: Finding): string {
  if (overridable) return 'A vet may override it'
  if (overrideRefusedBecause !== undefined) return `No override. ${overrideRefusedBecause}`
  return basis === 'carrier' ? 'Only the carrier’s consent lifts it' : 'Nobody may override it'
}

function conditionNumbers(group: Numbered[], conditions: ConditionView[]): number[] {
  const { rule } = group[0]?.finding ?? {}
  return conditions
    .filter(({ findingRule }) => findingRule !== null && findingRule === rule)
    .map(({ number }) => number)
}

function whoAndLeg(group: Numbered[], animalIds: string[], legIds: string[], naming: Naming): string {
  const crates = distinct(group.map((one) => one.finding.crateId)).map(naming.crateLetterOf)
  const who =
    animalIds.length > 0
      ? listed(distinct(animalIds.map(naming.letterOf)))
      : crates.length > 0
        ? listed(distinct(crates))
        : 'all'
  const ordinals = legIds.flatMap((legId) => naming.ordinalOf(legId) ?? [])
  return ordinals.length === 0 ? who : `${who}, ${legsInWords(ordinals)}`
}

/** Room to a limit that is no body limit, in its own unit. */
function spareOf({ limit, value, side, unit }: Finding): string {
  if (limit === undefined || value === undefined || side === undefined) return ''
  const room = side === 'high' ? limit - value : value - limit
  return valueWords({ value: Math.floor(room * 10) / 10, ...(unit === undefined ? {} : { unit }) })
}

/** Overrides in force, each with the finding it names, as they stand beside the stamp. */
export function overrideViews({ effective, original }: Assessed, plan: Plan, zone: string): OverrideView[] {
  return effective.overridden.flatMap(({ findingIndex, by }) => {
    const finding = original[findingIndex]
    if (finding === undefined) return []
    return [
      {
        findingIndex,
        findingWords: findingInFull(finding, plan),
        reason: by.reason,
        vetName: by.signedBy,
        signedAt: { ms: by.signedAtMs, zone },
        minutesPast: by.minutesPast,
        worstBodyC: by.worstBodyC,
      },
    ]
  })
}

function distinct(items: readonly (string | undefined)[]): string[] {
  return [...new Set(items.filter((item) => item !== undefined))]
}
