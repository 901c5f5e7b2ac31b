import { rampStep } from '@/lib/tokens'
import { figure, inUnit } from '../format'
import type { TempUnit } from '../preferences'
import { minutesPerPx, roundTicks, xAt, yAt } from './frame'
import type { TempFrame, TimeFrame } from './frame'
import { line, path, rect, through, words } from './marks'
import type { Box, Mark } from './marks'
import { extreme, stretchOf, thinned } from './series'
import { textWidth } from './text-width'
import { trackLabel } from './labels'
import type { AirTrack, ChartLeg } from './types'

export interface AirInput {
  crateAir: AirTrack | null
  outsideAir: AirTrack | null
  legs: readonly ChartLeg[]
  extreme: 'hottest' | 'coldest'
  unit: TempUnit
}

export interface AirPart {
  marks: Mark[]
  temp: TempFrame
  lines: Box
  strip: Box
}

export function hasAir(input: Pick<AirInput, 'crateAir' | 'outsideAir'>): boolean {
  return input.crateAir !== null || input.outsideAir !== null
}

/** Crate air solid, what lies outside dashed, on a scale of their own; under them the logger strip. */
export function airPart(
  time: TimeFrame,
  input: AirInput,
  top: number,
  { height = 100, size = 12, axisX = 63 }: { height?: number; size?: number; axisX?: number } = {},
): AirPart {
  const temp = airFrame(time, input, top, top + height)
  if (!hasAir(input)) {
    const nothing = { x: time.x0, y: top, width: 0, height: 0 }
    return { marks: [], temp, lines: nothing, strip: nothing }
  }
  const lines = { x: time.x0, y: top, width: time.x1 - time.x0, height }
  const strip = { x: time.x0, y: top + height + 8, width: time.x1 - time.x0, height: 26 }
  return {
    marks: [
      rect(lines, { fill: 'sheet' }),
      ...airAxis(time, temp, input.unit, axisX, size),
      ...input.legs
        .filter((leg) => leg.startMin > time.fromMin && leg.startMin < time.toMin)
        .map((leg) => {
          const x = xAt(time, leg.startMin)
          return line({ x, y: top }, { x, y: top + height }, { stroke: 'hair', strokeWidth: 1 })
        }),
      ...airLine(time, temp, input.outsideAir, { strokeWidth: 1.25, dash: [5, 3] }),
      ...airLine(time, temp, input.crateAir, { strokeWidth: 1.5 }),
      ...airNames(time, temp, input, size),
      ...loggerStrip(time, strip, input, size),
    ],
    temp,
    lines,
    strip,
  }
}

function airNames(time: TimeFrame, temp: TempFrame, input: AirInput, size: number): Mark[] {
  const crate = input.crateAir
  const outside = input.outsideAir
  const first = crate
    ? trackLabel(time, temp, { minutes: crate.minutes, bodyC: crate.tempC }, 'crate air', [], {
        size,
        weight: 400,
      })
    : { marks: [], taken: [] }
  const second = outside
    ? trackLabel(time, temp, { minutes: outside.minutes, bodyC: outside.tempC }, 'outside', first.taken, {
        size,
        weight: 400,
        beside: true,
      })
    : { marks: [] }
  return [...first.marks, ...second.marks]
}

function airFrame(time: TimeFrame, input: AirInput, top: number, foot: number): TempFrame {
  const values = [input.crateAir, input.outsideAir].flatMap((air) =>
    air ? stretchOf(air.minutes, air.tempC, time.fromMin, time.toMin).map(({ value }) => value) : [],
  )
  const low = values.length > 0 ? Math.min(...values) : 10
  const high = values.length > 0 ? Math.max(...values) : 30
  const step = high - low > 25 ? 10 : high - low > 10 ? 5 : 2
  const lowC = Math.floor((low - 0.5) / step) * step
  const highC = Math.max(lowC + 2 * step, Math.ceil((high + 0.5) / step) * step)
  return { lowC, highC, top, foot }
}

function airAxis(time: TimeFrame, temp: TempFrame, unit: TempUnit, x: number, size: number): Mark[] {
  const low = inUnit(temp.lowC, unit)
  const high = inUnit(temp.highC, unit)
  const { values } = roundTicks(low, high, temp.foot - temp.top, 30)
  const toC = (value: number) => (unit === 'c' ? value : (value - 32) / 1.8)
  return values.flatMap((value) => {
    const y = yAt(temp, toC(value))
    return [
      line({ x: time.x0, y }, { x: time.x1, y }, { stroke: 'hair', strokeWidth: 1 }),
      words(x, y + size / 3, figure(value), { face: 'fig', size, anchor: 'end' }),
    ]
  })
}

function airLine(
  time: TimeFrame,
  temp: TempFrame,
  air: AirTrack | null,
  look: { strokeWidth: number; dash?: number[] },
): Mark[] {
  if (!air) return []
  const samples = thinned(stretchOf(air.minutes, air.tempC, time.fromMin, time.toMin), minutesPerPx(time))
  const d = through(samples.map(({ minute, value }) => ({ x: xAt(time, minute), y: yAt(temp, value) })))
  return d === '' ? [] : [path(d, { fill: 'none', stroke: 'ink', ...look })]
}

/** Minutes a cell may hold, so that its number fits. */
const CELL_MINUTES = [15, 30, 60, 120, 180, 240, 360, 720, 1440] as const

/** One cell an hour where there is room: the ramp's colour and its number, the hottest or the coldest inside it. */
export function loggerStrip(
  time: TimeFrame,
  box: Box,
  { crateAir, extreme: which, unit }: Pick<AirInput, 'crateAir' | 'extreme' | 'unit'>,
  size = 12,
): Mark[] {
  if (!crateAir) return []
  const widest = textWidth('−00', 'fig', size) + 8
  const wanted = time.toMin - time.fromMin > 240 ? 60 : 15
  const cell =
    CELL_MINUTES.find((minutes) => minutes >= wanted && minutes / minutesPerPx(time) >= widest) ?? 1440
  const marks: Mark[] = []
  for (let from = Math.floor(time.fromMin / cell) * cell; from < time.toMin; from += cell) {
    const x0 = xAt(time, Math.max(from, time.fromMin))
    const x1 = xAt(time, Math.min(from + cell, time.toMin))
    const samples = stretchOf(
      crateAir.minutes,
      crateAir.tempC,
      Math.max(from, time.fromMin),
      Math.min(from + cell, time.toMin),
    )
    const value = extreme(samples, which === 'hottest' ? 1 : -1)?.value
    if (value === undefined || x1 - x0 < 0.5) continue
    const step = rampStep(Math.round(value))
    marks.push(
      rect(
        { x: x0, y: box.y, width: x1 - x0, height: box.height },
        { fill: step, stroke: 'rule', strokeWidth: 1 },
      ),
    )
    if (x1 - x0 >= widest - 6) {
      marks.push(
        words((x0 + x1) / 2, box.y + box.height / 2 + size * 0.38, figure(inUnit(value, unit)), {
          face: 'fig',
          size,
          ink: `${step}t`,
          anchor: 'middle',
        }),
      )
    }
  }
  return marks
}
