import type { ChecklistLeg } from '@/lib/views/checklist'

/** What to ring for, and what to keep in mind. */
export function EarlySigns({ leg }: { leg: ChecklistLeg }) {
  if (leg.signs.length + leg.cautions.length === 0) return null
  return (
    <section aria-labelledby="signs" className="border-t-2 border-ink bg-sheet px-4 pb-3.5 pt-3">
      <h2 id="signs" className="text-section">
        Early signs
      </h2>
      <p className="text-caption text-mute">Ring when you see one; don’t wait for a second.</p>
      <ul className="mt-1.5 list-none">
        {leg.signs.map((sign) => (
          <li
            key={`${sign.crateLetter}-${sign.text}`}
            className="grid grid-cols-[30px_1fr] border-t border-hair py-2"
          >
            <span className="crate text-section">{sign.crateLetter}</span>
            <span>{sign.text}</span>
          </li>
        ))}
        {leg.cautions.map((caution) => (
          <li key={caution} className="border-t border-hair py-2">
            {caution}
          </li>
        ))}
      </ul>
    </section>
  )
}
