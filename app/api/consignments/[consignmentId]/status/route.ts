import { consignmentStatus } from '@/lib/domain/consignments/load'
import { idOf, jsonRoute } from '@/lib/route'

/** State, progress and figures of one consignment, for a page that waits. */
export const GET = jsonRoute('/api/consignments/[consignmentId]/status', ({ actor, params }) =>
  consignmentStatus(actor, { consignmentId: idOf(params, 'consignmentId') }),
)
