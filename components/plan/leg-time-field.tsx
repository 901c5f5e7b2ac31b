'use client'

import { useController, useFormContext, useWatch } from 'react-hook-form'
import { LocalDateTimeInput } from '@/components/forms/local-date-time-input'
import type { Plan } from '@/lib/schemas/plan'
import { usePlanPage } from './plan-context'
import { useFieldError } from './plan-fields'
import { useJoinedLegs } from './use-joined-legs'
import { planPathId } from './plan-path'

/**
 * A wall time at one end of a leg, on the clock of that end's place. An hour the clock skips is refused by name; an hour
 * it shows twice is asked for, never guessed. A neighbour that met this end moves with it.
 */
export function LegTimeField({
  index,
  edge,
  label,
}: {
  index: number
  edge: 'start' | 'end'
  label: string
}) {
  const { control, setValue } = useFormContext<Plan>()
  const { catalogues } = usePlanPage()
  const joined = useJoinedLegs(index, edge)
  const path = `legs.${index}.${edge}Local` as const
  const offsetPath = `legs.${index}.${edge}OffsetMin` as const
  const { field } = useController({ control, name: path })
  const placeId = useWatch({
    control,
    name: `legs.${index}.${edge === 'start' ? 'fromPlaceId' : 'toPlaceId'}`,
  })
  const offsetMin = useWatch({ control, name: offsetPath })
  const change = (local: string, offset: number | null) => {
    joined.remember()
    if (local !== field.value) field.onChange(local)
    setValue(offsetPath, offset, { shouldDirty: true })
    joined.follow()
  }
  return (
    <LocalDateTimeInput
      id={planPathId(path)}
      name={path}
      label={label}
      zone={catalogues.places.find(({ id }) => id === placeId)?.zone ?? ''}
      value={field.value}
      offsetMin={offsetMin}
      error={useFieldError(path)}
      onChange={(local) => change(local, null)}
      onOffset={(offset) => change(field.value, offset)}
      onBlur={field.onBlur}
    />
  )
}
