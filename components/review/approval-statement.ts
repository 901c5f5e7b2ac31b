import type { ReviewView } from '@/lib/views/review'
import type { FindingView } from '@/lib/views/sheet'
import type { ReviewForm } from './review-form-schema'

/** The statement as it will be signed: crates, legs, conditions, and every overridden finding by its name. */
export function approvalStatement({
  marks,
  view,
  overridden,
  values,
}: {
  marks: readonly string[]
  view: ReviewView
  overridden: readonly { finding: FindingView; reason: string }[]
  values: ReviewForm
}): string {
  const legs = view.sheet.legs.length
  const conditions = view.sheet.conditions.length + values.conditions.length
  const parts = [
    `On the facts shown I approve crate set-up ${marks.join(', ')} for ${legs === 1 ? 'leg 1' : `legs 1 to ${legs}`}`,
    conditions > 0 ? `, on ${conditions === 1 ? 'one condition' : `${conditions} conditions`}` : '',
    overridden.length > 0
      ? `, and I override by name: ${overridden.map(({ finding }) => `${finding.asked} (${finding.whoLegWords})`).join('; ')}`
      : '',
  ]
  return `${parts.join('')}.`
}
