import 'server-only'
import type { Actor } from '@/lib/policies/actor'
import { boardQuerySchema } from '@/lib/schemas/board'
import type { BoardQuery } from '@/lib/schemas/board'
import type { AttentionLine } from '@/lib/views/board'
import { listConsignments } from './list'

const SOON_MS = 48 * 3_600_000
const MOST = 5

/**
 * What waits for a decision of the desk, soonest first: what the vet sent back, NO-GO that leaves within two days, and
 * assessments that no longer speak of their plan. Each consignment once, by the first that applies.
 */
export async function attentionLines(actor: Actor, now: Date): Promise<AttentionLine[]> {
  const ask = async (kind: AttentionLine['kind'], query: Partial<BoardQuery>) => {
    const { rows } = await listConsignments(actor, boardQuerySchema.parse({ ...query, limit: MOST }))
    return rows.map((row) => ({ row, kind }))
  }
  const lines = [
    ...(await ask('returned', { state: ['returned'] })),
    ...(await ask('no-go', { verdict: ['no-go'] })).filter(({ row }) =>
      leavesSoon(row.leaves?.ms ?? null, now),
    ),
    ...(await ask('out-of-date', { verdict: ['out-of-date'] })),
  ]
  const seen = new Set<number>()
  return lines
    .filter(({ row }) => !seen.has(row.id) && seen.add(row.id))
    .sort((a, b) => (a.row.leaves?.ms ?? Infinity) - (b.row.leaves?.ms ?? Infinity))
    .slice(0, MOST)
}

function leavesSoon(leavesMs: number | null, now: Date): boolean {
  return leavesMs !== null && leavesMs >= now.getTime() && leavesMs - now.getTime() <= SOON_MS
}
