import { Hole } from '@/components/ui/holes'
import type { HoleState } from '@/components/ui/holes'
import { dayTime } from '@/lib/views/format'
import type { MailRow, MailState } from '@/lib/views/administration'

export const MAIL_STATE_WORDS: Record<MailState, string> = {
  waiting: 'Waiting',
  sending: 'Going out',
  sent: 'Sent',
  uncertain: 'Uncertain',
  failed: 'Failed',
}

const HOLE: Record<MailState, HoleState> = {
  waiting: 'open',
  sending: 'open',
  sent: 'filled',
  uncertain: 'dashed',
  failed: 'struck',
}

/** A person has to decide: it goes out again only by hand. */
export function needsDecision(state: MailState): boolean {
  return state === 'uncertain' || state === 'failed'
}

/** The hole of a mail's state with its word and its time. */
export function MailStateCell({ row }: { row: Timed }) {
  return (
    <span className="grid grid-cols-[auto_1fr] gap-x-2">
      <span className="pt-0.5">
        <Hole state={HOLE[row.state]} />
      </span>
      <span>
        <span className="block font-semibold">{MAIL_STATE_WORDS[row.state]}</span>
        <span className="block text-small text-mute">{timeWords(row)}</span>
        {isLate(row) && (
          <span className="block text-small text-mute">
            written {dayTime(row.written.ms, row.written.zone)}
          </span>
        )}
      </span>
    </span>
  )
}

type Timed = Pick<MailRow, 'state' | 'at' | 'written' | 'attempts'>

/** Long after it was decided, what a mail says may be overtaken: then both times stand there. */
function isLate({ state, at, written }: Timed): boolean {
  return state === 'sent' && at.ms - written.ms > LATE_MS
}

const LATE_MS = 3_600_000

function timeWords({ state, at, attempts }: Timed): string {
  const time = dayTime(at.ms, at.zone)
  switch (state) {
    case 'waiting':
      return attempts > 0 ? `next ${time}` : `from ${time}`
    case 'sending':
      return `since ${time}`
    case 'sent':
      return time
    case 'uncertain':
      return `since ${time}`
    case 'failed':
      return `after ${attempts} ${attempts === 1 ? 'try' : 'tries'}`
  }
}
