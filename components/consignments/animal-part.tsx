'use client'

import { AnimalCharts } from '@/components/charts/animal-charts'
import { VerdictKey } from '@/components/ui/verdict-cell'
import type { DeskPageView } from '@/lib/views/desk-page'
import type { SheetView } from '@/lib/views/sheet'

/** Corridor, air and heat of the animal in hand. */
export function AnimalPart({
  view,
  animalId,
  dark,
}: {
  view: SheetView
  animalId: string
  dark: DeskPageView['dark']
}) {
  return (
    <div className="pt-3.5">
      <AnimalCharts key={animalId} view={view} animalId={animalId} dark={dark} />
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
