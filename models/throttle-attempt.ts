import { Model } from 'sequelize'
import type { CreationOptional, InferAttributes, InferCreationAttributes, Sequelize } from 'sequelize'
import { hash, key, moment, text } from './columns'

/** One attempt that counts towards a limit. */
export class ThrottleAttempt extends Model<
  InferAttributes<ThrottleAttempt>,
  InferCreationAttributes<ThrottleAttempt>
> {
  declare id: CreationOptional<number>
  /** "sign-in" or "verify". */
  declare scope: string
  declare keyHash: string
  declare at: Date
}

export function initThrottleAttempt(sequelize: Sequelize): typeof ThrottleAttempt {
  return ThrottleAttempt.init(
    {
      id: key(),
      scope: text(20),
      keyHash: hash(),
      at: moment(),
    },
    { sequelize, modelName: 'ThrottleAttempt', tableName: 'throttle_attempts', timestamps: false },
  )
}
