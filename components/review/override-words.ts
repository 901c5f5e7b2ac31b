import type { ReviewCrate } from '@/lib/views/review'
import type { FindingView } from '@/lib/views/sheet'

/** Why a finding can't be overridden; null where a vet may do it by name. */
export function whyNotOverridable(finding: FindingView): { bold: string; more: string } | null {
  if (finding.status === 'overridden')
    return { bold: 'Overridden.', more: 'It stands with the signature below.' }
  if (finding.overridable && finding.status === 'breach') return null
  const met = finding.status === 'met' || finding.status === 'note' ? ' It is met.' : ''
  if (finding.margin.limitKind === 'critical')
    return { bold: 'Not possible: critical.', more: `Nobody overrides it.${met}` }
  switch (finding.basis) {
    case 'law':
      return {
        bold: 'Not possible: law.',
        more: met === '' ? 'Only a paper attached changes the finding; release waits for it.' : met.trim(),
      }
    case 'carrier':
      return {
        bold: 'Not possible: the carrier’s own.',
        more: met === '' ? 'Only the carrier’s written consent changes it.' : met.trim(),
      }
    default:
      return { bold: 'Nothing to override.', more: met.trim() || finding.statusWords }
  }
}

/**
 * The findings a signature over these crates is about: those on an animal inside one, and those on all animals. A breach of
 * a crate nobody looked at can't slip in, and an override ticked for a crate since left out doesn't go along.
 */
export function coveredFindings(
  findings: readonly FindingView[],
  crates: readonly Pick<ReviewCrate, 'crateId' | 'animals'>[],
  crateIds: readonly string[],
): FindingView[] {
  const covered = crates.filter((crate) => crateIds.includes(crate.crateId))
  const animalIds = new Set(covered.flatMap((crate) => crate.animals.map((animal) => animal.animalId)))
  return findings.filter(
    (finding) => finding.animalIds.length === 0 || finding.animalIds.some((id) => animalIds.has(id)),
  )
}
