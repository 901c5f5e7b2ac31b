import { hatch } from './hatch'
import { xAt } from './frame'
import type { TimeFrame } from './frame'
import { line, path, rect, words } from './marks'
import type { Mark, Picture } from './marks'
import { textWidth } from './text-width'
import type { ChartLeg } from './types'

export type StripLeg = Pick<ChartLeg, 'legId' | 'ordinal' | 'name' | 'pattern' | 'startMin' | 'endMin'>

export interface StripOptions {
  width: number
  height?: number
  /** The stretch shown; legs that run off it get an arrowhead. Default: the whole journey. */
  fromMin?: number
  toMin?: number
  /** Names on the legs that have room: "1 Road". */
  named?: boolean
  hatchScale?: number
}

/** Legs as a bar in true time, each in its surroundings' pattern. Never a verdict: it only says where the animal is. */
export function journeyStrip(legs: readonly StripLeg[], options: StripOptions): Picture {
  const height = options.height ?? 16
  const fromMin = options.fromMin ?? legs[0]?.startMin ?? 0
  const toMin = options.toMin ?? legs.at(-1)?.endMin ?? fromMin + 60
  const time: TimeFrame = { fromMin, toMin, x0: 1, x1: options.width - 1 }
  const shown = legs.filter((leg) => leg.endMin > fromMin && leg.startMin < toMin)
  const marks: Mark[] = shown.flatMap((leg) => legMarks(time, leg, height, options))
  const first = shown[0]
  const last = shown.at(-1)
  if (first && last) {
    const x0 = xAt(time, Math.max(first.startMin, fromMin))
    const x1 = xAt(time, Math.min(last.endMin, toMin))
    marks.push(
      rect(
        { x: x0, y: 1, width: x1 - x0, height: height - 2 },
        { fill: 'none', stroke: 'ink', strokeWidth: 1.5 },
      ),
    )
    if (first.startMin < fromMin) marks.push(arrow(x0 + 2, height / 2, -1))
    if (last.endMin > toMin) marks.push(arrow(x1 - 2, height / 2, 1))
  }
  return { width: options.width, height, marks }
}

function legMarks(time: TimeFrame, leg: StripLeg, height: number, options: StripOptions): Mark[] {
  const x = xAt(time, Math.max(leg.startMin, time.fromMin))
  const width = xAt(time, Math.min(leg.endMin, time.toMin)) - x
  const box = { x, y: 1, width, height: height - 2 }
  return [
    rect(box, { fill: 'band' }),
    hatch(leg.pattern, box, { scale: options.hatchScale }),
    line({ x, y: 1 }, { x, y: height - 1 }, { stroke: 'ink', strokeWidth: 1 }),
    ...(options.named ? nameMarks(leg, box.x, width, height) : []),
  ]
}

function nameMarks(leg: StripLeg, x: number, width: number, height: number): Mark[] {
  const long = `${leg.ordinal} ${leg.name}`
  const text = [long, String(leg.ordinal)].find((each) => textWidth(each, 'text', 12, 600) + 12 <= width)
  if (!text) return []
  const room = textWidth(text, 'text', 12, 600) + 12
  return [
    rect({ x: x + (width - room) / 2, y: height / 2 - 8, width: room, height: 16 }, { fill: 'sheet' }),
    words(x + width / 2, height / 2 + 4, text, { weight: 600, anchor: 'middle' }),
  ]
}

/** A journey that runs off the picture. */
function arrow(x: number, y: number, direction: 1 | -1): Mark {
  return path(`M${x - direction * 7} ${y - 5}L${x} ${y}L${x - direction * 7} ${y + 5}Z`, { fill: 'ink' })
}
