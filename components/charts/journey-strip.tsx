import { journeyStrip } from '@/lib/views/charts/journey-strip'
import type { StripLeg, StripOptions } from '@/lib/views/charts/journey-strip'
import { PictureSvg } from './picture'

/** Legs as a bar in true time. Words beside it say the same; give a summary where none do. */
export function JourneyStrip({
  legs,
  summary,
  ...options
}: { legs: readonly StripLeg[]; summary?: string } & StripOptions) {
  return <PictureSvg picture={journeyStrip(legs, options)} summary={summary} />
}
