import type { ReactNode } from 'react'
import type { Verdict } from '@/lib/rules/result'
import { BrokenFrame } from './broken-frame'
import { join } from './join'
import { VERDICT_WORDS, verdictName } from './verdict'

/**
 * A figure in the frame of its verdict. It may stand alone only where the verdict's words are in the same row or in a
 * key on the same screen (VerdictKey), and never without the limit that decided: give it as `limit`.
 */
export function VerdictCell({
  verdict,
  children,
  limit,
  outOfDate = false,
  wide = false,
}: {
  verdict: Verdict | 'none' | null
  /** The figure, already formatted: "−16 min". */
  children: ReactNode
  /** "critical, A", "alarm low, C": stands beside the frame in 600. */
  limit?: ReactNode
  outOfDate?: boolean
  wide?: boolean
}) {
  if (verdict === null || verdict === 'none') return <span className="text-mute">none yet</span>
  const frame = join(
    'fig relative inline-block [--d:6px] [--g:4px] [--w:2px] border-2 px-1 py-px text-center text-small whitespace-nowrap',
    wide ? 'min-w-[4.75rem]' : 'min-w-[3.375rem]',
  )
  return (
    <span className="inline-flex flex-wrap items-center gap-x-2 gap-y-0.5">
      <span className="sr-only">{verdictName(verdict, 0, outOfDate)}, </span>
      {outOfDate ? (
        <s className={join(frame, 'border-transparent text-mute')}>{children}</s>
      ) : verdict === 'no-go' ? (
        <span className={join(frame, 'keep-ink border-ink bg-ink font-semibold text-on-ink')}>
          {children}
        </span>
      ) : verdict === 'go' ? (
        <span className={join(frame, 'border-ink')}>{children}</span>
      ) : (
        <span className={join(frame, '!border-0 !px-1.5 !py-[3px]')}>
          <BrokenFrame />
          {children}
        </span>
      )}
      {limit && <span className="font-semibold">{limit}</span>}
    </span>
  )
}

/** What the three frames mean; stands once on a screen that has verdict cells. */
export function VerdictKey() {
  return (
    <p className="flex flex-wrap items-center gap-x-4 gap-y-1 text-small text-mute">
      {(['go', 'conditional', 'no-go'] as const).map((verdict) => (
        <span key={verdict} className="inline-flex items-center gap-1.5">
          <FrameSample verdict={verdict} />
          {VERDICT_WORDS[verdict]}
        </span>
      ))}
    </p>
  )
}

function FrameSample({ verdict }: { verdict: Verdict }) {
  return (
    <span
      aria-hidden="true"
      className={join(
        'relative inline-block h-4 w-8 text-ink [--d:6px] [--g:4px] [--w:2px]',
        verdict === 'go' && 'border-2 border-ink',
        verdict === 'no-go' && 'keep-ink bg-ink',
      )}
    >
      {verdict === 'conditional' && <BrokenFrame />}
    </span>
  )
}
