import { bodyMargin } from '../format'
import { airPart, hasAir } from './air'
import type { AirPart } from './air'
import { bodyAxis, wholeBodyFrame } from './body-frame'
import { offScaleLabels } from './off-scale'
import { channel, legStretches, marginAt } from './channel'
import { xAt, yAt } from './frame'
import type { TempFrame, TimeFrame } from './frame'
import { calloutMarks } from './callouts'
import { dimension, limitLabels, trackLabel } from './labels'
import { headCaptions, headMarks, layOutHeads } from './leg-heads'
import type { HeadsLayout } from './leg-heads'
import { path, words } from './marks'
import type { Box, Mark, Picture } from './marks'
import { ruledZones, ruler } from './ruler'
import { stretchPart, stretchWindow } from './stretch'
import type { StretchPart } from './stretch'
import type { ChartLeg, CorridorInput } from './types'

export const LEFT = 72
export const READING_COLUMN = 170

export interface CorridorOptions {
  width: number
  /** The leg whose head is washed violet; a short one is drawn again on a stretch below. */
  chosenLegId: string | null
  channelHeight?: number
  /** Room at the right for the values under the reading line; paper has none. */
  readingColumn?: number
  hatchScale?: number
}

export interface CorridorPicture extends Picture {
  time: TimeFrame
  temp: TempFrame
  heads: HeadsLayout
  channelBox: Box
  air: AirPart
  rulerYs: number[]
  stretch: StretchPart | null
}

/** The desk's corridor: rulers, leg heads, channel, air, logger strip, and the chosen short leg magnified. */
export function corridor(input: CorridorInput, options: CorridorOptions): CorridorPicture {
  const right = options.readingColumn ?? READING_COLUMN
  const time: TimeFrame = { fromMin: 0, toMin: input.endMin, x0: LEFT, x1: options.width - right }
  const zones = ruledZones(input.zones)
  const rulerYs = zones.map((_, index) => 22 + index * 24)
  const heads = layOutHeads(time, input.legs, (rulerYs.at(-1) ?? 22) + 14)
  const top = heads.channelTop
  const foot = top + (options.channelHeight ?? 400)
  const temp = wholeBodyFrame(time, input, top, foot)
  const air = airPart(time, input, foot + (hasAir(input) ? 24 : 0))
  const chosen = input.legs.find((leg) => leg.legId === options.chosenLegId) ?? null
  const window = chosen ? stretchWindow(time, chosen, input.endMin) : null
  const strong = chosen ? neighbours(input.legs, chosen) : undefined
  const stretch =
    chosen && window
      ? stretchPart(
          input,
          { ...window, x0: time.x0, x1: time.x1 },
          chosen,
          air.strip.y + air.strip.height + 22,
          options,
        )
      : null
  const marks: Mark[] = [
    ...zones.flatMap((zone, index) => ruler(time, zone, input, { y: rulerYs[index] ?? 22, nameX: 0 })),
    ...headMarks(time, input.legs, heads, { unit: input.unit, chosen: options.chosenLegId }),
    ...headCaptions(time.x0 - 10, heads, input.unit),
    ...channel(time, temp, input, { hatchScale: options.hatchScale, strongLegs: strong }),
    ...bodyAxis(time, temp, input.unit),
    words(time.x0 - 10, top - 9, input.unit === 'c' ? 'Body °C' : 'Body °F', { anchor: 'end', ink: 'mute' }),
    ...wordsInChannel(time, temp, input),
    ...air.marks,
    ...(hasAir(input) ? airCaptions(time, input, air) : []),
  ]
  const end = air.strip.y + air.strip.height
  if (stretch && window) marks.push(...opening(time, window, top - 4, end + 6, stretch.top), ...stretch.marks)
  return {
    width: options.width,
    height: (stretch ? stretch.foot : end) + 20,
    marks,
    time,
    temp,
    heads,
    channelBox: { x: time.x0, y: top, width: time.x1 - time.x0, height: foot - top },
    air,
    rulerYs,
    stretch,
  }
}

function airCaptions(time: TimeFrame, input: CorridorInput, air: AirPart): Mark[] {
  const strip = input.extreme === 'hottest' ? 'Hottest' : 'Coldest'
  return [
    words(36, air.lines.y + 14, input.unit === 'c' ? 'Air °C' : 'Air °F', { anchor: 'end', ink: 'mute' }),
    words(time.x0 - 10, air.strip.y + 18, strip, { anchor: 'end', ink: 'mute' }),
  ]
}

/** Names of limits and tracks, marks of narrow margins, callouts: each keeps off what already stands. */
function wordsInChannel(time: TimeFrame, temp: TempFrame, input: CorridorInput): Mark[] {
  const legs = legStretches(time, input).map(({ leg, limits }) => ({ ...leg, limits }))
  const limits = limitLabels(time, temp, legs, input.unit)
  const off = offScaleLabels(time, temp, input)
  const narrow = dimensions(time, temp, input)
  const tracks = [input.deciding, input.typical].flatMap((track) => track ?? [])
  const lineYs = legs.flatMap((leg) => Object.values(leg.limits).map((limitC) => yAt(temp, limitC)))
  const callouts = calloutMarks(
    time,
    temp,
    input.callouts,
    [...limits.taken, ...narrow.taken, ...off.taken],
    tracks,
    lineYs,
    {
      lowC: Math.min(...legs.map((leg) => leg.limits.criticalLowC)),
      highC: Math.max(...legs.map((leg) => leg.limits.criticalHighC)),
    },
  )
  const taken = [...limits.taken, ...narrow.taken, ...off.taken, ...callouts.taken]
  const deciders = input.deciding ? [input.deciding] : []
  const deciding = input.deciding
    ? trackLabel(time, temp, input.deciding, input.deciding.words, taken, { lineYs })
    : { marks: [], taken: [] }
  const typical = input.typical
    ? trackLabel(time, temp, input.typical, 'typical', [...taken, ...deciding.taken], {
        weight: 400,
        beside: true,
        lineYs,
        others: deciders,
      })
    : { marks: [], taken: [] }
  return [
    ...limits.marks,
    ...off.marks,
    ...typical.marks,
    ...deciding.marks,
    ...narrow.marks,
    ...callouts.marks,
  ]
}

/**
 * Dimension marks where a leg's margin is under 0.75 °C and not passed. Only where the drawn distance reads like the
 * figure in the leg's head: the head may speak of another delay than the one drawn.
 */
function dimensions(time: TimeFrame, temp: TempFrame, input: CorridorInput): { marks: Mark[]; taken: Box[] } {
  const { deciding } = input
  if (!deciding) return { marks: [], taken: [] }
  const found = legStretches(time, input).flatMap(({ leg, limits, fromMin, toMin }) => {
    const bodyC = leg.head?.bodyC
    if (bodyC === null || bodyC === undefined || bodyC >= 0.75 || bodyC < 0) return []
    const minutes = deciding.minutes.filter((minute) => minute >= fromMin && minute <= toMin)
    const margins = minutes.map((minute) => ({ minute, ...marginAt(deciding, limits, minute) }))
    const least = margins.reduce<(typeof margins)[number] | null>(
      (best, each) => (best === null || each.marginC < best.marginC ? each : best),
      null,
    )
    if (
      !least ||
      least.marginC < 0.1 ||
      bodyMargin(least.marginC, input.unit) !== bodyMargin(bodyC, input.unit)
    )
      return []
    return [{ ...least, limitC: least.side === 'high' ? limits.alarmHighC : limits.alarmLowC }]
  })
  const apart: typeof found = []
  for (const each of found.sort((a, b) => a.marginC - b.marginC)) {
    if (
      apart.length < 3 &&
      apart.every((other) => Math.abs(xAt(time, other.minute) - xAt(time, each.minute)) > 90)
    )
      apart.push(each)
  }
  const placed = apart.map((each) => {
    const bodyC = each.side === 'high' ? each.limitC - each.marginC : each.limitC + each.marginC
    const x = Math.min(time.x1 - 70, Math.max(time.x0 + 10, xAt(time, each.minute)))
    return dimension(x, yAt(temp, bodyC), yAt(temp, each.limitC), bodyMargin(each.marginC, input.unit))
  })
  return { marks: placed.flatMap((each) => each.marks), taken: placed.flatMap((each) => each.taken) }
}

/** A frame on the upper picture that opens into the lower one. */
function opening(
  time: TimeFrame,
  window: { fromMin: number; toMin: number },
  top: number,
  foot: number,
  lowerTop: number,
): Mark[] {
  const x0 = xAt(time, window.fromMin)
  const x1 = xAt(time, window.toMin)
  const turn = foot + 12
  return [
    path(
      `M${px(x0)} ${top}H${px(x1)}V${foot}H${px(x0)}ZM${px(x0)} ${foot}V${turn}H${time.x0}V${lowerTop}M${px(x1)} ${foot}V${turn}H${time.x1}V${lowerTop}`,
      { fill: 'none', stroke: 'rule', strokeWidth: 1.5 },
    ),
  ]
}

function neighbours(legs: readonly ChartLeg[], chosen: ChartLeg): Set<string> {
  const index = legs.indexOf(chosen)
  return new Set([legs[index - 1], chosen, legs[index + 1]].flatMap((leg) => (leg ? [leg.legId] : [])))
}

function px(value: number): number {
  return Math.round(value * 10) / 10
}
