import { dayDateYear } from './format'

/** A day without a time, "2027-03-31", as people read it: "Wed 31 Mar 2027". Empty stays empty. */
export function calendarDay(day: string): string {
  const ms = Date.parse(`${day}T00:00:00Z`)
  return Number.isNaN(ms) ? day : dayDateYear(ms, 'UTC')
}
