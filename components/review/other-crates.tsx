'use client'

import { Ticks } from '@/components/forms/ticks'
import type { ReviewCrate } from '@/lib/views/review'
import type { ReviewFormState } from './review-desk'

/** One signature may cover several set-ups of the consignment; the one on the page is always among them. */
export function OtherCrates({
  form,
  crates,
  chosen,
}: {
  form: ReviewFormState
  crates: readonly ReviewCrate[]
  chosen: ReviewCrate
}) {
  const waiting = crates.filter((crate) => crate.decision === 'waiting')
  if (waiting.length < 2) return null
  return (
    <section>
      <Ticks
        {...form.field('crateIds')}
        label="Crates this signature covers"
        hint="Look at each before you tick it: the findings shown are those of the one on the page."
        inRow={false}
        options={waiting.map((crate) => ({
          value: crate.crateId,
          words: (
            <>
              <span className="crate">{crate.mark}</span>{' '}
              {crate.animals.map((animal) => animal.name).join(', ')}
              {crate.crateId === chosen.crateId && <span className="text-mute"> on this page</span>}
            </>
          ),
        }))}
      />
    </section>
  )
}
