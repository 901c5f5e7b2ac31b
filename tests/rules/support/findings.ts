import fc from 'fast-check'
import type { Finding } from '@/lib/rules/result'

/** A finding about Otto in crate A on the ramp; everything that matters is named by the test. */
export function aFinding(parts: Partial<Finding> = {}): Finding {
  return {
    rule: 'a-rule',
    basis: 'physiology',
    status: 'met',
    animalId: 'otto',
    crateId: 'a',
    legId: 'ramp',
    asked: 'Something.',
    note: 'Something was found.',
    sourceTag: 'judgement',
    overridable: false,
    ...parts,
  }
}

const margin = fc.option(
  fc.integer({ min: -30, max: 30 }).map((steps) => steps / 2),
  { nil: undefined },
)

/** Any finding about Otto, with any kind, margins and permission to override, even impossible ones. */
export const anyFinding: fc.Arbitrary<Finding> = fc
  .record({
    rule: fc.constantFrom(
      'core-critical-high',
      'core-alarm-high',
      'cold-effort',
      'us-9cfr-3.16e-temperature',
      'house-air-ceiling',
      'carbon-dioxide',
    ),
    basis: fc.constantFrom<Finding['basis']>('law', 'standard', 'carrier', 'house', 'physiology'),
    status: fc.constantFrom<Finding['status']>('met', 'note', 'condition', 'breach', 'judgement', 'unknown'),
    limitKind: fc.constantFrom<NonNullable<Finding['limitKind']>>(
      'critical',
      'alarm',
      'cold-effort',
      'other',
    ),
    side: fc.constantFrom<NonNullable<Finding['side']>>('high', 'low'),
    legId: fc.constantFrom('van', 'ramp', undefined),
    marginOutsideAirC: margin,
    marginMin: fc.option(fc.integer({ min: -200, max: 240 }), { nil: undefined }),
    overridable: fc.boolean(),
    minutesPast: fc.option(fc.integer({ min: 0, max: 300 }), { nil: undefined }),
    worstBodyC: fc.option(fc.double({ min: 30, max: 45, noNaN: true }), { nil: undefined }),
  })
  .map((parts) => aFinding(parts))
