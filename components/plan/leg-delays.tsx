'use client'

import { useFieldArray, useFormContext } from 'react-hook-form'
import type { Plan } from '@/lib/schemas/plan'
import { STOP_OPTIONS } from './option-words'
import { PlanNumber, PlanSelect, PlanTick } from './plan-fields'

/** Delay allowed on one leg, and the stops planned on it. */
export function LegDelays({ index, rest }: { index: number; rest: boolean }) {
  return (
    <div className="flex flex-col gap-2.5">
      <div className="grid grid-cols-2 gap-2.5">
        <PlanNumber path={`legs.${index}.delayTypicalMin`} label="Delay, typical" unit="min" />
        <PlanNumber path={`legs.${index}.delayWorstMin`} label="Delay, worst" unit="min" />
      </div>
      {rest && (
        <PlanTick
          path={`legs.${index}.outOfCrate`}
          label="Animals leave the crate"
          hint="Water, rest and body state start again from here."
        />
      )}
      <Stops index={index} />
    </div>
  )
}

function Stops({ index }: { index: number }) {
  const { control, getValues } = useFormContext<Plan>()
  const { fields, append, remove } = useFieldArray({
    control,
    name: `legs.${index}.stops`,
    keyName: 'rowKey',
  })
  const add = (kind: Plan['legs'][number]['stops'][number]['kind']) => {
    const last = getValues(`legs.${index}.stops`).at(-1)?.minute
    append({ kind, minute: typeof last === 'number' ? last : 0 })
  }
  return (
    <fieldset>
      <legend className="font-head text-body font-bold">Planned stops on this leg</legend>
      {fields.length === 0 && <p className="text-small text-mute">None planned.</p>}
      {fields.map((field, row) => (
        <div
          key={field.rowKey}
          className="grid grid-cols-[1fr_6.25rem_auto] items-end gap-1.5 border-t border-hair py-1.5"
        >
          <PlanSelect
            path={`legs.${index}.stops.${row}.kind`}
            label={<span className={row === 0 ? '' : 'sr-only'}>What for</span>}
            choices={STOP_OPTIONS}
          />
          <PlanNumber
            path={`legs.${index}.stops.${row}.minute`}
            label={<span className={row === 0 ? '' : 'sr-only'}>Into the leg</span>}
            unit="min"
          />
          <button
            type="button"
            className="link pb-1.5 text-small max-desk:min-h-11"
            onClick={() => remove(row)}
          >
            Out<span className="sr-only">: take out stop {row + 1}</span>
          </button>
        </div>
      ))}
      <p className="mt-1.5 flex flex-wrap gap-x-4 gap-y-1 text-small">
        {STOP_OPTIONS.map(({ value, words }) => (
          <button key={value} type="button" className="link max-desk:min-h-11" onClick={() => add(value)}>
            Add {words.toLowerCase()}
          </button>
        ))}
      </p>
    </fieldset>
  )
}
