import type { EffectiveVerdict } from '@/lib/rules/effective-verdict'
import type { Finding } from '@/lib/rules/result'
import type { AssessmentFact, SheetFacts } from './facts'

/** An assessment with the verdict that counts: overrides and conditions have had their say. */
export interface Assessed {
  fact: AssessmentFact
  effective: EffectiveVerdict
  /** The findings as stored, which never change; shorter than the effective ones by the vet's conditions. */
  original: Finding[]
}

export function assessedOf({ assessment, effective }: SheetFacts): Assessed | null {
  if (assessment === null || effective === null) return null
  return { fact: assessment, effective, original: assessment.result.findings }
}
