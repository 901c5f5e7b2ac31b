import { GO_MARGIN_C } from './base-runs'
import type { AnimalVerdict, Finding, LegVerdict, Verdict } from './result'
import { compare } from './wording'

/** An animal, its crate, and the legs it is aboard, in order. */
export interface Passage {
  animalId: string
  crateId: string
  legIds: string[]
}

export interface Verdicts {
  verdicts: LegVerdict[]
  animalVerdicts: AnimalVerdict[]
  verdict: { verdict: Verdict; decidedBy?: number }
}

/**
 * Verdict per animal and leg, per animal, and for the consignment. A leg is judged by the findings that name it; those
 * without a leg count for the animal. Breach is no-go; condition, judgement, unknown or an outside-air margin under 3 °C
 * is conditional; a note never counts. Animal and consignment take the worst.
 */
export function decide(findings: readonly Finding[], passages: readonly Passage[]): Verdicts {
  const verdicts = passages.flatMap((passage) =>
    passage.legIds.map((legId) => ({
      animalId: passage.animalId,
      legId,
      ...judge(findings, (finding) => finding.legId === legId && concerns(finding, passage)),
    })),
  )
  const animalVerdicts = passages.map((passage) => ({
    animalId: passage.animalId,
    ...judge(
      findings,
      (finding) =>
        concerns(finding, passage) && (finding.legId === undefined || passage.legIds.includes(finding.legId)),
    ),
  }))
  const verdict = judge(findings, (finding) => passages.some((passage) => concerns(finding, passage)))
  return { verdicts, animalVerdicts, verdict }
}

/** What a finding alone makes of a leg. */
export function weightOf({
  status,
  marginOutsideAirC,
}: Pick<Finding, 'status' | 'marginOutsideAirC'>): Verdict {
  switch (status) {
    case 'breach':
      return 'no-go'
    case 'condition':
    case 'judgement':
    case 'unknown':
      return 'conditional'
    case 'met':
      return marginOutsideAirC !== undefined && marginOutsideAirC < GO_MARGIN_C ? 'conditional' : 'go'
    case 'note':
      return 'go'
  }
}

/** The lower, the worse. */
export const SEVERITY: Record<Verdict, number> = { 'no-go': 0, conditional: 1, go: 2 }

export function worstOf(verdicts: readonly Verdict[]): Verdict {
  return verdicts.reduce<Verdict>(
    (worst, verdict) => (SEVERITY[verdict] < SEVERITY[worst] ? verdict : worst),
    'go',
  )
}

function concerns(finding: Finding, { animalId, crateId }: Passage): boolean {
  return (
    (finding.animalId === undefined || finding.animalId === animalId) &&
    (finding.crateId === undefined || finding.crateId === crateId)
  )
}

function judge(
  findings: readonly Finding[],
  counts: (finding: Finding) => boolean,
): { verdict: Verdict; decidedBy?: number } {
  const indexes = findings.flatMap((finding, index) =>
    counts(finding) && finding.status !== 'note' ? [index] : [],
  )
  const [first, ...others] = indexes
  if (first === undefined) return { verdict: 'go' }
  const decidedBy = others.reduce(
    (held, index) => (before(findings[index], findings[held]) ? index : held),
    first,
  )
  const finding = findings[decidedBy]
  return { verdict: finding === undefined ? 'go' : weightOf(finding), decidedBy }
}

/** Breach first by kind, then what makes a leg conditional, then the least margins; at last the name, so that order never matters. */
function before(a: Finding | undefined, b: Finding | undefined): boolean {
  if (a === undefined || b === undefined) return false
  const keys = [
    rank(a) - rank(b),
    margin(a.marginOutsideAirC) - margin(b.marginOutsideAirC),
    margin(a.marginMin) - margin(b.marginMin),
    compare(a.rule, b.rule),
  ]
  return (keys.find((key) => key !== 0) ?? 0) < 0
}

function rank(finding: Finding): number {
  const { basis, limitKind, status } = finding
  if (status !== 'breach') return weightOf(finding) === 'conditional' ? 10 : 11
  if (basis === 'physiology') return limitKind === 'critical' ? 0 : 3
  return { law: 1, carrier: 2, standard: 4, house: 5 }[basis]
}

/** Absent margins stand behind any figure; a finite number, so that differences stay numbers. */
function margin(value: number | undefined): number {
  return value ?? 1e9
}
