import 'server-only'
import type { Actor } from '@/lib/policies/actor'
import type { BoardStrip } from '@/lib/views/board'
import { models } from '@/models'
import { authorize } from '../authorize'
import { visibleConsignments } from './visible'

/** The legs of the consignments on a page of the board, on the clock: only legs whose two times are known. */
export async function boardStrips(actor: Actor, ids: readonly number[]): Promise<BoardStrip[]> {
  authorize(actor, 'consignment.list')
  if (ids.length === 0) return []
  const visible = await models.Consignment.findAll({
    where: { id: [...ids], ...visibleConsignments(actor) },
    attributes: ['id'],
  })
  const legs = await models.Leg.findAll({
    where: { consignmentId: visible.map(({ id }) => id) },
    attributes: ['consignmentId', 'kind', 'startsAt', 'endsAt'],
    order: ['consignmentId', 'position'],
  })
  return visible.map(({ id }) => ({
    consignmentId: id,
    legs: legs.flatMap(({ consignmentId, kind, startsAt, endsAt }) =>
      consignmentId === id && startsAt !== null && endsAt !== null
        ? [{ kind, startMs: startsAt.getTime(), endMs: endsAt.getTime() }]
        : [],
    ),
  }))
}
