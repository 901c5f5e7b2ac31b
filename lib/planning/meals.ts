import type { PlanAnimal } from '@/lib/schemas/plan'
import { resolveLocalTime } from './local-time'
import type { ResolvedTime } from './local-time'
import type { Timeline } from './timeline'

/** A last meal or drink before departure, told on the clock of the place the journey leaves from. */
export type LastTime = 'lastFedLocal' | 'lastWateredLocal'

/** How far back a last meal and a last drink are still counted. A longer time is a slip of the pen, or a starved animal. */
export const COUNTED_BACK_HOURS: Record<LastTime, number> = { lastFedLocal: 240, lastWateredLocal: 168 }

/**
 * When an animal last ate or drank. Where the clock shows that hour twice the earlier one is taken: longer without is the
 * careful side.
 */
export function lastTime(animal: PlanAnimal, field: LastTime, timeline: Timeline): ResolvedTime {
  const time = resolveLocalTime(animal[field], timeline.departureZone ?? '', null)
  const earlier = time.kind === 'doubled' ? time.choices[0] : undefined
  return earlier === undefined
    ? time
    : { kind: 'instant', instantMs: earlier.instantMs, offsetMin: earlier.offsetMin }
}
