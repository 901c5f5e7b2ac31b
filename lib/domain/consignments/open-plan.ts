import 'server-only'
import type { Actor } from '@/lib/policies/actor'
import type { Plan } from '@/lib/schemas/plan'
import { nextState } from '@/lib/states/consignment'
import type { ConsignmentState } from '@/lib/states/consignment'
import type { Verdict } from '@/lib/rules/result'
import { authorize } from '../authorize'
import { readPlan } from './read-plan'
import { findConsignment } from './visible'

export interface OpenPlan {
  id: number
  mark: string
  state: ConsignmentState
  revision: number
  /** To be sent with the save. */
  version: number
  inForceRevision: number | null
  verdict: Verdict | null
  outOfDate: boolean
  /** False once the journey has begun or is closed: the plan can then only be read. */
  editable: boolean
  plan: Plan
}

/** The working plan of a consignment, opened for typing, with the version its save must name. */
export async function openPlan(actor: Actor, consignmentId: number): Promise<OpenPlan> {
  const { row, facts } = await findConsignment(actor, consignmentId)
  authorize(actor, 'consignment.save', facts)
  return {
    id: row.id,
    mark: row.mark,
    state: row.state,
    revision: row.revision,
    version: row.version,
    inForceRevision: row.inForceRevision,
    verdict: row.verdict,
    outOfDate: row.outOfDate,
    editable: nextState(row.state, 'save') !== undefined,
    plan: await readPlan(row),
  }
}
