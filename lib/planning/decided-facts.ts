import type { DecidedFacts } from '@/lib/rules/hash'
import type { Plan } from '@/lib/schemas/plan'

/** What the plan hash covers besides the scenario. */
export interface PlanFacts extends DecidedFacts {
  animals: (DecidedFacts['animals'][number] & { temperament: string })[]
  legs: (DecidedFacts['legs'][number] & {
    fromPlaceId: number | null
    toPlaceId: number | null
    serviceNumber: string
    stops: readonly { minute: number; kind: string }[]
  })[]
  crates: { id: string; waterContainerL: number | null }[]
}

/**
 * What people decided that the engine never sees: a change to any of it voids what was signed. Telephones, drivers and
 * notes are left out; they touch no animal.
 */
export function decidedFacts(plan: Plan): PlanFacts {
  return {
    animals: plan.animals.map((animal) => ({
      id: animal.id,
      name: animal.name,
      identification: animal.identification,
      breedNote: animal.breedNote,
      medicines: animal.medicines,
      lastExamination: [animal.examinedOn, animal.examinedBy].filter((part) => part !== '').join(', '),
      temperament: animal.temperament,
    })),
    legs: plan.legs.map((leg) => ({
      id: leg.id,
      fromPlaceId: leg.fromPlaceId,
      toPlaceId: leg.toPlaceId,
      carrier: leg.carrier,
      serviceNumber: leg.serviceNumber,
      partyInCharge: leg.partyInCharge,
      stops: leg.stops,
    })),
    crates: plan.crates.map(({ id, waterContainerL }) => ({ id, waterContainerL })),
  }
}
