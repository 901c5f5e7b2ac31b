import type { Run, SimulateOptions } from './run'
import { lengthenLeg, startsOf, withDelays } from './schedule'
import { simulate } from './simulate'
import { stateAt } from './snapshots'
import type { Scenario } from './scenario'

export interface EndureOptions extends Omit<SimulateOptions, 'start' | 'untilMin' | 'tracks' | 'failure'> {
  /** The failure supposed, or "stays": the leg simply goes on. */
  kind: 'climate' | 'ventilation' | 'stays'
  legId: string
  /** Moment of the failure, minutes from departure on the schedule given. */
  minute: number
  /** How far to look. Default 240. */
  horizonMin?: number
}

export interface Endured {
  animalId: string
  /** Minutes from the failure to the first limit on either side; absent: not within the horizon. */
  toAlarmMin?: number
  toCriticalMin?: number
}

/**
 * If this fails now and the leg goes on, how long does each animal keep its limits? Continues from a state stored in
 * `run` (same scenario, variant and schedule; made with `snapshotEveryMin`). Absent result: the failure means nothing on
 * this leg, because its surroundings are not enclosed and name no outside.
 */
export function endure(scenario: Scenario, run: Run, options: EndureOptions): Endured[] | undefined {
  const { kind, legId, minute, horizonMin = 240, ...rest } = options
  if (!canFail(scenario, legId, kind)) return undefined
  const delayed = withDelays(scenario, options.scheduleId ?? 'on-time')
  const index = delayed.legs.findIndex((leg) => leg.id === legId)
  const legEndMin = startsOf(delayed.legs)[index + 1] ?? minute
  const held = lengthenLeg(delayed, legId, Math.max(0, minute + horizonMin - legEndMin))
  const later = simulate(held, {
    ...rest,
    scheduleId: 'on-time',
    start: stateAt(run, minute),
    untilMin: minute + horizonMin,
    tracks: false,
    stopOncePast: 'critical',
    ...(kind !== 'stays' && { failure: { kind, fromMin: minute } }),
  })
  return later.extremes
    .filter((extreme) => extreme.legId === legId)
    .map(({ animalId, crossedMin }) => {
      const alarmMin = Math.min(crossedMin.alarmLow ?? Infinity, crossedMin.alarmHigh ?? Infinity)
      const criticalMin = Math.min(crossedMin.criticalLow ?? Infinity, crossedMin.criticalHigh ?? Infinity)
      return {
        animalId,
        ...(alarmMin < Infinity && { toAlarmMin: Math.max(0, alarmMin - minute) }),
        ...(criticalMin < Infinity && { toCriticalMin: Math.max(0, criticalMin - minute) }),
      }
    })
}

function canFail(scenario: Scenario, legId: string, kind: EndureOptions['kind']): boolean {
  if (kind === 'stays') return true
  const surroundings = scenario.legs.find((leg) => leg.id === legId)?.surroundings
  if (surroundings?.type === 'enclosed') return true
  // A controlled space gives no volume, so what happens to its air without fans cannot be said.
  return kind === 'climate' && surroundings?.type === 'controlled' && surroundings.outside !== undefined
}
