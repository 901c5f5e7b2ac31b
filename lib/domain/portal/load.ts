import 'server-only'
import type { Actor } from '@/lib/policies/actor'
import type { PortalDocument, PortalRow, PortalView } from '@/lib/views/portal'
import { buildPortalView } from '@/lib/views/portal-view/build-portal-view'
import { models } from '@/models'
import type { Document } from '@/models'
import { authorize } from '../authorize'
import { sheetFacts } from '../consignments/sheet-facts'
import { findConsignment } from '../consignments/visible'
import { deskMoment } from '../firm'
import { listOwnConsignments } from './list'

export interface OwnConsignment {
  row: PortalRow
  /** null until a revision is released: before that there is nothing to rely on. */
  view: PortalView | null
}

/** One of a shipper's own consignments, as released. */
export async function loadOwnConsignment(
  actor: Actor,
  { consignmentId }: { consignmentId: number },
  now: Date,
): Promise<OwnConsignment> {
  const { row, facts } = await findConsignment(actor, consignmentId)
  authorize(actor, 'consignment.acknowledge', facts)
  const own = (await listOwnConsignments(actor)).find((one) => one.consignmentId === consignmentId)
  const summary = own ?? {
    consignmentId,
    mark: row.mark,
    from: row.fromPlaceName ?? '',
    to: row.toPlaceName ?? '',
    animals: row.animalsSummary,
    leaves: null,
    state: row.state,
    asked: '',
  }
  if (row.inForceSnapshotHash === null) return { row: summary, view: null }
  const papers = await models.Document.findAll({
    where: { consignmentId },
    include: [{ association: 'acknowledgement', include: [{ association: 'user', attributes: ['name'] }] }],
    order: [['id', 'DESC']],
  })
  const sheet = await sheetFacts(row, { which: 'in-force', tracks: false, now })
  const view = buildPortalView({
    sheet,
    documents: papers.map(portalDocument),
    acknowledgement: acknowledgementOf(papers, sheet.conditions.length, row.departsAt ?? now),
    requests: await requestsOf(consignmentId),
  })
  return { row: summary, view }
}

function portalDocument(paper: Document): PortalDocument {
  return {
    documentId: paper.id,
    kind: paper.kind,
    state: paper.state,
    revision: paper.revision,
    sheets: paper.pageCount,
    code: paper.code,
    made: deskMoment(paper.madeAt),
  }
}

function acknowledgementOf(
  papers: readonly Document[],
  conditionCount: number,
  by: Date,
): PortalView['acknowledgement'] {
  const manifest = papers.find(({ kind, state }) => kind === 'manifest' && state === 'current')
  if (manifest === undefined) return null
  const done = manifest.acknowledgement
  return {
    documentId: manifest.id,
    revision: manifest.revision,
    conditionCount,
    by: deskMoment(by),
    done: done ? { who: done.user?.name ?? '', at: deskMoment(done.at) } : null,
  }
}

async function requestsOf(consignmentId: number): Promise<PortalView['requests']> {
  const requests = await models.ChangeRequest.findAll({ where: { consignmentId }, order: [['id', 'DESC']] })
  return requests.map(({ at, revision, subject, text }) => ({ at: deskMoment(at), revision, subject, text }))
}
