import 'server-only'
import { SteadfoldError } from '@/lib/errors'
import type { Actor } from '@/lib/policies/actor'
import type { DeliverConsignment, DepartConsignment, StopConsignment } from '@/lib/schemas/act'
import type { InForceState } from '@/models/consignment'
import { act } from '../act'
import type { Done } from '../act'
import { authorize } from '../authorize'
import { moveInForce } from './move-in-force'
import { findConsignment } from './visible'

type RoadVerb = 'depart' | 'deliver' | 'stop'
type Moved = { state: InForceState }

/** The animals have left. A driver named on the revision in force says so, or a dispatcher in a driver's place. */
export function departConsignment(actor: Actor, input: DepartConsignment, now: Date): Promise<Moved> {
  return onTheRoad('depart', actor, input, now, {})
}

/** The animals have arrived and somebody has received them. */
export function deliverConsignment(actor: Actor, input: DeliverConsignment, now: Date): Promise<Moved> {
  return onTheRoad('deliver', actor, input, now, { note: `Received by ${input.receivedBy}.` })
}

/** The journey is broken off: why, and where the animals are. */
export function stopConsignment(actor: Actor, input: StopConsignment, now: Date): Promise<Moved> {
  const stoppedReason = `${input.reason} The animals are: ${input.whereAnimalsAre}`.slice(0, 500)
  return onTheRoad('stop', actor, input, now, { note: stoppedReason, stoppedReason })
}

function onTheRoad(
  verb: RoadVerb,
  actor: Actor,
  input: DepartConsignment,
  now: Date,
  { note = '', stoppedReason }: { note?: string; stoppedReason?: string },
): Promise<Moved> {
  const { consignmentId, requestId } = input
  const about = { type: 'consignment', id: consignmentId, consignmentId } as const
  return act(
    { actor, verb: `consignment.${verb}`, requestId, now, about },
    async (tx): Promise<Done<Moved>> => {
      const { row, facts } = await findConsignment(actor, consignmentId, { tx, lock: true })
      authorize(actor, `consignment.${verb}`, facts)
      const instead = insteadOfDriver(actor, input.inPlaceOfDriver)
      const before = { state: row.state, inForceState: row.inForceState, revision: row.revision }
      const who = { actor, now }
      const { state, setAside } = await moveInForce(
        tx,
        row,
        verb,
        who,
        stoppedReason === undefined ? {} : { stoppedReason },
      )
      return {
        result: { state },
        before,
        after: { state, revision: row.revision },
        note: [note, instead, setAside ?? ''].filter((part) => part !== '').join(' '),
      }
    },
  )
}

/** A dispatcher acts in a driver's place only with the reason written down. */
function insteadOfDriver(actor: Actor, reason: string): string {
  if (actor.role !== 'dispatcher') return ''
  if (reason !== '') return `In the driver’s place: ${reason}`
  throw new SteadfoldError('invalid', 'Say why you do this in the driver’s place.', {
    issues: [{ path: 'inPlaceOfDriver', message: 'Reason is missing: you act in the driver’s place.' }],
  })
}
