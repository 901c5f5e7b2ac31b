import { BOARD_SORTS, HOLDERS } from '@/lib/schemas/board'
import type { BoardQuery, Holder } from '@/lib/schemas/board'
import { toLocalTime } from '@/lib/planning/local-time'
import type { ConsignmentRow } from '@/lib/views/consignment-row'

export const HOLDER_WORDS: Record<Holder, string> = {
  dispatcher: 'Desk to act',
  vet: 'Vet to act',
  driver: 'Driver to act',
  shipper: 'Shipper to act',
  nobody: 'Nobody waits',
}

export const HOLDER_OPTIONS = HOLDERS.map((value) => ({ value, words: HOLDER_WORDS[value] }))

export const VERDICT_FILTERS = [
  { value: 'go', words: 'GO' },
  { value: 'conditional', words: 'GO WITH CONDITIONS' },
  { value: 'no-go', words: 'NO-GO' },
  { value: 'out-of-date', words: 'Out of date' },
  { value: 'none', words: 'Not assessed' },
] as const satisfies readonly { value: BoardQuery['verdict'][number]; words: string }[]

const SORT_WORDS: Record<BoardQuery['sort'], string> = {
  departure: 'Time of leaving',
  updated: 'Last changed',
  margin: 'Narrowest margin',
  mark: 'Mark',
}

export const SORT_OPTIONS = BOARD_SORTS.map((value) => ({ value, words: SORT_WORDS[value] }))

export interface RowGroup {
  words: string
  rows: ConsignmentRow[]
}

/** Rows in the order they came, cut where the answer to "when does it leave" changes. */
export function groupsOf(rows: readonly ConsignmentRow[], nowMs: number, zone: string): RowGroup[] {
  const groups: RowGroup[] = []
  for (const row of rows) {
    const words = groupWords(row, nowMs, zone)
    const last = groups.at(-1)
    if (last?.words === words) last.rows.push(row)
    else groups.push({ words, rows: [row] })
  }
  return groups
}

function groupWords(row: ConsignmentRow, nowMs: number, zone: string): string {
  if (row.inForceState === 'under_way') return 'Moving now'
  if (row.state === 'delivered' || row.state === 'stopped' || row.state === 'cancelled') return 'Closed'
  if (row.leaves === null) return 'No time of leaving yet'
  const day = (ms: number) => toLocalTime(ms, zone).slice(0, 10)
  if (row.leaves.ms < nowMs) return 'Time of leaving is past'
  return day(row.leaves.ms) === day(nowMs) ? 'Leaves today' : 'Leaves later'
}
