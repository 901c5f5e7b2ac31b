import type { PlanCrate } from '@/lib/schemas/plan'
import type { AnimalView, Moment, OverrideView, SheetView, Stamp } from './sheet'

/* What a vet sees: the queue in order of leaving, and one crate set-up at a time with everything that is signed on it. */

export interface ReviewQueueRow {
  consignmentId: number
  crateId: string
  crateMark: string
  crateLetter: string
  /** "Otto, pug. Peebles to Ravenna" */
  words: string
  leaves: Moment
  /** What was found about it; null once it is signed. */
  stamp: Stamp | null
  decision: 'waiting' | 'approved' | 'returned'
  /** When it was signed; null while it waits. */
  signed: Moment | null
}

export interface ReviewView {
  sheet: SheetView
  crates: ReviewCrate[]
  chosen: ReviewCrate
  /** By a finding's index: what it is about. A signature overrides only what concerns the crates it covers. */
  subjects: FindingSubject[]
  signer: SignerView
  /** Decisions in force on this plan, newest first. */
  signed: SignedApproval[]
  /** Approvals a later change ended, newest first. */
  voided: SignedApproval[]
  /** Why no decision can be taken now; empty where it can. */
  closedWords: string
}

/** The crate or the animal a finding speaks of; both null: all. */
export interface FindingSubject {
  crateId: string | null
  animalId: string | null
  /** The finding in full, as the statement names it where it is overridden. */
  words: string
}

export interface ReviewCrate {
  crateId: string
  letter: string
  mark: string
  /** As typed: the drawing and its figures are made from it. */
  plan: PlanCrate
  animals: AnimalView[]
  stamp: Stamp
  decision: ReviewQueueRow['decision']
  /** Signs offered for the species in it. */
  earlySigns: string[]
}

/** Who would sign, from the record an admin checked. */
export interface SignerView {
  name: string
  registration: string
  country: string
  /** Day, "2027-03-31". */
  expiresOn: string
  /** "checked by A. Penhallow, 14 Jan 2026" */
  checkedWords: string
  /** Why this person can't sign; empty where they can. */
  cannot: string
}

export interface SignedApproval {
  approvalId: number
  revision: number
  crateMarks: string[]
  decision: 'approved' | 'approved_with_conditions' | 'returned'
  /** "Approved with conditions 1, 3 and 4", what the signature means. */
  meaning: string
  statement: string
  reasons: string
  examined: boolean
  signerName: string
  registration: string
  country: string
  expiresOn: string
  signedAt: Moment
  voidedAt: Moment | null
  voidedReason: string
  withdrawn: boolean
  overrides: OverrideView[]
  /** What the driver is told to ring for. */
  earlySigns: string[]
  /** True while the signer, or another vet, may take it back. */
  withdrawable: boolean
}
