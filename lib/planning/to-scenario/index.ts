import type { Plan, PlanPlace } from '@/lib/schemas/plan'
import type { ProfileRow, Scenario } from '@/lib/thermal/scenario'
import type { ProfileInForce } from '../reasons'
import { timelineOf } from '../timeline'
import { scenarioCrates } from './crates'
import { scenarioLegs } from './legs'

export interface ScenarioParts {
  /** The consignment's four digits: with a crate's letter they make the crate mark. */
  mark: string
  places: readonly PlanPlace[]
  profiles: readonly ProfileInForce[]
}

/**
 * The engine's document for a plan that has no reasons against it (lib/planning/reasons). Throws a RangeError on a plan
 * that still has some: a scenario with a guess in it must not exist.
 */
export function toScenario(plan: Plan, { mark, places, profiles }: ScenarioParts): Scenario {
  const timeline = timelineOf(plan, places)
  const departureMs = timeline.departureMs
  if (departureMs === null) throw new RangeError('A plan without a departure has no scenario.')
  return {
    schema: 'steadfold/scenario@1',
    departureMs,
    outputStepS: 60,
    profiles: rowsInUse(plan, profiles),
    limits: [],
    context: { jurisdictions: [], carriers: [], papers: [], purpose: plan.purpose },
    legs: scenarioLegs(plan, timeline, departureMs),
    crates: scenarioCrates(plan, mark, profiles, timeline, departureMs),
  }
}

/** Only the rows the animals name: a change to another species must not make this assessment out of date. */
function rowsInUse(plan: Plan, profiles: readonly ProfileInForce[]): Record<string, ProfileRow> {
  const used = new Set(plan.animals.flatMap((animal) => profileKeys(animal)))
  return Object.fromEntries(
    profiles
      .filter(({ key }) => used.has(key))
      .map(({ key, version, values }) => [key, { version, values }] as const)
      .sort(([a], [b]) => (a < b ? -1 : 1)),
  )
}

/** A dog flagged snub-nosed is assessed by the snub-nosed row, so both must be there. */
function profileKeys({ profileKey, flags }: Plan['animals'][number]): string[] {
  return profileKey === 'dog' && flags.includes('snub-nosed') ? ['dog', 'snub-nosed-dog'] : [profileKey]
}
