import { readdirSync, readFileSync } from 'node:fs'
import path from 'node:path'
import { fileURLToPath } from 'node:url'
import type { Scenario } from '@/lib/thermal'

const folder = path.join(path.dirname(fileURLToPath(import.meta.url)), 'scenarios')

/** The journeys in tests/thermal/scenarios, by file name without its ending. */
export const scenarioNames: readonly string[] = readdirSync(folder)
  .filter((name) => name.endsWith('.json'))
  .map((name) => name.slice(0, -'.json'.length))
  .sort()

export function readScenario(name: string): Scenario {
  return JSON.parse(readFileSync(path.join(folder, `${name}.json`), 'utf8')) as Scenario
}
