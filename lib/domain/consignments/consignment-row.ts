import 'server-only'
import { literal } from 'sequelize'
import type { ConsignmentRow } from '@/lib/views/consignment-row'
import type { Moment } from '@/lib/views/sheet'
import type { Consignment } from '@/models'
import { FIRM_ZONE, deskMoment } from '../firm'

/** Counts a line of the board shows; give them to `attributes.include` of the query. */
export const SIGNED_AND_CRATES = [
  [
    literal(
      `(SELECT COUNT(DISTINCT signed.crate_ref) FROM approvals AS signed WHERE signed.consignment_id = \`Consignment\`.\`id\`
        AND signed.plan_hash = \`Consignment\`.\`plan_hash\` AND signed.voided_at IS NULL AND signed.decision <> 'returned')`,
    ),
    'signedCount',
  ],
  [
    literal('(SELECT COUNT(*) FROM crates AS boxed WHERE boxed.consignment_id = `Consignment`.`id`)'),
    'crateCount',
  ],
] as const as readonly [ReturnType<typeof literal>, string][]

/** A consignment, loaded with its shipper and counts, as one line of the board. */
export function consignmentRow(row: Consignment): ConsignmentRow {
  return {
    id: row.id,
    mark: row.mark,
    state: row.state,
    revision: row.revision,
    inForceRevision: row.inForceRevision,
    inForceState: row.inForceState,
    from: row.fromPlaceName,
    to: row.toPlaceName,
    animals: row.animalsSummary,
    shipper: row.shipper?.name ?? '',
    leaves: localMoment(row.departsAt, row.departsZone),
    arrives: localMoment(row.arrivesAt, row.arrivesZone),
    verdict: row.verdict,
    outOfDate: row.outOfDate,
    deciding: row.deciding ?? '',
    marginMin: row.marginMin,
    marginOutsideAirC: row.marginOutsideAirC,
    marginBodyC: row.marginBodyC,
    holder: row.holder,
    signed: counted(row, 'signedCount'),
    crates: counted(row, 'crateCount'),
    updated: deskMoment(row.updatedAt),
  }
}

function localMoment(at: Date | null, zone: string | null): Moment | null {
  return at === null ? null : { ms: at.getTime(), zone: zone ?? FIRM_ZONE }
}

function counted(row: Consignment, name: string): number {
  return Number(row.get(name) ?? 0)
}
