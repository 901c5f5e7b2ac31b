import Link from 'next/link'
import { Mark } from '@/components/ui/mark'
import { STATE_WORDS } from '@/lib/states/consignment'
import type { BoardView } from '@/lib/views/board'
import { HOLDER_WORDS } from './board-words'
import { JourneyCell, LeavesCell, MarginCell, StampCell, rowHref } from './row-cells'

/** The board under 760 px: mark and verdict, then the journey, its hour and its margin; the whole of it one link. */
export function BoardList({ view }: { view: BoardView }) {
  return (
    <ul className="list-none border-y-2 border-ink bg-sheet desk:hidden">
      {view.rows.map((row) => (
        <li key={row.id} className="border-t border-rule first:border-t-0">
          <Link href={rowHref(row)} className="block px-3 py-2.5 text-ink no-underline">
            <span className="flex flex-wrap items-center justify-between gap-x-3 gap-y-1">
              <Mark label="Consignment">{row.mark}</Mark>
              <StampCell row={row} />
            </span>
            <span className="my-1 block">
              <JourneyCell row={row} />
            </span>
            <span className="flex flex-wrap items-start justify-between gap-x-4 gap-y-1">
              <LeavesCell row={row} />
              {row.verdict === null ? null : <MarginCell row={row} />}
            </span>
            <span className="block text-small text-mute">
              {STATE_WORDS[row.state]}, revision {row.revision}. {HOLDER_WORDS[row.holder]}
            </span>
          </Link>
        </li>
      ))}
    </ul>
  )
}
