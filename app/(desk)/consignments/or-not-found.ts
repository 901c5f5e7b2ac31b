import { notFound } from 'next/navigation'
import { isSteadfoldError } from '@/lib/errors'

/** What is not there and what one may not see or do look alike: no such page. */
export async function orNotFound<T>(read: Promise<T>): Promise<T> {
  try {
    return await read
  } catch (error) {
    if (isSteadfoldError(error) && (error.code === 'not_found' || error.code === 'not_allowed')) notFound()
    throw error
  }
}
