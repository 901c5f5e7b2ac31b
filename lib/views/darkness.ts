import { sunVector } from '@/lib/thermal/sun'
import type { Plan, PlanPlace } from '@/lib/schemas/plan'
import { timelineOf } from '@/lib/planning/timeline'

const STEP_MIN = 5

/** Sine of −0.833°: half the sun's disc and refraction at the horizon (Astronomical Almanac, sunrise and sunset). */
const SUNRISE = -0.01454

/**
 * Stretches of a journey with the sun below the horizon, minutes from departure: at the place a leg starts from in its
 * first half, at the place it ends in its second.
 */
export function darkStretches(
  plan: Plan,
  places: readonly PlanPlace[],
): { fromMin: number; toMin: number }[] {
  const { legs, departureMs, arrivalMs } = timelineOf(plan, places)
  if (departureMs === null || arrivalMs === null) return []
  const endMin = (arrivalMs - departureMs) / 60_000
  const stretches: { fromMin: number; toMin: number }[] = []
  for (let minute = 0; minute <= endMin; minute += STEP_MIN) {
    const place = placeAt(legs, departureMs + minute * 60_000)
    if (place === null || !isDark(departureMs + minute * 60_000, place)) continue
    const last = stretches.at(-1)
    if (last && last.toMin >= minute - STEP_MIN) last.toMin = minute
    else stretches.push({ fromMin: minute, toMin: minute })
  }
  return stretches
}

function placeAt(legs: ReturnType<typeof timelineOf>['legs'], ms: number): PlanPlace | null {
  const leg = legs.find(
    ({ startMs, endMs }) => startMs !== null && endMs !== null && ms >= startMs && ms <= endMs,
  )
  if (leg === undefined || leg.startMs === null || leg.endMs === null) return null
  return ms - leg.startMs < (leg.endMs - leg.startMs) / 2 ? leg.from : leg.to
}

function isDark(ms: number, { latitudeDeg, longitudeDeg }: PlanPlace): boolean {
  const sun = sunVector(ms, { latitudeDeg, longitudeDeg })
  return sun !== undefined && sun.up < SUNRISE
}
