import { limitTemp } from '../format'
import { airPart, hasAir } from './air'
import type { AirPart } from './air'
import { bodyAxis, nearBodyFrame } from './body-frame'
import { channel } from './channel'
import { yAt } from './frame'
import type { TempFrame, TimeFrame } from './frame'
import { clearOfTracks, label, trackLabel } from './labels'
import { words } from './marks'
import type { Box, Mark, Picture } from './marks'
import { ruledZones, ruler, zoneAt } from './ruler'
import { offScaleLabels } from './off-scale'
import type { ChartLeg, CorridorInput } from './types'

/** Minutes of each neighbour in view, so that the change of ground is seen. */
const NEIGHBOUR_MIN = 4
const SIZE = 15

export interface LegCorridorPicture extends Picture {
  time: TimeFrame
  temp: TempFrame
  channelBox: Box
  air: AirPart
}

/** One leg over a phone's width: own zone above the thick ruler, the other below it, channel, air, logger strip. */
export function legCorridor(
  input: CorridorInput,
  legId: string,
  {
    width,
    channelHeight = 260,
    left = 50,
    right = 12,
  }: { width: number; channelHeight?: number; left?: number; right?: number },
): LegCorridorPicture | null {
  const leg = input.legs.find((each) => each.legId === legId)
  if (!leg) return null
  const time: TimeFrame = {
    fromMin: Math.max(0, leg.startMin - NEIGHBOUR_MIN),
    toMin: Math.min(input.endMin, leg.endMin + NEIGHBOUR_MIN),
    x0: left,
    x1: width - right,
  }
  const middle = (leg.startMin + leg.endMin) / 2
  const own = zoneAt(input.zones, middle)
  const other = ruledZones(input.zones).find((zone) => zone !== own)
  const top = other ? 62 : 44
  const temp = nearBodyFrame(time, input, top, top + channelHeight)
  const air = airPart(time, input, top + channelHeight + (hasAir(input) ? 24 : 0), {
    height: 78,
    size: SIZE,
    axisX: left - 8,
  })
  const marks: Mark[] = [
    ...ruler(time, own, input, { y: 30, nameX: 4, size: SIZE, nameMin: middle }),
    ...(other
      ? ruler(time, other, input, { y: 32, nameX: 4, size: SIZE, nameMin: middle, below: true })
      : []),
    ...channel(time, temp, input),
    ...bodyAxis(time, temp, input.unit, SIZE, 52),
    ...limitNames(input, leg, time, temp),
    ...offScaleLabels(time, temp, input, SIZE).marks,
    ...air.marks,
    ...(hasAir(input) ? [words(4, air.strip.y + 18, 'crate', { size: SIZE, ink: 'mute' })] : []),
  ]
  return {
    width,
    height: air.strip.y + air.strip.height + 20,
    marks,
    time,
    temp,
    channelBox: { x: left, y: top, width: time.x1 - left, height: channelHeight },
    air,
  }
}

function limitNames(input: CorridorInput, leg: ChartLeg, time: TimeFrame, temp: TempFrame): Mark[] {
  const limits = input.limits[input.legs.indexOf(leg)]
  if (!limits) return []
  const taken: Box[] = []
  const from = time.x0 + 42
  const tracks = [input.deciding, input.typical].flatMap((track) => track ?? [])
  const lineYs = Object.values(limits).map((limitC) => yAt(temp, limitC))
  const names = [
    ['Critical', limits.criticalHighC, 'high', -26],
    ['Alarm', limits.alarmHighC, 'high', 5],
    ['Alarm', limits.alarmLowC, 'low', -26],
    ['Critical', limits.criticalLowC, 'low', 6],
  ] as const
  const marks = names.flatMap(([name, limitC, side, shift]) => {
    const y = yAt(temp, limitC)
    if (y < temp.top || y > temp.foot) return []
    const text = limitTemp(limitC, side, input.unit)
    const top = Math.min(temp.foot - 24, Math.max(temp.top, y + shift))
    const { box } = label(from, top, name, text, SIZE)
    const made = label(clearOfTracks(time, temp, from, time.x1 - 6, box, tracks), top, name, text, SIZE)
    taken.push(made.box)
    return made.marks
  })
  const track = input.deciding
    ? trackLabel(time, temp, input.deciding, input.deciding.words, taken, { size: SIZE, lineYs })
    : { marks: [], taken: [] }
  return [...marks, ...track.marks]
}
