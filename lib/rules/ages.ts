import { AGE_MARKS } from '@/lib/species/ages'
import type { Animal, AnimalFlag } from '@/lib/thermal/scenario'

/**
 * The flags of an animal with those its age sets: young and old count whether or not somebody ticked them. Sorted, so that
 * a flag ticked and a flag by age give the same.
 */
export function flagsWithAge({
  profile,
  ageDays,
  flags,
}: Pick<Animal, 'profile' | 'ageDays' | 'flags'>): AnimalFlag[] {
  const { youngUnderDays, oldFromDays } = AGE_MARKS[profile] ?? {}
  if (ageDays === undefined) return flags
  const young = youngUnderDays !== undefined && ageDays < youngUnderDays.value
  const old = oldFromDays !== undefined && ageDays >= oldFromDays.value
  const byAge: AnimalFlag[] = [
    ...(young ? (['juvenile'] as const) : []),
    ...(old ? (['elderly'] as const) : []),
  ]
  const added = byAge.filter((flag) => !flags.includes(flag))
  return added.length === 0 ? flags : [...flags, ...added].sort()
}
