/**
 * The thermal core: a pure function of one scenario. No clock, no chance, no input or output.
 * `simulate` makes one run; the functions beside it rewrite scenarios for margins, delays, failures and stop limits.
 */
export { simulate } from './simulate'
export { gather } from './gather'
export { endure, type Endured, type EndureOptions } from './endure'
export { stateAt } from './snapshots'
export { ENGINE_VERSION } from './version'
export { rightHandSide } from './right-hand-side'
export { profileOf } from './journey'
export { holdLegAt, lengthenLeg, schedulesOf, shiftAir, withDelays } from './schedule'
export type {
  Closure,
  EffortExtremes,
  Failure,
  LegExtremes,
  Numerics,
  Run,
  SimulateOptions,
  StartFrom,
  StepCounts,
} from './run'
export type { Waypoint } from './waypoint'
export type * from './result'
export type * from './scenario'
export { VARIANTS } from './scenario'
