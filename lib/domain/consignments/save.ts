import 'server-only'
import type { Transaction } from 'sequelize'
import { SteadfoldError } from '@/lib/errors'
import { timelineOf } from '@/lib/planning/timeline'
import type { Actor } from '@/lib/policies/actor'
import type { Plan, SavePlan } from '@/lib/schemas/plan'
import { nextState } from '@/lib/states/consignment'
import type { ConsignmentState } from '@/lib/states/consignment'
import { models } from '@/models'
import type { Consignment } from '@/models'
import { act } from '../act'
import type { Done } from '../act'
import { standingApprovals, voidApprovals } from '../approvals/void'
import { authorize } from '../authorize'
import { planningKnowledge } from '../catalogue/knowledge'
import { boardFigures, writeWords } from './board-figures'
import { checkReferences } from './check-references'
import { createConsignment } from './create'
import { judgePlan } from './judge-plan'
import { HOLDER_OF, wrongState } from './move'
import { readPlan } from './read-plan'
import { findConsignment } from './visible'
import { writePlan } from './write-plan'

export interface SavedPlan {
  consignmentId: number
  mark: string
  /** To be sent with the next save. */
  version: number
  revision: number
  state: ConsignmentState
  /** What this save voided, as one sentence; null where nothing was. */
  voided: string | null
}

/** Both versions of a plan that two people changed at once: the details of the `conflict` error. */
export interface PlanConflict {
  yours: Plan
  meanwhile: {
    plan: Plan
    /** To be sent with the next save, once both were looked at. */
    version: number
    by: string
    atMs: number
  }
}

/**
 * Saves a plan. The version that was opened goes with it: a second editor's save is refused with both versions, and
 * nothing is overwritten. A save of a released plan starts the next revision while the released one stays in force. A
 * changed plan hash voids what was signed for this revision, and its vets and the desk get a mail; an unchanged one (a
 * telephone, a driver, a note) leaves assessment, review and approvals as they are.
 */
export function saveConsignment(actor: Actor, input: SavePlan, now: Date): Promise<SavedPlan> {
  const { consignmentId, requestId, plan } = input
  if (consignmentId === null) return createConsignment(actor, { requestId, plan }, now)
  const about = { type: 'consignment', id: consignmentId, consignmentId } as const
  return act(
    { actor, verb: 'consignment.save', requestId, now, about },
    async (tx): Promise<Done<SavedPlan>> => {
      const { row, facts } = await findConsignment(actor, consignmentId, { tx, lock: true })
      authorize(actor, 'consignment.save', facts)
      if (nextState(row.state, 'save') === undefined) throw wrongState(row.state, 'save')
      if (row.version !== input.version) throw await conflict(tx, row, plan)

      const { shipperName } = await checkReferences(tx, plan)
      const knowledge = await planningKnowledge(plan, tx)
      const timeline = timelineOf(plan, knowledge.places)
      const judged = judgePlan(plan, row.mark, knowledge)
      const planHash = judged.assessable ? judged.planHash : null
      const step = nextRevision(row, planHash)
      const before = {
        version: row.version,
        revision: row.revision,
        state: row.state,
        planHash: row.planHash,
      }

      const [count] = await models.Consignment.update(
        {
          ...boardFigures(plan, timeline, knowledge),
          ...step,
          version: row.version + 1,
          planHash,
          holder: HOLDER_OF[step.state],
          shipperId: plan.shipperId,
          purpose: plan.purpose,
          parties: {
            consignor: plan.consignor,
            consignee: plan.consignee,
            emergencyContact: plan.emergencyContact,
          },
          handlingNote: plan.handlingNote,
        },
        { where: { id: row.id, version: row.version, state: row.state }, transaction: tx },
      )
      if (count === 0) throw await conflict(tx, row, plan)
      const changed = planHash === null || planHash !== before.planHash
      if (changed) await supersedeRunning(tx, row.id)
      const own = changed && step.revision === before.revision
      const voided = own ? await endApprovals(tx, row, { by: actor.name, key: requestId, now }) : null
      await writePlan(tx, row.id, plan, timeline, { at: now, by: actor.id })
      await writeWords(tx, row.id, plan, { mark: row.mark, shipperName, timeline })
      return {
        result: {
          consignmentId: row.id,
          mark: row.mark,
          version: row.version + 1,
          revision: step.revision,
          state: step.state,
          voided,
        },
        consignmentId: row.id,
        before,
        after: { version: row.version + 1, ...step, planHash },
        note: voided ?? '',
      }
    },
  )
}

type NextRevision = { state: ConsignmentState; revision: number; outOfDate: boolean } & Partial<NoFigures>
type NoFigures = Record<
  'assessmentId' | 'verdict' | 'deciding' | 'marginMin' | 'marginOutsideAirC' | 'marginBodyC',
  null
>

/** State and revision after the save, and what becomes of the figures of the last assessment. */
function nextRevision(row: Consignment, planHash: string | null): NextRevision {
  if (row.state === 'released') {
    return {
      state: 'draft',
      revision: row.revision + 1,
      assessmentId: null,
      outOfDate: false,
      verdict: null,
      deciding: null,
      marginMin: null,
      marginOutsideAirC: null,
      marginBodyC: null,
    }
  }
  const unchanged = planHash !== null && planHash === row.planHash
  return {
    state: unchanged && row.state !== 'returned' ? row.state : 'draft',
    revision: row.revision,
    outOfDate: unchanged ? row.outOfDate : row.assessmentId !== null,
  }
}

/** An assessment still running is of a plan that is no more. */
async function supersedeRunning(tx: Transaction, consignmentId: number) {
  await models.Assessment.update(
    { status: 'superseded' },
    { where: { consignmentId, status: ['queued', 'running'] }, transaction: tx },
  )
}

async function endApprovals(
  tx: Transaction,
  row: Consignment,
  { by, key, now }: { by: string; key: string; now: Date },
): Promise<string | null> {
  const signed = await standingApprovals(tx, row)
  if (signed.length === 0) return null
  await voidApprovals(tx, row, signed, {
    at: now,
    key,
    voidedReason: 'The plan was changed after it was signed.',
    because: `${by} changed the plan after it was signed`,
  })
  const signers = [...new Set(signed.map(({ signerName }) => signerName))].join(' and ')
  const things = signed.length === 1 ? '1 approval' : `${signed.length} approvals`
  return `The plan was changed: ${things} by ${signers} ${signed.length === 1 ? 'is' : 'are'} void.`
}

async function conflict(tx: Transaction, row: Consignment, yours: Plan): Promise<SteadfoldError> {
  const plan = await readPlan(row, tx)
  const last = await models.AuditEvent.findOne({
    where: { consignmentId: row.id, verb: ['consignment.save', 'consignment.create'] },
    order: [['id', 'DESC']],
    include: [{ association: 'actor', attributes: ['name'] }],
    transaction: tx,
  })
  const by = last?.actor?.name ?? 'Somebody else'
  const atMs = (last?.at ?? row.updatedAt).getTime()
  const details: PlanConflict = { yours, meanwhile: { plan, version: row.version, by, atMs } }
  return new SteadfoldError(
    'conflict',
    `${by} saved this plan while you had it open. Nothing of yours was saved, and nothing of theirs is lost.`,
    { details: { ...details } },
  )
}
