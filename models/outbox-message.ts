import { Model } from 'sequelize'
import type { CreationOptional, InferAttributes, InferCreationAttributes, Sequelize } from 'sequelize'
import { z } from 'zod'
import { json, key, link, longText, moment, oneOf, optional, smallCount, text, withDefault } from './columns'

export const OUTBOX_STATES = ['waiting', 'sending', 'sent', 'uncertain', 'failed'] as const
export type OutboxState = (typeof OUTBOX_STATES)[number]

/** A mail to go out. */
export class OutboxMessage extends Model<
  InferAttributes<OutboxMessage>,
  InferCreationAttributes<OutboxMessage>
> {
  declare id: CreationOptional<number>
  declare messageId: string
  declare consignmentId: number | null
  declare toAddress: string
  declare subject: string
  declare text: string
  declare html: string
  /** Ids of documents. */
  declare attachments: number[]
  declare dedupeKey: string | null
  declare state: CreationOptional<OutboxState>
  declare attempts: CreationOptional<number>
  declare nextAttemptAt: Date
  declare leaseUntil: Date | null
  declare leasedBy: string | null
  declare lastError: string | null
  declare sentAt: Date | null
  declare createdAt: CreationOptional<Date>
  declare updatedAt: CreationOptional<Date>
}

export function initOutboxMessage(sequelize: Sequelize): typeof OutboxMessage {
  return OutboxMessage.init(
    {
      id: key(),
      messageId: text(160),
      consignmentId: optional(link()),
      toAddress: text(254),
      subject: text(250),
      text: longText('medium'),
      html: longText('medium'),
      attachments: json('attachments', z.array(z.number().int().positive())),
      dedupeKey: optional(text(160)),
      state: withDefault(oneOf(OUTBOX_STATES), 'waiting'),
      attempts: withDefault(smallCount(), 0),
      nextAttemptAt: moment(),
      leaseUntil: optional(moment()),
      leasedBy: optional(text(80)),
      lastError: optional(text(2000)),
      sentAt: optional(moment()),
      createdAt: moment(),
      updatedAt: moment(),
    },
    { sequelize, modelName: 'OutboxMessage', tableName: 'outbox_messages' },
  )
}
