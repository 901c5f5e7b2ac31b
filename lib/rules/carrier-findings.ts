import type { Scenario } from '@/lib/thermal'
import type { Finding } from './result'
import { type Subject, isAboard } from './subject'

const CONSENT = 'carrier-consent'

/** A sedated animal does not fly without the carrier's written consent; the paper changes the finding itself. */
export function carrierFindings(scenario: Scenario, subjects: readonly Subject[]): Finding[] {
  return subjects
    .filter(({ animal }) => animal.flags.includes('sedated'))
    .flatMap((subject) => {
      const { animal, crate } = subject
      const consented =
        scenario.context?.papers.some(
          ({ kind, animalIds }) =>
            kind === CONSENT && (animalIds.length === 0 || animalIds.includes(animal.id)),
        ) ?? false
      const flights = scenario.legs.filter((leg, index) => leg.kind === 'flight' && isAboard(subject, index))
      return flights.map((leg) => ({
        rule: 'carrier-sedated-by-air',
        basis: 'carrier' as const,
        status: consented ? ('met' as const) : ('breach' as const),
        animalId: animal.id,
        crateId: crate.id,
        legId: leg.id,
        asked: 'No sedated animal by air without the carrier’s written consent.',
        note: consented
          ? 'The carrier’s written consent is attached.'
          : 'Sedated, and no written consent of the carrier is attached.',
        sourceTag: 'judgement' as const,
        overridable: false,
      }))
    })
}
