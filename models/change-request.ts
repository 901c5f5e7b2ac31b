import { Model } from 'sequelize'
import type {
  CreationOptional,
  InferAttributes,
  InferCreationAttributes,
  NonAttribute,
  Sequelize,
} from 'sequelize'
import type { User } from './user'
import { count, key, link, moment, text } from './columns'

/** What a shipper asks to have changed. */
export class ChangeRequest extends Model<
  InferAttributes<ChangeRequest>,
  InferCreationAttributes<ChangeRequest>
> {
  declare id: CreationOptional<number>
  declare consignmentId: number
  declare revision: number
  declare userId: number
  declare subject: string
  declare text: string
  declare at: Date

  declare user?: NonAttribute<User>
}

export function initChangeRequest(sequelize: Sequelize): typeof ChangeRequest {
  return ChangeRequest.init(
    {
      id: key(),
      consignmentId: link(),
      revision: count(),
      userId: link(),
      subject: text(120),
      text: text(2000),
      at: moment(),
    },
    { sequelize, modelName: 'ChangeRequest', tableName: 'change_requests', timestamps: false },
  )
}
