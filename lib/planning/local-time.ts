/*
 * Wall times and instants. The clock of a place may skip an hour (missing) or show it twice (doubled): a plan never
 * guesses which was meant. Offsets come straight from Intl at a given instant, so the zone of the process never enters
 * (date-fns-tz reads a Date handed to it in the process zone, and picks a side of both traps in silence).
 */
import { shortZoneName } from './zone-names'

const MINUTE_MS = 60_000

export interface OffsetChoice {
  /** Minutes east of UTC. */
  offsetMin: number
  instantMs: number
  /** As people say it: "BST (UTC+1)". */
  label: string
}

export type ResolvedTime =
  | { kind: 'instant'; instantMs: number; offsetMin: number }
  | { kind: 'empty' }
  | { kind: 'malformed' }
  | { kind: 'unknown-zone' }
  /** The clock jumps over this time; `nextLocal` is the first wall time after the gap, between the two labels. */
  | { kind: 'missing'; nextLocal: string; beforeLabel: string; afterLabel: string }
  /** The clock shows this time twice and nobody has said which is meant. */
  | { kind: 'doubled'; choices: OffsetChoice[] }

/**
 * The instant of a wall time "2026-06-09T09:20" in an IANA zone. A chosen offset decides a doubled hour; where the hour
 * comes once, a chosen offset left over from an earlier date is ignored.
 */
export function resolveLocalTime(local: string, zone: string, chosenOffsetMin: number | null): ResolvedTime {
  if (local === '') return { kind: 'empty' }
  const wallMs = wallTimeMs(local)
  if (wallMs === null) return { kind: 'malformed' }
  if (!isKnownZone(zone)) return { kind: 'unknown-zone' }

  const choices = offsetsAround(wallMs, zone)
    .map((offsetMin) => ({ offsetMin, instantMs: wallMs - offsetMin * MINUTE_MS }))
    .filter(({ offsetMin, instantMs }) => zoneOffsetMin(instantMs, zone) === offsetMin)
    .sort((a, b) => a.instantMs - b.instantMs)

  const chosen = choices.find(({ offsetMin }) => offsetMin === chosenOffsetMin)
  const only = choices.length === 1 ? choices[0] : chosen
  if (only) return { kind: 'instant', ...only }
  if (choices.length === 0) return gapOver(wallMs, zone)
  return {
    kind: 'doubled',
    choices: choices.map((choice) => ({ ...choice, label: zoneLabel(choice.instantMs, zone) })),
  }
}

/** Minutes east of UTC that the zone's clocks show at an instant. */
export function zoneOffsetMin(instantMs: number, zone: string): number {
  return Math.round((wallClockMs(instantMs, zone) - Math.floor(instantMs / 1000) * 1000) / MINUTE_MS)
}

/** The wall time a clock in the zone shows at an instant, to the minute: "2026-06-09T09:20". */
export function toLocalTime(instantMs: number, zone: string): string {
  return spellWall(instantMs + zoneOffsetMin(instantMs, zone) * MINUTE_MS)
}

export interface LocalMoment {
  instantMs: number
  local: string
  offsetMin: number
  /** "Tue 9 Jun, 09:20 BST (UTC+1)" */
  text: string
}

/** An instant as a clock in the zone shows it, with the offset said. */
export function localMoment(instantMs: number, zone: string): LocalMoment {
  const local = toLocalTime(instantMs, zone)
  return {
    instantMs,
    local,
    offsetMin: zoneOffsetMin(instantMs, zone),
    text: `${spellDay(local)}, ${local.slice(11)} ${zoneLabel(instantMs, zone)}`,
  }
}

/** "BST (UTC+1)", or "UTC+4" where the zone has no abbreviation of its own. */
export function zoneLabel(instantMs: number, zone: string): string {
  const offsetMin = zoneOffsetMin(instantMs, zone)
  const utc = spellOffset(offsetMin)
  const name = shortZoneName(zone, offsetMin)
  return name === null || name === utc ? utc : `${name} (${utc})`
}

/** "UTC+1", "UTC−3:30", "UTC". */
export function spellOffset(offsetMin: number): string {
  if (offsetMin === 0) return 'UTC'
  const hours = Math.floor(Math.abs(offsetMin) / 60)
  const minutes = Math.abs(offsetMin) % 60
  return `UTC${offsetMin < 0 ? '−' : '+'}${hours}${minutes === 0 ? '' : `:${pad(minutes)}`}`
}

/** True for a zone this machine's time zone tables know. */
export function isKnownZone(zone: string): boolean {
  if (zone === '') return false
  try {
    clockOf(zone)
    return true
  } catch {
    return false
  }
}

function offsetsAround(wallMs: number, zone: string): number[] {
  const dayMs = 24 * 60 * MINUTE_MS
  // Offsets lie within 14 h of UTC and a zone changes at most once within two days, so these three see both sides.
  return [...new Set([wallMs - dayMs, wallMs, wallMs + dayMs].map((ms) => zoneOffsetMin(ms, zone)))]
}

/** The gap a wall time lies in: what the clock shows next, and what its zone is called before and after. */
function gapOver(wallMs: number, zone: string): Extract<ResolvedTime, { kind: 'missing' }> {
  const dayMs = 24 * 60 * MINUTE_MS
  const before = zoneOffsetMin(wallMs - dayMs, zone)
  let low = wallMs - before * MINUTE_MS - dayMs
  let high = wallMs - before * MINUTE_MS + dayMs
  // Bisection to the minute: 2 days halve to under one minute in 12 steps.
  while (high - low > MINUTE_MS) {
    const middle = low + Math.floor((high - low) / 2 / MINUTE_MS) * MINUTE_MS
    if (zoneOffsetMin(middle, zone) === before) low = middle
    else high = middle
  }
  return {
    kind: 'missing',
    nextLocal: toLocalTime(high, zone),
    beforeLabel: zoneLabel(low, zone),
    afterLabel: zoneLabel(high, zone),
  }
}

function wallTimeMs(local: string): number | null {
  const match = /^(\d{4})-(\d{2})-(\d{2})T(\d{2}):(\d{2})$/.exec(local)
  if (!match) return null
  const [year, month, day, hour, minute] = match.slice(1).map(Number) as [
    number,
    number,
    number,
    number,
    number,
  ]
  const ms = Date.UTC(year, month - 1, day, hour, minute)
  // Date.UTC rolls 31 June over into July: such a date is a slip of the pen, not the first of July.
  return spellWall(ms) === local ? ms : null
}

function wallClockMs(instantMs: number, zone: string): number {
  const parts: Record<string, number> = {}
  for (const { type, value } of clockOf(zone).formatToParts(instantMs)) parts[type] = Number(value)
  const { year = NaN, month = NaN, day = NaN, hour = NaN, minute = NaN, second = NaN } = parts
  return Date.UTC(year, month - 1, day, hour, minute, second)
}

const clocks = new Map<string, Intl.DateTimeFormat>()

function clockOf(zone: string): Intl.DateTimeFormat {
  const known = clocks.get(zone)
  if (known) return known
  const made = new Intl.DateTimeFormat('en-GB', {
    timeZone: zone,
    hourCycle: 'h23',
    year: 'numeric',
    month: '2-digit',
    day: '2-digit',
    hour: '2-digit',
    minute: '2-digit',
    second: '2-digit',
  })
  clocks.set(zone, made)
  return made
}

const DAYS = ['Sun', 'Mon', 'Tue', 'Wed', 'Thu', 'Fri', 'Sat'] as const
const MONTHS = ['Jan', 'Feb', 'Mar', 'Apr', 'May', 'Jun', 'Jul', 'Aug', 'Sep', 'Oct', 'Nov', 'Dec'] as const

function spellDay(local: string): string {
  const date = new Date(`${local.slice(0, 10)}T00:00:00Z`)
  return `${DAYS[date.getUTCDay()] ?? ''} ${date.getUTCDate()} ${MONTHS[date.getUTCMonth()] ?? ''}`
}

function spellWall(ms: number): string {
  return new Date(ms).toISOString().slice(0, 16)
}

function pad(value: number): string {
  return String(value).padStart(2, '0')
}
