import { duration } from '@/lib/views/format'

/** "in 17 h 15 min", "left 20 min ago". */
export function leavesIn(leavesMs: number, nowMs: number): string {
  const minutes = Math.round((leavesMs - nowMs) / 60_000)
  return minutes >= 0 ? `in ${duration(minutes)}` : `left ${duration(-minutes)} ago`
}
