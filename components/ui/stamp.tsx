import type { Verdict } from '@/lib/rules/result'
import { BrokenFrame, BrokenUpright } from './broken-frame'
import { join } from './join'
import { VERDICT_WORDS, verdictName } from './verdict'

export type StampSize = 's' | 'm' | 'phone' | 'l'

export interface StampProps {
  /** none: nothing was assessed yet. */
  verdict: Verdict | 'none'
  /** How many conditions it holds on; shown with GO WITH CONDITIONS alone. */
  conditions?: number
  /** The old verdict no longer speaks of this plan. */
  outOfDate?: boolean
  /** One L to a page. */
  size?: StampSize
}

const FRAME = {
  s: {
    width: 2,
    dash: 6,
    gap: 4,
    words: 'h-6 text-stamp-s px-2.5',
    cond: 'pl-2',
    count: 'ml-2 px-2 text-small',
  },
  m: {
    width: 2,
    dash: 6,
    gap: 4,
    words: 'h-8 text-stamp-m px-3',
    cond: 'pl-3',
    count: 'ml-[11px] px-[11px] text-[1.0625rem]',
  },
  phone: {
    width: 3,
    dash: 9,
    gap: 6,
    words: 'h-11 text-section px-4',
    cond: 'pl-4',
    count: 'ml-3 px-3 text-section',
  },
  l: {
    width: 4,
    dash: 13,
    gap: 8,
    words: 'h-[58px] text-stamp-l px-5',
    cond: 'pl-5',
    count: 'ml-[18px] px-[18px] text-[1.875rem]',
  },
} as const

/** Frame and fill carry the verdict, and the words are always there. A solid block of ink is NO-GO and nothing else. */
export function Stamp({ verdict, conditions = 0, outOfDate = false, size = 's' }: StampProps) {
  const name = verdictName(verdict, conditions, outOfDate)
  if (!outOfDate && verdict === 'none') {
    return <span className={join('text-mute', size === 's' ? 'text-small' : 'text-body')}>Not assessed</span>
  }
  const frame = FRAME[size]
  const base = join(
    'relative inline-flex items-center whitespace-nowrap font-head font-extrabold uppercase tracking-[.045em]',
    frame.words,
  )
  if (outOfDate) {
    return (
      <span role="img" aria-label={name} className={join(base, 'border border-dotted border-rule text-mute')}>
        OUT OF DATE
      </span>
    )
  }
  if (verdict === 'no-go') {
    return (
      <span role="img" aria-label={name} className={join(base, 'keep-ink bg-ink text-on-ink')}>
        {VERDICT_WORDS['no-go']}
      </span>
    )
  }
  if (verdict === 'go') {
    return (
      <span
        role="img"
        aria-label={name}
        className={join(
          base,
          'border-ink text-ink',
          size === 'l' ? 'border-4' : size === 'phone' ? 'border-3' : 'border-2',
        )}
      >
        {VERDICT_WORDS.go}
      </span>
    )
  }
  return (
    <span
      role="img"
      aria-label={name}
      className={join(base, 'text-ink', conditions > 0 && frame.cond, conditions > 0 && '!pr-0')}
    >
      <BrokenFrame {...frame} />
      {VERDICT_WORDS.conditional}
      {conditions > 0 && (
        <span
          className={join(
            'fig relative flex items-center self-stretch font-semibold tracking-normal',
            frame.count,
          )}
        >
          <BrokenUpright {...frame} />
          {conditions}
        </span>
      )}
    </span>
  )
}
