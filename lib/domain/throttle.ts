import 'server-only'
import { createHmac } from 'node:crypto'
import { Op } from 'sequelize'
import type { Transaction } from 'sequelize'
import { transaction } from '@/lib/db/transaction'
import { env } from '@/lib/env'
import { SteadfoldError } from '@/lib/errors'
import { models } from '@/models'

export interface Throttle {
  scope: 'sign-in' | 'verify'
  /** How many attempts within the window close it. */
  attempts: number
  windowMs: number
  /** For how long: the whole window after the attempt that closed it, or until the oldest of them is as old as the window. */
  closes: 'for-the-window' | 'until-the-oldest-is-past'
}

export const SIGN_IN_THROTTLE: Throttle = {
  scope: 'sign-in',
  attempts: 6,
  windowMs: 5 * 60_000,
  closes: 'for-the-window',
}
export const VERIFY_THROTTLE: Throttle = {
  scope: 'verify',
  attempts: 20,
  windowMs: 10 * 60_000,
  closes: 'until-the-oldest-is-past',
}

export type Claim =
  | { free: false; closedUntil: Date }
  | {
      free: true
      /** For forgiveAttempt. */
      attemptId: number
      /** How many more attempts are free after this one. */
      left: number
      /** When the next one is free, where this was the last; null while some are. */
      closedUntil: Date | null
    }

/**
 * Counts one attempt before it is made, where one is free: those that come at once are counted one after the other, so that
 * no more than the limit pass. Kept in the database, so that a restart or a second server forgets nothing; the key (an
 * address, an IP) only as a keyed hash. What turns out to be no attempt is forgiven or forgotten afterwards.
 */
export async function claimAttempt(throttle: Throttle, key: string, now: Date): Promise<Claim> {
  const of = { scope: throttle.scope, keyHash: keyHash(throttle, key) }
  const claim = await transaction(async (tx): Promise<Claim> => {
    await hold(tx, of, now)
    const before = await latest(tx, throttle, of)
    const closedUntil = closing(throttle, before, now)
    if (closedUntil !== null) return { free: false, closedUntil }
    const { id } = await models.ThrottleAttempt.create({ ...of, at: now }, { transaction: tx })
    const recent = await latest(tx, throttle, of)
    const inWindow = recent.filter((at) => at.getTime() > now.getTime() - throttle.windowMs).length
    return {
      free: true,
      attemptId: id,
      left: Math.max(0, throttle.attempts - inWindow),
      closedUntil: closing(throttle, recent, now),
    }
  })
  await clearOld(now)
  return claim
}

/** This attempt was a right one, and does not count. */
export async function forgiveAttempt(attemptId: number): Promise<void> {
  await models.ThrottleAttempt.destroy({ where: { id: attemptId } })
}

/** The right password was given: earlier slips no longer count. */
export async function forgetAttempts(throttle: Throttle, key: string, now: Date): Promise<void> {
  const of = { scope: throttle.scope, keyHash: keyHash(throttle, key) }
  await transaction(async (tx) => {
    await hold(tx, of, now)
    await models.ThrottleAttempt.destroy({ where: of, transaction: tx })
  })
}

interface Key {
  scope: string
  keyHash: string
}

/** Until the end of the transaction nobody else counts attempts of this key, whether it was known before or not. */
async function hold(tx: Transaction, of: Key, now: Date): Promise<void> {
  await models.ThrottleKey.upsert({ ...of, lastAt: now }, { transaction: tx })
}

/** As many as close it, newest first. */
async function latest(tx: Transaction, { attempts }: Throttle, of: Key): Promise<Date[]> {
  const rows = await models.ThrottleAttempt.findAll({
    where: { ...of },
    attributes: ['at'],
    order: [['at', 'DESC']],
    limit: attempts,
    transaction: tx,
  })
  return rows.map(({ at }) => at)
}

/** Until when it is closed; null where it is open. */
function closing({ attempts, windowMs, closes }: Throttle, recent: readonly Date[], now: Date): Date | null {
  const newest = recent[0]
  const oldest = recent[attempts - 1]
  if (newest === undefined || oldest === undefined) return null
  if (newest.getTime() - oldest.getTime() >= windowMs) return null
  const from = closes === 'for-the-window' ? newest : oldest
  const until = new Date(from.getTime() + windowMs)
  return until > now ? until : null
}

/** Clears out what no window reaches any more. */
async function clearOld(now: Date): Promise<void> {
  const longAgo = new Date(now.getTime() - 24 * 60 * 60_000)
  await transaction(async (tx) => {
    await models.ThrottleAttempt.destroy({ where: { at: { [Op.lt]: longAgo } }, transaction: tx })
    await models.ThrottleKey.destroy({ where: { lastAt: { [Op.lt]: longAgo } }, transaction: tx })
  })
}

/** The `throttled` error, with the moment from which it may be tried again. */
export function throttled(closedUntil: Date, message: string): SteadfoldError {
  return new SteadfoldError('throttled', message, { details: { closedUntil: closedUntil.toISOString() } })
}

function keyHash({ scope }: Throttle, key: string): string {
  return createHmac('sha256', env().auth.secret).update(`${scope}:${key.toLowerCase()}`).digest('hex')
}
