/**
 * The engine's input: one plain document, SI units in the field names.
 * The zod twin in lib/schemas/scenario.ts holds ranges, defaults and their sources; the compiler asserts that both agree.
 * Every default is already filled in here: what reaches the engine is complete.
 */

export type LegKind = 'road' | 'shed' | 'ramp' | 'flight' | 'sea' | 'rail' | 'border' | 'rest'
export type FlightPhase = 'doors-shut-departure' | 'airborne' | 'doors-shut-arrival'
export type Face = 'front' | 'back' | 'left' | 'right' | 'top'
export type Activity = 'asleep' | 'resting' | 'alert' | 'distressed'
export type AnimalFlag =
  'snub-nosed' | 'elderly' | 'juvenile' | 'pregnant' | 'sedated' | 'obese' | 'unacclimated' | 'ill'

/** The same animal run three ways (typical, prone to heat, prone to cold). A run gives all animals one variant. */
export type Variant = 'typical' | 'heat-prone' | 'cold-prone'
export const VARIANTS: readonly Variant[] = ['typical', 'heat-prone', 'cold-prone']

export interface Scenario {
  schema: 'steadfold/scenario@1'
  /** Milliseconds since the epoch, UTC: the planned start of the first leg. */
  departureMs: number
  /** Spacing of the reported track in seconds (30 to 600), not of the integration. */
  outputStepS: number
  profiles?: Record<string, ProfileRow>
  limits: LimitChange[]
  context?: RuleContext
  initial?: InitialState[]
  legs: Leg[]
  crates: Crate[]
}

/** A species row in force: its version and its values as lib/species declares them. */
export interface ProfileRow {
  version: number
  values: ProfileValues
}

export interface LimitChange {
  /** "profile", a crate id or an animal id. */
  scope: string
  coreCriticalLowC?: number
  coreAlarmLowC?: number
  coreAlarmHighC?: number
  coreCriticalHighC?: number
  airLowC?: number
  airHighC?: number
  reason: string
}

export interface RuleContext {
  jurisdictions: string[]
  carriers: CarrierContext[]
  papers: Paper[]
  purpose: 'commercial' | 'research' | 'exhibition' | 'private'
}

export interface CarrierContext {
  id: string
  rules: string[]
}

export interface Paper {
  kind: string
  animalIds: string[]
  issuedMs?: number
  expiresMs?: number
  /** Figures the paper states, e.g. { minAirC: 4.4 } on an acclimation certificate. */
  values: Record<string, number>
}

export interface Leg {
  id: string
  kind: LegKind
  flightPhase?: FlightPhase
  durationMin: number
  surroundings: Surroundings
  pressureKPa: number
  delay: { typicalMin: number; worstMin: number }
  outOfCrate: boolean
  attended: boolean
  place?: LegPlace
  events: LegEvent[]
}

export interface LegPlace {
  latitudeDeg?: number
  longitudeDeg?: number
  headingDeg?: number
  /** ISO 3166-1 alpha-2. */
  fromCountry?: string
  toCountry?: string
}

export interface LegEvent {
  /** Counted from the start of the leg. */
  minute: number
  durationMin: number
  kind: 'door' | 'fan' | 'conditioning'
  openAreaM2?: number
}

export type Surroundings = ControlledAir | OpenAir | EnclosedSpace

/** Air held at a set-point by somebody else's machine. */
export interface ControlledAir {
  type: 'controlled'
  airTempC: number
  relHumidityPct: number
  airSpeedMs: number
  /** Default: the air temperature. */
  surfaceTempC: number
  outsideCo2Ppm: number
  /** What lies outside, for endurance after a failure. Absent: endurance is unknown. */
  outside?: OpenAir
}

export interface OpenAir {
  type: 'open-air'
  /** Minutes count from departure; a single point means constant. Linear between points. */
  series: WeatherPoint[]
  source?: 'typed' | 'forecast'
  issuedAtMs?: number
  shadePct: number
  groundTempC?: number
  groundAlbedo: number
  windHeightM: number
}

export interface WeatherPoint {
  minute: number
  airTempC: number
  relHumidityPct: number
  windMs: number
  /** Global horizontal. */
  solarWm2: number
  diffuseWm2?: number
  skyTempC?: number
}

/** A vehicle, hold or shed whose air is itself a state: it warms with what it carries. */
export interface EnclosedSpace {
  type: 'enclosed'
  volumeM3: number
  /** UA to outside. */
  heatTransferWK: number
  interiorMassKJK: number
  /** Outside air by fans or openings; absent means unknown, and then leakage alone counts. */
  ventilationM3h?: number
  leakageM3h: number
  solarApertureM2: number
  solarTransmittance: number
  crateAirSpeedMs: number
  initialAirTempC?: number
  initialRelHumidityPct?: number
  wallTempC?: number
  conditioning?: { setPointC: number; coolingW: number; heatingW: number }
  otherLoad?: { sensibleW: number; moistureGh: number; co2Lh: number }
  /** Enclosed again at most once: a van on a ferry deck. */
  outside: Surroundings
  /** Legs that name the same compartment carry its air, walls, vapour and CO2 over. */
  compartmentId?: string
}

export interface Crate {
  id: string
  mark: string
  form: 'crate' | 'stall' | 'pen'
  fromLegId?: string
  toLegId?: string
  /** Inside dimensions. Length runs front to back. */
  lengthM: number
  widthM: number
  heightM: number
  wall?: CrateWall
  openings: Opening[]
  byLeg: CrateOnLeg[]
  floor?: CrateFloor
  bedding?: Bedding
  /** Only air is simulated so far; the schema refuses water and packs. */
  medium: 'air'
  initialAirTempC?: number
  initialRelHumidityPct?: number
  occupants: Animal[]
}

export type WallMaterial = 'plywood' | 'plastic' | 'fibreboard' | 'metal-mesh' | 'insulated-foam'

export interface CrateWall {
  material: WallMaterial
  thicknessMm: number
  openPct?: number
  massKg?: number
  emissivity?: number
  solarAbsorptance?: number
}

export interface Opening {
  face: Face
  areaM2: number
  widthM?: number
  heightM?: number
  sillHeightM?: number
  rimMm?: number
  meshMm?: number
  /** Free share of the mesh, 100 = no mesh. */
  meshOpenPct: number
  blockedPct: number
}

export interface CrateOnLeg {
  legId: string
  blockedPct: Partial<Record<Face, number>>
  clearanceMm?: number
  headingDeg?: number
  shadePct?: number
}

export interface CrateFloor {
  material: WallMaterial | 'steel' | 'aluminium' | 'rubber'
  thicknessMm: number
  onto: 'deck' | 'slats' | 'air'
  airGapMm?: number
}

export interface Bedding {
  material: 'none' | 'newspaper' | 'wood-shavings' | 'straw' | 'absorbent-pad' | 'foam'
  depthMm: number
  wetPct: number
  massKg?: number
}

export interface Animal {
  id: string
  /** A species profile's key, e.g. "snub-nosed-dog". */
  profile: string
  massKg: number
  count: number
  ageDays?: number
  lengthM?: number
  sex?: 'male' | 'female'
  /** Default: the profile's set-point (endotherms) or the crate air (ectotherms). */
  bodyTempC?: number
  coat?: Coat
  activity: Activity
  activityByLeg?: Record<string, Activity>
  activityDecayMin: number
  posture?: 'curled' | 'lying' | 'standing'
  hoursSinceFed?: number
  /** Minutes from departure at which water, and food, are offered; read by the rules. */
  waterOfferedMin?: number[]
  foodOfferedMin?: number[]
  acclimatedToC?: number
  flags: AnimalFlag[]
  /** What it was given, in words; the rules ask a vet, no figure depends on it. */
  medicines?: string
}

export interface Coat {
  depthMm?: number
  conductivityWmK?: number
  /** Share of full wetting, 0 to 100. */
  wetPct?: number
  waterKgM2?: number
  clipped?: boolean
}

/** Where an earlier run ended, one per variant; restarts a journey on the road. */
export interface InitialState {
  variant: Variant
  crates: {
    id: string
    airTempC: number
    wallTempC: number
    beddingTempC: number
    waterKgM3: number
    co2Ppm: number
    beddingWaterKg: number
  }[]
  animals: {
    id: string
    coreTempC: number
    shellTempC: number
    coatWaterKgM2: number
    waterLossKg: number
    /** Exhaustion of panting so far: the recovering integral of effort. */
    pantingMin: number
    minutesSinceLoading: number
  }[]
  compartments: { id: string; airTempC: number; wallTempC: number; waterKgM3: number; co2Ppm: number }[]
}

/** Which metabolic line a profile scales: see lib/thermal/metabolism.ts for equation and source of each. */
export type MetabolicLine = 'kleiber' | 'bird' | 'farm-horse' | 'chick' | 'squamate' | 'boid'

/** Limits of product safety, well inside anything fatal on record: a row without them cannot be assessed. */
export interface CoreLimits {
  criticalLowC: number
  alarmLowC: number
  alarmHighC: number
  criticalHighC: number
}

/** The bare figures the engine needs of a species; lib/species carries source and confidence beside each. */
export interface ProfileValues {
  thermoregulation: 'endotherm' | 'ectotherm'
  bodyPlan: 'mammal' | 'bird' | 'lizard' | 'snake'
  massMinKg: number
  massMaxKg: number
  limits?: CoreLimits
  airFloorC: number
  airCeilingC: number
  /** Set-point (endotherm) or preferred temperature (ectotherm). */
  setPointC: number
  metabolism: {
    line: MetabolicLine
    /** Multiplier on the line, at rest. */
    activityAtRest: number
    /** Maximum thermogenesis over the line's basal rate; absent for ectotherms. */
    maxOverBasal?: number
    q10: number
    respiratoryQuotient: number
  }
  surface: { meehCoefficient: number; exponent: number }
  conductance:
    | { model: 'line'; line: 'mammal' | 'bird' | 'chick-group'; minMultiple: number; maxMultiple: number }
    | { model: 'coat'; tissueMinWm2K: number; tissueMaxWm2K: number; bareShare: number }
    | { model: 'ectotherm'; wholeBodyWm2K: number }
  coat: { depthMm: number; conductivityWmK: number; windPenalty: number }
  respiration: {
    oxygenExtraction: number
    pantingMultiple: number
    pantingCost: number
    exhaled: 'mammal' | 'small'
  }
  skin: { wettednessBase: number; wettednessMax: number; sweatCapGm2h?: number }
  bands: ControlBands
  /** Share of the body's heat capacity in the shell. */
  shellShare: number
  /** How it rests in a crate unless the plan says otherwise. Default: lying. */
  posture?: 'curled' | 'lying' | 'standing'
  /** J/kgK; default 3470. */
  specificHeatJkgK?: number
  /** Young are born unable to make much extra heat: ageDays then limits thermogenesis. */
  altricial?: boolean
  /** What the flag "snub-nosed" leaves of the extra breath, on rows without a snub-nosed row of their own. */
  snubNosedFactor?: number
  /** Share of sun the coat takes up. Default 0.7. */
  solarAbsorptance?: number
}

/** Start and end, K of core error, of each effector's smooth band. */
export interface ControlBands {
  vasomotor: readonly [number, number]
  cold: readonly [number, number]
  pant: readonly [number, number]
  wet: readonly [number, number]
}
