'use client'

import { useQuery } from '@tanstack/react-query'
import { Attention } from '@/components/ui/notice'
import type { ReviewQueueRow } from '@/lib/views/review'
import { ReviewQueue } from './review-queue'

const EVERY_MS = 30_000

export interface QueueAnswer {
  rows: ReviewQueueRow[]
  nowMs: number
}

/** The queue of a page that stays open: asked again every half minute, and when the window is looked at. */
export function LiveQueue({
  first,
  chosen,
}: {
  first: QueueAnswer
  chosen: { consignmentId: number; crateId: string } | null
}) {
  const queue = useQuery({
    // A page drawn again after a signature brings its own queue, newer than what is kept.
    queryKey: ['review-queue', first.nowMs],
    queryFn: readQueue,
    initialData: first,
    initialDataUpdatedAt: first.nowMs,
    refetchInterval: EVERY_MS,
  })
  return (
    <div>
      <ReviewQueue rows={queue.data.rows} nowMs={queue.data.nowMs} chosen={chosen} />
      <p className="mt-1.5 text-small text-mute">Order: time of leaving.</p>
      {queue.isError && <Attention>No answer for the queue: what stands here may be old.</Attention>}
    </div>
  )
}

async function readQueue(): Promise<QueueAnswer> {
  const response = await fetch('/api/review')
  if (!response.ok) throw new Error(`The queue answered ${response.status}.`)
  return (await response.json()) as QueueAnswer
}
