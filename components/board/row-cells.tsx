import Link from 'next/link'
import { Holes } from '@/components/ui/holes'
import { Lines } from '@/components/ui/ledger'
import { Mark } from '@/components/ui/mark'
import { Stamp } from '@/components/ui/stamp'
import { Temperature } from '@/components/ui/temperature'
import { VerdictCell } from '@/components/ui/verdict-cell'
import { STATE_WORDS } from '@/lib/states/consignment'
import type { ConsignmentRow } from '@/lib/views/consignment-row'
import { counted, dayDate, localTime, minutesToSpare } from '@/lib/views/format'
import { HOLDER_WORDS } from './board-words'

export const rowHref = (row: ConsignmentRow) => `/consignments/${row.id}`

export function MarkCell({ row }: { row: ConsignmentRow }) {
  return (
    <Link href={rowHref(row)} tabIndex={-1} className="text-ink no-underline">
      <Mark label="Consignment">{row.mark}</Mark>
    </Link>
  )
}

export function JourneyCell({ row }: { row: ConsignmentRow }) {
  return (
    <Lines
      strong
      first={
        row.from === null && row.to === null
          ? 'No places yet'
          : `${row.from ?? 'not given'} to ${row.to ?? 'not given'}`
      }
      second={row.animals || 'No animals yet'}
    />
  )
}

/** Leaving on the clock where it leaves, and under it on the clock where it arrives. */
export function LeavesCell({ row: { leaves, arrives } }: { row: ConsignmentRow }) {
  if (leaves === null) return <span className="text-mute">not given yet</span>
  const away = arrives !== null && arrives.zone !== leaves.zone ? localTime(leaves.ms, arrives.zone) : null
  return (
    <span className="whitespace-nowrap text-small">
      <span className="block">{dayDate(leaves.ms, leaves.zone)}</span>
      {localTime(leaves.ms, leaves.zone)}
      {away !== null && <span className="text-mute">, {away}</span>}
    </span>
  )
}

/** Minutes first, then outside air, then the limit that decides with crate and leg in words. */
export function MarginCell({ row }: { row: ConsignmentRow }) {
  if (row.verdict === null) return <span className="text-mute">none yet</span>
  return (
    <span className="flex items-center gap-2.5">
      <VerdictCell verdict={row.verdict} outOfDate={row.outOfDate} wide>
        {row.marginMin === null ? (row.deciding.split(',')[0] ?? 'none') : minutesToSpare(row.marginMin)}
      </VerdictCell>
      <span className="min-w-0 text-small">
        {row.marginOutsideAirC !== null && (
          <span className="block">
            air <Temperature c={row.marginOutsideAirC} kind="air-margin" />
          </span>
        )}
        {row.deciding.split('; ').map((line) => (
          <span key={line} className="block">
            {line}
          </span>
        ))}
      </span>
    </span>
  )
}

export function StampCell({ row }: { row: ConsignmentRow }) {
  return (
    <span className="whitespace-nowrap">
      <Stamp verdict={row.verdict ?? 'none'} outOfDate={row.outOfDate} />
    </span>
  )
}

/** Where the consignment stands and whose move it is; a released revision is told beside the next one. */
export function StateCell({ row }: { row: ConsignmentRow }) {
  return (
    <span className="whitespace-nowrap">
      <Lines
        first={
          <>
            {row.inForceState === 'under_way' ? STATE_WORDS.under_way : STATE_WORDS[row.state]}
            {row.revision > 1 && `, revision ${row.revision}`}
          </>
        }
        second={
          row.inForceRevision !== null && row.inForceRevision !== row.revision
            ? `Revision ${row.inForceRevision} in force`
            : HOLDER_WORDS[row.holder]
        }
      />
    </span>
  )
}

export function SignedCell({ row }: { row: ConsignmentRow }) {
  if (row.crates === 0) return <span className="text-small text-mute">No crates yet</span>
  return (
    <span className="whitespace-nowrap text-small">
      <Holes done={Math.min(row.signed, 8)} of={Math.min(row.crates, 8)} /> {row.signed} of {row.crates}
      <span className="sr-only"> {counted(row.crates, 'crate')} signed</span>
    </span>
  )
}
