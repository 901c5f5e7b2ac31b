import { mkdirSync, rmSync } from 'node:fs'
import path from 'node:path'
import { build, bundleWorker } from './build.mjs'
import { root, testDataDir } from './paths.mjs'
import { SetupError, run } from './run.mjs'
import { countTests, playwrightCounts, vitestCounts } from './test-counts.mjs'
import { holdTestServer } from './test-database.mjs'
import { startTestApplication } from './test-application.mjs'

/** What npm test runs, in order. A step without tests of its own counts as one check. */
export const STEPS = [
  {
    name: 'format',
    title: 'Format',
    work: () => check('node_modules/prettier/bin/prettier.cjs', ['--check', '.']),
  },
  {
    name: 'lint',
    title: 'Lint',
    work: () => check('node_modules/eslint/bin/eslint.js', ['.', '--max-warnings', '0']),
  },
  { name: 'types', title: 'Types', work: types },
  { name: 'unit', title: 'Unit and property tests', work: () => vitest('unit') },
  { name: 'db', title: 'Tests on MariaDB', work: onDatabase },
  { name: 'build', title: 'Production build', work: production },
  { name: 'e2e', title: 'Browser tests in Chromium', work: browser },
]

const env = { ...process.env, TZ: 'UTC', NEXT_TELEMETRY_DISABLED: '1' }

async function check(script, args) {
  const { code } = await run(process.execPath, [path.join(root, script), ...args], {
    cwd: root,
    env,
    show: true,
  })
  return code === 0 ? { passed: 1, failed: 0 } : { passed: 0, failed: 1 }
}

async function types() {
  const routes = await check('node_modules/next/dist/bin/next', ['typegen'])
  return routes.failed > 0 ? routes : check('node_modules/typescript/bin/tsc', ['--noEmit'])
}

async function vitest(project) {
  const report = reportFile(`${project}.json`)
  const args = ['run', '--config', 'tests/vitest.config.ts', '--project', project]
  const reporters = ['--reporter=default', '--reporter=json', `--outputFile.json=${report}`]
  const { code } = await run(
    process.execPath,
    [path.join(root, 'node_modules/vitest/vitest.mjs'), ...args, ...reporters],
    {
      cwd: root,
      env,
      show: true,
    },
  )
  return countTests(report, code, vitestCounts)
}

async function onDatabase(undo) {
  await bundleWorker()
  return withServer(undo, () => vitest('db'))
}

/** One build for all steps of a run: what has failed once is not tried again. */
let built
const buildOnce = () => (built ??= build((words) => console.log(words)))

async function production() {
  console.log((await buildOnce()) ? 'Built.' : 'Already built from these sources.')
  return { passed: 1, failed: 0 }
}

/** The application as people run it: built, on its own database with the demo in it, mailing to a server that keeps all. */
async function browser(undo) {
  await buildOnce().catch(() => {
    throw new SetupError('Not run: the application cannot be built.')
  })
  return withServer(undo, async (server) => {
    const application = await startTestApplication(server, undo)
    const report = reportFile('e2e.json')
    try {
      const args = ['test', '--config', 'tests/playwright.config.ts']
      const { code } = await run(
        process.execPath,
        [path.join(root, 'node_modules/@playwright/test/cli.js'), ...args],
        {
          cwd: root,
          env: { ...env, ...application.testVariables, E2E_REPORT: report },
          show: true,
        },
      )
      return countTests(report, code, playwrightCounts)
    } finally {
      await application.stop()
    }
  })
}

async function withServer(undo, work) {
  const { server, stop } = await holdTestServer()
  undo.add(stop)
  try {
    return await work(server)
  } finally {
    undo.delete(stop)
    await stop()
  }
}

function reportFile(name) {
  mkdirSync(testDataDir, { recursive: true })
  const file = path.join(testDataDir, name)
  rmSync(file, { force: true })
  return file
}
