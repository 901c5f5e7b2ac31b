import Link from 'next/link'
import { Cell, Head, Ledger } from '@/components/ui/ledger'
import { Mark } from '@/components/ui/mark'
import { count, dayDate } from '@/lib/views/format'
import type { AuditRow } from '@/lib/views/administration'
import { toLocalTime, zoneOffsetMin } from '@/lib/planning/local-time'
import { AuditFacts } from './audit-facts'

/** The trail, newest first; a chosen row opens its facts before and after. Double rule: something was refused. */
export function AuditTable({
  rows,
  chosenId,
  hrefOf,
  hrefOfConsignment,
  zoneWords,
}: {
  rows: readonly AuditRow[]
  chosenId: number | null
  hrefOf: (row: AuditRow | null) => string
  /** All rows of the same consignment. */
  hrefOfConsignment: (row: AuditRow) => string
  zoneWords: string
}) {
  return (
    <>
      <Ledger caption="Audit trail, newest first" folds>
        <thead>
          <tr>
            <Head numeric>Row</Head>
            <Head>When, {zoneWords}</Head>
            <Head>Who</Head>
            <Head>What</Head>
            <Head>Mark</Head>
            <Head>From where</Head>
            <Head>Before, after</Head>
          </tr>
        </thead>
        <tbody>
          {rows.map((row) => (
            <Row
              key={row.id}
              row={row}
              chosen={row.id === chosenId}
              hrefOf={hrefOf}
              hrefOfConsignment={hrefOfConsignment}
            />
          ))}
        </tbody>
      </Ledger>
      <p className="mt-1.5 text-small text-mute">Double rule: something was refused.</p>
    </>
  )
}

function Row({
  row,
  chosen,
  hrefOf,
  hrefOfConsignment,
}: {
  row: AuditRow
  chosen: boolean
  hrefOf: (row: AuditRow | null) => string
  hrefOfConsignment: (row: AuditRow) => string
}) {
  const opens = row.before !== null || row.after !== null
  return (
    <>
      <tr
        id={`row-${row.id}`}
        aria-current={chosen ? 'true' : undefined}
        className="aria-[current]:bg-handwash aria-[current]:[&>td:first-child]:shadow-[inset_4px_0_0_var(--hand)]"
      >
        <Cell label="Row" inline numeric>
          {count(row.id)}
        </Cell>
        <Cell inline className="whitespace-nowrap">
          {dayDate(row.at.ms, row.at.zone)} <span className="fig text-small">{clockWithSeconds(row)}</span>
        </Cell>
        <Cell>
          {row.who}
          {row.role && <span className="text-mute">, {row.role}</span>}
        </Cell>
        <Cell attention={row.refused}>
          <span className="fig text-small">{row.verb}</span>
          <span className="text-mute"> {row.subject}</span>
          {row.note && <span className="block text-small text-mute">{row.note}</span>}
        </Cell>
        <Cell inline>
          {row.mark && (
            <Link href={hrefOfConsignment(row)} className="text-ink">
              <Mark size="s">{row.mark}</Mark>
            </Link>
          )}
        </Cell>
        <Cell label="From" inline className="fig text-small">
          {row.from}
        </Cell>
        <Cell label="Before, after" inline>
          {opens ? (
            <Link href={hrefOf(chosen ? null : row)} scroll={false} className="link">
              {chosen ? 'Close' : 'Open'}
              <span className="sr-only"> row {row.id}</span>
            </Link>
          ) : (
            <span className="text-mute">none</span>
          )}
        </Cell>
      </tr>
      {chosen && (
        <tr className="bg-handwash [&>td]:shadow-[inset_4px_0_0_var(--hand)]">
          <td colSpan={7} className="px-4 pb-3 pt-1">
            <AuditFacts before={row.before} after={row.after} />
          </td>
        </tr>
      )}
    </>
  )
}

function clockWithSeconds({ at }: AuditRow): string {
  const seconds = Math.floor((at.ms + zoneOffsetMin(at.ms, at.zone) * 60_000) / 1000) % 60
  return `${toLocalTime(at.ms, at.zone).slice(11)}:${String(seconds).padStart(2, '0')}`
}
