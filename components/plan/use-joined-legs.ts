'use client'

import { useRef } from 'react'
import { useFormContext } from 'react-hook-form'
import type { Plan, PlanLeg } from '@/lib/schemas/plan'
import { joinedNeighbour } from './leg-edits'

/** Keeps neighbours joined while one end of a leg changes: `remember` before the change, `follow` after it. */
export function useJoinedLegs(index: number, edge: 'start' | 'end') {
  const { getValues, setValue } = useFormContext<Plan>()
  const before = useRef<PlanLeg | null>(null)
  const remember = () => {
    before.current = structuredClone(getValues(`legs.${index}`))
  }
  const follow = () => {
    const legs = getValues('legs')
    const joined = before.current === null ? null : joinedNeighbour(legs, index, edge, before.current)
    remember()
    if (joined === null) return
    for (const [field, value] of Object.entries(joined.change)) {
      setValue(`legs.${joined.index}.${field}` as 'legs.0.startLocal', value as string, { shouldDirty: true })
    }
  }
  return { remember, follow }
}
