import { Model } from 'sequelize'
import type { CreationOptional, InferAttributes, InferCreationAttributes, Sequelize } from 'sequelize'
import type { z } from 'zod'
import { crateSchema } from '@/lib/schemas/plan'
import { json, key, moment, text, withDefault, yesNo } from './columns'

/** What is the same for every crate of a model: all but its name in a plan and who is inside. */
export const crateModelSpecSchema = crateSchema.omit({
  id: true,
  letter: true,
  crateModelId: true,
  occupants: true,
})
export type CrateModelSpec = z.infer<typeof crateModelSpecSchema>

/** A size of crate the firm keeps. */
export class CrateModel extends Model<InferAttributes<CrateModel>, InferCreationAttributes<CrateModel>> {
  declare id: CreationOptional<number>
  declare name: string
  declare spec: CrateModelSpec
  declare active: CreationOptional<boolean>
  declare createdAt: CreationOptional<Date>
  declare updatedAt: CreationOptional<Date>
}

export function initCrateModel(sequelize: Sequelize): typeof CrateModel {
  return CrateModel.init(
    {
      id: key(),
      name: text(80),
      spec: json('spec', crateModelSpecSchema),
      active: withDefault(yesNo(), true),
      createdAt: moment(),
      updatedAt: moment(),
    },
    { sequelize, modelName: 'CrateModel', tableName: 'crate_models' },
  )
}
