import path from 'node:path'
import { describe, expect, test } from 'vitest'
import { readEnv } from '@/lib/env'

const least = {
  APP_URL: 'http://127.0.0.1:3000/',
  NEXTAUTH_SECRET: 'x'.repeat(32),
  DATABASE_NAME: 'steadfold',
  DATABASE_USER: 'steadfold_app',
  DATABASE_PASSWORD: '',
}

describe('configuration', () => {
  test('fills in what may be left out', () => {
    const env = readEnv(least)
    expect(env).toMatchObject({
      mode: 'development',
      port: 3000,
      appUrl: 'http://127.0.0.1:3000',
      auth: { url: 'http://127.0.0.1:3000' },
      database: { host: '127.0.0.1', port: 3306, socket: undefined, password: '' },
      smtpUrl: undefined,
      firm: { name: 'Corran Animal Couriers' },
      dataDir: path.resolve('.data'),
      signing: { p12Path: path.resolve('.data/signing.p12'), p12Password: '' },
    })
  })

  test('an empty variable counts as left out', () => {
    expect(readEnv({ ...least, SMTP_URL: '', PORT: '', DATABASE_SOCKET: '' })).toMatchObject({
      port: 3000,
      smtpUrl: undefined,
    })
  })

  test('names every variable that is missing, at once', () => {
    const { APP_URL: _url, DATABASE_NAME: _name, ...rest } = least
    expect(() => readEnv(rest)).toThrow('APP_URL is missing; DATABASE_NAME is missing. See .env.example.')
  })

  test.each([
    [{ PORT: '70000' }, 'PORT is wrong'],
    [{ PORT: 'eighty' }, 'PORT is wrong'],
    [{ APP_URL: 'steadfold.example' }, 'APP_URL is wrong: put an http or https address'],
    [{ SMTP_URL: 'mail.example.org' }, 'SMTP_URL is wrong: put an address such as smtp://'],
    [{ DATABASE_NAME: 'drop table;' }, 'DATABASE_NAME is wrong'],
    [{ NODE_ENV: 'staging' }, 'NODE_ENV is wrong'],
    [{ TRUST_PROXY: 'true' }, 'TRUST_PROXY is wrong: put yes or no'],
  ])('%j: %s', (wrong, message) => {
    expect(() => readEnv({ ...least, ...wrong })).toThrow(message)
  })

  test('believes no proxy unless told to', () => {
    expect(readEnv(least).trustProxy).toBe(false)
    expect(readEnv({ ...least, TRUST_PROXY: 'no' }).trustProxy).toBe(false)
    expect(readEnv({ ...least, TRUST_PROXY: 'yes' }).trustProxy).toBe(true)
  })

  test('never repeats a secret that is too short', () => {
    const secret = 'hunter2hunter2'
    expect(() => readEnv({ ...least, NEXTAUTH_SECRET: secret })).toThrow(
      'NEXTAUTH_SECRET is wrong: put at least 32',
    )
    expect(() => readEnv({ ...least, NEXTAUTH_SECRET: secret })).not.toThrow(secret)
  })
})
