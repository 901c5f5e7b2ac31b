import type { Finding } from '@/lib/rules/result'
import { bodyMargin } from '../format'
import type { AnimalView } from '../sheet'
import type { Assessed } from './assessed'
import type { JourneyLeg } from './journey'
import { capital, legsInWords, limitWords, marginOf, narrowest, scheduleInWords, spareWords } from './words'

export interface Headline {
  headline: string
  headlineMore: string[]
}

/** The bold line beside the stamp, and what is said under it: which limit, whose, where, how much, and who may change it. */
export function headlineOf(
  assessed: Assessed | null,
  animals: AnimalView[],
  journey: JourneyLeg[],
): Headline {
  if (assessed === null) return { headline: 'Nothing was assessed yet.', headlineMore: [] }
  const { effective, fact } = assessed
  const { decidedBy, verdict } = effective.verdict
  const finding = decidedBy === undefined ? undefined : effective.findings[decidedBy]
  if (finding === undefined) return { headline: 'No finding decides.', headlineMore: [] }
  const room = finding.marginMin === undefined ? narrowest(effective.findings) : undefined
  const more = [
    room === undefined ? '' : leastToSpare(room, animals, journey, 'go', false),
    whereAndBody(room ?? finding, journey),
    verdict === 'no-go'
      ? mayOverride(effective.findings)
      : verdict === 'conditional'
        ? holdsWhile(effective.overridden.length)
        : '',
    fact.outOfDate
      ? 'Out of date: the plan or what it rests on has changed since. Assess again before anything is decided.'
      : '',
    fact.result.rulesEvaluated
      ? ''
      : 'Only the animals’ physiology was judged: no law and no carrier’s rule.',
  ]
  return { headline: leastToSpare(finding, animals, journey, verdict), headlineMore: more.filter(Boolean) }
}

function leastToSpare(
  finding: Finding,
  animals: AnimalView[],
  journey: JourneyLeg[],
  verdict: string,
  /** False: the figures are of the narrowest limit, something else decides. */
  decides = true,
): string {
  const animal = animals.find(({ animalId }) => animalId === finding.animalId)
  const who = animal === undefined ? '' : `${animal.name} (${animal.crateLetter})`
  const ordinals =
    decides && animal !== undefined && animal.decidedLegs.length > 0
      ? animal.decidedLegs
      : ordinalsOf(finding, journey)
  const where = legsInWords(ordinals)
  const decidedBy = `${limitName(finding)} decides`
  const { minutes, outsideAirC } = marginOf(finding)
  if (minutes === null && outsideAirC === null)
    return `${[who, where, decidedBy].filter(Boolean).join(', ')}: ${finding.asked}`
  const spare = spareWords(marginOf(finding)).replace(/, /, ', outside air ')
  if (verdict === 'no-go') return `${[who, where, decidedBy].filter(Boolean).join(', ')}: ${spare}.`
  return `Least to spare: ${spare}. ${[who, where, limitName(finding)].filter(Boolean).join(', ')}.`
}

function limitName(finding: Finding): string {
  const words = limitWords(finding)
  return finding.limitKind === 'alarm' || finding.limitKind === 'critical' ? `${words} limit` : words
}

function ordinalsOf(finding: Finding, journey: JourneyLeg[]): number[] {
  return journey.filter(({ leg }) => leg.id === finding.legId).map(({ ordinal }) => ordinal)
}

function whereAndBody(finding: Finding, journey: JourneyLeg[]): string {
  const body = finding.marginBodyC === undefined ? '' : `Body ${bodyMargin(finding.marginBodyC, 'c')}`
  const schedule =
    finding.scheduleId === undefined
      ? ''
      : scheduleInWords(finding.scheduleId, (legId) => journey.find(({ leg }) => leg.id === legId)?.ordinal)
  const words = [body, schedule].filter(Boolean).join(', ')
  return words === '' ? '' : `${capital(words)}.`
}

function holdsWhile(overrides: number): string {
  return overrides === 0
    ? 'It holds only while its conditions are kept.'
    : 'It rests on a vet’s override, and holds only inside the figures it was signed for.'
}

/** What a vet may do about it: nothing where anything absolute is in breach. */
function mayOverride(findings: readonly Finding[]): string {
  const breaches = findings.filter(({ status }) => status === 'breach')
  const absolute = breaches.find(({ overridable }) => !overridable)
  if (absolute === undefined)
    return 'A vet may override it by name and in writing. Nobody overrides a critical limit, a law or a carrier’s rule.'
  if (absolute.overrideRefusedBecause !== undefined)
    return `No override: ${lowerFirst(absolute.overrideRefusedBecause)}`
  if (absolute.basis === 'carrier')
    return 'Only the carrier’s written consent changes this. Nobody overrides it.'
  return 'Nobody may override it: change the plan.'
}

function lowerFirst(words: string): string {
  return words.charAt(0).toLowerCase() + words.slice(1)
}
