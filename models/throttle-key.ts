import { Model } from 'sequelize'
import type { InferAttributes, InferCreationAttributes, Sequelize } from 'sequelize'
import { hash, moment, text } from './columns'

/** One row for each key of a limit: whoever counts an attempt holds it, so that attempts are counted one after the other. */
export class ThrottleKey extends Model<InferAttributes<ThrottleKey>, InferCreationAttributes<ThrottleKey>> {
  /** "sign-in" or "verify". */
  declare scope: string
  declare keyHash: string
  declare lastAt: Date
}

export function initThrottleKey(sequelize: Sequelize): typeof ThrottleKey {
  return ThrottleKey.init(
    {
      scope: { ...text(20), primaryKey: true },
      keyHash: { ...hash(), primaryKey: true },
      lastAt: moment(),
    },
    { sequelize, modelName: 'ThrottleKey', tableName: 'throttle_keys', timestamps: false },
  )
}
