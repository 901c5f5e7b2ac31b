import { Mark } from '@/components/ui/mark'
import { Sheet } from '@/components/ui/section'
import { dayTime } from '@/lib/views/format'
import type { PortalRow } from '@/lib/views/portal'
import { portalStateWords } from './state-words'

/** Before a release there is nothing to rely on: what is planned, and that it may still change. */
export function WaitingConsignment({ row }: { row: PortalRow }) {
  return (
    <Sheet>
      <header className="flex flex-wrap items-center gap-x-5 gap-y-2">
        <Mark size="l">{row.mark}</Mark>
        <div>
          <h2 className="text-section">
            {row.from && row.to ? `${row.from} to ${row.to}` : 'Journey not planned yet'}
          </h2>
          <p className="text-mute">
            {row.animals}
            {row.leaves && `, leaves ${dayTime(row.leaves.ms, row.leaves.zone)}`}
          </p>
        </div>
      </header>
      <section>
        <p>
          <b>{portalStateWords(row.state)}.</b>{' '}
          {row.state === 'cancelled'
            ? 'This journey does not take place.'
            : 'Nothing is released yet: times, route and verdict may still change. The manifest comes by mail with the release.'}
        </p>
      </section>
    </Sheet>
  )
}
