import { Model } from 'sequelize'
import type { InferAttributes, InferCreationAttributes, NonAttribute, Sequelize } from 'sequelize'
import type { User } from './user'
import { link, moment } from './columns'

/** A shipper has seen a document; once per document. */
export class Acknowledgement extends Model<
  InferAttributes<Acknowledgement>,
  InferCreationAttributes<Acknowledgement>
> {
  declare documentId: number
  declare userId: number
  declare at: Date

  declare user?: NonAttribute<User>
}

export function initAcknowledgement(sequelize: Sequelize): typeof Acknowledgement {
  return Acknowledgement.init(
    {
      documentId: { ...link(), primaryKey: true },
      userId: link(),
      at: moment(),
    },
    { sequelize, modelName: 'Acknowledgement', tableName: 'acknowledgements', timestamps: false },
  )
}
