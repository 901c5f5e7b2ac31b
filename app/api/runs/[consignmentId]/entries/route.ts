import { storeEntries } from '@/lib/domain/runs/store-entries'
import { idOf, jsonRoute } from '@/lib/route'
import { storeEntriesSchema } from '@/lib/schemas/run-entry'

export const dynamic = 'force-dynamic'

/** A device's queue of road entries: answers which are stored and which never will be. Sent twice, stored once. */
export const POST = jsonRoute(
  '/api/runs/[consignmentId]/entries',
  async ({ actor, request, params, now }) => {
    const sent = (await request.json()) as Record<string, unknown>
    return storeEntries(
      actor,
      storeEntriesSchema.parse({ ...sent, consignmentId: idOf(params, 'consignmentId') }),
      now,
    )
  },
)
