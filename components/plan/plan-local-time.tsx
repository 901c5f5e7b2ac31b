'use client'

import { useController, useFormContext } from 'react-hook-form'
import { LocalDateTimeInput } from '@/components/forms/local-date-time-input'
import type { Plan } from '@/lib/schemas/plan'
import { useFieldError } from './plan-fields'
import { usePlanLegs } from './plan-timeline'
import { planPathId } from './plan-path'

/** A wall time at the place the journey leaves from. */
export function PlanLocalTime({
  path,
  label,
}: {
  path: `animals.${number}.lastFedLocal` | `animals.${number}.lastWateredLocal`
  label: string
}) {
  const { control } = useFormContext<Plan>()
  const { field } = useController({ control, name: path })
  const { timeline } = usePlanLegs()
  return (
    <LocalDateTimeInput
      id={planPathId(path)}
      name={path}
      label={label}
      zone={timeline.departureZone ?? ''}
      value={field.value}
      error={useFieldError(path)}
      onChange={field.onChange}
      onBlur={field.onBlur}
      question={
        <p className="text-small text-mute">The clock there shows this hour twice: the first is counted.</p>
      }
    />
  )
}
