import 'server-only'
import type { Transaction } from 'sequelize'
import { SteadfoldError } from '@/lib/errors'
import type { Holder } from '@/lib/schemas/board'
import { STATE_WORDS, nextState } from '@/lib/states/consignment'
import type { ConsignmentMove, ConsignmentState } from '@/lib/states/consignment'
import { models } from '@/models'
import type { Consignment } from '@/models'

type Also = Parameters<typeof models.Consignment.update>[0]

/**
 * Moves the working revision along the written table, by an update that names the state it starts from. `wrong_state`
 * where the table has no such line, or where somebody else has moved it meanwhile.
 */
export async function move(
  tx: Transaction,
  row: Consignment,
  verb: ConsignmentMove,
  also: Also = {},
): Promise<ConsignmentState> {
  const from = row.state
  const to = nextState(from, verb)
  if (to === undefined) throw wrongState(from, verb)
  const [count] = await models.Consignment.update(
    { holder: HOLDER_OF[to], ...also, state: to },
    { where: { id: row.id, state: from, version: row.version }, transaction: tx },
  )
  if (count === 0) {
    throw new SteadfoldError('wrong_state', 'Somebody else has just changed this consignment. Load it again.')
  }
  await row.reload({ transaction: tx })
  return to
}

export function wrongState(from: ConsignmentState, verb: ConsignmentMove): SteadfoldError {
  return new SteadfoldError(
    'wrong_state',
    `This consignment is ${STATE_WORDS[from].toLowerCase()}: ${MOVE_WORDS[verb]}`,
    {
      details: { state: from, verb },
    },
  )
}

/** Whose move it is in each state. */
export const HOLDER_OF: Record<ConsignmentState, Holder> = {
  draft: 'dispatcher',
  assessed: 'dispatcher',
  in_review: 'vet',
  returned: 'dispatcher',
  approved: 'dispatcher',
  released: 'driver',
  under_way: 'driver',
  delivered: 'nobody',
  stopped: 'nobody',
  cancelled: 'nobody',
}

const MOVE_WORDS: Record<ConsignmentMove, string> = {
  save: 'its plan can no longer be changed.',
  assess: 'it cannot be assessed.',
  submit: 'only an assessed plan goes to the vet.',
  approve: 'only what is in review can be approved.',
  return: 'only what is in review can be returned.',
  withdraw: 'an approval can be withdrawn only before the journey starts.',
  lapse: 'only what is approved can lose its approval.',
  release: 'only an approved consignment can be released.',
  depart: 'only a released consignment can depart.',
  deliver: 'only a consignment under way can be delivered.',
  stop: 'only a journey under way can be broken off.',
  cancel: 'it can no longer be cancelled.',
}
