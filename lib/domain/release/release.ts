import 'server-only'
import { SteadfoldError } from '@/lib/errors'
import type { Actor } from '@/lib/policies/actor'
import type { ConsignmentAct } from '@/lib/schemas/act'
import { nextState } from '@/lib/states/consignment'
import { act } from '../act'
import type { Done } from '../act'
import { authorize } from '../authorize'
import { currentAssessment } from '../consignments/current-assessment'
import { wrongState } from '../consignments/move'
import { findConsignment } from '../consignments/visible'
import { enqueue } from '../jobs/queue'
import { releaseObstacles } from './obstacles'

/** What the worker needs to make the papers of a release. */
export interface ReleasePayload {
  consignmentId: number
  revision: number
  planHash: string
  actorId: number
  [more: string]: unknown
}

/**
 * Asks for a release: everything is checked now, the papers are rendered and sealed by the worker, and when they are
 * recorded everything is checked again. Refused with every obstacle at once.
 */
export function releaseConsignment(
  actor: Actor,
  input: ConsignmentAct,
  now: Date,
): Promise<{ releasing: true }> {
  const { consignmentId, requestId } = input
  const about = { type: 'consignment', id: consignmentId, consignmentId } as const
  return act(
    { actor, verb: 'consignment.release', requestId, now, about },
    async (tx): Promise<Done<{ releasing: true }>> => {
      const { row, facts } = await findConsignment(actor, consignmentId, { tx, lock: true })
      authorize(actor, 'consignment.release', facts)
      if (nextState(row.state, 'release') === undefined) throw wrongState(row.state, 'release')
      const current = await currentAssessment(tx, row)
      const obstacles = await releaseObstacles(tx, row, current, now)
      if (obstacles.length > 0) throw notYet(obstacles)
      const planHash = current.assessment.planHash
      const payload: ReleasePayload = { consignmentId, revision: row.revision, planHash, actorId: actor.id }
      const dedupeKey = `release:${consignmentId}:${row.revision}:${planHash.slice(0, 16)}`
      await enqueue(tx, { kind: 'release', payload, dedupeKey, runAfter: now })
      return { result: { releasing: true }, after: payload, note: 'Asked for; the papers are being made.' }
    },
  )
}

/** The refusal that carries every obstacle. */
export function notYet(issues: SteadfoldError['issues']): SteadfoldError {
  const things = issues.length === 1 ? '1 thing stands' : `${issues.length} things stand`
  return new SteadfoldError('refused', `This cannot be released yet: ${things} in the way.`, { issues })
}
