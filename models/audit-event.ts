import { Model } from 'sequelize'
import type {
  CreationOptional,
  InferAttributes,
  InferCreationAttributes,
  NonAttribute,
  Sequelize,
} from 'sequelize'
import { z } from 'zod'
import type { User } from './user'
import { fixedText, json, key, link, moment, optional, text, withDefault } from './columns'

/** Who did what, when and from where. Rows are only ever added; the database refuses the rest. */
export class AuditEvent extends Model<InferAttributes<AuditEvent>, InferCreationAttributes<AuditEvent>> {
  declare id: CreationOptional<number>
  declare at: Date
  /** null: nobody signed in, or the worker. */
  declare actorId: number | null
  declare actorRole: string | null
  declare ip: string | null
  declare verb: string
  declare subjectType: string
  declare subjectId: string | null
  declare consignmentId: number | null
  /** Minted by the page: the same request cannot do the same verb twice. */
  declare requestId: string | null
  declare before: Record<string, unknown> | null
  declare after: Record<string, unknown> | null
  declare note: CreationOptional<string>

  declare actor?: NonAttribute<User | null>
}

export function initAuditEvent(sequelize: Sequelize): typeof AuditEvent {
  return AuditEvent.init(
    {
      id: key(),
      at: moment(),
      actorId: optional(link()),
      actorRole: optional(text(20)),
      ip: optional(text(45)),
      verb: text(60),
      subjectType: text(40),
      subjectId: optional(text(64)),
      consignmentId: optional(link()),
      requestId: optional(fixedText(36)),
      before: optional(json('before', z.record(z.string(), z.unknown()))),
      after: optional(json('after', z.record(z.string(), z.unknown()))),
      note: withDefault(text(1000), ''),
    },
    { sequelize, modelName: 'AuditEvent', tableName: 'audit_events', timestamps: false },
  )
}
