import { Cell, Head, Ledger, RowHead } from '@/components/ui/ledger'
import type { FindingView } from '@/lib/views/sheet'
import { MarginLine } from './margin-figures'

/** Findings that decide, hold release or were overridden; what is met and what is merely noted folds away. */
export function FindingsInTwo({ findings }: { findings: readonly FindingView[] }) {
  const quiet = findings.filter(({ status, decides }) => !decides && (status === 'met' || status === 'note'))
  const loud = findings.filter((finding) => !quiet.includes(finding))
  return (
    <>
      <FindingsTable findings={loud} />
      {quiet.length > 0 && (
        <details className="mt-2">
          <summary className="link inline-block max-desk:min-h-11">
            {quiet.length === 1
              ? '1 more that is met or noted'
              : `${quiet.length} more that are met or noted`}
          </summary>
          <div className="mt-2">
            <FindingsTable findings={quiet} />
          </div>
        </details>
      )}
    </>
  )
}

/** What was asked, by whom, what the plan gives, and whether anybody may override it. */
export function FindingsTable({
  findings,
  animalId,
}: {
  findings: readonly FindingView[]
  animalId?: string
}) {
  const shown =
    animalId === undefined
      ? findings
      : findings.filter(({ animalIds }) => animalIds.length === 0 || animalIds.includes(animalId))
  if (shown.length === 0) return <p className="text-mute">Nothing was found against this plan.</p>
  return (
    <Ledger caption="Findings, the deciding ones first" folds>
      <thead>
        <tr>
          <Head>No.</Head>
          <Head>Basis</Head>
          <Head>Who, leg</Head>
          <Head>What is asked, where from</Head>
          <Head>Plan gives</Head>
          <Head>To spare</Head>
          <Head>Status</Head>
        </tr>
      </thead>
      <tbody>
        {shown.map((finding) => (
          <tr key={finding.number} id={`finding-${finding.number}`}>
            <RowHead inline className="font-head text-sub font-bold">
              {finding.number}
            </RowHead>
            <Cell inline>{finding.basisWords}</Cell>
            <Cell inline>{finding.whoLegWords}</Cell>
            <Cell className="max-w-[34rem]">
              {finding.asked}
              {finding.note !== '' && finding.note !== finding.asked && (
                <span className="block text-small">{finding.note}</span>
              )}
              {(finding.citation !== '' || finding.sourceWords !== '') && (
                <span className="block text-small text-mute">
                  {[finding.citation, finding.sourceWords].filter(Boolean).join('; ')}
                </span>
              )}
            </Cell>
            <Cell label="Plan gives">{finding.givesWords}</Cell>
            <Cell label="To spare">
              {finding.margin.minutes === null && finding.margin.outsideAirC === null ? (
                finding.spareWords
              ) : (
                <MarginLine margin={finding.margin} />
              )}
            </Cell>
            <Cell label="Status" attention={finding.status === 'breach'}>
              <StatusWords finding={finding} />
            </Cell>
          </tr>
        ))}
      </tbody>
    </Ledger>
  )
}

function StatusWords({ finding: { statusWords, statusBold } }: { finding: FindingView }) {
  return (
    <>
      {statusBold && <b>{statusBold} </b>}
      {statusWords}
    </>
  )
}
