import { reviewQueue } from '@/lib/domain/approvals/queue'
import { jsonRoute } from '@/lib/route'

export const dynamic = 'force-dynamic'

/** The vet's queue, for a page that stays open. */
export const GET = jsonRoute('/api/review', async ({ actor, now }) => ({
  rows: await reviewQueue(actor),
  nowMs: now.getTime(),
}))
