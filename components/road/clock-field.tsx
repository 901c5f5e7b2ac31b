'use client'

import { useState } from 'react'
import { TextInput } from '@/components/forms/text-input'
import { Button } from '@/components/ui/button'
import { clock } from '@/lib/views/format'
import { timeLately } from './time-lately'

/** A time of the day, typed or filled in by "Now". */
export function ClockField({
  id,
  label,
  zone,
  zoneWords,
  onTime,
  error,
}: {
  id: string
  label: string
  zone: string
  /** "BST": stands in the field. */
  zoneWords: string
  /** null: what stands there is no time. */
  onTime: (atMs: number | null) => void
  error?: string
}) {
  const [typed, setTyped] = useState('')
  return (
    <div className="flex items-end gap-2.5">
      <TextInput
        id={id}
        className="flex-1"
        label={label}
        unit={zoneWords}
        inputMode="numeric"
        autoComplete="off"
        value={typed}
        error={error}
        onChange={(event) => {
          setTyped(event.target.value)
          onTime(timeLately(event.target.value, zone, Date.now()))
        }}
      />
      <Button
        size="phone"
        onClick={() => {
          const now = Date.now()
          setTyped(clock(now, zone))
          onTime(now)
        }}
      >
        Now
      </Button>
    </div>
  )
}
