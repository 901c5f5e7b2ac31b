import 'server-only'
import type { Actor } from '@/lib/policies/actor'
import type { SignIn } from '@/lib/schemas/sign-in'
import { models } from '@/models'
import type { User } from '@/models'
import { record } from '@/lib/domain/audit/record'
import { SIGN_IN_THROTTLE, claimAttempt, forgetAttempts } from '@/lib/domain/throttle'
import { isNobodysPassword, isPassword } from './password'

export type SignInAnswer =
  | { kind: 'signed-in'; actor: Actor }
  /** The same whether the address is unknown, closed or given with a wrong password. */
  | { kind: 'refused'; triesLeft: number }
  | { kind: 'closed'; until: Date }

/**
 * Checks an address and a password. Six wrong ones close the address for five minutes, known or not, also where they come at
 * once: each is counted before it is looked at, and the right one takes all counts back. Neither the answer
 * nor its time tells which addresses have an account. Every outcome is an audit event.
 */
export async function signIn(input: SignIn, ip: string | null, now: Date): Promise<SignInAnswer> {
  const claim = await claimAttempt(SIGN_IN_THROTTLE, input.email, now)
  if (!claim.free) {
    // Time is spent all the same: a closed address must not answer faster either.
    await isNobodysPassword(input.password)
    await note('user.sign-in.refused', null, ip, now, 'closed after too many wrong passwords')
    return { kind: 'closed', until: claim.closedUntil }
  }
  const user = await models.User.findOne({ where: { email: input.email } })
  const usable = user !== null && user.disabledAt === null
  const right = usable
    ? await isPassword(user.passwordHash, input.password)
    : await isNobodysPassword(input.password)
  if (!usable || !right) {
    await note('user.sign-in.refused', user?.id ?? null, ip, now, whyNot(user))
    const { closedUntil, left } = claim
    return closedUntil ? { kind: 'closed', until: closedUntil } : { kind: 'refused', triesLeft: left }
  }
  await forgetAttempts(SIGN_IN_THROTTLE, input.email, now)
  const actor = actorOf(user, ip)
  await record(null, { actor, verb: 'user.sign-in', at: now, subject: { type: 'user', id: user.id } })
  return { kind: 'signed-in', actor }
}

function whyNot(user: User | null): string {
  if (user === null) return 'unknown address'
  return user.disabledAt === null ? 'wrong password' : 'account closed'
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
