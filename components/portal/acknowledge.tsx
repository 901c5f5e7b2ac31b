'use client'

import { useState } from 'react'
import { SubmitButton } from '@/components/forms/submit-button'
import { Tick } from '@/components/forms/ticks'
import { useActionForm } from '@/components/hooks/use-action-form'
import { ErrorSummary } from '@/components/ui/error-summary'
import type { ActionResult } from '@/lib/errors'
import { acknowledgeSchema } from '@/lib/schemas/act'
import type { AcknowledgeDocument } from '@/lib/schemas/act'
import { clock, counted, dayDate, dayTime, zoneName } from '@/lib/views/format'
import type { PortalAcknowledgement } from '@/lib/views/portal'

/** A shipper says that the manifest was read and the facts are right: two ticks and a button. */
export function Acknowledge({
  asked,
  action,
  requestId,
}: {
  asked: PortalAcknowledgement
  action: (input: AcknowledgeDocument) => Promise<ActionResult<unknown>>
  requestId: string
}) {
  const { by, done, revision } = asked
  return (
    <section id="acknowledge" aria-labelledby="acknowledge-title">
      <h3 id="acknowledge-title" className="text-sub">
        {done ? `Revision ${revision} is acknowledged` : `Acknowledge revision ${revision}`}
      </h3>
      {done ? (
        <p className="mt-1">
          <span className="font-head text-section font-semibold italic text-hand">{done.who}</span>,{' '}
          {dayTime(done.at.ms, done.at.zone)}
        </p>
      ) : (
        <>
          <p className="text-small">by {dayDate(by.ms, by.zone)}</p>
          <p className="fig text-big font-semibold">
            {clock(by.ms, by.zone)} {zoneName(by.ms, by.zone)}
          </p>
          <p className="text-small text-mute">Then the animals leave. Without it the desk rings you.</p>
          <AcknowledgeForm asked={asked} action={action} requestId={requestId} />
        </>
      )}
      <p className="mt-2 text-small text-mute">
        Kept with your name and the time. It approves nothing: that is the vet’s.
      </p>
    </section>
  )
}

function AcknowledgeForm({
  asked: { documentId, revision, conditionCount },
  action,
  requestId,
}: {
  asked: PortalAcknowledgement
  action: (input: AcknowledgeDocument) => Promise<ActionResult<unknown>>
  requestId: string
}) {
  const [read, setRead] = useState(false)
  const [right, setRight] = useState(false)
  const { submit, pending, issues, turn, refusal } = useActionForm({
    name: 'acknowledge',
    schema: acknowledgeSchema,
    action,
    defaultValues: { documentId, requestId },
  })
  const conditions = conditionCount === 0 ? '' : ` and its ${counted(conditionCount, 'condition')}`
  return (
    <form method="post" onSubmit={submit} noValidate className="mt-2 grid gap-2">
      <Tick
        id="acknowledge-read"
        label={`I have read revision ${revision}${conditions}`}
        checked={read}
        onChange={(event) => setRead(event.target.checked)}
      />
      <Tick
        id="acknowledge-right"
        label="The facts about my animals are right"
        checked={right}
        onChange={(event) => setRight(event.target.checked)}
      />
      <ErrorSummary title={refusal?.message} issues={issues} turn={turn}>
        {refusal && issues.length === 0 ? <p>Nothing was kept.</p> : null}
      </ErrorSummary>
      <SubmitButton
        pending={pending}
        size="phone"
        refused={read && right ? undefined : 'Tick both first. If a fact is wrong, ask for a change instead.'}
      >
        Acknowledge revision {revision}
      </SubmitButton>
    </form>
  )
}
