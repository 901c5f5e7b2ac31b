import { randomUUID } from 'node:crypto'
import type { Metadata } from 'next'
import Link from 'next/link'
import { openPage, orNotFound, rowIdOf } from '@/app/open-page'
import { Acknowledge } from '@/components/portal/acknowledge'
import { AskChange } from '@/components/portal/ask-change'
import { ConsignmentSheet } from '@/components/portal/consignment-sheet'
import { DocumentsTable } from '@/components/portal/documents-table'
import { RingDesk } from '@/components/portal/ring-desk'
import { Strip } from '@/components/portal/strip'
import { WaitingConsignment } from '@/components/portal/waiting-consignment'
import { buttonClass } from '@/components/ui/button'
import { Page, PageTitle, Section, Sheet } from '@/components/ui/section'
import { firm } from '@/lib/domain/firm'
import { loadOwnConsignment } from '@/lib/domain/portal/load'
import { clock, zoneName } from '@/lib/views/format'
import { acknowledge, askForChange } from '../actions'

export const metadata: Metadata = { title: 'Your consignment' }
export const dynamic = 'force-dynamic'

export default async function OwnConsignmentPage({ params }: { params: Promise<{ consignmentId: string }> }) {
  const consignmentId = rowIdOf((await params).consignmentId)
  const actor = await openPage('/portal/[consignmentId]', `/portal/${consignmentId}`)
  const { row, view } = await orNotFound(loadOwnConsignment(actor, { consignmentId }, new Date()))
  const desk = firm()
  const asked = view?.acknowledgement ?? null
  return (
    <Page className="mx-auto max-w-[1232px]">
      <PageTitle acts={<Link href="/portal">All your consignments</Link>}>Your consignment</PageTitle>
      <div className="grid items-start gap-6 desk:grid-cols-[minmax(0,1fr)_minmax(16rem,376px)] print:block!">
        <div className="min-w-0">
          {view ? (
            <ConsignmentSheet
              view={view}
              strip={<Strip legs={view.legs} leaves={view.leaves} />}
              jump={
                asked && !asked.done ? (
                  <a
                    href="#acknowledge"
                    className={`${buttonClass({ first: true, size: 'phone' })} mt-3 w-full desk:hidden`}
                  >
                    Acknowledge by {clock(asked.by.ms, asked.by.zone)} {zoneName(asked.by.ms, asked.by.zone)}
                  </a>
                ) : undefined
              }
            />
          ) : (
            <WaitingConsignment row={row} />
          )}
          {view && (
            <Section
              id="documents"
              title={`Documents of ${view.mark}`}
              words="the PDF counts, not this page"
              acts={<Link href="/verify">Check a paper</Link>}
            >
              <DocumentsTable documents={view.documents} />
            </Section>
          )}
        </div>
        <Sheet className="no-print">
          {asked && <Acknowledge asked={asked} action={acknowledge} requestId={randomUUID()} />}
          <AskChange
            consignmentId={consignmentId}
            action={askForChange}
            requestId={randomUUID()}
            requests={view?.requests ?? []}
          />
          <RingDesk name={desk.name} telephone={desk.deskTelephone} hours={desk.deskHours} />
        </Sheet>
      </div>
    </Page>
  )
}
