import { execFile } from 'node:child_process'
import { mkdtempSync, writeFileSync } from 'node:fs'
import { tmpdir } from 'node:os'
import path from 'node:path'
import { fileURLToPath } from 'node:url'
import { describe, expect, it } from 'vitest'
import type { Assessment } from '@/lib/rules/result'
import { SHIPPED_ROWS } from '@/lib/rules/shipped-rows'
import type { ProfileRow } from '@/lib/thermal'
import { beagle, crateOf, legOf, roomAt, scenarioOf } from './support/worlds'

const root = path.resolve(path.dirname(fileURLToPath(import.meta.url)), '../..')
const folder = mkdtempSync(path.join(tmpdir(), 'steadfold-simulate-'))

function file(name: string, content: unknown): string {
  const target = path.join(folder, name)
  writeFileSync(target, typeof content === 'string' ? content : JSON.stringify(content))
  return target
}

/** The command as package.json declares it, with everything it wrote. */
function simulate(...args: string[]): Promise<{ code: number; stdout: string }> {
  return new Promise((resolve) => {
    execFile(
      'npm',
      ['run', '--silent', 'simulate', '--', ...args],
      { cwd: root, maxBuffer: 64 * 1024 * 1024 },
      (error, stdout) => resolve({ code: error === null ? 0 : Number(error.code), stdout }),
    )
  })
}

const scenario = scenarioOf({
  legs: [legOf('road', { durationMin: 30, surroundings: roomAt(18) })],
  crates: [crateOf('a', [beagle('bess')])],
})

/** A dog's row whose controller is all or nothing at its set-point: every field in its range, and a step no solver can follow. */
function rowWithoutBands(): ProfileRow {
  const dog = SHIPPED_ROWS['dog']
  if (dog === undefined) throw new Error('The catalogue has a dog.')
  const bands = { vasomotor: [0, 0], cold: [0, 0], pant: [0, 0], wet: [0, 0] } as const
  return { version: 1, values: { ...dog.values, bands } }
}

describe('npm run simulate', () => {
  it('prints the assessment, and nothing else, and exits 0', async () => {
    const { code, stdout } = await simulate(file('good.json', scenario))
    const result = JSON.parse(stdout) as Assessment
    expect(code).toBe(0)
    expect(result.schema).toBe('steadfold/result@1')
    expect(result.verdict.verdict).toBe('go')
    expect(stdout.trimEnd().split('\n')).toHaveLength(1)
  }, 60_000)

  it('a valid scenario the engine cannot follow exits 3, names leg and minute, and gives no verdict', async () => {
    const joins = { ...crateOf('a', [beagle('bess')]), fromLegId: 'ramp' }
    const stays = crateOf('b', [{ ...beagle('otto'), profile: 'cat', massKg: 4 }])
    const { code, stdout } = await simulate(
      file(
        'stuck.json',
        scenarioOf({
          profiles: { dog: rowWithoutBands() },
          legs: [
            legOf('road', { durationMin: 45, surroundings: roomAt(18) }),
            legOf('ramp', { kind: 'ramp', durationMin: 30, surroundings: roomAt(24) }),
          ],
          crates: [joins, stays],
        }),
      ),
    )
    expect(JSON.parse(stdout)).toEqual({ error: { code: 'not_converged', legId: 'ramp', minute: 45 } })
    expect(code).toBe(3)
  }, 60_000)

  it.each<[string, string[], string]>([
    ['a scenario with faults', [file('bad.json', { ...scenario, legs: [] })], 'legs'],
    ['a file that is not JSON', [file('text.json', 'a text')], ''],
    ['a file that is not there', [path.join(folder, 'none.json')], ''],
    ['no file', [], ''],
    ['an ensemble, which cannot be run yet', [file('again.json', scenario), '--members', '300'], '--members'],
  ])(
    '%s exits 2 and says where',
    async (_, args, at) => {
      const { code, stdout } = await simulate(...args)
      const { error } = JSON.parse(stdout) as {
        error: { code: string; issues: { path: string; message: string }[] }
      }
      expect(code).toBe(2)
      expect(error.code).toBe('invalid_scenario')
      expect(error.issues[0]?.path).toBe(at)
      expect(error.issues[0]?.message.length).toBeGreaterThan(5)
    },
    60_000,
  )
})
