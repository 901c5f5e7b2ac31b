import Link from 'next/link'
import { Mark } from '@/components/ui/mark'
import type { BoardView } from '@/lib/views/board'
import { JourneyCell, LeavesCell, MarginCell, StampCell, StateCell, rowHref } from './row-cells'

/** The board under 760 px: a row of two lines a consignment, the whole of it one link. */
export function BoardList({ view }: { view: BoardView }) {
  return (
    <ul className="list-none border-y-2 border-ink bg-sheet desk:hidden">
      {view.rows.map((row) => (
        <li key={row.id} className="border-t border-hair first:border-t-0">
          <Link
            href={rowHref(row)}
            className="grid grid-cols-[4.75rem_1fr] gap-x-3 px-3 py-2.5 text-ink no-underline"
          >
            <Mark label="Consignment">{row.mark}</Mark>
            <span className="min-w-0">
              <JourneyCell row={row} />
            </span>
            <span className="text-small">
              <LeavesCell row={row} />
            </span>
            <span className="flex min-w-0 flex-wrap items-center gap-x-3 gap-y-1 pt-1">
              <StampCell row={row} />
              {row.verdict !== null && <MarginCell row={row} />}
              <StateCell row={row} />
            </span>
          </Link>
        </li>
      ))}
    </ul>
  )
}
