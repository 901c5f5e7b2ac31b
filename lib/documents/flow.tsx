import type { ReactNode } from 'react'
import type { LedgerRow } from './parts/ledger'

/*
 * Sheets are planned before they are drawn: a page that breaks by itself is laid out again for each break, and could not
 * know "sheet n of m". Every block says its height; tables are cut between rows, and their heads repeat.
 */

export interface FixedBlock {
  height: number
  element: ReactNode
  /** Begins a new sheet whatever room is left. */
  newSheet?: boolean
}

export interface TableBlock {
  /** Height of everything but the rows: heading, table head, rules, and the remark under it. */
  around: number
  rows: LedgerRow[]
  /** Draws some of the rows; `continued` on every part but the first. */
  draw: (rows: LedgerRow[], continued: boolean) => ReactNode
  newSheet?: boolean
}

export type Block = FixedBlock | TableBlock

/** A table is not begun for fewer rows than this, unless it has no more. */
const LEAST_ROWS = 2

/** Blocks put on sheets in their order; `room` is what a sheet holds in pixels, by its number. */
export function flow(blocks: Block[], room: (sheet: number) => number): ReactNode[][] {
  const sheets: ReactNode[][] = [[]]
  let left = room(1)
  const turn = () => {
    sheets.push([])
    left = room(sheets.length)
  }
  const put = (element: ReactNode, height: number) => {
    sheets.at(-1)?.push(element)
    left -= height
  }
  for (const block of blocks) {
    const started = (sheets.at(-1)?.length ?? 0) > 0
    if (block.newSheet === true && started) turn()
    if ('rows' in block) {
      putTable(block, () => left, turn, put)
      continue
    }
    if (block.height > left && (sheets.at(-1)?.length ?? 0) > 0) turn()
    put(block.element, block.height)
  }
  return sheets
}

function putTable(
  block: TableBlock,
  left: () => number,
  turn: () => void,
  put: (element: ReactNode, height: number) => void,
) {
  let rest = block.rows
  let continued = false
  do {
    let taken = fitting(rest, left() - block.around)
    if (taken < Math.min(LEAST_ROWS, rest.length)) {
      turn()
      // A row taller than a whole sheet is still drawn once, rather than never.
      taken = Math.max(1, fitting(rest, left() - block.around))
    }
    const rows = rest.slice(0, taken)
    put(block.draw(rows, continued), block.around + rows.reduce((sum, { height }) => sum + height, 0))
    rest = rest.slice(taken)
    continued = true
  } while (rest.length > 0)
}

function fitting(rows: LedgerRow[], room: number): number {
  let used = 0
  let count = 0
  for (const { height } of rows) {
    used += height
    if (used > room) break
    count += 1
  }
  return count
}
