import 'server-only'
import type { Transaction } from 'sequelize'
import { SteadfoldError } from '@/lib/errors'
import type { Actor } from '@/lib/policies/actor'
import type { ConsignmentAct } from '@/lib/schemas/act'
import type { ConsignmentState } from '@/lib/states/consignment'
import type { Consignment } from '@/models'
import { act } from '../act'
import type { Done } from '../act'
import { crateRefs, signedCrates } from '../approvals/signed-crates'
import { authorize } from '../authorize'
import { mailSubmitted } from '../mail/work-mails'
import { absoluteBreaches, currentAssessment } from './current-assessment'
import { move } from './move'
import { findConsignment } from './visible'

/**
 * Sends an assessed plan to the vet. A plan with a breach of law, of a carrier's rule or of a critical limit does not go.
 * Where every crate set-up is signed already for this very plan, it is approved at once; else every vet gets a mail.
 */
export function submitConsignment(
  actor: Actor,
  input: ConsignmentAct,
  now: Date,
): Promise<{ state: ConsignmentState }> {
  const { consignmentId, requestId } = input
  const about = { type: 'consignment', id: consignmentId, consignmentId } as const
  return act(
    { actor, verb: 'consignment.submit', requestId, now, about },
    async (tx): Promise<Done<{ state: ConsignmentState }>> => {
      const { row, facts } = await findConsignment(actor, consignmentId, { tx, lock: true })
      authorize(actor, 'consignment.submit', facts)
      const before = { state: row.state }
      const moved = await move(tx, row, 'submit')
      const { findings } = await currentAssessment(tx, row)
      const absolute = absoluteBreaches(findings)
      if (absolute.length > 0) {
        throw new SteadfoldError(
          'refused',
          `No vet can approve this: ${absolute[0]?.note ?? 'a limit is passed.'}`,
          {
            details: { rules: absolute.map(({ rule }) => rule) },
          },
        )
      }
      const state = (await signedAlready(tx, row)) ? await move(tx, row, 'approve') : moved
      if (state === 'in_review') await mailSubmitted(tx, row, { now, key: requestId, by: actor.name })
      return { result: { state }, before, after: { state } }
    },
  )
}

async function signedAlready(tx: Transaction, row: Consignment): Promise<boolean> {
  const signed = await signedCrates(tx, row)
  return (await crateRefs(tx, row.id)).every((ref) => signed.has(ref))
}
