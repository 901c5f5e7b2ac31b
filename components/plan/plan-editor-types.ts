import type { ActionResult } from '@/lib/errors'
import type { Plan, SavePlan } from '@/lib/schemas/plan'

/** What a refused save brings along: what somebody else saved meanwhile. */
export interface SavedMeanwhile {
  theirs: Plan
  /** To be sent with the next save. */
  version: number
  savedBy: string
  savedAt: string
}

export interface SavedPlan {
  consignmentId: number
  mark: string
  version: number
  revision: number
  /** What this save voided, as one sentence. */
  voided: string | null
}

export interface PlanActions {
  save: (input: SavePlan) => Promise<ActionResult<SavedPlan>>
  assess: (input: { consignmentId: number; requestId: string }) => Promise<ActionResult<unknown>>
}

/** What the editor knows of the consignment beside its plan. */
export interface EditedConsignment {
  id: number
  mark: string
  revision: number
  version: number
  stateWords: string
  verdictWords: string
  /** A released revision stays in force while the next is worked on. */
  inForceRevision: number | null
}

/** The details of a `conflict`, read with care: they crossed a wire. */
export function savedMeanwhile(details: Record<string, unknown>): SavedMeanwhile | null {
  const { theirs, version, savedBy, savedAt } = details
  if (typeof version !== 'number' || typeof savedBy !== 'string' || typeof savedAt !== 'string') return null
  return typeof theirs === 'object' && theirs !== null
    ? { theirs: theirs as Plan, version, savedBy, savedAt }
    : null
}
