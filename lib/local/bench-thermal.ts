import { readFileSync } from 'node:fs'
import path from 'node:path'
import { assess } from '@/lib/rules/assess'
import { SHIPPED_ROWS } from '@/lib/rules/shipped-rows'
import { catalogueValues } from '@/lib/species'
import { simulate, VARIANTS, type Scenario, type Variant } from '@/lib/thermal'
import { compareSolvers, printFindings } from './bench-solvers'

/** 48 h, eight legs, four crates, six animals. */
const REFERENCE = 'reference-two-days'
/** Journeys the solvers are compared on: the reference, and three short ones of other kinds. */
const COMPARED: readonly (readonly [string, Variant])[] = [
  [REFERENCE, 'typical'],
  ['python-by-air', 'cold-prone'],
  ['horses-by-ferry', 'heat-prone'],
  ['pug-on-a-hot-ramp', 'heat-prone'],
]
const WARM_UP = 5
const REPEATS = 12

/** Prints how long the reference consignment takes in each variant: the least of several runs. */
export function benchSimulate(print: (line: string) => void): void {
  const scenario = readScenario(REFERENCE)
  for (const variant of VARIANTS) {
    for (const tracks of [false, true]) {
      const once = () => simulate(scenario, { variant, profiles: catalogueValues, tracks })
      for (let i = 0; i < WARM_UP; i++) once()
      const milliseconds = Math.min(...Array.from({ length: REPEATS }, () => timed(once)))
      const { steps } = once()
      const kept = tracks ? 'minute tracks' : 'no tracks'
      print(
        `${variant}, ${kept}: ${milliseconds.toFixed(1)} ms, ${steps.accepted} steps (${steps.rejected} rejected)`,
      )
    }
  }
}

/** Prints how long ours and an independent solver take for the same journeys at the same error. */
export function benchSolvers(print: (line: string) => void): void {
  for (const [name, variant] of COMPARED) {
    print(`${name}, ${variant}`)
    printFindings(compareSolvers(readScenario(name), variant), (line) => print(`  ${line}`))
  }
}

/** Prints how long a whole assessment of the reference consignment takes: every schedule, margins, stop limits, endurance. */
export function benchAssess(print: (line: string) => void): void {
  let runs = 0
  const milliseconds = timed(() =>
    assess(readScenario(REFERENCE), SHIPPED_ROWS, { onProgress: ({ done }) => (runs = done) }),
  )
  print(`${(milliseconds / 1000).toFixed(1)} s, ${runs} runs`)
}

function readScenario(name: string): Scenario {
  return JSON.parse(readFileSync(path.resolve('tests/thermal/scenarios', `${name}.json`), 'utf8')) as Scenario
}

function timed(work: () => unknown): number {
  const from = performance.now()
  work()
  return performance.now() - from
}
