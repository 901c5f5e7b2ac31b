import { swatch } from '@/lib/views/charts/hatch'
import type { SurroundingsPattern } from '@/lib/views/sheet'
import { Marks } from './marks'

/** A small window on a leg's surroundings; the leg's name always stands beside it. */
export function PatternSwatch({
  pattern,
  width = 34,
  height = 18,
}: {
  pattern: SurroundingsPattern
  width?: number
  height?: number
}) {
  return (
    <svg width={width} height={height} aria-hidden="true" className="inline-block shrink-0">
      <Marks marks={swatch(pattern, { x: 0, y: 0, width, height })} />
    </svg>
  )
}
