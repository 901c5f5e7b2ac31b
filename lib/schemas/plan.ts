import { z } from 'zod'
import { draftQuantity, quantity, requiredText, text } from './quantity'
import { withoutStrays } from './stray-fields'

/*
 * The plan as people type it: centimetres, kilograms, degrees Celsius, local times. One schema for the form, the action
 * and the tests. It shapes and bounds; what makes a journey impossible is said by lib/planning/reasons.ts, all at once.
 * Ids of animals, crates and legs are short strings minted by the form and stay the same through all revisions.
 */

const itemId = z.string().regex(/^[a-z0-9-]{1,24}$/, { error: 'This part has lost its id: add it again.' })

export const FACES = ['front', 'back', 'left', 'right', 'top'] as const
export const LEG_KINDS = ['road', 'shed', 'ramp', 'flight', 'sea', 'rail', 'border', 'rest'] as const
export const FLIGHT_PHASES = ['doors-shut-departure', 'airborne', 'doors-shut-arrival'] as const
export const WALL_MATERIALS = ['plywood', 'plastic', 'fibreboard', 'metal-mesh', 'insulated-foam'] as const
export const BEDDING_MATERIALS = [
  'none',
  'newspaper',
  'wood-shavings',
  'straw',
  'absorbent-pad',
  'foam',
] as const
export const ANIMAL_FLAGS = [
  'snub-nosed',
  'elderly',
  'juvenile',
  'pregnant',
  'sedated',
  'obese',
  'unacclimated',
  'ill',
] as const
export const PURPOSES = ['commercial', 'research', 'exhibition', 'private'] as const

export const telephone = (label: string) =>
  text(label, 40).refine((value) => value === '' || /^\+?[0-9 ()-]{6,}$/.test(value), {
    error: (issue) =>
      `${label} “${String(issue.input)}”: put digits with the country code, for example +44 7700 900100.`,
  })

export const localTime = (label: string) =>
  z.string().refine((value) => value === '' || /^\d{4}-\d{2}-\d{2}T\d{2}:\d{2}$/.test(value), {
    error: (issue) =>
      `${label} “${String(issue.input)}”: put a date and a time, for example 2026-06-09 09:20.`,
  })

const partySchema = z.object({
  name: text('Name', 120),
  address: text('Address', 300),
  telephone: telephone('Telephone'),
  email: text('E-mail', 200).refine((value) => value === '' || z.email().safeParse(value).success, {
    error: (issue) => `E-mail “${String(issue.input)}” is not an address.`,
  }),
})

export const coatSchema = z.object({
  depthMm: draftQuantity({ label: 'Coat depth', unit: 'mm', min: 0, max: 120 }),
  clipped: z.boolean(),
  wetPct: quantity({ label: 'Coat wet', unit: '%', min: 0, max: 100 }),
})

export const animalSchema = z.object({
  id: itemId,
  name: requiredText('Animal’s name or tag', 60),
  profileKey: text('Species', 40),
  breedNote: text('Breed', 80),
  identification: text('Identification', 80),
  sex: z.enum(['male', 'female', 'unknown']),
  ageDays: draftQuantity({ label: 'Age', unit: 'days', min: 0, max: 40_000 }),
  massKg: draftQuantity({ label: 'Mass', unit: 'kg', min: 0.005, max: 1_500 }),
  /** Identical animals in one box, day-old chicks for example, are one entry. */
  count: quantity({ label: 'How many', unit: 'animals', min: 1, max: 500 }).refine(
    Number.isInteger,
    'How many: put a whole number.',
  ),
  temperament: z.enum(['calm', 'anxious', 'unknown']),
  crateTrained: z.boolean(),
  coat: coatSchema,
  flags: z.array(z.enum(ANIMAL_FLAGS)),
  medicines: text('Medicines', 300),
  examinedOn: z
    .string()
    .refine((value) => value === '' || /^\d{4}-\d{2}-\d{2}$/.test(value), 'Date examined: put a date.'),
  examinedBy: text('Examined by', 120),
  lastFedLocal: localTime('Last fed'),
  lastWateredLocal: localTime('Last watered'),
})

export const openingSchema = z.object({
  id: itemId,
  face: z.enum(FACES),
  kind: z.enum(['door', 'slats', 'slots', 'holes', 'window']),
  widthCm: quantity({ label: 'Opening width', unit: 'cm', min: 0.2, max: 400 }),
  heightCm: quantity({ label: 'Opening height', unit: 'cm', min: 0.2, max: 400 }),
  howMany: quantity({ label: 'How many openings', unit: '', min: 1, max: 200 }).refine(
    Number.isInteger,
    'How many openings: put a whole number.',
  ),
  sillHeightCm: draftQuantity({ label: 'Sill above floor', unit: 'cm', min: 0, max: 300 }),
  meshOpenPct: quantity({ label: 'Mesh open', unit: '%', min: 5, max: 100 }),
  blockedPct: quantity({ label: 'Blocked', unit: '%', min: 0, max: 100 }),
})

export const crateSchema = z.object({
  id: itemId,
  /** "A", "B", …: with the consignment's mark it makes the crate mark. */
  letter: z.string().regex(/^[A-Z]$/, 'Crate letter: put one capital letter.'),
  crateModelId: z.number().int().positive().nullable(),
  form: z.enum(['crate', 'stall', 'pen']),
  lengthCm: draftQuantity({ label: 'Crate length inside', unit: 'cm', min: 10, max: 1_500 }),
  widthCm: draftQuantity({ label: 'Crate width inside', unit: 'cm', min: 10, max: 400 }),
  heightCm: draftQuantity({ label: 'Crate height inside', unit: 'cm', min: 8, max: 400 }),
  wallMaterial: z.enum(WALL_MATERIALS),
  wallThicknessMm: quantity({ label: 'Wall thickness', unit: 'mm', min: 0.5, max: 100 }),
  rimMm: quantity({ label: 'Rim', unit: 'mm', min: 0, max: 100 }),
  floorMaterial: z.enum([...WALL_MATERIALS, 'steel', 'aluminium', 'rubber']),
  floorThicknessMm: quantity({ label: 'Floor thickness', unit: 'mm', min: 0.5, max: 200 }),
  floorOnto: z.enum(['deck', 'slats', 'air']),
  bedding: z.object({
    material: z.enum(BEDDING_MATERIALS),
    depthMm: quantity({ label: 'Bedding depth', unit: 'mm', min: 0, max: 400 }),
    wetPct: quantity({ label: 'Bedding wet', unit: '%', min: 0, max: 100 }),
  }),
  waterContainerL: draftQuantity({ label: 'Water container', unit: 'L', min: 0, max: 100 }),
  openings: z.array(openingSchema).max(40, 'Openings: put at most 40 rows.'),
  /** Ids of the animals inside. */
  occupants: z.array(itemId),
})

const airFields = {
  airTempC: draftQuantity({ label: 'Air temperature', unit: '°C', min: -50, max: 60 }),
  relHumidityPct: draftQuantity({ label: 'Humidity', unit: '%', min: 0, max: 100 }),
}

export const weatherRowSchema = z.object({
  /** Counted from the start of the leg; the last row holds to the leg's end and through every delay. */
  minute: quantity({ label: 'Minute of the leg', unit: 'min', min: 0, max: 20_000 }),
  ...airFields,
  windMs: draftQuantity({ label: 'Wind', unit: 'm/s', min: 0, max: 40 }),
  solarWm2: draftQuantity({ label: 'Sun', unit: 'W/m²', min: 0, max: 1_300 }),
})

const openAirSchema = z.object({
  type: z.literal('open-air'),
  rows: z
    .array(weatherRowSchema)
    .min(1, 'Weather: put at least one row.')
    .max(60, 'Weather: put at most 60 rows.'),
  shadePct: quantity({ label: 'Shade', unit: '%', min: 0, max: 100 }),
})

const controlledSchema = z.object({
  type: z.literal('controlled'),
  ...airFields,
  airSpeedMs: quantity({ label: 'Air speed at the crates', unit: 'm/s', min: 0, max: 5 }),
  /** What lies outside, so that endurance after a failure can be told. Empty: unknown. */
  outside: openAirSchema.nullable(),
})

const enclosedSchema = z.object({
  type: z.literal('enclosed'),
  /** Legs that name the same space carry its air over: the three legs of a flight, a van's legs. */
  spaceName: text('Name of the space', 40),
  volumeM3: quantity({ label: 'Volume', unit: 'm³', min: 0.5, max: 5_000 }),
  heatTransferWK: quantity({ label: 'Heat through walls', unit: 'W/K', min: 1, max: 20_000 }),
  interiorMassKJK: quantity({ label: 'Inside mass', unit: 'kJ/K', min: 1, max: 50_000 }),
  /** Empty: unknown, and leakage alone is counted. */
  ventilationM3h: draftQuantity({ label: 'Fresh air', unit: 'm³/h', min: 0, max: 100_000 }),
  leakageM3h: quantity({ label: 'Leakage', unit: 'm³/h', min: 0, max: 10_000 }),
  solarApertureM2: quantity({ label: 'Sunlit glass', unit: 'm²', min: 0, max: 100 }),
  crateAirSpeedMs: quantity({ label: 'Air speed at the crates', unit: 'm/s', min: 0, max: 5 }),
  initialAirTempC: draftQuantity({ label: 'Air at the start', unit: '°C', min: -50, max: 70 }),
  conditioning: z
    .object({
      setPointC: draftQuantity({ label: 'Set-point', unit: '°C', min: -10, max: 40 }),
      /** Empty: nobody has asked yet. 0: the machine cannot. */
      coolingW: draftQuantity({ label: 'Cooling', unit: 'W', min: 0, max: 200_000 }),
      heatingW: draftQuantity({ label: 'Heating', unit: 'W', min: 0, max: 200_000 }),
    })
    .nullable(),
  outside: openAirSchema,
})

export const surroundingsSchema = z.discriminatedUnion('type', [
  controlledSchema,
  openAirSchema,
  enclosedSchema,
])

export const stopSchema = z.object({
  minute: quantity({ label: 'Stop, minutes into the leg', unit: 'min', min: 0, max: 20_000 }),
  kind: z.enum(['look', 'water', 'food']),
})

export const legSchema = z.object({
  id: itemId,
  kind: z.enum(LEG_KINDS),
  flightPhase: z.enum(FLIGHT_PHASES).nullable(),
  fromPlaceId: z.number().int().positive().nullable(),
  toPlaceId: z.number().int().positive().nullable(),
  /** Wall time at the from-place, and the offset chosen where the clock shows that hour twice (minutes east of UTC). */
  startLocal: localTime('Start'),
  startOffsetMin: z.number().int().nullable(),
  /** Wall time at the to-place. */
  endLocal: localTime('End'),
  endOffsetMin: z.number().int().nullable(),
  carrier: text('Carrier', 80),
  serviceNumber: text('Flight or service number', 40),
  surroundings: surroundingsSchema,
  pressureKPa: quantity({ label: 'Pressure', unit: 'kPa', min: 50, max: 110 }),
  outOfCrate: z.boolean(),
  partyInCharge: text('Party in charge', 120),
  partyTelephone: telephone('Telephone of the party in charge'),
  partyHours: text('Hours of the party in charge', 60),
  attended: z.boolean(),
  driverId: z.number().int().positive().nullable(),
  delayTypicalMin: quantity({ label: 'Delay, typical', unit: 'min', min: 0, max: 2_880 }),
  delayWorstMin: quantity({ label: 'Delay, worst', unit: 'min', min: 0, max: 2_880 }),
  stops: z.array(stopSchema).max(24, 'Stops: put at most 24.'),
  lastPointOfReturn: text('Last point of return', 120),
  fallback: text('Fallback kennel or vet', 160),
  note: text('Note', 500),
})

export const planSchema = z.object({
  shipperId: z.number().int().positive({ error: 'Shipper is missing.' }),
  purpose: z.enum(PURPOSES),
  consignor: partySchema,
  consignee: partySchema,
  /** Reachable for the whole journey. */
  emergencyContact: z.object({
    name: text('Emergency contact', 120),
    telephone: telephone('Emergency telephone'),
  }),
  handlingNote: text('Handling note', 1_000),
  animals: z.array(animalSchema).max(60, 'Animals: put at most 60 entries.'),
  crates: z.array(crateSchema).max(26, 'Crates: put at most 26.'),
  legs: z.array(legSchema).max(40, 'Legs: put at most 40.'),
})

export type Plan = z.infer<typeof planSchema>
export type PlanAnimal = z.infer<typeof animalSchema>
export type PlanCrate = z.infer<typeof crateSchema>
export type PlanOpening = z.infer<typeof openingSchema>
export type PlanLeg = z.infer<typeof legSchema>
export type PlanSurroundings = z.infer<typeof surroundingsSchema>
export type PlanOpenAir = z.infer<typeof openAirSchema>
export type PlanWeatherRow = z.infer<typeof weatherRowSchema>

/** A place as the plan refers to it: what the clock, the sun and the law need. */
export interface PlanPlace {
  id: number
  name: string
  kind: string
  country: string
  zone: string
  latitudeDeg: number
  longitudeDeg: number
}

/** Saving names the version that was opened; a second editor's save is refused and shown both. */
export const savePlanSchema = z.object({
  consignmentId: z.number().int().positive().nullable(),
  version: z.number().int().nonnegative().nullable(),
  requestId: z.uuid(),
  plan: withoutStrays(planSchema, 'a plan'),
})
export type SavePlan = z.infer<typeof savePlanSchema>
