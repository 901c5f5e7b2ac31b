import { spawnSync } from 'node:child_process'
import { mkdtempSync, rmSync, writeFileSync } from 'node:fs'
import { tmpdir } from 'node:os'
import path from 'node:path'
import { afterEach, beforeEach, expect, test } from 'vitest'
import { countTests, playwrightCounts, vitestCounts } from '@/lib/local/test-counts.mjs'

let folder: string
beforeEach(() => {
  folder = mkdtempSync(path.join(tmpdir(), 'steadfold-counts-'))
})
afterEach(() => rmSync(folder, { recursive: true }))

/** Runs the real Vitest over these files and counts what it reports. */
function counted(files: Record<string, string>) {
  for (const [name, text] of Object.entries(files)) writeFileSync(path.join(folder, name), text)
  const report = path.join(folder, 'report.json')
  const vitest = path.resolve('node_modules/vitest/vitest.mjs')
  writeFileSync(path.join(folder, 'vitest.config.mjs'), 'export default { test: { globals: true } }')
  const args = [vitest, 'run', '--reporter=json', `--outputFile=${report}`]
  // The inner run must not take itself for a part of this one.
  const env = Object.fromEntries(Object.entries(process.env).filter(([name]) => !name.startsWith('VITEST')))
  const { status } = spawnSync(process.execPath, args, { cwd: folder, env: { ...env, NODE_ENV: 'test' } })
  return countTests(report, status ?? 1, vitestCounts)
}

test('passed, failed and skipped are told apart', () => {
  const text =
    "test('a', () => {}); test('b', () => {}); test.skip('c', () => {}); test('d', () => { throw new Error('no') })"
  expect(counted({ 'one.test.js': text })).toEqual({ passed: 2, failed: 1, skipped: 1 })
}, 60_000)

test('a file that cannot be read is a failure, beside one whose tests pass', () => {
  const files = {
    'good.test.js': "test('a', () => {})",
    'bad.test.js': "import './nowhere.js'; test('b', () => {})",
  }
  expect(counted(files)).toEqual({ passed: 1, failed: 1, skipped: 0 })
}, 60_000)

test('no tests at all is a failure, and so is no report', () => {
  expect(counted({})).toMatchObject({ passed: 0, failed: 1 })
  expect(countTests(path.join(folder, 'none.json'), 0, vitestCounts)).toMatchObject({ passed: 0, failed: 1 })
}, 60_000)

test('an exit code without a failed test is a failure', () => {
  const report = path.join(folder, 'report.json')
  writeFileSync(report, JSON.stringify({ stats: { expected: 5, unexpected: 0, flaky: 0, skipped: 1 } }))
  expect(countTests(report, 1, playwrightCounts)).toEqual({ passed: 5, failed: 1, skipped: 1 })
  expect(countTests(report, 0, playwrightCounts)).toEqual({ passed: 5, failed: 0, skipped: 1 })
})

test('a test that needed a second try did not pass', () => {
  expect(playwrightCounts({ stats: { expected: 3, unexpected: 1, flaky: 1, skipped: 0 } })).toEqual({
    passed: 3,
    failed: 2,
    skipped: 0,
  })
})
