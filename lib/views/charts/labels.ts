import { limitTemp } from '../format'
import type { TempUnit } from '../preferences'
import { xAt, yAt, yInside } from './frame'
import type { TempFrame, TimeFrame } from './frame'
import { line, rect, words } from './marks'
import type { Box, Mark, Point } from './marks'
import { stretchOf } from './series'
import { textWidth } from './text-width'
import type { LegLimits, Track } from './types'

/** Words and where they stand; boxes already taken are not written over. */
export interface Placed {
  marks: Mark[]
  taken: Box[]
}

const PAD = 6

/** A paper label with a bold beginning; its box, so that others keep off it. */
export function label(
  x: number,
  y: number,
  bold: string,
  text: string,
  size = 12,
): { marks: Mark[]; box: Box } {
  const boldWidth = bold ? textWidth(bold, 'text', size, 600) + (text ? 4 : 0) : 0
  const box = { x, y, width: boldWidth + textWidth(text, 'text', size) + 2 * PAD, height: size + 8 }
  const marks: Mark[] = [rect(box, { fill: 'sheet' })]
  if (bold) marks.push(words(x + PAD, y + size + 3, bold, { size, weight: 600 }))
  if (text) marks.push(words(x + PAD + boldWidth, y + size + 3, text, { size }))
  return { marks, box }
}

/**
 * Names and figures of the four limits, at the left end; again wherever a limit steps. Critical stands inside the wall;
 * alarm stands in the wall too, unless the wall is too thin for both.
 */
export function limitLabels(
  time: TimeFrame,
  temp: TempFrame,
  legs: readonly { startMin: number; endMin: number; limits: LegLimits }[],
  unit: TempUnit,
  size = 12,
): Placed {
  const placed: Placed = { marks: [], taken: [] }
  const height = size + 8
  legs.forEach(({ startMin, endMin, limits }, index) => {
    const before = legs[index - 1]?.limits
    const x = xAt(time, Math.max(startMin, time.fromMin)) + (index === 0 ? 14 : 6)
    const room = xAt(time, Math.min(endMin, time.toMin)) - x
    for (const side of ['high', 'low'] as const) {
      const alarmC = side === 'high' ? limits.alarmHighC : limits.alarmLowC
      const criticalC = side === 'high' ? limits.criticalHighC : limits.criticalLowC
      const alarmWas = side === 'high' ? before?.alarmHighC : before?.alarmLowC
      const criticalWas = side === 'high' ? before?.criticalHighC : before?.criticalLowC
      const wall = Math.abs(yAt(temp, alarmC) - yAt(temp, criticalC))
      const up = side === 'high'
      // Above, the critical limit's name stands outside the wall; below, both names stand in it.
      const wide = wall >= (up ? height + 8 : 2 * height + 10)
      if (criticalC !== criticalWas && inFrame(temp, criticalC)) {
        const y = up ? yAt(temp, criticalC) - height - 3 : yAt(temp, criticalC) - (wide ? height + 3 : -6)
        place(
          placed,
          index === 0 ? 'Critical' : '',
          side,
          criticalC,
          { x, y: keep(temp, y, height) },
          room,
          unit,
          size,
        )
      }
      if (alarmC !== alarmWas && inFrame(temp, alarmC)) {
        const inside = up ? yAt(temp, alarmC) - height - 2 : yAt(temp, alarmC) + 5
        const outside = up ? yAt(temp, alarmC) + 5 : yAt(temp, alarmC) - height - 3
        place(
          placed,
          index === 0 ? 'Alarm' : '',
          side,
          alarmC,
          { x, y: wide ? inside : outside },
          room,
          unit,
          size,
        )
      }
    }
  })
  return placed
}

function place(
  placed: Placed,
  name: string,
  side: 'high' | 'low',
  limitC: number,
  at: Point,
  room: number,
  unit: TempUnit,
  size: number,
): void {
  const made = label(at.x, at.y, name ? `${name} ${side}` : '', limitTemp(limitC, side, unit), size)
  // A figure wider than its leg would name the neighbour's limit.
  if (name === '' && made.box.width > room) return
  placed.marks.push(...made.marks)
  placed.taken.push(made.box)
}

function inFrame(temp: TempFrame, tempC: number): boolean {
  const y = yAt(temp, tempC)
  return y >= temp.top && y <= temp.foot
}

function keep(temp: TempFrame, y: number, height: number): number {
  return Math.min(temp.foot - height, Math.max(temp.top, y))
}

/**
 * A track's name: in a gap of its line where the line runs flat, else just above or below it, so that a steep piece is
 * never hidden. `beside` keeps it out of the line altogether, for the lighter of two neighbours.
 */
export function trackLabel(
  time: TimeFrame,
  temp: TempFrame,
  track: Track,
  text: string,
  taken: Box[],
  {
    size = 12,
    weight = 600,
    beside = false,
    lineYs = [],
    others = [],
  }: {
    size?: number
    weight?: 400 | 600
    beside?: boolean
    lineYs?: readonly number[]
    /** Other tracks, which the words must not hide. */
    others?: readonly Track[]
  } = {},
): Placed {
  const width = textWidth(text, 'text', size, weight) + 2 * PAD
  const height = size + 6
  let best: { box: Box; cost: number } | null = null
  for (let share = 0.08; share <= 0.88; share += 0.04) {
    const x = time.x0 + share * (time.x1 - time.x0)
    if (x + width > time.x1 - 4) break
    const ys = stretchOf(track.minutes, track.bodyC, minuteOf(time, x), minuteOf(time, x + width)).map(
      ({ value }) => yInside(temp, value),
    )
    const upper = Math.min(...ys)
    const lower = Math.max(...ys)
    const places = [
      { y: (upper + lower) / 2 - height / 2, cost: beside || lower - upper > 8 ? 1000 : lower - upper },
      { y: lower + 2, cost: beside ? (lower - upper) / 4 : 20 + (lower - upper) / 4 },
      { y: upper - height - 2, cost: beside ? 5 + (lower - upper) / 4 : 22 + (lower - upper) / 4 },
    ]
    for (const { y, cost } of places) {
      const box = { x, y, width, height }
      if (y < temp.top || y + height > temp.foot || taken.some((other) => overlap(box, other))) continue
      if (lineYs.some((lineY) => lineY > y - 3 && lineY < y + height + 3)) continue
      if (hiding(time, temp, box, others, []) > 0) continue
      if (!best || cost < best.cost - 0.5) best = { box, cost }
    }
  }
  if (!best) return { marks: [], taken: [] }
  const { box } = best
  const look = { size, weight, anchor: 'middle', ink: weight === 600 ? 'ink' : 'mute' } as const
  return {
    marks: [rect(box, { fill: 'sheet' }), words(box.x + width / 2, box.y + size + 1, text, look)],
    taken: [box],
  }
}

/** The first x from the left at which a label of this size lies on no track; the left end where there is none. */
export function clearOfTracks(
  time: TimeFrame,
  temp: TempFrame,
  from: number,
  to: number,
  box: Omit<Box, 'x'>,
  tracks: readonly Track[],
): number {
  for (let x = from; x + box.width <= to; x += 12) {
    if (hiding(time, temp, { ...box, x }, tracks, []) === 0) return x
  }
  return from
}

/**
 * What a label would lie on: a limit's line costs a little, a track's line much, because that is the fact itself; so does
 * what is solid between a track and the critical limit it has passed.
 */
export function hiding(
  time: TimeFrame,
  temp: TempFrame,
  box: Box,
  tracks: readonly Track[],
  lineYs: readonly number[],
  critical?: { lowC: number; highC: number },
): number {
  const lines = lineYs.filter((y) => y > box.y - 3 && y < box.y + box.height + 3).length
  const hidden = tracks.some((track) =>
    stretchOf(track.minutes, track.bodyC, minuteOf(time, box.x), minuteOf(time, box.x + box.width)).some(
      ({ value }) => {
        const y = yInside(temp, value)
        const passed = critical ? Math.max(critical.lowC, Math.min(critical.highC, value)) : value
        const to = yInside(temp, passed)
        return Math.max(y, to) > box.y - 4 && Math.min(y, to) < box.y + box.height + 4
      },
    ),
  )
  return lines * 120 + (hidden ? 600 : 0)
}

/** A mark of the room between track and limit, where it is narrow: an upright with feet and the distance. */
export function dimension(x: number, trackY: number, limitY: number, text: string): Placed {
  const top = Math.min(trackY, limitY)
  const foot = Math.max(trackY, limitY)
  const width = textWidth(text, 'fig', 12) + 8
  // Too short for its own figure: that stands on the track's far side, on bare paper.
  const short = foot - top < 22
  const y = short ? (trackY < limitY ? top - 22 : foot + 4) : (top + foot) / 2 - 9
  const box = { x: short ? x - width / 2 : x + 5, y, width, height: 18 }
  return {
    marks: [
      line({ x, y: top }, { x, y: foot }, { stroke: 'ink', strokeWidth: 1.25 }),
      line({ x: x - 4, y: top }, { x: x + 4, y: top }, { stroke: 'ink', strokeWidth: 1.25 }),
      line({ x: x - 4, y: foot }, { x: x + 4, y: foot }, { stroke: 'ink', strokeWidth: 1.25 }),
      rect(box, { fill: 'sheet' }),
      words(box.x + 4, box.y + 13, text, { face: 'fig' }),
    ],
    taken: [box, { x: x - 6, y: top, width: 12, height: foot - top }],
  }
}

export function overlap(a: Box, b: Box): boolean {
  return a.x < b.x + b.width && b.x < a.x + a.width && a.y < b.y + b.height && b.y < a.y + a.height
}

export function minuteOf(time: TimeFrame, x: number): number {
  return time.fromMin + ((x - time.x0) * (time.toMin - time.fromMin)) / (time.x1 - time.x0)
}
