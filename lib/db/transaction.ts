import 'server-only'
import { setTimeout as wait } from 'node:timers/promises'
import { Transaction } from 'sequelize'
import { database } from './connection'

const ATTEMPTS = 5
/** ER_LOCK_DEADLOCK: the server has already rolled everything back, so the whole unit may run again. */
const DEADLOCK = 1213

/**
 * Runs one unit of work in a READ COMMITTED transaction: committed when `work` resolves, rolled back when it throws.
 * A deadlock repeats the whole unit, so `work` must touch nothing but the database. Give `tx` to every query inside:
 * one without it takes a second connection, and enough of those starve the pool.
 */
export async function transaction<T>(work: (tx: Transaction) => Promise<T>): Promise<T> {
  for (let attempt = 1; ; attempt += 1) {
    try {
      return await database().transaction(
        { isolationLevel: Transaction.ISOLATION_LEVELS.READ_COMMITTED },
        work,
      )
    } catch (error) {
      if (attempt === ATTEMPTS || !isDeadlock(error)) throw error
      // Chance keeps the two that collided from colliding again.
      await wait(attempt * 20 + Math.random() * 30)
    }
  }
}

/** True where the database refused a statement because of a deadlock. */
export function isDeadlock(error: unknown): boolean {
  return serverErrorNumber(error) === DEADLOCK
}

/** True where a unique key refused a row: somebody else was first. */
export function isDuplicate(error: unknown): boolean {
  return serverErrorNumber(error) === 1062
}

function serverErrorNumber(error: unknown): number | undefined {
  if (!(error instanceof Error) || !('parent' in error)) return undefined
  const parent = error.parent as { errno?: number } | undefined
  return parent?.errno
}
