import type { ChecklistEndurance } from '@/lib/views/checklist'

const LONG_MIN = 240

/** Kinds of failure that no animal feels for four hours: one sentence says so, and the table is left to the others. */
export function longKinds(rows: readonly ChecklistEndurance[]): string[] {
  const kinds = [...new Set(rows.map((row) => row.kindWords))]
  return kinds.filter((kind) => rows.every((row) => row.kindWords !== kind || isLong(row)))
}

function isLong({ toAlarmMin, toCriticalMin }: ChecklistEndurance): boolean {
  return [toAlarmMin, toCriticalMin].every((minutes) => minutes !== null && minutes >= LONG_MIN)
}
