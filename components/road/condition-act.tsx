'use client'

import { useId, useState } from 'react'
import { TextArea } from '@/components/forms/text-input'
import { Button } from '@/components/ui/button'

/** Each animal was looked at: all well with one press, or what is not well in words. */
export function ConditionAct({ onEnter }: { onEnter: (allWell: boolean, text: string) => void }) {
  const id = useId()
  const [saying, setSaying] = useState(false)
  const [tried, setTried] = useState(false)
  const [text, setText] = useState('')
  if (!saying)
    return (
      <div className="mt-2.5 flex gap-2.5">
        <Button size="phone" className="flex-1" onClick={() => onEnter(true, '')}>
          All well
        </Button>
        <Button size="phone" className="flex-1" onClick={() => setSaying(true)}>
          Not all
        </Button>
      </div>
    )
  return (
    <form
      noValidate
      className="mt-2 grid gap-2.5"
      onSubmit={(event) => {
        event.preventDefault()
        setTried(true)
        if (text.trim() !== '') onEnter(false, text.trim())
      }}
    >
      <TextArea
        id={id}
        label="Which animal, and what you see"
        hint="Ring before you write, if it is one of the early signs."
        rows={2}
        maxLength={500}
        value={text}
        onChange={(event) => setText(event.target.value)}
        error={tried && text.trim() === '' ? 'Say which animal and what you see.' : undefined}
      />
      <div className="flex gap-2">
        <Button type="submit" size="phone" className="flex-1">
          Enter
        </Button>
        <Button size="phone" onClick={() => setSaying(false)}>
          Go back
        </Button>
      </div>
    </form>
  )
}
