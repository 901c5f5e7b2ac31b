'use client'

import { useFormContext, useWatch } from 'react-hook-form'
import { Tick } from '@/components/forms/ticks'
import { controlOf } from '@/lib/planning/climate-control'
import type { Control } from '@/lib/planning/climate-control'
import type { Plan } from '@/lib/schemas/plan'
import { PlanNumber, PlanTemperature, PlanText } from './plan-fields'
import { WeatherRows } from './weather-rows'
import { planPathId } from './plan-path'

/** A van, a hold or a shed whose air is a state of its own, and the open air round it. */
export function EnclosedFields({ index }: { index: number }) {
  const base = `legs.${index}.surroundings` as const
  return (
    <>
      <div className="grid grid-cols-3 gap-2.5">
        <PlanNumber path={`${base}.volumeM3`} label="Volume" unit="m³" />
        <PlanNumber path={`${base}.heatTransferWK`} label="Through walls" unit="W/K" />
        <PlanNumber path={`${base}.interiorMassKJK`} label="Inside mass" unit="kJ/K" />
        <PlanNumber path={`${base}.ventilationM3h`} label="Fresh air" unit="m³/h" />
        <PlanNumber path={`${base}.leakageM3h`} label="Leakage" unit="m³/h" />
        <PlanNumber path={`${base}.crateAirSpeedMs`} label="Air at crates" unit="m/s" />
        <PlanNumber path={`${base}.solarApertureM2`} label="Sunlit glass" unit="m²" />
        <PlanTemperature path={`${base}.initialAirTempC`} label="Air at start" />
        <PlanText path={`${base}.spaceName`} label="Space" />
      </div>
      <FreshAir index={index} />
      <Conditioning index={index} />
      <div>
        <p className="mb-1 text-small font-semibold">Outside the space</p>
        <WeatherRows base={`${base}.outside`} words={`Air outside the space on leg ${index + 1}`} />
      </div>
    </>
  )
}

const CONTROL_WORDS: Record<Control, string> = {
  both: 'Watts the machine gives on such a day. Too few and the air leaves its set-point: the assessment shows it.',
  cooling: 'It can only cool: the space is as cold as it gets without.',
  heating: 'It can only heat: the space is as hot as it gets without.',
  none: 'Put the watts the machine gives on such a day, 0 where it can’t. Ask whoever runs it: none is guessed.',
}

function FreshAir({ index }: { index: number }) {
  const { control } = useFormContext<Plan>()
  const air = useWatch({ control, name: `legs.${index}.surroundings` })
  if (air?.type !== 'enclosed') return null
  return (
    <p className="text-small text-mute">
      {air.ventilationM3h === null ? 'Fresh air not known: leakage alone is counted. ' : ''}
      {air.initialAirTempC === null ? 'Air at the start not known: the air outside is taken. ' : ''}
      Legs that follow one another in a space of the same name share its air.
    </p>
  )
}

function Conditioning({ index }: { index: number }) {
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
          <div className="grid grid-cols-3 gap-2.5">
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
