import type { Metadata } from 'next'
import { notFound } from 'next/navigation'
import { boardAddressOf, boardSearch } from '@/components/board/board-address'
import { Board } from '@/components/board/board'
import { Page } from '@/components/ui/section'
import { requireActor } from '@/lib/auth/actor'
import { attentionLines } from '@/lib/domain/consignments/attention'
import { FIRM_ZONE } from '@/lib/domain/firm'
import { can } from '@/lib/policies/can'
import { mayOpen } from '@/lib/policies/routes'
import { readBoard } from './read-board'

export const metadata: Metadata = { title: 'Consignments' }
export const dynamic = 'force-dynamic'

export default async function ConsignmentsPage({
  searchParams,
}: {
  searchParams: Promise<Record<string, string | string[] | undefined>>
}) {
  const actor = await requireActor('/consignments')
  if (!mayOpen(actor, '/consignments')) notFound()
  const address = boardAddressOf(toSearch(await searchParams))
  const now = new Date()
  const view = await readBoard(actor, address.query, now)
  const attention = await attentionLines(actor, now)
  return (
    <Page>
      <Board
        first={{ search: boardSearch(address), view }}
        attention={attention}
        mayCreate={can(actor, 'consignment.create')}
        zone={FIRM_ZONE}
      />
    </Page>
  )
}

function toSearch(params: Record<string, string | string[] | undefined>): URLSearchParams {
  const search = new URLSearchParams()
  for (const [name, value] of Object.entries(params)) {
    for (const one of [value ?? []].flat()) search.append(name, one)
  }
  return search
}
