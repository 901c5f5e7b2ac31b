import type { Leg, Surroundings } from '@/lib/thermal'
import { type BaseRuns, PRONE, type Side } from './base-runs'
import type { AirPoint } from './clock'

/**
 * Air outside the crates on one leg of a schedule, where the law measures: the air given, or of an enclosed space the
 * air computed with the animals prone to that side aboard.
 */
export function outsideAir(
  base: BaseRuns,
  leg: Leg,
  legIndex: number,
  scheduleId: string,
  side: Side,
): AirPoint[] {
  const starts = base.schedules.find(({ id }) => id === scheduleId)?.legStartMin ?? []
  const fromMin = starts[legIndex] ?? 0
  const toMin = starts[legIndex + 1] ?? fromMin
  return air(leg.surroundings, fromMin, toMin) ?? computed(base, leg.id, scheduleId, side, fromMin, toMin)
}

function air(surroundings: Surroundings, fromMin: number, toMin: number): AirPoint[] | undefined {
  switch (surroundings.type) {
    case 'controlled':
      return [fromMin, toMin].map((minute) => ({ minute, tempC: surroundings.airTempC }))
    case 'open-air':
      return clipped(
        surroundings.series.map(({ minute, airTempC }) => ({ minute, tempC: airTempC })),
        fromMin,
        toMin,
      )
    case 'enclosed':
      return undefined
  }
}

function computed(
  base: BaseRuns,
  legId: string,
  scheduleId: string,
  side: Side,
  fromMin: number,
  toMin: number,
): AirPoint[] {
  const named = base.planned.find((one) => one.scheduleId === scheduleId && one.variant === PRONE[side])
  const track = named?.run.compartments.find((compartment) => compartment.legId === legId)
  const points = track?.minutes.map((minute, index) => ({ minute, tempC: track.airTempC[index] ?? 0 })) ?? []
  return clipped(points, fromMin, toMin)
}

/** The part between two minutes; beyond its first and last point the air stays as there. */
function clipped(points: readonly AirPoint[], fromMin: number, toMin: number): AirPoint[] {
  const inside = points.filter(({ minute }) => minute > fromMin && minute < toMin)
  return [
    { minute: fromMin, tempC: at(points, fromMin) },
    ...inside,
    { minute: toMin, tempC: at(points, toMin) },
  ]
}

function at(points: readonly AirPoint[], minute: number): number {
  const after = points.findIndex((point) => point.minute >= minute)
  const next = points[after]
  const previous = points[after - 1]
  if (next === undefined) return points.at(-1)?.tempC ?? 0
  if (previous === undefined || next.minute === minute) return next.tempC
  return (
    previous.tempC +
    ((next.tempC - previous.tempC) * (minute - previous.minute)) / (next.minute - previous.minute)
  )
}
