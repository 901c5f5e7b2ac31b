import 'server-only'
import type { CreationAttributes, Transaction } from 'sequelize'
import { transaction } from '@/lib/db/transaction'
import type { Assessment, Finding } from '@/lib/rules/result'
import { nextState } from '@/lib/states/consignment'
import type { Scenario } from '@/lib/thermal/scenario'
import { models } from '@/models'
import type { Assessment as AssessmentRow, Consignment, Finding as FindingRow } from '@/models'
import type { AssessmentError } from '@/models/assessment'
import { voidWorsened } from '../approvals/void-worsened'
import { record } from '../audit/record'
import { writeEffectiveVerdict } from '../consignments/effective-figures'
import { move } from '../consignments/move'
import { readPlan } from '../consignments/read-plan'
import { keepSnapshot, readSnapshot } from '../snapshot'
import { writeConditions } from './conditions'
import { packTracks } from './tracks'
import type { PackedTracks } from './tracks'

export type RecordedAssessment = 'recorded' | 'already' | 'superseded'

/**
 * Stores what a run found: findings, tracks, the result for good, the board's figures and the conditions that follow, and
 * moves the consignment on. An approval whose crate came out worse is void. Recorded twice, it is stored once; where the
 * plan was saved anew meanwhile, nothing moves.
 */
export async function recordAssessment(
  { assessmentId, result }: { assessmentId: number; result: Assessment },
  now: Date,
): Promise<RecordedAssessment> {
  const tracks = await packTracks(result)
  return transaction(async (tx) => {
    const assessment = await models.Assessment.findByPk(assessmentId, {
      transaction: tx,
      lock: tx.LOCK.UPDATE,
    })
    if (assessment === null || assessment.status === 'superseded') return 'superseded'
    if (assessment.status === 'done' || assessment.status === 'failed') return 'already'
    const row = await models.Consignment.findByPk(assessment.consignmentId, {
      transaction: tx,
      lock: tx.LOCK.UPDATE,
    })
    if (row === null) return 'superseded'
    await store(tx, assessment, result, tracks, now)
    if (!isCurrent(row, assessment)) return 'superseded'
    await move(tx, row, 'assess', { outOfDate: false })
    const scenario = (await readSnapshot(assessment.scenarioHash, tx)) as Scenario
    const plan = await readPlan(row, tx)
    const ended = await voidWorsened(tx, row, { plan, assessmentId: assessment.id, result }, now)
    if (ended && nextState(row.state, 'lapse') !== undefined) await move(tx, row, 'lapse')
    await writeConditions(tx, row, { plan, scenario, result }, now)
    await writeEffectiveVerdict(tx, row)
    await record(tx, {
      actor: null,
      verb: 'assessment.record',
      at: now,
      subject: { type: 'assessment', id: assessment.id },
      consignmentId: row.id,
      after: { verdict: result.verdict.verdict, inputHash: assessment.inputHash, state: row.state },
    })
    return 'recorded'
  })
}

/** The run failed for good: says why, and where it says nothing more. The consignment stays as it was. */
export function recordAssessmentFailure(failure: FailedAssessment, now: Date): Promise<void> {
  return transaction((tx) => failAssessment(tx, failure, now))
}

export interface FailedAssessment {
  assessmentId: number
  error: AssessmentError
  /** What the machine said, for the audit trail alone. */
  cause?: string
}

/** The same in the transaction that ends its job. What is done, failed or superseded already stays so. */
export async function failAssessment(
  tx: Transaction,
  { assessmentId, error, cause }: FailedAssessment,
  now: Date,
): Promise<void> {
  const [count] = await models.Assessment.update(
    { status: 'failed', error, finishedAt: now },
    { where: { id: assessmentId, status: ['queued', 'running'] }, transaction: tx },
  )
  if (count === 0) return
  const assessment = await models.Assessment.findByPk(assessmentId, { transaction: tx })
  await record(tx, {
    actor: null,
    verb: 'assessment.fail',
    at: now,
    subject: { type: 'assessment', id: assessmentId },
    consignmentId: assessment?.consignmentId ?? null,
    note: [`${error.code}: ${error.message}`, ...(cause === undefined ? [] : [`(${cause})`])].join(' '),
  })
}

function isCurrent(row: Consignment, assessment: AssessmentRow): boolean {
  return (
    row.assessmentId === assessment.id &&
    row.planHash === assessment.planHash &&
    nextState(row.state, 'assess') !== undefined
  )
}

async function store(
  tx: Transaction,
  assessment: AssessmentRow,
  result: Assessment,
  tracks: PackedTracks,
  now: Date,
) {
  const { crates: _crates, animals: _animals, compartments: _compartments, ...rest } = result
  await models.AssessmentTrack.create({ assessmentId: assessment.id, body: tracks.body }, { transaction: tx })
  await models.Finding.bulkCreate(
    result.findings.map((finding, ordinal) => findingRow(assessment.id, ordinal, finding)),
    { transaction: tx },
  )
  await assessment.update(
    {
      status: 'done',
      verdict: result.verdict.verdict,
      resultHash: await keepSnapshot(tx, 'result', { ...rest, tracksSha256: tracks.sha256 }),
      finishedAt: now,
      stage: '',
    },
    { transaction: tx },
  )
}

function findingRow(assessmentId: number, ordinal: number, finding: Finding): CreationAttributes<FindingRow> {
  return {
    assessmentId,
    ordinal,
    rule: finding.rule,
    basis: finding.basis,
    status: finding.status,
    side: finding.side ?? null,
    limitKind: finding.limitKind ?? null,
    animalRef: finding.animalId ?? null,
    crateRef: finding.crateId ?? null,
    legRef: finding.legId ?? null,
    marginMin: finding.marginMin ?? null,
    marginOutsideAirC: finding.marginOutsideAirC ?? null,
    marginBodyC: finding.marginBodyC ?? null,
    minute: finding.minute ?? null,
    overridable: finding.overridable,
    body: finding,
  }
}
