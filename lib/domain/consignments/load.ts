import 'server-only'
import { Op } from 'sequelize'
import { actsNow } from '@/lib/policies/acts'
import type { Act } from '@/lib/policies/acts'
import type { Actor } from '@/lib/policies/actor'
import { visibleParts } from '@/lib/policies/consignment'
import type { ConsignmentPart } from '@/lib/policies/consignment'
import { reasonsNotAssessable } from '@/lib/planning/reasons'
import type { ProfileInForce, Reason } from '@/lib/planning/reasons'
import type { CrateModelPlan } from '@/lib/planning/new-plan'
import type { Plan, PlanPlace } from '@/lib/schemas/plan'
import { SteadfoldError } from '@/lib/errors'
import type { ConsignmentRow } from '@/lib/views/consignment-row'
import type { SheetFacts } from '@/lib/views/sheet-view/facts'
import { models } from '@/models'
import type { Approval, Consignment, Job } from '@/models'
import { authorize } from '../authorize'
import { allPlaces, planningKnowledge, profilesInForce } from '../catalogue/knowledge'
import { SIGNED_AND_CRATES, consignmentRow } from './consignment-row'
import { readPlan } from './read-plan'
import { sheetFacts } from './sheet-facts'
import type { Which } from './sheet-facts'
import { findConsignment } from './visible'

/** How far an assessment is, for a page that waits for it. */
export interface AssessmentStatus {
  assessmentId: number
  status: 'queued' | 'running' | 'done' | 'failed' | 'superseded'
  stage: string
  done: number
  total: number
  /** Why it failed, in words. */
  error: string
}

export interface ConsignmentStatus {
  row: ConsignmentRow
  version: number
  assessment: AssessmentStatus | null
  /** True while the release is being rendered and sealed. */
  releasing: boolean
  /** Why the last release failed; empty where it did not. */
  releaseError: string
}

/** A consignment with what its pages need first. What the actor may not see is not found. */
export interface LoadedConsignment extends ConsignmentStatus {
  acts: Act[]
  parts: readonly ConsignmentPart[]
}

/** Where a consignment stands, and what the actor may do with it now. */
export async function loadConsignment(
  actor: Actor,
  { consignmentId }: { consignmentId: number },
): Promise<LoadedConsignment> {
  const { row, facts } = await findConsignment(actor, consignmentId)
  return { ...(await statusOf(row)), acts: actsNow(actor, facts, row), parts: visibleParts(actor, facts) }
}

/** The short answer for a page that waits: state, progress and figures, a few hundred bytes. */
export async function consignmentStatus(
  actor: Actor,
  { consignmentId }: { consignmentId: number },
): Promise<ConsignmentStatus> {
  const { row } = await findConsignment(actor, consignmentId)
  return statusOf(row)
}

/** What the sheet on screen is built from. Drivers and shippers get the revision in force, never the one being worked on. */
export async function loadSheetFacts(
  actor: Actor,
  { consignmentId, which, tracks }: { consignmentId: number; which: Which; tracks: boolean },
  now: Date,
): Promise<SheetFacts> {
  const { row, facts } = await findConsignment(actor, consignmentId)
  const working = visibleParts(actor, facts).includes('assessment')
  return sheetFacts(row, { which: working ? which : 'in-force', tracks, now })
}

/** Everything the plan editor shows and offers. */
export interface PlanEditor {
  /** null: a new consignment. */
  consignment: LoadedConsignment | null
  plan: Plan | null
  /** Every reason why the plan cannot be assessed. */
  reasons: Reason[]
  places: PlanPlace[]
  profiles: ProfileInForce[]
  crateModels: { id: number; name: string; plan: CrateModelPlan }[]
  drivers: { id: number; name: string; telephone: string }[]
  shippers: { id: number; name: string; accountNo: string }[]
  /** When and by whom the air of each leg was typed or last said to hold. */
  airStamps: { legId: string; atMs: number; by: string }[]
}

/** The plan editor for a consignment, or for a new one. */
export async function loadPlanEditor(
  actor: Actor,
  { consignmentId }: { consignmentId: number | null },
): Promise<PlanEditor> {
  if (consignmentId === null) {
    authorize(actor, 'consignment.create')
    return { consignment: null, plan: null, reasons: [], airStamps: [], ...(await editorCatalogue()) }
  }
  const { row, facts } = await findConsignment(actor, consignmentId)
  if (!visibleParts(actor, facts).includes('plan')) {
    throw new SteadfoldError('not_found', 'There is no such consignment.')
  }
  const plan = await readPlan(row)
  return {
    consignment: await loadConsignment(actor, { consignmentId }),
    plan,
    reasons: reasonsNotAssessable(plan, await planningKnowledge(plan)),
    airStamps: await airStamps(row.id),
    ...(await editorCatalogue()),
  }
}

async function editorCatalogue() {
  const crateModels = await models.CrateModel.findAll({ where: { active: true }, order: ['name'] })
  const drivers = await models.User.findAll({
    where: { role: 'driver', disabledAt: null },
    attributes: ['id', 'name', 'telephone'],
    order: ['name'],
  })
  const shippers = await models.Shipper.findAll({ attributes: ['id', 'name', 'accountNo'], order: ['name'] })
  return {
    places: await allPlaces(),
    profiles: await profilesInForce(),
    crateModels: crateModels.map(({ id, name, spec }) => ({ id, name, plan: spec })),
    drivers: drivers.map(({ id, name, telephone }) => ({ id, name, telephone })),
    shippers: shippers.map(({ id, name, accountNo }) => ({ id, name, accountNo })),
  }
}

async function airStamps(consignmentId: number): Promise<PlanEditor['airStamps']> {
  const legs = await models.Leg.findAll({ where: { consignmentId }, order: ['position'] })
  const ids = [...new Set(legs.flatMap(({ airEnteredBy }) => airEnteredBy ?? []))]
  const people = await models.User.findAll({ where: { id: ids }, attributes: ['id', 'name'] })
  return legs.flatMap(({ ref, airEnteredAt, airEnteredBy }) =>
    airEnteredAt === null
      ? []
      : [
          {
            legId: ref,
            atMs: airEnteredAt.getTime(),
            by: people.find(({ id }) => id === airEnteredBy)?.name ?? '',
          },
        ],
  )
}

async function statusOf(row: Consignment): Promise<ConsignmentStatus> {
  const whole = await models.Consignment.findByPk(row.id, {
    include: [{ association: 'shipper', attributes: ['name'] }],
    attributes: { include: [...SIGNED_AND_CRATES] },
  })
  const assessment = row.assessmentId === null ? null : await models.Assessment.findByPk(row.assessmentId)
  const release = await releaseUnderWay(row)
  return {
    row: consignmentRow(whole ?? row),
    version: row.version,
    assessment: assessment && {
      assessmentId: assessment.id,
      status: assessment.status,
      stage: assessment.stage,
      done: assessment.doneCount,
      total: assessment.totalCount,
      error: assessment.error?.message ?? '',
    },
    releasing: release !== null && release.state !== 'failed',
    releaseError: release?.state === 'failed' ? (release.lastError ?? '') : '',
  }
}

/** The release last asked for under the signatures that stand. One that failed before they were put is history. */
async function releaseUnderWay({ id, state, revision, planHash }: Consignment): Promise<Job | null> {
  if (state !== 'approved' || planHash === null) return null
  const signedAt = await models.Approval.max<Date | string | null, Approval>('signedAt', {
    where: { consignmentId: id, planHash, voidedAt: null },
  })
  return models.Job.findOne({
    where: {
      kind: 'release',
      state: ['queued', 'running', 'failed'],
      payload: { consignmentId: id, revision, planHash },
      ...(signedAt !== null && { runAfter: { [Op.gte]: signedAt } }),
    },
    order: [['id', 'DESC']],
  })
}
