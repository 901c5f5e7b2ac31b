import { DataTypes } from 'sequelize'
import type { Model, ModelAttributeColumnOptions } from 'sequelize'
import type { z } from 'zod'

/*
 * Kinds of columns. Each call makes a new object, because Sequelize writes into what it is given.
 * A column is required unless wrapped in optional().
 */

type Column = ModelAttributeColumnOptions<Model>

const required = (type: Column['type']): Column => ({ type, allowNull: false })

export const optional = (column: Column): Column => ({ ...column, allowNull: true })

export const withDefault = (column: Column, defaultValue: unknown): Column => ({ ...column, defaultValue })

/** The row's own number, given by the database. */
export const key = (): Column => ({
  ...required(DataTypes.BIGINT.UNSIGNED),
  primaryKey: true,
  autoIncrement: true,
})

/** The number of a row in another table. */
export const link = (): Column => required(DataTypes.BIGINT.UNSIGNED)

export const text = (length: number): Column => required(DataTypes.STRING(length))

export const fixedText = (length: number): Column => required(DataTypes.CHAR(length))

export const longText = (size?: 'medium' | 'long'): Column =>
  required(size === undefined ? DataTypes.TEXT : DataTypes.TEXT({ length: size }))

/** SHA-256 in lower-case hexadecimal. */
export const hash = (): Column => fixedText(64)

export const yesNo = (): Column => required(DataTypes.BOOLEAN)

export const oneOf = (words: readonly string[]): Column => required(DataTypes.ENUM(...words))

/** A whole number that is never negative. */
export const count = (): Column => required(DataTypes.INTEGER.UNSIGNED)

export const smallCount = (): Column => required(DataTypes.SMALLINT.UNSIGNED)

export const whole = (): Column => required(DataTypes.INTEGER)

export const smallWhole = (): Column => required(DataTypes.SMALLINT)

/** A figure as somebody typed it: comes back with the very same bits. */
export const figure = (): Column => required(DataTypes.DOUBLE)

/** An instant, UTC, to the millisecond. */
export const moment = (): Column => required(DataTypes.DATE(3))

/** A calendar day as 'yyyy-MM-dd'; give it as such a string, never as a Date. */
export const day = (): Column => required(DataTypes.DATEONLY)

export const bytes = (): Column => required(DataTypes.BLOB('long'))

/**
 * A figure with a fixed number of decimals. The driver hands it over as an exact string; with at most fifteen digits
 * the number made of it here is the same figure.
 */
export function decimal(name: string, digits: number, decimals: number): Column {
  return {
    ...required(DataTypes.DECIMAL(digits, decimals)),
    get(this: Model) {
      const value: unknown = this.getDataValue(name as never)
      return value === null || value === undefined ? value : Number(value)
    },
  }
}

/**
 * JSON whose shape matters: read through its schema, so that a row written by older code or by hand fails here,
 * with the column's name, and not somewhere inside a verdict.
 */
export function json(name: string, schema: z.ZodType): Column {
  return {
    ...required(DataTypes.JSON),
    get(this: Model) {
      const value: unknown = this.getDataValue(name as never)
      if (value === null || value === undefined) return value
      const parsed = schema.safeParse(value)
      if (parsed.success) return parsed.data
      throw new Error(`The stored ${name} does not have the shape it should: ${parsed.error.message}`)
    },
  }
}
