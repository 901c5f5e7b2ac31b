import { Model } from 'sequelize'
import type { CreationOptional, InferAttributes, InferCreationAttributes, Sequelize } from 'sequelize'
import { fixedText, key, moment, text, withDefault } from './columns'

/** A firm or person whose animals travel. */
export class Shipper extends Model<InferAttributes<Shipper>, InferCreationAttributes<Shipper>> {
  declare id: CreationOptional<number>
  /** Four digits. */
  declare accountNo: string
  declare name: string
  declare email: string
  declare telephone: string
  declare address: string
  /** BCP 47, for mails and documents. */
  declare language: CreationOptional<string>
  declare createdAt: CreationOptional<Date>
  declare updatedAt: CreationOptional<Date>
}

export function initShipper(sequelize: Sequelize): typeof Shipper {
  return Shipper.init(
    {
      id: key(),
      accountNo: fixedText(4),
      name: text(120),
      email: text(254),
      telephone: text(40),
      address: text(300),
      language: withDefault(text(35), 'en-GB'),
      createdAt: moment(),
      updatedAt: moment(),
    },
    { sequelize, modelName: 'Shipper', tableName: 'shippers' },
  )
}
