'use client'

import { useFormContext, useWatch } from 'react-hook-form'
import { airStart } from '@/lib/planning/spaces'
import type { AirStart } from '@/lib/planning/spaces'
import type { Plan } from '@/lib/schemas/plan'
import { ClimateControlFields } from './climate-control-fields'
import { PlanNumber, PlanTemperature, PlanText } from './plan-fields'
import { WeatherRows } from './weather-rows'

/** A van, a hold or a shed whose air is a state of its own, and the open air round it. */
export function EnclosedFields({ index }: { index: number }) {
  const { control } = useFormContext<Plan>()
  const legs = useWatch({ control, name: 'legs' })
  const base = `legs.${index}.surroundings` as const
  const air = legs[index]?.surroundings
  if (air?.type !== 'enclosed') return null
  const start = airStart(legs, index)
  return (
    <>
      <div className="grid grid-cols-2 gap-2.5 desk:grid-cols-3">
        <PlanNumber path={`${base}.volumeM3`} label="Volume" unit="m³" />
        <PlanNumber path={`${base}.heatTransferWK`} label="Through walls" unit="W/K" />
        <PlanNumber path={`${base}.interiorMassKJK`} label="Inside mass" unit="kJ/K" />
        <PlanNumber path={`${base}.ventilationM3h`} label="Fresh air" unit="m³/h" />
        <PlanNumber path={`${base}.leakageM3h`} label="Leakage" unit="m³/h" />
        <PlanNumber path={`${base}.crateAirSpeedMs`} label="Air at crates" unit="m/s" />
        <PlanNumber path={`${base}.solarApertureM2`} label="Sunlit glass" unit="m²" />
        {start === 'own' && <PlanTemperature path={`${base}.initialAirTempC`} label="Air at start" />}
        <PlanText path={`${base}.spaceName`} label="Space" />
      </div>
      <p className="text-small text-mute">
        {air.ventilationM3h === null && 'Fresh air not known: leakage alone is counted. '}
        {start !== 'own' && `Air at the start: ${START_WORDS[start]} (leg ${index}). `}
        {start === 'own' &&
          air.initialAirTempC === null &&
          'Air at the start not known: the air outside is taken. '}
        Legs that follow one another in a space of the same name share its air.
      </p>
      <ClimateControlFields index={index} />
      <div>
        <p className="mb-1 text-small font-semibold">Outside the space</p>
        <WeatherRows
          base={`${base}.outside`}
          words={`Air outside the space on leg ${index + 1}`}
          reach="closed"
        />
        {air.solarApertureM2 === 0 && (
          <p className="mt-1 text-small text-mute">No sunlit glass: sun on the walls is not counted.</p>
        )}
      </div>
    </>
  )
}

const START_WORDS: Record<Exclude<AirStart, 'own'>, string> = {
  carried: 'carried over in this space',
  flight: 'as the hold was kept in the air',
}
