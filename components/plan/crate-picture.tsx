import { CrateDrawing } from '@/components/crates/crate-drawing'
import { crateShape } from '@/components/crates/crate-shape'
import { useMemo } from 'react'
import type { PlanCrate } from '@/lib/schemas/plan'
import { figure } from '@/lib/views/format'
import { BEDDING_WORDS } from './option-words'

/** The crate as typed, drawn to scale; while a figure is missing or unreadable it says what a drawing needs. */
export function CratePicture({ crate, mark }: { crate: PlanCrate; mark: string | null }) {
  const shape = useMemo(
    () => (isReadable(crate) ? crateShape(crate, `${mark ?? '0000'}-${crate.letter}`) : null),
    [crate, mark],
  )
  const { material, depthMm } = crate.bedding
  const notes = useMemo(
    () =>
      material === 'none'
        ? []
        : [`${BEDDING_WORDS[material].toLowerCase()} ${figure(Number(depthMm))}\u00a0mm`],
    [material, depthMm],
  )
  if (shape === null) {
    return (
      <p className="max-w-60 text-small text-mute">
        Type length, width and height to see crate {crate.letter} drawn.
      </p>
    )
  }
  return (
    <div className="w-[364px] max-w-full">
      <CrateDrawing shape={shape} notes={notes} />
    </div>
  )
}

/** While somebody types, a figure may be text that cannot be read yet. */
function isReadable(crate: PlanCrate): boolean {
  const figures: unknown[] = [
    crate.lengthCm,
    crate.widthCm,
    crate.heightCm,
    ...crate.openings.flatMap((row) => [
      row.widthCm,
      row.heightCm,
      row.howMany,
      row.meshOpenPct,
      row.blockedPct,
    ]),
  ]
  return figures.every((value) => typeof value === 'number' && Number.isFinite(value) && value >= 0)
}
