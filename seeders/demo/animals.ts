import type { PlanAnimal, PlanCrate, PlanOpening } from '@/lib/schemas/plan'

type Given<T, Required extends keyof T> = Pick<T, Required> & Partial<T>

/** An animal as a dispatcher would type it: rested, calm, examined yesterday unless said otherwise. */
export function animal(given: Given<PlanAnimal, 'id' | 'name' | 'profileKey' | 'massKg'>): PlanAnimal {
  return {
    breedNote: '',
    identification: '',
    sex: 'unknown',
    ageDays: 1_200,
    count: 1,
    temperament: 'calm',
    crateTrained: true,
    coat: { depthMm: null, clipped: false, wetPct: 0 },
    flags: [],
    medicines: '',
    examinedOn: '',
    examinedBy: '',
    lastFedLocal: '',
    lastWateredLocal: '',
    ...given,
  }
}

interface Box {
  letter: string
  sizeCm: readonly [length: number, width: number, height: number]
  occupants: string[]
  openings: PlanOpening[]
  given?: Partial<PlanCrate>
}

export function crate({ letter, sizeCm, occupants, openings, given }: Box): PlanCrate {
  const [lengthCm, widthCm, heightCm] = sizeCm
  return {
    id: `crate-${letter.toLowerCase()}`,
    letter,
    crateModelId: null,
    form: 'crate',
    lengthCm,
    widthCm,
    heightCm,
    wallMaterial: 'plywood',
    wallThicknessMm: 9,
    rimMm: 20,
    floorMaterial: 'plywood',
    floorThicknessMm: 12,
    floorOnto: 'deck',
    bedding: { material: 'absorbent-pad', depthMm: 20, wetPct: 0 },
    waterContainerL: 0.5,
    openings,
    occupants,
    ...given,
  }
}

/** A slatted crate: mesh door at the front, slats left and right, slots at the back. */
export function slatted(
  [lengthCm, widthCm, heightCm]: readonly [number, number, number],
  blockedRightPct = 0,
): PlanOpening[] {
  const slatWide = Math.round(lengthCm * 0.82)
  return [
    opening('opening-1', 'front', 'door', Math.round(widthCm * 0.74), Math.round(heightCm * 0.74), 1, 70),
    opening('opening-2', 'left', 'slats', slatWide, Math.round(heightCm * 0.62) / 10, 4, 100),
    opening(
      'opening-3',
      'right',
      'slats',
      slatWide,
      Math.round(heightCm * 0.62) / 10,
      4,
      100,
      blockedRightPct,
    ),
    opening(
      'opening-4',
      'back',
      'slots',
      Math.round(widthCm * 0.16 * 10) / 10,
      Math.round(heightCm * 0.86) / 10,
      8,
      100,
    ),
  ]
}

export function opening(
  id: string,
  face: PlanOpening['face'],
  kind: PlanOpening['kind'],
  widthCm: number,
  heightCm: number,
  howMany: number,
  meshOpenPct: number,
  blockedPct = 0,
): PlanOpening {
  return { id, face, kind, widthCm, heightCm, howMany, sillHeightCm: null, meshOpenPct, blockedPct }
}
