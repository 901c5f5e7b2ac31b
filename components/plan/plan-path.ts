import { fieldId } from '@/components/forms/field-id'
import type { Plan } from '@/lib/schemas/plan'

/*
 * A path into the plan ("crates.1.openings.0.widthCm") says three things: which part of the page holds the field, which
 * item of that part has to be opened, and where the focus goes.
 */

export const PLAN_PARTS = ['parties', 'animals', 'crates', 'legs'] as const
export type PlanPart = (typeof PLAN_PARTS)[number]

export const PART_WORDS: Record<PlanPart, string> = {
  parties: 'Parties',
  animals: 'Animals',
  crates: 'Crates',
  legs: 'Legs',
}

export interface PlanSpot {
  part: PlanPart
  /** Which animal, crate or leg; null: the part as a whole. */
  index: number | null
}

/** The part of the page and the item in it that a path belongs to. */
export function spotOf(path: string): PlanSpot {
  const [head, index] = path.split('.')
  if (head === 'animals' || head === 'crates' || head === 'legs') {
    return { part: head, index: index === undefined ? null : Number(index) }
  }
  return { part: 'parties', index: null }
}

/** How many of the paths lie in each part. */
export function countByPart(paths: readonly string[]): Record<PlanPart, number> {
  const counts: Record<PlanPart, number> = { parties: 0, animals: 0, crates: 0, legs: 0 }
  for (const path of paths) counts[spotOf(path).part] += 1
  return counts
}

/** True where a path is the given one or lies under it. */
export function isUnder(path: string, above: string): boolean {
  return path === above || path.startsWith(`${above}.`)
}

/** The value at a path; undefined where the plan holds nothing there. */
export function valueAt(plan: Plan, path: string): unknown {
  return path.split('.').reduce<unknown>((value, key) => {
    if (typeof value !== 'object' || value === null) return undefined
    return (value as Record<string, unknown>)[key]
  }, plan)
}

/** Id of the field at a path, for labels, links and the focus. */
export function planPathId(path: string): string {
  return fieldId('plan', path)
}
