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

/** Width, dash and gap of the frame as variables: on a phone the L stamp draws itself narrower, words and all. */
const SIZES = {
  s: 'h-6 max-desk:h-8 text-stamp-s px-2.5 [--w:2px] [--d:6px] [--g:4px]',
  m: 'h-8 max-desk:h-10 text-stamp-m px-3 [--w:2px] [--d:6px] [--g:4px]',
  phone: 'h-11 text-section px-4 [--w:3px] [--d:9px] [--g:6px]',
  l: 'h-[58px] text-stamp-l px-5 [--w:4px] [--d:13px] [--g:8px] max-desk:h-12 max-desk:px-3 max-desk:[--w:3px] max-desk:[--d:9px] max-desk:[--g:6px]',
} as const

const COUNT = {
  s: 'ml-2 px-2 text-small',
  m: 'ml-[11px] px-[11px] text-[1.0625rem]',
  phone: 'ml-3 px-3 text-section',
  l: 'ml-[18px] px-[18px] text-[1.875rem] max-desk:ml-3 max-desk:px-3 max-desk:text-section',
} as const

/** Frame and fill carry the verdict, and the words are always there. A solid block of ink is NO-GO and nothing else. */
export function Stamp({ verdict, conditions = 0, outOfDate = false, size = 's' }: StampProps) {
  const name = verdictName(verdict, conditions, outOfDate)
  if (!outOfDate && verdict === 'none') {
    return <span className={join('text-mute', size === 's' ? 'text-small' : 'text-body')}>Not assessed</span>
  }
  const base = join(
    'relative inline-flex items-center whitespace-nowrap font-head font-extrabold uppercase tracking-[.045em]',
    SIZES[size],
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
      <span role="img" aria-label={name} className={join(base, 'border-(length:--w) border-ink text-ink')}>
        {VERDICT_WORDS.go}
      </span>
    )
  }
  return (
    <span role="img" aria-label={name} className={join(base, 'text-ink', conditions > 0 && '!pr-0')}>
      <BrokenFrame />
      {VERDICT_WORDS.conditional}
      {conditions > 0 && (
        <span
          className={join(
            'fig relative flex items-center self-stretch font-semibold tracking-normal',
            COUNT[size],
          )}
        >
          <BrokenUpright />
          {conditions}
        </span>
      )}
    </span>
  )
}
