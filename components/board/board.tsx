'use client'

import { Button, ButtonLink, Key } from '@/components/ui/button'
import { Waiting } from '@/components/ui/holes'
import { Empty, Notice } from '@/components/ui/notice'
import { PageTitle } from '@/components/ui/section'
import { Paging } from '@/components/ui/tabs'
import type { AttentionLine, BoardView } from '@/lib/views/board'
import { counted, dayDateYear, localTimeWithOffset } from '@/lib/views/format'
import { AttentionLines } from './attention-lines'
import { asked, earlierPage, isNarrowed, laterPage } from './board-address'
import { BoardFilters } from './board-filters'
import { BoardList } from './board-list'
import { BoardTable } from './board-table'
import { PatternKey } from './board-strip'
import { useBoard } from './use-board'

/** The dispatcher's board: what waits for a decision, then every consignment the reader may see. */
export function Board({
  first,
  attention,
  mayCreate,
  zone,
}: {
  first: { search: string; view: BoardView }
  attention: readonly AttentionLine[]
  mayCreate: boolean
  zone: string
}) {
  const { address, view, waiting, failed, again, go } = useBoard(first)
  const { query } = address
  const nowMs = view?.readMs ?? first.view.readMs
  const ask = (change: Parameters<typeof asked>[1], how?: 'push' | 'replace') =>
    go(asked(address, change), how)
  return (
    <>
      <PageTitle
        words={`${dayDateYear(nowMs, zone)}, ${localTimeWithOffset(nowMs, zone)}`}
        acts={
          mayCreate && (
            <ButtonLink first href="/consignments/new">
              New consignment
            </ButtonLink>
          )
        }
      >
        Consignments
      </PageTitle>
      <AttentionLines lines={attention} nowMs={nowMs} />
      <BoardFilters query={query} counts={view?.counts ?? {}} onAsk={ask} />
      {failed && (
        <Notice
          role="alert"
          title="The board could not be read again"
          acts={<Button onClick={again}>Read again</Button>}
        >
          <p>{view ? 'The rows below are the last ones read.' : 'Nothing can be shown until it answers.'}</p>
        </Notice>
      )}
      {view === undefined ? (
        !failed && <Waiting rows={6}>Reading the board.</Waiting>
      ) : view.rows.length === 0 ? (
        <NoRows
          narrowed={isNarrowed(query)}
          mayCreate={mayCreate}
          onClear={() => ask({ find: '', state: [], verdict: [], holder: null, leavesFrom: null })}
        />
      ) : (
        <>
          <BoardTable
            view={view}
            query={query}
            zone={zone}
            stale={waiting}
            onSort={(sort, descending) => ask({ sort, descending })}
          />
          <BoardList view={view} />
          <BoardPaging view={view} address={address} onGo={go} />
          <BoardFoot />
        </>
      )}
    </>
  )
}

function BoardPaging({
  view,
  address,
  onGo,
}: {
  view: BoardView
  address: Parameters<typeof earlierPage>[0]
  onGo: (next: Parameters<typeof earlierPage>[0]) => void
}) {
  const earlier = earlierPage(address)
  const { after } = view
  const marks = [view.rows[0]?.mark, view.rows.at(-1)?.mark].filter(Boolean)
  const words = `${counted(view.rows.length, 'consignment')}, ${marks.join(' to ')}`
  return (
    <Paging
      words={words}
      before={earlier && <Button onClick={() => onGo(earlier)}>Earlier</Button>}
      after={
        after !== null && (
          <Button onClick={() => onGo(laterPage(address, after))}>Later, after {marks.at(-1)}</Button>
        )
      }
    />
  )
}

function NoRows({
  narrowed,
  mayCreate,
  onClear,
}: {
  narrowed: boolean
  mayCreate: boolean
  onClear: () => void
}) {
  if (narrowed) {
    return <Empty act={<Button onClick={onClear}>Show all open</Button>}>No consignment is like that.</Empty>
  }
  return (
    <Empty
      act={
        mayCreate && (
          <ButtonLink first href="/consignments/new">
            New consignment
          </ButtonLink>
        )
      }
    >
      No consignment is open.
    </Empty>
  )
}

function BoardFoot() {
  return (
    <div className="mt-2.5 flex flex-wrap justify-between gap-x-6 gap-y-2 text-small text-mute max-desk:hidden">
      <p className="flex flex-wrap gap-x-4">
        <span>
          <Key>Up</Key> <Key>Down</Key> next, previous
        </span>
        <span>
          <Key>Enter</Key> open
        </span>
        <span>
          <Key>Home</Key> <Key>End</Key> first, last
        </span>
      </p>
      <PatternKey />
    </div>
  )
}
