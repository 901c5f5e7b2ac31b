import { afterAll, inject } from 'vitest'

Object.assign(process.env, inject('databaseVariables'))

afterAll(async () => {
  const { closeDatabase } = await import('@/lib/db/connection')
  await closeDatabase()
})
