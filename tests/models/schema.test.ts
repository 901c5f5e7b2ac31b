import { QueryTypes } from 'sequelize'
import type { Model, ModelStatic } from 'sequelize'
import { expect, test } from 'vitest'
import { database } from '@/lib/db/connection'
import { models } from '@/models'

interface ColumnRow {
  table_name: string
  column_name: string
  column_type: string
  is_nullable: 'YES' | 'NO'
}

const all: ModelStatic<Model>[] = Object.values(models)

const columns = await database().query<ColumnRow>(
  `SELECT table_name AS table_name, column_name AS column_name, column_type AS column_type, is_nullable AS is_nullable
     FROM information_schema.columns WHERE table_schema = DATABASE()`,
  { type: QueryTypes.SELECT },
)

/** How MariaDB spells what Sequelize calls a type. */
function spelling(type: unknown): string {
  const { toSql } = type as { toSql: (options: { escape: (word: string) => string }) => string }
  return toSql
    .call(type, { escape: (word) => `'${word}'` })
    .toLowerCase()
    .replace(/^integer unsigned$/, 'int(10) unsigned')
    .replace(/^integer$/, 'int(11)')
    .replace(/^bigint unsigned$/, 'bigint(20) unsigned')
    .replace(/^smallint unsigned$/, 'smallint(5) unsigned')
    .replace(/^smallint$/, 'smallint(6)')
    .replace(/^double precision$/, 'double')
    .replace(/^json$/, 'longtext')
    .replaceAll(', ', ',')
}

test.each(all.map((model) => [model.getTableName() as string, model] as const))(
  '%s: the model and the table say the same',
  (table, model) => {
    const inTable = columns
      .filter((column) => column.table_name === table)
      .map((column) => `${column.column_name} ${column.column_type.toLowerCase()} ${column.is_nullable}`)
    const inModel = Object.values(model.getAttributes()).map(
      (attribute) =>
        `${attribute.field} ${spelling(attribute.type)} ${attribute.allowNull === false || attribute.primaryKey ? 'NO' : 'YES'}`,
    )
    expect(inModel.sort()).toEqual(inTable.sort())
  },
)

test('every table has its model', () => {
  const tables = new Set(columns.map((column) => column.table_name))
  tables.delete('schema_migrations')
  expect([...tables].sort()).toEqual(all.map((model) => model.getTableName() as string).sort())
})
