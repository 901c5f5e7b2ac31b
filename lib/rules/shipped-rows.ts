import { catalogue, profileValues } from '@/lib/species'
import type { ProfileRow } from '@/lib/thermal'

/** The shipped species rows as the engine and the rules take them, by profile key. */
export const SHIPPED_ROWS: Readonly<Record<string, ProfileRow>> = Object.fromEntries(
  Object.entries(catalogue).map(([key, profile]) => [
    key,
    { version: profile.version, values: profileValues(profile) },
  ]),
)
