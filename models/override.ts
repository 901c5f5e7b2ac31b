import { Model } from 'sequelize'
import type { CreationOptional, InferAttributes, InferCreationAttributes, Sequelize } from 'sequelize'
import { figure, key, link, optional, text, whole } from './columns'

/** One finding a vet overrode by name, with the reason. */
export class Override extends Model<InferAttributes<Override>, InferCreationAttributes<Override>> {
  declare id: CreationOptional<number>
  declare approvalId: number
  declare findingRule: string
  declare animalRef: string | null
  declare legRef: string | null
  declare reason: string
  /** What it was signed for; a later run beyond any of these figures ends it. */
  declare minutesPast: number
  declare worstBodyC: number | null
  declare worstValue: CreationOptional<number | null>
}

export function initOverride(sequelize: Sequelize): typeof Override {
  return Override.init(
    {
      id: key(),
      approvalId: link(),
      findingRule: text(80),
      animalRef: optional(text(24)),
      legRef: optional(text(24)),
      reason: text(2000),
      minutesPast: whole(),
      worstBodyC: optional(figure()),
      worstValue: optional(figure()),
    },
    { sequelize, modelName: 'Override', tableName: 'overrides', timestamps: false },
  )
}
