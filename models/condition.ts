import { Model } from 'sequelize'
import type { CreationOptional, InferAttributes, InferCreationAttributes, Sequelize } from 'sequelize'
import { count, hash, key, link, moment, oneOf, optional, text, withDefault, yesNo } from './columns'

export const CONDITION_ORIGINS = ['narrow_margin', 'rule', 'vet'] as const
export type ConditionOrigin = (typeof CONDITION_ORIGINS)[number]

/** What is asked of a party so that a verdict holds, and the answer. */
export class Condition extends Model<InferAttributes<Condition>, InferCreationAttributes<Condition>> {
  declare id: CreationOptional<number>
  declare consignmentId: number
  declare revision: number
  declare planHash: string
  declare origin: ConditionOrigin
  declare approvalId: number | null
  declare findingRule: string | null
  /** null: the whole journey. */
  declare legRef: string | null
  declare party: string
  declare text: string
  /** Our own checklist item is the confirmation; it does not hold release. */
  declare ours: boolean
  declare askedAt: Date
  declare answer: 'confirmed' | 'refused' | null
  declare answeredBy: string | null
  declare answeredHow: 'writing' | 'telephone' | 'in person' | null
  declare answeredAt: Date | null
  declare answerNote: CreationOptional<string>
  declare recordedBy: number | null
  declare kept: boolean | null
}

export function initCondition(sequelize: Sequelize): typeof Condition {
  return Condition.init(
    {
      id: key(),
      consignmentId: link(),
      revision: count(),
      planHash: hash(),
      origin: oneOf(CONDITION_ORIGINS),
      approvalId: optional(link()),
      findingRule: optional(text(80)),
      legRef: optional(text(24)),
      party: text(120),
      text: text(500),
      ours: yesNo(),
      askedAt: moment(),
      answer: optional(oneOf(['confirmed', 'refused'])),
      answeredBy: optional(text(120)),
      answeredHow: optional(oneOf(['writing', 'telephone', 'in person'])),
      answeredAt: optional(moment()),
      answerNote: withDefault(text(500), ''),
      recordedBy: optional(link()),
      kept: optional(yesNo()),
    },
    { sequelize, modelName: 'Condition', tableName: 'conditions', timestamps: false },
  )
}
