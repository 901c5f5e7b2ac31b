import type { PaperCheckResult } from '@/components/verify/paper-check'
import { FIRM_ZONE } from '@/lib/domain/firm'
import type { SteadfoldError } from '@/lib/errors'

/** A refused check as the page shows it: a wait that counts down, or a sentence at the field. */
export function refusedCheck(error: SteadfoldError, field: 'code' | 'file', now: Date): PaperCheckResult {
  const until = error.details['closedUntil']
  if (error.code === 'throttled' && typeof until === 'string')
    return { kind: 'throttled', endsMs: Date.parse(until), nowMs: now.getTime(), zone: FIRM_ZONE }
  return { kind: 'refused', field, message: error.issues[0]?.message ?? error.message }
}
