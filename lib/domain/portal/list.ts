import 'server-only'
import type { Actor } from '@/lib/policies/actor'
import type { PortalRow } from '@/lib/views/portal'
import { models } from '@/models'
import type { Consignment, Document } from '@/models'
import { authorize } from '../authorize'
import { visibleConsignments } from '../consignments/visible'
import { FIRM_ZONE } from '../firm'

const SHOWN = 200

/** A shipper's own consignments, the next to leave first. */
export async function listOwnConsignments(actor: Actor): Promise<PortalRow[]> {
  authorize(actor, 'consignment.list')
  const rows = await models.Consignment.findAll({
    where: visibleConsignments(actor),
    order: [
      ['departsAt', 'DESC'],
      ['id', 'DESC'],
    ],
    limit: SHOWN,
  })
  const manifests = await models.Document.findAll({
    where: { consignmentId: rows.map(({ id }) => id), kind: 'manifest', state: 'current' },
    include: [{ association: 'acknowledgement' }],
  })
  return rows.map((row) => portalRow(row, manifests))
}

function portalRow(row: Consignment, manifests: readonly Document[]): PortalRow {
  const manifest = manifests.find(({ consignmentId }) => consignmentId === row.id)
  const waits = manifest !== undefined && !manifest.acknowledgement && row.inForceState === 'released'
  return {
    consignmentId: row.id,
    mark: row.mark,
    from: row.fromPlaceName ?? '',
    to: row.toPlaceName ?? '',
    animals: row.animalsSummary,
    leaves: row.departsAt && { ms: row.departsAt.getTime(), zone: row.departsZone ?? FIRM_ZONE },
    state: row.inForceState ?? row.state,
    asked: waits ? `acknowledge revision ${manifest.revision}` : '',
  }
}
