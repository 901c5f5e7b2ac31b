'use client'

import { useState } from 'react'
import { SubmitButton } from '@/components/forms/submit-button'
import { TextArea } from '@/components/forms/text-input'
import { Radios } from '@/components/forms/ticks'
import { useActionForm } from '@/components/hooks/use-action-form'
import { Button } from '@/components/ui/button'
import { ErrorSummary } from '@/components/ui/error-summary'
import type { ActionResult } from '@/lib/errors'
import { askChangeSchema } from '@/lib/schemas/act'
import type { AskChange as AskChangeInput } from '@/lib/schemas/act'
import { dayTime } from '@/lib/views/format'
import type { PortalView } from '@/lib/views/portal'

const SUBJECTS = [
  'Day or hour',
  'Something about an animal or crate',
  'Who receives them',
  'A paper',
] as const

interface AskChangeProps {
  consignmentId: number
  action: (input: AskChangeInput) => Promise<ActionResult<unknown>>
  /** The form keeps the one it began with; the next form begins with a fresh one of the server. */
  requestId: string
}

/** A shipper asks for a change; what was asked before stands under it. */
export function AskChange({ requests, ...form }: AskChangeProps & { requests: PortalView['requests'] }) {
  const [sent, setSent] = useState(false)
  return (
    <section aria-labelledby="ask-change">
      <h3 id="ask-change" className="text-sub">
        Ask for a change
      </h3>
      {sent ? (
        <div role="status" className="mt-1 grid justify-items-start gap-2">
          <p>It is with the desk. Nothing is changed until the desk says so.</p>
          <Button size="phone" onClick={() => setSent(false)}>
            Ask for another
          </Button>
        </div>
      ) : (
        <AskChangeForm {...form} onSent={() => setSent(true)} />
      )}
      {requests.length > 0 && (
        <ul className="mt-3 list-none">
          {requests.map((request) => (
            <li key={request.at.ms} className="border-t border-hair py-1.5 text-small">
              <b>{request.subject}</b>, revision {request.revision}, {dayTime(request.at.ms, request.at.zone)}
              <span className="block text-mute">{request.text}</span>
            </li>
          ))}
        </ul>
      )}
    </section>
  )
}

function AskChangeForm({
  consignmentId,
  action,
  requestId,
  onSent,
}: AskChangeProps & { onSent: () => void }) {
  const { submit, pending, issues, turn, refusal, field } = useActionForm({
    name: 'ask-change',
    schema: askChangeSchema,
    action,
    defaultValues: { consignmentId, requestId, subject: '', text: '' },
    onDone: onSent,
  })
  return (
    <form method="post" onSubmit={submit} noValidate className="mt-2 grid gap-3">
      <Radios
        {...field('subject')}
        label="Of what"
        options={SUBJECTS.map((subject) => ({ value: subject, words: subject }))}
      />
      <TextArea
        {...field('text')}
        label="What should be different"
        hint="A change to an animal or the journey makes a new revision: it is run again, and the vet may have to sign again."
        rows={3}
        maxLength={2000}
      />
      <ErrorSummary title={refusal?.message} issues={issues} turn={turn}>
        {refusal && issues.length === 0 ? <p>Nothing was sent.</p> : null}
      </ErrorSummary>
      <SubmitButton pending={pending} size="phone" first={false}>
        Send to the desk
      </SubmitButton>
    </form>
  )
}
