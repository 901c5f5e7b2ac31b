import type { Plan, PlanCrate } from '@/lib/schemas/plan'
import { dayDate, dayDateYear, figure, localTime, localTimeWithOffset } from '../format'
import type { CallView, ManifestCrate, ManifestLeg, ManifestView, PartyView, SealView } from '../manifest'
import type { LegCell, LegView, Moment, SheetView, StopLimitView } from '../sheet'
import { buildSheetView } from '../sheet-view/build-sheet-view'
import type { SheetFacts } from '../sheet-view/facts'
import { capital } from '../sheet-view/words'
import { handlingOf } from './handling'

/** What a manifest needs besides the sheet's facts. */
export interface ManifestFacts extends SheetFacts {
  documentCode: string
  verifyUrl: string
  /** Who released it, and as what: "I. Quennell, dispatcher". */
  releasedBy: string
  releasedAtMs: number
  shipperEmail: string
  /** Name and telephone of the vet to ring; null where nobody is named. */
  vetOnCall: { name: string; telephone: string } | null
  crateModels: readonly { id: number; name: string }[]
  seal: { subject: string; serial: string; validToMs: number; selfIssued: boolean }
}

/** The manifest of a revision, from plain facts. Pure, and built on the very sheet it was released on. */
export function buildManifestView(facts: ManifestFacts): ManifestView {
  const sheet = buildSheetView(facts)
  const { plan, firm, consignment } = facts
  const moment = (ms: number): Moment => ({ ms, zone: firm.zone })
  return {
    consignmentId: sheet.consignmentId,
    mark: sheet.mark,
    revision: sheet.revision,
    replacesRevision: sheet.replacesRevision,
    revisionWords: `Revision ${sheet.revision}, in force.${sheet.replacesRevision === null ? '' : ` Replaces revision ${sheet.replacesRevision}.`}`,
    edgeWords: 'Original. Travels with the crates.',
    documentCode: facts.documentCode,
    verifyUrl: facts.verifyUrl,
    made: sheet.made,
    firm,
    consignor: party(plan.consignor),
    consignee: party(plan.consignee),
    shipper: {
      name: facts.shipper.name,
      lines: [
        facts.shipper.accountNo === '' ? '' : `account ${facts.shipper.accountNo}`,
        facts.shipperEmail,
      ].filter(Boolean),
    },
    emergencyContact: {
      name: plan.emergencyContact.name,
      lines: [plan.emergencyContact.telephone].filter(Boolean),
    },
    leaves: sheet.leaves,
    arrives: sheet.arrives,
    animalCount: sheet.animalCount,
    crateCount: sheet.crateCount,
    journeyMin: sheet.journeyMin,
    stamp: sheet.stamp,
    headline: sheet.headline,
    headlineMore: sheet.headlineMore,
    overrides: sheet.overrides,
    animals: sheet.animals,
    crates: crates(facts, sheet),
    legs: sheet.legs.map((leg) => manifestLeg(leg, sheet)),
    approvals: sheet.approvals,
    conditions: sheet.conditions,
    handling: handlingOf(plan),
    calls: calls(facts),
    handovers: handovers(plan, sheet.legs),
    releasedWords: `${consignment.revision} of ${consignment.revision}, released by ${facts.releasedBy}, ${dayDateYear(facts.releasedAtMs, firm.zone)}, ${localTime(facts.releasedAtMs, firm.zone)}`,
    planHash: sheet.planHash,
    inputHash: sheet.inputHash,
    assessedWords: assessedWords(sheet),
    seal: {
      subject: facts.seal.subject,
      serial: facts.seal.serial,
      validTo: moment(facts.seal.validToMs),
      selfIssued: facts.seal.selfIssued,
    } satisfies SealView,
  }
}

function assessedWords({ assessed, weatherWords, versionWords }: SheetView): string {
  const at =
    assessed === null
      ? 'not assessed'
      : `${dayDate(assessed.ms, assessed.zone)}, ${localTimeWithOffset(assessed.ms, assessed.zone)}`
  return [at, `weather ${weatherWords}`, versionWords].filter(Boolean).join('; ')
}

function party({ name, address, telephone, email }: Plan['consignor']): PartyView {
  return { name, lines: [address.replace(/\s*\n\s*/g, ', '), telephone, email].filter(Boolean) }
}

function crates({ plan, crateModels }: ManifestFacts, sheet: SheetView): ManifestCrate[] {
  return [...plan.crates]
    .sort((a, b) => (a.letter < b.letter ? -1 : 1))
    .map((crate) => {
      const stops = sheet.stopLimits.find(({ crateId }) => crateId === crate.id)
      const inside = sheet.animals.filter(({ crateId }) => crateId === crate.id)
      const model = crateModels.find(({ id }) => id === crate.crateModelId)
      return {
        crateId: crate.id,
        crateMark: `${sheet.mark}-${crate.letter}`,
        modelWords: model?.name ?? `${capital(crate.form)}, ${crate.wallMaterial.replace('-', ' ')}`,
        insideWords: dimensions(crate),
        animalsMassKg: inside.some(({ massKg }) => massKg === null)
          ? null
          : inside.reduce((sum, { massKg, count }) => sum + (massKg ?? 0) * count, 0),
        openPct: openShare(crate),
        beddingWords:
          crate.bedding.material === 'none'
            ? 'no bedding'
            : `${crate.bedding.material.replace('-', ' ')} ${figure(crate.bedding.depthMm)} mm`,
        stop: stops?.strictest ?? { aboveC: null, belowC: null, aboveF: null, belowF: null },
        otherLegs: otherLegs(stops),
        bodyLimits: inside[0]?.bodyLimits ?? null,
      }
    })
}

function dimensions({ lengthCm, widthCm, heightCm }: PlanCrate): string {
  const sides = [lengthCm, widthCm, heightCm]
  return sides.some((side) => side === null)
    ? 'size not given'
    : `${sides.map((side) => figure(side ?? 0)).join(' × ')} cm`
}

/** Open share of the four sides as they stand, blocked part and mesh taken off, %. */
function openShare({ lengthCm, widthCm, heightCm, openings }: PlanCrate): number | null {
  if (lengthCm === null || widthCm === null || heightCm === null) return null
  const sidesCm2 = 2 * (lengthCm + widthCm) * heightCm
  const openCm2 = openings
    .filter(({ face }) => face !== 'top')
    .reduce(
      (sum, one) =>
        sum + one.widthCm * one.heightCm * one.howMany * (one.meshOpenPct / 100) * (1 - one.blockedPct / 100),
      0,
    )
  return (100 * openCm2) / sidesCm2
}

function otherLegs(stops: StopLimitView | undefined): ManifestCrate['otherLegs'] {
  const others = stops?.byLeg.filter(({ plannedInside }) => !plannedInside) ?? []
  // Where no leg is planned inside its limit, the strictest of all stands already.
  return others.length === stops?.byLeg.length
    ? []
    : others.map(({ ordinal, aboveC, belowC, aboveF, belowF }) => ({
        ordinal,
        aboveC,
        belowC,
        aboveF,
        belowF,
      }))
}

function manifestLeg({ cells, ...leg }: LegView, { animals }: SheetView): ManifestLeg {
  const narrowest = [...cells].filter(({ verdict }) => verdict !== null).sort(worstFirst)[0]
  const animal = animals.find(({ animalId }) => animalId === narrowest?.animalId)
  return {
    ...leg,
    verdict: narrowest?.verdict ?? null,
    margin: narrowest?.margin ?? {
      minutes: null,
      outsideAirC: null,
      bodyC: null,
      limitKind: null,
      side: null,
    },
    limitWords: narrowest?.limitWords ?? '',
    decidedWords: narrowest?.decidedWords ?? '',
    crateLetter: animal?.crateLetter ?? '',
  }
}

const RANK = { 'no-go': 0, conditional: 1, go: 2 } as const

function worstFirst(a: LegCell, b: LegCell): number {
  const rank = ({ verdict }: LegCell) => (verdict === null ? 3 : RANK[verdict])
  const room = ({ margin }: LegCell) => (margin.outsideAirC ?? 99) * 1000 + (margin.minutes ?? 999)
  return rank(a) - rank(b) || room(a) - room(b)
}

function calls({ firm, plan, vetOnCall }: ManifestFacts): CallView[] {
  const people = [
    {
      who: `Desk, ${firm.name}`,
      purpose: 'anything late, hot, cold or wrong',
      telephone: firm.deskTelephone,
    },
    ...(vetOnCall === null
      ? []
      : [
          {
            who: `Vet on call, ${vetOnCall.name}`,
            purpose: 'an animal in trouble',
            telephone: vetOnCall.telephone,
          },
        ]),
    {
      who: `Emergency contact, ${plan.emergencyContact.name}`,
      purpose: 'the owner’s word',
      telephone: plan.emergencyContact.telephone,
    },
  ]
  return people.map((person, index) => ({
    number: index + 1,
    ...person,
    ifNoAnswer: index === people.length - 1 ? 'ring 1 again' : `5 min, ring ${index + 2}`,
  }))
}

/** Where the crates pass from one party to another, and where the journey ends. */
function handovers(plan: Plan, legs: LegView[]): string[] {
  const changes = legs.filter(
    (leg, index) => index > 0 && leg.partyInCharge !== legs[index - 1]?.partyInCharge,
  )
  const end = legs.at(-1)?.toPlace
  return [
    ...changes.map(({ ordinal, title }) => `${title}, leg ${ordinal}`),
    ...(end === undefined || end === '' ? [] : [`${end}, to the consignee`]),
  ]
}
