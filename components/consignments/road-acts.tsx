'use client'

import { deliverSchema, departSchema, stopJourneySchema } from '@/lib/schemas/act'
import { ActDialog } from './act-dialog'
import type { DeskActions } from './acts-bar'
import type { DeskAct } from './status-view'

const INSTEAD = {
  path: 'inPlaceOfDriver',
  label: 'Why you do this in the driver’s place',
  hint: 'For example: the driver rang from the ramp without a signal.',
} as const

/** Departing, delivering and breaking off are a driver's; the desk does them in a driver's place and writes down why. */
export function RoadActs({
  consignmentId,
  mark,
  acts,
  actions,
}: {
  consignmentId: number
  mark: string
  acts: readonly DeskAct[]
  actions: Pick<DeskActions, 'depart' | 'deliver' | 'stop'>
}) {
  const start = { consignmentId, requestId: '', inPlaceOfDriver: '' }
  return (
    <>
      {acts.includes('depart') && (
        <ActDialog
          words="Depart in the driver’s place"
          title={`${mark} departs`}
          schema={departSchema}
          action={actions.depart}
          start={start}
          asks={[INSTEAD]}
          done={`Write down that ${mark} has departed`}
        />
      )}
      {acts.includes('deliver') && (
        <ActDialog
          words="Deliver in the driver’s place"
          title={`${mark} is delivered`}
          schema={deliverSchema}
          action={actions.deliver}
          start={{ ...start, receivedBy: '' }}
          asks={[{ path: 'receivedBy', label: 'Received by' }, INSTEAD]}
          done={`Write down that ${mark} is delivered`}
        />
      )}
      {acts.includes('stop') && (
        <ActDialog
          words="Break the journey off"
          title={`Break off the journey of ${mark}`}
          schema={stopJourneySchema}
          action={actions.stop}
          start={{ ...start, reason: '', whereAnimalsAre: '' }}
          asks={[
            { path: 'reason', label: 'Why the journey is broken off', long: true },
            { path: 'whereAnimalsAre', label: 'Where the animals are' },
            INSTEAD,
          ]}
          done="Break it off"
        >
          <p>The consignment is closed. Moving the animals on is a new one.</p>
        </ActDialog>
      )}
    </>
  )
}
