import { createHash } from 'node:crypto'
import type { Scenario } from '@/lib/thermal'
import { canonicalResult } from './canonical-result'

/** SHA-256 of a scenario's canonical result, hexadecimal. */
export function resultHash(scenario: Scenario): string {
  return createHash('sha256').update(canonicalResult(scenario)).digest('hex')
}
