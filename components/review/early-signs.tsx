'use client'

import { useFieldArray } from 'react-hook-form'
import { TextInput } from '@/components/forms/text-input'
import { Tick } from '@/components/forms/ticks'
import type { ReviewCrate } from '@/lib/views/review'
import type { ReviewFormState } from './review-desk'

/** What the driver is told to ring for, by crate: offered for the species, chosen by the vet, who may add to it. */
export function EarlySigns({
  form,
  crates,
  closed,
}: {
  form: ReviewFormState
  /** Those the signature covers. */
  crates: readonly ReviewCrate[]
  /** Nothing can be decided now. */
  closed: boolean
}) {
  const { fields, append, remove } = useFieldArray({ control: form.form.control, name: 'signs' })
  if (closed) return null
  return (
    <section aria-labelledby="signs-title">
      <h3 id="signs-title" className="text-sub">
        Early signs
      </h3>
      <p className="text-caption text-mute">The driver rings when he or she sees one.</p>
      {crates.map((crate) => {
        const offered = new Set(crate.earlySigns)
        return (
          <fieldset key={crate.crateId} className="mt-1.5">
            <legend className="font-semibold">Crate {crate.letter}</legend>
            <ul className="list-none">
              {fields.map((row, index) => {
                if (row.crateId !== crate.crateId) return null
                return (
                  <li key={row.id} className="py-0.5">
                    {offered.has(row.text) ? (
                      <Tick {...form.field(`signs.${index}.on`)} label={row.text} />
                    ) : (
                      <div className="flex items-end gap-2">
                        <TextInput
                          {...form.field(`signs.${index}.text`)}
                          className="flex-1"
                          label="Sign"
                          maxLength={200}
                        />
                        <button
                          type="button"
                          className="link max-desk:min-h-11"
                          onClick={() => remove(index)}
                        >
                          Take off
                        </button>
                      </div>
                    )}
                  </li>
                )
              })}
            </ul>
            <button
              type="button"
              className="link max-desk:min-h-11"
              onClick={() => append({ on: true, crateId: crate.crateId, text: '' })}
            >
              Add a sign<span className="sr-only"> for crate {crate.letter}</span>
            </button>
          </fieldset>
        )
      })}
    </section>
  )
}
