import { Marks } from '@/components/charts/marks'
import type { PlanLeg } from '@/lib/schemas/plan'
import { swatch } from '@/lib/views/charts/hatch'
import type { SurroundingsPattern } from '@/lib/views/sheet'

const PATTERNS: Record<PlanLeg['kind'], SurroundingsPattern> = {
  road: 'van',
  shed: 'shed',
  ramp: 'ramp',
  flight: 'hold',
  sea: 'sea',
  rail: 'rail',
  border: 'customs',
  rest: 'rest',
}

/** The pattern a leg's surroundings are drawn with. */
export function patternOf(leg: Pick<PlanLeg, 'kind'>): SurroundingsPattern {
  return PATTERNS[leg.kind]
}

/** A small window on it, beside the leg's name. */
export function LegSwatch({ leg }: { leg: Pick<PlanLeg, 'kind'> }) {
  return (
    <svg width="34" height="18" aria-hidden="true" className="inline-block shrink-0">
      <Marks marks={swatch(patternOf(leg), { x: 0, y: 0, width: 34, height: 18 })} />
    </svg>
  )
}
