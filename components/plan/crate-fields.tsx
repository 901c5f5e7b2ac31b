'use client'

import { useFormContext, useWatch } from 'react-hook-form'
import { SelectField } from '@/components/forms/select-field'
import type { Plan } from '@/lib/schemas/plan'
import { BEDDING_OPTIONS, FLOOR_OPTIONS, FORM_OPTIONS, ONTO_OPTIONS, WALL_OPTIONS } from './option-words'
import { usePlanPage } from './plan-context'
import { PlanNumber, PlanSelect, useFieldError } from './plan-fields'
import { planPathId } from './plan-path'

/** Size, walls, floor, bedding and water of one crate. */
export function CrateFields({ index }: { index: number }) {
  const { control } = useFormContext<Plan>()
  const bedding = useWatch({ control, name: `crates.${index}.bedding.material` })
  const at = <F extends keyof Plan['crates'][number]>(field: F) => `crates.${index}.${field}` as const
  return (
    <div className="flex flex-col gap-2.5">
      <div className="grid grid-cols-2 gap-2.5 desk:grid-cols-[1.7fr_1.3fr_1fr_1fr_1fr]">
        <div className="max-desk:col-span-2">
          <ModelField index={index} />
        </div>
        <PlanSelect path={at('form')} label="Form" choices={FORM_OPTIONS} />
        <PlanNumber path={at('lengthCm')} label="Long, inside" unit="cm" />
        <PlanNumber path={at('widthCm')} label="Wide" unit="cm" />
        <PlanNumber path={at('heightCm')} label="High" unit="cm" />
      </div>
      <div className="grid grid-cols-2 gap-2.5 desk:grid-cols-6">
        <PlanSelect path={at('wallMaterial')} label="Wall" choices={WALL_OPTIONS} />
        <PlanNumber path={at('wallThicknessMm')} label="Thick" unit="mm" />
        <PlanNumber path={at('rimMm')} label="Rim" unit="mm" />
        <PlanSelect path={at('floorMaterial')} label="Floor" choices={FLOOR_OPTIONS} />
        <PlanNumber path={at('floorThicknessMm')} label="Floor thick" unit="mm" />
        <PlanSelect path={at('floorOnto')} label="Floor stands" choices={ONTO_OPTIONS} />
      </div>
      <div className="grid grid-cols-2 gap-2.5 desk:grid-cols-4">
        <PlanSelect path={`crates.${index}.bedding.material`} label="Bedding" choices={BEDDING_OPTIONS} />
        {bedding !== 'none' && (
          <>
            <PlanNumber path={`crates.${index}.bedding.depthMm`} label="Deep" unit="mm" />
            <PlanNumber path={`crates.${index}.bedding.wetPct`} label="Wet" unit="%" />
          </>
        )}
        <PlanNumber path={at('waterContainerL')} label="Water" unit="L" />
      </div>
    </div>
  )
}

/** Choosing a model puts its whole set-up in; changing a figure afterwards leaves the model's name standing. */
function ModelField({ index }: { index: number }) {
  const { register, getValues, setValue } = useFormContext<Plan>()
  const { catalogues } = usePlanPage()
  const path = `crates.${index}.crateModelId` as const
  const setValueAs = (value: unknown) => (value === '' || value === null ? null : Number(value))
  const field = register(path, { setValueAs })
  const put = (id: number | null) => {
    const model = catalogues.crateModels.find((row) => row.id === id)
    if (model === undefined) return
    const { id: crateId, letter, occupants } = getValues(`crates.${index}`)
    const made = structuredClone(model.plan)
    setValue(
      `crates.${index}`,
      { ...made, id: crateId, letter, occupants, crateModelId: model.id },
      { shouldDirty: true },
    )
  }
  return (
    <SelectField
      {...field}
      id={planPathId(path)}
      label="Crate model"
      none="Own dimensions"
      error={useFieldError(path)}
      choices={catalogues.crateModels.map(({ id, name }) => ({ value: String(id), words: name }))}
      onChange={(event) => {
        void field.onChange(event)
        put(setValueAs(event.target.value))
      }}
    />
  )
}
