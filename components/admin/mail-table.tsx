import Link from 'next/link'
import { Cell, Head, Ledger } from '@/components/ui/ledger'
import { Mark } from '@/components/ui/mark'
import type { MailRow } from '@/lib/views/administration'
import { MailStateCell, needsDecision } from './mail-state'

/** The mail queue. Double rule: somebody has to decide; nothing goes twice by itself. */
export function MailTable({
  rows,
  chosenId,
  hrefOf,
}: {
  rows: readonly MailRow[]
  chosenId: number | null
  hrefOf: (row: MailRow) => string
}) {
  return (
    <>
      <Ledger caption="Mails, newest first" folds>
        <thead>
          <tr>
            <Head>State</Head>
            <Head>Mail</Head>
            <Head>To</Head>
            <Head>Last word</Head>
            <Head>Action</Head>
          </tr>
        </thead>
        <tbody>
          {rows.map((row) => (
            <tr
              key={row.id}
              aria-current={row.id === chosenId ? 'true' : undefined}
              className="aria-[current]:bg-handwash aria-[current]:[&>td:first-child]:shadow-[inset_4px_0_0_var(--hand)]"
            >
              <Cell attention={needsDecision(row.state)} className="min-w-[9rem]">
                <MailStateCell row={row} />
              </Cell>
              <Cell>
                {row.mark && (
                  <>
                    <Mark size="s">{row.mark}</Mark>{' '}
                  </>
                )}
                {withoutMark(row)}
              </Cell>
              <Cell label="To" className="break-all text-small">
                {row.to}
              </Cell>
              <Cell label="Last word" className="text-small">
                {row.lastWord}
              </Cell>
              <Cell>
                <Link href={hrefOf(row)} scroll={false} className="link">
                  {needsDecision(row.state) ? 'Decide' : 'Open'}
                  <span className="sr-only">
                    {' '}
                    {row.subject}, to {row.to}
                  </span>
                </Link>
              </Cell>
            </tr>
          ))}
        </tbody>
      </Ledger>
      <p className="mt-1.5 text-small text-mute">
        Double rule: somebody has to decide. No mail is ever sent twice by itself.
      </p>
    </>
  )
}

/** A subject begins with the mark, which stands beside it already. */
function withoutMark({ mark, subject }: MailRow): string {
  return mark !== null && subject.startsWith(mark)
    ? subject.slice(mark.length).replace(/^[,:]\s*/, '')
    : subject
}
