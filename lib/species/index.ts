import type { ProfileValues } from '@/lib/thermal/scenario'
import { cat } from './cat'
import { dayOldChick } from './day-old-chick'
import { dog, snubNosedDog } from './dog'
import { guineaPig } from './guinea-pig'
import { horse } from './horse'
import { pigeon } from './pigeon'
import { profileValues, type Profile } from './profile'
import { rabbit } from './rabbit'
import { ballPython, beardedDragon } from './reptiles'

/** The shipped catalogue, by profile key. An installation's own rows take their place one by one. */
export const catalogue: Readonly<Record<string, Profile>> = Object.fromEntries(
  [dog, snubNosedDog, cat, rabbit, guineaPig, horse, dayOldChick, pigeon, beardedDragon, ballPython].map(
    (profile) => [profile.key, profile],
  ),
)

/** The shipped rows as bare figures, ready for the engine. */
export const catalogueValues: Readonly<Record<string, ProfileValues>> = Object.fromEntries(
  Object.entries(catalogue).map(([key, profile]) => [key, profileValues(profile)]),
)

/** Rows in force for a scenario: its own first, the shipped catalogue for the rest. */
export function profilesInForce(
  rows: Readonly<Record<string, { values: ProfileValues }>> | undefined,
): Record<string, ProfileValues> {
  const own = Object.entries(rows ?? {}).map(([key, row]) => [key, row.values] as const)
  return { ...catalogueValues, ...Object.fromEntries(own) }
}

export { profileValues, type Confidence, type Figure, type Profile } from './profile'
export { snubNosedBreed, snubNosedBreeds } from './snub-nosed-breeds'
