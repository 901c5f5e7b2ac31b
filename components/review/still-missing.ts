import type { FindingView } from '@/lib/views/sheet'
import { chosenOverrides } from './review-form-schema'
import type { ReviewForm } from './review-form-schema'

const SHORTEST_REASON = 10

/** The first thing that keeps the button from working, as a sentence's end; empty when nothing does. */
export function stillMissing(values: ReviewForm, findings: readonly FindingView[], cannot: string): string {
  if (values.crateIds.length === 0) return 'choose a crate.'
  if (values.decision === 'return') return values.reasons.trim() === '' ? 'write the reasons.' : ''
  if (cannot !== '') return 'an admin has to put your record right.'
  const unreasoned = chosenOverrides(values, findings).find(({ reason }) => reason.length < SHORTEST_REASON)
  if (unreasoned) return `say why you override “${unreasoned.finding.asked}”.`
  if (values.conditions.some((condition) => condition.text.trim() === ''))
    return 'write the new condition, or take it off.'
  if (values.decision !== 'approve') return 'choose a decision.'
  if (values.examined === '') return 'say whether you have examined the animals.'
  if (values.password === '') return 'type your password.'
  return ''
}
