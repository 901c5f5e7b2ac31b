import { Model } from 'sequelize'
import type { CreationOptional, InferAttributes, InferCreationAttributes, Sequelize } from 'sequelize'
import { FACES } from '@/lib/schemas/plan'
import type { PlanOpening } from '@/lib/schemas/plan'
import { figure, key, link, oneOf, optional, smallCount, text } from './columns'

/** A row of a crate's openings. */
export class Opening extends Model<InferAttributes<Opening>, InferCreationAttributes<Opening>> {
  declare id: CreationOptional<number>
  declare crateId: number
  declare ref: string
  declare position: number
  declare face: PlanOpening['face']
  declare kind: PlanOpening['kind']
  declare widthCm: number
  declare heightCm: number
  declare howMany: number
  declare sillHeightCm: number | null
  declare meshOpenPct: number
  declare blockedPct: number
}

export function initOpening(sequelize: Sequelize): typeof Opening {
  return Opening.init(
    {
      id: key(),
      crateId: link(),
      ref: text(24),
      position: smallCount(),
      face: oneOf(FACES),
      kind: oneOf(['door', 'slats', 'slots', 'holes', 'window']),
      widthCm: figure(),
      heightCm: figure(),
      howMany: smallCount(),
      sillHeightCm: optional(figure()),
      meshOpenPct: figure(),
      blockedPct: figure(),
    },
    { sequelize, modelName: 'Opening', tableName: 'openings', timestamps: false },
  )
}
