import canonicalize from 'canonicalize'
import { catalogueValues } from '@/lib/species'
import { gather, simulate, VARIANTS, type Scenario } from '@/lib/thermal'

/**
 * All three variants of a scenario on time, as RFC 8785 text: what is hashed to compare Node with Chromium. No Node module is used here,
 * so that a browser test can import it and hash the text with SubtleCrypto.
 */
export function canonicalResult(scenario: Scenario): string {
  const runs = VARIANTS.map((variant) => simulate(scenario, { variant, profiles: catalogueValues }))
  const text = canonicalize({ result: gather(runs), extremes: runs.map((run) => run.extremes) })
  if (text === undefined) throw new Error('The result has no canonical form.')
  return text
}
