import type { Metadata } from 'next'
import { notFound } from 'next/navigation'
import { GoNoGoSheet } from '@/components/sheets/go-no-go-sheet'
import { PrintButton } from '@/components/sheets/print-button'
import { ButtonLink } from '@/components/ui/button'
import { Page } from '@/components/ui/section'
import { requireActor } from '@/lib/auth/actor'
import { loadDeskPage } from '@/lib/domain/consignments/desk-page'
import { mayOpen } from '@/lib/policies/routes'
import { orNotFound } from '../../or-not-found'
import { rowId } from '../../row-id'

export const metadata: Metadata = { title: 'Go/no-go sheet' }
export const dynamic = 'force-dynamic'

export default async function SheetPage({ params }: { params: Promise<{ consignmentId: string }> }) {
  const id = rowId((await params).consignmentId)
  const actor = await requireActor(`/consignments/${id}/sheet`)
  if (!mayOpen(actor, '/consignments/[consignmentId]/sheet')) notFound()
  const { sheet, documents } = await orNotFound(loadDeskPage(actor, { consignmentId: id }, new Date()))
  const paper = documents.find(({ kind, state }) => kind === 'go_no_go' && state === 'current')
  return (
    <Page className="print:!p-0">
      <p className="no-print mx-auto mb-3 flex max-w-[820px] flex-wrap items-center gap-3">
        <ButtonLink href={`/consignments/${id}`}>Back to {sheet.mark}</ButtonLink>
        <PrintButton />
        {paper ? (
          <a className="link" href={`/api/documents/${paper.documentId}/pdf`}>
            The issued sheet, revision {paper.revision}, code {paper.code}, PDF
          </a>
        ) : (
          <span className="text-mute">No sealed sheet is issued yet: release makes one.</span>
        )}
      </p>
      <GoNoGoSheet view={sheet} />
    </Page>
  )
}
