'use client'

import { useMemo } from 'react'
import { Corridor } from '@/components/charts/corridor'
import { CrateDrawing } from '@/components/crates/crate-drawing'
import { crateShape } from '@/components/crates/crate-shape'
import { useUnit } from '@/components/ui/preferences'
import { corridorFromSheet } from '@/lib/views/charts/from-sheet'
import type { ReviewCrate } from '@/lib/views/review'
import type { SheetView } from '@/lib/views/sheet'
import { crateNotes } from './crate-notes'

/** The crate as typed, and beside it what happens to each animal in it. */
export function ReviewPictures({
  crate,
  sheet,
}: {
  crate: ReviewCrate
  sheet: Pick<SheetView, 'animals' | 'legs' | 'charts'>
}) {
  const shape = useMemo(() => crateShape(crate.plan, crate.mark), [crate])
  const notes = useMemo(() => crateNotes(crate.plan), [crate])
  return (
    <div className="grid gap-4 wide:grid-cols-[364px_minmax(0,1fr)]">
      <section aria-labelledby="crate-title">
        <div className="mb-2 flex flex-wrap items-baseline gap-x-3">
          <h2 id="crate-title" className="text-section">
            Crate {crate.mark}
          </h2>
          <p className="text-caption text-mute">to scale, drawn from the figures typed</p>
        </div>
        <div className="border-2 border-ink bg-sheet p-2.5">
          {shape ? (
            <CrateDrawing shape={shape} notes={notes} />
          ) : (
            <p className="text-mute">A size is missing: it can’t be drawn.</p>
          )}
        </div>
      </section>
      <div className="min-w-0">
        {crate.animals.map((animal) => (
          <AnimalCorridor key={animal.animalId} animalId={animal.animalId} name={animal.name} sheet={sheet} />
        ))}
        {crate.animals.length === 0 && <p className="text-mute">No animal is in this crate.</p>}
      </div>
    </div>
  )
}

function AnimalCorridor({
  animalId,
  name,
  sheet,
}: {
  animalId: string
  name: string
  sheet: Pick<SheetView, 'animals' | 'legs' | 'charts'>
}) {
  const unit = useUnit()
  const input = useMemo(() => corridorFromSheet(sheet, animalId, unit), [sheet, animalId, unit])
  if (!input) return <p className="text-mute">No tracks are kept for {name}.</p>
  return <Corridor input={input} title={`Corridor, ${name}`} words="hatching from the alarm limit" />
}
