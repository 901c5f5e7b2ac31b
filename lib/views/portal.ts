import type { ConsignmentState } from '@/lib/states/consignment'
import type { ConditionAnswer, Moment, OverrideView, Stamp, SurroundingsPattern } from './sheet'
import type { PaperKind } from './verification'

/*
 * What a shipper sees of one of its own consignments. Other parties appear as "the carrier" or "the handler": their names,
 * telephones and prices are nobody's business here, so these types have no place for them.
 */

export interface PortalRow {
  consignmentId: number
  mark: string
  from: string
  to: string
  animals: string
  leaves: Moment | null
  state: ConsignmentState
  /** "by 13:00 BST, revision 5"; empty where nothing is asked of the shipper. */
  asked: string
}

export interface PortalView {
  consignmentId: number
  mark: string
  /** The revision in force; null until one is released. */
  revision: number | null
  state: ConsignmentState
  from: string
  to: string
  leaves: Moment
  arrives: Moment
  journeyMin: number
  stamp: Stamp
  headline: string
  headlineMore: string[]
  legs: PortalLeg[]
  animals: PortalAnimal[]
  conditions: PortalCondition[]
  approvals: PortalApproval[]
  overrides: OverrideView[]
  documents: PortalDocument[]
  acknowledgement: PortalAcknowledgement | null
  /** What this shipper asked for earlier, newest first. */
  requests: { at: Moment; revision: number; subject: string; text: string }[]
}

export interface PortalLeg {
  legId: string
  ordinal: number
  /** "Road", "In the air": what fits into the strip. */
  words: string
  pattern: SurroundingsPattern
  startMin: number
  endMin: number
}

export interface PortalAnimal {
  animalId: string
  crateLetter: string
  name: string
  describes: string
  identification: string
}

export interface PortalCondition {
  number: number
  text: string
  /** "Leg 7", "Legs 4 to 6", "Whole journey". */
  whereWords: string
  /** From when it must be so: the start of its first leg, by the clock there. */
  from: Moment
  answer: ConditionAnswer
  /** "the carrier", "the handler", "our people". */
  party: string
  /** When it was confirmed or refused. */
  answeredAt: Moment | null
}

export interface PortalApproval {
  vetName: string
  registration: string
  registrationCountry: string
  signedAt: Moment
  examined: boolean
  crateMarks: string[]
  statement: string
}

export interface PortalDocument {
  documentId: number
  kind: PaperKind
  state: 'current' | 'superseded' | 'void'
  revision: number
  sheets: number
  code: string
  made: Moment
}

/** What is asked of the shipper about the manifest in force. */
export interface PortalAcknowledgement {
  documentId: number
  revision: number
  conditionCount: number
  /** Until when; the journey's start at the latest. */
  by: Moment
  done: { who: string; at: Moment } | null
}
