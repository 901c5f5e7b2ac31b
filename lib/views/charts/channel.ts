import { STROKE } from '@/lib/tokens'
import { hatch } from './hatch'
import { minutesPerPx, xAt, yAt, yInside } from './frame'
import type { TempFrame, TimeFrame } from './frame'
import { line, path, rect, through } from './marks'
import type { Mark, Point } from './marks'
import { stretchOf, thinned, valueAt } from './series'
import type { Sample } from './series'
import type { ChartLeg, CorridorInput, LegLimits, Spread, Track } from './types'

export interface ChannelLook {
  /** Hatching at 0.8 on paper. */
  hatchScale?: number
  /** Line weights times this; small corridors on paper take 0.75. */
  weight?: number
  /** Legs whose boundaries are drawn full; the others are lighter. */
  strongLegs?: ReadonlySet<string>
}

export type ChannelInput = Pick<CorridorInput, 'legs' | 'limits' | 'typical' | 'deciding' | 'spread'>

interface LegStretch {
  leg: ChartLeg
  limits: LegLimits
  fromMin: number
  toMin: number
}

/**
 * The corridor itself, without rulers, axis or words: walls of surroundings from the alarm limits outwards, paper between
 * them, the tracks, and the four limits stepping at legs. What passes critical is solid.
 */
export function channel(
  time: TimeFrame,
  temp: TempFrame,
  input: ChannelInput,
  look: ChannelLook = {},
): Mark[] {
  const stretches = legStretches(time, input)
  const weight = look.weight ?? 1
  return [
    ...stretches.flatMap((stretch) => walls(time, temp, stretch, look.hatchScale ?? 1)),
    ...(input.spread ? spread(time, temp, input.spread) : []),
    ...(input.deciding
      ? stretches.flatMap((stretch) => beyondCritical(time, temp, stretch, input.deciding))
      : []),
    ...track(time, temp, input.typical, STROKE.typical * Math.max(weight, 0.8), 3),
    ...track(time, temp, input.deciding, STROKE.deciding * weight, 5.5 * weight),
    ...limitLines(time, temp, stretches, weight),
    ...boundaries(time, temp, stretches, look.strongLegs),
  ]
}

/** Legs that reach into the frame, each with its limits and the part that shows. */
export function legStretches(time: TimeFrame, input: Pick<ChannelInput, 'legs' | 'limits'>): LegStretch[] {
  return input.legs.flatMap((leg, index) => {
    const limits = input.limits[index] ?? input.limits.at(-1)
    const fromMin = Math.max(leg.startMin, time.fromMin)
    const toMin = Math.min(leg.endMin, time.toMin)
    return limits && toMin > fromMin ? [{ leg, limits, fromMin, toMin }] : []
  })
}

function walls(time: TimeFrame, temp: TempFrame, stretch: LegStretch, scale: number): Mark[] {
  const x = xAt(time, stretch.fromMin)
  const width = xAt(time, stretch.toMin) - x
  const alarmHigh = yInside(temp, stretch.limits.alarmHighC)
  const alarmLow = yInside(temp, stretch.limits.alarmLowC)
  const boxes = [
    { x, y: temp.top, width, height: alarmHigh - temp.top },
    { x, y: alarmLow, width, height: temp.foot - alarmLow },
  ].filter((box) => box.height > 0.5)
  return [
    rect({ x, y: alarmHigh, width, height: alarmLow - alarmHigh }, { fill: 'sheet' }),
    ...boxes.flatMap((box) => [rect(box, { fill: 'band' }), hatch(stretch.leg.pattern, box, { scale })]),
  ]
}

/** P5 to P95: grey on a paper ground, so that it reads on the hatching too. */
function spread(time: TimeFrame, temp: TempFrame, band: Spread): Mark[] {
  const upper = pointsOf(time, temp, { minutes: band.minutes, bodyC: band.p95C })
  const lower = pointsOf(time, temp, { minutes: band.minutes, bodyC: band.p05C })
  const d = through([...upper, ...lower.reverse()])
  if (d === '') return []
  return [
    path(`${d}Z`, { fill: 'sheet', stroke: 'sheet', strokeWidth: 4 }),
    path(`${d}Z`, { fill: 'ink', fillOpacity: 0.16, stroke: 'ink', strokeWidth: 0.9 }),
  ]
}

/** Between the critical limit and the deciding track that has passed it: solid ink, because it is NO-GO drawn. */
function beyondCritical(
  time: TimeFrame,
  temp: TempFrame,
  stretch: LegStretch,
  deciding: Track | null,
): Mark[] {
  if (!deciding) return []
  const samples = thinned(
    stretchOf(deciding.minutes, deciding.bodyC, stretch.fromMin, stretch.toMin),
    minutesPerPx(time),
  )
  const sides = [
    { limitC: stretch.limits.criticalHighC, sign: 1 },
    { limitC: stretch.limits.criticalLowC, sign: -1 },
  ] as const
  return sides.flatMap(({ limitC, sign }) =>
    excursions(samples, limitC, sign).map((past) => {
      const curve = past.map(({ minute, value }) => ({ x: xAt(time, minute), y: yInside(temp, value) }))
      const foot = yInside(temp, limitC)
      const first = curve[0]?.x ?? 0
      const last = curve.at(-1)?.x ?? 0
      return path(`${through([{ x: first, y: foot }, ...curve, { x: last, y: foot }])}Z`, { fill: 'ink' })
    }),
  )
}

/** Runs of samples past a limit, cut exactly where the track crosses it. */
export function excursions(samples: readonly Sample[], limitC: number, sign: 1 | -1): Sample[][] {
  const runs: Sample[][] = []
  let run: Sample[] = []
  samples.forEach((sample, index) => {
    const before = samples[index - 1]
    const past = sign * (sample.value - limitC) > 0
    const wasPast = before !== undefined && sign * (before.value - limitC) > 0
    if (before && past !== wasPast) {
      const share = (limitC - before.value) / (sample.value - before.value)
      run.push({ minute: before.minute + share * (sample.minute - before.minute), value: limitC })
    }
    if (past) run.push(sample)
    else if (run.length > 0) {
      runs.push(run)
      run = []
    }
  })
  if (run.length > 1) runs.push(run)
  return runs.filter((each) => each.length > 1)
}

function track(time: TimeFrame, temp: TempFrame, drawn: Track | null, weight: number, halo: number): Mark[] {
  if (!drawn) return []
  const d = through(pointsOf(time, temp, drawn))
  if (d === '') return []
  return [
    path(d, { fill: 'none', stroke: 'sheet', strokeWidth: halo }),
    path(d, { fill: 'none', stroke: 'ink', strokeWidth: weight }),
  ]
}

function pointsOf(time: TimeFrame, temp: TempFrame, drawn: Track): Point[] {
  return thinned(stretchOf(drawn.minutes, drawn.bodyC, time.fromMin, time.toMin), minutesPerPx(time)).map(
    ({ minute, value }) => ({ x: xAt(time, minute), y: yInside(temp, value) }),
  )
}

/** Alarm 2.5, critical 5 with a paper halo. One stepped path for each, so that a step has its upright. */
function limitLines(
  time: TimeFrame,
  temp: TempFrame,
  stretches: readonly LegStretch[],
  weight: number,
): Mark[] {
  const stepped = (key: keyof LegLimits) => runsInFrame(time, temp, stretches, key).map(through)
  const alarms = (['alarmHighC', 'alarmLowC'] as const).flatMap(stepped)
  const criticals = (['criticalHighC', 'criticalLowC'] as const).flatMap(stepped)
  return [
    ...alarms.map((d) => path(d, { fill: 'none', stroke: 'ink', strokeWidth: STROKE.alarm * weight })),
    ...criticals.flatMap((d) => [
      path(d, { fill: 'none', stroke: 'sheet', strokeWidth: (STROKE.critical + 4) * weight }),
      path(d, { fill: 'none', stroke: 'ink', strokeWidth: STROKE.critical * weight }),
    ]),
  ]
}

/** The line of one limit, in pieces where the axis stops short of it. */
function runsInFrame(
  time: TimeFrame,
  temp: TempFrame,
  stretches: readonly LegStretch[],
  key: keyof LegLimits,
): Point[][] {
  const runs: Point[][] = []
  let open = false
  for (const stretch of stretches) {
    const y = yAt(temp, stretch.limits[key])
    const inside = y >= temp.top - 0.5 && y <= temp.foot + 0.5
    if (inside) {
      if (!open) runs.push([])
      runs.at(-1)?.push({ x: xAt(time, stretch.fromMin), y }, { x: xAt(time, stretch.toMin), y })
    }
    open = inside
  }
  return runs
}

function boundaries(
  time: TimeFrame,
  temp: TempFrame,
  stretches: readonly LegStretch[],
  strong: ReadonlySet<string> | undefined,
): Mark[] {
  return stretches.slice(1).map((stretch, index) => {
    const x = xAt(time, stretch.fromMin)
    const before = stretches[index]?.leg.legId ?? ''
    const full = strong === undefined || strong.has(stretch.leg.legId) || strong.has(before)
    return line(
      { x, y: temp.top },
      { x, y: temp.foot },
      { stroke: 'ink', strokeWidth: 1, strokeOpacity: full ? 1 : 0.6 },
    )
  })
}

/** Distance of the deciding track to the nearer alarm limit at a minute; negative when past. */
export function marginAt(
  deciding: Track,
  limits: LegLimits,
  minute: number,
): { marginC: number; side: 'high' | 'low' } {
  const bodyC = valueAt(deciding.minutes, deciding.bodyC, minute)
  const high = limits.alarmHighC - bodyC
  const low = bodyC - limits.alarmLowC
  return high <= low ? { marginC: high, side: 'high' } : { marginC: low, side: 'low' }
}
