import type { FindingSubject, ReviewCrate } from '@/lib/views/review'
import type { FindingView } from '@/lib/views/sheet'

/** A breach, whether or not another crate's signature has overridden it: each signature names what it goes against. */
export function isBreach({ status }: Pick<FindingView, 'status'>): boolean {
  return status === 'breach' || status === 'overridden'
}

/** Why a finding can't be overridden; null where a vet may do it by name. `closed`: nothing can be decided now. */
export function whyNotOverridable(
  finding: FindingView,
  closed: boolean,
): { bold: string; more: string } | null {
  if (finding.status === 'overridden' && closed)
    return { bold: 'Overridden.', more: 'It stands with the signature below.' }
  if (finding.overridable && isBreach(finding)) return null
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

/** What a signature over these crates is about, and what of the findings concerns it. */
export interface Coverage {
  crates: readonly Pick<ReviewCrate, 'crateId' | 'animals'>[]
  subjects: readonly Pick<FindingSubject, 'crateId' | 'animalId'>[]
}

/**
 * The indexes of a row's findings that concern one of the crates: about it, about an animal in it, or about all. A breach of
 * a crate nobody looked at can't slip in, and an override ticked for a crate since left out doesn't go along.
 */
export function concernedIndexes(
  finding: Pick<FindingView, 'indexes'>,
  { crates, subjects }: Coverage,
  crateIds: readonly string[],
): number[] {
  const covered = crates.filter((crate) => crateIds.includes(crate.crateId))
  return finding.indexes.filter((index) => {
    const subject = subjects[index]
    if (!subject) return false
    const { crateId, animalId } = subject
    if (crateId !== null) return crateIds.includes(crateId)
    return (
      animalId === null ||
      covered.some((crate) => crate.animals.some((animal) => animal.animalId === animalId))
    )
  })
}

/** The rows with something in them that concerns one of the crates. */
export function coveredFindings(
  findings: readonly FindingView[],
  coverage: Coverage,
  crateIds: readonly string[],
): FindingView[] {
  return findings.filter((finding) => concernedIndexes(finding, coverage, crateIds).length > 0)
}
