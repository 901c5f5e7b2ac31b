import { getTimezoneOffset } from 'date-fns-tz'

const HOUR_MS = 3_600_000

/** Wall times half an hour into the hour a zone's clocks skip, and into the one they show twice, next after a moment. */
export function nextClockChanges(zone: string, after: Date): { missing: string; doubled: string } {
  let missing: string | undefined
  let doubled: string | undefined
  for (let ms = Math.ceil(after.getTime() / HOUR_MS) * HOUR_MS; !missing || !doubled; ms += HOUR_MS) {
    if (ms > after.getTime() + 400 * 24 * HOUR_MS) throw new Error(`The clocks of ${zone} do not change.`)
    const before = getTimezoneOffset(zone, new Date(ms - HOUR_MS))
    const now = getTimezoneOffset(zone, new Date(ms))
    // Clocks put forward at this instant skip what they would have shown in the hour after it; put back, they repeat it.
    if (now > before) missing ??= wall(ms + before + HOUR_MS / 2)
    if (now < before) doubled ??= wall(ms + now + HOUR_MS / 2)
  }
  return { missing, doubled }
}

/** "2027-03-28 01:30", of a moment told as if the wall stood in UTC. */
function wall(ms: number): string {
  return new Date(ms).toISOString().slice(0, 16).replace('T', ' ')
}
