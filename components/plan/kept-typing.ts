import type { Plan } from '@/lib/schemas/plan'

/*
 * A copy of what is typed, kept in this browser tab until it is saved: a closed lid, a wrong link or a lost session takes
 * nothing with it. It names the version it began from, so that a plan saved meanwhile by somebody else is merged, not
 * overwritten.
 */

export interface KeptTyping {
  version: number | null
  base: Plan
  values: Plan
  atMs: number
}

const keyOf = (consignmentId: number | null) => `steadfold-plan-${consignmentId ?? 'new'}`

/** What was typed and not saved, or null; a copy that cannot be read counts as none. */
export function keptTyping(consignmentId: number | null): KeptTyping | null {
  try {
    const text = sessionStorage.getItem(keyOf(consignmentId))
    if (text === null) return null
    const kept = JSON.parse(text) as KeptTyping
    return Array.isArray(kept.values.legs) && Array.isArray(kept.base.legs) ? kept : null
  } catch {
    return null
  }
}

export function keepTyping(consignmentId: number | null, kept: KeptTyping): void {
  try {
    sessionStorage.setItem(keyOf(consignmentId), JSON.stringify(kept))
  } catch {
    // Storage may be full or forbidden: the page itself still holds everything.
  }
}

export function dropTyping(consignmentId: number | null): void {
  try {
    sessionStorage.removeItem(keyOf(consignmentId))
  } catch {
    // Nothing was kept.
  }
}
