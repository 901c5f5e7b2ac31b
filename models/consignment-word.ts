import { Model } from 'sequelize'
import type { InferAttributes, InferCreationAttributes, Sequelize } from 'sequelize'
import { link, text } from './columns'

/** One word, in lower case, that a consignment can be found by. */
export class ConsignmentWord extends Model<
  InferAttributes<ConsignmentWord>,
  InferCreationAttributes<ConsignmentWord>
> {
  declare word: string
  declare consignmentId: number
}

export function initConsignmentWord(sequelize: Sequelize): typeof ConsignmentWord {
  return ConsignmentWord.init(
    {
      word: { ...text(40), primaryKey: true },
      consignmentId: { ...link(), primaryKey: true },
    },
    { sequelize, modelName: 'ConsignmentWord', tableName: 'consignment_words', timestamps: false },
  )
}
