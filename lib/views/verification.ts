import type { Moment } from './sheet'

/*
 * What the public verification page may say of a paper: its kind, its revision, when it was made and how its plan hash
 * begins. No animal, no party, no route.
 */

export type PaperState = 'current' | 'superseded' | 'void' | 'not-as-issued' | 'unknown'
export type PaperKind = 'go_no_go' | 'manifest'

export interface VerificationView {
  state: PaperState
  /** As printed, "R4XT-96KW"; null where a file carried none. */
  code: string | null
  /** What was looked at: the code alone, or every byte of a file. */
  by: 'code' | 'file'
  checked: Moment
  paper: VerifiedPaper | null
}

export interface VerifiedPaper {
  kind: PaperKind
  sheets: number
  revision: number
  /** The highest revision issued of this kind of paper for the same consignment. */
  latestRevision: number
  made: Moment
  /** When it was superseded or taken back. */
  stateChanged: Moment | null
  /** First 16 characters. */
  planHashStart: string
}

export const PAPER_KIND_WORDS: Record<PaperKind, string> = {
  go_no_go: 'Go/no-go sheet',
  manifest: 'Manifest',
}
