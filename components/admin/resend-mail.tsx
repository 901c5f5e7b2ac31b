'use client'

import { useState } from 'react'
import { SubmitButton } from '@/components/forms/submit-button'
import { TextInput } from '@/components/forms/text-input'
import { Tick } from '@/components/forms/ticks'
import { useActionForm } from '@/components/hooks/use-action-form'
import { ErrorSummary } from '@/components/ui/error-summary'
import type { ActionResult } from '@/lib/errors'
import { resendMailSchema } from '@/lib/schemas/administration'
import type { ResendMail as ResendMailInput } from '@/lib/schemas/administration'
import type { MailState } from '@/lib/views/administration'

/** A person decides that a mail goes again: who said so is kept in the audit trail. */
export function ResendMail({
  mailId,
  state,
  action,
  requestId,
}: {
  mailId: number
  state: MailState
  action: (input: ResendMailInput) => Promise<ActionResult<unknown>>
  requestId: string
}) {
  const [sure, setSure] = useState(false)
  const { submit, pending, issues, turn, refusal, field } = useActionForm({
    name: 'resend',
    schema: resendMailSchema,
    action,
    defaultValues: { mailId, requestId, reason: '' },
  })
  return (
    <form method="post" onSubmit={submit} noValidate className="grid gap-2.5">
      <h3 className="text-sub">Send it again</h3>
      <Tick
        id="resend-sure"
        label={
          state === 'uncertain'
            ? 'It did not arrive: I asked the person it is for'
            : 'The address and the reason it failed are put right, or it is to be tried once more'
        }
        checked={sure}
        onChange={(event) => setSure(event.target.checked)}
      />
      <TextInput {...field('reason')} label="Who told you, and when" maxLength={300} />
      <ErrorSummary title={refusal?.message} issues={issues} turn={turn}>
        {refusal && issues.length === 0 ? <p>Nothing was sent.</p> : null}
      </ErrorSummary>
      <SubmitButton
        pending={pending}
        refused={sure ? undefined : 'Tick it first: no mail goes twice by itself.'}
      >
        Send again
      </SubmitButton>
      <p className="text-small text-mute">
        The letter stays as it was written, with the same number. Kept in the audit trail.
      </p>
    </form>
  )
}
