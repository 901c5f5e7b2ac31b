import { mkdirSync, rmSync } from 'node:fs'
import path from 'node:path'
import { startApplication } from './application.mjs'
import { dropDatabase } from './grants.mjs'
import { testDataDir } from './paths.mjs'
import { findProgram, freePort } from './run.mjs'
import { prepareDatabase } from './schema.mjs'
import { keepSecrets } from './secrets.mjs'
import { applicationVariables, databaseVariables } from './variables.mjs'

const DATABASE = 'steadfold_e2e'
const folder = path.join(testDataDir, 'application')

/**
 * The built application on the tests' server, from nothing: a new database with the demo, no mails, a new signing key.
 * `testVariables` tell the browser tests where it is.
 */
export async function startTestApplication(server, undo = new Set()) {
  const began = []
  const stop = async () => {
    undo.delete(stop)
    for (const one of began.splice(0).reverse()) await one()
  }
  undo.add(stop)
  try {
    rmSync(folder, { recursive: true, force: true })
    mkdirSync(folder, { recursive: true })
    const secrets = keepSecrets(testDataDir)
    await dropDatabase(server, DATABASE)
    began.push(() => dropDatabase(server, DATABASE))
    const { startMailFake } = await import('./smtp-fake.mjs')
    const mail = await startMailFake({ folder: path.join(folder, 'mail') })
    began.push(mail.stop)
    const port = await freePort()
    const address = `http://127.0.0.1:${port}`
    const variables = {
      ...applicationVariables({ folder, port, secrets, smtpUrl: mail.smtpUrl }, { APP_URL: address }),
      ...databaseVariables(server, DATABASE, secrets),
    }
    await prepareDatabase({
      server,
      database: DATABASE,
      secrets,
      variables,
      folder,
      demo: true,
      say: console.log,
    })
    const application = await startApplication({ folder, host: '127.0.0.1', port, variables, say: relay })
    began.push(application.stop)
    await application.healthy()
    const testVariables = {
      ...variables,
      E2E_BASE_URL: address,
      E2E_MAIL_URL: mail.webUrl,
      CHROMIUM_PATH:
        process.env.CHROMIUM_PATH ?? findProgram('chromium', 'chromium-browser', 'google-chrome') ?? '',
    }
    return { address, mail, testVariables, stop }
  } catch (error) {
    await stop()
    throw error
  }
}

function relay(name, text) {
  for (const line of text.split('\n')) if (line.trim() !== '') console.log(`${name.padEnd(6)} │ ${line}`)
}
