import type { Plan, PlanAnimal, PlanCrate, PlanLeg, PlanOpening } from '@/lib/schemas/plan'
import { offeredLeg } from './offers'

/** A plan with nothing in it yet, for one shipper. */
export function emptyPlan(shipperId: number): Plan {
  return {
    shipperId,
    purpose: 'commercial',
    consignor: { name: '', address: '', telephone: '', email: '' },
    consignee: { name: '', address: '', telephone: '', email: '' },
    emergencyContact: { name: '', telephone: '' },
    handlingNote: '',
    animals: [],
    crates: [],
    legs: [],
  }
}

/** An animal nobody has described yet. The id is new within the plan and stays through all revisions. */
export function newAnimal(plan: Pick<Plan, 'animals'>): PlanAnimal {
  return {
    id: nextId('animal', plan.animals),
    name: '',
    profileKey: '',
    breedNote: '',
    identification: '',
    sex: 'unknown',
    ageDays: null,
    massKg: null,
    count: 1,
    temperament: 'unknown',
    crateTrained: false,
    coat: { depthMm: null, clipped: false, wetPct: 0 },
    flags: [],
    medicines: '',
    examinedOn: '',
    examinedBy: '',
    lastFedLocal: '',
    lastWateredLocal: '',
  }
}

/** What a crate model says of every crate of its kind: everything but who is inside and what it is called. */
export type CrateModelPlan = Omit<PlanCrate, 'id' | 'letter' | 'crateModelId' | 'occupants'>

/** A crate of a model, with the next free letter, empty. Without a model: a plywood crate with no openings drawn yet. */
export function newCrate(
  plan: Pick<Plan, 'crates'>,
  model: { id: number; plan: CrateModelPlan } | null,
): PlanCrate {
  const made = model?.plan ?? UNDRAWN_CRATE
  return {
    ...structuredClone(made),
    id: nextId('crate', plan.crates),
    letter: nextLetter(plan.crates),
    crateModelId: model?.id ?? null,
    occupants: [],
  }
}

export function newOpening(crate: Pick<PlanCrate, 'openings'>): PlanOpening {
  return {
    id: nextId('opening', crate.openings),
    face: 'front',
    kind: 'slats',
    widthCm: 20,
    heightCm: 10,
    howMany: 1,
    sillHeightCm: null,
    meshOpenPct: 100,
    blockedPct: 0,
  }
}

/** A leg that goes on where and when the last one ends, in surroundings offered for its kind. */
export function newLeg(
  plan: Pick<Plan, 'legs'>,
  kind: PlanLeg['kind'],
  flightPhase: PlanLeg['flightPhase'] = null,
): PlanLeg {
  const before = plan.legs.at(-1)
  const stays = kind !== 'road' && kind !== 'sea' && kind !== 'rail' && flightPhase !== 'airborne'
  const { mark: _mark, ...offered } = offeredLeg(kind, flightPhase)
  return {
    id: nextId('leg', plan.legs),
    kind,
    flightPhase,
    fromPlaceId: before?.toPlaceId ?? null,
    toPlaceId: stays ? (before?.toPlaceId ?? null) : null,
    startLocal: before?.endLocal ?? '',
    startOffsetMin: before?.endOffsetMin ?? null,
    endLocal: '',
    endOffsetMin: null,
    carrier: kind === 'flight' ? (before?.carrier ?? '') : '',
    serviceNumber: kind === 'flight' ? (before?.serviceNumber ?? '') : '',
    ...offered,
    outOfCrate: false,
    partyInCharge: '',
    partyTelephone: '',
    partyHours: '',
    attended: false,
    driverId: null,
    stops: [],
    lastPointOfReturn: '',
    fallback: '',
    note: '',
  }
}

/** A flight as three legs: doors shut on the stand, airborne, doors shut on arrival. */
export function newFlight(plan: Pick<Plan, 'legs'>): PlanLeg[] {
  const legs = [...plan.legs]
  for (const phase of ['doors-shut-departure', 'airborne', 'doors-shut-arrival'] as const) {
    legs.push(newLeg({ legs }, 'flight', phase))
  }
  return legs.slice(plan.legs.length)
}

const UNDRAWN_CRATE: CrateModelPlan = {
  form: 'crate',
  lengthCm: null,
  widthCm: null,
  heightCm: null,
  wallMaterial: 'plywood',
  wallThicknessMm: 9,
  rimMm: 20,
  floorMaterial: 'plywood',
  floorThicknessMm: 12,
  floorOnto: 'deck',
  bedding: { material: 'absorbent-pad', depthMm: 5, wetPct: 0 },
  waterContainerL: null,
  openings: [],
}

/** Ids of one kind count on from the highest ever seen in the plan, so that a deleted part's id is not reused at once. */
function nextId(noun: string, parts: readonly { id: string }[]): string {
  const highest = parts.reduce((max, { id }) => Math.max(max, Number(/-(\d+)$/.exec(id)?.[1] ?? 0)), 0)
  return `${noun}-${highest + 1}`
}

function nextLetter(crates: readonly { letter: string }[]): string {
  const taken = new Set(crates.map(({ letter }) => letter))
  const letters = Array.from({ length: 26 }, (_, index) => String.fromCharCode(65 + index))
  return letters.find((letter) => !taken.has(letter)) ?? 'Z'
}
