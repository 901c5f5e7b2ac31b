'use client'

import { useFormContext, useWatch } from 'react-hook-form'
import { FieldSet } from '@/components/forms/field'
import { Tick } from '@/components/forms/ticks'
import type { Plan } from '@/lib/schemas/plan'
import { useFieldError } from './plan-fields'
import { planPathId } from './plan-path'

/** Which animals stand in the crate. One that already stands in another says so. */
export function OccupantsField({ index }: { index: number }) {
  const { control, getValues, setValue } = useFormContext<Plan>()
  const path = `crates.${index}.occupants` as const
  const animals = useWatch({ control, name: 'animals' })
  const crates = useWatch({ control, name: 'crates' })
  const inside = crates[index]?.occupants ?? []
  const error = useFieldError(path)
  const change = (id: string, isInside: boolean) => {
    const before = getValues(path)
    setValue(path, isInside ? [...before, id] : before.filter((known) => known !== id), { shouldDirty: true })
  }
  return (
    <FieldSet id={planPathId(path)} legend="Animals inside" error={error}>
      {animals.length === 0 && <p className="text-small text-mute">No animal is entered yet.</p>}
      <span className="flex flex-wrap gap-x-4 gap-y-1">
        {animals.map((animal, place) => {
          const other = crates.find((crate, at) => at !== index && crate.occupants.includes(animal.id))
          return (
            <Tick
              key={animal.id}
              id={planPathId(`${path}.${animal.id}`)}
              label={animal.name || `Animal ${place + 1}`}
              hint={other && `Stands in crate ${other.letter}`}
              checked={inside.includes(animal.id)}
              onChange={(event) => change(animal.id, event.target.checked)}
            />
          )
        })}
      </span>
    </FieldSet>
  )
}
