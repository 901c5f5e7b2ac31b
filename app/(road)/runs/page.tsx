import type { Metadata } from 'next'
import { openPage } from '@/app/open-page'
import { RunList } from '@/components/road/run-list'
import { Page, PageTitle } from '@/components/ui/section'
import { FIRM_ZONE } from '@/lib/domain/firm'
import { listRuns } from '@/lib/domain/runs/list'
import { dayDateYear, localTimeWithOffset } from '@/lib/views/format'

export const metadata: Metadata = { title: 'Your runs' }
export const dynamic = 'force-dynamic'

export default async function RunsPage() {
  const actor = await openPage('/runs', '/runs')
  const now = new Date()
  const runs = await listRuns(actor, now)
  return (
    <Page className="mx-auto max-w-[430px]">
      <PageTitle
        words={`${dayDateYear(now.getTime(), FIRM_ZONE)}, ${localTimeWithOffset(now.getTime(), FIRM_ZONE)}`}
      >
        Your runs
      </PageTitle>
      <RunList runs={runs} />
    </Page>
  )
}
