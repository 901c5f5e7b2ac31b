'use client'

import { useId, useRef } from 'react'
import type { KeyboardEvent, ReactNode } from 'react'
import { join } from '@/components/ui/join'
import { useProblems } from './plan-context'
import { isUnder, planPathId } from './plan-path'

interface PartTab {
  key: string
  /** Path of the item, for what has to be put right in it. */
  path: string
  letter?: string
  words: string
}

/** Items of a part side by side, one of them open below; arrow keys walk them. */
export function PartTabs({
  label,
  items,
  chosen,
  onChoose,
  acts,
  children,
}: {
  label: string
  items: readonly PartTab[]
  chosen: number
  onChoose: (index: number) => void
  acts: ReactNode
  children: ReactNode
}) {
  const problems = useProblems()
  const list = useRef<HTMLDivElement>(null)
  const base = useId()
  const step = (event: KeyboardEvent) => {
    const next = nextIndex(event.key, chosen, items.length)
    if (next === null) return
    event.preventDefault()
    onChoose(next)
    list.current?.querySelectorAll<HTMLElement>('[role=tab]')[next]?.focus()
  }
  return (
    <div>
      <div ref={list} role="tablist" aria-label={label} onKeyDown={step} className="flex flex-wrap gap-1.5">
        {items.map((item, index) => {
          const wrong = problems.filter(({ path }) => isUnder(path, item.path)).length
          return (
            <button
              key={item.key}
              type="button"
              role="tab"
              id={`${base}-${index}`}
              aria-selected={index === chosen}
              aria-controls={`${base}-panel`}
              tabIndex={index === chosen ? 0 : -1}
              onClick={() => onChoose(index)}
              className={join(
                'flex min-h-9 cursor-pointer items-center gap-2.5 px-3.5 py-1 text-left max-desk:min-h-11',
                index === chosen
                  ? 'relative z-[1] -mb-0.5 border-2 border-ink border-b-sheet bg-sheet'
                  : 'border border-b-0 border-rule bg-band',
              )}
            >
              {item.letter && <span className="crate text-mark-m">{item.letter}</span>}
              {item.words}
              {wrong > 0 && <span className="dbl pl-1.5 text-small font-semibold">{wrong} to put right</span>}
            </button>
          )
        })}
      </div>
      <div
        role="tabpanel"
        id={`${base}-panel`}
        aria-labelledby={`${base}-${chosen}`}
        className="border-2 border-ink bg-sheet"
      >
        <span id={planPathId(items[chosen]?.path ?? '')} tabIndex={-1} className="sr-only">
          {items[chosen]?.words}
        </span>
        {children}
        <div className="flex flex-wrap gap-2 border-t border-rule px-3.5 py-2.5">{acts}</div>
      </div>
    </div>
  )
}

function nextIndex(key: string, index: number, many: number): number | null {
  switch (key) {
    case 'ArrowRight':
      return Math.min(many - 1, index + 1)
    case 'ArrowLeft':
      return Math.max(0, index - 1)
    case 'Home':
      return 0
    case 'End':
      return many - 1
    default:
      return null
  }
}
