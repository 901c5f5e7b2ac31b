'use client'

import { useQuery } from '@tanstack/react-query'
import { useRouter } from 'next/navigation'
import { useEffect, useRef } from 'react'
import type { ConsignmentStatusView } from './status-view'

const EVERY_MS = 1_000

/**
 * Asks how far an assessment or a release is, once a second while one is under way, and draws the page afresh when it has
 * ended. In a tab nobody looks at it waits.
 */
export function useStatus(
  first: ConsignmentStatusView,
  consignmentId: number,
): ConsignmentStatusView & { lost: boolean } {
  const router = useRouter()
  const query = useQuery({
    queryKey: ['consignment-status', consignmentId],
    queryFn: ({ signal }) => readStatus(consignmentId, signal),
    initialData: first,
    enabled: isWorking(first),
    refetchInterval: (current) => (isWorking(current.state.data ?? first) ? EVERY_MS : false),
    staleTime: 0,
  })
  const status = isWorking(first) ? query.data : first
  const working = isWorking(status)
  const was = useRef(working)
  useEffect(() => {
    if (was.current && !working) router.refresh()
    was.current = working
  }, [working, router])
  return { ...status, lost: query.isError }
}

/** True while the worker has something in hand for this consignment. */
export function isWorking({ assessment, releasing }: ConsignmentStatusView): boolean {
  return releasing || assessment?.status === 'queued' || assessment?.status === 'running'
}

async function readStatus(consignmentId: number, signal: AbortSignal): Promise<ConsignmentStatusView> {
  const answer = await fetch(`/api/consignments/${consignmentId}/status`, { signal })
  if (!answer.ok) throw new Error(`The desk answered ${answer.status}.`)
  return (await answer.json()) as ConsignmentStatusView
}
