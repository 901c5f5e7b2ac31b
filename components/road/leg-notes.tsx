import type { ChecklistLeg } from '@/lib/views/checklist'

/** What the plan says for when things go wrong on this leg: where one can still turn back, and who takes the animals in. */
export function LegNotes({ leg }: { leg: ChecklistLeg }) {
  if (leg.notes.length === 0) return null
  return (
    <section aria-labelledby="leg-notes" className="border-t-2 border-ink bg-sheet px-4 pb-3.5 pt-3">
      <h2 id="leg-notes" className="text-section">
        On this leg
      </h2>
      <dl className="mt-1.5">
        {leg.notes.map(({ head, text }) => (
          <div key={head} className="border-t border-hair py-2">
            <dt className="text-caption text-mute">{head}</dt>
            <dd className="m-0 [overflow-wrap:anywhere]">{text}</dd>
          </div>
        ))}
      </dl>
    </section>
  )
}
