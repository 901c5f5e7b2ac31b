'use client'

import { useEffect, useRef } from 'react'
import { join } from '@/components/ui/join'
import { BrokenFrame } from '@/components/ui/broken-frame'
import { verdictName } from '@/components/ui/verdict'
import { hatch } from '@/lib/views/charts/hatch'
import type { ChartLeg } from '@/lib/views/charts/types'
import { Marks } from './marks'

const CELL = 43

/**
 * One cell a leg: its number in the verdict's frame, below it a strip of its surroundings. The chosen one is washed violet
 * with a violet foot. Over nine legs the row scrolls, the chosen leg in its middle.
 */
export function LegStepper({
  legs,
  chosenLegId,
  onChoose,
}: {
  legs: readonly ChartLeg[]
  chosenLegId: string | null
  onChoose: (legId: string) => void
}) {
  const row = useRef<HTMLDivElement>(null)
  useEffect(() => {
    const chosen = row.current?.querySelector<HTMLElement>('[aria-pressed=true]')
    if (row.current && chosen)
      row.current.scrollLeft = chosen.offsetLeft - (row.current.clientWidth - CELL) / 2
  }, [chosenLegId])
  return (
    <div
      ref={row}
      role="group"
      aria-label="Legs"
      className="relative flex overflow-x-auto border-b border-rule bg-sheet max-desk:-mx-4"
    >
      {legs.map((leg) => (
        <StepperCell key={leg.legId} leg={leg} chosen={leg.legId === chosenLegId} onChoose={onChoose} />
      ))}
    </div>
  )
}

function StepperCell({
  leg,
  chosen,
  onChoose,
}: {
  leg: ChartLeg
  chosen: boolean
  onChoose: (legId: string) => void
}) {
  const verdict = leg.head?.verdict ?? null
  return (
    <button
      type="button"
      aria-pressed={chosen}
      aria-label={`Leg ${leg.ordinal}, ${leg.name}. ${verdictName(verdict ?? 'none')}`}
      onClick={() => onChoose(leg.legId)}
      className={join('relative flex-[1_0_43px] cursor-pointer pb-[6px] pt-2', chosen && 'bg-handwash')}
    >
      <span
        className={join(
          'relative mx-auto flex size-[30px] items-center justify-center font-head text-[17px] font-bold [--d:6px] [--g:4px] [--w:2px]',
          verdict === 'no-go' ? 'keep-ink bg-ink text-on-ink' : 'text-ink',
          verdict === 'go' && 'border-2 border-ink bg-sheet',
        )}
      >
        {verdict === 'conditional' && <BrokenFrame />}
        {leg.ordinal}
      </span>
      <svg aria-hidden="true" height="16" className="mt-2 block w-full border-l border-ink bg-band">
        {/* Drawn wider than any cell and cut by it. */}
        <Marks marks={[hatch(leg.pattern, { x: 0, y: 0, width: 1200, height: 16 })]} />
      </svg>
      {chosen && <span aria-hidden="true" className="absolute inset-x-0 bottom-0 h-1.5 bg-hand" />}
    </button>
  )
}
