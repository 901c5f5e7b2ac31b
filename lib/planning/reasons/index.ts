import type { Plan, PlanPlace } from '@/lib/schemas/plan'
import { timelineOf } from '../timeline'
import { airReasons } from './air'
import { animalReasons } from './animals'
import { crateReasons } from './crates'
import { legReasons } from './legs'
import { paperReasons } from './paper'
import { reason } from './reason'
import type { ProfileInForce, Reason } from './reason'

export type { ProfileInForce, Reason } from './reason'

export interface PlanningKnowledge {
  places: readonly PlanPlace[]
  /** The species rows in force, one per key. */
  profiles: readonly ProfileInForce[]
}

/**
 * Every reason why a plan cannot be assessed, all at once and in the order of the page; none means it can. Each names its
 * place in the plan ("legs.2.surroundings.airTempC") and says one sentence.
 */
export function reasonsNotAssessable(plan: Plan, { places, profiles }: PlanningKnowledge): Reason[] {
  const timeline = timelineOf(plan, places)
  return [
    ...partyReasons(plan),
    ...animalReasons(plan, profiles, timeline),
    ...crateReasons(plan),
    ...legReasons(plan, timeline),
    ...airReasons(plan),
    ...paperReasons(plan, timeline),
  ]
}

function partyReasons(plan: Plan): Reason[] {
  const reasons: Reason[] = []
  if (plan.consignor.name === '') reasons.push(reason('consignor.name', 'The consignor has no name.'))
  if (plan.consignee.name === '') reasons.push(reason('consignee.name', 'The consignee has no name.'))
  if (plan.emergencyContact.name === '') {
    reasons.push(reason('emergencyContact.name', 'Nobody is named for emergencies.'))
  }
  if (plan.emergencyContact.telephone === '') {
    reasons.push(reason('emergencyContact.telephone', 'The emergency contact has no telephone.'))
  }
  return reasons
}
