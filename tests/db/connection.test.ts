import { QueryTypes } from 'sequelize'
import { describe, expect, test } from 'vitest'
import { database } from '@/lib/db/connection'
import { transaction } from '@/lib/db/transaction'
import { models } from '@/models'
import { withEmptyTables } from '../support/db'
import { make } from '../support/factories'

withEmptyTables()

const select = async (sql: string) =>
  (await database().query<{ x: unknown }>(sql, { type: QueryTypes.SELECT }))[0]?.x

describe('what the driver hands over', () => {
  test('a DECIMAL is an exact string, also where a double would round it', async () => {
    expect(await select('SELECT CAST(1.5 AS DECIMAL(10,4)) x')).toBe('1.5000')
    expect(await select('SELECT CAST(12345678901234567.89 AS DECIMAL(20,2)) x')).toBe('12345678901234567.89')
  })

  test('a BIGINT is a number, and an error where a number would round it', async () => {
    expect(await select('SELECT CAST(9007199254740991 AS SIGNED) x')).toBe(9_007_199_254_740_991)
    await expect(select('SELECT CAST(9007199254740993 AS SIGNED) x')).rejects.toThrow()
  })

  test('raw SQL without a type works, and so does taking a column away', async () => {
    const [rows] = await database().query('SELECT 1 AS x UNION SELECT 2')
    expect(rows).toEqual([{ x: 1 }, { x: 2 }])
  })

  test('the session counts in UTC and refuses bad values instead of bending them', async () => {
    expect(await select('SELECT @@time_zone x')).toBe('+00:00')
    expect(await select('SELECT @@sql_mode x')).toContain('STRICT_TRANS_TABLES')
  })
})

test('an instant keeps its milliseconds', async () => {
  const at = new Date('2026-10-25T00:30:00.123Z')
  const { id } = await make.auditEvent({ at })
  expect((await models.AuditEvent.findByPk(id))?.at).toEqual(at)
})

test('a locked row is skipped, not waited for', async () => {
  const [first, second] = [await make.job(), await make.job()]
  const seen = await transaction(async (outer) => {
    await models.Job.findAll({ where: { id: first.id }, lock: true, transaction: outer })
    return database().transaction(async (inner) =>
      models.Job.findAll({ lock: true, skipLocked: true, order: ['id'], transaction: inner }),
    )
  })
  expect(seen.map(({ id }) => id)).toEqual([second.id])
})

test('making the instance and the models asks nothing of the configuration', async () => {
  const { createDatabase } = await import('@/lib/db/connection')
  let asked = 0
  const idle = createDatabase(() => {
    asked += 1
    throw new Error('No address.')
  })
  expect(asked).toBe(0)
  await expect(idle.authenticate()).rejects.toThrow('No address.')
  expect(asked).toBe(1)
})
