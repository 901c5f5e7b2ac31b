import type { Metadata } from 'next'
import { openPage } from '@/app/open-page'
import { ConsignmentsTable } from '@/components/portal/consignments-table'
import { Empty } from '@/components/ui/notice'
import { Page, PageTitle } from '@/components/ui/section'
import { FIRM_ZONE, firm } from '@/lib/domain/firm'
import { listOwnConsignments } from '@/lib/domain/portal/list'
import { dayDateYear, localTimeWithOffset } from '@/lib/views/format'

export const metadata: Metadata = { title: 'Your consignments' }
export const dynamic = 'force-dynamic'

export default async function PortalPage() {
  const actor = await openPage('/portal', '/portal')
  const nowMs = new Date().getTime()
  const rows = await listOwnConsignments(actor)
  return (
    <Page className="mx-auto max-w-[1232px]">
      <PageTitle words={`${dayDateYear(nowMs, FIRM_ZONE)}, ${localTimeWithOffset(nowMs, FIRM_ZONE)}`}>
        Your consignments
      </PageTitle>
      {rows.length === 0 ? (
        <Empty>
          No consignment of yours is kept here. Ring the desk for a journey: {firm().deskTelephone}.
        </Empty>
      ) : (
        <ConsignmentsTable rows={rows} />
      )}
      <p className="mt-3 max-w-[90ch] text-small text-mute">
        A decision aid. It takes the place of no veterinarian, no acceptance rule of a carrier and no law of
        the countries crossed. You see only your own account’s consignments.
      </p>
    </Page>
  )
}
