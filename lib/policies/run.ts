import type { Actor } from './actor'
import type { Line, NoFacts } from './table'

/** What a policy must know of one leg of the revision in force. */
export interface RunLegFacts {
  /** The driver named on the leg; null where none of ours is. */
  driverId: number | null
}

const own = (actor: Actor, facts: RunLegFacts) => facts.driverId !== null && facts.driverId === actor.id

export const runPolicy = {
  'run.list': { driver: true } satisfies Line<NoFacts>,
  'run.read': { driver: own, dispatcher: true, vet: true } satisfies Line<RunLegFacts>,
  'run.enter': { driver: own } satisfies Line<RunLegFacts>,
  'run.hand-over': { driver: own } satisfies Line<RunLegFacts>,
}
