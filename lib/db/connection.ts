import 'server-only'
import { Sequelize } from 'sequelize'
import { env } from '@/lib/env'

// Each route bundle evaluates this file again; the instance they share lives on globalThis.
const shared = globalThis as { steadfoldDatabase?: Sequelize }

/**
 * The one Sequelize instance of this process. Making it reads no configuration and opens no connection:
 * both happen when the first query needs a connection.
 */
export function database(): Sequelize {
  shared.steadfoldDatabase ??= createDatabase()
  return shared.steadfoldDatabase
}

/** Ends all connections; the process cannot query afterwards. */
export async function closeDatabase(): Promise<void> {
  await shared.steadfoldDatabase?.close()
}

/** Where to connect; the default reads lib/env. Migrations and tests connect as other users. */
export interface DatabaseAddress {
  host: string
  port: number
  socket?: string | undefined
  name: string
  user: string
  password: string
}

/** A Sequelize for MariaDB with our types and repairs; asks for the address at its first connection. */
export function createDatabase(address: () => DatabaseAddress = () => env().database): Sequelize {
  const sequelize = new Sequelize({
    dialect: 'mariadb',
    timezone: '+00:00',
    logging: false,
    isolationLevel: 'READ COMMITTED',
    // DECIMAL arrives as an exact string, BIGINT as a number or an error: never a rounded value.
    dialectOptions: {
      supportBigNumbers: false,
      bigIntAsNumber: true,
      insertIdAsNumber: true,
      checkNumberRange: true,
    },
    define: { underscored: true, charset: 'utf8mb4', collate: 'utf8mb4_unicode_ci' },
    pool: { max: 8, min: 0, idle: 10_000, acquire: 15_000, evict: 1_000 },
    hooks: {
      beforeConnect: (config) => {
        const { host, port, socket, name, user, password } = address()
        Object.assign(config, { host, port: String(port), database: name, username: user, password })
        if (socket !== undefined)
          Object.assign(config, { dialectOptions: { ...config.dialectOptions, socketPath: socket } })
        // Some QueryInterface calls ask the instance, not the connection, for the database's name.
        Object.assign(sequelize.config, { database: name })
      },
    },
  })
  repairDialect(sequelize)
  return sequelize
}

interface MariadbDialect {
  supports: Record<string, unknown>
  Query: {
    prototype: {
      formatResults: (data: unknown, affectedRows?: unknown) => unknown
      isRawQuery: () => boolean
    }
  }
}

/**
 * Two gaps of Sequelize 6.37 with the mariadb driver 3.x: `skipLocked` is silently ignored, and raw SELECTs without a
 * `type` (removeColumn too) fail because the driver's `meta` property cannot be deleted.
 */
function repairDialect(sequelize: Sequelize) {
  const { dialect } = sequelize as unknown as { dialect: MariadbDialect }
  dialect.supports.skipLocked = true
  const prototype = dialect.Query.prototype
  const formatResults = prototype.formatResults
  if ('repaired' in formatResults) return
  const repaired: typeof formatResults = function (
    this: MariadbDialect['Query']['prototype'],
    data,
    affectedRows,
  ) {
    if (Array.isArray(data) && this.isRawQuery())
      return [Array.from(data as unknown[]), (data as { meta?: unknown }).meta]
    return formatResults.call(this, data, affectedRows)
  }
  prototype.formatResults = Object.assign(repaired, { repaired: true })
}
