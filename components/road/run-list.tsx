import Link from 'next/link'
import { Mark } from '@/components/ui/mark'
import { Empty } from '@/components/ui/notice'
import { Stamp } from '@/components/ui/stamp'
import { STATE_WORDS } from '@/lib/states/consignment'
import { dayTime } from '@/lib/views/format'
import type { RunRow } from '@/lib/views/checklist'

/** A driver's own runs in order of leaving, as wide targets for a thumb. */
export function RunList({ runs }: { runs: readonly RunRow[] }) {
  if (runs.length === 0)
    return <Empty>No run names you. A run appears here once its consignment is released.</Empty>
  return (
    <ul className="list-none divide-y divide-rule border-y-2 border-ink bg-sheet">
      {runs.map((run) => (
        <li key={run.consignmentId}>
          <Link
            href={`/runs/${run.consignmentId}`}
            className="block px-4 py-3 text-ink no-underline hover:bg-handwash"
          >
            <span className="flex items-baseline justify-between gap-3">
              <Mark size="phone">{run.mark}</Mark>
              <span className="text-small">
                {STATE_WORDS[run.state]}, revision {run.revision}
              </span>
            </span>
            <span className="mt-1 block font-semibold">
              {run.from} to {run.to}
            </span>
            <span className="block text-small text-mute">{run.animals}</span>
            <span className="mt-1.5 block">
              <Stamp {...run.stamp} size="s" />
            </span>
            <span className="mt-1.5 block">
              {run.legs.map((leg) => (
                <span key={leg.ordinal} className="grid grid-cols-[26px_1fr] py-0.5">
                  <b className="font-head font-bold">{leg.ordinal}</b>
                  <span className={leg.closed ? 'text-mute' : undefined}>
                    {leg.title}
                    <span className="block text-small text-mute">
                      {leg.closed ? 'closed' : dayTime(leg.start.ms, leg.start.zone)}
                    </span>
                  </span>
                </span>
              ))}
            </span>
            <span className="mt-1.5 block font-semibold text-hand underline decoration-1 underline-offset-2">
              Open the checklist
            </span>
          </Link>
        </li>
      ))}
    </ul>
  )
}
