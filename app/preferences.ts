import { cookies } from 'next/headers'
import { LIGHT_COOKIE, UNIT_COOKIE, preferencesFrom } from '@/lib/views/preferences'
import type { Preferences } from '@/lib/views/preferences'

/** Unit and light this browser asked for; server components format with `unit`. */
export async function readPreferences(): Promise<Preferences> {
  const jar = await cookies()
  return preferencesFrom(jar.get(UNIT_COOKIE)?.value, jar.get(LIGHT_COOKIE)?.value)
}
