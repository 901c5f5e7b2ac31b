import { airTemp, bodyMargin, bodyTemp, limitTemp, localTime } from '../format'
import { marginAt } from './channel'
import { yInside } from './frame'
import type { TempFrame } from './frame'
import { zoneAt } from './ruler'
import { valueAt } from './series'
import type { CorridorInput, LegLimits } from './types'

export interface ReadingRow {
  name: string
  value: string
  strong: boolean
  y: number
}

/** Everything under the reading line at a minute, in words. */
export interface Reading {
  minute: number
  legOrdinal: number
  legName: string
  /** First the animal's own clock, then the desk's where it differs. */
  times: string[]
  body: ReadingRow[]
  air: ReadingRow[]
  /** For ears: "03:09 GST, leg 5, body 39.5 °C, alarm high passed by 0.1 °C". */
  spoken: string
}

export function readingAt(
  input: CorridorInput,
  minute: number,
  temp: TempFrame,
  airFrame: TempFrame,
): Reading {
  const { unit } = input
  const index = legIndexAt(input, minute)
  const leg = input.legs[index]
  const limits = input.limits[index] ?? input.limits[0]
  const ms = input.departureMs + minute * 60_000
  const own = zoneAt(input.zones, minute)
  const others = [...new Set(input.zones.map(({ zone }) => zone))].filter((zone) => zone !== own)
  const times = [own, ...others.slice(0, 1)].map((zone) => localTime(ms, zone))
  const body: ReadingRow[] = []
  const add = (name: string, tempC: number, value: string, strong = false) =>
    body.push({ name, value, strong, y: yInside(temp, tempC) })
  const typicalC = input.typical && valueAt(input.typical.minutes, input.typical.bodyC, minute)
  const decidingC = input.deciding && valueAt(input.deciding.minutes, input.deciding.bodyC, minute)
  if (limits) {
    add('Critical high', limits.criticalHighC, limitTemp(limits.criticalHighC, 'high', unit))
    add('Alarm high', limits.alarmHighC, limitTemp(limits.alarmHighC, 'high', unit))
    add('Alarm low', limits.alarmLowC, limitTemp(limits.alarmLowC, 'low', unit))
    add('Critical low', limits.criticalLowC, limitTemp(limits.criticalLowC, 'low', unit))
  }
  if (input.spread) {
    const { minutes, p05C, p95C } = input.spread
    add('P95', valueAt(minutes, p95C, minute), bodyTemp(valueAt(minutes, p95C, minute), unit))
    add('P5', valueAt(minutes, p05C, minute), bodyTemp(valueAt(minutes, p05C, minute), unit))
  }
  if (typicalC !== null) add('Typical', typicalC, bodyTemp(typicalC, unit))
  if (decidingC !== null) add(variantName(input), decidingC, bodyTemp(decidingC, unit), true)
  return {
    minute,
    legOrdinal: leg?.ordinal ?? 0,
    legName: leg?.name ?? '',
    times,
    body: spaced(body),
    air: spaced(airRows(input, minute, airFrame)),
    spoken: spoken(input, minute, times[0] ?? '', leg?.ordinal ?? 0, limits, decidingC ?? typicalC),
  }
}

/** Index of the leg a minute falls in; the last minute belongs to the last leg. */
export function legIndexAt(input: Pick<CorridorInput, 'legs'>, minute: number): number {
  const index = input.legs.findIndex((leg) => minute < leg.endMin)
  return index === -1 ? input.legs.length - 1 : index
}

/** Lines pushed apart to 19 px and kept in order, so that no two figures stand on one another. */
export function spaced(rows: readonly ReadingRow[], gap = 19): ReadingRow[] {
  const sorted = [...rows].sort((a, b) => a.y - b.y)
  const groups: { rows: ReadingRow[]; middle: number }[] = []
  for (const row of sorted) {
    let group = { rows: [row], middle: row.y }
    let last = groups.at(-1)
    while (last && group.middle - span(group.rows, gap) / 2 < last.middle + span(last.rows, gap) / 2 + gap) {
      groups.pop()
      const rowsOfBoth = [...last.rows, ...group.rows]
      group = { rows: rowsOfBoth, middle: mean(rowsOfBoth.map(({ y }) => y)) }
      last = groups.at(-1)
    }
    groups.push(group)
  }
  return groups.flatMap(({ rows: inGroup, middle }) =>
    inGroup.map((row, index) => ({ ...row, y: middle - span(inGroup, gap) / 2 + index * gap })),
  )
}

function airRows(input: CorridorInput, minute: number, frame: TempFrame): ReadingRow[] {
  const rows: ReadingRow[] = []
  const add = (name: string, air: CorridorInput['crateAir']) => {
    if (!air) return
    const tempC = valueAt(air.minutes, air.tempC, minute)
    rows.push({ name, value: airTemp(tempC, input.unit), strong: false, y: yInside(frame, tempC) })
  }
  add('Crate air', input.crateAir)
  add('Outside', input.outsideAir)
  return rows
}

function spoken(
  input: CorridorInput,
  minute: number,
  time: string,
  ordinal: number,
  limits: LegLimits | undefined,
  bodyC: number | null,
): string {
  const parts = [time, `leg ${ordinal}`]
  if (bodyC !== null && Number.isFinite(bodyC)) parts.push(`body ${bodyTemp(bodyC, input.unit)}`)
  if (limits && input.deciding) {
    const { marginC, side } = marginAt(input.deciding, limits, minute)
    const size = bodyMargin(marginC, input.unit).replace('−', '')
    parts.push(marginC < 0 ? `alarm ${side} passed by ${size}` : `${size} to alarm ${side}`)
  }
  if (input.crateAir) {
    parts.push(
      `crate air ${airTemp(valueAt(input.crateAir.minutes, input.crateAir.tempC, minute), input.unit)}`,
    )
  }
  return parts.join(', ')
}

/** "Heat-prone" from "heat-prone, decides". */
function variantName(input: CorridorInput): string {
  const words = input.deciding?.words.split(',')[0] ?? 'Body'
  return words.charAt(0).toUpperCase() + words.slice(1)
}

function span(rows: readonly ReadingRow[], gap: number): number {
  return (rows.length - 1) * gap
}

function mean(values: readonly number[]): number {
  return values.reduce((sum, value) => sum + value, 0) / values.length
}

/** The minute at which the deciding track has least room to an alarm limit; the reading line starts there. */
export function narrowestMinute(input: CorridorInput): number {
  const { deciding } = input
  if (!deciding) return 0
  let best = { minute: 0, marginC: Number.POSITIVE_INFINITY }
  for (const minute of deciding.minutes) {
    const limits = input.limits[legIndexAt(input, minute)]
    if (!limits || minute > input.endMin) continue
    const { marginC } = marginAt(deciding, limits, minute)
    if (marginC < best.marginC) best = { minute, marginC }
  }
  return Math.round(best.minute)
}
