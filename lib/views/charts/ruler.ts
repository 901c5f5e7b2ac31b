import { zoneOffsetMin } from '@/lib/planning/local-time'
import { clock, dayDate, zoneName } from '../format'
import { minutesPerPx, xAt } from './frame'
import type { TimeFrame } from './frame'
import { line, rect, words } from './marks'
import type { Mark } from './marks'
import { textWidth } from './text-width'

/** Steps between labels and between ticks, minutes. */
const STEPS = [
  [5, 5],
  [10, 5],
  [15, 5],
  [30, 10],
  [60, 30],
  [120, 60],
  [180, 60],
  [360, 120],
  [720, 360],
  [1440, 720],
] as const

export interface RulerInput {
  departureMs: number
  zones: readonly { zone: string; fromMin: number }[]
  dark: readonly { fromMin: number; toMin: number }[]
}

export interface RulerLook {
  /** y of the line; labels stand above it, or below where `below`. */
  y: number
  /** Where the zone's name stands; absent: none. */
  nameX?: number
  /** The minute that decides whether the name is 600; default: the frame's start. */
  nameMin?: number
  size?: number
  below?: boolean
  /** How far a label may hang over the end of the line, px; default 14. */
  overhang?: number
  /** Steps narrower than this many px carry no label. */
  room?: number
}

/**
 * One time ruler in one zone. Labels are 600 while the animal is in that zone, else mute; at midnight the day stands in
 * place of the hour; where it is dark outside the line is thick.
 */
export function ruler(frame: TimeFrame, zone: string, input: RulerInput, look: RulerLook): Mark[] {
  const { y, size = 12, below = false } = look
  const room = look.room ?? textWidth('Wed 30 Sep', 'text', size, 600) + 10
  const [labelStep, tickStep] = stepsFor(frame, room)
  const up = below ? -1 : 1
  const marks: Mark[] = [line({ x: frame.x0, y }, { x: frame.x1, y }, { stroke: 'ink', strokeWidth: 1 })]
  for (const { fromMin, toMin } of input.dark) {
    const from = Math.max(fromMin, frame.fromMin)
    const to = Math.min(toMin, frame.toMin)
    if (to <= from) continue
    const x = xAt(frame, from)
    marks.push(rect({ x, y: y - 1.5, width: xAt(frame, to) - x, height: 4 }, { fill: 'ink' }))
  }
  let lastEnd = -Infinity
  for (const { minute, wall } of wallTicks(frame, zone, input.departureMs, tickStep)) {
    const x = xAt(frame, minute)
    const labelled = wall % labelStep === 0
    marks.push(line({ x, y }, { x, y: y - up * (labelled ? 5 : 3) }, { stroke: 'ink', strokeWidth: 1 }))
    if (!labelled) continue
    const ms = input.departureMs + minute * 60_000
    const text = wall % 1440 === 0 ? dayDate(ms, zone) : clock(ms, zone)
    const own = zoneAt(input.zones, minute) === zone
    const half = textWidth(text, 'text', size, own ? 600 : 400) / 2
    // A label may hang over the end of the line by a little, never over its neighbour.
    if (x - half < lastEnd + 6 || x - half < frame.x0 - 14 || x + half > frame.x1 + (look.overhang ?? 14))
      continue
    lastEnd = x + half
    marks.push(
      words(x, below ? y + size + 5 : y - 8, text, {
        size,
        weight: own ? 600 : 400,
        ink: own ? 'ink' : 'mute',
        anchor: 'middle',
      }),
    )
  }
  if (look.nameX !== undefined) {
    const ms = input.departureMs + frame.fromMin * 60_000
    const own = zoneAt(input.zones, look.nameMin ?? frame.fromMin) === zone
    marks.push(
      words(look.nameX, below ? y + size + 5 : y - 4, zoneName(ms, zone), {
        size,
        weight: own ? 600 : 400,
        ink: own ? 'ink' : 'mute',
      }),
    )
  }
  return marks
}

/** The zone the animal is in at a minute. */
export function zoneAt(zones: RulerInput['zones'], minute: number): string {
  let zone = zones[0]?.zone ?? 'UTC'
  for (const stretch of zones) if (stretch.fromMin <= minute) zone = stretch.zone
  return zone
}

/** Zones that get a ruler: where the journey starts and where it ends, one line where they are the same. */
export function ruledZones(zones: RulerInput['zones']): string[] {
  const first = zones[0]?.zone ?? 'UTC'
  const last = zones.at(-1)?.zone ?? first
  return first === last ? [first] : [first, last]
}

function stepsFor(frame: TimeFrame, room: number): readonly [number, number] {
  return STEPS.find(([label]) => label / minutesPerPx(frame) >= room) ?? [1440, 720]
}

/** Minutes at which a clock in the zone shows a multiple of the step. Offsets are multiples of 15 min, so 15 is fine enough. */
function wallTicks(
  frame: TimeFrame,
  zone: string,
  departureMs: number,
  step: number,
): { minute: number; wall: number }[] {
  const departureMin = departureMs / 60_000
  const grid = Math.min(step, 15)
  const first = Math.ceil((departureMin + frame.fromMin) / grid - 1e-9) * grid
  const ticks: { minute: number; wall: number }[] = []
  for (let utc = first; utc <= departureMin + frame.toMin + 1e-9; utc += grid) {
    const wall = utc + zoneOffsetMin(utc * 60_000, zone)
    if (wall % step === 0) ticks.push({ minute: utc - departureMin, wall })
  }
  return ticks
}
