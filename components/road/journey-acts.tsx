'use client'

import { useState } from 'react'
import { useActionForm } from '@/components/hooks/use-action-form'
import { SubmitButton } from '@/components/forms/submit-button'
import { TextArea, TextInput } from '@/components/forms/text-input'
import { Button } from '@/components/ui/button'
import { ErrorSummary } from '@/components/ui/error-summary'
import type { ActionResult } from '@/lib/errors'
import { deliverSchema, departSchema, stopJourneySchema } from '@/lib/schemas/act'
import type { DeliverConsignment, DepartConsignment, StopConsignment } from '@/lib/schemas/act'
import type { ChecklistView } from '@/lib/views/checklist'

export interface JourneyActions {
  depart: (input: DepartConsignment) => Promise<ActionResult<unknown>>
  deliver: (input: DeliverConsignment) => Promise<ActionResult<unknown>>
  stop: (input: StopConsignment) => Promise<ActionResult<unknown>>
}

export type RequestIds = Record<keyof JourneyActions, string>

/** What a driver says of the whole journey: it has begun, it is delivered, it is broken off. Needs a signal. */
export function JourneyActs({
  view,
  actions,
  requestIds,
}: {
  view: ChecklistView
  actions: JourneyActions
  requestIds: RequestIds
}) {
  const [open, setOpen] = useState<'deliver' | 'stop' | null>(null)
  if (!view.mayDepart && !view.mayDeliver && !view.mayStop) return null
  const act = { consignmentId: view.consignmentId, inPlaceOfDriver: '' }
  return (
    <section aria-labelledby="journey-acts" className="no-print border-t-2 border-ink bg-sheet px-4 py-3.5">
      <h2 id="journey-acts" className="text-section">
        The journey
      </h2>
      <p className="text-caption text-mute">
        These three go at once and need a signal. Without one, ring the desk.
      </p>
      <div className="mt-2.5 grid gap-2.5">
        {view.mayDepart && <Depart act={{ ...act, requestId: requestIds.depart }} action={actions.depart} />}
        {view.mayDeliver && open !== 'deliver' && (
          <Button size="phone" onClick={() => setOpen('deliver')}>
            Delivered
          </Button>
        )}
        {open === 'deliver' && (
          <Deliver
            act={{ ...act, requestId: requestIds.deliver }}
            action={actions.deliver}
            onLeave={() => setOpen(null)}
          />
        )}
        {view.mayStop && open !== 'stop' && (
          <Button size="phone" onClick={() => setOpen('stop')}>
            Break the journey off
          </Button>
        )}
        {open === 'stop' && (
          <Stop
            act={{ ...act, requestId: requestIds.stop }}
            action={actions.stop}
            onLeave={() => setOpen(null)}
          />
        )}
      </div>
    </section>
  )
}

function Depart({ act, action }: { act: DepartConsignment; action: JourneyActions['depart'] }) {
  const { submit, pending, issues, turn, refusal } = useActionForm({
    name: 'depart',
    schema: departSchema,
    action,
    defaultValues: act,
  })
  return (
    <form method="post" onSubmit={submit} noValidate className="grid gap-2.5">
      <ErrorSummary title={refusal?.message} issues={issues} turn={turn}>
        {refusal && issues.length === 0 ? <p>Nothing was changed.</p> : null}
      </ErrorSummary>
      <SubmitButton pending={pending} size="phone">
        We have left
      </SubmitButton>
    </form>
  )
}

function Deliver({
  act,
  action,
  onLeave,
}: {
  act: DepartConsignment
  action: JourneyActions['deliver']
  onLeave: () => void
}) {
  const { submit, pending, issues, turn, refusal, field } = useActionForm({
    name: 'deliver',
    schema: deliverSchema,
    action,
    defaultValues: { ...act, receivedBy: '' },
  })
  return (
    <form method="post" onSubmit={submit} noValidate className="grid gap-2.5 border-t border-rule pt-2.5">
      <ErrorSummary title={refusal?.message} issues={issues} turn={turn}>
        {refusal && issues.length === 0 ? <p>Nothing was changed.</p> : null}
      </ErrorSummary>
      <TextInput {...field('receivedBy')} label="Received by, name and firm" maxLength={120} />
      <div className="flex gap-2.5">
        <SubmitButton pending={pending} size="phone">
          Delivered, journey ends
        </SubmitButton>
        <Button size="phone" onClick={onLeave}>
          Go back
        </Button>
      </div>
    </form>
  )
}

function Stop({
  act,
  action,
  onLeave,
}: {
  act: DepartConsignment
  action: JourneyActions['stop']
  onLeave: () => void
}) {
  const { submit, pending, issues, turn, refusal, field } = useActionForm({
    name: 'stop',
    schema: stopJourneySchema,
    action,
    defaultValues: { ...act, reason: '', whereAnimalsAre: '' },
  })
  return (
    <form method="post" onSubmit={submit} noValidate className="grid gap-2.5 border-t border-rule pt-2.5">
      <ErrorSummary title={refusal?.message} issues={issues} turn={turn}>
        {refusal && issues.length === 0 ? <p>Nothing was changed.</p> : null}
      </ErrorSummary>
      <TextArea {...field('reason')} label="Why the journey was broken off" rows={2} maxLength={500} />
      <TextInput {...field('whereAnimalsAre')} label="Where the animals are now" maxLength={300} />
      <div className="flex flex-wrap gap-2.5">
        <SubmitButton pending={pending} size="phone">
          Broken off
        </SubmitButton>
        <Button size="phone" onClick={onLeave}>
          Go back
        </Button>
      </div>
    </form>
  )
}
