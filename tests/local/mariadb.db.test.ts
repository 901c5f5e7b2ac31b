import {
  existsSync,
  mkdirSync,
  mkdtempSync,
  readFileSync,
  renameSync,
  rmSync,
  statSync,
  writeFileSync,
} from 'node:fs'
import { createServer } from 'node:net'
import type { AddressInfo } from 'node:net'
import { tmpdir } from 'node:os'
import path from 'node:path'
import { afterAll, expect, test } from 'vitest'
import { query, startMariadb, stopMariadb } from '@/lib/local/mariadb.mjs'
import { databaseFiles } from '@/lib/local/paths.mjs'
import { until } from '@/lib/local/run.mjs'
import { keepSecrets } from '@/lib/local/secrets.mjs'

/* The server of one machine, from nothing, through everything that can go wrong with its folder. In order. */

const folder = mkdtempSync(path.join(tmpdir(), 'steadfold-mariadb-'))
const files = databaseFiles(folder)

afterAll(async () => {
  await stopMariadb(folder)
  rmSync(folder, { recursive: true })
})

test('a first start makes the folder, and nobody can come in by network', async () => {
  // What an interrupted first start leaves behind is no hindrance.
  mkdirSync(`${files.folder}.new`, { recursive: true })
  writeFileSync(path.join(`${files.folder}.new`, 'ibdata1'), 'half')
  const server = await startMariadb(folder)
  expect(server.started).toBe(true)
  const accounts = await query(server, 'SELECT user, host FROM mysql.global_priv ORDER BY user')
  expect(accounts.every(([, host]) => host === 'localhost')).toBe(true)
  const [[address, zone] = []] = await query(server, 'SELECT @@bind_address, @@time_zone')
  expect([address, zone]).toEqual(['127.0.0.1', '+00:00'])
}, 120_000)

test('a second start finds it running', async () => {
  const server = await startMariadb(folder)
  expect(server.started).toBe(false)
  expect(server.port).toBe(Number(readFileSync(files.port, 'utf8')))
})

test('after a kill it recovers what was committed', async () => {
  const server = await startMariadb(folder)
  await query(server, 'CREATE DATABASE kept; CREATE TABLE kept.it (x INT); INSERT INTO kept.it VALUES (7)')
  const pid = Number(readFileSync(files.pid, 'utf8'))
  process.kill(pid, 'SIGKILL')
  await until(() => !existsSync(`/proc/${pid}`), { timeoutMs: 10_000 })
  expect(existsSync(files.pid)).toBe(true)
  const again = await startMariadb(folder)
  expect(again.started).toBe(true)
  expect(await query(again, 'SELECT x FROM kept.it')).toEqual([['7']])
}, 120_000)

test('stopping stops it, and stopping again does nothing', async () => {
  expect(await stopMariadb(folder)).toBe(true)
  expect(existsSync(files.socket)).toBe(false)
  expect(await stopMariadb(folder)).toBe(false)
}, 60_000)

test('a number left by a process that is now another’s does not mislead it', async () => {
  writeFileSync(files.pid, String(process.pid))
  const server = await startMariadb(folder, { forTests: true })
  expect(server.started).toBe(true)
  await stopMariadb(folder)
}, 120_000)

test('a port that is taken is named', async () => {
  const other = createServer()
  await new Promise<void>((resolve) => other.listen(0, '127.0.0.1', resolve))
  const { port } = other.address() as AddressInfo
  await expect(startMariadb(folder, { port })).rejects.toThrow(`Port ${port} (DATABASE_PORT) is in use`)
  other.close()
})

test('half a folder is refused, and left as it is', async () => {
  const part = path.join(files.folder, 'ibdata1')
  renameSync(part, `${part}.away`)
  await expect(startMariadb(folder)).rejects.toThrow('only half a database')
  renameSync(`${part}.away`, part)
  await expect(startMariadb(folder, { forTests: true })).resolves.toMatchObject({ started: true })
}, 120_000)

test('secrets are made once and readable by their owner alone', () => {
  const first = keepSecrets(folder)
  expect(keepSecrets(folder)).toEqual(first)
  expect(statSync(path.join(folder, 'secrets.json')).mode & 0o777).toBe(0o600)
  expect(new Set(Object.values(first)).size).toBe(Object.keys(first).length)
})
