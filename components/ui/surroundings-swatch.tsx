import { Marks } from '@/components/charts/marks'
import { swatch } from '@/lib/views/charts/hatch'
import type { SurroundingsPattern } from '@/lib/views/sheet'

export const SURROUNDINGS_WORDS: Record<SurroundingsPattern, string> = {
  van: 'van',
  shed: 'shed',
  ramp: 'ramp',
  hold: 'hold',
  customs: 'customs',
  sea: 'sea',
  rail: 'rail',
  rest: 'rest',
}

/** A small window on a leg's surroundings; its words stand beside it. */
export function SurroundingsSwatch({
  pattern,
  width = 34,
  height = 18,
}: {
  pattern: SurroundingsPattern
  width?: number
  height?: number
}) {
  return (
    <svg aria-hidden="true" width={width} height={height} className="inline-block shrink-0 align-middle">
      <Marks marks={swatch(pattern, { x: 0, y: 0, width, height })} />
    </svg>
  )
}

/** All patterns with their words; stands once under a picture that is hatched. */
export function SurroundingsKey({ patterns }: { patterns: readonly SurroundingsPattern[] }) {
  return (
    <p className="flex flex-wrap items-center gap-x-4 gap-y-1 text-small text-mute">
      {patterns.map((pattern) => (
        <span key={pattern} className="inline-flex items-center gap-1.5">
          <SurroundingsSwatch pattern={pattern} />
          {SURROUNDINGS_WORDS[pattern]}
        </span>
      ))}
    </p>
  )
}
