import { z } from 'zod'

/** How the audit trail is asked for; unknown words fall back, never fail. */
export const auditQuerySchema = z.object({
  actorId: z.number().int().positive().nullable().catch(null).default(null),
  consignmentId: z.number().int().positive().nullable().catch(null).default(null),
  verb: z.string().trim().max(60).catch('').default(''),
  /** Only what was refused. */
  refused: z.boolean().catch(false).default(false),
  /** Days, "2026-06-09", UTC, both included. */
  from: z.iso.date().nullable().catch(null).default(null),
  to: z.iso.date().nullable().catch(null).default(null),
  /** Lines older than this one, newest first. */
  before: z.number().int().positive().nullable().catch(null).default(null),
  limit: z.number().int().min(1).max(200).catch(100).default(100),
})
export type AuditQuery = z.infer<typeof auditQuerySchema>
