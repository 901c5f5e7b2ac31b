'use client'

import { useState } from 'react'
import type { ComponentProps, ReactNode } from 'react'
import { join } from '@/components/ui/join'
import { CONTROL, Field, InputBox, describedBy } from './field'
import type { FieldFace } from './field'

type Native<T extends 'input' | 'textarea'> = Omit<ComponentProps<T>, 'id' | 'className' | 'children'>

/** One line of words. */
export function TextInput({
  id,
  label,
  hint,
  error,
  className,
  unit,
  bare,
  ...rest
}: FieldFace & Native<'input'> & { unit?: ReactNode; bare?: boolean }) {
  return (
    <Field {...{ id, label, hint, error, className, bare }}>
      <InputBox error={Boolean(error)} unit={unit} disabled={rest.disabled} bare={bare}>
        <input
          {...rest}
          id={id}
          aria-invalid={error ? true : undefined}
          aria-describedby={describedBy({ id, hint, error })}
          className={CONTROL}
        />
      </InputBox>
    </Field>
  )
}

/**
 * A figure with its unit inside the field. It is text with a numeric keypad, because a browser's number field refuses a
 * decimal comma and drops what it can't read; parseFigure reads both, and what it can't read stays for the message.
 */
export function NumberInput({
  id,
  label,
  hint,
  error,
  className,
  unit,
  bare,
  ...rest
}: FieldFace & Native<'input'> & { unit?: ReactNode; bare?: boolean }) {
  return (
    <Field {...{ id, label, hint, error, className, bare }}>
      <InputBox error={Boolean(error)} unit={unit} disabled={rest.disabled} bare={bare}>
        <input
          inputMode="decimal"
          autoComplete="off"
          {...rest}
          type="text"
          id={id}
          aria-invalid={error ? true : undefined}
          aria-describedby={describedBy({ id, hint, error })}
          className={join(CONTROL, 'fig text-right')}
        />
      </InputBox>
    </Field>
  )
}

export function TextArea({
  id,
  label,
  hint,
  error,
  className,
  rows = 3,
  ...rest
}: FieldFace & Native<'textarea'>) {
  return (
    <Field {...{ id, label, hint, error, className }}>
      <InputBox error={Boolean(error)} disabled={rest.disabled}>
        <textarea
          {...rest}
          id={id}
          rows={rows}
          aria-invalid={error ? true : undefined}
          aria-describedby={describedBy({ id, hint, error })}
          className={join(CONTROL, 'resize-y')}
        />
      </InputBox>
    </Field>
  )
}

/** A password that can be looked at. */
export function PasswordInput({
  id,
  label,
  hint,
  error,
  className,
  autoComplete = 'current-password',
  ...rest
}: FieldFace & Native<'input'>) {
  const [shown, setShown] = useState(false)
  return (
    <Field {...{ id, label, hint, error, className }}>
      <InputBox error={Boolean(error)} disabled={rest.disabled}>
        <input
          {...rest}
          id={id}
          type={shown ? 'text' : 'password'}
          autoComplete={autoComplete}
          autoCapitalize="none"
          spellCheck={false}
          aria-invalid={error ? true : undefined}
          aria-describedby={describedBy({ id, hint, error })}
          className={CONTROL}
        />
        <button
          type="button"
          aria-controls={id}
          aria-pressed={shown}
          className="link px-2.5 max-desk:min-h-11"
          onClick={() => setShown((before) => !before)}
        >
          {shown ? 'Hide' : 'Show'}
          <span className="sr-only"> password</span>
        </button>
      </InputBox>
    </Field>
  )
}
