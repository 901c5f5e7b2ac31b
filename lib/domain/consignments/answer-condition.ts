import 'server-only'
import { SteadfoldError } from '@/lib/errors'
import type { Actor } from '@/lib/policies/actor'
import type { ConditionAnswerInput } from '@/lib/schemas/act'
import { models } from '@/models'
import { act } from '../act'
import type { Done } from '../act'
import { authorize } from '../authorize'
import { writeEffectiveVerdict } from './effective-figures'
import { findConsignment } from './visible'

/**
 * Writes down what a party answered to a condition: confirmed or refused, by whom and how. It is answered once, and the
 * verdict that counts follows: what is refused cannot go.
 */
export function answerCondition(
  actor: Actor,
  input: ConditionAnswerInput,
  now: Date,
): Promise<{ answer: 'confirmed' | 'refused' }> {
  const { conditionId, requestId } = input
  const about = { type: 'condition', id: conditionId } as const
  return act(
    { actor, verb: 'consignment.confirm-condition', requestId, now, about },
    async (tx): Promise<Done<{ answer: 'confirmed' | 'refused' }>> => {
      const condition = await models.Condition.findByPk(conditionId, { transaction: tx })
      if (condition === null) throw new SteadfoldError('not_found', 'There is no such condition.')
      const { row, facts } = await findConsignment(actor, condition.consignmentId, { tx, lock: true })
      authorize(actor, 'consignment.confirm-condition', facts)
      const [count] = await models.Condition.update(
        {
          answer: input.answer,
          answeredBy: input.answeredBy,
          answeredHow: input.how,
          answeredAt: now,
          answerNote: input.note,
          recordedBy: actor.id,
        },
        { where: { id: conditionId, answer: null }, transaction: tx },
      )
      if (count === 0) throw new SteadfoldError('wrong_state', 'This condition has an answer already.')
      await writeEffectiveVerdict(tx, row)
      return {
        result: { answer: input.answer },
        consignmentId: row.id,
        after: { answer: input.answer, answeredBy: input.answeredBy, how: input.how },
        note: input.note,
      }
    },
  )
}
