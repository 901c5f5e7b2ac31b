import 'server-only'
import { boardStrips } from '@/lib/domain/consignments/board-strips'
import { listConsignments } from '@/lib/domain/consignments/list'
import type { Actor } from '@/lib/policies/actor'
import type { BoardQuery } from '@/lib/schemas/board'
import type { BoardView } from '@/lib/views/board'

/** One answer of the board, the same for the page's first rows and for the handler. */
export async function readBoard(actor: Actor, query: BoardQuery, now: Date): Promise<BoardView> {
  const page = await listConsignments(actor, query)
  const strips = await boardStrips(
    actor,
    page.rows.map(({ id }) => id),
  )
  return { ...page, strips, readMs: now.getTime() }
}
