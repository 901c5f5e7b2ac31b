import type { Role } from '@/lib/policies/actor'
import type { Moment } from './sheet'

/* What the firm's own lists show: people, mails, the audit trail, the certificate that seals papers. */

export interface UserRow {
  id: number
  name: string
  email: string
  telephone: string
  role: Role
  /** The firm a shipper's user speaks for. */
  shipperName: string | null
  since: Moment
  /** Set while the account may not sign in. */
  offSince: Moment | null
  registration: RegistrationView | null
}

/** A vet's registration as an admin checked it. */
export interface RegistrationView {
  number: string
  country: string
  /** Day, "2027-03-31". */
  expiresOn: string
  checked: Moment | null
}

export type MailState = 'waiting' | 'sending' | 'sent' | 'uncertain' | 'failed'

export interface MailRow {
  id: number
  state: MailState
  /** When it was sent, is next tried, or stopped. */
  at: Moment
  /** When what it says was decided. */
  written: Moment
  mark: string | null
  consignmentId: number | null
  to: string
  subject: string
  attempts: number
  lastWord: string
}

export interface MailDetail extends MailRow {
  messageId: string
  text: string
  attachments: { documentId: number; words: string }[]
}

export interface AuditRow {
  id: number
  at: Moment
  who: string
  role: Role | null
  verb: string
  subject: string
  mark: string | null
  consignmentId: number | null
  from: string
  note: string
  before: Record<string, unknown> | null
  after: Record<string, unknown> | null
  /** Something was refused. */
  refused: boolean
}

/** What the certificate that seals papers says of itself. */
export interface CertificateView {
  subject: string
  issuer: string
  serial: string
  validFrom: Moment
  validTo: Moment
  selfIssued: boolean
  state: 'in-force' | 'not-yet' | 'ended'
}
