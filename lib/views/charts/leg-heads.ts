import { airMargin, bodyMargin, hourMin, minutesToSpare } from '../format'
import type { TempUnit } from '../preferences'
import { xAt } from './frame'
import type { TimeFrame } from './frame'
import { path, rect, words } from './marks'
import type { Box, Mark } from './marks'
import { textWidth } from './text-width'
import type { ChartLeg, LegHead } from './types'

export interface HeadBox extends Box {
  legId: string
}

/** Widths a head asks for: all its lines; air and body under one another; number, minutes and limit alone. */
const FULL = 113
const TALL = 84
const SLIM = 60

export interface HeadsLayout {
  heads: HeadBox[]
  top: number
  foot: number
  /** Where leaders meet their true stretch. */
  channelTop: number
}

/**
 * Every leg gets a head wide enough to read, however short the leg; what long legs have over is shared out again. A head
 * that stands off its true stretch is joined to it by leaders.
 */
export function layOutHeads(time: TimeFrame, legs: readonly ChartLeg[], top: number): HeadsLayout {
  const width = time.x1 - time.x0
  const least = Math.min(FULL, width / Math.max(1, legs.length))
  const over = legs.map((leg) => Math.max(0, xAt(time, leg.endMin) - xAt(time, leg.startMin) - least))
  const sum = over.reduce((total, each) => total + each, 0)
  const share = sum > 0 ? (width - least * legs.length) / sum : 0
  const foot = top + (least < FULL - 9 ? 130 : 112)
  let x = time.x0
  const heads = legs.map((leg, index) => {
    const own = least + (over[index] ?? 0) * share
    const head = { legId: leg.legId, x, y: top, width: own, height: foot - top }
    x += own
    return head
  })
  return { heads, top, foot, channelTop: foot + 24 }
}

/** Number, name, h:min, minutes in their frame, the limit that decided, air and body. */
export function headMarks(
  time: TimeFrame,
  legs: readonly ChartLeg[],
  layout: HeadsLayout,
  { unit, chosen }: { unit: TempUnit; chosen: string | null },
): Mark[] {
  const { heads, top, foot, channelTop } = layout
  const marks: Mark[] = [
    rect({ x: time.x0, y: top, width: time.x1 - time.x0, height: foot - top }, { fill: 'sheet' }),
  ]
  legs.forEach((leg, index) => {
    const head = heads[index]
    if (!head) return
    if (leg.legId === chosen) marks.push(rect(head, { fill: 'handwash' }))
    marks.push(...headWords(leg, head, unit))
    if (index > 0) {
      const x = xAt(time, leg.startMin)
      marks.push(
        path(`M${r(head.x)} ${top}V${foot}L${r(x)} ${channelTop}`, { stroke: 'ink', strokeWidth: 1 }),
      )
    }
  })
  marks.push(
    path(`M${time.x0} ${top}H${time.x1}M${time.x0} ${top}V${channelTop}M${time.x1} ${top}V${channelTop}`, {
      stroke: 'ink',
      strokeWidth: 1.5,
    }),
  )
  return marks
}

/** Captions of the rows, right of the left margin's edge. */
export function headCaptions(x: number, layout: HeadsLayout, unit: TempUnit): Mark[] {
  const { top } = layout
  const look = { anchor: 'end', ink: 'mute' } as const
  return [
    words(x, top + 19, 'Leg', look),
    words(x, top + 59, 'To spare', look),
    words(x, top + 83, 'Limit', look),
    words(x, top + 101, unit === 'c' ? '°C' : '°F', look),
  ]
}

function headWords(leg: ChartLeg, head: HeadBox, unit: TempUnit): Mark[] {
  const x = head.x + (head.width < SLIM + 14 ? 4 : 8)
  const room = head.x + head.width - x - 4
  const number = String(leg.ordinal)
  const numberWidth = textWidth(number, 'head', 15, 700) + 6
  const marks: Mark[] = [
    words(x, head.y + 19, number, { face: 'head', size: 15 }),
    words(x + numberWidth, head.y + 19, shortened(leg.name, room - numberWidth, 13, 600), {
      size: 13,
      weight: 600,
    }),
    words(x, head.y + 37, `${hourMin(leg.endMin - leg.startMin)}${head.width >= TALL ? ' h:min' : ''}`, {
      ink: 'mute',
    }),
  ]
  if (!leg.head || leg.head.verdict === null)
    return [...marks, words(x, head.y + 59, 'none yet', { ink: 'mute' })]
  return [
    ...marks,
    ...cellMarks(leg.head, x, head.y + 44, Math.min(76, room)),
    ...limitWords(leg.head, x, head, unit),
  ]
}

function limitWords(head: LegHead, x: number, box: HeadBox, unit: TempUnit): Mark[] {
  const room = box.x + box.width - x - 2
  const marks: Mark[] = [words(x, box.y + 83, shortened(decides(head), room, 12, 600), { weight: 600 })]
  const air = head.outsideAirC === null ? '' : `air ${bare(airMargin(head.outsideAirC, unit))}`
  const body = head.bodyC === null ? '' : `body ${bare(bodyMargin(head.bodyC, unit))}`
  const joined = [air, body].filter(Boolean).join(', ')
  if (box.height < 120) return [...marks, words(x, box.y + 101, joined, { ink: 'mute' })]
  return [...marks, words(x, box.y + 101, air, { ink: 'mute' }), words(x, box.y + 118, body, { ink: 'mute' })]
}

/** "alarm"; "alarm, law" where a law decides and the figures are to the alarm limit. */
function decides({ limitWords: limit, decidedWords }: LegHead): string {
  return [limit, decidedWords].filter(Boolean).join(', ')
}

/** A figure in the frame of its verdict; the limit's words stand under it. */
export function cellMarks(head: LegHead, x: number, y: number, width: number, height = 22): Mark[] {
  if (head.verdict === null) return []
  const text = head.minutes === null ? 'none' : minutesToSpare(head.minutes)
  const size = textWidth(text, 'fig', 13) > width - 6 ? 11 : 13
  const label = (ink: 'ink' | 'on-ink', weight: 400 | 600) =>
    words(x + width / 2, y + height / 2 + size * 0.35, text, {
      face: 'fig',
      size,
      weight,
      ink,
      anchor: 'middle',
    })
  if (head.verdict === 'no-go') return [rect({ x, y, width, height }, { fill: 'ink' }), label('on-ink', 600)]
  const frame = { x: x + 1, y: y + 1, width: width - 2, height: height - 2 }
  return [
    rect(frame, {
      fill: 'sheet',
      stroke: 'ink',
      strokeWidth: 2,
      dash: head.verdict === 'conditional' ? [6, 4] : undefined,
    }),
    label('ink', 400),
  ]
}

/** Words cut to a width, at a word where one can be. */
export function shortened(text: string, room: number, size: number, weight: number): string {
  if (textWidth(text, 'text', size, weight) <= room) return text
  for (let end = text.length - 1; end > 0; end -= 1) {
    const part = text.slice(0, end).replace(/[\s,]+$/, '')
    if (textWidth(part, 'text', size, weight) <= room) return part
  }
  return ''
}

/** Without its unit: the caption at the left carries it. */
function bare(text: string): string {
  return text.replace(/\u00a0°[CF]$/, '')
}

function r(value: number): number {
  return Math.round(value * 10) / 10
}
