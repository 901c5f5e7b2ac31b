import { spawn } from 'node:child_process'
import type { ChildProcess } from 'node:child_process'
import { once } from 'node:events'
import { request } from 'node:http'
import type { IncomingHttpHeaders, IncomingMessage, OutgoingHttpHeaders } from 'node:http'
import { text } from 'node:stream/consumers'
import { afterAll, beforeAll, describe, expect, it } from 'vitest'
import { requestIp } from '@/lib/auth/request-ip'
import { readEnv } from '@/lib/env'
import { withOwnAddress } from '@/lib/local/application.mjs'

const FORGED = {
  'x-forwarded-for': '203.0.113.9, 198.51.100.77',
  'x-forwarded-host': 'elsewhere.example',
  'x-forwarded-proto': 'https',
  'x-real-ip': '203.0.113.9',
  forwarded: 'for=203.0.113.9',
}

let plain: Served
let trusting: Served
beforeAll(async () => {
  plain = await serve({ TRUST_PROXY: 'no' })
  trusting = await serve({ TRUST_PROXY: 'yes' })
}, 20_000)
afterAll(() => [plain, trusting].forEach(({ child }) => child.kill()))

describe('a web server started as npm start does', () => {
  it('throws away what a request says of itself, and puts the address of its connection', async () => {
    const seen = await ask(plain, { ...FORGED, accept: 'text/plain' })
    expect(seen.headers).toMatchObject({ 'x-forwarded-for': '127.0.0.1', accept: 'text/plain' })
    expect(JSON.stringify(seen)).not.toMatch(/203\.0\.113|198\.51\.100|elsewhere|https/)
    expect(requestIp(seen.headers, seen.vouchedFor)).toBe('127.0.0.1')
  })

  it('does so as well for one that waits to be told to continue', async () => {
    const seen = await ask(plain, { ...FORGED, expect: '100-continue' })
    expect(seen.headers['x-forwarded-for']).toBe('127.0.0.1')
  })

  it('gives one key to the limits however the header is rotated', async () => {
    const keys = new Set<string | null>()
    for (let turn = 0; turn < 25; turn += 1) {
      const seen = await ask(plain, { 'x-forwarded-for': `203.0.113.${turn}` })
      keys.add(requestIp(seen.headers, seen.vouchedFor))
    }
    expect([...keys]).toEqual(['127.0.0.1'])
  })

  it('leaves the headers of a trusted proxy as they are, and its last address counts', async () => {
    const seen = await ask(trusting, FORGED)
    expect(seen).toMatchObject({ vouchedFor: false, headers: FORGED })
    expect(requestIp(seen.headers, true)).toBe('198.51.100.77')
  })
})

it.each(['yes', 'true', 'YES', 'no', 'false', ''])(
  'reads TRUST_PROXY=%s as the configuration does',
  async (word) => {
    const least = {
      APP_URL: 'http://127.0.0.1:3000',
      NEXTAUTH_SECRET: 'x'.repeat(32),
      DATABASE_NAME: 'steadfold',
      DATABASE_USER: 'steadfold_app',
      DATABASE_PASSWORD: '',
    }
    const served = await serve({ TRUST_PROXY: word })
    const { vouchedFor } = await ask(served, FORGED)
    served.child.kill()
    expect(vouchedFor).toBe(!readEnv({ ...least, TRUST_PROXY: word }).trustProxy)
  },
)

describe('the address of a request', () => {
  it('is unknown where nothing vouches for the header, and never what is no address', () => {
    expect(requestIp({ 'x-forwarded-for': '203.0.113.9' }, false)).toBeNull()
    expect(requestIp({ 'x-forwarded-for': '<script>' }, true)).toBeNull()
    expect(requestIp(new Headers({ 'x-forwarded-for': '::ffff:127.0.0.1' }), true)).toBe('127.0.0.1')
    expect(requestIp({}, true)).toBeNull()
  })
})

interface Served {
  child: ChildProcess
  port: number
}

/** Node's own server, which does what next does with the header: fills it in only where it is absent. */
const SERVER = `
  const answer = (request, response) => {
    request.headers['x-forwarded-for'] ??= request.socket.remoteAddress
    const vouchedFor = globalThis.steadfoldOwnAddress === true
    response.end(JSON.stringify({ headers: request.headers, vouchedFor }))
  }
  const server = require('node:http').createServer(answer).on('checkContinue', answer)
  server.listen(0, '127.0.0.1', () => console.log(server.address().port))`

async function serve(variables: Record<string, string>): Promise<Served> {
  const child = spawn(process.execPath, ['-e', SERVER], {
    env: { ...process.env, ...variables, NODE_OPTIONS: withOwnAddress() },
    stdio: ['ignore', 'pipe', 'inherit'],
  })
  const [port] = (await once(child.stdout, 'data')) as [Buffer]
  return { child, port: Number(port) }
}

async function ask(
  { port }: Served,
  headers: OutgoingHttpHeaders,
): Promise<{ headers: IncomingHttpHeaders; vouchedFor: boolean }> {
  const sent = request({ host: '127.0.0.1', port, headers })
  sent.end()
  const [answer] = (await once(sent, 'response')) as [IncomingMessage]
  return JSON.parse(await text(answer)) as never
}
