import 'server-only'
import type { Transaction } from 'sequelize'
import { isPassword } from '@/lib/auth/password'
import { SteadfoldError } from '@/lib/errors'
import type { Actor } from '@/lib/policies/actor'
import { lettersNotOnPaper, notOnPaperWords } from '@/lib/schemas/paper-letters'
import { models } from '@/models'
import type { User } from '@/models'
import { SIGN_IN_THROTTLE, claimAttempt, forgiveAttempt, throttled } from '../throttle'

export interface Registration {
  signerName: string
  registrationNumber: string
  registrationCountry: string
  registrationExpiresOn: string
}

/**
 * The password, asked again at the moment of signing. Wrong ones count with those of the sign-in page, so that an open
 * screen is no way around its limit.
 */
export async function confirmPassword(actor: Actor, password: string, now: Date): Promise<void> {
  const claim = await claimAttempt(SIGN_IN_THROTTLE, actor.email, now)
  if (!claim.free) throw throttled(claim.closedUntil, 'Too many wrong passwords. Wait a few minutes.')
  const user = await models.User.findByPk(actor.id, { attributes: ['passwordHash'] })
  if (user !== null && (await isPassword(user.passwordHash, password))) {
    await forgiveAttempt(claim.attemptId)
    return
  }
  throw new SteadfoldError('invalid', 'Nothing was signed.', {
    issues: [{ path: 'password', message: 'This is not your password.' }],
  })
}

/** The registration an admin checked, as it goes into the approval. `refused` where nobody checked it or it has expired. */
export async function registrationOf(tx: Transaction, actor: Actor, now: Date): Promise<Registration> {
  const user = await models.User.findByPk(actor.id, { transaction: tx })
  if (user === null) throw new SteadfoldError('not_allowed', 'You may not do this.')
  const trouble = registrationTrouble(user, now) ?? signatureTrouble(user)
  if (trouble !== null) throw new SteadfoldError('refused', trouble)
  return {
    signerName: user.name,
    registrationNumber: user.registrationNumber ?? '',
    registrationCountry: user.registrationCountry ?? '',
    registrationExpiresOn: user.registrationExpiresOn ?? '',
  }
}

/** What is signed is printed: a name the paper cannot show would stop the release long after. */
function signatureTrouble({ name, registrationNumber, registrationCountry }: User): string | null {
  const words = [name, registrationNumber ?? '', registrationCountry ?? '']
  const bad = words.find((word) => lettersNotOnPaper(word, 'title').length > 0)
  if (bad === undefined) return null
  return `Your record cannot stand on a paper: ${notOnPaperWords(bad, lettersNotOnPaper(bad, 'title'))}`
}

type RegistrationRow = Pick<
  User,
  'registrationNumber' | 'registrationCountry' | 'registrationExpiresOn' | 'registrationCheckedAt'
>

/** Why this person cannot sign; null where they can. A registration counts to the end of its last day, UTC. */
export function registrationTrouble(user: RegistrationRow, now: Date): string | null {
  const { registrationNumber, registrationCountry, registrationExpiresOn, registrationCheckedAt } = user
  if (registrationNumber === null || registrationCountry === null || registrationExpiresOn === null) {
    return 'Your registration is not on record: an admin enters and checks it.'
  }
  if (registrationCheckedAt === null) return 'No admin has checked your registration yet.'
  if (registrationExpiresOn < now.toISOString().slice(0, 10)) {
    return `Your registration expired on ${registrationExpiresOn}.`
  }
  return null
}
