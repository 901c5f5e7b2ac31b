import { beforeEach, describe, expect, it } from 'vitest'
import { authOptions } from '@/lib/auth/config'
import { readRefusal } from '@/lib/auth/refusal-word'
import { requestIp } from '@/lib/auth/request-ip'
import { hashPassword, isPassword } from '@/lib/auth/password'
import { signIn } from '@/lib/auth/sign-in'
import { models } from '@/models'
import { PASSWORD, cast } from '../support/cast'
import type { Cast } from '../support/cast'
import { emptyTables } from '../support/db'

const NOW = new Date('2026-06-09T08:00:00.000Z')
const later = (minutes: number) => new Date(NOW.getTime() + minutes * 60_000)

let people: Cast
beforeEach(async () => {
  await emptyTables()
  people = await cast()
})

const right = { email: 'dispatcher@example.org', password: PASSWORD }
const wrong = { ...right, password: 'not this one' }

describe('signing in', () => {
  it('lets the right password in and says who it is', async () => {
    const answer = await signIn(right, '192.0.2.7', NOW)
    expect(answer).toMatchObject({
      kind: 'signed-in',
      actor: { role: 'dispatcher', name: 'I. Quennell', shipperId: null },
    })
    const lines = await models.AuditEvent.findAll()
    expect(lines).toMatchObject([{ verb: 'user.sign-in', actorId: people.dispatcher.id, ip: '192.0.2.7' }])
  })

  it('answers the same whether an address is unknown, closed or given a wrong password', async () => {
    const unknown = await signIn({ ...wrong, email: 'nobody@example.org' }, null, NOW)
    const closed = await signIn({ email: 'gone@example.org', password: PASSWORD }, null, NOW)
    expect(await signIn(wrong, null, NOW)).toEqual({ kind: 'refused', triesLeft: 5 })
    expect(unknown).toEqual({ kind: 'refused', triesLeft: 5 })
    expect(closed).toEqual({ kind: 'refused', triesLeft: 5 })
    expect(await models.AuditEvent.count({ where: { verb: 'user.sign-in.refused' } })).toBe(3)
  })

  it('takes about as long for an unknown address as for a wrong password', async () => {
    const took = async (email: string) => {
      const start = performance.now()
      await signIn({ email, password: 'not this one' }, null, NOW)
      return performance.now() - start
    }
    await took('warm-up@example.org')
    const known = Math.min(await took('vet@example.org'), await took('vet@example.org'))
    const unknown = Math.min(await took('no-vet@example.org'), await took('no-vet@example.org'))
    // Without the stand-in hash an unknown address answers five to ten times faster than a known one.
    expect(unknown).toBeGreaterThan(known * 0.4)
    expect(unknown).toBeLessThan(known * 2.5)
  })

  it.each(['dispatcher@example.org', 'nobody@example.org'])(
    'closes %s for five minutes after six wrong passwords',
    async (email) => {
      for (let left = 5; left >= 1; left -= 1) {
        expect(await signIn({ email, password: 'wrong' }, null, NOW)).toEqual({
          kind: 'refused',
          triesLeft: left,
        })
      }
      expect(await signIn({ email, password: 'wrong' }, null, NOW)).toEqual({
        kind: 'closed',
        until: later(5),
      })
      expect(await signIn({ email, password: PASSWORD }, null, later(4.9))).toEqual({
        kind: 'closed',
        until: later(5),
      })
      // Others can sign in meanwhile.
      expect(await signIn({ email: 'vet@example.org', password: PASSWORD }, null, later(1))).toMatchObject({
        kind: 'signed-in',
      })
      const again = await signIn({ email, password: PASSWORD }, null, later(5.1))
      expect(again.kind).toBe(email.startsWith('nobody') ? 'refused' : 'signed-in')
    },
  )

  it('forgets slips after the right password', async () => {
    for (let turn = 0; turn < 5; turn += 1) await signIn(wrong, null, NOW)
    expect(await signIn(right, null, NOW)).toMatchObject({ kind: 'signed-in' })
    expect(await signIn(wrong, null, NOW)).toEqual({ kind: 'refused', triesLeft: 5 })
  })

  it('keeps neither address nor password where they could be read', async () => {
    await signIn({ ...wrong, email: 'nobody@example.org' }, '192.0.2.9', NOW)
    const kept = JSON.stringify([await models.AuditEvent.findAll(), await models.ThrottleAttempt.findAll()])
    expect(kept).not.toContain('nobody@example.org')
    expect(kept).not.toContain('not this one')
  })
})

describe('the session', () => {
  const session = async (sub: string) => {
    const { callbacks } = authOptions()
    const token = await callbacks?.jwt?.({ token: { sub }, user: { id: sub }, account: null } as never)
    return callbacks?.session?.({ session: { expires: 'later' }, token } as never)
  }

  it('reads role and shipper from the database each time', async () => {
    const sub = String(people.driver.id)
    expect(await session(sub)).toMatchObject({ actor: { role: 'driver', shipperId: null } })
    await models.User.update({ role: 'shipper', shipperId: 12 }, { where: { id: people.driver.id } })
    expect(await session(sub)).toMatchObject({ actor: { role: 'shipper', shipperId: 12 } })
  })

  it('ends with the account', async () => {
    const sub = String(people.vet.id)
    await models.User.update({ disabledAt: NOW }, { where: { id: people.vet.id } })
    expect(await session(sub)).toMatchObject({ actor: null })
    expect(await session('999999')).toMatchObject({ actor: null })
    expect(await session('')).toMatchObject({ actor: null })
  })

  it('carries no password hash', async () => {
    expect(JSON.stringify(await session(String(people.vet.id)))).not.toContain('argon2')
  })
})

describe('passwords', () => {
  it('are kept as argon2id and never match another', async () => {
    const hash = await hashPassword('häuser am Meer')
    expect(hash).toMatch(/^\$argon2id\$/)
    // The same letters typed as one sign or as letter and dots.
    expect(await isPassword(hash, 'ha\u0308user am Meer')).toBe(true)
    expect(await isPassword(hash, 'hauser am Meer')).toBe(false)
    expect(await isPassword('none', 'none')).toBe(false)
  })
})

it('reads the one word next-auth hands to the page', () => {
  expect(readRefusal('refused:3')).toEqual({ kind: 'refused', triesLeft: 3 })
  expect(readRefusal('closed:1780000000000')).toEqual({ kind: 'closed', untilMs: 1_780_000_000_000 })
  expect(readRefusal('CredentialsSignin')).toEqual({ kind: 'fault' })
  expect(readRefusal('refused:often')).toEqual({ kind: 'fault' })
})

it('believes no address a request gives of itself', () => {
  expect(requestIp({ 'x-forwarded-for': '203.0.113.9' })).toBeNull()
  expect(requestIp(new Headers({ 'x-forwarded-for': '203.0.113.9' }))).toBeNull()
})
