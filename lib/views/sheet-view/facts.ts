import type { EffectiveVerdict } from '@/lib/rules/effective-verdict'
import type { Assessment } from '@/lib/rules/result'
import type { Plan, PlanPlace } from '@/lib/schemas/plan'
import type { ConsignmentState } from '@/lib/states/consignment'
import type { BodyLimits, SheetFirm } from '../sheet'

/*
 * What a sheet is built from, as plain values: rows already read, nothing asked of a clock or a database. Instants are
 * milliseconds since the epoch.
 */

export interface SheetFacts {
  consignment: {
    id: number
    mark: string
    revision: number
    replacesRevision: number | null
    state: ConsignmentState
    planHash: string
  }
  plan: Plan
  shipper: { name: string; accountNo: string }
  /** Every place the plan names. */
  places: readonly PlanPlace[]
  profiles: readonly ProfileFact[]
  assessment: AssessmentFact | null
  /** lib/rules/effective-verdict over the same assessment, with approvals in force and conditions; null without one. */
  effective: EffectiveVerdict | null
  approvals: readonly ApprovalFact[]
  conditions: readonly ConditionFact[]
  firm: SheetFirm
  /** Eight characters; null on screen. */
  documentCode: string | null
  madeAtMs: number
}

export interface ProfileFact {
  key: string
  commonName: string
  version: number
  /** null: the row has no limits, so it can't be assessed. */
  limits: BodyLimits | null
}

export interface AssessmentFact {
  /** crates, animals and compartments may be empty: then there are no charts. */
  result: Assessment
  assessedAtMs: number
  assessedBy: string
  outOfDate: boolean
}

export interface ApprovalFact {
  crateId: string
  decision: 'approved' | 'approved_with_conditions' | 'returned'
  statement: string
  examined: boolean
  signerName: string
  registrationNumber: string
  /** ISO 3166-1 alpha-2. */
  registrationCountry: string
  /** yyyy-MM-dd */
  registrationExpiresOn: string
  /** "Record checked by admin 14 Jan 2026"; empty where not known. */
  checkedWords: string
  signedAtMs: number
  /** False once voided or withdrawn. */
  inForce: boolean
  /** What the driver is told to ring for. */
  earlySigns: readonly string[]
  overrides: readonly OverrideFact[]
}

export interface OverrideFact {
  findingRule: string
  animalId: string | null
  legId: string | null
  reason: string
  minutesPast: number
  worstBodyC: number | null
}

export interface ConditionFact {
  id: string
  text: string
  /** null: the whole journey. */
  legId: string | null
  party: string
  /** Our own checklist item confirms it. */
  ours: boolean
  findingRule: string | null
  askedAtMs: number | null
  answer: 'confirmed' | 'refused' | null
  answeredBy: string | null
  answeredHow: string | null
  answeredAtMs: number | null
  kept: boolean | null
}
