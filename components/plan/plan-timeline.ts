'use client'

import { useMemo } from 'react'
import { useFormContext, useWatch } from 'react-hook-form'
import { timelineOf } from '@/lib/planning/timeline'
import type { Timeline } from '@/lib/planning/timeline'
import type { Plan, PlanLeg } from '@/lib/schemas/plan'
import { usePlanPage } from './plan-context'

/** The legs as they stand in the form, each on the clocks of its two places. */
export function usePlanLegs(): { legs: readonly PlanLeg[]; timeline: Timeline } {
  const { control } = useFormContext<Plan>()
  const { catalogues } = usePlanPage()
  const legs = useWatch({ control, name: 'legs' })
  const timeline = useMemo(() => timelineOf({ legs }, catalogues.places), [legs, catalogues.places])
  return { legs, timeline }
}
