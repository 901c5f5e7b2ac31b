'use client'

import type { ActionResult } from '@/lib/errors'
import type { ConsignmentStatusView } from './status-view'
import { useSimpleAct } from './use-simple-act'
import { WorkPart } from './work-part'

/** The worker's row with the way to ask again where an assessment stopped. */
export function AssessAgain({
  consignmentId,
  first,
  assess,
}: {
  consignmentId: number
  first: ConsignmentStatusView
  assess?: (input: { consignmentId: number; requestId: string }) => Promise<ActionResult<unknown>>
}) {
  const act = useSimpleAct(consignmentId, assess ?? refuse)
  return (
    <>
      <WorkPart consignmentId={consignmentId} first={first} onAssess={assess && act.run} />
      {act.refused && (
        <p role="alert" className="dbl pl-2 font-semibold">
          {act.refused.message}
        </p>
      )}
    </>
  )
}

async function refuse(): Promise<ActionResult<unknown>> {
  return { ok: false, code: 'not_allowed', message: 'You may not do this.', issues: [], details: {} }
}
