'use client'

import { useMemo, useState } from 'react'
import { Corridor } from '@/components/charts/corridor'
import { HeatLedger } from '@/components/charts/heat-ledger'
import { useUnit } from '@/components/ui/preferences'
import { VerdictKey } from '@/components/ui/verdict-cell'
import { corridorFromSheet, ledgerFromSheet } from '@/lib/views/charts/from-sheet'
import { legIndexAt, narrowestMinute } from '@/lib/views/charts/reading'
import type { DeskPageView } from '@/lib/views/desk-page'
import type { SheetView } from '@/lib/views/sheet'
import { PhoneLeg } from './phone-leg'

/** Corridor, air and heat of the animal in hand under one reading line; on a phone the leg it stands on comes first. */
export function AnimalPart({
  view,
  animalId,
  dark,
}: {
  view: SheetView
  animalId: string
  dark: DeskPageView['dark']
}) {
  const unit = useUnit()
  const input = useMemo(() => corridorFromSheet(view, animalId, unit, dark), [view, animalId, unit, dark])
  const heat = useMemo(() => ledgerFromSheet(view, animalId), [view, animalId])
  const [chosen, setChosen] = useState<number | null>(null)
  if (input === null) return <p className="pt-3.5 text-mute">No tracks are kept for this animal.</p>
  const minute = Math.min(input.endMin, chosen ?? narrowestMinute(input))
  const leg = view.legs[legIndexAt(input, minute)]
  const column = view.animals.findIndex((animal) => animal.animalId === animalId)
  const startOf = (index: number) => input.legs[index]?.startMin
  return (
    <div className="pt-3.5">
      {leg && (
        <PhoneLeg leg={leg} cell={leg.cells[column]} view={view} startOf={startOf} onMinute={setChosen} />
      )}
      <Corridor input={input} minute={minute} onMinute={setChosen} />
      {heat && (
        <div className="mt-6">
          <HeatLedger input={heat} minute={minute} departureMs={input.departureMs} zones={input.zones} />
        </div>
      )}
      <div className="mt-3 flex flex-wrap items-center gap-x-5 gap-y-1 text-small text-mute">
        <VerdictKey />
        <span>
          <b className="text-ink">critical</b> absolute, nobody overrides it
        </span>
        <span>
          <b className="text-ink">alarm</b> a vet may override it by name
        </span>
      </div>
    </div>
  )
}
