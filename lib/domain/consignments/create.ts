import 'server-only'
import type { Transaction } from 'sequelize'
import { isDuplicate } from '@/lib/db/transaction'
import { SteadfoldError } from '@/lib/errors'
import { timelineOf } from '@/lib/planning/timeline'
import type { Actor } from '@/lib/policies/actor'
import type { Plan } from '@/lib/schemas/plan'
import { models } from '@/models'
import type { Consignment } from '@/models'
import { act } from '../act'
import type { Done } from '../act'
import { authorize } from '../authorize'
import { planningKnowledge } from '../catalogue/knowledge'
import { boardFigures, writeWords } from './board-figures'
import { checkReferences } from './check-references'
import { judgePlan } from './judge-plan'
import type { SavedPlan } from './save'
import { writePlan } from './write-plan'

/** A new consignment with its mark, in draft. */
export function createConsignment(
  actor: Actor,
  input: { requestId: string; plan: Plan },
  now: Date,
): Promise<SavedPlan> {
  const deed = { actor, verb: 'consignment.create', requestId: input.requestId, now, about: ABOUT } as const
  return act(deed, async (tx): Promise<Done<SavedPlan>> => {
    authorize(actor, 'consignment.create')
    const { plan } = input
    const { shipperName } = await checkReferences(tx, plan)
    const knowledge = await planningKnowledge(plan, tx)
    const timeline = timelineOf(plan, knowledge.places)
    const row = await withFreeMark(tx, async (mark) => {
      const judged = judgePlan(plan, mark, knowledge)
      return models.Consignment.create(
        {
          mark,
          version: 1,
          shipperId: plan.shipperId,
          purpose: plan.purpose,
          parties: {
            consignor: plan.consignor,
            consignee: plan.consignee,
            emergencyContact: plan.emergencyContact,
          },
          handlingNote: plan.handlingNote,
          planHash: judged.assessable ? judged.planHash : null,
          createdBy: actor.id,
          ...boardFigures(plan, timeline, knowledge),
        },
        { transaction: tx },
      )
    })
    await writePlan(tx, row.id, plan, timeline, { at: now, by: actor.id })
    await writeWords(tx, row.id, plan, { mark: row.mark, shipperName, timeline })
    return {
      result: {
        consignmentId: row.id,
        mark: row.mark,
        version: 1,
        revision: 1,
        state: 'draft',
        voided: null,
      },
      subjectId: row.id,
      consignmentId: row.id,
      after: { mark: row.mark },
    }
  })
}

const ABOUT = { type: 'consignment', id: null } as const
const FIRST_MARK = 1000
const LAST_MARK = 9999

/** Marks count on from the newest and begin again after 9999; one is free once its consignment is closed. */
async function withFreeMark(
  tx: Transaction,
  insert: (mark: string) => Promise<Consignment>,
): Promise<Consignment> {
  const newest = await models.Consignment.findOne({
    order: [['id', 'DESC']],
    attributes: ['mark'],
    transaction: tx,
  })
  const open = await models.Consignment.findAll({ attributes: ['openMark'], transaction: tx })
  const taken = new Set(open.map(({ openMark }) => openMark))
  const start = Number(newest?.mark ?? FIRST_MARK - 1)
  const span = LAST_MARK - FIRST_MARK + 1
  for (let step = 1; step <= span; step += 1) {
    const mark = String(FIRST_MARK + ((start - FIRST_MARK + step + span) % span))
    if (taken.has(mark)) continue
    try {
      return await insert(mark)
    } catch (error) {
      // Somebody has just taken this mark: the next one will do.
      if (!isDuplicate(error)) throw error
    }
  }
  throw new SteadfoldError('unavailable', 'All four-digit marks are in use: close a consignment first.')
}
