import 'server-only'
import type { DocumentLine } from '@/lib/views/desk-page'
import { models } from '@/models'
import { deskMoment } from '../firm'

/** The papers issued for a consignment, newest first, without their bytes. */
export async function documentLines(consignmentId: number): Promise<DocumentLine[]> {
  const papers = await models.Document.findAll({ where: { consignmentId }, order: [['id', 'DESC']] })
  return papers.map((paper) => ({
    documentId: paper.id,
    kind: paper.kind,
    revision: paper.revision,
    code: paper.code,
    state: paper.state,
    madeAt: deskMoment(paper.madeAt),
    pageCount: paper.pageCount,
    voidedReason: paper.voidedReason ?? '',
  }))
}
