import 'server-only'
import { notFound } from 'next/navigation'
import { requireActor } from '@/lib/auth/actor'
import { isSteadfoldError } from '@/lib/errors'
import type { Actor } from '@/lib/policies/actor'
import { mayOpen } from '@/lib/policies/routes'
import type { RoutePattern } from '@/lib/policies/routes'

/** Who opens this page. A visitor goes to the sign-in page first; somebody whose kind of page it isn't finds nothing here. */
export async function openPage(pattern: RoutePattern, address: string): Promise<Actor> {
  const actor = await requireActor(address)
  if (!mayOpen(actor, pattern)) notFound()
  return actor
}

/** What is not there and what one may not see look alike: no such page. */
export async function orNotFound<T>(read: Promise<T>): Promise<T> {
  try {
    return await read
  } catch (error) {
    if (isSteadfoldError(error) && (error.code === 'not_found' || error.code === 'not_allowed')) notFound()
    throw error
  }
}

/** The number of a row out of an address; what is no number is no page. */
export function rowIdOf(text: string): number {
  if (!/^[1-9]\d{0,14}$/.test(text)) notFound()
  return Number(text)
}

/** One value of an address's query; a repeated one counts once. */
export function queryText(value: string | string[] | undefined): string {
  return (Array.isArray(value) ? value[0] : value)?.trim() ?? ''
}
