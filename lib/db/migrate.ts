import 'server-only'
import path from 'node:path'
import { pathToFileURL } from 'node:url'
import type { QueryInterface, Sequelize } from 'sequelize'
import { SequelizeStorage, Umzug } from 'umzug'

/** One step of the schema. Each migration file exports `up` and `down`, with one statement of DDL each. */
export type Migration = (step: { context: QueryInterface }) => Promise<unknown>

/**
 * Umzug over migrations/*.ts, recorded in the table schema_migrations under names without extension,
 * so that a later change of file type does not run anything twice.
 */
export function migrator(sequelize: Sequelize, folder = path.resolve('migrations')): Umzug<QueryInterface> {
  return new Umzug({
    migrations: {
      glob: ['*.ts', { cwd: folder }],
      resolve: ({ path: file, context }) => {
        if (file === undefined) throw new Error('A migration needs a file.')
        const load = async () =>
          (await import(/* @vite-ignore */ pathToFileURL(file).href)) as Record<'up' | 'down', Migration>
        return {
          name: path.basename(file, '.ts'),
          up: async () => (await load()).up({ context }),
          down: async () => (await load()).down({ context }),
        }
      },
    },
    context: sequelize.getQueryInterface(),
    storage: new SequelizeStorage({ sequelize, tableName: 'schema_migrations' }),
    logger: undefined,
  })
}
