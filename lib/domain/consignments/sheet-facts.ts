import 'server-only'
import { SteadfoldError } from '@/lib/errors'
import type { Plan, PlanPlace } from '@/lib/schemas/plan'
import type { ApprovalFact, ConditionFact, SheetFacts } from '@/lib/views/sheet-view/facts'
import { models } from '@/models'
import type { Approval, Assessment as AssessmentRow, Consignment } from '@/models'
import type { StandingCondition } from '../assessments/conditions'
import { standingConditions } from '../assessments/conditions'
import { readResult } from '../assessments/read-result'
import { readTracks } from '../assessments/tracks'
import { planningKnowledge } from '../catalogue/knowledge'
import type { ProfileInForce } from '@/lib/planning/reasons'
import { firm } from '../firm'
import { effectiveOf } from './effective-figures'
import { planInForce } from './plan-in-force'
import { readPlan } from './read-plan'

/** Which revision a page speaks of: the one being worked on, or the one that travels. */
export type Which = 'working' | 'in-force'

export interface SheetFactsOptions {
  which: Which
  /** Tracks are long: only pages with charts ask for them. */
  tracks: boolean
  documentCode?: string | null
  now: Date
}

interface Edition {
  plan: Plan
  places: readonly PlanPlace[]
  profiles: readonly ProfileInForce[]
  revision: number
  planHash: string | null
  assessmentId: number | null
}

/** What the go/no-go sheet and the manifest are built from, for one revision of a consignment that was found already. */
export async function sheetFacts(row: Consignment, options: SheetFactsOptions): Promise<SheetFacts> {
  const edition = options.which === 'working' ? await workingEdition(row) : await editionInForce(row)
  const assessment = await finished(edition.assessmentId)
  const result = assessment === null ? null : await readResult(assessment)
  const keyed = { id: row.id, planHash: edition.planHash }
  const approvals = await allApprovals(row.id, edition)
  const inForce = new Map(approvals.filter(stands).map((approval) => [approval.crateRef, approval]))
  const conditions = await standingConditions(undefined, keyed)
  const shipper = await models.Shipper.findByPk(edition.plan.shipperId)
  return {
    consignment: {
      id: row.id,
      mark: row.mark,
      revision: edition.revision,
      replacesRevision: await replacedRevision(row.id, edition.revision),
      state: options.which === 'in-force' ? (row.inForceState ?? row.state) : row.state,
      planHash: edition.planHash ?? '',
    },
    plan: edition.plan,
    shipper: { name: shipper?.name ?? '', accountNo: shipper?.accountNo ?? '' },
    places: edition.places,
    profiles: edition.profiles.map(({ key, commonName, version, values }) => ({
      key,
      commonName,
      version,
      limits: values.limits === undefined ? null : { ...values.limits, confidence: 'judgement' },
    })),
    assessment: assessment &&
      result && {
        result: { ...result, ...(await tracksOf(assessment, options.tracks)) },
        assessedAtMs: (assessment.finishedAt ?? assessment.requestedAt).getTime(),
        assessedBy:
          (await models.User.findByPk(assessment.requestedBy, { attributes: ['name'] }))?.name ?? '',
        outOfDate: isOutOfDate(row, edition, assessment),
      },
    effective: result && effectiveOf(result, edition.plan, inForce, conditions),
    approvals: approvals.map(approvalFact),
    conditions: conditions.map(({ row: condition }) => conditionFact(condition)),
    firm: firm(),
    documentCode: options.documentCode ?? null,
    madeAtMs: options.now.getTime(),
  }
}

async function workingEdition(row: Consignment): Promise<Edition> {
  const plan = await readPlan(row)
  return {
    plan,
    ...(await planningKnowledge(plan)),
    revision: row.revision,
    planHash: row.planHash,
    assessmentId: row.assessmentId,
  }
}

async function editionInForce(row: Consignment): Promise<Edition> {
  const released = await planInForce(row)
  if (released === null) throw new SteadfoldError('not_found', 'No revision of this consignment is released.')
  const { profiles } = await planningKnowledge(released.plan)
  return { ...released, profiles }
}

async function finished(assessmentId: number | null): Promise<AssessmentRow | null> {
  if (assessmentId === null) return null
  return models.Assessment.findOne({ where: { id: assessmentId, status: 'done' } })
}

async function tracksOf({ id }: AssessmentRow, wanted: boolean) {
  const tracks = wanted ? await readTracks(id) : null
  return tracks ?? { crates: [], animals: [], compartments: [] }
}

function isOutOfDate(row: Consignment, edition: Edition, assessment: AssessmentRow): boolean {
  return edition.planHash !== assessment.planHash || (edition.revision === row.revision && row.outOfDate)
}

/** Decisions on this plan, those taken back or ended by a change of this revision as well. */
function allApprovals(consignmentId: number, { revision, planHash }: Edition): Promise<Approval[]> {
  return models.Approval.findAll({
    where: { consignmentId, ...(planHash === null ? { revision } : { planHash }) },
    include: [{ association: 'overrides' }],
    order: ['id'],
  })
}

function stands({ voidedAt, decision }: Approval): boolean {
  return voidedAt === null && decision !== 'returned'
}

async function replacedRevision(consignmentId: number, revision: number): Promise<number | null> {
  const papers = await models.Document.findAll({
    where: { consignmentId },
    attributes: ['revision'],
    order: [['revision', 'DESC']],
  })
  return papers.find((paper) => paper.revision < revision)?.revision ?? null
}

function approvalFact(approval: Approval): ApprovalFact {
  return {
    crateId: approval.crateRef,
    decision: approval.decision,
    statement: approval.statement,
    examined: approval.examined,
    signerName: approval.signerName,
    registrationNumber: approval.registrationNumber,
    registrationCountry: approval.registrationCountry,
    registrationExpiresOn: approval.registrationExpiresOn,
    checkedWords: 'Record checked by an admin',
    signedAtMs: approval.signedAt.getTime(),
    inForce: stands(approval),
    earlySigns: approval.earlySigns,
    overrides: (approval.overrides ?? []).map((override) => ({
      findingRule: override.findingRule,
      animalId: override.animalRef,
      legId: override.legRef,
      reason: override.reason,
      minutesPast: override.minutesPast,
      worstBodyC: override.worstBodyC,
    })),
  }
}

function conditionFact(condition: StandingCondition['row']): ConditionFact {
  return {
    id: String(condition.id),
    text: condition.text,
    legId: condition.legRef,
    party: condition.party,
    ours: condition.ours,
    findingRule: condition.findingRule,
    askedAtMs: condition.askedAt.getTime(),
    answer: condition.answer,
    answeredBy: condition.answeredBy,
    answeredHow: condition.answeredHow,
    answeredAtMs: condition.answeredAt?.getTime() ?? null,
    kept: condition.kept,
  }
}
