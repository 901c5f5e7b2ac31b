import { Model } from 'sequelize'
import type {
  CreationOptional,
  InferAttributes,
  InferCreationAttributes,
  NonAttribute,
  Sequelize,
} from 'sequelize'
import type { PlanCrate } from '@/lib/schemas/plan'
import type { Occupant } from './occupant'
import type { Opening } from './opening'
import { figure, fixedText, key, link, oneOf, optional, smallCount, text } from './columns'

/** A crate of the working plan; dimensions are inside. */
export class Crate extends Model<InferAttributes<Crate>, InferCreationAttributes<Crate>> {
  declare id: CreationOptional<number>
  declare consignmentId: number
  declare ref: string
  declare position: number
  declare letter: string
  declare crateModelId: number | null
  declare form: PlanCrate['form']
  declare lengthCm: number | null
  declare widthCm: number | null
  declare heightCm: number | null
  declare wallMaterial: PlanCrate['wallMaterial']
  declare wallThicknessMm: number
  declare rimMm: number
  declare floorMaterial: PlanCrate['floorMaterial']
  declare floorThicknessMm: number
  declare floorOnto: PlanCrate['floorOnto']
  declare beddingMaterial: PlanCrate['bedding']['material']
  declare beddingDepthMm: number
  declare beddingWetPct: number
  declare waterContainerL: number | null

  declare openings?: NonAttribute<Opening[]>
  declare occupants?: NonAttribute<Occupant[]>
}

export function initCrate(sequelize: Sequelize): typeof Crate {
  return Crate.init(
    {
      id: key(),
      consignmentId: link(),
      ref: text(24),
      position: smallCount(),
      letter: fixedText(1),
      crateModelId: optional(link()),
      form: oneOf(['crate', 'stall', 'pen']),
      lengthCm: optional(figure()),
      widthCm: optional(figure()),
      heightCm: optional(figure()),
      wallMaterial: text(20),
      wallThicknessMm: figure(),
      rimMm: figure(),
      floorMaterial: text(20),
      floorThicknessMm: figure(),
      floorOnto: oneOf(['deck', 'slats', 'air']),
      beddingMaterial: text(20),
      beddingDepthMm: figure(),
      beddingWetPct: figure(),
      waterContainerL: optional(figure()),
    },
    { sequelize, modelName: 'Crate', tableName: 'crates', timestamps: false },
  )
}
