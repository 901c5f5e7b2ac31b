import { SteadfoldError } from '@/lib/errors'
import type {
  Animal,
  CoreLimits,
  Crate,
  LimitChange,
  ProfileRow,
  ProfileValues,
  Scenario,
} from '@/lib/thermal/scenario'
import { flagsWithAge } from './ages'
import { compare } from './wording'

/** One animal entry with everything the rules ask of it. */
export interface Subject {
  animal: Animal
  crate: Crate
  row: ProfileRow
  /** Body limits in force: the profile's, made tighter where somebody did. */
  limits: CoreLimits
  /** Backstop for the air in the crate, as changed by the house. */
  airLowC: number
  airHighC: number
  /** Indexes of the first and last leg aboard. */
  firstLeg: number
  lastLeg: number
}

export interface Prepared {
  scenario: Scenario
  subjects: Subject[]
  /** What the engine takes: figures by profile key, limits by animal id. */
  profiles: Record<string, ProfileValues>
  limits: Record<string, CoreLimits>
  rows: Readonly<Record<string, ProfileRow>>
}

/**
 * Resolves species rows, flags that stand for a row, and limits. Throws `invalid` for a species nobody knows and
 * `refused` for a row without alarm and critical limits, which cannot be assessed.
 */
export function prepare(given: Scenario, catalogue: Readonly<Record<string, ProfileRow>>): Prepared {
  const rows = { ...catalogue, ...given.profiles }
  const scenario = {
    ...given,
    crates: given.crates.map((crate) => ({
      ...crate,
      occupants: crate.occupants.map((animal) => resolved(animal, rows)),
    })),
  }
  const subjects = scenario.crates
    .flatMap((crate) => crate.occupants.map((animal) => subjectOf(scenario, crate, animal, rows)))
    .sort((a, b) => compare(a.animal.id, b.animal.id))
  return {
    scenario,
    subjects,
    profiles: Object.fromEntries(Object.entries(rows).map(([key, row]) => [key, row.values])),
    limits: Object.fromEntries(subjects.map(({ animal, limits }) => [animal.id, limits])),
    rows,
  }
}

/** True while the animal is aboard on this leg. */
export function isAboard(subject: Subject, legIndex: number): boolean {
  return legIndex >= subject.firstLeg && legIndex <= subject.lastLeg
}

/** "snub-nosed" on a plain dog takes the snub-nosed row, flag kept for the findings; age sets flags of its own. */
function resolved(given: Animal, rows: Readonly<Record<string, ProfileRow>>): Animal {
  const animal = { ...given, flags: flagsWithAge(given) }
  const own = `snub-nosed-${animal.profile}`
  return animal.flags.includes('snub-nosed') && rows[own] !== undefined ? { ...animal, profile: own } : animal
}

function subjectOf(
  scenario: Scenario,
  crate: Crate,
  animal: Animal,
  rows: Readonly<Record<string, ProfileRow>>,
): Subject {
  const row = rows[animal.profile]
  if (row === undefined) throw new SteadfoldError('invalid', `No species profile “${animal.profile}”.`)
  const { limits } = row.values
  if (limits === undefined)
    throw new SteadfoldError(
      'refused',
      `Species profile “${animal.profile}” has no alarm and critical limits: it cannot be assessed.`,
    )
  const changes = scenario.limits.filter(
    ({ scope }) => scope === 'profile' || scope === crate.id || scope === animal.id,
  )
  return {
    animal,
    crate,
    row,
    limits: tightened(limits, changes),
    airLowC: lastOf(changes, 'airLowC') ?? row.values.airFloorC,
    airHighC: lastOf(changes, 'airHighC') ?? row.values.airCeilingC,
    firstLeg: indexOf(scenario, crate.fromLegId, 0),
    lastLeg: indexOf(scenario, crate.toLegId, scenario.legs.length - 1),
  }
}

/** Body limits only ever move inward: what the schema let through is held here once more. */
function tightened(limits: CoreLimits, changes: readonly LimitChange[]): CoreLimits {
  return changes.reduce(
    (held, change) => ({
      criticalLowC: Math.max(held.criticalLowC, change.coreCriticalLowC ?? -Infinity),
      alarmLowC: Math.max(held.alarmLowC, change.coreAlarmLowC ?? -Infinity),
      alarmHighC: Math.min(held.alarmHighC, change.coreAlarmHighC ?? Infinity),
      criticalHighC: Math.min(held.criticalHighC, change.coreCriticalHighC ?? Infinity),
    }),
    limits,
  )
}

/** The narrowest scope stands last in force: profile, then crate, then animal, each later entry over an earlier one. */
function lastOf(changes: readonly LimitChange[], field: 'airLowC' | 'airHighC'): number | undefined {
  const narrowness = (scope: string) => (scope === 'profile' ? 0 : 1)
  return [...changes]
    .sort((a, b) => narrowness(a.scope) - narrowness(b.scope))
    .reduce<number | undefined>((held, change) => change[field] ?? held, undefined)
}

function indexOf(scenario: Scenario, legId: string | undefined, otherwise: number): number {
  const index = scenario.legs.findIndex((leg) => leg.id === legId)
  return index < 0 ? otherwise : index
}
