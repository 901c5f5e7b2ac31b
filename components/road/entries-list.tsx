'use client'

import { Hole } from '@/components/ui/holes'
import { useUnit } from '@/components/ui/preferences'
import { clock } from '@/lib/views/format'
import type { ChecklistLeg, ChecklistView } from '@/lib/views/checklist'
import { entryWords } from './entry-words'
import type { Entries } from './use-entries'

/** What was entered on this leg: a filled hole is with the server, an open one still on the phone. */
export function EntriesList({
  entries,
  leg,
  view,
}: {
  entries: Entries
  leg: ChecklistLeg
  view: ChecklistView
}) {
  const unit = useUnit()
  const kept = new Set(entries.kept.map(({ entry }) => entry.clientId))
  const own = entries.all.filter((entry) => entry.legId === leg.legId)
  const refused = entries.kept.filter(({ entry, refused }) => refused !== '' && entry.legId === leg.legId)
  const itemNumber = new Map(leg.items.map((item) => [item.key, item.number]))
  return (
    <section aria-labelledby="entries" className="no-print border-t-2 border-ink px-4 pb-5 pt-3.5">
      <h2 id="entries" className="text-section">
        Your entries on this leg
      </h2>
      {own.length === 0 && refused.length === 0 && <p className="mt-1 text-small text-mute">None yet.</p>}
      <ul className="mt-1 list-none">
        {own.map((entry) => {
          const number = itemNumber.get(entry.itemKey)
          return (
            <li
              key={entry.clientId}
              className="grid grid-cols-[24px_1fr_auto] items-baseline border-t border-hair py-1.5 text-small"
            >
              <Hole state={kept.has(entry.clientId) ? 'open' : 'filled'} />
              <span>
                {number !== undefined && `${number} `}
                {entryWords(entry, view.crates, unit)}
              </span>
              <span className="whitespace-nowrap pl-2 text-mute">
                {clock(entry.atMs, leg.end.zone)}, {kept.has(entry.clientId) ? 'kept' : 'sent'}
              </span>
            </li>
          )
        })}
        {refused.map(({ entry, refused: why }) => (
          <li
            key={entry.clientId}
            className="grid grid-cols-[24px_1fr] items-baseline border-t border-hair py-1.5 text-small"
          >
            <Hole state="struck" />
            <span>
              {entryWords(entry, view.crates, unit)}
              <span className="dbl mt-1 block pl-2 font-semibold">Not taken: {why}</span>
              <button type="button" className="link min-h-11" onClick={() => entries.drop(entry.clientId)}>
                Take it off this phone
              </button>
            </span>
          </li>
        ))}
      </ul>
    </section>
  )
}
