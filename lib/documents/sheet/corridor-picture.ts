import { type TempFrame, type TimeFrame, xAt } from '@/lib/views/charts/frame'
import { type Mark, path, type Picture, rect, words } from '@/lib/views/charts/marks'
import { ruledZones, ruler } from '@/lib/views/charts/ruler'
import type { ChartLeg } from '@/lib/views/charts/types'
import type { AnimalChart, SheetCharts } from '@/lib/views/sheet'
import { animalChannel, type PastedLabel } from './corridor-channel'
import { stretchMarks, stretchOfLeg } from './corridor-stretch'

/*
 * The corridors of one sheet: every animal on one time scale, the deciding one last and twice as high, and its narrow legs
 * once more on a wider scale below.
 */

export const CHART_LEFT = 98
const SMALL = 56
const TALL = 100
const GAP = 6
const RULER = 20
const STRETCH = 100

export interface CorridorsDrawn {
  picture: Picture
  /** Letters of animals whose critical low limit lies below the picture. */
  cut: string[]
}

export interface ChosenCorridors {
  charts: SheetCharts
  animals: AnimalChart[]
  /** The one drawn last and high; null where it stands on another sheet. */
  deciding: AnimalChart | null
  /** The leg on which it is decided. */
  decidedLegId: string | null
  callout: PastedLabel | null
}

export function corridorPicture(
  { charts, animals, deciding, decidedLegId, callout }: ChosenCorridors,
  width: number,
): CorridorsDrawn {
  const time: TimeFrame = { fromMin: 0, toMin: charts.endMin, x0: CHART_LEFT, x1: width - 2 }
  const zones = ruledZones(charts.zones)
  const rulerInput = { departureMs: charts.departureMs, zones: charts.zones, dark: [] }
  const legsY = RULER * zones.length + 13
  const legs = charts.legs.map(chartLeg)
  const marks: Mark[] = [
    ...zones.flatMap((zone, index) =>
      ruler(time, zone, rulerInput, {
        y: RULER + index * RULER,
        nameX: 0,
        size: 10.5,
        room: 44,
        overhang: 2,
      }),
    ),
    ...charts.legs.flatMap((leg) => legNumber(time, leg, legsY)),
  ]
  const cut: string[] = []
  let top = legsY + 7
  for (const animal of animals.filter((one) => one !== deciding)) {
    const temp = smallFrame(animal, top)
    marks.push(...animalChannel(time, temp, legs, animal))
    if (temp.lowC > animal.limits.criticalLowC) cut.push(animal.crateLetter)
    top = temp.foot + GAP
  }
  if (deciding === null) return { picture: { width, height: top, marks }, cut }

  const temp: TempFrame = { ...wholeRange(deciding), top, foot: top + TALL }
  marks.push(...animalChannel(time, temp, legs, deciding))
  const leg = legs.find(({ legId }) => legId === decidedLegId)
  const window = leg === undefined ? null : stretchOfLeg(time, leg, charts.endMin)
  if (leg === undefined || window === null) return { picture: { width, height: temp.foot + 4, marks }, cut }
  const lower = temp.foot + 30
  marks.push(...opening(time, window, temp, lower))
  marks.push(
    ...stretchMarks({
      time: { ...window, x0: time.x0, x1: time.x1 },
      top: lower,
      height: STRETCH,
      charts,
      legs,
      deciding,
      leg,
      callout,
    }),
  )
  return { picture: { width, height: lower + 12 + STRETCH + 4, marks }, cut }
}

function chartLeg({
  legId,
  ordinal,
  title,
  pattern,
  startMin,
  endMin,
}: SheetCharts['legs'][number]): ChartLeg {
  return { legId, ordinal, name: title.split(',')[0] ?? title, pattern, startMin, endMin, head: null }
}

function legNumber(
  time: TimeFrame,
  { ordinal, startMin, endMin }: SheetCharts['legs'][number],
  y: number,
): Mark[] {
  const x = (xAt(time, startMin) + xAt(time, endMin)) / 2
  const room = xAt(time, endMin) - xAt(time, startMin)
  return room < 7 ? [] : [words(x, y, String(ordinal), { face: 'head', size: 12, anchor: 'middle' })]
}

/** All of the high side; the low side ends under its alarm limit where no track comes near it. */
function smallFrame(animal: AnimalChart, top: number): TempFrame {
  const { lowC, highC } = wholeRange(animal)
  const { alarmLowC, alarmHighC } = animal.limits
  const lowest = Math.min(...bodies(animal), alarmLowC)
  const cutC = alarmLowC - 0.14 * (alarmHighC - alarmLowC)
  return { lowC: lowest < alarmLowC ? lowC : cutC, highC, top, foot: top + SMALL }
}

/**
 * Both critical limits and the tracks, though never more than a third of the range beyond a limit: a body far past its
 * critical limit is drawn at the edge, and the room that is left stays readable.
 */
function wholeRange(animal: AnimalChart): { lowC: number; highC: number } {
  const { criticalLowC, criticalHighC } = animal.limits
  const values = bodies(animal)
  const most = (criticalHighC - criticalLowC) / 3
  const low = Math.max(criticalLowC - most, Math.min(criticalLowC, ...values))
  const high = Math.min(criticalHighC + most, Math.max(criticalHighC, ...values))
  const pad = 0.05 * (high - low)
  return { lowC: low - pad, highC: high + pad }
}

function bodies({ typical, deciding }: AnimalChart): number[] {
  return [typical, deciding].flatMap((track) => track?.bodyC ?? [])
}

/** A frame round the stretch, opening into the wider picture below. */
function opening(
  time: TimeFrame,
  window: { fromMin: number; toMin: number },
  temp: TempFrame,
  lower: number,
): Mark[] {
  const [x0, x1] = [xAt(time, window.fromMin), xAt(time, window.toMin)]
  const box = { x: x0, y: temp.top - 2, width: x1 - x0, height: temp.foot - temp.top + 4 }
  const foot = box.y + box.height
  return [
    rect(box, { fill: 'none', stroke: 'sheet', strokeWidth: 4 }),
    rect(box, { fill: 'none', stroke: 'ink', strokeWidth: 1.25 }),
    path(
      `M${x0.toFixed(1)} ${foot}L${time.x0} ${lower - 10}V${lower + 12}M${x1.toFixed(1)} ${foot}L${time.x1} ${lower - 10}V${lower + 12}`,
      { fill: 'none', stroke: 'ink', strokeWidth: 1.25 },
    ),
  ]
}
