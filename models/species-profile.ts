import { Model } from 'sequelize'
import type { CreationOptional, InferAttributes, InferCreationAttributes, Sequelize } from 'sequelize'
import { z } from 'zod'
import type { Profile } from '@/lib/species'
import { count, json, key, link, moment, optional, text } from './columns'

const profileShape = z.looseObject({
  key: z.string(),
  version: z.number().int(),
  limits: z.record(z.string(), z.looseObject({ value: z.number(), unit: z.string() })),
  remarks: z.array(z.string()),
})

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
  /** Every figure with its source; profileValues of lib/species refuses a row that cannot be computed with. */
  declare profile: Profile
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
      profile: json('profile', profileShape),
      createdBy: optional(link()),
      createdAt: moment(),
    },
    { sequelize, modelName: 'SpeciesProfile', tableName: 'species_profiles', updatedAt: false },
  )
}
