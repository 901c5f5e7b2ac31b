import 'server-only'
import type { ConsignmentRow } from '@/lib/views/consignment-row'
import type { Moment } from '@/lib/views/sheet'
import type { Consignment } from '@/models'
import { FIRM_ZONE, deskMoment } from '../firm'

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
