'use client'

import { useFormContext, useWatch } from 'react-hook-form'
import { BoxedFacts, Fact } from '@/components/ui/boxed-facts'
import { Mark } from '@/components/ui/mark'
import type { Plan } from '@/lib/schemas/plan'
import { dayDate, dayDateYear, duration, localTimeWithOffset } from '@/lib/views/format'
import { useProblems } from './plan-context'
import type { EditedConsignment } from './plan-editor-types'
import { usePlanLegs } from './plan-timeline'

/** What the plan comes to, live: from and to, leaving and arriving on their own clocks, state, and what is missing. */
export function PlanHead({ consignment, nowMs }: { consignment: EditedConsignment | null; nowMs: number }) {
  const { control } = useFormContext<Plan>()
  const [consignor, consignee] = useWatch({ control, name: ['consignor.name', 'consignee.name'] })
  const { timeline } = usePlanLegs()
  const problems = useProblems()
  const { departureMs, departureZone, arrivalMs, arrivalZone } = timeline
  const away = departureMs === null ? null : (departureMs - nowMs) / 60_000
  return (
    <BoxedFacts columns="150px 1.25fr 1.15fr 1fr .9fr 230px">
      <Fact caption="Consignment">
        {consignment === null ? (
          <h1 className="text-section">New consignment</h1>
        ) : (
          <h1>
            <Mark size="l" label="Plan of consignment">
              {consignment.mark}
            </Mark>
          </h1>
        )}
      </Fact>
      <Fact caption="From, to">
        <b className="block">{timeline.legs[0]?.from?.name ?? (consignor || 'not given yet')}</b>
        <b className="block">{timeline.legs.at(-1)?.to?.name ?? (consignee || 'not given yet')}</b>
      </Fact>
      <Fact caption="Leaves">
        {departureMs === null || departureZone === null ? (
          'not given yet'
        ) : (
          <>
            {dayDateYear(departureMs, departureZone)}, {localTimeWithOffset(departureMs, departureZone)}
            <span className="block text-small text-mute">
              {away !== null && away >= 0 ? `${duration(away)} from now` : 'This time is past'}
            </span>
          </>
        )}
      </Fact>
      <Fact caption="Arrives">
        {arrivalMs === null || arrivalZone === null ? (
          'not given yet'
        ) : (
          <>
            {dayDate(arrivalMs, arrivalZone)}, {localTimeWithOffset(arrivalMs, arrivalZone)}
            {departureMs !== null && arrivalMs > departureMs && (
              <span className="block text-small text-mute">
                {duration((arrivalMs - departureMs) / 60_000)} in crate
              </span>
            )}
          </>
        )}
      </Fact>
      <Fact caption="State">
        <b>{consignment?.stateWords ?? 'Not saved'}</b>
        {consignment && <>, revision {consignment.revision}</>}
        {consignment?.inForceRevision != null && (
          <span className="block text-small text-mute">
            Revision {consignment.inForceRevision} is in force
          </span>
        )}
      </Fact>
      <Fact caption="Verdict">
        {consignment?.verdictWords ?? 'Not assessed'}
        <span className="block text-small">
          {problems.length === 0
            ? 'Can be assessed'
            : `${problems.length} ${problems.length === 1 ? 'thing' : 'things'} to put right first`}
        </span>
      </Fact>
    </BoxedFacts>
  )
}
