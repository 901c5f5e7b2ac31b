import { readFile } from 'node:fs/promises'
import { isSteadfoldError } from '@/lib/errors'
import { assess } from '@/lib/rules/assess'
import { SHIPPED_ROWS } from '@/lib/rules/shipped-rows'
import { type ScenarioIssue, parseScenario } from '@/lib/schemas/scenario'

/*
 * npm run --silent simulate -- path/to/scenario.json
 *
 * Prints the assessment of a scenario file as JSON, and nothing else, on standard output.
 * Exit: 0 assessed; 2 the scenario (or the command) is not valid; 3 the engine did not converge.
 */

process.exitCode = await simulateFile(process.argv.slice(2))

/** Writes one JSON document to standard output and returns the exit code. */
async function simulateFile(args: readonly string[]): Promise<number> {
  const options = args.filter((arg) => arg.startsWith('--'))
  if (options.length > 0) return refuse(options.map(optionIssue))
  const [path, ...others] = args
  if (path === undefined || others.length > 0)
    return refuse([
      { path: '', message: 'Name one scenario file: npm run --silent simulate -- path/to/scenario.json' },
    ])
  const read = await readJson(path)
  if ('issue' in read) return refuse([read.issue])
  const parsed = parseScenario(read.json)
  if (!parsed.ok) return refuse(parsed.issues)
  try {
    await print(assess(parsed.scenario, SHIPPED_ROWS))
    return 0
  } catch (error) {
    if (isSteadfoldError(error) && error.code === 'not_converged') {
      const { legId, minute } = error.details
      await print({ error: { code: 'not_converged', legId, minute } })
      return 3
    }
    if (isSteadfoldError(error)) return refuse([{ path: '', message: error.message }])
    throw error
  }
}

function optionIssue(option: string): ScenarioIssue {
  const ensemble = option === '--members' || option === '--seed'
  return {
    path: option,
    message: ensemble
      ? 'Ensembles cannot be run yet: leave out --members and --seed.'
      : `There is no option ${option}.`,
    received: option,
  }
}

async function refuse(issues: readonly ScenarioIssue[]): Promise<number> {
  await print({ error: { code: 'invalid_scenario', issues } })
  return 2
}

async function readJson(path: string): Promise<{ json: unknown } | { issue: ScenarioIssue }> {
  let text: string
  try {
    text = await readFile(path, 'utf8')
  } catch {
    return { issue: { path: '', message: 'This file cannot be read.', received: path } }
  }
  try {
    return { json: JSON.parse(text) }
  } catch {
    return { issue: { path: '', message: 'This file is not JSON.', received: path } }
  }
}

/** Resolves once the bytes are out: a pipe takes a large document in pieces. */
function print(document: unknown): Promise<void> {
  return new Promise((resolve, reject) => {
    process.stdout.write(`${JSON.stringify(document)}\n`, (error) => (error ? reject(error) : resolve()))
  })
}
