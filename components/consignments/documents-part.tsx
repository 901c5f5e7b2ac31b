import { DocumentDrawing } from '@/components/ui/document-state'
import type { DocumentLine } from '@/lib/views/desk-page'
import { counted, dayDate, localTime } from '@/lib/views/format'

const KIND_WORDS: Record<DocumentLine['kind'], string> = { go_no_go: 'Go/no-go sheet', manifest: 'Manifest' }
const STATE_WORDS: Record<DocumentLine['state'], string> = {
  current: 'current',
  superseded: 'superseded',
  void: 'void',
}

/** The papers issued, each with the drawn sheet of its state. */
export function DocumentsPart({ documents }: { documents: readonly DocumentLine[] }) {
  if (documents.length === 0) return <p className="text-mute">No paper was issued yet: release makes them.</p>
  return (
    <ul className="list-none border-y-2 border-ink bg-sheet">
      {documents.map((paper) => (
        <li
          key={paper.documentId}
          className="flex items-start gap-3 border-t border-hair px-2.5 py-2 first:border-t-0"
        >
          <DocumentDrawing state={paper.state} height={28} />
          <span>
            <a className="link font-semibold" href={`/api/documents/${paper.documentId}/pdf`}>
              {KIND_WORDS[paper.kind]}, revision {paper.revision}, PDF
            </a>
            , <b>{STATE_WORDS[paper.state]}</b>
            <span className="block text-small text-mute">
              Code {paper.code}, {counted(paper.pageCount, 'sheet')}, made{' '}
              {dayDate(paper.madeAt.ms, paper.madeAt.zone)} {localTime(paper.madeAt.ms, paper.madeAt.zone)}
              {paper.voidedReason && `. ${paper.voidedReason}`}
            </span>
          </span>
        </li>
      ))}
    </ul>
  )
}
