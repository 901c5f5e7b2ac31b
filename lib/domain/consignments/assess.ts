import 'server-only'
import { Op } from 'sequelize'
import type { Transaction } from 'sequelize'
import { SteadfoldError } from '@/lib/errors'
import type { Actor } from '@/lib/policies/actor'
import { RULES_VERSION } from '@/lib/rules/version'
import type { ConsignmentAct } from '@/lib/schemas/act'
import type { Plan, PlanPlace } from '@/lib/schemas/plan'
import { nextState } from '@/lib/states/consignment'
import { ENGINE_VERSION } from '@/lib/thermal/version'
import { models } from '@/models'
import type { Assessment, Consignment } from '@/models'
import { act } from '../act'
import type { Done } from '../act'
import { authorize } from '../authorize'
import { planningKnowledge } from '../catalogue/knowledge'
import { enqueue } from '../jobs/queue'
import { keepSnapshot } from '../snapshot'
import { judgePlan } from './judge-plan'
import type { JudgedPlan } from './judge-plan'
import { move, wrongState } from './move'
import { readPlan } from './read-plan'
import { findConsignment } from './visible'
import { writeRow } from './write-row'

export interface AskedAssessment {
  assessmentId: number
  /** "queued": the worker takes it up; "done": this very plan was assessed before and stands. */
  status: 'queued' | 'done'
}

/**
 * Asks for the working plan to be assessed: keeps the scenario for good, queues the run and gives its number. Refused
 * with every reason at once where the plan cannot be assessed.
 */
export function assessConsignment(actor: Actor, input: ConsignmentAct, now: Date): Promise<AskedAssessment> {
  const { consignmentId, requestId } = input
  const about = { type: 'consignment', id: consignmentId, consignmentId } as const
  return act(
    { actor, verb: 'consignment.assess', requestId, now, about },
    async (tx): Promise<Done<AskedAssessment>> => {
      const { row, facts } = await findConsignment(actor, consignmentId, { tx, lock: true })
      authorize(actor, 'consignment.assess', facts)
      if (nextState(row.state, 'assess') === undefined) throw wrongState(row.state, 'assess')
      const plan = await readPlan(row, tx)
      const knowledge = await planningKnowledge(plan, tx)
      const judged = judgePlan(plan, row.mark, knowledge)
      if (!judged.assessable) throw notAssessable(judged.reasons.length, judged.reasons)

      const standing = await standingAssessment(tx, row, judged.inputHash)
      if (standing !== null) return stand(tx, row, standing)
      await models.Assessment.update(
        { status: 'superseded' },
        { where: { consignmentId, status: ['queued', 'running'] }, transaction: tx },
      )
      const places = knowledge.places.filter(({ id }) =>
        plan.legs.some(({ fromPlaceId, toPlaceId }) => id === fromPlaceId || id === toPlaceId),
      )
      const assessment = await insert(tx, row, { judged, plan, places }, { by: actor.id, at: now })
      await writeRow(tx, row, { assessmentId: assessment.id, planHash: judged.planHash })
      await enqueue(tx, {
        kind: 'assess',
        payload: { assessmentId: assessment.id },
        dedupeKey: `assess:${assessment.id}`,
        runAfter: now,
      })
      return {
        result: { assessmentId: assessment.id, status: 'queued' },
        after: { assessmentId: assessment.id, planHash: judged.planHash, inputHash: judged.inputHash },
      }
    },
  )
}

/** The newest assessment of this revision over the same input that is not lost; asked twice, run once. */
function standingAssessment(
  tx: Transaction,
  row: Consignment,
  inputHash: string,
): Promise<Assessment | null> {
  return models.Assessment.findOne({
    where: {
      consignmentId: row.id,
      revision: row.revision,
      inputHash,
      status: { [Op.in]: ['queued', 'running', 'done'] },
    },
    order: [['id', 'DESC']],
    transaction: tx,
  })
}

async function stand(
  tx: Transaction,
  row: Consignment,
  standing: Assessment,
): Promise<Done<AskedAssessment>> {
  const done = standing.status === 'done'
  if (done) await move(tx, row, 'assess', { assessmentId: standing.id, outOfDate: false })
  return {
    result: { assessmentId: standing.id, status: done ? 'done' : 'queued' },
    note: done
      ? 'This plan was assessed before; the assessment stands.'
      : 'This plan is being assessed already.',
  }
}

/** What an assessment is made of: the plan hash can be worked out again from it, whatever the working plan becomes. */
interface AssessedPlan {
  judged: Extract<JudgedPlan, { assessable: true }>
  plan: Plan
  places: readonly PlanPlace[]
}

async function insert(
  tx: Transaction,
  row: Consignment,
  { judged, plan, places }: AssessedPlan,
  asked: { by: number; at: Date },
): Promise<Assessment> {
  return models.Assessment.create(
    {
      consignmentId: row.id,
      revision: row.revision,
      planHash: judged.planHash,
      inputHash: judged.inputHash,
      scenarioHash: await keepSnapshot(tx, 'scenario', judged.scenario),
      planSnapshotHash: await keepSnapshot(tx, 'plan', {
        schema: 'steadfold/assessed-plan@1',
        mark: row.mark,
        revision: row.revision,
        planHash: judged.planHash,
        plan,
        places,
      }),
      engineVersion: ENGINE_VERSION,
      rulesVersion: RULES_VERSION,
      profileVersions: judged.profileVersions,
      requestedBy: asked.by,
      requestedAt: asked.at,
      resultHash: null,
      verdict: null,
      error: null,
      startedAt: null,
      finishedAt: null,
    },
    { transaction: tx },
  )
}

function notAssessable(count: number, issues: SteadfoldError['issues']) {
  const things = count === 1 ? '1 thing' : `${count} things`
  return new SteadfoldError('invalid', `This plan cannot be assessed: ${things} to put right first.`, {
    issues,
  })
}
