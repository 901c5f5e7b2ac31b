import type { Actor, Role } from './actor'
import type { Line, NoFacts } from './table'

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
  'consignment.list': { dispatcher: true, vet: true, admin: true, shipper: true } satisfies Line<NoFacts>,
  'consignment.create': { dispatcher: true } satisfies Line<NoFacts>,

  'consignment.read': {
    dispatcher: true,
    vet: true,
    admin: true,
    driver: drives,
    shipper: ours,
  } satisfies Line<ConsignmentFacts>,
  'consignment.save': { dispatcher: true } satisfies Line<ConsignmentFacts>,
  'consignment.assess': { dispatcher: true } satisfies Line<ConsignmentFacts>,
  'consignment.submit': { dispatcher: true } satisfies Line<ConsignmentFacts>,
  'consignment.release': { dispatcher: true } satisfies Line<ConsignmentFacts>,
  'consignment.cancel': { dispatcher: true } satisfies Line<ConsignmentFacts>,
  'consignment.confirm-air': { dispatcher: true } satisfies Line<ConsignmentFacts>,
  'consignment.confirm-condition': { dispatcher: true } satisfies Line<ConsignmentFacts>,
  'consignment.record-instruction': { dispatcher: true } satisfies Line<ConsignmentFacts>,

  /** A dispatcher does these in a driver's place and writes down why. */
  'consignment.depart': { dispatcher: true, driver: drives } satisfies Line<ConsignmentFacts>,
  'consignment.deliver': { dispatcher: true, driver: drives } satisfies Line<ConsignmentFacts>,
  'consignment.stop': { dispatcher: true, driver: drives } satisfies Line<ConsignmentFacts>,

  'consignment.acknowledge': { shipper: ours } satisfies Line<ConsignmentFacts>,
  'consignment.ask-change': { shipper: ours } satisfies Line<ConsignmentFacts>,
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
  const line: Line<ConsignmentFacts> = consignmentPolicy['consignment.read']
  const permission = line[actor.role]
  const reads = permission === true || (permission !== undefined && permission(actor, facts))
  return reads ? PARTS_BY_ROLE[actor.role] : []
}
