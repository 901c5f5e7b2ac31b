import 'server-only'
import { getServerSession } from 'next-auth'
import { headers } from 'next/headers'
import { redirect } from 'next/navigation'
import { cache } from 'react'
import type { Actor } from '@/lib/policies/actor'
import { authOptions } from './config'
import { requestIp } from './request-ip'

/** Who is asking, or null where nobody is signed in or the account was closed. Asked once per request. */
export const currentActor = cache(async (): Promise<Actor | null> => {
  const session = await getServerSession(authOptions())
  const actor = session?.actor ?? null
  return actor && { ...actor, ip: requestIp(await headers()) }
})

/** Who is asking; a visitor is sent to the sign-in page and comes back to `returnTo` afterwards. */
export async function requireActor(returnTo?: string): Promise<Actor> {
  const actor = await currentActor()
  if (actor === null)
    redirect(returnTo === undefined ? '/sign-in' : `/sign-in?to=${encodeURIComponent(returnTo)}`)
  return actor
}
