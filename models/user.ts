import { Model } from 'sequelize'
import type {
  CreationOptional,
  InferAttributes,
  InferCreationAttributes,
  NonAttribute,
  Sequelize,
} from 'sequelize'
import type { Shipper } from './shipper'
import { day, fixedText, key, link, moment, oneOf, optional, text, withDefault } from './columns'

export const USER_ROLES = ['dispatcher', 'vet', 'driver', 'shipper', 'admin'] as const
export type UserRole = (typeof USER_ROLES)[number]

/** A person of the firm, or of a shipper, with exactly one role. */
export class User extends Model<InferAttributes<User>, InferCreationAttributes<User>> {
  declare id: CreationOptional<number>
  declare email: string
  declare name: string
  declare role: UserRole
  /** Set for shippers and for nobody else; the database insists. */
  declare shipperId: number | null
  /** argon2id. Never leaves the server. */
  declare passwordHash: string
  declare telephone: CreationOptional<string>
  /** A vet's registration, as an admin checked it. */
  declare registrationNumber: string | null
  declare registrationCountry: string | null
  declare registrationExpiresOn: string | null
  declare registrationCheckedBy: number | null
  declare registrationCheckedAt: Date | null
  declare disabledAt: Date | null
  declare createdAt: CreationOptional<Date>
  declare updatedAt: CreationOptional<Date>

  declare shipper?: NonAttribute<Shipper | null>
}

export function initUser(sequelize: Sequelize): typeof User {
  return User.init(
    {
      id: key(),
      email: text(254),
      name: text(120),
      role: oneOf(USER_ROLES),
      shipperId: optional(link()),
      passwordHash: text(200),
      telephone: withDefault(text(40), ''),
      registrationNumber: optional(text(40)),
      registrationCountry: optional(fixedText(2)),
      registrationExpiresOn: optional(day()),
      registrationCheckedBy: optional(link()),
      registrationCheckedAt: optional(moment()),
      disabledAt: optional(moment()),
      createdAt: moment(),
      updatedAt: moment(),
    },
    { sequelize, modelName: 'User', tableName: 'users' },
  )
}
