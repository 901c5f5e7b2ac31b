'use client'

import { useEffect, useRef, useState } from 'react'
import { SelectField } from '@/components/forms/select-field'
import { TextInput } from '@/components/forms/text-input'
import { Tick } from '@/components/forms/ticks'
import { join } from '@/components/ui/join'
import { CONSIGNMENT_STATES, STATE_WORDS } from '@/lib/states/consignment'
import type { BoardQuery, Holder } from '@/lib/schemas/board'
import { HOLDER_OPTIONS, SORT_OPTIONS, VERDICT_FILTERS } from './board-words'

const TYPING_MS = 250

/** Narrowing and ordering of the board. Each change is an address of its own. */
export function BoardFilters({
  query,
  counts,
  onAsk,
}: {
  query: BoardQuery
  counts: Partial<Record<BoardQuery['state'][number], number>>
  onAsk: (change: Partial<BoardQuery>, how?: 'push' | 'replace') => void
}) {
  const [open, setOpen] = useState(false)
  const narrow = open ? '' : 'max-desk:hidden'
  const toggled = <V extends string>(list: readonly V[], value: V, on: boolean) =>
    on ? [...list, value] : list.filter((known) => known !== value)
  return (
    <form
      role="search"
      aria-label="Consignments"
      className="mb-3"
      onSubmit={(event) => event.preventDefault()}
    >
      <div className="grid grid-cols-2 items-end gap-x-4 gap-y-2 desk:grid-cols-[minmax(180px,260px)_160px_190px_170px_170px_auto]">
        <FindField find={query.find} onFind={(find) => onAsk({ find }, 'replace')} />
        <button
          type="button"
          aria-expanded={open}
          className="link col-span-2 min-h-11 text-left desk:hidden"
          onClick={() => setOpen((before) => !before)}
        >
          {open ? 'Fold the filters' : 'Narrow and order'}
        </button>
        <TextInput
          id="board-leaves-from"
          className={narrow}
          label="Leaves from"
          type="date"
          value={query.leavesFrom ?? ''}
          onChange={(event) => onAsk({ leavesFrom: event.target.value || null })}
        />
        <SelectField
          id="board-sort"
          className={narrow}
          label="Order"
          choices={SORT_OPTIONS}
          value={query.sort}
          onChange={(event) => onAsk({ sort: event.target.value as BoardQuery['sort'] })}
        />
        <SelectField
          id="board-holder"
          className={narrow}
          label="Whose move"
          none="Anybody’s"
          choices={HOLDER_OPTIONS}
          value={query.holder ?? ''}
          onChange={(event) => onAsk({ holder: (event.target.value || null) as Holder | null })}
        />
        <SelectField
          id="board-state"
          className={narrow}
          label="State"
          none={query.state.length > 1 ? `${query.state.length} states` : 'All open'}
          choices={CONSIGNMENT_STATES.map((state) => ({
            value: state,
            words: `${STATE_WORDS[state]}, ${counts[state] ?? 0}`,
          }))}
          value={query.state.length === 1 ? query.state[0] : ''}
          onChange={(event) =>
            onAsk({
              state: event.target.value === '' ? [] : [event.target.value as BoardQuery['state'][number]],
            })
          }
        />
        <Tick
          id="board-closed"
          className={join('pb-1.5', narrow)}
          label="Closed ones too"
          checked={query.closed}
          onChange={(event) => onAsk({ closed: event.target.checked })}
        />
      </div>
      <fieldset className={join('mt-2 flex flex-wrap gap-x-4 gap-y-1', narrow)}>
        <legend className="sr-only">Verdict</legend>
        {VERDICT_FILTERS.map(({ value, words }) => (
          <Tick
            key={value}
            id={`board-verdict-${value}`}
            label={words}
            checked={query.verdict.includes(value)}
            onChange={(event) => onAsk({ verdict: toggled(query.verdict, value, event.target.checked) })}
          />
        ))}
      </fieldset>
    </form>
  )
}

/** Beginnings of words: a mark, a place, an animal, a shipper. Asked a moment after the typing stops. */
function FindField({ find, onFind }: { find: string; onFind: (find: string) => void }) {
  const [typed, setTyped] = useState(find)
  const [asked, setAsked] = useState(find)
  // The back button changes the address under the field.
  if (asked !== find) {
    setAsked(find)
    setTyped(find)
  }
  const ask = useRef(onFind)
  useEffect(() => {
    ask.current = onFind
  })
  useEffect(() => {
    if (typed === find) return
    const timer = setTimeout(() => ask.current(typed), TYPING_MS)
    return () => clearTimeout(timer)
  }, [typed, find])
  return (
    <TextInput
      id="board-find"
      label="Find"
      type="search"
      autoComplete="off"
      value={typed}
      onChange={(event) => setTyped(event.target.value)}
      className="max-desk:col-span-2"
    />
  )
}
