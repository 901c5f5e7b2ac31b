import type { InitialState, Variant } from './scenario'

/** Everything that outlives a leg, by id. Integrals run on from departure. */
export interface Store {
  crates: Map<string, CrateState>
  animals: Map<string, AnimalState>
  spaces: Map<string, SpaceState>
}

export interface CrateState {
  airC: number
  wallC: number
  bedC: number
  waterKgM3: number
  co2Ppm: number
  bedWaterKg: number
  /** Given off, vented, condensed, kg since the run began; and what hung in air and bedding then. */
  sums: number[]
}

export interface AnimalState {
  coreC: number
  shellC: number
  lostKg: number
  pantingMin: number
  coatKgM2: number
  /** Metabolism, conduction, convection, radiation, evaporation: J since the run began. */
  sums: number[]
}

export interface SpaceState {
  airC: number
  massC: number
  waterKgM3: number
  co2Ppm: number
}

export function storeOf(initial: InitialState | undefined): Store {
  const store: Store = { crates: new Map(), animals: new Map(), spaces: new Map() }
  if (!initial) return store
  for (const crate of initial.crates) {
    store.crates.set(crate.id, {
      airC: crate.airTempC,
      wallC: crate.wallTempC,
      bedC: crate.beddingTempC,
      waterKgM3: crate.waterKgM3,
      co2Ppm: crate.co2Ppm,
      bedWaterKg: crate.beddingWaterKg,
      sums: [0, 0, 0],
    })
  }
  for (const animal of initial.animals) {
    store.animals.set(animal.id, {
      coreC: animal.coreTempC,
      shellC: animal.shellTempC,
      lostKg: animal.waterLossKg,
      pantingMin: animal.pantingMin,
      coatKgM2: animal.coatWaterKgM2,
      sums: [0, 0, 0, 0, 0],
    })
  }
  for (const space of initial.compartments) {
    store.spaces.set(space.id, {
      airC: space.airTempC,
      massC: space.wallTempC,
      waterKgM3: space.waterKgM3,
      co2Ppm: space.co2Ppm,
    })
  }
  return store
}

/** The store as the contract's document, ids in order. */
export function initialStateOf(store: Store, variant: Variant, minutesSinceLoading: number): InitialState {
  return {
    variant,
    crates: sorted(store.crates).map(([id, crate]) => ({
      id,
      airTempC: crate.airC,
      wallTempC: crate.wallC,
      beddingTempC: crate.bedC,
      waterKgM3: crate.waterKgM3,
      co2Ppm: crate.co2Ppm,
      beddingWaterKg: crate.bedWaterKg,
    })),
    animals: sorted(store.animals).map(([id, animal]) => ({
      id,
      coreTempC: animal.coreC,
      shellTempC: animal.shellC,
      coatWaterKgM2: animal.coatKgM2,
      waterLossKg: animal.lostKg,
      pantingMin: animal.pantingMin,
      minutesSinceLoading,
    })),
    compartments: sorted(store.spaces).map(([id, space]) => ({
      id,
      airTempC: space.airC,
      wallTempC: space.massC,
      waterKgM3: space.waterKgM3,
      co2Ppm: space.co2Ppm,
    })),
  }
}

function sorted<T>(entries: Map<string, T>): [string, T][] {
  return [...entries].sort(([a], [b]) => (a < b ? -1 : a > b ? 1 : 0))
}
