'use client'

import { useState } from 'react'
import type { ReactNode } from 'react'
import { join } from '@/components/ui/join'
import { resolveLocalTime } from '@/lib/planning/local-time'
import { dayDate, zoneName, zoneWithOffset } from '@/lib/views/format'
import { CONTROL, Field, InputBox } from './field'
import type { FieldFace } from './field'
import { localText, parseLocalTime } from './local-text'
import { Radios } from './ticks'

/**
 * A wall time at a place, typed as 2026-06-09 09:20, with its zone in the field. Under it the day in words; where the
 * place's clock shows the hour twice, the question which one is meant; where it skips it, the first time after the gap.
 */
export function LocalDateTimeInput({
  id,
  label,
  hint,
  error,
  className,
  zone,
  value,
  offsetMin,
  onChange,
  onOffset,
  onBlur,
  name,
  disabled,
  question,
}: FieldFace & {
  /** IANA zone of the place; empty while no place is chosen. */
  zone: string
  /** "2026-06-09T09:20" or what can't be read yet. */
  value: string
  offsetMin?: number | null
  onChange: (value: string) => void
  onOffset?: (offsetMin: number | null) => void
  onBlur?: () => void
  name?: string
  disabled?: boolean
  /** Stands in place of the question about a doubled hour. */
  question?: ReactNode
}) {
  // While it has the focus the field shows what is being typed; the value follows as soon as it can be read.
  const [typed, setTyped] = useState<string | null>(null)
  const time = resolveLocalTime(value, zone, offsetMin ?? null)
  // Asked for as long as the hour comes twice: a choice once made can be seen, and changed.
  const both = resolveLocalTime(value, zone, null)
  const noteId = `${id}-note`
  const describedBy = join(hint ? `${id}-hint` : '', noteId, error ? `${id}-error` : '')
  const zoneWords = time.kind === 'instant' ? zoneName(time.instantMs, zone) : ''
  return (
    <div className={className}>
      <Field {...{ id, label, hint, error }}>
        <InputBox error={Boolean(error)} unit={zoneWords || undefined} disabled={disabled}>
          <input
            id={id}
            name={name}
            disabled={disabled}
            value={typed ?? localText(value)}
            inputMode="numeric"
            autoComplete="off"
            aria-invalid={error ? true : undefined}
            aria-describedby={describedBy}
            className={CONTROL}
            onChange={(event) => {
              setTyped(event.target.value)
              onChange(parseLocalTime(event.target.value))
            }}
            onBlur={() => {
              setTyped(null)
              onBlur?.()
            }}
          />
        </InputBox>
        <span id={noteId} className="text-caption text-mute">
          {time.kind === 'instant' &&
            `${dayDate(time.instantMs, zone)}, ${zoneWithOffset(time.instantMs, zone)}`}
          {time.kind === 'missing' &&
            `The clock there goes from ${time.beforeLabel} to ${time.afterLabel} and skips this time; the next one is ${localText(time.nextLocal)}.`}
        </span>
      </Field>
      {both.kind === 'doubled' &&
        (question ?? (
          <Radios
            id={`${id}-which`}
            name={`${id}-which`}
            label="The clock there shows this hour twice. Which one?"
            inRow
            chosen={String(offsetMin ?? '')}
            options={both.choices.map((choice, index) => ({
              value: String(choice.offsetMin),
              words: `${index === 0 ? 'first' : 'second'}, ${choice.label}`,
            }))}
            onChange={(event) => onOffset?.(Number(event.target.value))}
          />
        ))}
    </div>
  )
}
