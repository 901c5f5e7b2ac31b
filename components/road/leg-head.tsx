import { clock, dayDate, localTime, utcOffset, zoneName } from '@/lib/views/format'
import type { ChecklistLeg } from '@/lib/views/checklist'

/** The leg and its deadline: what has to happen by then, 44 px high, with the zone beside it. */
export function LegHead({ leg }: { leg: ChecklistLeg }) {
  const { start, end } = leg
  return (
    <>
      <div className="px-4 pb-3 pt-3.5">
        <h1 className="text-page">
          {leg.ordinal} {leg.title}
        </h1>
        <p>
          {dayDate(start.ms, start.zone)}, {localTime(start.ms, start.zone)} to {localTime(end.ms, end.zone)}
        </p>
        {leg.conditionWords && <p className="mt-1 text-small text-mute">{leg.conditionWords}</p>}
      </div>
      <div className="grid grid-cols-[1fr_auto] items-end gap-x-3 border-t-2 border-ink bg-sheet px-4 py-3">
        <p className="col-span-2 text-small">{leg.deadlineWords}</p>
        <p className="fig text-deadline font-semibold tracking-[-.02em]">{clock(end.ms, end.zone)}</p>
        <p className="text-right text-small">
          <b>{zoneName(end.ms, end.zone)}</b> ({utcOffset(end.ms, end.zone)})
          {leg.endElsewhere && (
            <span className="block">
              {localTime(leg.endElsewhere.ms, leg.endElsewhere.zone)} at the journey’s end
            </span>
          )}
          <span className="block">{leg.delayWorstMin} min late at most</span>
        </p>
      </div>
    </>
  )
}
