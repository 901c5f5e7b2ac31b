'use client'

import { useState } from 'react'
import { SubmitButton } from '@/components/forms/submit-button'
import { TextArea } from '@/components/forms/text-input'
import { useActionForm } from '@/components/hooks/use-action-form'
import { Button } from '@/components/ui/button'
import { ErrorSummary } from '@/components/ui/error-summary'
import type { ActionResult } from '@/lib/errors'
import { withdrawSchema } from '@/lib/schemas/approval'
import type { WithdrawApproval } from '@/lib/schemas/approval'
import type { SignedApproval } from '@/lib/views/review'

/** A vet takes an approval back before the journey is under way; the manifest that rests on it is void. */
export function Withdraw({
  approval,
  action,
  requestId,
}: {
  approval: SignedApproval
  action: (input: WithdrawApproval) => Promise<ActionResult<unknown>>
  requestId: string
}) {
  const [open, setOpen] = useState(false)
  const { submit, pending, issues, turn, refusal, field } = useActionForm({
    name: `withdraw-${approval.approvalId}`,
    schema: withdrawSchema,
    action,
    defaultValues: { approvalId: approval.approvalId, requestId, reason: '' },
    onDone: () => setOpen(false),
  })
  if (!open)
    return (
      <Button onClick={() => setOpen(true)}>
        Take back the approval of {approval.crateMarks.join(', ')}
      </Button>
    )
  return (
    <form method="post" onSubmit={submit} noValidate className="grid gap-2.5 border border-rule bg-sheet p-3">
      <p className="text-small">
        The consignment goes back to the desk. A manifest that rests on this approval is void at once.
      </p>
      <TextArea {...field('reason')} label="Reason" rows={2} maxLength={1000} />
      <ErrorSummary title={refusal?.message} issues={issues} turn={turn}>
        {refusal && issues.length === 0 ? <p>Nothing was changed.</p> : null}
      </ErrorSummary>
      <div className="flex flex-wrap gap-2">
        <SubmitButton pending={pending}>Take it back</SubmitButton>
        <Button onClick={() => setOpen(false)}>Leave it</Button>
      </div>
    </form>
  )
}
