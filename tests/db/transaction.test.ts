import { QueryTypes } from 'sequelize'
import { expect, test } from 'vitest'
import { database } from '@/lib/db/connection'
import { isDeadlock, isDuplicate, transaction } from '@/lib/db/transaction'
import { models } from '@/models'
import { withEmptyTables } from '../support/db'
import { make } from '../support/factories'

withEmptyTables()

test('what throws leaves nothing behind', async () => {
  const attempt = transaction(async (tx) => {
    await models.Job.create({ kind: 'assess', payload: {}, runAfter: new Date(0) }, { transaction: tx })
    throw new Error('Second thoughts.')
  })
  await expect(attempt).rejects.toThrow('Second thoughts.')
  expect(await models.Job.count()).toBe(0)
})

test('it reads what others have committed meanwhile', async () => {
  const job = await make.job()
  await transaction(async (tx) => {
    await models.Job.count({ transaction: tx })
    await models.Job.update({ attempts: 3 }, { where: { id: job.id } })
    expect((await models.Job.findByPk(job.id, { transaction: tx }))?.attempts).toBe(3)
    const [row] = await database().query<{ level: string }>('SELECT @@tx_isolation AS level', {
      type: QueryTypes.SELECT,
      transaction: tx,
    })
    expect(row?.level).toBe('READ-COMMITTED')
  })
})

test('of two units in each other’s way, both are done once', async () => {
  const [a, b] = [await make.job(), await make.job()]
  let runs = 0
  let meet: () => void = () => undefined
  const bothHoldOne = new Promise<void>((resolve) => (meet = resolve))
  let holding = 0

  const unit = (first: number, second: number) =>
    transaction(async (tx) => {
      runs += 1
      await models.Job.increment('attempts', { where: { id: first }, transaction: tx })
      holding += 1
      if (holding === 2) meet()
      await bothHoldOne
      await models.Job.increment('attempts', { where: { id: second }, transaction: tx })
    })
  await Promise.all([unit(a.id, b.id), unit(b.id, a.id)])

  expect(runs).toBe(3)
  const jobs = await models.Job.findAll({ order: ['id'] })
  expect(jobs.map(({ attempts }) => attempts)).toEqual([2, 2])
})

test('a duplicate is told from a deadlock, and is not tried again', async () => {
  await make.job({ dedupeKey: 'assess:1' })
  let runs = 0
  const error: unknown = await transaction(async (tx) => {
    runs += 1
    await models.Job.create(
      { kind: 'assess', payload: {}, runAfter: new Date(0), dedupeKey: 'assess:1' },
      { transaction: tx },
    )
  }).catch((thrown: unknown) => thrown)
  expect(runs).toBe(1)
  expect(isDuplicate(error)).toBe(true)
  expect(isDeadlock(error)).toBe(false)
})
