import type { Plan } from '@/lib/schemas/plan'
import type { Scenario } from '@/lib/thermal/scenario'

/**
 * Everything people decided, as one plain document to be hashed: a change to any of it voids what was signed. It leaves
 * out what they did not decide (species rows, spacing of the track, papers) and what does not touch the animals
 * (telephones, drivers, notes). Legs keep their order, animals and crates sort by id.
 */
export function planHashInput(plan: Plan, scenario: Scenario) {
  const {
    schema: _schema,
    outputStepS: _step,
    profiles: _profiles,
    initial: _initial,
    context,
    ...decided
  } = scenario
  return {
    schema: 'steadfold/plan@1',
    scenario: decided,
    context: context && {
      jurisdictions: context.jurisdictions,
      carriers: context.carriers,
      purpose: context.purpose,
    },
    animals: [...plan.animals].sort(byId).map((animal) => ({
      id: animal.id,
      name: animal.name,
      identification: animal.identification,
      breedNote: animal.breedNote,
      ageDays: animal.ageDays,
      sex: animal.sex,
      temperament: animal.temperament,
      crateTrained: animal.crateTrained,
      flags: [...animal.flags].sort(),
      medicines: animal.medicines,
      examinedOn: animal.examinedOn,
      examinedBy: animal.examinedBy,
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
    crates: [...plan.crates]
      .sort(byId)
      .map(({ id, letter, waterContainerL }) => ({ id, letter, waterContainerL })),
  }
}

function byId(a: { id: string }, b: { id: string }): number {
  return a.id < b.id ? -1 : a.id > b.id ? 1 : 0
}
