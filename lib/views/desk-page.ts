import type { FieldIssue } from '@/lib/errors'
import type { Moment, SheetView } from './sheet'

/* What the desk's page of a consignment shows beside its sheet. */

/** A vet's decision on one crate set-up, with what became of it. */
export interface ApprovalLine {
  approvalId: number
  revision: number
  /** "2441-A" */
  crateMark: string
  decision: 'approved' | 'approved_with_conditions' | 'returned'
  signerName: string
  registration: string
  signedAt: Moment
  examined: boolean
  /** As signed, word for word; empty where it was returned. */
  statement: string
  reasons: string
  conditions: string[]
  /** Counts for the plan as it stands now. */
  stands: boolean
  /** What was voided or withdrawn, when and why; null while nothing was. */
  voided: { at: Moment; reason: string; withdrawn: boolean } | null
}

export interface DocumentLine {
  documentId: number
  kind: 'go_no_go' | 'manifest'
  revision: number
  code: string
  state: 'current' | 'superseded' | 'void'
  madeAt: Moment
  pageCount: number
  voidedReason: string
}

/** One line of the consignment's own trail. */
export interface HistoryLine {
  id: number
  at: Moment
  who: string
  verb: string
  note: string
  refused: boolean
}

/** What release waits for, all at once; none means it may go. */
export interface ReleaseReadiness {
  obstacles: FieldIssue[]
  /** When the oldest air of a leg was typed or last said to hold; null where none was. */
  oldestAir: Moment | null
}

export interface DeskPageView {
  sheet: SheetView
  approvals: ApprovalLine[]
  documents: DocumentLine[]
  history: HistoryLine[]
  /** Only while it is approved: release is the next act. */
  readiness: ReleaseReadiness | null
  /** Stretches of the journey in the dark, minutes from departure. */
  dark: { fromMin: number; toMin: number }[]
}
