import { Model } from 'sequelize'
import type { CreationOptional, InferAttributes, InferCreationAttributes, Sequelize } from 'sequelize'
import { decimal, fixedText, key, moment, oneOf, text, withDefault } from './columns'

export const PLACE_KINDS = [
  'address',
  'depot',
  'kennel',
  'clinic',
  'airport',
  'seaport',
  'railhead',
  'border_post',
] as const
export type PlaceKind = (typeof PLACE_KINDS)[number]

/** Where a leg starts or ends. */
export class Place extends Model<InferAttributes<Place>, InferCreationAttributes<Place>> {
  declare id: CreationOptional<number>
  declare name: string
  declare kind: PlaceKind
  declare address: CreationOptional<string>
  /** ISO 3166-1 alpha-2. */
  declare country: string
  /** IANA, e.g. "Europe/London". */
  declare zone: string
  declare latitude: number
  declare longitude: number
  declare telephone: CreationOptional<string>
  declare hours: CreationOptional<string>
  declare createdAt: CreationOptional<Date>
  declare updatedAt: CreationOptional<Date>
}

export function initPlace(sequelize: Sequelize): typeof Place {
  return Place.init(
    {
      id: key(),
      name: text(120),
      kind: oneOf(PLACE_KINDS),
      address: withDefault(text(300), ''),
      country: fixedText(2),
      zone: text(40),
      latitude: decimal('latitude', 8, 5),
      longitude: decimal('longitude', 8, 5),
      telephone: withDefault(text(40), ''),
      hours: withDefault(text(120), ''),
      createdAt: moment(),
      updatedAt: moment(),
    },
    { sequelize, modelName: 'Place', tableName: 'places' },
  )
}
