import { writeFileSync } from 'node:fs'
import path from 'node:path'
import { describe, expect, it } from 'vitest'
import { checkSettings } from '@/lib/local/settings.mjs'
import { inFolder } from '../documents/support/pdf-tools'

const secrets = { nextauthSecret: 's'.repeat(44), databaseAppPassword: 'p'.repeat(44) }
const SLOW = 60_000

/** As npm start asks, with nothing set but what is given. */
const check = (given: Record<string, string>) =>
  inFolder((folder) => {
    writeFileSync(path.join(folder, 'bad.p12'), 'not a key')
    const known = Object.fromEntries(
      Object.entries(given).map(([name, value]) => [name, value.replace('FOLDER', folder)]),
    )
    const ownDatabase = known['DATABASE_USER'] === undefined
    return checkSettings(
      { folder, port: 3000, secrets, ownDatabase },
      { NODE_ENV: 'production', PATH: process.env.PATH, ...known },
    )
  })

describe('the settings, at the start', () => {
  it.each([
    ['nothing set', {}, true],
    ['DEMO=No', { DEMO: 'No' }, false],
    ['DEMO=false', { DEMO: 'false' }, false],
    ['a database of the firm’s own', { DATABASE_USER: 'corran' }, false],
    ['a database of the firm’s own and DEMO=no', { DATABASE_USER: 'corran', DEMO: 'no' }, false],
  ])(
    'are taken, with the demo or without: %s',
    async (_words, given, demo) => expect(await check(given)).toEqual({ demo }),
    SLOW,
  )

  it.each([
    [{ APP_URL: 'steadfold.example' }, /^Configuration: APP_URL is wrong: [^;]*\. See \.env\.example\.$/],
    [{ DEMO: 'off' }, /DEMO is wrong: put yes or no/],
    [{ DATABASE_NAME: 'a;b' }, /DATABASE_NAME is wrong/],
    [{ DATABASE_USER: 'corran', DEMO: 'yes' }, /DATABASE_USER names a database of yours/],
    [{ SIGNING_P12_PATH: 'FOLDER/none.p12' }, /SIGNING_P12_PATH\) cannot be read: there is no such file/],
    [{ SIGNING_P12_PATH: 'FOLDER/bad.p12' }, /SIGNING_P12_PATH\) cannot be read: it is no PKCS#12 file/],
  ])(
    'are refused in plain words: %j',
    async (given, words) => {
      await expect(check(given as Record<string, string>)).rejects.toMatchObject({
        name: 'SetupError',
        message: expect.stringMatching(words) as string,
      })
    },
    SLOW,
  )
})
