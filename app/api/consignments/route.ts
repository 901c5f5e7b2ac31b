import { jsonRoute } from '@/lib/route'
import { boardQueryOf } from '@/lib/schemas/board'
import { readBoard } from '@/app/(desk)/consignments/read-board'

/** The board's rows for a query in the address; the page asks it in place. */
export const GET = jsonRoute('/api/consignments', ({ actor, request, now }) =>
  readBoard(actor, boardQueryOf(request.nextUrl.searchParams), now),
)
