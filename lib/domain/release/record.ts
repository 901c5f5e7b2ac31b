import 'server-only'
import { createHash } from 'node:crypto'
import type { Transaction } from 'sequelize'
import { transaction } from '@/lib/db/transaction'
import { SteadfoldError } from '@/lib/errors'
import { enqueue as enqueueMail } from '@/lib/mail/outbox'
import { models } from '@/models'
import type { Consignment, Document } from '@/models'
import type { DocumentKind } from '@/models/document'
import { record } from '../audit/record'
import { authorize } from '../authorize'
import { planningKnowledge } from '../catalogue/knowledge'
import { currentAssessment } from '../consignments/current-assessment'
import type { CurrentAssessment } from '../consignments/current-assessment'
import { move } from '../consignments/move'
import { keepReleasedPlan } from '../consignments/plan-in-force'
import { findConsignment } from '../consignments/visible'
import { supersedeDocuments } from '../documents/document-state'
import { keepSnapshot } from '../snapshot'
import { releaseObstacles } from './obstacles'
import { releaser } from './prepare'
import type { PreparedRelease } from './prepare'
import { notYet } from './release'

/** A paper as it left the press: sealed bytes, and the view they were made from. */
export interface IssuedPaper {
  kind: DocumentKind
  code: string
  bytes: Buffer
  pages: number
  view: unknown
}

export interface IssuedRelease {
  papers: IssuedPaper[]
  /** The mail to the shipper; the manifest is attached as issued. */
  letter: { to: string; subject: string; text: string; html: string }
}

/**
 * Records a release whose papers are rendered and sealed: looks at everything again, stores papers and plan for good,
 * supersedes what was in force, and writes the mail. Recorded twice, it is stored once. "changed" where the consignment was
 * written to since the papers were prepared, even in what no plan hash covers (a telephone, the consignee): papers and
 * stored plan would disagree, so nothing is recorded and the release is to be prepared again.
 */
export async function recordRelease(
  { task, readAt }: Pick<PreparedRelease, 'task' | 'readAt'>,
  issued: IssuedRelease,
  now: Date,
): Promise<{ documentIds: number[] } | 'already' | 'changed'> {
  const actor = await releaser(task)
  return transaction(async (tx) => {
    const { row, facts } = await findConsignment(actor, task.consignmentId, { tx, lock: true })
    authorize(actor, 'consignment.release', facts)
    if (row.inForceRevision === task.revision && row.inForceState !== null) return 'already'
    if (row.revision !== task.revision || row.planHash !== task.planHash) {
      throw new SteadfoldError('wrong_state', 'The plan was changed while its papers were being made.')
    }
    if (row.version !== readAt.version || row.updatedAt.getTime() !== readAt.updatedAt.getTime())
      return 'changed'
    const current = await currentAssessment(tx, row)
    const obstacles = await releaseObstacles(tx, row, current, now)
    if (obstacles.length > 0) throw notYet(obstacles)

    const before = { state: row.state, inForceRevision: row.inForceRevision }
    const inForceSnapshotHash = await keepInForce(tx, row, current)
    await supersedeDocuments(tx, row.id, now)
    await endOlderApprovals(tx, row, now)
    const state = await move(tx, row, 'release', {
      inForceRevision: row.revision,
      inForceState: 'released',
      inForceSnapshotHash,
    })
    const documents = await store(tx, row, issued.papers, { by: actor.id, at: now })
    await enqueueMail(tx, mailOf(row, issued, documents), now)
    await record(tx, {
      actor,
      verb: 'consignment.released',
      at: now,
      subject: { type: 'consignment', id: row.id },
      consignmentId: row.id,
      before,
      after: {
        state,
        revision: row.revision,
        planHash: row.planHash,
        documents: documents.map(({ code }) => code),
      },
    })
    return { documentIds: documents.map(({ id }) => id) }
  })
}

async function keepInForce(tx: Transaction, row: Consignment, { assessment, plan }: CurrentAssessment) {
  const { places } = await planningKnowledge(plan, tx)
  return keepReleasedPlan(tx, {
    schema: 'steadfold/released-plan@1',
    mark: row.mark,
    revision: row.revision,
    planHash: assessment.planHash,
    assessmentId: assessment.id,
    plan,
    places: [...places],
  })
}

/** What was signed for an earlier plan has done its work. */
async function endOlderApprovals(tx: Transaction, row: Consignment, now: Date) {
  const standing = await models.Approval.findAll({
    where: { consignmentId: row.id, voidedAt: null },
    attributes: ['id', 'planHash', 'decision'],
    transaction: tx,
  })
  const older = standing.filter(
    ({ planHash, decision }) => planHash !== row.planHash && decision !== 'returned',
  )
  await models.Approval.update(
    { voidedAt: now, voidedReason: `Superseded by revision ${row.revision}.` },
    { where: { id: older.map(({ id }) => id) }, transaction: tx },
  )
}

async function store(
  tx: Transaction,
  row: Consignment,
  papers: readonly IssuedPaper[],
  made: { by: number; at: Date },
): Promise<Document[]> {
  const documents: Document[] = []
  for (const { kind, code, bytes, pages, view } of papers) {
    const document = await models.Document.create(
      {
        consignmentId: row.id,
        revision: row.revision,
        kind,
        code,
        bytes,
        sha256: createHash('sha256').update(bytes).digest('hex'),
        planHash: row.planHash ?? '',
        viewHash: await keepSnapshot(tx, kind === 'manifest' ? 'manifest' : 'sheet', view),
        sizeBytes: bytes.length,
        pageCount: pages,
        madeAt: made.at,
        madeBy: made.by,
        stateChangedAt: null,
        voidedReason: null,
      },
      { transaction: tx },
    )
    documents.push(document)
  }
  return documents
}

function mailOf(row: Consignment, { letter }: IssuedRelease, documents: readonly Document[]) {
  const manifest = documents.filter(({ kind }) => kind === 'manifest').map(({ id }) => id)
  return {
    ...letter,
    attachments: manifest,
    consignmentId: row.id,
    dedupeKey: `manifest:${row.id}:${row.revision}:${documents[0]?.code ?? ''}`,
  }
}
