import { Cell, Head, Ledger, Lines, RowHead } from '@/components/ui/ledger'
import type { ApprovalLine } from '@/lib/views/desk-page'
import { dayDate, localTime } from '@/lib/views/format'
import type { Moment } from '@/lib/views/sheet'

const DECISION_WORDS: Record<ApprovalLine['decision'], string> = {
  approved: 'Approved',
  approved_with_conditions: 'Approved with conditions',
  returned: 'Returned',
}

/** Every decision of a vet, and plainly what became of it: what was voided, when, and why. */
export function ApprovalsPart({ approvals }: { approvals: readonly ApprovalLine[] }) {
  if (approvals.length === 0)
    return <p className="text-mute">No vet has decided on a crate of this consignment yet.</p>
  return (
    <Ledger caption="Approvals of crate set-ups, newest first" folds>
      <thead>
        <tr>
          <Head>Crate</Head>
          <Head>Revision</Head>
          <Head>Decision</Head>
          <Head>Signed by</Head>
          <Head>Stands</Head>
        </tr>
      </thead>
      <tbody>
        {approvals.map((line) => (
          <tr key={line.approvalId}>
            <RowHead inline>
              <span className="crate text-mark-s">{line.crateMark}</span>
            </RowHead>
            <Cell label="Revision" inline>
              {line.revision}
            </Cell>
            <Cell label="Decision">
              <Lines
                first={DECISION_WORDS[line.decision]}
                second={[line.statement, line.reasons, line.conditions.join('. ')].filter(Boolean).join(' ')}
              />
            </Cell>
            <Cell label="Signed by">
              <Lines first={`${line.signerName}, ${line.registration}`} second={when(line.signedAt)} />
            </Cell>
            <Cell label="Stands" attention={line.voided !== null}>
              <Stands line={line} />
            </Cell>
          </tr>
        ))}
      </tbody>
    </Ledger>
  )
}

function Stands({ line }: { line: ApprovalLine }) {
  if (line.voided !== null) {
    return (
      <Lines
        first={<b>{line.voided.withdrawn ? 'Withdrawn' : 'Void'}</b>}
        second={`${when(line.voided.at)}. ${line.voided.reason}`}
      />
    )
  }
  if (line.decision === 'returned') return <>Returned, to be put right</>
  return line.stands ? <b>Stands</b> : <>Signed for an earlier plan</>
}

function when({ ms, zone }: Moment): string {
  return `${dayDate(ms, zone)}, ${localTime(ms, zone)}`
}
