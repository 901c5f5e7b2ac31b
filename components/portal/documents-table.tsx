import { DocumentDrawing } from '@/components/ui/document-state'
import { Cell, Head, Ledger, RowHead } from '@/components/ui/ledger'
import { Empty } from '@/components/ui/notice'
import { printedCode } from '@/lib/documents/code'
import { counted, dayTime } from '@/lib/views/format'
import type { PortalDocument } from '@/lib/views/portal'
import { PAPER_KIND_WORDS } from '@/lib/views/verification'

const STATE_WORDS: Record<PortalDocument['state'], string> = {
  current: 'Current',
  superseded: 'Superseded',
  void: 'Void',
}

/** Papers of a consignment with the drawn sheet of their state. */
export function DocumentsTable({ documents }: { documents: readonly PortalDocument[] }) {
  if (documents.length === 0)
    return <Empty>No paper is issued yet. The manifest comes with the release.</Empty>
  return (
    <Ledger caption="Papers, newest first" folds>
      <thead>
        <tr>
          <Head>Paper</Head>
          <Head>State</Head>
          <Head>Made, code</Head>
          <Head>PDF</Head>
        </tr>
      </thead>
      <tbody>
        {documents.map((document) => (
          <tr key={document.documentId}>
            <RowHead>
              <span className="block font-semibold">{PAPER_KIND_WORDS[document.kind]}</span>
              <span className="block text-small font-normal text-mute">
                {counted(document.sheets, 'sheet')}
              </span>
            </RowHead>
            <Cell label="State">
              <span className="flex items-center gap-2.5">
                <DocumentDrawing state={document.state} height={28} />
                <span>
                  {STATE_WORDS[document.state]}, revision {document.revision}
                </span>
              </span>
            </Cell>
            <Cell label="Made, code">
              <MadeAndCode document={document} />
            </Cell>
            <Cell label="PDF">
              <a
                href={`/api/documents/${document.documentId}/pdf`}
                className="link inline-flex items-center max-desk:min-h-11"
              >
                Download
                <span className="sr-only">
                  {' '}
                  {PAPER_KIND_WORDS[document.kind]}, revision {document.revision}, PDF
                </span>
              </a>
            </Cell>
          </tr>
        ))}
      </tbody>
    </Ledger>
  )
}

function MadeAndCode({ document }: { document: PortalDocument }) {
  return (
    <>
      <span className="block font-normal">{dayTime(document.made.ms, document.made.zone)}</span>
      <span className="fig block text-small font-normal text-mute">{printedCode(document.code)}</span>
    </>
  )
}
