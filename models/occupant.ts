import { Model } from 'sequelize'
import type { InferAttributes, InferCreationAttributes, NonAttribute, Sequelize } from 'sequelize'
import type { Animal } from './animal'
import { link, smallCount } from './columns'

/** Who is in which crate; an animal is in one at most. */
export class Occupant extends Model<InferAttributes<Occupant>, InferCreationAttributes<Occupant>> {
  declare animalId: number
  declare crateId: number
  declare position: number

  declare animal?: NonAttribute<Animal>
}

export function initOccupant(sequelize: Sequelize): typeof Occupant {
  return Occupant.init(
    {
      animalId: { ...link(), primaryKey: true },
      crateId: link(),
      position: smallCount(),
    },
    { sequelize, modelName: 'Occupant', tableName: 'occupants', timestamps: false },
  )
}
