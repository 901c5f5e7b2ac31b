import { counted, localTime } from '@/lib/views/format'

/** Under the slat while nothing gets through: since when, and what is kept. Never blocks a tick. */
export function SignalLine({
  silentSinceMs,
  keptCount,
  zone,
}: {
  silentSinceMs: number | null
  keptCount: number
  zone: string
}) {
  return (
    <div role="status" className="no-print">
      {silentSinceMs !== null && keptCount > 0 && (
        <p className="border-b border-rule bg-band px-4 py-2 text-small">
          <b>No answer since {localTime(silentSinceMs, zone)}.</b> {counted(keptCount, 'entry', 'entries')}{' '}
          {keptCount === 1 ? 'is' : 'are'} kept on this phone and {keptCount === 1 ? 'goes' : 'go'} by{' '}
          {keptCount === 1 ? 'itself' : 'themselves, in order'}.
        </p>
      )}
    </div>
  )
}
