import { resolveLocalTime, toLocalTime } from '@/lib/planning/local-time'

const DAY_MS = 86_400_000
/** A watch may be a few minutes fast; a handover is not written down before it happens. */
const AHEAD_MS = 15 * 60_000

/**
 * The instant of a typed "06:20" (or "620", "6.20") in a zone: the last time the clock showed it. null where it is no time.
 * An hour that comes twice counts as the later one that is not ahead of now.
 */
export function timeLately(typed: string, zone: string, nowMs: number): number | null {
  const found = /^(\d{1,2})[:.]?(\d{2})$/.exec(typed.trim())
  if (!found) return null
  const [hour, minute] = [Number(found[1]), Number(found[2])]
  if (hour > 23 || minute > 59) return null
  const wall = `${String(hour).padStart(2, '0')}:${String(minute).padStart(2, '0')}`
  const instants = [nowMs, nowMs - DAY_MS].flatMap((dayMs) => {
    const resolved = resolveLocalTime(`${toLocalTime(dayMs, zone).slice(0, 10)}T${wall}`, zone, null)
    if (resolved.kind === 'instant') return [resolved.instantMs]
    return resolved.kind === 'doubled' ? resolved.choices.map((choice) => choice.instantMs) : []
  })
  const past = instants.filter((ms) => ms <= nowMs + AHEAD_MS)
  return past.length === 0 ? null : Math.max(...past)
}
