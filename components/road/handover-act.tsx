'use client'

import { useId, useState } from 'react'
import { NumberInput, TextInput } from '@/components/forms/text-input'
import { Button } from '@/components/ui/button'
import { zoneName } from '@/lib/views/format'
import type { ChecklistLeg, ChecklistView } from '@/lib/views/checklist'
import { ClockField } from './clock-field'
import type { NewEntry } from './use-entries'

const COUNTS = ['alive', 'dead', 'short'] as const

/** The crates change hands: to whom, where, when, and how many are alive, dead, short. */
export function HandoverAct({
  leg,
  crates,
  onEnter,
}: {
  leg: ChecklistLeg
  crates: ChecklistView['crates']
  onEnter: (more: Partial<NewEntry>) => void
}) {
  const id = useId()
  const expected = crates.reduce((sum, crate) => sum + crate.animalCount, 0)
  const [to, setTo] = useState(leg.handOverTo)
  const [place, setPlace] = useState(leg.toPlace)
  const [atMs, setAtMs] = useState<number | null>(null)
  const [typed, setTyped] = useState<Record<(typeof COUNTS)[number], string>>({
    alive: '',
    dead: '0',
    short: '0',
  })
  const [tried, setTried] = useState(false)
  const counts = { alive: whole(typed.alive), dead: whole(typed.dead), short: whole(typed.short) }
  const sum = COUNTS.every((name) => counts[name] !== null)
    ? COUNTS.reduce((total, name) => total + (counts[name] ?? 0), 0)
    : null
  const sumWrong = sum !== null && sum !== expected

  function enter(event: React.FormEvent) {
    event.preventDefault()
    setTried(true)
    if (to.trim() === '' || place.trim() === '' || atMs === null || sum === null || sumWrong) return
    onEnter({ atMs, place: place.trim(), value: { to: to.trim() }, ...counts })
  }

  return (
    <form method="post" noValidate onSubmit={enter} className="mt-2 grid gap-2.5">
      <TextInput
        id={`${id}-to`}
        label="To whom, name and firm"
        maxLength={120}
        value={to}
        onChange={(event) => setTo(event.target.value)}
        error={tried && to.trim() === '' ? 'Say who received the crates.' : undefined}
      />
      <TextInput
        id={`${id}-place`}
        label="Where"
        maxLength={160}
        value={place}
        onChange={(event) => setPlace(event.target.value)}
        error={tried && place.trim() === '' ? 'Say where it was.' : undefined}
      />
      <ClockField
        id={`${id}-at`}
        label="When"
        zone={leg.end.zone}
        zoneWords={zoneName(leg.end.ms, leg.end.zone)}
        onTime={setAtMs}
        error={tried && atMs === null ? 'Put the time, for example 06:20, or press Now.' : undefined}
      />
      <div className="grid grid-cols-3 gap-2.5">
        {COUNTS.map((name) => (
          <NumberInput
            key={name}
            id={`${id}-${name}`}
            label={name === 'alive' ? 'Alive' : name === 'dead' ? 'Dead' : 'Short'}
            inputMode="numeric"
            value={typed[name]}
            onChange={(event) => setTyped({ ...typed, [name]: event.target.value })}
            error={tried && counts[name] === null ? 'Put a number.' : undefined}
          />
        ))}
      </div>
      {tried && sumWrong && (
        <p role="alert" className="dbl pl-2 text-small font-semibold">
          {sum} counted, {expected} in the crates: alive, dead and short together make {expected}.
        </p>
      )}
      <Button type="submit" size="phone">
        Enter the handover
      </Button>
    </form>
  )
}

function whole(typed: string): number | null {
  return /^\d{1,4}$/.test(typed.trim()) ? Number(typed.trim()) : null
}
