import 'server-only'
import { Op, literal } from 'sequelize'
import type { Transaction, WhereOptions } from 'sequelize'
import { SteadfoldError } from '@/lib/errors'
import type { Actor } from '@/lib/policies/actor'
import { can } from '@/lib/policies/can'
import type { ConsignmentFacts } from '@/lib/policies/consignment'
import { models } from '@/models'
import type { Consignment } from '@/models'
import { database } from '@/lib/db/connection'

/**
 * Narrows a query to the consignments an actor may see. The policy table is asked again of each record that is opened;
 * this keeps lists from ever loading another's.
 */
export function visibleConsignments(actor: Actor): WhereOptions<Consignment> {
  switch (actor.role) {
    case 'dispatcher':
    case 'vet':
    case 'admin':
      return {}
    case 'shipper':
      return { shipperId: actor.shipperId ?? NOBODY }
    case 'driver':
      return { [Op.and]: [literal(namedInForce(actor.id))] }
  }
}

const NOBODY = 0

/** The plan in force is a snapshot: the rows beside it may already be the next revision's. */
function namedInForce(driverId: number): string {
  return `EXISTS (SELECT 1 FROM snapshots AS in_force WHERE in_force.hash = in_force_snapshot_hash
    AND JSON_CONTAINS(JSON_EXTRACT(in_force.body, '$.plan.legs[*].driverId'), ${database().escape(String(driverId))}))`
}

/** A consignment with what the policies must know of it. */
export interface Found {
  row: Consignment
  facts: ConsignmentFacts
}

/** The consignment, or `not_found` where there is none or the actor may not see it: the two must look alike. */
export async function findConsignment(
  actor: Actor,
  id: number,
  options: { tx?: Transaction; lock?: boolean } = {},
): Promise<Found> {
  const { tx, lock = false } = options
  const row = await models.Consignment.findByPk(id, {
    transaction: tx ?? null,
    ...(lock && tx ? { lock: tx.LOCK.UPDATE } : {}),
  })
  if (row === null) throw notFound()
  const facts = await factsOf(row, tx)
  if (!can(actor, 'consignment.read', facts)) throw notFound()
  return { row, facts }
}

/** What the policies must know of a consignment. */
export async function factsOf(row: Consignment, tx?: Transaction): Promise<ConsignmentFacts> {
  return { shipperId: row.shipperId, driverIds: await driversInForce(row, tx) }
}

async function driversInForce(row: Consignment, tx?: Transaction): Promise<number[]> {
  if (row.inForceSnapshotHash === null) return []
  const kept = await models.Snapshot.findByPk(row.inForceSnapshotHash, {
    attributes: [[literal("JSON_EXTRACT(body, '$.plan.legs[*].driverId')"), 'driverIds']],
    transaction: tx ?? null,
  })
  // The driver hands JSON over parsed; null drivers stand among the numbers.
  const ids: unknown = kept?.get('driverIds')
  return Array.isArray(ids) ? ids.filter((id): id is number => typeof id === 'number') : []
}

function notFound() {
  return new SteadfoldError('not_found', 'There is no such consignment.')
}
