import 'server-only'
import type { Transaction } from 'sequelize'
import { models } from '@/models'
import type { Actor } from '@/lib/policies/actor'

export type SubjectType =
  'consignment' | 'assessment' | 'approval' | 'condition' | 'document' | 'run' | 'user' | 'mail' | 'catalogue'

export interface Happening {
  /** null: nobody signed in, or the worker. */
  actor: Actor | null
  /** "consignment.save"; a refusal adds ".refused". */
  verb: string
  subject: { type: SubjectType; id: number | string | null }
  at: Date
  consignmentId?: number | null
  requestId?: string | null
  before?: Record<string, unknown> | null
  after?: Record<string, unknown> | null
  note?: string
}

/** Adds one line to the audit trail, in the transaction of the deed it speaks of. Lines are never changed. */
export async function record(tx: Transaction | null, happening: Happening): Promise<void> {
  const { actor, subject } = happening
  await models.AuditEvent.create(
    {
      at: happening.at,
      actorId: actor?.id ?? null,
      actorRole: actor?.role ?? null,
      ip: actor?.ip ?? null,
      verb: happening.verb,
      subjectType: subject.type,
      subjectId: subject.id === null ? null : String(subject.id).slice(0, 64),
      consignmentId: happening.consignmentId ?? null,
      requestId: happening.requestId ?? null,
      before: happening.before ?? null,
      after: happening.after ?? null,
      note: (happening.note ?? '').slice(0, 1000),
    },
    { transaction: tx },
  )
}
