import type { Actor } from './actor'
import { line } from './table'
import type { NoFacts } from './table'

/** What a policy must know of one leg of the revision in force. */
export interface RunLegFacts {
  /** The driver named on the leg; null where none of ours is. */
  driverId: number | null
}

const own = (actor: Actor, facts: RunLegFacts) => facts.driverId !== null && facts.driverId === actor.id

export const runPolicy = {
  'run.list': line<NoFacts>({ driver: true }),
  'run.enter': line<RunLegFacts>({ driver: own }),
  'run.hand-over': line<RunLegFacts>({ driver: own }),
}
