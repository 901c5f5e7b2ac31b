import type { InitialState, Variant } from './scenario'

/** Tracks of one assessment. Arrays sort by id, then variant in the order typical, heat-prone, cold-prone, then schedule. */
export interface Simulation {
  engineVersion: string
  schedules: Schedule[]
  crates: CrateTrack[]
  animals: AnimalTrack[]
  compartments: CompartmentTrack[]
  closure: { maxResidualW: number; energyErrorPct: number }
  finalState: InitialState[]
}

export interface Schedule {
  /** "on-time", "typical" or "worst:<legId>". */
  id: string
  /** Minute from the planned departure at which each leg starts. One more entry than legs: the last is the arrival. */
  legStartMin: number[]
}

export interface CrateTrack {
  id: string
  variant: Variant
  scheduleId: string
  minutes: number[]
  airTempC: number[]
  relHumidityPct: number[]
  co2Ppm: number[]
  airChangesPerHour: number[]
  wallTempC: number[]
}

export interface AnimalTrack {
  id: string
  crateId: string
  variant: Variant
  scheduleId: string
  minutes: number[]
  coreTempC: number[]
  skinTempC: number[]
  /** Watts per animal, gains positive, losses negative; the first five sum to storage. */
  heat: HeatTerms
  waterLossPctMass: number[]
  /** Share of thermogenic and of evaporative capacity in use. */
  effort: { coldPct: number[]; heatPct: number[] }
  /** Minute from which core ran away upward, absent when it never did. */
  runawayFromMin?: number
}

export interface HeatTerms {
  metabolismW: number[]
  conductionW: number[]
  convectionW: number[]
  radiationW: number[]
  evaporationW: number[]
  storageW: number[]
}

export interface CompartmentTrack {
  legId: string
  compartmentId: string
  variant: Variant
  scheduleId: string
  minutes: number[]
  airTempC: number[]
  relHumidityPct: number[]
  co2Ppm: number[]
}
