import type { ReactNode } from 'react'
import { DocumentState } from '@/components/ui/document-state'
import { PAPER_KIND_WORDS } from '@/lib/views/verification'
import type { VerificationView } from '@/lib/views/verification'
import { counted } from '@/lib/views/format'
import { fullTime, paperStateWords } from './paper-state-words'

/** What became of one check: the drawn sheet, a sentence, and the few facts that let an altered print be seen. */
export function VerificationResult({ view }: { view: VerificationView }) {
  const words = paperStateWords(view)
  return (
    <section aria-label="Result" role="status">
      <DocumentState state={view.state}>
        <p className="mt-1 text-long">{words.fact}</p>
        <p className="mt-1 font-semibold">{words.act}</p>
        <p className="mt-1.5 text-mute">
          Checked {fullTime(view.checked)}. It can change at any minute: check again at each handover.
        </p>
      </DocumentState>
      <dl className="mt-4 divide-y divide-hair border-y-2 border-ink">
        {view.code && (
          <Row name="Code">
            <span className="fig">{view.code}</span>
          </Row>
        )}
        {view.paper && <PaperRows view={view} />}
        {!view.paper && <Row name="Kind of paper">Nothing is known of it here</Row>}
      </dl>
      <p className="mt-4">
        <b>This is not a verdict.</b> The page says whether the paper is the one we issued. Whether the
        animals may go, and on what conditions, stands on the paper itself.
      </p>
    </section>
  )
}

function PaperRows({ view: { paper, state, by } }: { view: VerificationView }) {
  if (!paper) return null
  return (
    <>
      <Row name="Kind of paper">
        {PAPER_KIND_WORDS[paper.kind]}, {counted(paper.sheets, 'sheet')}
      </Row>
      <Row name="Revision">
        {paper.revision} of {Math.max(paper.revision, paper.latestRevision)}
      </Row>
      <Row name="Issued">{fullTime(paper.made)}</Row>
      <Row name="File">
        {by === 'code'
          ? 'Not looked at: only the code was given. Choose the PDF to compare every byte.'
          : state === 'not-as-issued'
            ? 'Compared: its bytes differ from the file we issued'
            : 'Compared: every byte is as we issued it'}
      </Row>
      <Row name="Plan hash begins">
        <span className="fig">{inHalves(paper.planHashStart)}</span>
      </Row>
    </>
  )
}

function Row({ name, children }: { name: string; children: ReactNode }) {
  return (
    <div className="grid grid-cols-[112px_1fr] gap-x-3 py-2 desk:grid-cols-[150px_1fr]">
      <dt className="text-mute">{name}</dt>
      <dd className="m-0 break-words">{children}</dd>
    </div>
  )
}

/** "d14f40e1 84ec6eab": two groups of eight are compared by eye without losing the place. */
function inHalves(start: string): string {
  return `${start.slice(0, 8)} ${start.slice(8)}`
}
