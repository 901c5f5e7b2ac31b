'use client'

import { useFieldArray } from 'react-hook-form'
import { SelectField } from '@/components/forms/select-field'
import { TextArea, TextInput } from '@/components/forms/text-input'
import type { ConditionView, LegView } from '@/lib/views/sheet'
import type { ReviewFormState } from './review-desk'

/** Conditions that stand already with who answered, and those the vet puts with this signature. */
export function VetConditions({
  form,
  conditions,
  legs,
  closed,
}: {
  form: ReviewFormState
  conditions: readonly ConditionView[]
  legs: readonly LegView[]
  /** Nothing can be decided now, so nothing can be added. */
  closed: boolean
}) {
  const { fields, append, remove } = useFieldArray({ control: form.form.control, name: 'conditions' })
  return (
    <section aria-labelledby="conditions-title">
      <h3 id="conditions-title" className="text-sub">
        Conditions
      </h3>
      <ol className="mt-1 list-none">
        {conditions.map((condition) => (
          <li key={condition.conditionId} className="grid grid-cols-[20px_1fr] gap-x-1.5 py-1">
            <span className="font-head font-bold">{condition.number}</span>
            <span>
              {condition.text}
              <span className="block text-caption text-mute">
                {legsWords(condition.legs)}
                {condition.answerWords}
              </span>
            </span>
          </li>
        ))}
      </ol>
      {conditions.length === 0 && fields.length === 0 && <p className="mt-1 text-mute">None so far.</p>}
      {fields.map((row, index) => (
        <fieldset key={row.id} className="mt-2 border-t border-hair pt-2">
          <legend className="sr-only">New condition {index + 1}</legend>
          <div className="grid gap-2">
            <TextArea
              {...form.field(`conditions.${index}.text`)}
              label="Condition"
              rows={2}
              maxLength={300}
            />
            <SelectField
              {...form.field(`conditions.${index}.legId`)}
              label="Leg"
              none="Whole journey"
              choices={legs.map((leg) => ({ value: leg.legId, words: `${leg.ordinal} ${leg.title}` }))}
            />
            <TextInput
              {...form.field(`conditions.${index}.party`)}
              label="Asked of"
              hint="Empty: whoever is in charge of the leg"
              maxLength={120}
            />
          </div>
          <button type="button" className="link mt-1.5" onClick={() => remove(index)}>
            Take this condition off
          </button>
        </fieldset>
      ))}
      <p className="mt-2" hidden={closed}>
        <button type="button" className="link" onClick={() => append({ text: '', legId: '', party: '' })}>
          Add a condition
        </button>
      </p>
    </section>
  )
}

/** "Leg 3. " before the answer; nothing where a condition holds for the whole journey. */
function legsWords(legs: readonly number[]): string {
  return legs.length === 0 ? '' : `${legs.length === 1 ? 'Leg' : 'Legs'} ${legs.join(', ')}. `
}
