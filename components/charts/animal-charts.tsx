'use client'

import { useMemo, useState } from 'react'
import { useUnit } from '@/components/ui/preferences'
import { corridorFromSheet, ledgerFromSheet } from '@/lib/views/charts/from-sheet'
import { narrowestMinute } from '@/lib/views/charts/reading'
import type { CorridorInput } from '@/lib/views/charts/types'
import type { SheetView } from '@/lib/views/sheet'
import { Corridor } from './corridor'
import { HeatLedger } from './heat-ledger'

/** Corridor, crate air and heat ledger of one animal of a sheet, under one reading line. */
export function AnimalCharts({
  view,
  animalId,
  dark,
}: {
  view: Pick<SheetView, 'animals' | 'legs' | 'charts'>
  animalId: string
  /** Stretches of the journey in the dark, minutes from departure. */
  dark?: CorridorInput['dark']
}) {
  const unit = useUnit()
  const input = useMemo(() => corridorFromSheet(view, animalId, unit, dark), [view, animalId, unit, dark])
  const heat = useMemo(() => ledgerFromSheet(view, animalId), [view, animalId])
  const [chosen, setChosen] = useState<number | null>(null)
  if (!input) return <p className="text-mute">No tracks are kept for this animal.</p>
  const minute = Math.min(input.endMin, chosen ?? narrowestMinute(input))
  return (
    <>
      <Corridor input={input} minute={minute} onMinute={setChosen} />
      {heat && (
        <div className="mt-6">
          <HeatLedger input={heat} minute={minute} departureMs={input.departureMs} zones={input.zones} />
        </div>
      )}
    </>
  )
}
