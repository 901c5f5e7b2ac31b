import 'server-only'
import { createHmac } from 'node:crypto'
import { Op } from 'sequelize'
import { env } from '@/lib/env'
import { SteadfoldError } from '@/lib/errors'
import { models } from '@/models'

export interface Throttle {
  scope: 'sign-in' | 'verify'
  /** How many attempts within the window close it. */
  attempts: number
  windowMs: number
}

export const SIGN_IN_THROTTLE: Throttle = { scope: 'sign-in', attempts: 6, windowMs: 5 * 60_000 }
export const VERIFY_THROTTLE: Throttle = { scope: 'verify', attempts: 20, windowMs: 10 * 60_000 }

export interface ThrottleState {
  /** How many more attempts are free. */
  left: number
  /** When the next attempt is free; null while some are. */
  closedUntil: Date | null
}

/**
 * How often something was tried of late: kept in the database, so that a restart or a second server forgets nothing. The
 * key (an address, an IP) is kept only as a keyed hash.
 */
export async function throttleState(throttle: Throttle, key: string, now: Date): Promise<ThrottleState> {
  const since = new Date(now.getTime() - throttle.windowMs)
  const recent = await models.ThrottleAttempt.findAll({
    where: { scope: throttle.scope, keyHash: keyHash(throttle, key), at: { [Op.gt]: since } },
    attributes: ['at'],
    order: [['at', 'DESC']],
    limit: throttle.attempts,
  })
  const left = Math.max(0, throttle.attempts - recent.length)
  if (left > 0) return { left, closedUntil: null }
  // Closed for the whole window, counted from the attempt that closed it.
  const last = recent[0]?.at ?? now
  return { left: 0, closedUntil: new Date(last.getTime() + throttle.windowMs) }
}

/** Counts one attempt, and clears out what no window reaches any more. */
export async function countAttempt(throttle: Throttle, key: string, now: Date): Promise<void> {
  await models.ThrottleAttempt.create({ scope: throttle.scope, keyHash: keyHash(throttle, key), at: now })
  const longAgo = new Date(now.getTime() - 24 * 60 * 60_000)
  await models.ThrottleAttempt.destroy({ where: { at: { [Op.lt]: longAgo } } })
}

/** The right password was given: earlier slips no longer count. */
export async function forgetAttempts(throttle: Throttle, key: string): Promise<void> {
  await models.ThrottleAttempt.destroy({ where: { scope: throttle.scope, keyHash: keyHash(throttle, key) } })
}

/** The `throttled` error, with the moment from which it may be tried again. */
export function throttled(closedUntil: Date, message: string): SteadfoldError {
  return new SteadfoldError('throttled', message, { details: { closedUntil: closedUntil.toISOString() } })
}

function keyHash({ scope }: Throttle, key: string): string {
  return createHmac('sha256', env().auth.secret).update(`${scope}:${key.toLowerCase()}`).digest('hex')
}
