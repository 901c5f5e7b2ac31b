import type { AnimalTrack, CompartmentTrack, CrateTrack, Schedule } from './result'
import type { CoreLimits, InitialState, ProfileValues, Variant } from './scenario'
import type { Waypoint } from './waypoint'

/** How one run is to be made. Everything else is in the scenario. */
export interface SimulateOptions {
  variant: Variant
  /** The species rows in force, by profile key. A key an animal names and this map lacks is refused. */
  profiles: Readonly<Record<string, ProfileValues>>
  /** "on-time" (default), "typical" or "worst:<legId>", as `schedulesOf` names them. */
  scheduleId?: string
  /** All air, surfaces, set-points and initial air this much warmer at the same relative humidity. Default 0. */
  airShiftC?: number
  /** Where to start: a state and the minute (from departure, on this schedule) it belongs to. Default: the departure. */
  start?: StartFrom
  /** Minute from departure at which to stop. Default: the arrival. */
  untilMin?: number
  /** Last leg to simulate, by id. Default: the last of the journey. */
  throughLegId?: string
  /** Keeps a waypoint behind each leg. */
  waypoints?: boolean
  /**
   * Goes on from a waypoint of another run of this scenario, in place of the departure. The legs before it must be the same, in
   * the same variant, at the same shift and limits; with tracks only where that run kept them.
   */
  from?: Waypoint
  /** Minute tracks at the scenario's outputStepS. Default true; the short runs of margins leave them out. */
  tracks?: boolean
  /** Spacing of stored states, minutes. Leg starts and the end are always stored. Default: those only. */
  snapshotEveryMin?: number
  /** What breaks down, and when. From then to the end of the run. */
  failure?: Failure
  /** Limits whose crossings are timed, by animal id. Default: the limits of the animal's profile. */
  limits?: Readonly<Record<string, CoreLimits>>
  /** Ends the run early once every animal still aboard is past this limit, on whichever side. */
  stopOncePast?: 'alarm' | 'critical'
  /** For refinement studies only. */
  numerics?: Partial<Numerics>
}

export interface StartFrom {
  minute: number
  state: InitialState
}

export interface Failure {
  /**
   * climate: heating and cooling stop; a controlled leg that names its outside drifts to it.
   * ventilation: fans and openings of the enclosed space close, leakage remains; its climate control goes on.
   */
  kind: 'climate' | 'ventilation'
  fromMin: number
}

export interface Numerics {
  relTol: number
  absTolK: number
  absTolKgM3: number
  absTolPpm: number
  maxStepS: number
  maxSteps: number
}

/** One integration: one variant of every animal, one schedule. */
export interface Run {
  variant: Variant
  schedule: Schedule
  /** Tracks; empty arrays of minutes when tracks were not asked for. */
  crates: CrateTrack[]
  animals: AnimalTrack[]
  compartments: CompartmentTrack[]
  /** One entry per animal and leg it was aboard (and simulated), in leg order, then animal id. */
  extremes: LegExtremes[]
  /** Leg starts, the asked spacing and the end, ascending by minute. Read it through `stateAt`. */
  snapshots: StartFrom[]
  finalState: InitialState
  /** One behind each leg, where they were asked for. */
  waypoints: Waypoint[]
  closure: Closure
  steps: StepCounts
}

/** What the rules need of one animal on one leg; sampled at most a minute apart, whether tracks are kept or not. */
export interface LegExtremes {
  animalId: string
  crateId: string
  legId: string
  fromMin: number
  toMin: number
  peakCoreC: number
  peakCoreMin: number
  lowestCoreC: number
  lowestCoreMin: number
  /** First minute on this leg past each limit, absent when kept. A leg entered past a limit has it at fromMin. */
  crossedMin: { criticalLow?: number; alarmLow?: number; alarmHigh?: number; criticalHigh?: number }
  /** Minutes of this leg spent past each limit. */
  minutesPast: { criticalLow: number; alarmLow: number; alarmHigh: number; criticalHigh: number }
  /** Thermogenic capacity in use. Runs count minutes in a row, carried over from the leg before. */
  coldEffort: EffortExtremes
  /** Evaporative capacity (panting, sweat) in use. */
  heatEffort: EffortExtremes
  waterLossPctMass: number
  crateAirMinC: number
  crateAirMaxC: number
  crateAirMeanC: number
  crateHumidityMaxPct: number
  crateHumidityMeanPct: number
  co2MaxPpm: number
  /** Longest run in a row above each mark, minutes, carried over from the leg before. */
  co2OverMin: { over5000: number; over15000: number; over30000: number }
  /** Air outside the crate, where the law measures. */
  outsideAirMinC: number
  outsideAirMaxC: number
  outsideAirMeanC: number
  outsideHumidityMeanPct: number
  runawayFromMin?: number
}

export interface EffortExtremes {
  maxPct: number
  maxMin: number
  longestOver40Min: number
  longestOver60Min: number
  /** First minute at which the effort had stood at 60 % or more for 60 minutes in a row. */
  breachMin?: number
}

export interface Closure {
  /** Largest |sum of five terms − storage| on any reported or sampled minute, W. */
  maxResidualW: number
  /** Heat in minus heat stored over heat turned over, per cent, worst animal, by quadrature on the track; 0 without tracks. */
  energyErrorPct: number
  /** The same from the accumulators integrated with the state; round-off only (about 1e-12). */
  accumulatorError: number
  /** Water given off minus water vented, condensed and held, over water given off, worst crate. */
  waterError: number
}

export interface StepCounts {
  accepted: number
  rejected: number
  rightHandSides: number
  jacobians: number
}
