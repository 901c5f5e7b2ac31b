import 'server-only'
import { SteadfoldError } from '@/lib/errors'
import type { Actor } from '@/lib/policies/actor'
import { can } from '@/lib/policies/can'
import { models } from '@/models'
import type { Document } from '@/models'
import { record } from '../audit/record'
import { factsOf } from '../consignments/visible'

export interface DownloadedDocument {
  bytes: Buffer
  fileName: string
  document: Document
}

/** A stored paper with its bytes as issued. What the actor may not see does not exist. Each download is written down. */
export async function downloadDocument(
  actor: Actor,
  { documentId }: { documentId: number },
  now: Date,
): Promise<DownloadedDocument> {
  const document = await models.Document.findByPk(documentId, {
    include: [{ association: 'consignment' }],
  })
  const consignment = document?.consignment
  if (document === null || consignment === undefined) throw notFound()
  if (!can(actor, 'document.read', { ...(await factsOf(consignment)), kind: document.kind })) throw notFound()
  const whole = await models.Document.unscoped().findByPk(documentId, { attributes: ['bytes'] })
  if (whole === null) throw notFound()
  await record(null, {
    actor,
    verb: 'document.download',
    at: now,
    subject: { type: 'document', id: document.id },
    consignmentId: document.consignmentId,
    after: { kind: document.kind, revision: document.revision, state: document.state },
  })
  const kind = document.kind === 'manifest' ? 'manifest' : 'go-no-go'
  return { bytes: whole.bytes, fileName: `${consignment.mark}-${kind}-${document.revision}.pdf`, document }
}

function notFound() {
  return new SteadfoldError('not_found', 'There is no such paper.')
}
