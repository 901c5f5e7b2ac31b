import type { Verdict } from '@/lib/rules/result'

/** Words of a verdict, as every page, paper and mail says them. Capitals belong to verdicts alone. */
export const VERDICT_WORDS: Record<Verdict, string> = {
  go: 'GO',
  conditional: 'GO WITH CONDITIONS',
  'no-go': 'NO-GO',
}

/** For ears: "Verdict: go with conditions, 3 conditions". */
export function verdictName(verdict: Verdict | 'none', conditions = 0, outOfDate = false): string {
  if (outOfDate) return 'Verdict: out of date'
  if (verdict === 'none') return 'Not assessed'
  const words = { go: 'go', conditional: 'go with conditions', 'no-go': 'no-go' }[verdict]
  const counted = `${conditions} ${conditions === 1 ? 'condition' : 'conditions'}`
  return verdict === 'conditional' && conditions > 0 ? `Verdict: ${words}, ${counted}` : `Verdict: ${words}`
}
