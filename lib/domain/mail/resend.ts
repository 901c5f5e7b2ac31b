import 'server-only'
import { SteadfoldError } from '@/lib/errors'
import { resend } from '@/lib/mail/outbox'
import type { Actor } from '@/lib/policies/actor'
import type { ResendMail } from '@/lib/schemas/administration'
import { models } from '@/models'
import { act } from '../act'
import type { Done } from '../act'
import { authorize } from '../authorize'

/** A person sends again what may not have arrived, and says who told them: no mail goes twice by itself. */
export function resendMail(actor: Actor, input: ResendMail, now: Date): Promise<{ state: 'waiting' }> {
  const { mailId, requestId, reason } = input
  return act(
    { actor, verb: 'mail.resend', requestId, now, about: { type: 'mail', id: mailId } },
    async (tx): Promise<Done<{ state: 'waiting' }>> => {
      authorize(actor, 'mail.resend')
      const mail = await models.OutboxMessage.findByPk(mailId, {
        attributes: ['id', 'state', 'consignmentId', 'toAddress', 'subject', 'lastError'],
        transaction: tx,
        lock: tx.LOCK.UPDATE,
      })
      if (mail === null) throw new SteadfoldError('not_found', 'There is no such mail.')
      const before = { state: mail.state, lastError: mail.lastError }
      await resend(tx, mailId, now)
      return {
        result: { state: 'waiting' },
        consignmentId: mail.consignmentId,
        before,
        after: { state: 'waiting', to: mail.toAddress, subject: mail.subject },
        note: reason,
      }
    },
  )
}
