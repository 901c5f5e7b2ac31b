import Link from 'next/link'
import { Mark } from '@/components/ui/mark'
import { Stamp } from '@/components/ui/stamp'
import { dayTime } from '@/lib/views/format'
import type { ReviewQueueRow } from '@/lib/views/review'
import { leavesIn } from './leaves-in'

/** The queue as a column: what waits in order of leaving, then what is signed. */
export function ReviewQueue({
  rows,
  nowMs,
  chosen,
}: {
  rows: readonly ReviewQueueRow[]
  nowMs: number
  chosen: { consignmentId: number; crateId: string } | null
}) {
  const waiting = rows.filter((row) => row.decision === 'waiting')
  const signed = rows.filter((row) => row.decision !== 'waiting')
  return (
    <nav aria-label="Queue" className="border-y-2 border-ink bg-sheet">
      <Group title={`To review, ${waiting.length}`}>
        {waiting.map((row) => (
          <Row key={`${row.consignmentId}-${row.crateId}`} row={row} nowMs={nowMs} chosen={chosen} />
        ))}
        {waiting.length === 0 && <li className="px-3 py-2.5 text-mute">Nothing waits for a vet.</li>}
      </Group>
      {signed.length > 0 && (
        <Group title="Signed">
          {signed.map((row) => (
            <Row key={`${row.consignmentId}-${row.crateId}`} row={row} nowMs={nowMs} chosen={chosen} />
          ))}
        </Group>
      )}
    </nav>
  )
}

function Group({ title, children }: { title: string; children: React.ReactNode }) {
  return (
    <>
      <h2 className="border-b border-rule bg-band px-3 py-1 text-[0.875rem]/[1.125rem]">{title}</h2>
      <ul className="list-none divide-y divide-hair">{children}</ul>
    </>
  )
}

function Row({
  row,
  nowMs,
  chosen,
}: {
  row: ReviewQueueRow
  nowMs: number
  chosen: { consignmentId: number; crateId: string } | null
}) {
  const isChosen = chosen?.consignmentId === row.consignmentId && chosen.crateId === row.crateId
  return (
    <li>
      <Link
        href={`/review/${row.consignmentId}?crate=${row.crateLetter}`}
        aria-current={isChosen ? 'true' : undefined}
        className="block px-3 py-2 text-ink no-underline hover:bg-handwash aria-[current]:bg-handwash aria-[current]:shadow-[inset_4px_0_0_var(--hand)]"
      >
        <span className="flex items-baseline justify-between gap-2">
          <Mark>{row.crateMark}</Mark>
          <span className="text-small">
            {row.signed ? dayTime(row.signed.ms, row.signed.zone) : leavesIn(row.leaves.ms, nowMs)}
          </span>
        </span>
        <span className="block text-small text-mute">
          {row.words}
          {row.decision === 'approved' && ', approved'}
          {row.decision === 'returned' && ', returned'}
        </span>
        {row.stamp && (
          <span className="mt-1.5 block">
            <Stamp {...row.stamp} size="s" />
          </span>
        )}
      </Link>
    </li>
  )
}
