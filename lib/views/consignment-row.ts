import type { Verdict } from '@/lib/rules/result'
import type { Holder } from '@/lib/schemas/board'
import type { ConsignmentState } from '@/lib/states/consignment'
import type { Moment } from './sheet'

/** One line of the board. Figures are raw; an absent one is null, never 0. */
export interface ConsignmentRow {
  id: number
  mark: string
  state: ConsignmentState
  revision: number
  /** The revision that travels, and its state; null while none is released. */
  inForceRevision: number | null
  inForceState: 'released' | 'under_way' | 'delivered' | 'stopped' | null
  from: string | null
  to: string | null
  animals: string
  shipper: string
  leaves: Moment | null
  arrives: Moment | null
  /** null: not assessed. */
  verdict: Verdict | null
  outOfDate: boolean
  /** "alarm limit, Bramble (A), leg 7"; empty where nothing decides. */
  deciding: string
  marginMin: number | null
  marginOutsideAirC: number | null
  marginBodyC: number | null
  holder: Holder
  /** Crate set-ups signed for this very plan, of how many. */
  signed: number
  crates: number
  updated: Moment
}

export interface ConsignmentPage {
  rows: ConsignmentRow[]
  /** Give it as `after` for the next rows; null at the end. */
  after: string | null
  /** Of all the actor may see, whatever the filters: how many are in each state. */
  counts: Partial<Record<ConsignmentState, number>>
}
