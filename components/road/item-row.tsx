'use client'

import { useState } from 'react'
import { Button } from '@/components/ui/button'
import { join } from '@/components/ui/join'
import { useUnit } from '@/components/ui/preferences'
import { localTime } from '@/lib/views/format'
import type { ChecklistItem, ChecklistLeg, ChecklistView } from '@/lib/views/checklist'
import { entryWords } from './entry-words'
import { ItemAct } from './item-act'
import { ItemBox } from './item-box'
import type { ItemState } from './item-states'
import { NotDone } from './not-done'
import type { NewEntry } from './use-entries'

export interface ItemRowProps {
  item: ChecklistItem
  leg: ChecklistLeg
  view: ChecklistView
  state: ItemState
  /** The first open one: washed, with a violet edge. */
  next: boolean
  /** Closed legs and journeys that aren't under way take no more. */
  locked: boolean
  onEntry: (entry: NewEntry) => void
}

/** One item: ticked, marked not done with the reason, or open with what it asks for. */
export function ItemRow({ item, leg, view, state, next, locked, onEntry }: ItemRowProps) {
  const [again, setAgain] = useState(false)
  const [saying, setSaying] = useState(false)
  const unit = useUnit()
  const settled = again || state.state === 'open' ? null : state.entry

  function enter(kind: NewEntry['kind'], more: Partial<NewEntry> = {}) {
    onEntry({
      legId: leg.legId,
      itemKey: item.key,
      kind,
      atMs: Date.now(),
      place: '',
      value: {},
      alive: null,
      dead: null,
      short: null,
      ...more,
    })
    setAgain(false)
    setSaying(false)
  }

  return (
    <li
      className={join(
        'grid grid-cols-[54px_1fr] border-b border-rule px-4',
        settled ? 'py-2.5' : 'min-h-[72px] py-3.5',
        next && 'bg-handwash shadow-[inset_6px_0_0_var(--hand)]',
      )}
    >
      <ItemBox
        label={`Item ${item.number}: ${item.text}`}
        state={again ? 'open' : state.state}
        onTick={settled || locked || item.kind !== 'tick' ? undefined : () => enter('tick')}
      />
      <div className="min-w-0">
        <p className={settled ? 'text-small text-mute' : undefined}>
          <b className="mr-1.5 font-head font-bold">{item.number}</b>
          {item.text}
        </p>
        {settled && (
          <p className="text-small font-semibold text-hand">
            {entryWords(settled, view.crates, unit)}, {localTime(settled.atMs, leg.end.zone)}
          </p>
        )}
        {!settled && !locked && (
          <>
            <ItemAct item={item} leg={leg} view={view} onEnter={enter} />
            {saying ? (
              <NotDone
                number={item.number}
                onSay={(reason) => enter('not_done', { value: { reason } })}
                onLeave={() => setSaying(false)}
              />
            ) : (
              <button type="button" className="link min-h-11 text-left" onClick={() => setSaying(true)}>
                Not done, say why
              </button>
            )}
          </>
        )}
        {settled && !locked && (
          <button type="button" className="link min-h-11 text-left text-small" onClick={() => setAgain(true)}>
            Put right<span className="sr-only"> item {item.number}</span>
          </button>
        )}
        {again && (
          <Button size="phone" className="mt-2" onClick={() => setAgain(false)}>
            Leave as it was
          </Button>
        )}
      </div>
    </li>
  )
}
