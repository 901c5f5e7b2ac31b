import type {
  AirStop,
  AnimalView,
  ApprovalView,
  BodyLimits,
  ConditionView,
  LegView,
  Margin,
  Moment,
  OverrideView,
  SheetFirm,
  Stamp,
} from './sheet'

/*
 * The manifest as plain JSON, for its page, its PDF and its mail. Sheet 1 holds facts, sheet 2 holds acts. Built by
 * lib/views/manifest-view/build-manifest-view.ts.
 */

export interface PartyView {
  name: string
  /** Address, telephone, e-mail or account: what is known, one line each. */
  lines: string[]
}

export interface ManifestCrate {
  crateId: string
  crateMark: string
  /** "Crate, plywood 9 mm" or the model's name. */
  modelWords: string
  /** "92 × 61 × 68 cm" */
  insideWords: string
  /** Animals in it, kg; the empty crate is not weighed in the plan. */
  animalsMassKg: number | null
  /** Open share of the four sides, %. */
  openPct: number | null
  /** "pad 20 mm" */
  beddingWords: string
  stop: AirStop
  /** Legs whose own limit differs because their planned air lies outside the strictest one. */
  otherLegs: (AirStop & { ordinal: number })[]
  bodyLimits: BodyLimits | null
}

/** A leg with the animal that has least to spare on it. */
export interface ManifestLeg extends Omit<LegView, 'cells'> {
  verdict: LegView['cells'][number]['verdict']
  margin: Margin
  limitWords: string
  decidedWords: string
  /** Letter of the crate that has least to spare. */
  crateLetter: string
}

export interface CallView {
  number: number
  who: string
  purpose: string
  telephone: string
  ifNoAnswer: string
}

/** What the certificate that seals the file says of itself. */
export interface SealView {
  subject: string
  serial: string
  validTo: Moment
  selfIssued: boolean
}

export interface ManifestView {
  consignmentId: number
  mark: string
  revision: number
  replacesRevision: number | null
  /** "Revision 5, in force. Replaces revision 4." */
  revisionWords: string
  /** "Original. Travels with the crates." */
  edgeWords: string
  documentCode: string
  /** What the square holds: the public verification page with this code. */
  verifyUrl: string
  made: Moment
  firm: SheetFirm

  consignor: PartyView
  consignee: PartyView
  shipper: PartyView
  emergencyContact: PartyView
  leaves: Moment
  arrives: Moment
  animalCount: number
  crateCount: number
  journeyMin: number

  stamp: Stamp
  headline: string
  headlineMore: string[]
  overrides: OverrideView[]

  animals: AnimalView[]
  crates: ManifestCrate[]
  legs: ManifestLeg[]

  approvals: ApprovalView[]
  conditions: ConditionView[]
  handling: string[]
  calls: CallView[]
  /** Places where the crates change hands, in order. */
  handovers: string[]

  /** "5 of 5, released by I. Quennell, dispatcher, Thu 11 Jun 2026, 09:11 BST". */
  releasedWords: string
  planHash: string
  inputHash: string
  /** "Thu 11 Jun, 08:31 BST, weather typed, engine 1.4.0, rules 2026.05". */
  assessedWords: string
  seal: SealView
}
