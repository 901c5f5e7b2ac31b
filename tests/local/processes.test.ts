import { existsSync, mkdtempSync, readFileSync, rmSync, writeFileSync } from 'node:fs'
import { spawn } from 'node:child_process'
import { tmpdir } from 'node:os'
import path from 'node:path'
import { afterEach, beforeEach, describe, expect, test } from 'vitest'
import { Supervised, processNote } from '@/lib/local/processes.mjs'
import { processExists, until } from '@/lib/local/run.mjs'

let folder: string
beforeEach(() => {
  folder = mkdtempSync(path.join(tmpdir(), 'steadfold-processes-'))
})
afterEach(() => rmSync(folder, { recursive: true }))

/** A process that says it is up and lives until told, or falls at once. */
const node = (script: string) => ({
  name: 'it',
  command: process.execPath,
  args: ['-e', script],
  cwd: folder,
  env: { ...process.env, STEADFOLD_FOLDER: folder },
})
const LIVES = "console.log('up'); setInterval(() => {}, 1000)"
const DEAF = "process.on('SIGTERM', () => {}); console.log('up'); setInterval(() => {}, 1000)"

describe('a supervised process', () => {
  test('is started again when it falls, and ended when told', async () => {
    let said = ''
    const one = new Supervised({ ...node(LIVES), say: (_name: string, text: string) => (said += text) })
    expect(await until(() => said.includes('up'), { timeoutMs: 10_000 })).toBe(true)
    const first = Number(one.pid)
    process.kill(first, 'SIGKILL')
    expect(await until(() => one.pid !== first && said.split('up').length === 3, { timeoutMs: 10_000 })).toBe(
      true,
    )
    const second = Number(one.pid)
    await one.stop()
    expect(processExists(second)).toBe(false)
  }, 30_000)

  test('is given longer and longer pauses when it falls at once', async () => {
    const falls: number[] = []
    let said = ''
    const one = new Supervised({
      ...node('process.exit(3)'),
      say: (_name: string, text: string) => (said += text),
      onFall: (count: number) => falls.push(count),
    })
    expect(await until(() => falls.length === 2, { timeoutMs: 15_000 })).toBe(true)
    await one.stop()
    expect(said).toContain('ended (exit code 3); starts again in 1 s')
    expect(said).toContain('starts again in 2 s')
  }, 30_000)

  test('that does not listen is made to end', async () => {
    let said = ''
    const one = new Supervised({ ...node(DEAF), say: (_name: string, text: string) => (said += text) })
    await until(() => said.includes('up'), { timeoutMs: 10_000 })
    const pid = Number(one.pid)
    await one.stop(200)
    expect(processExists(pid)).toBe(false)
  }, 30_000)
})

test('processes left over by a kill are ended at the next start; one that is not ours is not', async () => {
  const file = path.join(folder, 'processes.json')
  const ours = spawn(process.execPath, ['-e', LIVES], {
    detached: true,
    env: { ...process.env, STEADFOLD_FOLDER: folder },
  })
  const foreign = spawn(process.execPath, ['-e', LIVES], { detached: true })
  await Promise.all(
    [ours, foreign].map((child) => new Promise((resolve) => child.stdout.once('data', resolve))),
  )
  writeFileSync(file, JSON.stringify([ours.pid, foreign.pid]))
  const ended = new Promise((resolve) => ours.once('exit', resolve))
  await processNote(file, `STEADFOLD_FOLDER=${folder}`).endLeftovers()
  await ended
  expect(processExists(Number(foreign.pid))).toBe(true)
  expect(existsSync(file)).toBe(false)
  foreign.kill('SIGKILL')
}, 30_000)

test('what runs is noted, and no longer once it has ended', async () => {
  const file = path.join(folder, 'processes.json')
  const note = processNote(file, 'X=y')
  const one = new Supervised({ ...node(LIVES), say: () => undefined, note })
  expect(JSON.parse(readFileSync(file, 'utf8'))).toEqual([one.pid])
  await one.stop()
  expect(await until(() => readFileSync(file, 'utf8') === '[]', { timeoutMs: 5_000 })).toBe(true)
})
