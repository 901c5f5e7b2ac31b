import 'server-only'
import { isDuplicate } from '@/lib/db/transaction'
import { SteadfoldError } from '@/lib/errors'
import type { Actor } from '@/lib/policies/actor'
import { can } from '@/lib/policies/can'
import type { AcknowledgeDocument } from '@/lib/schemas/act'
import { models } from '@/models'
import { act } from '../act'
import type { Done } from '../act'
import { authorize } from '../authorize'
import { factsOf } from '../consignments/visible'

/** A shipper says that the manifest in force was read; said once for each paper. */
export function acknowledgeDocument(
  actor: Actor,
  input: AcknowledgeDocument,
  now: Date,
): Promise<{ acknowledged: true }> {
  const { documentId, requestId } = input
  const about = { type: 'document', id: documentId } as const
  return act(
    { actor, verb: 'consignment.acknowledge', requestId, now, about },
    async (tx): Promise<Done<{ acknowledged: true }>> => {
      const document = await models.Document.findByPk(documentId, {
        include: [{ association: 'consignment' }],
        transaction: tx,
      })
      const consignment = document?.consignment
      if (document === null || consignment === undefined) throw notFound()
      const facts = await factsOf(consignment, tx)
      if (!can(actor, 'document.read', { ...facts, kind: document.kind })) throw notFound()
      authorize(actor, 'consignment.acknowledge', facts)
      if (document.state !== 'current') {
        throw new SteadfoldError('out_of_date', 'A newer revision has replaced this paper: read that one.')
      }
      try {
        await models.Acknowledgement.create({ documentId, userId: actor.id, at: now }, { transaction: tx })
      } catch (error) {
        // A colleague of the same shipper was first: it is acknowledged all the same.
        if (!isDuplicate(error)) throw error
      }
      return {
        result: { acknowledged: true },
        consignmentId: consignment.id,
        after: { kind: document.kind, revision: document.revision },
      }
    },
  )
}

function notFound() {
  return new SteadfoldError('not_found', 'There is no such paper.')
}
