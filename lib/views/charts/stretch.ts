import { hourMin, limitTemp } from '../format'
import { bodyAxis, nearBodyFrame } from './body-frame'
import { channel, legStretches } from './channel'
import { xAt, yAt } from './frame'
import type { TempFrame, TimeFrame } from './frame'
import { clearOfTracks, label } from './labels'
import { shortened } from './leg-heads'
import { line, path, rect, words } from './marks'
import type { Box, Mark } from './marks'
import { ruledZones, ruler } from './ruler'
import { textWidth } from './text-width'
import { offScaleLabels } from './off-scale'
import type { ChartLeg, CorridorInput } from './types'

/** A leg narrower than this is drawn again, wide. */
const NARROW_PX = 70
const LEAST_MIN = 90

export interface StretchPart {
  time: TimeFrame
  temp: TempFrame
  top: number
  foot: number
  channelBox: Box
  marks: Mark[]
}

/** The stretch of time on which a narrow leg and its neighbours are drawn again; null where the leg is wide enough. */
export function stretchWindow(
  time: TimeFrame,
  leg: ChartLeg,
  endMin: number,
): { fromMin: number; toMin: number } | null {
  if (xAt(time, leg.endMin) - xAt(time, leg.startMin) >= NARROW_PX) return null
  const long = Math.min(endMin, Math.max(LEAST_MIN, (leg.endMin - leg.startMin) * 1.8))
  const middle = (leg.startMin + leg.endMin) / 2
  const fromMin = Math.min(Math.max(0, Math.round(middle - long / 2)), endMin - long)
  return { fromMin, toMin: fromMin + long }
}

/** The chosen leg wide: rulers, leg names on the wall, the channel near its tracks. Hatching is not magnified. */
export function stretchPart(
  input: CorridorInput,
  time: TimeFrame,
  chosen: ChartLeg,
  top: number,
  { hatchScale, channelHeight = 224 }: { hatchScale?: number; channelHeight?: number } = {},
): StretchPart {
  const height = Math.min(channelHeight, 224)
  const zones = [...ruledZones(input.zones)].reverse()
  const firstY = top + 34
  const channelTop = firstY + (zones.length - 1) * 26 + 30
  const temp = nearBodyFrame(time, input, channelTop, channelTop + height, { above: 66 })
  const magnified = Math.round((input.endMin / (time.toMin - time.fromMin)) * 10) / 10
  const legs = legStretches(time, input)
  const marks: Mark[] = [
    ...zones.flatMap((zone, index) =>
      ruler(time, zone, input, {
        y: firstY + index * 26,
        nameX: 0,
        nameMin: (chosen.startMin + chosen.endMin) / 2,
      }),
    ),
    words(0, channelTop - 10, `${String(magnified)} times`, { weight: 600 }),
    words(0, channelTop + 5, 'wider', { ink: 'mute' }),
    ...channel(time, temp, input, { hatchScale }),
    ...bodyAxis(time, temp, input.unit),
    ...legs.slice(1).map(({ fromMin }) => {
      const x = xAt(time, fromMin)
      return line({ x, y: channelTop - 14 }, { x, y: channelTop }, { stroke: 'ink', strokeWidth: 1 })
    }),
    ...legs.flatMap(({ leg, fromMin, toMin }) =>
      legName(time, leg, fromMin, toMin, channelTop + 8, leg === chosen),
    ),
    ...limitNames(time, temp, input, chosen),
    ...offScaleLabels(time, temp, input).marks,
    path(
      `M${xAt(time, Math.max(chosen.startMin, time.fromMin)).toFixed(1)} ${channelTop - 14}H${xAt(time, Math.min(chosen.endMin, time.toMin)).toFixed(1)}`,
      {
        stroke: 'hand',
        strokeWidth: 4,
      },
    ),
  ]
  return {
    time,
    temp,
    top,
    foot: channelTop + height,
    channelBox: { x: time.x0, y: channelTop, width: time.x1 - time.x0, height },
    marks,
  }
}

function legName(
  time: TimeFrame,
  leg: ChartLeg,
  fromMin: number,
  toMin: number,
  y: number,
  chosen: boolean,
): Mark[] {
  const x = xAt(time, fromMin) + 8
  const room = xAt(time, toMin) - x - 8
  const number = String(leg.ordinal)
  const numberWidth = textWidth(number, 'head', 15, 700) + 6
  const space = room - numberWidth - 16
  const whole = `${leg.name}, ${hourMin(leg.endMin - leg.startMin)}`
  const text = textWidth(whole, 'text', 12) <= space ? whole : shortened(leg.name, space, 12, 400)
  const width = numberWidth + textWidth(text, 'text', 12) + 16
  if (room < numberWidth + 12) return []
  return [
    rect({ x, y, width, height: 24 }, { fill: chosen ? 'handwash' : 'sheet' }),
    words(x + 8, y + 17, number, { face: 'head', size: 15 }),
    words(x + 8 + numberWidth, y + 17, text),
  ]
}

/** Both limits of the side in view, named on the chosen leg. */
function limitNames(time: TimeFrame, temp: TempFrame, input: CorridorInput, chosen: ChartLeg): Mark[] {
  const limits = input.limits[input.legs.indexOf(chosen)]
  if (!limits) return []
  const from = Math.max(time.x0, xAt(time, chosen.startMin)) + 14
  const to = Math.min(time.x1, xAt(time, chosen.endMin)) - 6
  const tracks = [input.deciding, input.typical].flatMap((track) => track ?? [])
  const names = [
    ['Critical', limits.criticalHighC, 'high', -23],
    ['Alarm', limits.alarmHighC, 'high', 5],
    ['Alarm', limits.alarmLowC, 'low', -23],
    ['Critical', limits.criticalLowC, 'low', 6],
  ] as const
  return names.flatMap(([name, limitC, side, shift]) => {
    const y = yAt(temp, limitC)
    if (y < temp.top + 30 || y > temp.foot - 10) return []
    const text = limitTemp(limitC, side, input.unit)
    const { box } = label(from, y + shift, name, text)
    return label(clearOfTracks(time, temp, from, to, box, tracks), y + shift, name, text).marks
  })
}
