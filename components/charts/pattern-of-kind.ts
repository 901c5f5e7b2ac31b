import type { LegKind } from '@/lib/thermal/scenario'
import type { SurroundingsPattern } from '@/lib/views/sheet'

/** The pattern a leg's surroundings are drawn with, by the leg's kind. */
export const PATTERN_OF_KIND: Record<LegKind, SurroundingsPattern> = {
  road: 'van',
  shed: 'shed',
  ramp: 'ramp',
  flight: 'hold',
  sea: 'sea',
  rail: 'rail',
  border: 'customs',
  rest: 'rest',
}
