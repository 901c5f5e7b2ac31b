import type { LegKind } from '@/lib/thermal/scenario'
import type { ConsignmentPage, ConsignmentRow } from './consignment-row'

/** The legs of one consignment on the clock, for the strip of the board. */
export interface BoardStrip {
  consignmentId: number
  legs: { kind: LegKind; startMs: number; endMs: number }[]
}

/** One answer of the board: its rows, their strips, and when it was read. */
export interface BoardView extends ConsignmentPage {
  strips: BoardStrip[]
  readMs: number
}

/** A consignment that waits for a decision of the desk. */
export interface AttentionLine {
  row: ConsignmentRow
  kind: 'no-go' | 'out-of-date' | 'returned'
}
