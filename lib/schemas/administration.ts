import { z } from 'zod'
import { requestId, rowId } from './act'
import { requiredText } from './quantity'

/** The roles as a form names them; lib/policies/actor.ts holds what they mean. */
const ROLE_NAMES = ['dispatcher', 'vet', 'driver', 'shipper', 'admin'] as const
export const MAIL_STATES = ['waiting', 'sending', 'sent', 'uncertain', 'failed'] as const

/** How the list of people is asked for; unknown words fall back, never fail. */
export const userQuerySchema = z.object({
  /** Beginning of a name, or part of an address. */
  find: z.string().trim().max(80).catch('').default(''),
  role: z.enum(ROLE_NAMES).nullable().catch(null).default(null),
  /** Opaque: where the page before ended. */
  after: z.string().max(400).nullable().catch(null).default(null),
  limit: z.number().int().min(1).max(200).catch(50).default(50),
})
export type UserQuery = z.infer<typeof userQuerySchema>

/** How the mail queue is asked for. */
export const mailQuerySchema = z.object({
  /** A mark, or part of an address. */
  find: z.string().trim().max(80).catch('').default(''),
  states: z.array(z.enum(MAIL_STATES)).catch([]).default([]),
  /** Older than this one. */
  before: z.number().int().positive().nullable().catch(null).default(null),
  limit: z.number().int().min(1).max(200).catch(30).default(30),
})
export type MailQuery = z.infer<typeof mailQuerySchema>

/** A person sends an uncertain or failed mail again, and says how they know that it did not arrive. */
export const resendMailSchema = z.object({
  mailId: rowId,
  requestId,
  reason: requiredText('Who told you, and when', 300),
})
export type ResendMail = z.infer<typeof resendMailSchema>
