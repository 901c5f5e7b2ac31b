import type { Plan, PlanAnimal, PlanCrate, PlanLeg, PlanOpening, PlanSurroundings } from '@/lib/schemas/plan'

/*
 * What the choices of the plan are called on the page. Order is the order of the lists people choose from.
 */

export interface Option<V extends string = string> {
  value: V
  words: string
}

function options<V extends string>(words: Record<V, string>): readonly Option<V>[] {
  return (Object.keys(words) as V[]).map((value) => ({ value, words: words[value] }))
}

export const KIND_WORDS: Record<PlanLeg['kind'], string> = {
  road: 'Road',
  shed: 'Shed',
  ramp: 'Ramp',
  flight: 'Flight',
  sea: 'Sea',
  rail: 'Rail',
  border: 'Border post',
  rest: 'Rest stop',
}

export const PHASE_WORDS: Record<NonNullable<PlanLeg['flightPhase']>, string> = {
  'doors-shut-departure': 'Doors shut on stand',
  airborne: 'Airborne',
  'doors-shut-arrival': 'Doors shut on arrival',
}

export const SURROUNDINGS_WORDS: Record<PlanSurroundings['type'], string> = {
  controlled: 'Held at a set-point',
  'open-air': 'Open air',
  enclosed: 'Enclosed, own air',
}

export const PURPOSE_WORDS: Record<Plan['purpose'], string> = {
  commercial: 'Commercial',
  research: 'Research',
  exhibition: 'Exhibition',
  private: 'Private',
}

export const SEX_WORDS: Record<PlanAnimal['sex'], string> = {
  female: 'Female',
  male: 'Male',
  unknown: 'Not known',
}

export const TEMPERAMENT_WORDS: Record<PlanAnimal['temperament'], string> = {
  calm: 'Calm',
  anxious: 'Anxious',
  unknown: 'Not known',
}

export const FLAG_WORDS: Record<PlanAnimal['flags'][number], string> = {
  'snub-nosed': 'Snub-nosed',
  elderly: 'Elderly',
  juvenile: 'Juvenile',
  pregnant: 'Pregnant',
  sedated: 'Sedated',
  obese: 'Obese',
  unacclimated: 'Not acclimated',
  ill: 'Ill, or was lately',
}

export const FORM_WORDS: Record<PlanCrate['form'], string> = {
  crate: 'Crate',
  stall: 'Stall, open at the top',
  pen: 'Pen, open at the top',
}

export const WALL_WORDS: Record<PlanCrate['wallMaterial'], string> = {
  plywood: 'Plywood',
  plastic: 'Plastic',
  fibreboard: 'Fibreboard',
  'metal-mesh': 'Metal mesh',
  'insulated-foam': 'Insulated foam',
}

export const FLOOR_WORDS: Record<PlanCrate['floorMaterial'], string> = {
  ...WALL_WORDS,
  steel: 'Steel',
  aluminium: 'Aluminium',
  rubber: 'Rubber',
}

export const ONTO_WORDS: Record<PlanCrate['floorOnto'], string> = {
  deck: 'On the deck',
  slats: 'On slats',
  air: 'Raised, air under it',
}

export const BEDDING_WORDS: Record<PlanCrate['bedding']['material'], string> = {
  none: 'None',
  newspaper: 'Newspaper',
  'wood-shavings': 'Wood shavings',
  straw: 'Straw',
  'absorbent-pad': 'Absorbent pad',
  foam: 'Foam',
}

export const FACE_WORDS: Record<PlanOpening['face'], string> = {
  front: 'Front',
  left: 'Left',
  right: 'Right',
  back: 'Back',
  top: 'Top',
}

export const OPENING_WORDS: Record<PlanOpening['kind'], string> = {
  door: 'Door mesh',
  slats: 'Slats',
  slots: 'Slots',
  holes: 'Holes',
  window: 'Window',
}

export const STOP_WORDS: Record<PlanLeg['stops'][number]['kind'], string> = {
  look: 'Look and read',
  water: 'Water',
  food: 'Food',
}

export const PURPOSE_OPTIONS = options(PURPOSE_WORDS)
export const SEX_OPTIONS = options(SEX_WORDS)
export const TEMPERAMENT_OPTIONS = options(TEMPERAMENT_WORDS)
export const FLAG_OPTIONS = options(FLAG_WORDS)
export const FORM_OPTIONS = options(FORM_WORDS)
export const WALL_OPTIONS = options(WALL_WORDS)
export const FLOOR_OPTIONS = options(FLOOR_WORDS)
export const ONTO_OPTIONS = options(ONTO_WORDS)
export const BEDDING_OPTIONS = options(BEDDING_WORDS)
export const FACE_OPTIONS = options(FACE_WORDS)
export const OPENING_OPTIONS = options(OPENING_WORDS)
export const STOP_OPTIONS = options(STOP_WORDS)
export const SURROUNDINGS_OPTIONS = options(SURROUNDINGS_WORDS)
/** A flight is added as three legs, never as one. */
export const SINGLE_LEG_KINDS = options(KIND_WORDS).filter(({ value }) => value !== 'flight')

/** "Ramp", or the part of a flight: "Doors shut on arrival". */
export function legName(leg: Pick<PlanLeg, 'kind' | 'flightPhase'>): string {
  return leg.flightPhase === null ? KIND_WORDS[leg.kind] : PHASE_WORDS[leg.flightPhase]
}
