import { figure, inUnit } from '../format'
import type { TempUnit } from '../preferences'
import { roundTicks, yAt } from './frame'
import type { TempFrame, TimeFrame } from './frame'
import { line, words } from './marks'
import type { Mark } from './marks'
import { legStretches } from './channel'
import { stretchOf } from './series'
import type { CorridorInput } from './types'

type BodyInput = Pick<CorridorInput, 'legs' | 'limits' | 'typical' | 'deciding' | 'spread'>

/** All four limits and every track, with room in both walls for a label. */
export function wholeBodyFrame(time: TimeFrame, input: BodyInput, top: number, foot: number): TempFrame {
  const limits = legStretches(time, input).map((stretch) => stretch.limits)
  const values = trackValues(time, input)
  const low = Math.min(...limits.map((each) => each.criticalLowC), ...values)
  const high = Math.max(...limits.map((each) => each.criticalHighC), ...values)
  const range = high - low
  const lowest = Math.min(...limits.map((each) => each.criticalLowC))
  const highest = Math.max(...limits.map((each) => each.criticalHighC))
  return {
    lowC: Math.min(lowest - 0.07 * range, low - 0.03 * range),
    highC: Math.max(highest + 0.21 * range, high + 0.03 * range),
    top,
    foot,
  }
}

/**
 * Near the tracks: their range, and the alarm and critical limits of the side they come closer to. The other side's limits
 * lie beyond the axis unless the tracks near them; whoever shows the picture says so.
 */
export function nearBodyFrame(
  time: TimeFrame,
  input: BodyInput,
  top: number,
  foot: number,
  { above = 30, below = 24 }: { above?: number; below?: number } = {},
): TempFrame {
  const limits = legStretches(time, input).map((stretch) => stretch.limits)
  const values = trackValues(time, input)
  const least = Math.min(...values)
  const most = Math.max(...values)
  const roomHigh = Math.min(...limits.map((each) => each.alarmHighC)) - most
  const roomLow = least - Math.max(...limits.map((each) => each.alarmLowC))
  const edges = [least, most]
  if (roomHigh <= roomLow || roomHigh < 0.6)
    edges.push(...limits.flatMap((each) => [each.alarmHighC, each.criticalHighC]))
  if (roomLow < roomHigh || roomLow < 0.6)
    edges.push(...limits.flatMap((each) => [each.alarmLowC, each.criticalLowC]))
  const low = Math.min(...edges)
  const high = Math.max(...edges, low + 0.5)
  // Room in px above and below for words, whatever the range.
  const cPerPx = (high - low) / (foot - top - above - below)
  return { lowC: low - below * cPerPx, highC: high + above * cPerPx, top, foot }
}

/** Figures of the body scale at the left of a channel. */
export function bodyAxis(time: TimeFrame, temp: TempFrame, unit: TempUnit, size = 12, roomPx = 46): Mark[] {
  const toC = (value: number) => (unit === 'c' ? value : (value - 32) / 1.8)
  const { values, minor, step } = roundTicks(
    inUnit(temp.lowC, unit),
    inUnit(temp.highC, unit),
    temp.foot - temp.top,
    roomPx,
  )
  return [
    ...minor.map((value) => {
      const y = yAt(temp, toC(value))
      return line({ x: time.x0 - 5, y }, { x: time.x0, y }, { stroke: 'ink', strokeWidth: 1 })
    }),
    ...values.map((value) =>
      words(time.x0 - 9, yAt(temp, toC(value)) + size / 3, figure(value, step < 5 ? 1 : 0), {
        face: 'fig',
        size,
        anchor: 'end',
      }),
    ),
  ]
}

function trackValues(time: TimeFrame, input: BodyInput): number[] {
  const inFrame = (minutes: readonly number[], values: readonly number[]) =>
    stretchOf(minutes, values, time.fromMin, time.toMin).map(({ value }) => value)
  const values = [
    ...(input.typical ? inFrame(input.typical.minutes, input.typical.bodyC) : []),
    ...(input.deciding ? inFrame(input.deciding.minutes, input.deciding.bodyC) : []),
    ...(input.spread ? inFrame(input.spread.minutes, input.spread.p05C) : []),
    ...(input.spread ? inFrame(input.spread.minutes, input.spread.p95C) : []),
  ]
  if (values.length > 0) return values
  return legStretches(time, input).map(({ limits }) => (limits.alarmHighC + limits.alarmLowC) / 2)
}
