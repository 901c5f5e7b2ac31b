'use client'

import { useFieldArray, useFormContext, useWatch } from 'react-hook-form'
import { CratePicture } from './crate-picture'
import { SelectField } from '@/components/forms/select-field'
import { Button } from '@/components/ui/button'
import { Empty } from '@/components/ui/notice'
import { newCrate } from '@/lib/planning/new-plan'
import type { Plan } from '@/lib/schemas/plan'
import { CrateFields } from './crate-fields'
import { MAX_CRATES } from './limits'
import { OccupantsField } from './occupants-field'
import { OpeningsTable } from './openings-table'
import { PartTabs } from './part-tabs'
import { usePlanPage } from './plan-context'

/** The crates, one in hand at a time: drawn to scale as typed beside its figures. */
export function CratesPart({ chosen, onChoose }: { chosen: number; onChoose: (index: number) => void }) {
  const { control, getValues } = useFormContext<Plan>()
  const { catalogues, mark } = usePlanPage()
  const { fields, append, remove } = useFieldArray({ control, name: 'crates', keyName: 'rowKey' })
  const [crates, animals] = useWatch({ control, name: ['crates', 'animals'] })
  const index = Math.min(chosen, fields.length - 1)
  const add = (modelId: number | null) => {
    append(newCrate(getValues(), catalogues.crateModels.find(({ id }) => id === modelId) ?? null), {
      shouldFocus: false,
    })
    onChoose(fields.length)
  }
  const adding = fields.length < MAX_CRATES && <AddCrate onAdd={add} />
  if (fields.length === 0) return <Empty act={adding}>No crate is entered yet.</Empty>
  const crate = crates[index]
  return (
    <PartTabs
      label="Crates"
      chosen={index}
      onChoose={onChoose}
      items={crates.map(({ id, letter, occupants }, place) => ({
        key: id,
        path: `crates.${place}`,
        letter,
        words:
          animals
            .filter((animal) => occupants.includes(animal.id))
            .map(({ name }) => name)
            .join(', ') || 'empty',
      }))}
      acts={
        <>
          {adding}
          <Button
            onClick={() => {
              remove(index)
              onChoose(Math.max(0, index - 1))
            }}
          >
            Take out crate {crate?.letter}
          </Button>
        </>
      }
    >
      <div className="grid max-board:divide-y max-board:divide-rule board:grid-cols-[auto_1fr] board:divide-x board:divide-rule [&>*]:min-w-0 [&>*]:px-3.5 [&>*]:py-3">
        <div>{crate && <CratePicture crate={crate} mark={mark} />}</div>
        <div className="flex flex-col gap-3" key={fields[index]?.rowKey}>
          <CrateFields index={index} />
          <OccupantsField index={index} />
          <OpeningsTable index={index} />
        </div>
      </div>
    </PartTabs>
  )
}

/** A crate of a model, or one whose size is typed. */
function AddCrate({ onAdd }: { onAdd: (modelId: number | null) => void }) {
  const { catalogues } = usePlanPage()
  return (
    <span className="flex flex-wrap items-end gap-2">
      <SelectField
        id="plan-add-crate"
        label={<span className="sr-only">Add a crate</span>}
        none="Add a crate of …"
        value=""
        choices={[
          ...catalogues.crateModels.map(({ id, name }) => ({ value: String(id), words: name })),
          { value: 'own', words: 'Own dimensions' },
        ]}
        onChange={({ target: { value } }) => {
          if (value !== '') onAdd(value === 'own' ? null : Number(value))
        }}
      />
    </span>
  )
}
