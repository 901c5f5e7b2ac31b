/** One point of an air temperature that runs straight between points. */
export interface AirPoint {
  minute: number
  tempC: number
}

/** A stretch of time beyond a limit. */
export interface Span {
  fromMin: number
  toMin: number
}

/** Rounding in the last places of a conversion must not make a breach. */
const TOLERANCE_C = 1e-6
export const TOLERANCE_MIN = 1e-6

/**
 * Stretches in which the air lies strictly above (below) a limit, with the crossing found on the straight line between
 * points. Two points at one minute are a jump. Touching stretches are joined.
 */
export function spansBeyond(points: readonly AirPoint[], side: 'high' | 'low', limitC: number): Span[] {
  const past = ({ tempC }: AirPoint) => (side === 'high' ? tempC - limitC : limitC - tempC) - TOLERANCE_C
  const spans: Span[] = []
  points.forEach((point, index) => {
    const next = points[index + 1]
    if (next === undefined) return
    const [here, there] = [past(point), past(next)]
    if (here <= 0 && there <= 0) return
    const crossing = point.minute + ((next.minute - point.minute) * here) / (here - there || 1)
    join(spans, here > 0 ? point.minute : crossing, there > 0 ? next.minute : crossing)
  })
  return spans
}

/** Longest stretch that has run by `byMin`, of those touching the time from `sinceMin` on. */
export function longestBy(spans: readonly Span[], sinceMin: number, byMin: number): number {
  return Math.max(
    0,
    ...spans
      .filter(({ fromMin, toMin }) => toMin > sinceMin && fromMin < byMin)
      .map(({ fromMin, toMin }) => Math.min(toMin, byMin) - fromMin),
  )
}

/** All minutes beyond the limit up to `byMin`. */
export function totalBy(spans: readonly Span[], byMin: number): number {
  return spans.reduce((sum, { fromMin, toMin }) => sum + Math.max(0, Math.min(toMin, byMin) - fromMin), 0)
}

function join(spans: Span[], fromMin: number, toMin: number) {
  const last = spans.at(-1)
  if (last !== undefined && fromMin <= last.toMin + TOLERANCE_MIN) last.toMin = Math.max(last.toMin, toMin)
  else spans.push({ fromMin, toMin })
}
