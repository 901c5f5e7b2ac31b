'use client'

import { useRef } from 'react'
import { useFormContext, useWatch } from 'react-hook-form'
import { Radios } from '@/components/forms/ticks'
import { OFFERED_MARK, offeredOpenAir } from '@/lib/planning/offers'
import type { Plan, PlanSurroundings } from '@/lib/schemas/plan'
import { EnclosedFields } from './enclosed-fields'
import { stillOffered, surroundingsOf } from './leg-edits'
import { SURROUNDINGS_OPTIONS } from './option-words'
import { PlanNumber, PlanTemperature } from './plan-fields'
import { WeatherRows } from './weather-rows'
import { planPathId } from './plan-path'

/** What is round the crates on one leg: air held by a machine, open air, or a space with air of its own. */
export function LegSurroundings({ index }: { index: number }) {
  const { control, register, setValue } = useFormContext<Plan>()
  const leg = useWatch({ control, name: `legs.${index}` })
  // What was typed for another kind of surroundings comes back when somebody changes their mind.
  const typed = useRef(new Map<string, PlanSurroundings>())
  if (leg === undefined) return null
  const { type } = leg.surroundings
  const choose = (next: PlanSurroundings['type']) => {
    typed.current.set(`${leg.id} ${type}`, structuredClone(leg.surroundings))
    const kept = typed.current.get(`${leg.id} ${next}`) ?? surroundingsOf(next, leg)
    setValue(`legs.${index}.surroundings`, kept, { shouldDirty: true })
  }
  return (
    <div className="flex flex-col gap-2.5">
      <Radios
        id={planPathId(`legs.${index}.surroundings.type`)}
        label={<span className="sr-only">Surroundings</span>}
        {...register(`legs.${index}.surroundings.type`)}
        inRow
        options={SURROUNDINGS_OPTIONS}
        key={type}
        onChange={(event) => choose(event.target.value as PlanSurroundings['type'])}
      />
      {type === 'controlled' && <ControlledFields index={index} />}
      {type === 'open-air' && (
        <WeatherRows base={`legs.${index}.surroundings`} words={`Weather on leg ${index + 1}`} reach="open" />
      )}
      {type === 'enclosed' && <EnclosedFields index={index} />}
      <Offered words={stillOffered(leg)} />
    </div>
  )
}

function ControlledFields({ index }: { index: number }) {
  const { control, setValue } = useFormContext<Plan>()
  const base = `legs.${index}.surroundings` as const
  const air = useWatch({ control, name: base })
  const outside = air?.type === 'controlled' ? air.outside : null
  return (
    <>
      <div className="grid grid-cols-2 gap-2.5 desk:grid-cols-3">
        <PlanTemperature path={`${base}.airTempC`} label="Air" />
        <PlanNumber path={`${base}.relHumidityPct`} label="Humidity" unit="%" />
        <PlanNumber path={`${base}.airSpeedMs`} label="Air at crates" unit="m/s" />
      </div>
      {outside === null ? (
        <p className="text-small text-mute">
          What lies outside is not given: endurance after a failure stays unknown.{' '}
          <button
            type="button"
            className="link"
            onClick={() => setValue(`${base}.outside`, offeredOpenAir(), { shouldDirty: true })}
          >
            Give the air outside
          </button>
        </p>
      ) : (
        <div>
          <p className="mb-1 flex justify-between text-small">
            <span className="font-semibold">Outside</span>
            <button
              type="button"
              className="link"
              onClick={() => setValue(`${base}.outside`, null, { shouldDirty: true })}
            >
              Take out
            </button>
          </p>
          <WeatherRows base={`${base}.outside`} words={`Air outside on leg ${index + 1}`} reach="held" />
        </div>
      )}
    </>
  )
}

function Offered({ words }: { words: readonly string[] }) {
  if (words.length === 0) return null
  return (
    <p className="border-t border-dotted border-rule pt-1.5 text-small text-mute">
      <span className="font-semibold text-ink">{capital(OFFERED_MARK)}:</span> {words.join(', ')}. Put the
      figures of whoever runs the space or the leg.
    </p>
  )
}

function capital(words: string): string {
  return words.charAt(0).toUpperCase() + words.slice(1)
}
