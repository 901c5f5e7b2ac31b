import { clock } from '@/lib/views/format'
import type { ChecklistLeg, EntryView } from '@/lib/views/checklist'
import { legTally } from './item-states'

/** The driver's own legs, and no others, as cells one presses. */
export function OwnLegs({
  legs,
  entries,
  chosenId,
  onChoose,
}: {
  legs: readonly ChecklistLeg[]
  entries: readonly EntryView[]
  chosenId: string
  onChoose: (legId: string) => void
}) {
  return (
    <nav
      aria-label="Your legs"
      className="no-print grid auto-cols-fr grid-flow-col overflow-x-auto border-b-2 border-ink bg-sheet"
    >
      {legs.map((leg) => {
        const { closed } = legTally(leg.items, entries, leg.legId)
        return (
          <button
            key={leg.legId}
            type="button"
            aria-current={leg.legId === chosenId ? 'step' : undefined}
            onClick={() => onChoose(leg.legId)}
            className="min-h-14 min-w-[104px] cursor-pointer border-l border-rule px-3 py-1 text-left text-ink first:border-l-0 first:pl-4 aria-[current]:bg-handwash aria-[current]:shadow-[inset_0_-6px_0_var(--hand)]"
          >
            <span className="block truncate">
              <b className="mr-1 font-head font-bold">{leg.ordinal}</b>
              {leg.title.split(',')[0]}
            </span>
            <span className="block text-caption text-mute">
              {closed ? 'closed' : `until ${clock(leg.end.ms, leg.end.zone)}`}
            </span>
          </button>
        )
      })}
    </nav>
  )
}
