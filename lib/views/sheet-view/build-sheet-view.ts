import { STATE_WORDS } from '@/lib/states/consignment'
import type { ConditionView, SheetView } from '../sheet'
import { animalViews, stampOf } from './animals'
import { approvalViews } from './approvals'
import { type Assessed, assessedOf } from './assessed'
import { sheetCharts } from './charts'
import { conditionsRemark, conditionViews } from './conditions'
import type { SheetFacts } from './facts'
import { findingViews, type Naming, overrideViews } from './findings'
import { headlineOf } from './headline'
import { type JourneyLeg, journeyOf } from './journey'
import { legViews } from './legs'
import { enduranceViews, stopLimitViews } from './stops'
import { marginOf } from './words'

/** The go/no-go sheet of one revision, from plain facts. Pure: no clock, no database, the same facts give the same view. */
export function buildSheetView(facts: SheetFacts): SheetView {
  const { consignment, plan, firm } = facts
  const assessed = assessedOf(facts)
  const journey = journeyOf(plan, facts.places, firm.zone)
  const conditions = conditionViews(facts, journey)
  const conditionsOn = (legIds: readonly string[]) => countOn(conditions, journey, legIds)
  const animals = animalViews({ facts, assessed, journey, conditionsOn })
  const naming = namingOf(facts, journey)
  const verdict = assessed?.effective.verdict
  const finding =
    verdict?.decidedBy === undefined ? undefined : assessed?.effective.findings[verdict.decidedBy]
  const first = journey[0]
  const last = journey.at(-1)
  const nowhere = { ms: facts.madeAtMs, zone: firm.zone }
  return {
    consignmentId: consignment.id,
    mark: consignment.mark,
    revision: consignment.revision,
    replacesRevision: consignment.replacesRevision,
    state: consignment.state,
    revisionWords: revisionWords(facts),
    edgeWords: edgeWords(facts),
    documentCode: facts.documentCode,
    made: { ms: facts.madeAtMs, zone: firm.zone },
    firm,
    from: placed(plan.consignor.name, first?.fromPlace),
    to: placed(plan.consignee.name, last?.toPlace),
    leaves: first?.start ?? nowhere,
    arrives: last?.end ?? nowhere,
    shipper: [facts.shipper.name, facts.shipper.accountNo].filter(Boolean).join(', '),
    flight: flightOf(journey),
    animalCount: animals.reduce((sum, { count }) => sum + count, 0),
    crateCount: plan.crates.length,
    journeyMin:
      first === undefined || last === undefined ? 0 : Math.round((last.end.ms - first.start.ms) / 60_000),
    stamp: stampOf(verdict?.verdict, { assessed }, conditions.length),
    ...headlineOf(assessed, animals, journey),
    margin: marginOf(finding),
    overrides: assessed === null ? [] : overrideViews(assessed, plan, firm.zone),
    approvals: approvalViews(facts),
    animals,
    legs: legViews(journey, animals, assessed, conditions),
    conditions,
    conditionsWords: conditionsRemark(conditions),
    stopLimits: stopLimitViews(facts, assessed, journey),
    endurance: enduranceViews(facts, assessed, journey),
    findings: assessed === null ? [] : findingViews({ assessed, naming, conditions }),
    charts: sheetCharts(animals, assessed, journey),
    ...provenance(facts, assessed),
    cautions: cautionsOf(assessed),
  }
}

function provenance(
  { consignment, firm, plan, profiles, assessment }: SheetFacts,
  assessed: Assessed | null,
) {
  const used = profiles.filter(({ key }) => plan.animals.some((animal) => animal.profileKey === key))
  const rows = used.map(({ commonName, version }) => `${commonName.toLowerCase()} ${version}`).join(', ')
  const result = assessed?.fact.result
  return {
    planHash: consignment.planHash,
    inputHash: result?.inputHash ?? '',
    assessed: assessment === null ? null : { ms: assessment.assessedAtMs, zone: firm.zone },
    assessedBy: assessment?.assessedBy ?? '',
    weatherWords: 'as typed in the plan',
    versionWords:
      result === undefined
        ? ''
        : `engine ${result.engineVersion}, rules ${result.rulesVersion}, profiles ${rows}`,
    runWords: result === undefined ? '' : `3 tracks for each animal, ${result.schedules.length} schedules`,
  }
}

function cautionsOf(assessed: Assessed | null): SheetView['cautions'] {
  const judged = assessed?.original.some(({ sourceTag }) => sourceTag === 'judgement') ?? false
  return [
    {
      bold: 'A decision aid.',
      text: 'It takes the place of no veterinarian, no acceptance rule of a carrier and no law of the countries crossed.',
    },
    ...(judged
      ? [
          {
            bold: '',
            text: 'Limits and findings marked judgement wait for the vet’s word: no measurement stands behind them.',
          },
        ]
      : []),
    {
      bold: '',
      text: 'Check the code: a changed plan or a worse forecast may have replaced this paper. A condition not kept: ring the desk.',
    },
  ]
}

function namingOf({ plan }: SheetFacts, journey: JourneyLeg[]): Naming {
  const crateOf = new Map(plan.crates.flatMap((crate) => crate.occupants.map((id) => [id, crate] as const)))
  const names = new Map(plan.animals.map(({ id, name }) => [id, name]))
  const shared = new Set(plan.crates.filter(({ occupants }) => occupants.length > 1).map(({ id }) => id))
  const ordinals = new Map(journey.map(({ leg, ordinal }) => [leg.id, ordinal]))
  return {
    // Two animals in one crate share its letter, so the name stands with it.
    letterOf: (animalId) => {
      const crate = crateOf.get(animalId)
      return crate === undefined
        ? (names.get(animalId) ?? '')
        : shared.has(crate.id)
          ? `${crate.letter} ${names.get(animalId) ?? ''}`
          : crate.letter
    },
    crateLetterOf: (crateId) => plan.crates.find(({ id }) => id === crateId)?.letter ?? '',
    ordinalOf: (legId) => ordinals.get(legId),
  }
}

/** Conditions for the whole journey, and those of these legs. */
function countOn(conditions: ConditionView[], journey: JourneyLeg[], legIds: readonly string[]): number {
  const ordinals = new Set(journey.filter(({ leg }) => legIds.includes(leg.id)).map(({ ordinal }) => ordinal))
  return conditions.filter(({ legs }) => legs.length === 0 || legs.some((ordinal) => ordinals.has(ordinal)))
    .length
}

/** "Hallmyre Kennels, Peebles": the party, and its place where the name doesn't say it. */
function placed(party: string, place: string | undefined): string {
  const at = place ?? ''
  if (at.includes(party)) return at
  return [party, party.includes(at) ? '' : at].filter(Boolean).join(', ')
}

function flightOf(journey: JourneyLeg[]): string {
  const air = journey.filter(({ leg }) => leg.kind === 'flight' && leg.flightPhase === 'airborne')
  return air.map(({ leg }) => [leg.carrier, leg.serviceNumber].filter(Boolean).join(' ')).join(', ')
}

function revisionWords({ consignment: { revision, replacesRevision, state } }: SheetFacts): string {
  const replaces = replacesRevision === null ? '' : ` Replaces revision ${replacesRevision}.`
  return `Revision ${revision}, ${STATE_WORDS[state].toLowerCase()}.${replaces}`
}

/** Stands on the edge of a paper that nothing was released on. */
function edgeWords({ consignment: { state } }: SheetFacts): string {
  switch (state) {
    case 'released':
    case 'under_way':
    case 'delivered':
      return 'For the desk. The manifest travels with the crates.'
    case 'in_review':
      return 'For the vet. Not for the road: nothing is released.'
    case 'approved':
      return 'Approved. Not for the road: nothing is released.'
    default:
      return 'For the desk. Not for the road: nothing is released.'
  }
}
