import { SteadfoldError } from '../errors'
import { bodyOf, type Body } from './body'
import { airVolumeM3 } from './box'
import { coatWaterKgM2 } from './coat'
import type { SimulateOptions } from './run'
import type { Animal, Crate, Leg, ProfileValues, Scenario, Variant } from './scenario'
import { startsOf } from './schedule'

/** A scenario with its delays and shift written in, its animals resolved: what all legs share. */
export interface Journey {
  variant: Variant
  departureMs: number
  legs: Leg[]
  startsMin: number[]
  crates: Aboard[]
}

export interface Aboard {
  crate: Crate
  bodies: Body[]
  mammals: boolean
  /** Air in the crate with its animals in it, m³. */
  volumeM3: number
  /** First and last leg, by index. */
  fromLeg: number
  toLeg: number
}

export function journeyOf(scenario: Scenario, options: SimulateOptions): Journey {
  const { legs } = scenario
  const carriedWater = new Map(
    (options.start?.state.animals ?? []).map((animal) => [animal.id, animal.coatWaterKgM2] as const),
  )
  const crates = [...scenario.crates]
    .sort((a, b) => (a.id < b.id ? -1 : 1))
    .map((crate): Aboard => {
      const cratemates = crate.occupants.reduce((sum, animal) => sum + animal.count, 0)
      const rows = crate.occupants.map((animal) => profileOf(animal, options.profiles))
      return {
        crate,
        bodies: crate.occupants.map((animal, index) =>
          bodyOf(animal, rows[index] as ProfileValues, {
            variant: options.variant,
            cratemates,
            coatMayBeWet: coatWaterKgM2(animal.coat) > 0 || (carriedWater.get(animal.id) ?? 0) > 1e-4,
          }),
        ),
        volumeM3: airVolumeM3(crate),
        mammals: rows.some((row) => row.bodyPlan === 'mammal'),
        fromLeg: crate.fromLegId === undefined ? 0 : legIndex(legs, crate.fromLegId),
        toLeg: crate.toLegId === undefined ? legs.length - 1 : legIndex(legs, crate.toLegId),
      }
    })
  return {
    variant: options.variant,
    departureMs: scenario.departureMs,
    legs,
    startsMin: startsOf(legs),
    crates,
  }
}

/** The row an animal runs on: a dog flagged snub-nosed takes the snub-nosed dog's. */
export function profileOf(animal: Animal, profiles: Readonly<Record<string, ProfileValues>>): ProfileValues {
  const own = animal.flags.includes('snub-nosed') ? profiles[`snub-nosed-${animal.profile}`] : undefined
  if (!own && animal.profile === 'dog' && animal.flags.includes('snub-nosed')) {
    throw new SteadfoldError(
      'refused',
      `Animal "${animal.id}" is a snub-nosed dog, and no snub-nosed row is in force.`,
    )
  }
  const row = own ?? profiles[animal.profile]
  if (!row)
    throw new SteadfoldError('refused', `No species profile "${animal.profile}" for animal "${animal.id}".`)
  return row
}

function legIndex(legs: readonly Leg[], legId: string): number {
  const index = legs.findIndex((leg) => leg.id === legId)
  if (index < 0) throw new SteadfoldError('invalid', `No leg "${legId}" in this journey.`)
  return index
}
