import { checkNode, FOR_TESTS, ensureNodePackages, ensurePrograms } from './packages.mjs'
import { whenNpmIsGone } from './run.mjs'
import { STEPS } from './test-steps.mjs'

/*
 * npm test: the same set-up as npm start, on data of its own, then every check. The last line counts them all.
 * npm test -- unit db   runs only the steps named: format lint types unit db build e2e.
 */
const wanted = process.argv.slice(2)
const counted = { passed: 0, failed: 0 }
const lines = []

/** Undoing of what a step has started, for an interrupt in its middle; steps undo their own work otherwise. */
const undo = new Set()
for (const signal of ['SIGINT', 'SIGTERM', 'SIGHUP']) process.on(signal, () => interrupted(signal))
whenNpmIsGone(() => interrupted('npm is gone'))

try {
  const unknown = wanted.find((name) => !STEPS.some((step) => step.name === name))
  if (unknown !== undefined)
    throw new Error(`Unknown step “${unknown}”: put ${STEPS.map(({ name }) => name).join(', ')}.`)
  checkNode()
  await ensurePrograms(FOR_TESTS, heading)
  await ensureNodePackages(heading)
  for (const step of STEPS) {
    if (wanted.length === 0 || wanted.includes(step.name)) await runStep(step)
  }
} catch (error) {
  console.error(error?.name === 'SetupError' ? error.message : error)
  counted.failed += 1
}
finish()

async function runStep({ title, work }) {
  heading(title)
  const began = Date.now()
  let result
  try {
    result = await work(undo)
  } catch (error) {
    console.error(error?.name === 'SetupError' ? error.message : error)
    result = { passed: 0, failed: 1 }
  }
  counted.passed += result.passed
  counted.failed += result.failed
  const skipped = result.skipped ? `, ${result.skipped} skipped` : ''
  const seconds = ((Date.now() - began) / 1000).toFixed(1)
  lines.push(`${title.padEnd(34)} ${result.passed} passed, ${result.failed} failed${skipped}  (${seconds} s)`)
}

function heading(words) {
  console.log(`\n── ${words} ${'─'.repeat(Math.max(0, 90 - words.length))}`)
}

async function interrupted(signal) {
  console.error(`\nInterrupted (${signal}); stopping what was started …`)
  for (const one of [...undo].reverse()) await one().catch((error) => console.error(error))
  process.exit(130)
}

function finish() {
  heading('Sum')
  for (const line of lines) console.log(line)
  console.log(`\n${counted.passed} passed, ${counted.failed} failed`)
  process.exitCode = counted.failed === 0 && counted.passed > 0 ? 0 : 1
}
