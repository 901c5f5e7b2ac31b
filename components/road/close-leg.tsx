'use client'

import { Button } from '@/components/ui/button'
import { counted, localTime } from '@/lib/views/format'
import type { ChecklistLeg } from '@/lib/views/checklist'
import type { LegTally } from './item-states'

/** A leg closes when each item is ticked or marked not done with the reason. */
export function CloseLeg({
  leg,
  tally,
  locked,
  onClose,
}: {
  leg: ChecklistLeg
  tally: LegTally
  locked: string
  onClose: () => void
}) {
  if (tally.closed)
    return (
      <p className="no-print border-b-2 border-ink p-4 font-semibold text-hand">
        Leg {leg.ordinal} closed {localTime(tally.closed.atMs, leg.end.zone)}
      </p>
    )
  const open = `${counted(tally.open, 'item')} ${tally.open === 1 ? 'is' : 'are'} open`
  const refused = locked || (tally.open > 0 ? open : undefined)
  return (
    <div className="no-print border-b-2 border-ink p-4">
      <Button
        size="phone"
        className="min-h-15 w-full"
        refused={refused || undefined}
        onClick={onClose}
        aria-describedby="close-why"
      >
        Close leg {leg.ordinal}
      </Button>
      <p id="close-why" className="mt-2 text-small text-mute">
        {locked ? `${locked}. ` : tally.open > 0 ? `${open}. ` : ''}A leg closes when each item is ticked or
        marked not done with the reason. The desk sees both.
      </p>
    </div>
  )
}
