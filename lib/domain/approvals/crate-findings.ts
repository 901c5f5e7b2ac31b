import { SteadfoldError } from '@/lib/errors'
import { isOverridable } from '@/lib/rules/effective-verdict'
import type { Finding } from '@/lib/rules/result'
import type { ApproveCrates } from '@/lib/schemas/approval'
import type { Plan, PlanCrate } from '@/lib/schemas/plan'
import { isAbsolute } from '../consignments/current-assessment'

export interface SignedOverride {
  crateRef: string
  finding: Finding
  reason: string
}

/** The crates of the plan that are to be signed, in its order; `invalid` where one is not in it. */
export function chosenCrates(plan: Plan, crateIds: readonly string[]): PlanCrate[] {
  const chosen = plan.crates.filter(({ id }) => crateIds.includes(id))
  if (chosen.length !== new Set(crateIds).size) {
    throw new SteadfoldError('invalid', 'This page is out of step: a crate is no longer in the plan.')
  }
  return chosen
}

/** Whether a finding is about this crate: about it, about an animal in it, or about all. */
export function concerns(finding: Finding, crate: PlanCrate): boolean {
  if (finding.crateId !== undefined) return finding.crateId === crate.id
  if (finding.animalId !== undefined) return crate.occupants.includes(finding.animalId)
  return true
}

/**
 * The overrides of one signature, each tied to its crate. Refused: a finding that is no breach or may not be overridden,
 * and a breach on a signed crate that nobody names.
 */
export function signedOverrides(
  findings: readonly Finding[],
  crates: readonly PlanCrate[],
  asked: ApproveCrates['overrides'],
): SignedOverride[] {
  const named = new Map(asked.map(({ findingIndex, reason }) => [findingIndex, reason]))
  const overrides = asked.flatMap(({ findingIndex, reason }) => {
    const finding = findings[findingIndex]
    if (finding === undefined) throw new SteadfoldError('invalid', 'This page is out of step: load it again.')
    insistOverridable(finding)
    const own = crates.filter((crate) => concerns(finding, crate))
    if (own.length === 0) {
      throw new SteadfoldError('invalid', `“${finding.asked}” is not about a crate you are signing.`)
    }
    return own.map((crate) => ({ crateRef: crate.id, finding, reason }))
  })
  findings.forEach((finding, index) => {
    if (finding.status !== 'breach' || named.has(index)) return
    if (!crates.some((crate) => concerns(finding, crate))) return
    if (isAbsolute(finding)) insistOverridable(finding)
    throw new SteadfoldError(
      'refused',
      `A breach is neither overridden nor gone: ${finding.note} Override it by name, or return the crate.`,
      { details: { findingIndex: index } },
    )
  })
  return overrides
}

function insistOverridable(finding: Finding) {
  if (finding.status !== 'breach') {
    throw new SteadfoldError('invalid', `“${finding.asked}” is no breach: there is nothing to override.`)
  }
  if (isOverridable(finding)) return
  const because = finding.overrideRefusedBecause ?? finding.note
  throw new SteadfoldError('refused', `Nobody may override this: ${because}`, {
    details: { rule: finding.rule, basis: finding.basis },
  })
}
