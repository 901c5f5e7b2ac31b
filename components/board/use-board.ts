'use client'

import { keepPreviousData, useQuery } from '@tanstack/react-query'
import { useSearchParams } from 'next/navigation'
import { useMemo, useState } from 'react'
import type { BoardView } from '@/lib/views/board'
import { boardAddressOf, boardSearch } from './board-address'
import type { BoardAddress } from './board-address'

/**
 * The board of the address bar. The server sends the first rows with the page; after that the handler is asked, and old
 * rows stay in place until new ones come.
 */
export function useBoard(first: { search: string; view: BoardView }) {
  const params = useSearchParams()
  const inUrl = boardSearch(boardAddressOf(new URLSearchParams(params)))
  // Next hands a new address over in its own time; a tick must show at once, so what was asked last leads until then.
  const [known, setKnown] = useState({ inUrl, asked: inUrl })
  if (known.inUrl !== inUrl) setKnown({ inUrl, asked: inUrl })
  const search = known.asked
  const address = useMemo(() => boardAddressOf(new URLSearchParams(search)), [search])
  const query = useQuery({
    queryKey: ['consignments', search],
    queryFn: ({ signal }) => readBoard(search, signal),
    initialData: search === first.search ? first.view : undefined,
    initialDataUpdatedAt: first.view.readMs,
    placeholderData: keepPreviousData,
    refetchInterval: 30_000,
  })
  return {
    address,
    view: query.data,
    waiting: query.isPlaceholderData || query.isPending,
    failed: query.isError,
    again: () => void query.refetch(),
    go: (next: BoardAddress, how: 'push' | 'replace' = 'push') => {
      const text = boardSearch(next)
      const href = text === '' ? '/consignments' : `/consignments?${text}`
      setKnown((before) => ({ ...before, asked: text }))
      // The handler answers the rows, so the address alone moves on: a tick shows at once and no page is drawn anew.
      window.history[how === 'push' ? 'pushState' : 'replaceState'](null, '', href)
    },
  }
}

async function readBoard(search: string, signal: AbortSignal): Promise<BoardView> {
  const answer = await fetch(`/api/consignments?${search}`, {
    signal,
    headers: { accept: 'application/json' },
  })
  if (!answer.ok) throw new Error(`The board answered ${answer.status}.`)
  return (await answer.json()) as BoardView
}
