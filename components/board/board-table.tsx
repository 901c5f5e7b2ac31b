'use client'

import { createColumnHelper, flexRender, getCoreRowModel, useReactTable } from '@tanstack/react-table'
import type { Row as TableRow } from '@tanstack/react-table'
import { useRouter } from 'next/navigation'
import { Fragment, useMemo, useRef, useState } from 'react'
import { Cell, GroupRow, Head, Ledger, Row } from '@/components/ui/ledger'
import { join } from '@/components/ui/join'
import type { BoardQuery } from '@/lib/schemas/board'
import type { BoardView } from '@/lib/views/board'
import type { ConsignmentRow } from '@/lib/views/consignment-row'
import { BoardStripCell, BoardStripHead } from './board-strip'
import { groupsOf } from './board-words'
import {
  JourneyCell,
  LeavesCell,
  MarginCell,
  MarkCell,
  SignedCell,
  StampCell,
  StateCell,
  rowHref,
} from './row-cells'
import { useRowKeys } from './use-row-keys'

const column = createColumnHelper<ConsignmentRow>()

/** Columns that fold away as the page narrows (lib/tokens.ts, SCREENS). */
const NARROWING: Record<string, string> = {
  strip: 'max-board:hidden',
  signed: 'max-wide:hidden',
}

/** The board as a ledger: rows walked with the arrow keys, ordered by the server, cut into when they leave. */
export function BoardTable({
  view,
  query,
  zone,
  stale,
  onSort,
}: {
  view: BoardView
  query: BoardQuery
  zone: string
  /** Old rows shown while new ones are read. */
  stale: boolean
  onSort: (sort: BoardQuery['sort'], descending: boolean) => void
}) {
  const router = useRouter()
  const [chosen, setChosen] = useState(0)
  const body = useRef<HTMLTableElement>(null)
  const strips = useMemo(
    () => new Map(view.strips.map((strip) => [strip.consignmentId, strip.legs])),
    [view.strips],
  )
  const columns = useMemo(
    () => [
      column.display({ id: 'mark', header: 'Mark', cell: ({ row }) => <MarkCell row={row.original} /> }),
      column.display({
        id: 'journey',
        header: 'Consignment',
        cell: ({ row }) => <JourneyCell row={row.original} />,
      }),
      column.display({
        id: 'departure',
        header: 'Leaves',
        cell: ({ row }) => <LeavesCell row={row.original} />,
      }),
      column.display({
        id: 'strip',
        header: () => <BoardStripHead view={view} zone={zone} />,
        cell: ({ row }) => (
          <BoardStripCell
            row={row.original}
            legs={strips.get(row.original.id) ?? []}
            view={view}
            zone={zone}
          />
        ),
      }),
      column.display({
        id: 'margin',
        header: 'Narrowest margin',
        cell: ({ row }) => <MarginCell row={row.original} />,
      }),
      column.display({
        id: 'verdict',
        header: 'Verdict',
        cell: ({ row }) => <StampCell row={row.original} />,
      }),
      column.display({ id: 'state', header: 'State', cell: ({ row }) => <StateCell row={row.original} /> }),
      column.display({
        id: 'signed',
        header: 'Signed',
        cell: ({ row }) => <SignedCell row={row.original} />,
      }),
    ],
    [strips, view, zone],
  )
  // eslint-disable-next-line react-hooks/incompatible-library -- the table's functions are called in this render only
  const table = useReactTable({
    data: view.rows,
    columns,
    getCoreRowModel: getCoreRowModel(),
    getRowId: (row) => String(row.id),
    manualSorting: true,
    manualFiltering: true,
    manualPagination: true,
  })
  const rows = table.getRowModel().rows
  const keys = useRowKeys({
    many: rows.length,
    chosen: Math.min(chosen, rows.length - 1),
    onChoose: (index) => {
      setChosen(index)
      body.current?.querySelectorAll<HTMLElement>('tr[data-row]')[index]?.focus()
    },
    onOpen: (index) => {
      const row = rows[index]
      if (row) router.push(rowHref(row.original))
    },
  })
  const byId = new Map(rows.map((row, index) => [row.original.id, { row, index }]))
  const groups =
    query.sort === 'departure' ? groupsOf(view.rows, view.readMs, zone) : [{ words: '', rows: view.rows }]
  return (
    <div
      className={join('max-desk:hidden', stale && 'opacity-60')}
      ref={body as never}
      onKeyDown={keys.onKeyDown}
    >
      <Ledger
        caption="Consignments. Arrow keys walk the rows, Enter opens, Home and End jump."
        aria-busy={stale || undefined}
      >
        <thead>
          <tr>
            {table.getFlatHeaders().map((header) => (
              <Head
                key={header.id}
                aria-sort={ariaSort(header.id, query)}
                className={join(NARROWING[header.id], 'sticky top-0')}
              >
                <SortableHead id={header.id} query={query} onSort={onSort}>
                  {flexRender(header.column.columnDef.header, header.getContext())}
                </SortableHead>
              </Head>
            ))}
          </tr>
        </thead>
        <tbody>
          {groups.map((group, place) => (
            <Fragment key={`${group.words} ${place}`}>
              {group.words !== '' && (
                <GroupRow columns={columns.length}>
                  {group.words}, {group.rows.length}
                </GroupRow>
              )}
              {group.rows.map(({ id }) => {
                const known = byId.get(id)
                return (
                  known && <BoardRow key={id} {...known} chosen={known.index === keys.chosen} keys={keys} />
                )
              })}
            </Fragment>
          ))}
        </tbody>
      </Ledger>
    </div>
  )
}

function BoardRow({
  row,
  index,
  chosen,
  keys,
}: {
  row: TableRow<ConsignmentRow>
  index: number
  chosen: boolean
  keys: ReturnType<typeof useRowKeys>
}) {
  return (
    <Row
      data-row
      chosen={chosen}
      tabIndex={chosen ? 0 : -1}
      aria-label={`Consignment ${row.original.mark}`}
      onFocus={() => keys.focused(index)}
      onClick={() => keys.open(index)}
      className="h-12 cursor-pointer -outline-offset-2"
    >
      {row.getVisibleCells().map((cell) => (
        <Cell
          key={cell.id}
          className={join(
            '!py-1',
            NARROWING[cell.column.id],
            cell.column.id === 'strip' && 'overflow-hidden !p-0',
          )}
        >
          {flexRender(cell.column.columnDef.cell, cell.getContext())}
        </Cell>
      ))}
    </Row>
  )
}

const SORTS: Record<string, BoardQuery['sort']> = { mark: 'mark', departure: 'departure', margin: 'margin' }

/** A head that orders the board says so in words. */
function SortableHead({
  id,
  query,
  onSort,
  children,
}: {
  id: string
  query: BoardQuery
  onSort: (sort: BoardQuery['sort'], descending: boolean) => void
  children: React.ReactNode
}) {
  const sort = SORTS[id]
  if (sort === undefined) return children
  const current = query.sort === sort
  return (
    <button
      type="button"
      className="cursor-pointer text-left font-semibold text-hand underline underline-offset-2"
      onClick={() => onSort(sort, current && !query.descending)}
    >
      {children}
      {current && (
        <span className="block font-normal text-mute no-underline">
          {query.descending ? LAST[sort] : FIRST[sort]}
        </span>
      )}
    </button>
  )
}

const FIRST: Record<BoardQuery['sort'], string> = {
  departure: 'soonest first',
  updated: 'oldest change first',
  margin: 'narrowest first',
  mark: 'lowest first',
}
const LAST: Record<BoardQuery['sort'], string> = {
  departure: 'latest first',
  updated: 'newest change first',
  margin: 'widest first',
  mark: 'highest first',
}

function ariaSort(id: string, query: BoardQuery): 'ascending' | 'descending' | undefined {
  if (SORTS[id] !== query.sort) return undefined
  return query.descending ? 'descending' : 'ascending'
}
