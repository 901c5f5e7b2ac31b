'use client'

import { useFieldArray, useFormContext, useWatch } from 'react-hook-form'
import { Button } from '@/components/ui/button'
import { Empty } from '@/components/ui/notice'
import { newAnimal } from '@/lib/planning/new-plan'
import type { Plan } from '@/lib/schemas/plan'
import { AnimalFields } from './animal-fields'
import { MAX_ANIMALS } from './limits'
import { PartTabs } from './part-tabs'

/** The animals, one in hand at a time. */
export function AnimalsPart({ chosen, onChoose }: { chosen: number; onChoose: (index: number) => void }) {
  const { control, getValues, setValue } = useFormContext<Plan>()
  const { fields, append, remove } = useFieldArray({ control, name: 'animals', keyName: 'rowKey' })
  const [animals, crates] = useWatch({ control, name: ['animals', 'crates'] })
  const index = Math.min(chosen, fields.length - 1)

  const add = () => {
    append(newAnimal(getValues()), { shouldFocus: false })
    onChoose(fields.length)
  }
  const takeOut = () => {
    const id = getValues(`animals.${index}.id`)
    getValues('crates').forEach(({ occupants }, crate) => {
      if (!occupants.includes(id)) return
      setValue(
        `crates.${crate}.occupants`,
        occupants.filter((known) => known !== id),
        { shouldDirty: true },
      )
    })
    remove(index)
    onChoose(Math.max(0, index - 1))
  }

  if (fields.length === 0) {
    return <Empty act={<Button onClick={add}>Add an animal</Button>}>No animal is entered yet.</Empty>
  }
  const current = animals[index]
  return (
    <PartTabs
      label="Animals"
      chosen={index}
      onChoose={onChoose}
      items={animals.map((animal, place) => ({
        key: animal.id,
        path: `animals.${place}`,
        letter: crates.find(({ occupants }) => occupants.includes(animal.id))?.letter,
        words: animal.name || `Animal ${place + 1}`,
      }))}
      acts={
        <>
          {fields.length < MAX_ANIMALS && <Button onClick={add}>Add an animal</Button>}
          <Button onClick={takeOut}>Take out {current?.name || `animal ${index + 1}`}</Button>
        </>
      }
    >
      <AnimalFields key={fields[index]?.rowKey} index={index} />
    </PartTabs>
  )
}
