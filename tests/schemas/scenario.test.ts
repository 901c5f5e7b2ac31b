import { describe, expect, it } from 'vitest'
import { parseScenario, scenarioSchema } from '@/lib/schemas/scenario'

/** A small valid file, as a person writes it: only what has no default. */
function file(): ReturnType<typeof JSON.parse> {
  return {
    schema: 'steadfold/scenario@1',
    departure: '2026-06-09T08:20Z',
    legs: [
      {
        id: 'van',
        kind: 'road',
        durationMin: 90,
        surroundings: { type: 'controlled', airTempC: 18, relHumidityPct: 50, airSpeedMs: 0.1 },
      },
      {
        id: 'ramp',
        kind: 'ramp',
        durationMin: 30,
        delay: { typicalMin: 10, worstMin: 40 },
        surroundings: {
          type: 'open-air',
          series: [{ minute: 0, airTempC: 24, relHumidityPct: 45, windMs: 2, solarWm2: 500 }],
        },
      },
    ],
    crates: [
      {
        id: 'a',
        mark: '2417-A',
        lengthM: 0.9,
        widthM: 0.6,
        heightM: 0.65,
        wall: { material: 'plastic', thicknessMm: 3 },
        openings: [{ face: 'front', areaM2: 0.2 }],
        occupants: [{ id: 'bess', profile: 'dog', massKg: 11 }],
      },
    ],
  }
}

const VAN = {
  type: 'enclosed',
  volumeM3: 12,
  heatTransferWK: 45,
  interiorMassKJK: 150,
  leakageM3h: 6,
  solarApertureM2: 1,
  crateAirSpeedMs: 0.1,
}

function issuesOf(json: unknown) {
  const parsed = parseScenario(json)
  return parsed.ok ? [] : parsed.issues
}

function scenarioOf(json: unknown) {
  const parsed = parseScenario(json)
  if (!parsed.ok) throw new Error(JSON.stringify(parsed.issues))
  return parsed.scenario
}

describe('a scenario file', () => {
  it('comes out complete: departure in milliseconds, every default filled', () => {
    const scenario = scenarioOf(file())
    expect(scenario.departureMs).toBe(Date.UTC(2026, 5, 9, 8, 20))
    expect(scenario.outputStepS).toBe(60)
    expect(scenario.legs[0]?.pressureKPa).toBe(101.325)
    expect(scenario.legs[0]?.delay).toEqual({ typicalMin: 0, worstMin: 0 })
    expect(scenario.legs[0]?.surroundings).toMatchObject({ surfaceTempC: 18, outsideCo2Ppm: 420 })
    expect(scenario.crates[0]).toMatchObject({ form: 'crate', medium: 'air', byLeg: [] })
    expect(scenario.crates[0]?.occupants[0]).toMatchObject({
      count: 1,
      activity: 'resting',
      activityDecayMin: 45,
      flags: [],
    })
  })

  it('gives itself again when parsed twice, so a stored scenario can be run again', () => {
    const once = scenarioOf(file())
    expect(scenarioOf(JSON.parse(JSON.stringify(once)))).toEqual(once)
  })

  it('describes every field it has', () => {
    const undescribed: string[] = []
    walk(scenarioSchema, '', undescribed)
    expect(undescribed).toEqual([])
  })
})

describe('what a scenario may not say', () => {
  it.each<[string, (json: ReturnType<typeof file>) => void, string, RegExp]>([
    ['no departure', (json) => delete json.departure, 'departure', /Departure is missing/],
    ['30 February', (json) => (json.departure = '2026-02-30T08:20Z'), 'departure', /2026-02-30T08:20Z/],
    ['a departure without zone', (json) => (json.departure = '2026-06-09T08:20'), 'departure', /in UTC/],
    ['another schema', (json) => (json.schema = 'steadfold/scenario@2'), 'schema', /steadfold\/scenario@1/],
    ['a field nobody knows', (json) => (json.legs[0].speedKmh = 80), 'legs.0.speedKmh', /not a field here/],
    [
      'ice packs',
      (json) => (json.crates[0].packs = [{ kind: 'ice', massKg: 1 }]),
      'crates.0.packs',
      /cannot be simulated yet/,
    ],
    [
      'animals in water',
      (json) => (json.crates[0].medium = 'water'),
      'crates.0.medium',
      /only animals in air/,
    ],
    [
      'a tank of water',
      (json) => (json.crates[0].water = { massKg: 40, tempC: 12 }),
      'crates.0.water',
      /Animals in water cannot be simulated yet/,
    ],
    [
      'an animal in a huddle',
      (json) => (json.crates[0].occupants[0].huddle = 3),
      'crates.0.occupants.0.huddle',
      /the species row decides/,
    ],
    ['members of an ensemble', (json) => (json.members = 300), 'members', /Ensembles cannot be run yet/],
    ['a seed', (json) => (json.seed = 7), 'seed', /Ensembles cannot be run yet/],
    ['an ensemble', (json) => (json.ensemble = { members: 300 }), 'ensemble', /cannot be run yet/],
    [
      'a mass outside the profile',
      (json) => (json.crates[0].occupants[0].massKg = 120),
      'crates.0.occupants.0.massKg',
      /120 kg: put 0.3 to 90 kg/,
    ],
    [
      'a species nobody knows',
      (json) => (json.crates[0].occupants[0].profile = 'unicorn'),
      'crates.0.occupants.0.profile',
      /unicorn/,
    ],
    [
      'an air hotter than any',
      (json) => (json.legs[0].surroundings.airTempC = 75),
      'legs.0.surroundings.airTempC',
      /75 °C: put −60 to 60 °C/,
    ],
    [
      'text for a number',
      (json) => (json.legs[0].durationMin = '90'),
      'legs.0.durationMin',
      /“90” is not a number/,
    ],
    [
      'a worst delay under the typical',
      (json) => (json.legs[1].delay.worstMin = 5),
      'legs.1.delay.worstMin',
      /at least the typical/,
    ],
    ['a crate without walls', (json) => delete json.crates[0].wall, 'crates.0.wall', /Walls are missing/],
    ['a closed crate', (json) => (json.crates[0].openings = []), 'crates.0.openings', /no openings/],
    [
      'an opening larger than its face',
      (json) => (json.crates[0].openings[0].areaM2 = 0.391),
      'crates.0.openings.0.areaM2',
      /the face has only 0.39 m²/,
    ],
    [
      'an opening wider than its face',
      (json) => (json.crates[0].openings[0].widthM = 0.7),
      'crates.0.openings.0.widthM',
      /only 0.6 m wide/,
    ],
    [
      'two animals of one id',
      (json) => json.crates[0].occupants.push({ ...json.crates[0].occupants[0] }),
      'crates.0.occupants.1.id',
      /stands twice/,
    ],
    [
      'a crate on a leg that is not there',
      (json) => (json.crates[0].toLegId = 'sea'),
      'crates.0.toLegId',
      /No leg “sea”/,
    ],
    [
      'a crate that leaves before it joins',
      (json) => Object.assign(json.crates[0], { fromLegId: 'ramp', toLegId: 'van' }),
      'crates.0.toLegId',
      /leaves before it joins/,
    ],
    [
      'a body limit made wider',
      (json) => (json.limits = [{ scope: 'bess', coreAlarmHighC: 39.8, reason: 'test' }]),
      'limits.0.coreAlarmHighC',
      /never wider/,
    ],
    [
      'a limit for nobody',
      (json) => (json.limits = [{ scope: 'otto', coreAlarmHighC: 39, reason: 'test' }]),
      'limits.0.scope',
      /no crate or animal/,
    ],
    [
      'out of crate on the road',
      (json) => (json.legs[0].outOfCrate = true),
      'legs.0.outOfCrate',
      /only a leg of kind rest/,
    ],
    [
      'an event after the leg',
      (json) => (json.legs[0].events = [{ minute: 90, durationMin: 5, kind: 'door' }]),
      'legs.0.events',
      /before the leg ends/,
    ],
    [
      'a door event in a room that has none',
      (json) => (json.legs[0].events = [{ minute: 5, durationMin: 5, kind: 'door' }]),
      'legs.0.events',
      /only an enclosed space/,
    ],
    [
      'a mesh width, which changes nothing yet',
      (json) => (json.crates[0].openings[0].meshMm = 25),
      'crates.0.openings.0.meshMm',
      /cannot be used yet/,
    ],
    [
      'an acclimation the engine cannot compute',
      (json) => (json.crates[0].occupants[0].acclimatedToC = 2),
      'crates.0.occupants.0.acclimatedToC',
      /cannot be computed yet/,
    ],
    [
      'an initial state of one variant only',
      (json) => (json.initial = [{ variant: 'typical', crates: [], animals: [], compartments: [] }]),
      'initial',
      /exactly one for heat-prone/,
    ],
    [
      'a set-point with no watts behind it',
      (json) =>
        (json.legs[0].surroundings = {
          ...VAN,
          conditioning: { setPointC: 18, coolingW: 0, heatingW: 0 },
          outside: json.legs[1].surroundings,
        }),
      'legs.0.surroundings.conditioning',
      /without cooling or heating holds nothing/,
    ],
  ])('refuses %s', (_, spoil, path, message) => {
    const json = file()
    spoil(json)
    const issue = issuesOf(json).find((one) => one.path === path)
    expect(issue?.message).toMatch(message)
  })

  it('tells all faults at once, each with what stood there', () => {
    const json = file()
    json.legs[0].durationMin = -5
    json.crates[0].occupants[0].massKg = 'heavy'
    const issues = issuesOf(json)
    expect(issues.map(({ path }) => path)).toEqual(['legs.0.durationMin', 'crates.0.occupants.0.massKg'])
    expect(issues.map(({ received }) => received)).toEqual([-5, 'heavy'])
  })

  it('lets a body limit be made tighter, and an air limit wider', () => {
    const json = file()
    json.limits = [{ scope: 'bess', coreAlarmHighC: 39.7, airHighC: 40, reason: 'seen by the vet' }]
    expect(issuesOf(json)).toEqual([])
  })

  it('lets a space stand in another once, and no deeper', () => {
    const json = file()
    const open = {
      type: 'open-air',
      series: [{ minute: 0, airTempC: 20, relHumidityPct: 50, windMs: 1, solarWm2: 0 }],
    }
    json.legs[0].surroundings = { ...VAN, outside: { ...VAN, outside: open } }
    expect(issuesOf(json)).toEqual([])
    json.legs[0].surroundings = { ...VAN, outside: { ...VAN, outside: { ...VAN, outside: open } } }
    expect(issuesOf(json)[0]?.message).toMatch(/at most once/)
  })
})

describe('weather', () => {
  // Leg "ramp": on time 90 to 120; typical end 130; worst end 160; with 300 beyond, 460.
  function withSeries(lastMinute: number, firstMinute = 0) {
    const json = file()
    const point = { airTempC: 24, relHumidityPct: 45, windMs: 2, solarWm2: 500 }
    json.legs[1].surroundings.series = [
      { minute: firstMinute, ...point },
      { minute: lastMinute, ...point },
    ]
    return json
  }

  it('must reach 300 minutes past the worst end of its leg', () => {
    expect(issuesOf(withSeries(460))).toEqual([])
    expect(issuesOf(withSeries(459))[0]).toMatchObject({
      path: 'legs.1.surroundings.series.1.minute',
      received: 459,
    })
  })

  it('must start by the leg', () => {
    expect(issuesOf(withSeries(460, 90))).toEqual([])
    expect(issuesOf(withSeries(460, 91))[0]?.path).toBe('legs.1.surroundings.series.0.minute')
  })

  it('must run forward in time', () => {
    const json = withSeries(460)
    json.legs[1].surroundings.series.push({ ...json.legs[1].surroundings.series[1] })
    expect(issuesOf(json)[0]?.message).toMatch(/later than the one before/)
  })
})

/** Every value a person can write carries a description, its own or that of the wrapper around it. */
function walk(schema: unknown, path: string, undescribed: string[], wrapped = false): void {
  const it = schema as { _zod?: { def: Record<string, unknown> }; description?: string }
  const def = it._zod?.def
  if (def === undefined) return
  const described = wrapped || it.description !== undefined
  const inner = def.innerType ?? def.in
  if (inner !== undefined) walk(inner, path, undescribed, described)
  if (def.element !== undefined) walk(def.element, `${path}[]`, undescribed)
  for (const [key, value] of Object.entries((def.shape ?? {}) as Record<string, unknown>))
    walk(value, `${path}.${key}`, undescribed)
  for (const option of Array.isArray(def.options) ? def.options : []) walk(option, path, undescribed)
  const leaf = ['number', 'string', 'boolean', 'enum'].includes(String(def.type))
  if (leaf && !described) undescribed.push(path)
}
