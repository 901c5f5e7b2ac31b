import { whyOverrideEnds } from './effective-verdict'
import type { SignedOverride } from './effective-verdict'
import type { Assessment, Finding } from './result'
import { SEVERITY, worstOf } from './verdicts'

/** What a run found, as far as a signature rests on it. */
export type Outcome = Pick<Assessment, 'findings' | 'animalVerdicts'>

export interface SignedCrate {
  crateId: string
  occupants: readonly string[]
  overrides: readonly SignedOverride[]
}

/**
 * Whether a crate set-up came out worse in a later run of the same plan than in the one that was signed: a lower verdict,
 * a finding newly in breach, or an overridden finding beyond the figures it was signed for.
 */
export function cameOutWorse(crate: SignedCrate, signed: Outcome, later: Outcome): boolean {
  const breaches = (outcome: Outcome) =>
    outcome.findings.filter((finding) => finding.status === 'breach' && concerns(finding, crate))
  const known = new Set(breaches(signed).map(nameOf))
  return (
    SEVERITY[verdictOf(crate, later)] < SEVERITY[verdictOf(crate, signed)] ||
    breaches(later).some((finding) => !known.has(nameOf(finding)) || outgrown(finding, crate.overrides))
  )
}

function concerns({ animalId, crateId }: Finding, crate: SignedCrate): boolean {
  if (crateId !== undefined) return crateId === crate.crateId
  return animalId === undefined || crate.occupants.includes(animalId)
}

function verdictOf({ occupants }: SignedCrate, { animalVerdicts }: Outcome) {
  return worstOf(
    animalVerdicts.filter(({ animalId }) => occupants.includes(animalId)).map((one) => one.verdict),
  )
}

function outgrown(finding: Finding, overrides: readonly SignedOverride[]): boolean {
  const own = overrides.find((by) => nameOf(finding) === nameOf({ ...by, crateId: finding.crateId }))
  return own !== undefined && whyOverrideEnds(finding, own) !== undefined
}

interface Named {
  rule: string
  animalId?: string | null
  crateId?: string | undefined
  legId?: string | null
}

function nameOf({ rule, animalId, crateId, legId }: Named): string {
  return JSON.stringify([rule, animalId ?? null, crateId ?? null, legId ?? null])
}
