'use client'

import { useState } from 'react'
import type { ReactNode } from 'react'
import type { DefaultValues, FieldValues, Path } from 'react-hook-form'
import type { z } from 'zod'
import { SubmitButton } from '@/components/forms/submit-button'
import { TextArea, TextInput } from '@/components/forms/text-input'
import { useActionForm } from '@/components/hooks/use-action-form'
import { Button } from '@/components/ui/button'
import { Dialog } from '@/components/ui/dialog'
import { ErrorSummary } from '@/components/ui/error-summary'
import type { ActionResult } from '@/lib/errors'

interface Asked<In extends FieldValues> {
  path: Path<In>
  label: string
  hint?: string
  long?: boolean
}

/** A button that lays one decision over the page: what follows from it, what has to be written down, and the act itself. */
export function ActDialog<In extends FieldValues, Out extends FieldValues>({
  words,
  title,
  first = false,
  schema,
  action,
  start,
  asks,
  done,
  children,
}: {
  /** The button that opens it. */
  words: string
  title: string
  first?: boolean
  schema: z.ZodType<Out, In>
  action: (input: Out) => Promise<ActionResult<unknown>>
  start: DefaultValues<In>
  asks: readonly Asked<In>[]
  /** The verb on the button that does it. */
  done: string
  /** What follows from it. */
  children?: ReactNode
}) {
  const [open, setOpen] = useState(false)
  const { form, submit, pending, issues, turn, refusal, field } = useActionForm({
    schema,
    action,
    defaultValues: start,
    onDone: () => {
      setOpen(false)
      form.reset({ ...start, requestId: crypto.randomUUID() } as DefaultValues<In>)
    },
  })
  const begin = () => {
    // Each opening is an act of its own; a second press of the same one does nothing more.
    form.setValue('requestId' as Path<In>, crypto.randomUUID() as never)
    setOpen(true)
  }
  return (
    <>
      <Button first={first} onClick={begin}>
        {words}
      </Button>
      <Dialog open={open} title={title} onClose={() => setOpen(false)}>
        <form
          method="post"
          noValidate
          onSubmit={(event) => void submit(event)}
          className="flex flex-col gap-3"
        >
          {children}
          <ErrorSummary title={refusal?.message} issues={issues} turn={turn}>
            {refusal !== null && issues.length === 0 ? <p>Nothing was changed.</p> : null}
          </ErrorSummary>
          {asks.map(({ path, label, hint, long }) =>
            long ? (
              <TextArea key={path} {...field(path)} label={label} hint={hint} />
            ) : (
              <TextInput key={path} {...field(path)} label={label} hint={hint} autoComplete="off" />
            ),
          )}
          <div>
            <SubmitButton pending={pending} pendingWords="Sending">
              {done}
            </SubmitButton>
          </div>
        </form>
      </Dialog>
    </>
  )
}
