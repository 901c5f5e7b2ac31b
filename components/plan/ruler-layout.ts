import type { TimedLeg } from '@/lib/planning/timeline'

/** A stretch of the ruler, px from its left edge. */
export interface RulerLeg {
  index: number
  fromPx: number
  toPx: number
}

export interface RulerGap {
  /** Between the leg of this index and the next. */
  after: number
  fromPx: number
  toPx: number
  minutes: number
  overlap: boolean
}

export interface RulerLayout {
  startMs: number
  endMs: number
  legs: RulerLeg[]
  gaps: RulerGap[]
  /** Legs without both times, in words under the ruler. */
  untimed: number[]
  /** px of an instant. */
  at: (ms: number) => number
}

const HOUR_MS = 3_600_000

/** The legs on one true time scale; null while no leg has both its times. */
export function rulerLayout(legs: readonly TimedLeg[], widthPx: number): RulerLayout | null {
  const timed = legs.flatMap(({ startMs, endMs }, index) =>
    startMs !== null && endMs !== null && endMs > startMs ? [{ index, startMs, endMs }] : [],
  )
  if (timed.length === 0) return null
  const startMs = Math.min(...timed.map((leg) => leg.startMs))
  const endMs = Math.max(...timed.map((leg) => leg.endMs))
  const at = (ms: number) => ((ms - startMs) / (endMs - startMs)) * widthPx
  const gaps = timed.slice(1).flatMap((leg, place) => {
    const before = timed[place]
    if (before === undefined || before.index !== leg.index - 1 || before.endMs === leg.startMs) return []
    const overlap = leg.startMs < before.endMs
    const [from, to] = overlap ? [leg.startMs, before.endMs] : [before.endMs, leg.startMs]
    return [{ after: before.index, fromPx: at(from), toPx: at(to), minutes: (to - from) / 60_000, overlap }]
  })
  return {
    startMs,
    endMs,
    at,
    gaps,
    legs: timed.map((leg) => ({ index: leg.index, fromPx: at(leg.startMs), toPx: at(leg.endMs) })),
    untimed: legs.flatMap((_, index) => (timed.some((leg) => leg.index === index) ? [] : [index])),
  }
}

/** Full hours on the ruler, thinned so that their words keep clear of one another. */
export function rulerTicks(
  { startMs, endMs }: RulerLayout,
  widthPx: number,
  zoneOffsetMin: number,
): number[] {
  const perHourPx = (widthPx * HOUR_MS) / (endMs - startMs)
  const stepH = [1, 2, 3, 6, 12, 24].find((hours) => hours * perHourPx >= 62) ?? 24
  const offsetMs = zoneOffsetMin * 60_000
  const stepMs = stepH * HOUR_MS
  const ticks: number[] = []
  for (let ms = Math.ceil((startMs + offsetMs) / stepMs) * stepMs - offsetMs; ms <= endMs; ms += stepMs)
    ticks.push(ms)
  return ticks
}

export interface FigureUnder {
  index: number
  /** Where the figure stands, and the middle of its leg. */
  atPx: number
  legPx: number
}

/** Legs narrower than their number: it stands under the bar instead, pushed right to keep clear of the one before. */
export function figuresUnder(legs: readonly RulerLeg[], figurePx: number): FigureUnder[] {
  let free = 0
  return legs
    .filter(({ fromPx, toPx }) => toPx - fromPx < figurePx)
    .map(({ index, fromPx, toPx }) => {
      const legPx = (fromPx + toPx) / 2
      const atPx = Math.max(legPx, free)
      free = atPx + figurePx
      return { index, atPx, legPx }
    })
}
