import { beforeEach, describe, expect, it } from 'vitest'
import { actorOf, signIn } from '@/lib/auth/sign-in'
import { confirmPassword } from '@/lib/domain/approvals/signer'
import { verifyCode } from '@/lib/domain/documents/verify'
import { models } from '@/models'
import type { User } from '@/models'
import { PASSWORD, cast } from '../support/cast'
import type { Cast } from '../support/cast'
import { emptyTables } from '../support/db'

const NOW = new Date('2026-06-09T08:00:00.000Z')
const later = (minutes: number) => new Date(NOW.getTime() + minutes * 60_000)
const EMAIL = 'dispatcher@example.org'

let people: Cast
beforeEach(async () => {
  await emptyTables()
  people = await cast()
})

const atOnce = <T>(times: number, one: (turn: number) => Promise<T>) =>
  Promise.all(Array.from({ length: times }, (_, turn) => one(turn)))
const outcome = (promise: Promise<unknown>): Promise<string> =>
  promise.then(
    () => 'passed',
    (error: { code?: string }) => error.code ?? 'fault',
  )
const count = (words: readonly string[], word: string) => words.filter((one) => one === word).length

describe('passwords that come at once', () => {
  it('are looked at six times and no more, and the address is closed for five minutes after', async () => {
    const answers = await atOnce(12, (turn) => signIn({ email: EMAIL, password: `wrong ${turn}` }, null, NOW))
    const kinds = answers.map(({ kind }) => kind)
    expect([count(kinds, 'refused'), count(kinds, 'closed')]).toEqual([5, 7])
    const tries = answers.flatMap((answer) => (answer.kind === 'refused' ? [answer.triesLeft] : []))
    expect(tries.sort()).toEqual([1, 2, 3, 4, 5])
    // The line says "wrong password" only once a password was compared.
    const notes = (await models.AuditEvent.findAll()).map(({ note }) => note)
    expect(notes.filter((note) => note.startsWith('wrong password'))).toHaveLength(6)
    expect(notes.filter((note) => note.startsWith('closed'))).toHaveLength(6)

    const right = { email: EMAIL, password: PASSWORD }
    expect(await signIn(right, null, later(4.99))).toEqual({ kind: 'closed', until: later(5) })
    expect(await signIn(right, null, later(5))).toMatchObject({ kind: 'signed-in' })
  })

  it('are looked at six times where a vet signs, too, and count with those of the sign-in page', async () => {
    const vet = actorOf(people.vet as User, null)
    const answers = await atOnce(12, (turn) => outcome(confirmPassword(vet, `wrong ${turn}`, NOW)))
    expect([count(answers, 'invalid'), count(answers, 'throttled')]).toEqual([6, 6])
    expect(await outcome(confirmPassword(vet, PASSWORD, later(4.99)))).toBe('throttled')
    expect(await signIn({ email: vet.email, password: PASSWORD }, null, later(4.99))).toMatchObject({
      kind: 'closed',
    })
    expect(await outcome(confirmPassword(vet, PASSWORD, later(5)))).toBe('passed')
  })

  it('close nothing where they are right', async () => {
    const vet = actorOf(people.vet as User, null)
    for (let turn = 0; turn < 10; turn += 1) await confirmPassword(vet, PASSWORD, NOW)
    expect(await models.ThrottleAttempt.count()).toBe(0)
    // A slip made before counts on: the page is open, its keeper may not be the vet.
    expect(await outcome(confirmPassword(vet, 'wrong', NOW))).toBe('invalid')
    await confirmPassword(vet, PASSWORD, NOW)
    expect(await models.ThrottleAttempt.count()).toBe(1)
  })
})

it('closes the whole five minutes also where the six were spread over nearly as long', async () => {
  const wrong = { email: EMAIL, password: 'wrong' }
  for (const minute of [0, 0.9, 1.8, 2.7, 3.6, 4.5]) await signIn(wrong, null, later(minute))
  const right = { email: EMAIL, password: PASSWORD }
  expect(await signIn(right, null, later(9.4))).toEqual({ kind: 'closed', until: later(9.5) })
  expect(await signIn(right, null, later(9.5))).toMatchObject({ kind: 'signed-in' })
})

describe('papers checked from one place', () => {
  const check = (ip: string, now = NOW) => outcome(verifyCode({ ip }, { code: 'ZZZZ-ZZZZ' }, now))

  it('are 20 of 30 that come at once', async () => {
    const answers = await atOnce(30, () => check('198.51.100.4'))
    expect([count(answers, 'passed'), count(answers, 'throttled')]).toEqual([20, 10])
    expect(await models.AuditEvent.count({ where: { verb: 'document.verify' } })).toBe(20)
    expect(await check('198.51.100.5')).toBe('passed')
  })

  it('are 20 in any ten minutes', async () => {
    for (let turn = 0; turn < 20; turn += 1) await check('198.51.100.4', later(turn / 4))
    expect(await check('198.51.100.4', later(9.9))).toBe('throttled')
    expect(await check('198.51.100.4', later(10))).toBe('passed')
    expect(await check('198.51.100.4', later(10.1))).toBe('throttled')
  })

  it('are those of one network where addresses are there for the taking', async () => {
    for (let turn = 0; turn < 20; turn += 1) await check(`2001:db8:0:7::${turn.toString(16)}`)
    expect(await check('2001:db8::7:1:2:3:4')).toBe('throttled')
    expect(await check('2001:db8:0:8::1')).toBe('passed')
    expect(await check('2001:db8::1')).toBe('passed')
    expect(await check('::1')).toBe('passed')
  })
})
