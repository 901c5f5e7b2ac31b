'use client'

import { useFormContext, useWatch } from 'react-hook-form'
import { wearsCoat } from '@/lib/planning/coats'
import type { Plan } from '@/lib/schemas/plan'
import { figure } from '@/lib/views/format'
import { FLAG_OPTIONS, SEX_OPTIONS, TEMPERAMENT_OPTIONS } from './option-words'
import { usePlanPage } from './plan-context'
import { PlanNumber, PlanSelect, PlanText, PlanTick, PlanTicks } from './plan-fields'
import { PlanLocalTime } from './plan-local-time'

/** One animal, or several alike in one box. */
export function AnimalFields({ index }: { index: number }) {
  const { control } = useFormContext<Plan>()
  const { catalogues } = usePlanPage()
  const at = <F extends keyof Plan['animals'][number]>(field: F) => `animals.${index}.${field}` as const
  const profileKey = useWatch({ control, name: `animals.${index}.profileKey` })
  const species = catalogues.species.find(({ key }) => key === profileKey)
  const massHint =
    species &&
    `${figure(species.values.massMinKg, 2)} to ${figure(species.values.massMaxKg, 2)} kg for this species`
  const coated = species === undefined || wearsCoat(species.values)
  return (
    <div className="grid max-board:divide-y max-board:divide-rule board:grid-cols-3 board:divide-x board:divide-rule [&>*]:px-3.5 [&>*]:pb-3.5 [&>*]:pt-2.5">
      <div className="flex flex-col gap-2.5">
        <div className="grid grid-cols-[1fr_6rem] gap-2.5">
          <PlanText path={at('name')} label="Name or tag" />
          <PlanNumber path={at('count')} label="How many" unit="" />
        </div>
        <PlanSelect
          path={at('profileKey')}
          label="Species"
          none="Not chosen"
          choices={catalogues.species.map(({ key, commonName }) => ({ value: key, words: commonName }))}
        />
        <PlanText path={at('breedNote')} label="Breed" />
        <PlanText path={at('identification')} label="Identification" hint="Microchip, ring or ear tag." />
        <div className="grid grid-cols-2 gap-2.5">
          <PlanSelect path={at('sex')} label="Sex" choices={SEX_OPTIONS} />
          <PlanNumber path={at('ageDays')} label="Age" unit="days" />
        </div>
      </div>
      <div className="flex flex-col gap-2.5">
        <PlanNumber path={at('massKg')} label="Mass, each" unit="kg" hint={massHint} />
        <div className="grid grid-cols-2 gap-2.5">
          {coated && <PlanNumber path={`animals.${index}.coat.depthMm`} label="Coat depth" unit="mm" />}
          <PlanNumber
            path={`animals.${index}.coat.wetPct`}
            label={coated ? 'Coat wet' : 'Skin wet'}
            unit="%"
          />
        </div>
        {coated && <PlanTick path={`animals.${index}.coat.clipped`} label="Coat clipped" />}
        <PlanSelect path={at('temperament')} label="Temperament" choices={TEMPERAMENT_OPTIONS} />
        <PlanTick path={at('crateTrained')} label="Crate-trained" />
        <PlanTicks path={at('flags')} label="What makes it susceptible" choices={FLAG_OPTIONS} />
      </div>
      <div className="flex flex-col gap-2.5">
        <PlanText path={at('medicines')} label="Medicines" hint="Drug, dose, time, prescriber." />
        <PlanText path={at('examinedOn')} label="Examined on" type="date" className="max-w-[12rem]" />
        <PlanText path={at('examinedBy')} label="Examined by" />
        <PlanLocalTime path={at('lastFedLocal')} label="Last fed" />
        <PlanLocalTime path={at('lastWateredLocal')} label="Last watered" />
      </div>
    </div>
  )
}
