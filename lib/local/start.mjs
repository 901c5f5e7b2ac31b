import './env-file.mjs'
import { existsSync, readFileSync, rmSync, writeFileSync } from 'node:fs'
import path from 'node:path'
import { clearTheWay, startApplication } from './application.mjs'
import { build } from './build.mjs'
import { startMariadb, stopMariadb } from './mariadb.mjs'
import { FOR_START, checkNode, ensureNodePackages, ensurePrograms } from './packages.mjs'
import { dataDir } from './paths.mjs'
import { SetupError, freePort, processExists, whenNpmIsGone, writableFolder, portFrom } from './run.mjs'
import { migrateUp, prepareDatabase, runTypescript } from './schema.mjs'
import { keepSecrets } from './secrets.mjs'
import { checkSettings } from './settings.mjs'
import { applicationVariables, databaseVariables } from './variables.mjs'

/*
 * npm start: installs, sets up, builds and serves everything on this machine, and keeps it running until Ctrl-C.
 * Each step is skipped where nothing needs doing. npm run dev: the same with next dev.
 */
const dev = process.argv.includes('--dev')
const DATABASE = 'steadfold'
const MAIL_PAGE_PORT = 8025

/** What was started, newest last; stopped in the opposite order. */
const started = []
let stopping

process.on('SIGINT', () => stopAndExit(0))
process.on('SIGTERM', () => stopAndExit(0))
process.on('SIGHUP', () => stopAndExit(0))
whenNpmIsGone(() => stopAndExit(0))

start().catch(async (error) => {
  console.error(error?.name === 'SetupError' ? `\n${error.message}` : error)
  await stopAndExit(1)
})

async function start() {
  checkNode()
  writableFolder(dataDir)
  holdTheOnlyStart()
  const host = process.env.HOST || '127.0.0.1'
  const port = portFrom('PORT', 3000)
  await clearTheWay({ folder: dataDir, host, port })
  const ownDatabase = !process.env.DATABASE_USER
  await ensureNodePackages(say)
  const secrets = keepSecrets(dataDir)
  const { demo } = await checkSettings({ folder: dataDir, port, secrets, ownDatabase })
  await ensurePrograms(ownDatabase ? FOR_START : {}, say)
  const mail = process.env.SMTP_URL ? undefined : await startMail()
  const rest = applicationVariables({ folder: dataDir, port, secrets, smtpUrl: mail?.smtpUrl })
  const { variables, signIns, empty } = ownDatabase
    ? await startOwnDatabase(secrets, rest, demo)
    : await reachGivenDatabase(rest)
  if (!dev) await build(say)
  say(dev ? 'Starting in development …' : 'Starting …')
  const application = await startApplication({ folder: dataDir, host, port, variables, dev, say: relay })
  started.push(application)
  await application.healthy()
  welcome(rest.APP_URL, mail, signIns, empty)
}

async function startOwnDatabase(secrets, rest, demo) {
  say('Starting the database …')
  const port = process.env.DATABASE_PORT ? portFrom('DATABASE_PORT', 3306) : undefined
  // One left running by a start that was killed is ours to stop as well.
  started.push({ stop: () => stopMariadb(dataDir) })
  const server = await startMariadb(dataDir, { port })
  const database = process.env.DATABASE_NAME || DATABASE
  const variables = { ...rest, ...databaseVariables(server, database, secrets) }
  const ready = await prepareDatabase({ server, database, secrets, variables, folder: dataDir, demo, say })
  return { variables, ...ready }
}

/** A database run by somebody else: its accounts and rights are theirs to give (README), its schema is ours. */
async function reachGivenDatabase(rest) {
  say(`Using the database at ${process.env.DATABASE_SOCKET || process.env.DATABASE_HOST || '127.0.0.1'} …`)
  await migrateUp(rest)
  await runTypescript('lib/local/seed.ts', ['reference'], rest)
  return { variables: rest, signIns: null, empty: false }
}

async function startMail() {
  const { startMailFake } = await import('./smtp-fake.mjs')
  const mail = await startMailFake({
    folder: path.join(dataDir, 'mail'),
    httpPort: await freePort(MAIL_PAGE_PORT),
  })
  started.push(mail)
  return mail
}

/** Two starts over one data folder would fight for it. */
function holdTheOnlyStart() {
  const file = path.join(dataDir, 'start.pid')
  const holder = existsSync(file) ? Number(readFileSync(file, 'utf8')) : 0
  if (holder > 0 && holder !== process.pid && processExists(holder) && isAStart(holder)) {
    throw new SetupError(
      `Steadfold is already running here (process ${holder}). Stop it first, with Ctrl-C in its terminal.`,
    )
  }
  writeFileSync(file, String(process.pid))
  started.push({ stop: () => rmSync(file, { force: true }) })
}

function isAStart(pid) {
  try {
    return readFileSync(`/proc/${pid}/cmdline`, 'utf8').includes('start.mjs')
  } catch {
    return true
  }
}

function stopAndExit(code) {
  stopping ??= (async () => {
    if (started.length > 1) console.log('\nStopping …')
    for (const one of started.reverse()) {
      try {
        await one.stop()
      } catch (error) {
        console.error(error?.message ?? error)
      }
    }
    process.exit(code)
  })()
  return stopping
}

function welcome(address, mail, signIns, empty) {
  console.log(`\nSteadfold is ready: ${address}`)
  if (mail) console.log(`Mails are kept on this machine, and delivered nowhere: ${mail.webUrl}`)
  if (signIns?.people?.length > 0) {
    console.log(`\nDemo accounts, all with the password ${signIns.password}:`)
    for (const { role, name, email } of signIns.people)
      console.log(`  ${role.padEnd(11)} ${email.padEnd(30)} ${name}`)
  }
  if (empty) console.log('\nNobody has an account yet: npm run first-admin -- "Name" name@example.org')
  console.log('\nCtrl-C stops everything.')
}

function say(words) {
  console.log(words)
}

function relay(name, text) {
  for (const line of text.split('\n')) if (line.trim() !== '') console.log(`${name.padEnd(6)} │ ${line}`)
}
