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
import {
  count,
  fixedText,
  json,
  key,
  link,
  moment,
  oneOf,
  optional,
  smallCount,
  text,
  withDefault,
} from './columns'

export const CHECKLIST_KINDS = [
  'tick',
  'not_done',
  'reading',
  'water',
  'condition',
  'handover',
  'note',
  'close_leg',
] as const
export type ChecklistKind = (typeof CHECKLIST_KINDS)[number]

/** What a driver wrote down on the road. */
export class ChecklistEntry extends Model<
  InferAttributes<ChecklistEntry>,
  InferCreationAttributes<ChecklistEntry>
> {
  declare id: CreationOptional<number>
  /** Minted on the device: sent twice, stored once. */
  declare clientId: string
  declare consignmentId: number
  declare revision: number
  declare legRef: string | null
  declare itemKey: string
  declare kind: ChecklistKind
  /** When it happened, by the device's clock. */
  declare at: Date
  declare place: CreationOptional<string>
  declare value: unknown
  declare alive: number | null
  declare dead: number | null
  declare short: number | null
  declare userId: number
  declare receivedAt: Date

  declare user?: NonAttribute<User>
}

export function initChecklistEntry(sequelize: Sequelize): typeof ChecklistEntry {
  return ChecklistEntry.init(
    {
      id: key(),
      clientId: fixedText(36),
      consignmentId: link(),
      revision: count(),
      legRef: optional(text(24)),
      itemKey: text(80),
      kind: oneOf(CHECKLIST_KINDS),
      at: moment(),
      place: withDefault(text(160), ''),
      value: json('value', z.json()),
      alive: optional(smallCount()),
      dead: optional(smallCount()),
      short: optional(smallCount()),
      userId: link(),
      receivedAt: moment(),
    },
    { sequelize, modelName: 'ChecklistEntry', tableName: 'checklist_entries', timestamps: false },
  )
}
