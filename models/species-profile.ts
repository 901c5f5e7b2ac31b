import { Model } from 'sequelize'
import type { CreationOptional, InferAttributes, InferCreationAttributes, Sequelize } from 'sequelize'
import { z } from 'zod'
import { count, json, key, link, moment, optional, text } from './columns'

/** One version of a species row; never changed, never removed. */
export class SpeciesProfile extends Model<
  InferAttributes<SpeciesProfile>,
  InferCreationAttributes<SpeciesProfile>
> {
  declare id: CreationOptional<number>
  /** Plain English in kebab-case, e.g. "day-old-chick". */
  declare key: string
  declare version: number
  declare commonName: string
  declare scientificName: string
  /** The sourced profile; whoever computes with it parses it by its own schema. */
  declare profile: Record<string, unknown>
  declare createdBy: number | null
  declare createdAt: CreationOptional<Date>
}

export function initSpeciesProfile(sequelize: Sequelize): typeof SpeciesProfile {
  return SpeciesProfile.init(
    {
      id: key(),
      key: text(40),
      version: count(),
      commonName: text(80),
      scientificName: text(80),
      profile: json('profile', z.record(z.string(), z.unknown())),
      createdBy: optional(link()),
      createdAt: moment(),
    },
    { sequelize, modelName: 'SpeciesProfile', tableName: 'species_profiles', updatedAt: false },
  )
}
