'use client'

import { useFormContext, useWatch } from 'react-hook-form'
import type { Plan } from '@/lib/schemas/plan'
import { usePlanPage } from './plan-context'
import { PlanRecordSelect, PlanText, PlanTextArea, PlanTick } from './plan-fields'

/** Who is in charge of one leg, who of ours stands there, and where the animals go if it cannot go on. */
export function LegCharge({ index }: { index: number }) {
  const { control, setValue } = useFormContext<Plan>()
  const { catalogues } = usePlanPage()
  const attended = useWatch({ control, name: `legs.${index}.attended` })
  const party = useWatch({ control, name: `legs.${index}.partyInCharge` })
  return (
    <div className="flex flex-col gap-2.5">
      <PlanText path={`legs.${index}.partyInCharge`} label="Party in charge" />
      <div className="grid grid-cols-[1.4fr_1fr] gap-2.5 max-desk:grid-cols-1">
        <PlanText path={`legs.${index}.partyTelephone`} label="Telephone" type="tel" />
        <PlanText path={`legs.${index}.partyHours`} label="Hours" />
      </div>
      <PlanTick path={`legs.${index}.attended`} label="One of ours stands beside the crates" />
      {attended ? (
        <PlanRecordSelect
          path={`legs.${index}.driverId`}
          label="Who of ours"
          records={catalogues.drivers}
          none="Nobody named"
        />
      ) : (
        <p className="text-small text-mute">
          None of ours: a condition counts here only when {party || 'the party in charge'} has confirmed it.
          <StaleDriver
            index={index}
            onClear={() => setValue(`legs.${index}.driverId`, null, { shouldDirty: true })}
          />
        </p>
      )}
      <PlanText path={`legs.${index}.lastPointOfReturn`} label="Last point of return" />
      <PlanText path={`legs.${index}.fallback`} label="Fallback kennel or vet, with hours" />
      <PlanTextArea path={`legs.${index}.note`} label="Note for this leg" rows={2} />
    </div>
  )
}

/** A name left over from before nobody of ours was to be there. */
function StaleDriver({ index, onClear }: { index: number; onClear: () => void }) {
  const { control } = useFormContext<Plan>()
  const { catalogues } = usePlanPage()
  const driverId = useWatch({ control, name: `legs.${index}.driverId` })
  const driver = catalogues.drivers.find(({ id }) => id === driverId)
  if (driver === undefined) return null
  return (
    <>
      {' '}
      {driver.name} is still named.{' '}
      <button type="button" className="link" onClick={onClear}>
        Take the name off
      </button>
    </>
  )
}
