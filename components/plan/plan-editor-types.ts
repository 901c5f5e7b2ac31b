import type { ActionResult } from '@/lib/errors'
import type { Plan, SavePlan } from '@/lib/schemas/plan'

/** What a refused save brings along: what somebody else saved meanwhile. */
export interface SavedMeanwhile {
  plan: Plan
  /** To be sent with the next save. */
  version: number
  by: string
  atMs: number
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
export function savedMeanwhile({ meanwhile }: Record<string, unknown>): SavedMeanwhile | null {
  if (typeof meanwhile !== 'object' || meanwhile === null) return null
  const { plan, version, by, atMs } = meanwhile as Record<string, unknown>
  if (typeof version !== 'number' || typeof by !== 'string' || typeof atMs !== 'number') return null
  return typeof plan === 'object' && plan !== null ? { plan: plan as Plan, version, by, atMs } : null
}
