import type { Actor, Role } from './actor'
import { line } from './table'
import type { NoFacts } from './table'

/** What a policy must know of a consignment. Plain, already loaded: a policy asks no database. */
export interface ConsignmentFacts {
  shipperId: number
  /** Drivers named on legs of the revision in force. Empty until a revision is released. */
  driverIds: readonly number[]
}

const ours = (actor: Actor, facts: ConsignmentFacts) =>
  actor.shipperId !== null && actor.shipperId === facts.shipperId
const drives = (actor: Actor, facts: ConsignmentFacts) => facts.driverIds.includes(actor.id)

export const consignmentPolicy = {
  'consignment.list': line<NoFacts>({ dispatcher: true, vet: true, admin: true, shipper: true }),
  'consignment.create': line<NoFacts>({ dispatcher: true }),

  'consignment.read': line<ConsignmentFacts>({
    dispatcher: true,
    vet: true,
    admin: true,
    driver: drives,
    shipper: ours,
  }),
  'consignment.save': line<ConsignmentFacts>({ dispatcher: true }),
  'consignment.assess': line<ConsignmentFacts>({ dispatcher: true }),
  'consignment.submit': line<ConsignmentFacts>({ dispatcher: true }),
  'consignment.release': line<ConsignmentFacts>({ dispatcher: true }),
  'consignment.cancel': line<ConsignmentFacts>({ dispatcher: true }),
  'consignment.confirm-air': line<ConsignmentFacts>({ dispatcher: true }),
  'consignment.confirm-condition': line<ConsignmentFacts>({ dispatcher: true }),
  'consignment.record-instruction': line<ConsignmentFacts>({ dispatcher: true }),

  /** A dispatcher does these in a driver's place and writes down why. */
  'consignment.depart': line<ConsignmentFacts>({ dispatcher: true, driver: drives }),
  'consignment.deliver': line<ConsignmentFacts>({ dispatcher: true, driver: drives }),
  'consignment.stop': line<ConsignmentFacts>({ dispatcher: true, driver: drives }),

  'consignment.acknowledge': line<ConsignmentFacts>({ shipper: ours }),
  'consignment.ask-change': line<ConsignmentFacts>({ shipper: ours }),
}

/** The parts of a consignment that pages show or leave out. */
export const CONSIGNMENT_PARTS = [
  'plan',
  'assessment',
  'approvals',
  'documents',
  'run',
  'history',
  'shipper-contacts',
  'our-people',
] as const
export type ConsignmentPart = (typeof CONSIGNMENT_PARTS)[number]

const PARTS_BY_ROLE: Record<Role, readonly ConsignmentPart[]> = {
  dispatcher: CONSIGNMENT_PARTS,
  vet: CONSIGNMENT_PARTS,
  admin: CONSIGNMENT_PARTS,
  /** One contact of the shipper's stands on the run itself; the rest is not a driver's. */
  driver: ['run', 'documents'],
  shipper: ['documents', 'shipper-contacts'],
}

/** What of this consignment the actor may be shown; nothing where the actor may not read it at all. */
export function visibleParts(actor: Actor, facts: ConsignmentFacts): readonly ConsignmentPart[] {
  const permission = consignmentPolicy['consignment.read'][actor.role]
  const reads = permission === true || (permission !== undefined && permission(actor, facts))
  return reads ? PARTS_BY_ROLE[actor.role] : []
}
