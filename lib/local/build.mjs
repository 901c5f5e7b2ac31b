import { createHash } from 'node:crypto'
import { existsSync, mkdirSync, readFileSync, readdirSync, rmSync, writeFileSync } from 'node:fs'
import path from 'node:path'
import { pathToFileURL } from 'node:url'
import { root } from './paths.mjs'
import { SetupError, failAndExit, run } from './run.mjs'

const SOURCES = ['app', 'components', 'lib', 'models', 'public', 'fonts']
const FILES = [
  'next.config.mjs',
  'package-lock.json',
  'postcss.config.mjs',
  'proxy.ts',
  'tailwind.config.ts',
  'tsconfig.json',
]
const STAMP = path.join(root, '.next/steadfold-sources')
const WORKER = path.join(root, 'dist/worker')

/** Builds the worker and the web application for production, unless both are already built from these very sources. */
export async function build(say, { force = false } = {}) {
  const sources = hashOfSources()
  if (!force && isBuilt(sources)) return false
  say('Building the application …')
  // An interrupted build must not pass for the one before it.
  rmSync(STAMP, { force: true })
  await bundleWorker()
  const next = path.join(root, 'node_modules/next/dist/bin/next')
  const { code, stdout, stderr } = await run(process.execPath, [next, 'build'], {
    cwd: root,
    env: { ...process.env, NODE_ENV: 'production', TZ: 'UTC', NEXT_TELEMETRY_DISABLED: '1' },
  })
  if (code !== 0)
    throw new SetupError(`next build failed:\n${(stdout + stderr).trim().split('\n').slice(-60).join('\n')}`)
  writeFileSync(STAMP, sources)
  return true
}

/**
 * Bundles lib/workers/worker.ts and every lib/workers/*-thread.ts to dist/worker/NAME.mjs; packages stay outside.
 * Threads are started by file, which neither Next's bundler nor TypeScript sources can offer.
 */
export async function bundleWorker({ onRebuild } = {}) {
  const esbuild = await import('esbuild')
  const entryPoints = readdirSync(path.join(root, 'lib/workers'))
    .filter((name) => name === 'worker.ts' || name.endsWith('-thread.ts'))
    .map((name) => path.join(root, 'lib/workers', name))
  if (entryPoints.length === 0) throw new SetupError('lib/workers/worker.ts is missing.')
  rmSync(WORKER, { recursive: true, force: true })
  mkdirSync(WORKER, { recursive: true })
  const options = {
    absWorkingDir: root,
    entryPoints,
    outdir: WORKER,
    outExtension: { '.js': '.mjs' },
    bundle: true,
    platform: 'node',
    target: 'node20',
    format: 'esm',
    packages: 'external',
    jsx: 'automatic',
    sourcemap: true,
    logLevel: 'silent',
    plugins: [emptyServerOnly, ...(onRebuild ? [rebuilt(onRebuild)] : [])],
  }
  try {
    if (onRebuild === undefined) await esbuild.build(options)
    else {
      const context = await esbuild.context(options)
      await context.watch()
      return () => context.dispose()
    }
  } catch (error) {
    const messages = await esbuild.formatMessages(error.errors ?? [], { kind: 'error' })
    throw new SetupError(`The worker cannot be bundled:\n${messages.join('\n') || error.message}`)
  }
}

/** `server-only` throws anywhere but in Next's server bundles. */
const emptyServerOnly = {
  name: 'empty-server-only',
  setup(bundle) {
    bundle.onResolve({ filter: /^server-only$/ }, () => ({ path: 'server-only', namespace: 'empty' }))
    bundle.onLoad({ filter: /.*/, namespace: 'empty' }, () => ({ contents: '' }))
  },
}

function rebuilt(onRebuild) {
  return { name: 'rebuilt', setup: (bundle) => bundle.onEnd(({ errors }) => onRebuild(errors)) }
}

function isBuilt(sources) {
  return (
    existsSync(path.join(root, '.next/BUILD_ID')) &&
    existsSync(path.join(WORKER, 'worker.mjs')) &&
    existsSync(STAMP) &&
    readFileSync(STAMP, 'utf8') === sources
  )
}

function hashOfSources() {
  const hash = createHash('sha256')
  for (const file of [...SOURCES.flatMap((folder) => filesUnder(folder)), ...FILES]) {
    const place = path.join(root, file)
    if (!existsSync(place)) continue
    hash.update(`${file}\0`).update(readFileSync(place)).update('\0')
  }
  return hash.digest('hex')
}

function filesUnder(folder) {
  if (!existsSync(path.join(root, folder))) return []
  return readdirSync(path.join(root, folder), { withFileTypes: true, recursive: true })
    .filter((entry) => entry.isFile())
    .map((entry) => path.relative(root, path.join(entry.parentPath ?? entry.path, entry.name)))
    .sort()
}

if (import.meta.url === pathToFileURL(process.argv[1] ?? '').href) {
  build((words) => console.log(words), { force: process.argv.includes('--force') })
    .then((done) => console.log(done ? 'Built.' : 'Nothing has changed since the last build.'))
    .catch(failAndExit)
}
