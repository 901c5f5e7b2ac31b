import type { Actor } from './actor'
import type { ConsignmentFacts } from './consignment'
import { line } from './table'

export const DOCUMENT_KINDS = ['go_no_go', 'manifest'] as const
export type DocumentKind = (typeof DOCUMENT_KINDS)[number]

/** A stored document and the consignment it belongs to. */
export interface DocumentFacts extends ConsignmentFacts {
  kind: DocumentKind
}

const FOR_DRIVERS: readonly DocumentKind[] = ['manifest']
const FOR_SHIPPERS: readonly DocumentKind[] = ['manifest', 'go_no_go']

export const documentPolicy = {
  'document.read': line<DocumentFacts>({
    dispatcher: true,
    vet: true,
    admin: true,
    driver: (actor: Actor, facts: DocumentFacts) =>
      facts.driverIds.includes(actor.id) && FOR_DRIVERS.includes(facts.kind),
    shipper: (actor: Actor, facts: DocumentFacts) =>
      actor.shipperId !== null && actor.shipperId === facts.shipperId && FOR_SHIPPERS.includes(facts.kind),
  }),
}
