'use client'

import type { ReactNode } from 'react'
import { useController, useFormContext, useFormState } from 'react-hook-form'
import type { Path } from 'react-hook-form'
import { parseFigure } from '@/components/forms/figure'
import { SelectField } from '@/components/forms/select-field'
import type { Choice } from '@/components/forms/select-field'
import { TemperatureInput } from '@/components/forms/temperature-input'
import { NumberInput, TextArea, TextInput } from '@/components/forms/text-input'
import { Radios, Tick, Ticks } from '@/components/forms/ticks'
import type { Plan } from '@/lib/schemas/plan'
import { useProblem } from './plan-context'
import { planPathId } from './plan-path'

/*
 * The fields of the plan: each knows its path, finds its own value, and says what is wrong with it.
 */

export type PlanPath = Path<Plan>

interface Face {
  path: PlanPath
  label: ReactNode
  hint?: ReactNode
  className?: string
}

/** What the form itself says of the field, else why it keeps the plan from being assessed. */
export function useFieldError(path: PlanPath): string | undefined {
  const { control, getFieldState } = useFormContext<Plan>()
  const state = useFormState({ control, name: path, exact: true })
  const problem = useProblem(path)
  return getFieldState(path, state).error?.message ?? problem
}

export function PlanText({
  path,
  ...face
}: Face & { type?: 'text' | 'tel' | 'email' | 'date'; unit?: ReactNode }) {
  const { register } = useFormContext<Plan>()
  return (
    <TextInput
      {...face}
      {...register(path)}
      id={planPathId(path)}
      error={useFieldError(path)}
      autoComplete="off"
    />
  )
}

export function PlanTextArea({ path, ...face }: Face & { rows?: number }) {
  const { register } = useFormContext<Plan>()
  return <TextArea {...face} {...register(path)} id={planPathId(path)} error={useFieldError(path)} />
}

/** A figure: empty is null, what cannot be read stays as typed for the message to name. */
export function PlanNumber({ path, ...face }: Face & { unit: string; bare?: boolean }) {
  const { register } = useFormContext<Plan>()
  return (
    <NumberInput
      {...face}
      {...register(path, { setValueAs: parseFigure })}
      id={planPathId(path)}
      error={useFieldError(path)}
    />
  )
}

/** A temperature, typed in the unit of the session and kept in °C. */
export function PlanTemperature({ path, ...face }: Face & { bare?: boolean }) {
  const { control } = useFormContext<Plan>()
  const { field } = useController({ control, name: path })
  return (
    <TemperatureInput
      {...face}
      id={planPathId(path)}
      name={path}
      valueC={field.value as number | string | null}
      onChangeC={field.onChange}
      onBlur={field.onBlur}
      error={useFieldError(path)}
    />
  )
}

/** One of a list of words. */
export function PlanSelect({
  path,
  choices,
  none,
  ...face
}: Face & { choices: readonly Choice[]; none?: string; bare?: boolean }) {
  const { register } = useFormContext<Plan>()
  return (
    <SelectField
      {...face}
      {...register(path)}
      id={planPathId(path)}
      choices={choices}
      none={none}
      error={useFieldError(path)}
    />
  )
}

/** One of a list of records; the plan keeps the id, or null. */
export function PlanRecordSelect({
  path,
  records,
  none = 'Not chosen',
  onChosen,
  ...face
}: Face & {
  records: readonly { id: number; name: string }[]
  none?: string
  /** After the choice stands in the plan. */
  onChosen?: (id: number | null, before: unknown) => void
}) {
  const { register, getValues } = useFormContext<Plan>()
  const setValueAs = (value: unknown) => (value === '' || value === null ? null : Number(value))
  const field = register(path, { setValueAs })
  return (
    <SelectField
      {...face}
      {...field}
      id={planPathId(path)}
      none={none}
      choices={records.map(({ id, name }) => ({ value: String(id), words: name }))}
      error={useFieldError(path)}
      onChange={(event) => {
        const before = getValues(path)
        void field.onChange(event)
        onChosen?.(setValueAs(event.target.value), before)
      }}
    />
  )
}

export function PlanTick({ path, ...face }: Face) {
  const { register } = useFormContext<Plan>()
  return <Tick {...face} {...register(path)} id={planPathId(path)} error={useFieldError(path)} />
}

export function PlanTicks({ path, choices, ...face }: Face & { choices: readonly Choice[] }) {
  const { register } = useFormContext<Plan>()
  return (
    <Ticks
      {...face}
      {...register(path)}
      id={planPathId(path)}
      options={choices}
      error={useFieldError(path)}
    />
  )
}

export function PlanRadios({
  path,
  choices,
  inRow,
  ...face
}: Face & { choices: readonly Choice[]; inRow?: boolean }) {
  const { register } = useFormContext<Plan>()
  return (
    <Radios
      {...face}
      {...register(path)}
      inRow={inRow}
      id={planPathId(path)}
      options={choices}
      error={useFieldError(path)}
    />
  )
}
