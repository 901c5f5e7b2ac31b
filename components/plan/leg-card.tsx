'use client'

import type { ReactNode } from 'react'
import type { PlanLeg } from '@/lib/schemas/plan'
import { LegCharge } from './leg-charge'
import { LegDelays } from './leg-delays'
import { LegJourney } from './leg-journey'
import { LegSurroundings } from './leg-surroundings'
import { legName } from './option-words'

/** One leg opened: its journey, who is in charge, what is round the crates, delays and stops. */
export function LegCard({
  index,
  leg,
  swatch,
  acts,
}: {
  index: number
  leg: PlanLeg
  /** The pattern of its surroundings, drawn. */
  swatch: ReactNode
  acts: ReactNode
}) {
  return (
    <div
      role="group"
      aria-label={`Leg ${index + 1}, ${legName(leg)}`}
      className="grid border-2 border-ink bg-sheet max-board:divide-y max-board:divide-rule board:grid-cols-[1fr_1fr_1.3fr_1fr] board:divide-x board:divide-rule"
    >
      <LegPart
        head={
          <>
            <span className="mr-2.5 text-page">{index + 1}</span>
            {swatch}
            <span className="ml-2">{legName(leg)}</span>
          </>
        }
      >
        <LegJourney index={index} />
      </LegPart>
      <LegPart head="In charge and at hand">
        <LegCharge index={index} />
      </LegPart>
      <LegPart head="Surroundings">
        <LegSurroundings index={index} />
      </LegPart>
      <LegPart head="Delay and stops">
        <LegDelays index={index} rest={leg.kind === 'rest'} />
        <div className="mt-4 flex flex-wrap gap-2">{acts}</div>
      </LegPart>
    </div>
  )
}

function LegPart({ head, children }: { head: ReactNode; children: ReactNode }) {
  return (
    <div className="min-w-0 px-3.5 pb-3.5 pt-2.5">
      <h3 className="mb-2 flex min-h-8 items-center text-sub">{head}</h3>
      {children}
    </div>
  )
}
