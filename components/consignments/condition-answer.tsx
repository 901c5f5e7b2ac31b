'use client'

import { useState } from 'react'
import { Radios } from '@/components/forms/ticks'
import { SubmitButton } from '@/components/forms/submit-button'
import { TextArea, TextInput } from '@/components/forms/text-input'
import { useActionForm } from '@/components/hooks/use-action-form'
import { Dialog } from '@/components/ui/dialog'
import { ErrorSummary } from '@/components/ui/error-summary'
import type { ActionResult } from '@/lib/errors'
import { conditionAnswerSchema } from '@/lib/schemas/act'
import type { ConditionAnswerInput } from '@/lib/schemas/act'
import type { ConditionView } from '@/lib/views/sheet'

export type AnswerCondition = (input: ConditionAnswerInput) => Promise<ActionResult<unknown>>

/** Writing down what a party answered to a condition: confirmed or refused, by whom and how. Answered once. */
export function ConditionAnswer({
  condition,
  answer,
}: {
  condition: ConditionView
  answer: AnswerCondition
}) {
  const [open, setOpen] = useState(false)
  const { form, submit, pending, issues, turn, refusal, field } = useActionForm({
    schema: conditionAnswerSchema,
    action: answer,
    defaultValues: {
      conditionId: Number(condition.conditionId),
      requestId: '',
      answer: 'confirmed',
      how: 'writing',
      answeredBy: '',
      note: '',
    },
    onDone: () => setOpen(false),
  })
  return (
    <>
      <button
        type="button"
        className="link no-print max-desk:min-h-11"
        onClick={() => {
          form.setValue('requestId', crypto.randomUUID())
          setOpen(true)
        }}
      >
        Write down the answer
      </button>
      <Dialog
        open={open}
        title={`Condition ${condition.number}: what was answered`}
        onClose={() => setOpen(false)}
      >
        <form
          method="post"
          noValidate
          onSubmit={(event) => void submit(event)}
          className="flex flex-col gap-3"
        >
          <p>
            {condition.text}{' '}
            <span className="text-mute">Asked of {condition.askedOf || 'the party in charge'}.</span>
          </p>
          <ErrorSummary title={refusal?.message} issues={issues} turn={turn} />
          <Radios
            {...field('answer')}
            label="Answer"
            inRow
            options={[
              { value: 'confirmed', words: 'Confirmed' },
              { value: 'refused', words: 'Refused' },
            ]}
          />
          <Radios
            {...field('how')}
            label="How"
            inRow
            options={[
              { value: 'writing', words: 'In writing' },
              { value: 'telephone', words: 'By telephone' },
              { value: 'in person', words: 'In person' },
            ]}
          />
          <TextInput {...field('answeredBy')} label="Who answered" autoComplete="off" />
          <TextArea {...field('note')} label="Note" rows={2} />
          <div>
            <SubmitButton pending={pending}>Write it down</SubmitButton>
          </div>
        </form>
      </Dialog>
    </>
  )
}
