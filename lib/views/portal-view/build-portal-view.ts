import { crateMark } from '@/lib/planning/crate-mark'
import type { LegKind } from '@/lib/thermal/scenario'
import type {
  PortalAcknowledgement,
  PortalApproval,
  PortalCondition,
  PortalDocument,
  PortalLeg,
  PortalView,
} from '../portal'
import type { ConditionView, LegView, SheetView } from '../sheet'
import { buildSheetView } from '../sheet-view/build-sheet-view'
import type { SheetFacts } from '../sheet-view/facts'
import { capital, legsInWords } from '../sheet-view/words'

export interface PortalFacts {
  /** Of the revision in force. */
  sheet: SheetFacts
  documents: readonly PortalDocument[]
  acknowledgement: PortalAcknowledgement | null
  requests: PortalView['requests']
}

/** What a shipper reads of a released consignment. Other parties keep their names and telephones to themselves. */
export function buildPortalView(facts: PortalFacts): PortalView {
  const sheet = buildSheetView(facts.sheet)
  return {
    consignmentId: sheet.consignmentId,
    mark: sheet.mark,
    revision: sheet.revision,
    state: sheet.state,
    from: sheet.legs[0]?.fromPlace ?? '',
    to: sheet.legs.at(-1)?.toPlace ?? '',
    leaves: sheet.leaves,
    arrives: sheet.arrives,
    journeyMin: sheet.journeyMin,
    stamp: sheet.stamp,
    headline: sheet.headline,
    headlineMore: sheet.headlineMore,
    legs: sheet.legs.map((leg) => portalLeg(leg, sheet)),
    animals: sheet.animals.map(({ animalId, crateLetter, name, describes, identification }) => ({
      animalId,
      crateLetter,
      name,
      describes,
      identification,
    })),
    conditions: sheet.conditions.map((condition) => portalCondition(condition, sheet, facts.sheet)),
    approvals: portalApprovals(facts.sheet),
    overrides: sheet.overrides,
    documents: [...facts.documents],
    acknowledgement: facts.acknowledgement,
    requests: facts.requests,
  }
}

const LEG_WORDS: Record<LegKind, string> = {
  road: 'Road',
  shed: 'Shed',
  ramp: 'Ramp',
  flight: 'Aircraft',
  sea: 'Sea',
  rail: 'Rail',
  border: 'Border',
  rest: 'Rest',
}

function portalLeg(leg: LegView, sheet: SheetView): PortalLeg {
  const startMin = Math.round((leg.start.ms - sheet.leaves.ms) / 60_000)
  return {
    legId: leg.legId,
    ordinal: leg.ordinal,
    words: leg.flightPhase === 'airborne' ? 'In the air' : LEG_WORDS[leg.kind],
    pattern: leg.pattern,
    startMin,
    endMin: startMin + leg.durationMin,
  }
}

function portalCondition(condition: ConditionView, sheet: SheetView, facts: SheetFacts): PortalCondition {
  const leg = sheet.legs.find(({ ordinal }) => ordinal === condition.legs[0])
  const answeredAtMs = facts.conditions.find(({ id }) => id === condition.conditionId)?.answeredAtMs ?? null
  return {
    number: condition.number,
    text: condition.text,
    whereWords: condition.legs.length === 0 ? 'Whole journey' : capital(legsInWords(condition.legs)),
    from: leg?.start ?? sheet.leaves,
    answer: condition.answer,
    party:
      condition.answer === 'ours' ? 'our people' : leg?.kind === 'flight' ? 'the carrier' : 'the handler',
    answeredAt: answeredAtMs === null ? null : { ms: answeredAtMs, zone: facts.firm.zone },
  }
}

function portalApprovals({ approvals, plan, consignment, firm }: SheetFacts): PortalApproval[] {
  return approvals
    .filter(({ inForce, decision }) => inForce && decision !== 'returned')
    .map((approval) => {
      const letter = plan.crates.find(({ id }) => id === approval.crateId)?.letter ?? '?'
      return {
        vetName: approval.signerName,
        registration: approval.registrationNumber,
        registrationCountry: approval.registrationCountry,
        signedAt: { ms: approval.signedAtMs, zone: firm.zone },
        examined: approval.examined,
        crateMarks: [crateMark(consignment.mark, letter)],
        statement: approval.statement,
      }
    })
}
