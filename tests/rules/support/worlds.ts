import type {
  Animal,
  Crate,
  EnclosedSpace,
  Leg,
  OpenAir,
  Scenario,
  ControlledAir,
  RuleContext,
} from '@/lib/thermal'

/** Small worlds for the rules: one crate, a leg or two, with everything that matters named by the test. */
export const DEPARTURE_MS = Date.UTC(2026, 5, 9, 8, 20)

export function scenarioOf(parts: Partial<Scenario> & Pick<Scenario, 'legs' | 'crates'>): Scenario {
  return { schema: 'steadfold/scenario@1', departureMs: DEPARTURE_MS, outputStepS: 60, limits: [], ...parts }
}

export function legOf(id: string, parts: Partial<Leg> = {}): Leg {
  return {
    id,
    kind: 'road',
    durationMin: 60,
    surroundings: roomAt(20),
    pressureKPa: 101.325,
    delay: { typicalMin: 0, worstMin: 0 },
    outOfCrate: false,
    attended: true,
    events: [],
    ...parts,
  }
}

export function roomAt(airTempC: number, parts: Partial<ControlledAir> = {}): ControlledAir {
  return {
    type: 'controlled',
    airTempC,
    relHumidityPct: 50,
    airSpeedMs: 0.3,
    surfaceTempC: airTempC,
    outsideCo2Ppm: 420,
    ...parts,
  }
}

export function openAirAt(airTempC: number, parts: Partial<OpenAir> = {}): OpenAir {
  return {
    type: 'open-air',
    series: [{ minute: 0, airTempC, relHumidityPct: 50, windMs: 1, solarWm2: 300 }],
    source: 'typed',
    shadePct: 100,
    groundAlbedo: 0.2,
    windHeightM: 10,
    ...parts,
  }
}

export function vanIn(outside: OpenAir, parts: Partial<EnclosedSpace> = {}): EnclosedSpace {
  return {
    type: 'enclosed',
    volumeM3: 12,
    heatTransferWK: 45,
    interiorMassKJK: 150,
    ventilationM3h: 60,
    leakageM3h: 6,
    solarApertureM2: 1,
    solarTransmittance: 0.6,
    crateAirSpeedMs: 0.1,
    outside,
    ...parts,
  }
}

export function crateOf(id: string, occupants: Animal[], parts: Partial<Crate> = {}): Crate {
  return {
    id,
    mark: `2417-${id.toUpperCase()}`,
    form: 'crate',
    lengthM: 0.9,
    widthM: 0.6,
    heightM: 0.65,
    wall: { material: 'plastic', thicknessMm: 3 },
    openings: [
      {
        face: 'front',
        areaM2: 0.2,
        heightM: 0.4,
        widthM: 0.5,
        sillHeightM: 0.15,
        rimMm: 20,
        meshOpenPct: 70,
        blockedPct: 0,
      },
      {
        face: 'left',
        areaM2: 0.1,
        heightM: 0.2,
        widthM: 0.5,
        sillHeightM: 0.4,
        rimMm: 20,
        meshOpenPct: 100,
        blockedPct: 0,
      },
      {
        face: 'right',
        areaM2: 0.1,
        heightM: 0.2,
        widthM: 0.5,
        sillHeightM: 0.4,
        rimMm: 20,
        meshOpenPct: 100,
        blockedPct: 0,
      },
      {
        face: 'back',
        areaM2: 0.06,
        heightM: 0.15,
        widthM: 0.4,
        sillHeightM: 0.4,
        rimMm: 20,
        meshOpenPct: 100,
        blockedPct: 0,
      },
    ],
    byLeg: [],
    bedding: { material: 'newspaper', depthMm: 10, wetPct: 0 },
    medium: 'air',
    occupants,
    ...parts,
  }
}

export function beagle(id: string, parts: Partial<Animal> = {}): Animal {
  return {
    id,
    profile: 'dog',
    massKg: 11,
    count: 1,
    ageDays: 1_400,
    activity: 'resting',
    activityDecayMin: 45,
    flags: [],
    hoursSinceFed: 3,
    waterOfferedMin: [-60],
    ...parts,
  }
}

export function pug(id: string, parts: Partial<Animal> = {}): Animal {
  return beagle(id, { profile: 'snub-nosed-dog', massKg: 8.4, flags: ['snub-nosed'], ...parts })
}

export function usContext(parts: Partial<RuleContext> = {}): RuleContext {
  return { jurisdictions: ['US'], carriers: [], papers: [], purpose: 'commercial', ...parts }
}
