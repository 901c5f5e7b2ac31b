'use client'

import { useFormContext } from 'react-hook-form'
import { offeredLeg } from '@/lib/planning/offers'
import { hourMin, localTime } from '@/lib/views/format'
import type { Plan, PlanLeg } from '@/lib/schemas/plan'
import { SelectField } from '@/components/forms/select-field'
import { surroundingsUntouched } from './leg-edits'
import { LegTimeField } from './leg-time-field'
import { PHASE_WORDS, SINGLE_LEG_KINDS } from './option-words'
import { usePlanPage } from './plan-context'
import { PlanNumber, PlanRecordSelect, PlanText } from './plan-fields'
import { usePlanLegs } from './plan-timeline'
import { useJoinedLegs } from './use-joined-legs'
import { planPathId } from './plan-path'

/** Kind, places, carrier and times of one leg. */
export function LegJourney({ index }: { index: number }) {
  const { catalogues } = usePlanPage()
  const from = useJoinedLegs(index, 'start')
  const to = useJoinedLegs(index, 'end')
  return (
    <div className="flex flex-col gap-2.5">
      <div className="grid grid-cols-2 gap-2.5">
        <KindField index={index} />
        <PlanNumber path={`legs.${index}.pressureKPa`} label="Pressure" unit="kPa" />
      </div>
      <div onFocus={from.remember}>
        <PlanRecordSelect
          path={`legs.${index}.fromPlaceId`}
          label="From"
          records={catalogues.places}
          onChosen={from.follow}
        />
      </div>
      <div onFocus={to.remember}>
        <PlanRecordSelect
          path={`legs.${index}.toPlaceId`}
          label="To"
          records={catalogues.places}
          onChosen={to.follow}
        />
      </div>
      <div className="grid grid-cols-[1.4fr_1fr] gap-2.5">
        <PlanText path={`legs.${index}.carrier`} label="Carrier" />
        <PlanText path={`legs.${index}.serviceNumber`} label="Number" />
      </div>
      <LegTimeField index={index} edge="start" label="Start, local" />
      <LegTimeField index={index} edge="end" label="End, local" />
      <LegClock index={index} />
    </div>
  )
}

/** A flight's legs keep their part; any other leg may change its kind, and brings new surroundings if nobody typed any. */
function KindField({ index }: { index: number }) {
  const { register, getValues, setValue } = useFormContext<Plan>()
  const { legs } = usePlanLegs()
  const leg = legs[index]
  if (leg === undefined) return null
  const path = `legs.${index}.kind` as const
  if (leg.kind === 'flight') {
    return (
      <div>
        <span className="text-small font-semibold">Part of the flight</span>
        <p className="pt-1">{leg.flightPhase === null ? 'Flight' : PHASE_WORDS[leg.flightPhase]}</p>
      </div>
    )
  }
  const field = register(path)
  return (
    <SelectField
      {...field}
      id={planPathId(path)}
      label="Kind"
      choices={SINGLE_LEG_KINDS}
      onChange={(event) => {
        const before = structuredClone(getValues(`legs.${index}`))
        void field.onChange(event)
        if (surroundingsUntouched(before)) putOffered(event.target.value as PlanLeg['kind'])
      }}
    />
  )

  function putOffered(kind: PlanLeg['kind']) {
    const { surroundings, pressureKPa, delayTypicalMin, delayWorstMin } = offeredLeg(kind, null)
    const options = { shouldDirty: true }
    setValue(`legs.${index}.surroundings`, surroundings, options)
    setValue(`legs.${index}.pressureKPa`, pressureKPa, options)
    setValue(`legs.${index}.delayTypicalMin`, delayTypicalMin, options)
    setValue(`legs.${index}.delayWorstMin`, delayWorstMin, options)
  }
}

/** The leg on the clock where the journey began, and how long it lasts. */
function LegClock({ index }: { index: number }) {
  const { timeline } = usePlanLegs()
  const leg = timeline.legs[index]
  if (leg === undefined || leg.startMs === null || leg.endMs === null) return null
  const zone = timeline.departureZone ?? 'UTC'
  return (
    <p className="text-small text-mute">
      {localTime(leg.startMs, zone)} to {localTime(leg.endMs, zone)} where the journey began,{' '}
      {hourMin((leg.endMs - leg.startMs) / 60_000)}&nbsp;h:min
    </p>
  )
}
