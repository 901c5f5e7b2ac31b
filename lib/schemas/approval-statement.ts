/**
 * What a vet signs, word for word. Stored with each approval, so that a later change of these words changes nothing that
 * was signed.
 */
export function approvalStatement({ examined }: { examined: boolean }): string {
  return [
    'I approve the crate set-up on the facts shown.',
    examined ? 'I have examined the animal.' : 'I have not examined the animal.',
    'This is not a certificate of fitness to travel.',
  ].join(' ')
}
