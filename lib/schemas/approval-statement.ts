/** What a signature is put under. */
export interface Signed {
  /** null: not answered yet; that sentence is then left out. */
  examined: boolean | null
  /** "2441-A", in the order of the plan. */
  crateMarks: readonly string[]
  /** Every finding overridden, in full (lib/views/override-words). */
  overridden: readonly string[]
}

/**
 * What a vet signs, word for word: the crates it covers, each finding it goes against by name, the two answers. Stored with
 * each approval, so that a later change of these words changes nothing that was signed.
 */
export function approvalStatement({ examined, crateMarks, overridden }: Signed): string {
  return [
    `I approve the crate ${crateMarks.length === 1 ? 'set-up' : 'set-ups'} ${listed(crateMarks)} on the facts shown.`,
    ...(overridden.length === 0 ? [] : [`I override by name: ${numbered(overridden)}.`]),
    ...(examined === null ? [] : [`I have ${examined ? '' : 'not '}examined the animal.`]),
    'This is not a certificate of fitness to travel.',
  ].join(' ')
}

function listed(marks: readonly string[]): string {
  const last = marks.at(-1) ?? ''
  return marks.length < 2 ? last : `${marks.slice(0, -1).join(', ')} and ${last}`
}

function numbered(findings: readonly string[]): string {
  return findings.length === 1
    ? (findings[0] ?? '')
    : findings.map((words, index) => `(${index + 1}) ${words}`).join('; ')
}
