import { channel, marginAt } from '@/lib/views/charts/channel'
import { type TempFrame, type TimeFrame, xAt, yAt } from '@/lib/views/charts/frame'
import { type Mark, rect, words } from '@/lib/views/charts/marks'
import { stretchOf } from '@/lib/views/charts/series'
import { textWidth } from '@/lib/views/charts/text-width'
import type { ChartLeg, CorridorInput } from '@/lib/views/charts/types'
import { bodyMargin, figure } from '@/lib/views/format'
import type { AnimalChart } from '@/lib/views/sheet'

export const HATCH_SCALE = 0.8

/** The freight label pasted at the point that decides. */
export interface PastedLabel {
  verdict: 'no-go' | 'conditional'
  figure: string
  title: string
  text: string
}

/** A channel with its letter, name, track and limits at the left. */
export function animalChannel(
  time: TimeFrame,
  temp: TempFrame,
  legs: ChartLeg[],
  animal: AnimalChart,
): Mark[] {
  const input = channelInput(legs, animal)
  return [
    ...channel(time, temp, input, { hatchScale: HATCH_SCALE, weight: 1 }),
    words(0, temp.top + 22, animal.crateLetter, { face: 'crate', size: 20 }),
    words(18, temp.top + 11, shortName(animal.name), { size: 10.5, weight: 600 }),
    words(18, temp.top + 23, animal.deciding?.variant ?? '', { size: 10 }),
    ...limitFigures(time, temp, animal),
    ...narrowMark(time, temp, animal),
  ]
}

export function channelInput(
  legs: ChartLeg[],
  { limits, typical, deciding }: AnimalChart,
): Pick<CorridorInput, 'legs' | 'limits' | 'typical' | 'deciding' | 'spread'> {
  return {
    legs,
    limits: legs.map(() => limits),
    typical,
    deciding: deciding === null ? null : { ...deciding, words: deciding.variant },
    spread: null,
  }
}

/** Figures of the limits at the left edge: critical in 600, and never two over one another. */
export function limitFigures(time: TimeFrame, temp: TempFrame, { limits }: AnimalChart): Mark[] {
  const { criticalHighC, alarmHighC, alarmLowC, criticalLowC } = limits
  const wanted = [
    [criticalHighC, 600],
    [alarmHighC, 400],
    [alarmLowC, 400],
    [criticalLowC, 600],
  ] as const
  let last = -Infinity
  return wanted.flatMap(([tempC, weight]) => {
    const y = yAt(temp, tempC)
    if (y < temp.top - 1 || y > temp.foot + 1) return []
    const baseline = Math.max(y + 3.6, last + 10.5)
    last = baseline
    return [words(time.x0 - 4, baseline, figure(tempC, 1), { face: 'fig', size: 10, weight, anchor: 'end' })]
  })
}

const NARROW_C = 0.75

/** The room left, in a gap beside the narrowest point, where it is narrow and not passed. */
function narrowMark(time: TimeFrame, temp: TempFrame, { deciding, limits }: AnimalChart): Mark[] {
  if (deciding === null) return []
  const samples = stretchOf(deciding.minutes, deciding.bodyC, time.fromMin, time.toMin)
  const least = samples
    .map(({ minute, value }) => ({ minute, value, ...marginAt(deciding, limits, minute) }))
    .reduce<{ minute: number; value: number; marginC: number } | null>(
      (best, one) => (best === null || one.marginC < best.marginC ? one : best),
      null,
    )
  if (least === null || least.marginC < 0 || least.marginC >= NARROW_C) return []
  const text = bodyMargin(least.marginC, 'c')
  const width = textWidth(text, 'fig', 10.5, 600) + 6
  const x = Math.min(xAt(time, least.minute) + 8, time.x1 - width - 2)
  const y = yAt(temp, least.value) + 4
  return [
    rect({ x: x - 2, y: y - 9.5, width, height: 12 }, { fill: 'sheet' }),
    words(x + 1, y, text, { face: 'fig', size: 10.5, weight: 600 }),
  ]
}

function shortName(name: string): string {
  let short = name
  while (short.length > 3 && textWidth(short, 'text', 10.5, 600) > 52) short = short.slice(0, -1)
  return short === name ? name : `${short.slice(0, -1)}…`
}
