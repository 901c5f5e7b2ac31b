import type { ReactNode } from 'react'
import { join } from './join'

export type HoleState = 'filled' | 'open' | 'dashed' | 'struck'

/** One vent hole. filled: done, sent, reached. open: waits. dashed: uncertain. struck: failed. Words always stand beside it. */
export function Hole({ state, size = 11 }: { state: HoleState; size?: number }) {
  return (
    <svg
      aria-hidden="true"
      width={size + 4}
      height={size + 4}
      viewBox="0 0 15 15"
      className="inline-block shrink-0 align-[-2px]"
    >
      <circle
        cx="7.5"
        cy="7.5"
        r="5"
        strokeWidth="1.5"
        strokeDasharray={state === 'dashed' ? '2 2' : undefined}
        className={join('stroke-ink', state === 'filled' ? 'fill-ink' : 'fill-none')}
      />
      {state === 'struck' && <path d="M2.5 12.5 12.5 2.5" strokeWidth="1.5" className="stroke-ink" />}
    </svg>
  )
}

/** A row of holes, as many as there are parts. */
export function Holes({ done, of }: { done: number; of: number }) {
  return (
    <span className="inline-flex flex-wrap gap-px align-[-3px]" aria-hidden="true">
      {Array.from({ length: of }, (_, index) => (
        <Hole key={index} state={index < done ? 'filled' : 'open'} />
      ))}
    </span>
  )
}

/**
 * Long work: one hole for each part, what and how far, whether one can leave, links to see and to stop. No spinner and
 * no percentage. Old figures stay where they were, marked OUT OF DATE.
 */
export function WorkRow({
  done,
  of,
  words,
  more,
  acts,
}: {
  done: number
  of: number
  words: ReactNode
  more?: ReactNode
  acts?: ReactNode
}) {
  return (
    <div
      role="status"
      className="flex flex-wrap items-center gap-x-4 gap-y-2 border-y border-rule py-2 text-small"
    >
      <Holes done={done} of={of} />
      <span className="font-semibold">{words}</span>
      {more && <span className="text-mute">{more}</span>}
      {acts && <span className="ml-auto flex gap-4">{acts}</span>}
    </div>
  )
}

/** What a loading page shows: its own rules, empty, and a sentence. Nothing moves. */
export function Waiting({ children = 'Reading.', rows = 3 }: { children?: ReactNode; rows?: number }) {
  return (
    <div role="status" className="border-y-2 border-ink bg-sheet">
      <p className="px-2.5 py-[5px] text-small text-mute">{children}</p>
      {Array.from({ length: rows }, (_, index) => (
        <div key={index} aria-hidden="true" className="h-12 border-t border-hair" />
      ))}
    </div>
  )
}
