import type { ConsignmentState } from '@/lib/states/consignment'
import type { CallView } from './manifest'
import type { AirStop, Moment, OverrideView, Stamp, SurroundingsPattern } from './sheet'

/*
 * A driver's checklist: the legs on which this driver stands beside the crates, on the revision in force. The phone, the
 * printed form and the queue of entries take this one view.
 */

export interface RunRow {
  consignmentId: number
  mark: string
  revision: number
  from: string
  to: string
  animals: string
  state: ConsignmentState
  stamp: Stamp
  /** Own legs, "1 Road, Peebles to Edinburgh". */
  legs: { ordinal: number; title: string; start: Moment; closed: boolean }[]
  leaves: Moment
}

export interface ChecklistView {
  consignmentId: number
  mark: string
  revision: number
  driverName: string
  state: ConsignmentState
  stamp: Stamp
  headline: string
  overrides: OverrideView[]
  crates: { crateId: string; letter: string; animals: string; animalCount: number }[]
  legs: ChecklistLeg[]
  calls: CallView[]
  /** Entries the server has, in order of time. */
  entries: EntryView[]
  desk: { name: string; telephone: string }
  made: Moment
  documentCode: string | null
  /** What a driver may say of the whole journey now. */
  mayDepart: boolean
  mayDeliver: boolean
  mayStop: boolean
}

export interface ChecklistLeg {
  legId: string
  ordinal: number
  title: string
  pattern: SurroundingsPattern
  fromPlace: string
  toPlace: string
  start: Moment
  end: Moment
  /** The leg's end told where the journey ends; null where the clocks agree. */
  endElsewhere: Moment | null
  delayWorstMin: number
  /** "At the ramp door by": what has to happen at `end`. */
  deadlineWords: string
  /** To whom the crates go at its end; empty where the next leg is the driver's own. */
  handOverTo: string
  stops: ChecklistStop[]
  endurance: ChecklistEndurance[]
  signs: { crateLetter: string; text: string }[]
  cautions: string[]
  conditionWords: string
  /** What the plan says of turning back, of where the animals go if the leg cannot go on, and besides. */
  notes: { head: string; text: string }[]
  items: ChecklistItem[]
}

export interface ChecklistStop extends AirStop {
  crateId: string
  crateLetter: string
  animals: string
}

export interface ChecklistEndurance {
  crateLetter: string
  name: string
  /** "if the climate control fails". */
  kindWords: string
  toAlarmMin: number | null
  toCriticalMin: number | null
}

export type ItemKind = 'tick' | 'reading' | 'water' | 'condition' | 'handover'

export interface ChecklistItem {
  key: string
  number: number
  kind: ItemKind
  text: string
}

/** What a driver wrote down. `value` is what the kind needs: see components/road/entry-words.ts. */
export interface EntryView {
  clientId: string
  legId: string | null
  itemKey: string
  kind: EntryKind
  atMs: number
  place: string
  value: Record<string, unknown>
  alive: number | null
  dead: number | null
  short: number | null
}

export type EntryKind =
  'tick' | 'not_done' | 'reading' | 'water' | 'condition' | 'handover' | 'note' | 'close_leg'
