'use client'

import { useFormContext, useWatch } from 'react-hook-form'
import { Tick } from '@/components/forms/ticks'
import { controlOf } from '@/lib/planning/climate-control'
import type { Control } from '@/lib/planning/climate-control'
import type { Plan } from '@/lib/schemas/plan'
import { PlanNumber, PlanTemperature } from './plan-fields'
import { planPathId } from './plan-path'

/** What holds the air of a space at a set-point, and with how many watts. None are offered: they must be asked for. */
export function ClimateControlFields({ index }: { index: number }) {
  const { control, setValue } = useFormContext<Plan>()
  const base = `legs.${index}.surroundings.conditioning` as const
  const air = useWatch({ control, name: `legs.${index}.surroundings` })
  if (air?.type !== 'enclosed') return null
  const on = air.conditioning !== null
  return (
    <fieldset className="flex flex-col gap-2">
      <legend className="sr-only">Cooling and heating</legend>
      <Tick
        id={planPathId(base)}
        label="Cooled or heated to a set-point"
        checked={on}
        onChange={(event) =>
          setValue(base, event.target.checked ? { setPointC: null, coolingW: null, heatingW: null } : null, {
            shouldDirty: true,
          })
        }
      />
      {on && (
        <>
          <div className="grid grid-cols-2 gap-2.5 desk:grid-cols-3">
            <PlanTemperature path={`${base}.setPointC`} label="Set-point" />
            <PlanNumber path={`${base}.coolingW`} label="Cooling" unit="W" />
            <PlanNumber path={`${base}.heatingW`} label="Heating" unit="W" />
          </div>
          <p className="text-small text-mute">{CONTROL_WORDS[controlOf(air.conditioning)]}</p>
        </>
      )}
    </fieldset>
  )
}

const CONTROL_WORDS: Record<Control, string> = {
  both: 'Where the watts are too few, the air leaves its set-point and the assessment shows it.',
  cooling: 'It can only cool: where it is colder outside, the space gets colder too.',
  heating: 'It can only heat: where it is hotter outside, the space gets hotter too.',
  none: 'Put the watts the machine gives on such a day, 0 where it can’t. Ask whoever runs it.',
}
