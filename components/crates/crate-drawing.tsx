'use client'

import { useMemo } from 'react'
import { PictureSvg } from '@/components/charts/picture'
import { useWidth } from '@/components/hooks/use-width'
import { crateDrawing, crateSummary } from '@/lib/views/charts/crate'
import type { CrateShape } from '@/lib/views/charts/crate'

/** A crate drawn from its typed figures: four sides, floor and top to one scale, open share over each, the blocked part hatched. */
export function CrateDrawing({ shape, notes = [] }: { shape: CrateShape; notes?: readonly string[] }) {
  const [box, measured] = useWidth<HTMLDivElement>()
  const width = Math.min(measured ?? 364, 520)
  const picture = useMemo(() => crateDrawing(shape, { width, notes }), [shape, width, notes])
  return (
    <div ref={box}>
      <PictureSvg picture={picture} summary={crateSummary(shape)} />
    </div>
  )
}
