'use client'

import { useId, useState } from 'react'
import { TextArea } from '@/components/forms/text-input'
import { Button } from '@/components/ui/button'

const LONGEST = 500

/** Why an item was not done: the reason goes with it to the desk. */
export function NotDone({
  number,
  onSay,
  onLeave,
}: {
  number: number
  onSay: (reason: string) => void
  onLeave: () => void
}) {
  const id = useId()
  const [reason, setReason] = useState('')
  const [tried, setTried] = useState(false)
  return (
    <form
      className="mt-2 grid gap-2"
      noValidate
      onSubmit={(event) => {
        event.preventDefault()
        setTried(true)
        if (reason.trim() !== '') onSay(reason.trim())
      }}
    >
      <TextArea
        id={id}
        label={`Why item ${number} is not done`}
        rows={2}
        maxLength={LONGEST}
        value={reason}
        onChange={(event) => setReason(event.target.value)}
        error={tried && reason.trim() === '' ? 'The reason is missing: the desk needs it.' : undefined}
      />
      <div className="flex gap-2">
        <Button type="submit" size="phone" className="flex-1">
          Mark not done
        </Button>
        <Button size="phone" onClick={onLeave}>
          Go back
        </Button>
      </div>
    </form>
  )
}
