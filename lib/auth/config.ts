import 'server-only'
import type { NextAuthOptions } from 'next-auth'
import Credentials from 'next-auth/providers/credentials'
import { env } from '@/lib/env'
import { record } from '@/lib/domain/audit/record'
import { signInSchema } from '@/lib/schemas/sign-in'
import { models } from '@/models'
import { requestIp } from './request-ip'
import { actorOf, signIn } from './sign-in'

const WORKING_DAY_S = 12 * 60 * 60

/**
 * next-auth with our own accounts. The token in the cookie holds a user's number and nothing to rely on: role and shipper
 * are read from the database each time a session is asked for, and a closed account has none.
 */
export function authOptions(): NextAuthOptions {
  return {
    secret: env().auth.secret,
    session: { strategy: 'jwt', maxAge: WORKING_DAY_S },
    pages: { signIn: '/sign-in', error: '/sign-in', signOut: '/sign-in' },
    providers: [
      Credentials({
        name: 'Password',
        credentials: { email: { type: 'email' }, password: { type: 'password' } },
        authorize: async (credentials, request) => {
          const parsed = signInSchema.safeParse(credentials)
          if (!parsed.success) throw new Error('invalid')
          const answer = await signIn(parsed.data, requestIp(request.headers ?? {}), new Date())
          // next-auth carries one word of an error to the page: lib/auth/refusal-word.ts reads it there.
          if (answer.kind === 'closed') throw new Error(`closed:${answer.until.getTime()}`)
          if (answer.kind === 'refused') throw new Error(`refused:${answer.triesLeft}`)
          return { id: String(answer.actor.id), name: answer.actor.name, email: answer.actor.email }
        },
      }),
    ],
    callbacks: {
      jwt: async ({ token }) => {
        const user = await models.User.findByPk(Number(token.sub ?? 0))
        if (user === null || user.disabledAt !== null) return { sub: token.sub ?? '', actor: null }
        return { ...token, actor: actorOf(user, null) }
      },
      session: ({ session, token }) => ({ expires: session.expires, actor: token.actor ?? null }),
    },
    events: {
      signOut: async ({ token }) => {
        const actor = token.actor ?? null
        if (actor === null) return
        const subject = { type: 'user', id: actor.id } as const
        await record(null, { actor, verb: 'user.sign-out', at: new Date(), subject })
      },
    },
  }
}
