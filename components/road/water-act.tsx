'use client'

import { useId, useState } from 'react'
import { TextInput } from '@/components/forms/text-input'
import { Button } from '@/components/ui/button'

/** Water was offered: who drank may be said, and need not. */
export function WaterAct({ onEnter }: { onEnter: (text: string) => void }) {
  const id = useId()
  const [text, setText] = useState('')
  return (
    <form
      className="mt-2 grid gap-2.5"
      onSubmit={(event) => {
        event.preventDefault()
        onEnter(text.trim())
      }}
    >
      <TextInput
        id={id}
        label="Who drank, who did not"
        maxLength={300}
        value={text}
        onChange={(event) => setText(event.target.value)}
      />
      <Button type="submit" size="phone">
        Water given
      </Button>
    </form>
  )
}
