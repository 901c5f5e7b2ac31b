'use client'

import { Button } from '@/components/ui/button'
import { WorkRow } from '@/components/ui/holes'
import { Notice } from '@/components/ui/notice'
import { partsOfStage } from '@/lib/rules/progress'
import { isWorking, useStatus } from './use-status'
import type { ConsignmentStatusView } from './status-view'

/** The worker's row: how far it is, or why it stopped. Nothing where there is nothing to say. */
export function WorkPart({
  consignmentId,
  first,
  onAssess,
}: {
  consignmentId: number
  first: ConsignmentStatusView
  /** Absent where the reader may not ask for an assessment. */
  onAssess?: () => void
}) {
  const status = useStatus(first, consignmentId)
  const { assessment } = status
  if (status.releasing) {
    return (
      <WorkRow
        done={0}
        of={2}
        words="Releasing: the papers are made and sealed."
        more="You can leave; it goes on by itself."
      />
    )
  }
  if (assessment !== null && isWorking(status))
    return <Assessing assessment={assessment} lost={status.lost} />
  if (assessment?.status === 'done' && isWorking(first))
    return <WorkRow done={1} of={1} words="Assessed. The page is being drawn afresh." />
  if (assessment?.status === 'failed') {
    return (
      <Notice
        role="alert"
        title="The assessment stopped"
        acts={onAssess && <Button onClick={onAssess}>Assess again</Button>}
      >
        <p>{assessment.error || 'It stopped without saying why.'}</p>
        <p className="text-mute">
          No verdict was made. The plan and all that was decided before still stand as they were.
        </p>
      </Notice>
    )
  }
  if (status.releaseError !== '') {
    return (
      <Notice role="alert" title="The release stopped">
        <p>{status.releaseError}</p>
        <p className="text-mute">Nothing was released and nothing was sent.</p>
      </Notice>
    )
  }
  return null
}

function Assessing({
  assessment,
  lost,
}: {
  assessment: NonNullable<ConsignmentStatusView['assessment']>
  lost: boolean
}) {
  const { status, stage, done, total } = assessment
  // A hole for each leg, or schedule, of the stage in hand.
  const parts = status === 'queued' ? null : partsOfStage(stage)
  const words =
    status === 'queued'
      ? 'Waiting for its turn to be assessed.'
      : total > 0
        ? `${stage}. ${done} of about ${total} runs.`
        : `${stage || 'Beginning'}.`
  return (
    <WorkRow
      done={parts?.done ?? 0}
      of={parts?.of ?? 1}
      words={words}
      more={
        lost
          ? 'The desk does not answer just now; the work goes on there.'
          : 'You can leave; it goes on by itself.'
      }
    />
  )
}
