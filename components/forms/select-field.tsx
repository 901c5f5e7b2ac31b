import type { ComponentProps } from 'react'
import { join } from '@/components/ui/join'
import { CONTROL, Field, InputBox, describedBy } from './field'
import type { FieldFace } from './field'

export interface Choice {
  value: string
  words: string
  disabled?: boolean
}

/** One of a list. `none` is the words of the empty choice; without it the list has none. */
export function SelectField({
  id,
  label,
  hint,
  error,
  className,
  choices,
  none,
  bare,
  ...rest
}: FieldFace &
  Omit<ComponentProps<'select'>, 'id' | 'className' | 'children'> & {
    choices: readonly Choice[]
    none?: string
    bare?: boolean
  }) {
  return (
    <Field {...{ id, label, hint, error, className, bare }}>
      <InputBox error={Boolean(error)} disabled={rest.disabled} bare={bare}>
        <select
          {...rest}
          id={id}
          aria-invalid={error ? true : undefined}
          aria-describedby={describedBy({ id, hint, error })}
          className={join(CONTROL, 'peer -mr-6 cursor-pointer pr-7 [&>option]:bg-sheet [&>option]:text-ink')}
        >
          {none !== undefined && <option value="">{none}</option>}
          {choices.map((choice) => (
            <option key={choice.value} value={choice.value} disabled={choice.disabled}>
              {choice.words}
            </option>
          ))}
        </select>
        <svg
          aria-hidden="true"
          width="10"
          height="6"
          viewBox="0 0 10 6"
          className="pointer-events-none mr-2.5 shrink-0 fill-hand"
        >
          <path d="M0 0h10L5 6z" />
        </svg>
      </InputBox>
    </Field>
  )
}
