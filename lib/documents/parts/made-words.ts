import { dayDateYear, localTimeWithOffset } from '@/lib/views/format'
import type { Moment } from '@/lib/views/sheet'

/** "Thu 11 Jun 2026, 09:34 BST (UTC+1)" */
export function madeWords({ ms, zone }: Moment): string {
  return `${dayDateYear(ms, zone)}, ${localTimeWithOffset(ms, zone)}`
}

/** "31 Mar 2027", for the day something ends. */
export function plainDate(ms: number, zone: string): string {
  const [, ...rest] = dayDateYear(ms, zone).split('\u00a0')
  return rest.join('\u00a0')
}
