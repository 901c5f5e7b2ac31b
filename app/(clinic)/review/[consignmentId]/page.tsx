import { randomUUID } from 'node:crypto'
import type { Metadata } from 'next'
import Link from 'next/link'
import { openPage, orNotFound, queryText, rowIdOf } from '@/app/open-page'
import { leavesIn } from '@/components/review/leaves-in'
import { LiveQueue } from '@/components/review/live-queue'
import { ReviewDesk } from '@/components/review/review-desk'
import { ReviewHead } from '@/components/review/review-head'
import { ReviewPictures } from '@/components/review/review-pictures'
import { SignedPart, VoidedNotice } from '@/components/review/signed-part'
import { WhatVoids } from '@/components/review/what-voids'
import { Page, PageTitle } from '@/components/ui/section'
import { loadReview } from '@/lib/domain/approvals/load-review'
import { reviewQueue } from '@/lib/domain/approvals/queue'
import { FIRM_ZONE } from '@/lib/domain/firm'
import { dayDateYear, localTimeWithOffset } from '@/lib/views/format'
import { approve, sendBack, withdraw } from '../actions'

export const metadata: Metadata = { title: 'Crate set-up' }
export const dynamic = 'force-dynamic'

export default async function ReviewPage({
  params,
  searchParams,
}: {
  params: Promise<{ consignmentId: string }>
  searchParams: Promise<{ crate?: string | string[] }>
}) {
  const consignmentId = rowIdOf((await params).consignmentId)
  const actor = await openPage('/review/[consignmentId]', `/review/${consignmentId}`)
  const crate = queryText((await searchParams).crate)
  const now = new Date()
  const nowMs = now.getTime()
  const view = await orNotFound(
    loadReview(actor, { consignmentId, crateId: crate === '' ? null : crate }, now),
  )
  const rows = await reviewQueue(actor)
  const { sheet, chosen } = view
  return (
    <Page>
      <PageTitle
        words={`${dayDateYear(nowMs, FIRM_ZONE)}, ${localTimeWithOffset(nowMs, FIRM_ZONE)}. Leaves ${leavesIn(sheet.leaves.ms, nowMs)}.`}
        acts={<Link href={`/consignments/${consignmentId}`}>Whole assessment of {sheet.mark}</Link>}
      >
        Crate set-up review
      </PageTitle>
      <VoidedNotice view={view} />
      <div className="grid items-start gap-6 board:grid-cols-[212px_minmax(0,1fr)]">
        <div className="max-board:order-last">
          <LiveQueue first={{ rows, nowMs }} chosen={{ consignmentId, crateId: chosen.crateId }} />
        </div>
        <div className="min-w-0">
          <ReviewHead view={view} />
          {/* A new plan, or another crate, is another form: nothing typed for the one may be signed for the other. */}
          <ReviewDesk
            key={`${sheet.planHash}-${sheet.inputHash}-${chosen.crateId}-${view.signed.length}`}
            view={view}
            pictures={<ReviewPictures crate={chosen} sheet={sheet} />}
            requestId={randomUUID()}
            actions={{ approve, sendBack }}
          />
          <SignedPart
            view={view}
            withdraw={withdraw}
            requestIds={Object.fromEntries(view.signed.map((one) => [one.approvalId, randomUUID()]))}
          />
          <WhatVoids />
        </div>
      </div>
    </Page>
  )
}
