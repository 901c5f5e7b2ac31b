import { spellOffset, toLocalTime, zoneOffsetMin } from '@/lib/planning/local-time'
import { shortZoneName } from '@/lib/planning/zone-names'
import type { TempUnit } from './preferences'

/*
 * The only place where figures become words. True minus, no-break space before the unit, and rounding to the safe side
 * where a figure is a limit or a margin; readings round to the nearest.
 */

export type { TempUnit }

const NBSP = '\u00a0'
const MINUS = '\u2212'
export const MINUTES_SHOWN = 240
const DAYS = ['Sun', 'Mon', 'Tue', 'Wed', 'Thu', 'Fri', 'Sat'] as const
const MONTHS = ['Jan', 'Feb', 'Mar', 'Apr', 'May', 'Jun', 'Jul', 'Aug', 'Sep', 'Oct', 'Nov', 'Dec'] as const

/** Which way a figure may be rounded: a limit only towards the animal's safety. */
export type Rounding = 'nearest' | 'down' | 'up'

/** "−0.1", "39.4": fixed decimals, true minus, never "−0". */
export function figure(value: number, decimals = 0, rounding: Rounding = 'nearest'): string {
  if (!Number.isFinite(value)) return 'none'
  const text = Math.abs(rounded(value, decimals, rounding)).toFixed(decimals)
  return rounded(value, decimals, rounding) < 0 ? MINUS + text : text
}

/** Like figure, but a gain carries its plus: "+27.1". */
export function signed(value: number, decimals = 0): string {
  const text = figure(value, decimals)
  return rounded(value, decimals, 'nearest') > 0 ? `+${text}` : text
}

/** "48 212": groups of three held together by no-break spaces. */
export function count(value: number): string {
  return figure(value).replace(/\B(?=(\d{3})+(?!\d))/g, NBSP)
}

/** "3 conditions", "1 condition". */
export function counted(value: number, one: string, many = `${one}s`): string {
  return `${count(value)}${NBSP}${value === 1 ? one : many}`
}

/** A figure and its unit that never part: "8.4 kg". */
export function withUnit(value: number, unit: string, decimals = 0, rounding: Rounding = 'nearest'): string {
  return `${figure(value, decimals, rounding)}${NBSP}${unit}`
}

export const UNIT_SIGN: Record<TempUnit, string> = { c: '°C', f: '°F' }

/** °C to the unit shown; 9 decimals are enough to take off binary dust (38.5 °C is 101.3 °F, not 101.29…). */
export function inUnit(tempC: number, unit: TempUnit): number {
  return unit === 'c' ? tempC : rounded(tempC * 1.8 + 32, 9, 'nearest')
}

/** The other way, for what people type. */
export function fromUnit(value: number, unit: TempUnit): number {
  return unit === 'c' ? value : rounded((value - 32) / 1.8, 9, 'nearest')
}

/** A reading, to the nearest: bodyTemp "39.5 °C", airTemp "34 °C". */
export function bodyTemp(tempC: number, unit: TempUnit): string {
  return withUnit(inUnit(tempC, unit), UNIT_SIGN[unit], 1)
}

export function airTemp(tempC: number, unit: TempUnit): string {
  return withUnit(inUnit(tempC, unit), UNIT_SIGN[unit], 0)
}

/** An upper limit never prints higher than it is, a lower one never lower: 28 °C is at most 82 °F, 8 °C at least 47 °F. */
export function limitTemp(tempC: number, side: 'high' | 'low', unit: TempUnit, decimals: 0 | 1 = 1): string {
  return withUnit(inUnit(tempC, unit), UNIT_SIGN[unit], decimals, side === 'high' ? 'down' : 'up')
}

/** A limit's figure without its unit, for axes and columns that carry the unit in the head. */
export function limitFigure(
  tempC: number,
  side: 'high' | 'low',
  unit: TempUnit,
  decimals: 0 | 1 = 1,
): string {
  return figure(inUnit(tempC, unit), decimals, side === 'high' ? 'down' : 'up')
}

/** A margin to spare in outside air: whole degrees, rounded down, no offset in °F. */
export function airMargin(deltaC: number, unit: TempUnit): string {
  return withUnit(differenceIn(deltaC, unit), UNIT_SIGN[unit], 0, 'down')
}

/** A margin to spare in body temperature: one decimal, rounded down. */
export function bodyMargin(deltaC: number, unit: TempUnit): string {
  return withUnit(differenceIn(deltaC, unit), UNIT_SIGN[unit], 1, 'down')
}

/** A change, signed, to the nearest: "+0.4 °C". */
export function tempChange(deltaC: number, unit: TempUnit, decimals: 0 | 1 = 1): string {
  return `${signed(differenceIn(deltaC, unit), decimals)}${NBSP}${UNIT_SIGN[unit]}`
}

/** A difference in the unit shown: × 1.8, no offset. */
export function differenceIn(deltaC: number, unit: TempUnit): number {
  return unit === 'c' ? rounded(deltaC, 9, 'nearest') : rounded(deltaC * 1.8, 9, 'nearest')
}

/** Minutes to spare: rounded down, "240+ min" when four hours or longer, "−16 min" when past. */
export function minutesToSpare(minutes: number): string {
  return minutes >= MINUTES_SHOWN ? `${MINUTES_SHOWN}+${NBSP}min` : withUnit(minutes, 'min', 0, 'down')
}

/** Minutes to a limit after a failure; null means nobody can say. */
export function enduranceMinutes(minutes: number | null): string {
  if (minutes === null) return 'unknown'
  return minutes <= 0 ? 'passed' : minutesToSpare(minutes)
}

/** "7:25", for a column whose head says h:min. */
export function hourMin(minutes: number): string {
  const whole = Math.round(Math.abs(minutes))
  const text = `${Math.floor(whole / 60)}:${String(whole % 60).padStart(2, '0')}`
  return minutes < 0 && whole > 0 ? MINUS + text : text
}

/** "23 h 05 min", "35 min", "2 days 23 h". */
export function duration(minutes: number): string {
  const whole = Math.max(0, Math.round(minutes))
  if (whole < 60) return `${whole}${NBSP}min`
  if (whole < 48 * 60)
    return `${Math.floor(whole / 60)}${NBSP}h${NBSP}${String(whole % 60).padStart(2, '0')}${NBSP}min`
  return `${Math.floor(whole / 1440)}${NBSP}days${NBSP}${Math.floor((whole % 1440) / 60)}${NBSP}h`
}

/**
 * "03:09", for axes and columns whose head names the zone. Wall times come from lib/planning/local-time.ts: date-fns-tz
 * shifts an hour that the reader's own clock skips (formatInTimeZone, a Dubai time read in London on the March night).
 */
export function clock(ms: number, zone: string): string {
  return toLocalTime(ms, zone).slice(11)
}

/** "GST", "CEST", "UTC+3". */
export function zoneName(ms: number, zone: string): string {
  return shortZoneName(zone, zoneOffsetMin(ms, zone)) ?? utcOffset(ms, zone)
}

/** "UTC+4", "UTC−3:30", "UTC". */
export function utcOffset(ms: number, zone: string): string {
  return spellOffset(zoneOffsetMin(ms, zone))
}

/** "GST (UTC+4)". */
export function zoneWithOffset(ms: number, zone: string): string {
  const name = zoneName(ms, zone)
  const offset = utcOffset(ms, zone)
  return name === offset ? name : `${name} (${offset})`
}

/** "03:09 GST". */
export function localTime(ms: number, zone: string): string {
  return `${clock(ms, zone)}${NBSP}${zoneName(ms, zone)}`
}

/** "03:09 GST (UTC+4)", at the first mention on a page. */
export function localTimeWithOffset(ms: number, zone: string): string {
  return `${clock(ms, zone)}${NBSP}${zoneWithOffset(ms, zone)}`
}

/** "Wed 10 Jun". */
export function dayDate(ms: number, zone: string): string {
  const day = toLocalTime(ms, zone).slice(0, 10)
  const date = new Date(`${day}T00:00:00Z`)
  return [DAYS[date.getUTCDay()], date.getUTCDate(), MONTHS[date.getUTCMonth()]].join(NBSP)
}

/** "Wed 10 Jun 2026": the year once on a page. */
export function dayDateYear(ms: number, zone: string): string {
  return `${dayDate(ms, zone)}${NBSP}${toLocalTime(ms, zone).slice(0, 4)}`
}

/** "Wed 10 Jun 09:20 BST". */
export function dayTime(ms: number, zone: string): string {
  return `${dayDate(ms, zone)} ${localTime(ms, zone)}`
}

/** Lengths are kept in metres and shown in centimetres. */
export function centimetres(lengthM: number, decimals = 0): string {
  return withUnit(lengthM * 100, 'cm', decimals)
}

export function squareCentimetres(areaM2: number): string {
  return `${count(Math.round(areaM2 * 10_000))}${NBSP}cm²`
}

export function kilograms(massKg: number): string {
  return withUnit(massKg, 'kg', massKg < 10 ? 1 : massKg < 100 && !Number.isInteger(massKg) ? 1 : 0)
}

export function percent(value: number, decimals = 0): string {
  return withUnit(value, '%', decimals)
}

function rounded(value: number, decimals: number, rounding: Rounding): number {
  const scale = 10 ** decimals
  const scaled = Number((value * scale).toPrecision(14))
  const whole =
    rounding === 'down'
      ? Math.floor(scaled)
      : rounding === 'up'
        ? Math.ceil(scaled)
        : Math.sign(scaled) * Math.round(Math.abs(scaled))
  return whole / scale + 0
}
