import { channel } from '@/lib/views/charts/channel'
import { nearBodyFrame } from '@/lib/views/charts/body-frame'
import { type TempFrame, type TimeFrame, xAt, yAt } from '@/lib/views/charts/frame'
import { trackLabel } from '@/lib/views/charts/labels'
import { type Box, circle, line, type Mark, rect, words } from '@/lib/views/charts/marks'
import { ruler, zoneAt } from '@/lib/views/charts/ruler'
import { valueAt } from '@/lib/views/charts/series'
import { textWidth } from '@/lib/views/charts/text-width'
import type { ChartLeg } from '@/lib/views/charts/types'
import { limitTemp } from '@/lib/views/format'
import type { AnimalChart, SheetCharts } from '@/lib/views/sheet'
import { channelInput, HATCH_SCALE, limitFigures, type PastedLabel } from './corridor-channel'

/** A leg wider than this on the journey's own scale needs no second picture. */
const WIDE_PX = 160
const LEAST_MIN = 60

/** The stretch of time round a narrow leg; null where the leg is wide enough as it is. */
export function stretchOfLeg(
  time: TimeFrame,
  leg: ChartLeg,
  endMin: number,
): { fromMin: number; toMin: number } | null {
  if (xAt(time, leg.endMin) - xAt(time, leg.startMin) >= WIDE_PX) return null
  const long = Math.min(endMin, Math.max(LEAST_MIN, (leg.endMin - leg.startMin) * 2))
  const middle = (leg.startMin + leg.endMin) / 2
  const fromMin = Math.min(Math.max(0, middle - long / 2), endMin - long)
  return { fromMin, toMin: fromMin + long }
}

export interface StretchOptions {
  time: TimeFrame
  top: number
  height: number
  charts: SheetCharts
  legs: ChartLeg[]
  deciding: AnimalChart
  leg: ChartLeg
  callout: PastedLabel | null
}

/** The deciding leg drawn again, wide: its own clock, names of legs, limits and tracks, and the label that says it. */
export function stretchMarks({
  time,
  top,
  height,
  charts,
  legs,
  deciding,
  leg,
  callout,
}: StretchOptions): Mark[] {
  const input = channelInput(legs, deciding)
  const channelTop = top + 12
  const temp = roomForNames(
    readable(nearBodyFrame(time, input, channelTop, channelTop + height), deciding.limits),
    deciding.limits.criticalHighC,
  )
  const zone = zoneAt(charts.zones, leg.startMin)
  const rulerInput = { departureMs: charts.departureMs, zones: charts.zones, dark: [] }
  const names = [
    ...legs.flatMap((one) => legName(time, one, channelTop)),
    ...limitNames(time, temp, deciding),
  ]
  const label = callout === null ? [] : pasted(time, temp, deciding, leg, callout)
  const taken = [...names, ...label].flatMap((mark) =>
    mark.kind === 'rect' ? [mark] : mark.kind === 'circle' ? [aroundPoint(mark)] : [],
  )
  const times = Math.round(charts.endMin / (time.toMin - time.fromMin))
  return [
    ...ruler(time, zone, rulerInput, { y: channelTop, nameX: 0, size: 10.5, room: 60 }),
    ...channel(time, temp, input, { hatchScale: HATCH_SCALE }),
    words(0, channelTop + 22, deciding.crateLetter, { face: 'crate', size: 20 }),
    words(18, channelTop + 11, `${times} times`, { size: 10.5, weight: 600 }),
    words(18, channelTop + 23, 'wider', { size: 10 }),
    ...limitFigures(time, temp, deciding),
    ...names,
    ...trackNames(time, temp, deciding, taken),
    ...label,
  ]
}

const NAMES_HIGH = 20

/** Names of legs stand above the critical limit, where the axis reaches it. */
function roomForNames(temp: TempFrame, criticalHighC: number): TempFrame {
  if (temp.highC < criticalHighC || yAt(temp, criticalHighC) - temp.top >= NAMES_HIGH) return temp
  const height = temp.foot - temp.top
  return {
    ...temp,
    highC: criticalHighC + (NAMES_HIGH * (criticalHighC - temp.lowC)) / (height - NAMES_HIGH),
  }
}

/** What lies far past a critical limit is drawn at the edge. */
function readable(temp: TempFrame, { criticalHighC, criticalLowC }: AnimalChart['limits']): TempFrame {
  const most = (criticalHighC - criticalLowC) / 4
  return {
    ...temp,
    highC: Math.min(temp.highC, criticalHighC + most),
    lowC: Math.max(temp.lowC, criticalLowC - most),
  }
}

function aroundPoint({ x, y }: { x: number; y: number }): Box {
  return { x: x - 24, y: y - 8, width: 48, height: 16 }
}

function legName(time: TimeFrame, leg: ChartLeg, top: number): Mark[] {
  const from = Math.max(leg.startMin, time.fromMin)
  const to = Math.min(leg.endMin, time.toMin)
  if (to <= from) return []
  const room = xAt(time, to) - xAt(time, from)
  const full = `${leg.ordinal} ${leg.name}`
  const text = textWidth(full, 'text', 10.5, 600) + 14 <= room ? full : String(leg.ordinal)
  if (room < 18) return []
  return tag(xAt(time, from) + 6, top + 2, text, 600)
}

function limitNames(time: TimeFrame, temp: TempFrame, { limits }: AnimalChart): Mark[] {
  const names = [
    ['critical', limits.criticalHighC, 'high', 5],
    ['alarm', limits.alarmHighC, 'high', 4],
    ['alarm low', limits.alarmLowC, 'low', -17],
    ['critical low', limits.criticalLowC, 'low', -19],
  ] as const
  return names.flatMap(([name, tempC, side, shift]) => {
    const y = yAt(temp, tempC)
    if (y < temp.top + 2 || y > temp.foot - 2) return []
    return tag(
      time.x0 + 6,
      y + shift,
      `${name} ${limitTemp(tempC, side, 'c')}`,
      name.startsWith('critical') ? 600 : 400,
    )
  })
}

/** Names in gaps of their own lines, where those run flat and nothing stands yet. */
function trackNames(
  time: TimeFrame,
  temp: TempFrame,
  { typical, deciding }: AnimalChart,
  taken: Box[],
): Mark[] {
  const look = { size: 10.5 }
  const first =
    deciding === null
      ? null
      : trackLabel(time, temp, deciding, `${deciding.variant}, decides`, taken, { ...look, weight: 600 })
  const second =
    typical === null
      ? null
      : trackLabel(time, temp, typical, 'typical', [...taken, ...(first?.taken ?? [])], {
          ...look,
          weight: 400,
        })
  return [...(first?.marks ?? []), ...(second?.marks ?? [])]
}

/** The label pasted on the wall, with a leader to the worst point of the leg. */
function pasted(
  time: TimeFrame,
  temp: TempFrame,
  { deciding, limits }: AnimalChart,
  leg: ChartLeg,
  callout: PastedLabel,
): Mark[] {
  if (deciding === null) return []
  const minutes = deciding.minutes.filter(
    (minute) => minute >= Math.max(leg.startMin, time.fromMin) && minute <= Math.min(leg.endMin, time.toMin),
  )
  const roomAt = (minute: number) => {
    const bodyC = valueAt(deciding.minutes, deciding.bodyC, minute)
    return Math.min(limits.alarmHighC - bodyC, bodyC - limits.alarmLowC)
  }
  const worst = minutes.reduce(
    (best, minute) => (roomAt(minute) < roomAt(best) ? minute : best),
    minutes[0] ?? leg.startMin,
  )
  const point = { x: xAt(time, worst), y: yAt(temp, valueAt(deciding.minutes, deciding.bodyC, worst)) }
  const solid = callout.verdict === 'no-go'
  const block = solid
    ? Math.max(46, textWidth(callout.figure, 'fig', 10.5, 600) + 10)
    : textWidth('GO WITH CONDITIONS', 'head', 10, 800) + 14
  const width =
    block + Math.max(textWidth(callout.title, 'text', 10.5, 600), textWidth(callout.text, 'text', 10.5)) + 14
  const past = valueAt(deciding.minutes, deciding.bodyC, worst) > (limits.alarmHighC + limits.alarmLowC) / 2
  const wished = past ? yAt(temp, limits.alarmHighC) - 34 : yAt(temp, limits.alarmLowC) + 4
  const wallY = Math.min(temp.foot - 33, Math.max(temp.top + NAMES_HIGH, wished))
  const right = point.x + 70 + width < time.x1
  const box = {
    x: right ? point.x + 70 : Math.max(time.x0 + 130, point.x - 70 - width),
    y: wallY,
    width,
    height: 31,
  }
  const edge = { x: right ? box.x : box.x + box.width, y: box.y + 15 }
  return [
    line(edge, point, { stroke: 'sheet', strokeWidth: 4 }),
    line(edge, point, { stroke: 'ink', strokeWidth: 1.25 }),
    circle(point.x, point.y, 3.2, { fill: 'sheet', stroke: 'ink', strokeWidth: 1.25 }),
    rect(box, { fill: 'sheet', stroke: 'ink', strokeWidth: 1.25, ...(solid ? {} : { dash: [5, 3] }) }),
    ...(solid ? [rect({ ...box, width: block }, { fill: 'ink' })] : []),
    words(box.x + block / 2, box.y + 13, solid ? 'NO-GO' : 'GO WITH CONDITIONS', {
      face: 'head',
      size: 10,
      weight: 800,
      anchor: 'middle',
      ink: solid ? 'on-ink' : 'ink',
    }),
    words(box.x + block / 2, box.y + 26, callout.figure, {
      face: 'fig',
      size: 10.5,
      weight: 600,
      anchor: 'middle',
      ink: solid ? 'on-ink' : 'ink',
    }),
    words(box.x + block + 6, box.y + 13, callout.title, { size: 10.5, weight: 600 }),
    words(box.x + block + 6, box.y + 26, callout.text, { size: 10.5 }),
  ]
}

function tag(x: number, y: number, text: string, weight: 400 | 600): Mark[] {
  return [
    rect({ x, y, width: textWidth(text, 'text', 10.5, weight) + 8, height: 15 }, { fill: 'sheet' }),
    words(x + 4, y + 11.3, text, { size: 10.5, weight }),
  ]
}
