import { Model } from 'sequelize'
import type { CreationOptional, InferAttributes, InferCreationAttributes, Sequelize } from 'sequelize'
import { hash, longText, moment, text } from './columns'

/** What was assessed, approved or released, kept for good under its hash. */
export class Snapshot extends Model<InferAttributes<Snapshot>, InferCreationAttributes<Snapshot>> {
  /** SHA-256 of the bytes of body. */
  declare hash: string
  /** "scenario", "plan", "sheet", "manifest". */
  declare kind: string
  /** Canonical JSON (RFC 8785). */
  declare body: string
  declare createdAt: CreationOptional<Date>
}

export function initSnapshot(sequelize: Sequelize): typeof Snapshot {
  return Snapshot.init(
    {
      hash: { ...hash(), primaryKey: true },
      kind: text(20),
      body: longText('long'),
      createdAt: moment(),
    },
    { sequelize, modelName: 'Snapshot', tableName: 'snapshots', updatedAt: false },
  )
}
