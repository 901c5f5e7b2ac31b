import { nextState } from '@/lib/states/consignment'
import type { ConsignmentMove, ConsignmentState } from '@/lib/states/consignment'
import type { Actor } from './actor'
import { can } from './can'
import type { Verb } from './can'
import type { ConsignmentFacts } from './consignment'

/** Where a consignment stands: its working revision, and the one that travels. */
export interface Standing {
  state: ConsignmentState
  inForceState: 'released' | 'under_way' | 'delivered' | 'stopped' | null
}

export type Act = Extract<
  ConsignmentMove,
  'save' | 'assess' | 'submit' | 'release' | 'depart' | 'deliver' | 'stop' | 'cancel'
>

const VERB: Record<Act, Extract<Verb, `consignment.${string}`>> = {
  save: 'consignment.save',
  assess: 'consignment.assess',
  submit: 'consignment.submit',
  release: 'consignment.release',
  depart: 'consignment.depart',
  deliver: 'consignment.deliver',
  stop: 'consignment.stop',
  cancel: 'consignment.cancel',
}

/** The road acts on the revision in force, the desk on the one being worked on. */
const ON_THE_ROAD: readonly Act[] = ['depart', 'deliver', 'stop']

/**
 * What the actor may do with this consignment now, by policy and by state: which buttons a page shows. The verb asks both
 * again, and what only the record can tell (an assessment out of date, air too old) it alone knows.
 */
export function actsNow(actor: Actor, facts: ConsignmentFacts, standing: Standing): Act[] {
  return (Object.keys(VERB) as Act[]).filter((act) => {
    if (!can(actor, VERB[act], facts as never)) return false
    if (ON_THE_ROAD.includes(act)) {
      return standing.inForceState !== null && nextState(standing.inForceState, act) !== undefined
    }
    const travelling = standing.inForceState !== null && standing.inForceState !== 'released'
    return !travelling && nextState(standing.state, act) !== undefined
  })
}
