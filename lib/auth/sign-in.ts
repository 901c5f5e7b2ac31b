import 'server-only'
import type { Actor } from '@/lib/policies/actor'
import type { SignIn } from '@/lib/schemas/sign-in'
import { models } from '@/models'
import type { User } from '@/models'
import { record } from '@/lib/domain/audit/record'
import { SIGN_IN_THROTTLE, countAttempt, forgetAttempts, throttleState } from '@/lib/domain/throttle'
import { isNobodysPassword, isPassword } from './password'

export type SignInAnswer =
  | { kind: 'signed-in'; actor: Actor }
  /** The same whether the address is unknown, closed or given with a wrong password. */
  | { kind: 'refused'; triesLeft: number }
  | { kind: 'closed'; until: Date }

/**
 * Checks an address and a password. Six wrong ones close the address for five minutes, known or not; neither the answer
 * nor its time tells which addresses have an account. Every outcome is an audit event.
 */
export async function signIn(input: SignIn, ip: string | null, now: Date): Promise<SignInAnswer> {
  const { closedUntil } = await throttleState(SIGN_IN_THROTTLE, input.email, now)
  if (closedUntil) {
    // Time is spent all the same: a closed address must not answer faster either.
    await isNobodysPassword(input.password)
    await note('user.sign-in.refused', null, ip, now, 'closed after too many wrong passwords')
    return { kind: 'closed', until: closedUntil }
  }
  const user = await models.User.findOne({ where: { email: input.email } })
  const usable = user !== null && user.disabledAt === null
  const right = usable
    ? await isPassword(user.passwordHash, input.password)
    : await isNobodysPassword(input.password)
  if (!usable || !right) return refuse(input, user, ip, now)
  await forgetAttempts(SIGN_IN_THROTTLE, input.email)
  const actor = actorOf(user, ip)
  await record(null, { actor, verb: 'user.sign-in', at: now, subject: { type: 'user', id: user.id } })
  return { kind: 'signed-in', actor }
}

async function refuse(input: SignIn, user: User | null, ip: string | null, now: Date): Promise<SignInAnswer> {
  await countAttempt(SIGN_IN_THROTTLE, input.email, now)
  const why =
    user === null ? 'unknown address' : user.disabledAt !== null ? 'account closed' : 'wrong password'
  await note('user.sign-in.refused', user?.id ?? null, ip, now, why)
  const { left, closedUntil } = await throttleState(SIGN_IN_THROTTLE, input.email, now)
  return closedUntil ? { kind: 'closed', until: closedUntil } : { kind: 'refused', triesLeft: left }
}

/** The address typed is not written down: people type passwords into the wrong field. */
function note(verb: string, userId: number | null, ip: string | null, at: Date, why: string) {
  return record(null, {
    actor: null,
    verb,
    at,
    subject: { type: 'user', id: userId },
    note: `${why}${ip === null ? '' : `, from ${ip}`}`,
  })
}

/** A user row as the actor the policies know. */
export function actorOf(user: User, ip: string | null): Actor {
  return {
    id: user.id,
    name: user.name,
    email: user.email,
    role: user.role,
    shipperId: user.shipperId,
    ip,
  }
}
