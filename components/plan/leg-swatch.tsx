import { PATTERN_OF_KIND } from '@/components/charts/pattern-of-kind'
import { PatternSwatch } from '@/components/charts/pattern-swatch'
import type { PlanLeg } from '@/lib/schemas/plan'

/** The pattern of a leg's surroundings, beside the leg's name. */
export function LegSwatch({ leg }: { leg: Pick<PlanLeg, 'kind'> }) {
  return <PatternSwatch pattern={PATTERN_OF_KIND[leg.kind]} />
}
