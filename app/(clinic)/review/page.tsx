import type { Metadata } from 'next'
import { openPage } from '@/app/open-page'
import { LiveQueue } from '@/components/review/live-queue'
import { Page, PageTitle } from '@/components/ui/section'
import { reviewQueue } from '@/lib/domain/approvals/queue'
import { FIRM_ZONE } from '@/lib/domain/firm'
import { dayDateYear, localTimeWithOffset } from '@/lib/views/format'

export const metadata: Metadata = { title: 'Crate set-ups' }
export const dynamic = 'force-dynamic'

export default async function ReviewQueuePage() {
  const actor = await openPage('/review', '/review')
  const now = new Date()
  const rows = await reviewQueue(actor)
  return (
    <Page>
      <PageTitle
        words={`${dayDateYear(now.getTime(), FIRM_ZONE)}, ${localTimeWithOffset(now.getTime(), FIRM_ZONE)}`}
      >
        Crate set-up review
      </PageTitle>
      <div className="max-w-[560px]">
        <LiveQueue first={{ rows, nowMs: now.getTime() }} chosen={null} />
      </div>
    </Page>
  )
}
