import Link from 'next/link'
import { Mark } from '@/components/ui/mark'
import type { AttentionLine } from '@/lib/views/board'
import { duration } from '@/lib/views/format'
import { rowHref } from './row-cells'

/** What waits for a decision of the desk, above everything else; nothing where nothing waits. */
export function AttentionLines({ lines, nowMs }: { lines: readonly AttentionLine[]; nowMs: number }) {
  if (lines.length === 0) return null
  return (
    <section aria-label="Needs a decision" className="mb-3.5 border-t-2 border-ink">
      {lines.map((line) => (
        <div
          key={line.row.id}
          className="grid grid-cols-[64px_1fr] items-baseline border-b border-rule py-1.5 desk:grid-cols-[84px_1fr]"
        >
          <Mark size="s">{line.row.mark}</Mark>
          <p>
            <LineWords line={line} nowMs={nowMs} />
          </p>
        </div>
      ))}
    </section>
  )
}

function LineWords({ line: { row, kind }, nowMs }: { line: AttentionLine; nowMs: number }) {
  const leaves = <Leaves leavesMs={row.leaves?.ms ?? null} nowMs={nowMs} />
  const deciding = row.deciding === '' ? '' : `: ${row.deciding.split('; ')[0]}`
  switch (kind) {
    case 'no-go':
      return (
        <>
          NO-GO{deciding}. {leaves}{' '}
          <Link className="link" href={`${rowHref(row)}/plan`}>
            Re-plan
          </Link>
        </>
      )
    case 'out-of-date':
      return (
        <>
          Out of date: the plan, a species row or a version has moved on since it was assessed. {leaves}{' '}
          <Link className="link" href={rowHref(row)}>
            Assess again
          </Link>
        </>
      )
    case 'returned':
      return (
        <>
          Returned by the vet. {leaves}{' '}
          <Link className="link" href={rowHref(row)}>
            Read why
          </Link>
        </>
      )
  }
}

function Leaves({ leavesMs, nowMs }: { leavesMs: number | null; nowMs: number }) {
  if (leavesMs === null) return <>No time of leaving yet.</>
  if (leavesMs < nowMs) return <>Its time of leaving is past.</>
  return (
    <>
      Leaves in <b>{duration((leavesMs - nowMs) / 60_000)}</b>.
    </>
  )
}
