import { z } from 'zod'
import { CONSIGNMENT_STATES } from '@/lib/states/consignment'

export const BOARD_SORTS = ['departure', 'updated', 'margin', 'mark'] as const
export const HOLDERS = ['dispatcher', 'vet', 'driver', 'shipper', 'nobody'] as const
export type Holder = (typeof HOLDERS)[number]
export const BOARD_VERDICTS = ['go', 'conditional', 'no-go', 'out-of-date', 'none'] as const

/** How the board is asked for: from the address bar or from the paged handler. Unknown words fall back, never fail. */
export const boardQuerySchema = z.object({
  find: z.string().trim().max(80).catch('').default(''),
  state: z.array(z.enum(CONSIGNMENT_STATES)).catch([]).default([]),
  verdict: z.array(z.enum(BOARD_VERDICTS)).catch([]).default([]),
  holder: z.enum(HOLDERS).nullable().catch(null).default(null),
  /** Only what leaves on this day or later, a day in UTC. */
  leavesFrom: z.iso.date().nullable().catch(null).default(null),
  /** Closed consignments are left out unless asked for. */
  closed: z.boolean().catch(false).default(false),
  sort: z.enum(BOARD_SORTS).catch('departure').default('departure'),
  descending: z.boolean().catch(false).default(false),
  limit: z.number().int().min(1).max(200).catch(50).default(50),
  /** Where the page before ended; opaque. */
  after: z.string().max(400).nullable().catch(null).default(null),
})
export type BoardQuery = z.infer<typeof boardQuerySchema>

/** The query in an address: repeated `state` and `verdict`, everything else once. */
export function boardQueryOf(search: URLSearchParams): BoardQuery {
  const number = (name: string) => (search.has(name) ? Number(search.get(name)) : undefined)
  return boardQuerySchema.parse({
    find: search.get('find') ?? undefined,
    state: search.getAll('state'),
    verdict: search.getAll('verdict'),
    holder: search.get('holder'),
    leavesFrom: search.get('leavesFrom'),
    closed: search.get('closed') === '1',
    sort: search.get('sort') ?? undefined,
    descending: search.get('descending') === '1',
    limit: number('limit'),
    after: search.get('after'),
  })
}
