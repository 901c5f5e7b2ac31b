import Link from 'next/link'
import { Cell, Head, Ledger, RowHead } from '@/components/ui/ledger'
import { Mark } from '@/components/ui/mark'
import { dayTime } from '@/lib/views/format'
import type { PortalRow } from '@/lib/views/portal'
import { portalStateWords } from './state-words'

/** A shipper's own consignments, the one that leaves next first. Double rule: something is asked of the shipper. */
export function ConsignmentsTable({ rows }: { rows: readonly PortalRow[] }) {
  return (
    <Ledger caption="Your consignments" folds>
      <thead>
        <tr>
          <Head>Mark</Head>
          <Head>Journey</Head>
          <Head>State</Head>
          <Head>Open</Head>
        </tr>
      </thead>
      <tbody>
        {rows.map((row) => (
          <tr key={row.consignmentId}>
            <RowHead>
              <Mark>{row.mark}</Mark>
            </RowHead>
            <Cell>
              <span className="block font-semibold">
                {row.from} to {row.to}
              </span>
              <span className="block text-small text-mute">
                {row.animals}
                {row.leaves && `, leaves ${dayTime(row.leaves.ms, row.leaves.zone)}`}
              </span>
            </Cell>
            <Cell label="State" attention={row.asked !== ''}>
              {portalStateWords(row.state)}
              {row.asked && <span className="block text-small font-semibold">{row.asked}</span>}
            </Cell>
            <Cell label="Open">
              <Link
                href={`/portal/${row.consignmentId}`}
                className="link inline-flex items-center max-desk:min-h-11"
              >
                Open<span className="sr-only"> {row.mark}</span>
              </Link>
            </Cell>
          </tr>
        ))}
      </tbody>
    </Ledger>
  )
}
