import { figure, inUnit } from '../format'
import type { TempUnit } from '../preferences'
import { roundTicks, yAt } from './frame'
import type { TempFrame, TimeFrame } from './frame'
import { line, words } from './marks'
import type { Mark } from './marks'
import { legStretches } from './channel'
import { extreme, stretchOf } from './series'
import type { Sample } from './series'
import type { CorridorInput, Track } from './types'

type BodyInput = Pick<CorridorInput, 'legs' | 'limits' | 'typical' | 'deciding' | 'spread'>

/** How far past a critical limit the scale follows a track, as a share of the room between both critical limits. */
const BEYOND = 0.6

/** All four limits and every track, with room in both walls for a label. A runaway leaves the picture (see offScale). */
export function wholeBodyFrame(time: TimeFrame, input: BodyInput, top: number, foot: number): TempFrame {
  const { lowestC, highestC } = reach(time, input)
  const values = trackValues(time, input)
  const low = Math.min(lowestC, Math.max(lowestC - BEYOND * (highestC - lowestC), Math.min(...values)))
  const high = Math.max(highestC, Math.min(highestC + BEYOND * (highestC - lowestC), Math.max(...values)))
  const range = high - low
  return {
    lowC: Math.min(lowestC - 0.07 * range, low - 0.03 * range),
    highC: Math.max(highestC + 0.21 * range, high + 0.03 * range),
    top,
    foot,
  }
}

/** Where a track leaves the picture: its extreme there, so that no figure is lost with the line. */
export function offScale(
  time: TimeFrame,
  temp: TempFrame,
  track: Track | null,
): { sample: Sample; side: 'high' | 'low' }[] {
  if (!track) return []
  const samples = stretchOf(track.minutes, track.bodyC, time.fromMin, time.toMin)
  const most = extreme(samples, 1)
  const least = extreme(samples, -1)
  return [
    ...(most && most.value > temp.highC ? [{ sample: most, side: 'high' as const }] : []),
    ...(least && least.value < temp.lowC ? [{ sample: least, side: 'low' as const }] : []),
  ]
}

function reach(time: TimeFrame, input: BodyInput): { lowestC: number; highestC: number } {
  const limits = legStretches(time, input).map((stretch) => stretch.limits)
  return {
    lowestC: Math.min(...limits.map((each) => each.criticalLowC)),
    highestC: Math.max(...limits.map((each) => each.criticalHighC)),
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
  const { lowestC, highestC } = reach(time, input)
  const beyond = BEYOND * (highestC - lowestC)
  const least = Math.max(lowestC - beyond, Math.min(...values))
  const most = Math.min(highestC + beyond, Math.max(...values))
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
