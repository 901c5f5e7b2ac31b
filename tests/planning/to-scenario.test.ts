import { describe, expect, it } from 'vitest'
import { decidedFacts } from '@/lib/planning/decided-facts'
import { bothLocalTimes } from '@/lib/planning/timeline'
import { activityByLeg } from '@/lib/planning/to-scenario/animals'
import { toScenario } from '@/lib/planning/to-scenario'
import { planHash } from '@/lib/rules/hash'
import type { Plan } from '@/lib/schemas/plan'
import { parseScenario } from '@/lib/schemas/scenario'
import { PLACES, PROFILES, glasgowToMuscat } from './plan'

const parts = { mark: '2417', places: PLACES, profiles: PROFILES }
const scenarioOf = (plan: Plan) => toScenario(plan, parts)
const hashOf = (plan: Plan) => planHash({ scenario: scenarioOf(plan), facts: decidedFacts(plan) })
const at = <T>(items: readonly T[], index: number): T => {
  const found = items[index]
  if (found === undefined) throw new Error(`Nothing at ${index}.`)
  return found
}

describe('the scenario of a plan', () => {
  const scenario = scenarioOf(glasgowToMuscat())

  it('is taken by the engine’s own schema as it is', () => {
    const parsed = parseScenario(scenario, {})
    expect(parsed.ok ? [] : parsed.issues).toEqual([])
    expect(parsed.ok && parsed.scenario).toEqual(scenario)
  })

  it('counts minutes on one clock, whatever the clocks on the walls', () => {
    expect(new Date(scenario.departureMs).toISOString()).toBe('2026-06-09T08:20:00.000Z')
    // 13:20 BST to 23:40 GST is 12:20 to 19:40 UTC.
    expect(scenario.legs.map(({ durationMin }) => durationMin)).toEqual([160, 50, 30, 440, 30, 110])
  })

  it('turns centimetres to metres and marks the crate', () => {
    const crate = at(scenario.crates, 0)
    expect(crate).toMatchObject({ mark: '2417-A', lengthM: 1, widthM: 0.65, heightM: 0.75 })
    // Six slats of 50 × 4 cm: their area together, the height of one.
    expect(crate.openings).toEqual([
      {
        face: 'front',
        areaM2: 0.12,
        heightM: 0.04,
        sillHeightM: 0.2,
        rimMm: 20,
        meshOpenPct: 100,
        blockedPct: 0,
      },
    ])
  })

  it('names places for the sun and the law', () => {
    expect(scenario.legs.map(({ place }) => [place?.fromCountry, place?.toCountry])).toEqual([
      ['GB', 'GB'],
      ['GB', 'GB'],
      ['GB', 'GB'],
      ['GB', 'OM'],
      ['OM', 'OM'],
      ['OM', 'OM'],
    ])
    expect(scenario.context?.jurisdictions).toEqual([])
  })

  it('shares the air of neighbouring legs in one space and of no others', () => {
    const spaces = scenario.legs.map(({ surroundings }) =>
      surroundings.type === 'enclosed' ? surroundings.compartmentId : null,
    )
    // The van at Muscat is not the van at Glasgow, and the hold after the flight starts at the flight’s set-point.
    expect(spaces).toEqual(['space-leg-1', null, 'space-leg-3', null, 'space-leg-5', 'space-leg-6'])
    expect(at(scenario.legs, 4).surroundings).toMatchObject({
      initialAirTempC: 18,
      wallTempC: 18,
      initialRelHumidityPct: 40,
    })
    const plan = glasgowToMuscat()
    const road = at(plan.legs, 0)
    plan.legs = [
      { ...road, endLocal: '2026-06-09T10:20', toPlaceId: 2 },
      { ...road, id: 'leg-2', startLocal: '2026-06-09T10:20', endLocal: '2026-06-09T11:20', fromPlaceId: 2 },
    ]
    const [a, b] = scenarioOf(plan).legs.map(({ surroundings }) => surroundings)
    expect(a?.type === 'enclosed' && b?.type === 'enclosed' && a.compartmentId === b.compartmentId).toBe(true)
  })

  it('lets a van that comes from a heated shed start as warm as it is outside, unless somebody typed its air', () => {
    const vanAfterShed = (initialAirTempC: number | null) => {
      const plan = glasgowToMuscat()
      const [van, ramp] = [at(plan.legs, 5), at(plan.legs, 4)]
      if (van.surroundings.type !== 'enclosed') throw new Error('No van.')
      Object.assign(ramp, {
        kind: 'shed',
        flightPhase: null,
        surroundings: {
          type: 'controlled',
          airTempC: 24,
          relHumidityPct: 40,
          airSpeedMs: 0.1,
          outside: null,
        },
      })
      van.surroundings.initialAirTempC = initialAirTempC
      plan.legs = [{ ...ramp, startLocal: '2026-06-09T23:00' }, van]
      return at(scenarioOf(plan).legs, 1).surroundings
    }
    expect(vanAfterShed(null)).not.toHaveProperty('initialAirTempC')
    expect(vanAfterShed(38)).toMatchObject({ initialAirTempC: 38 })
    expect(vanAfterShed(38)).not.toHaveProperty('wallTempC')
  })

  it('leaves out what the form does not ask for: air that is carried over, wind round a van, sun round a shed', () => {
    const plan = glasgowToMuscat()
    const arrival = at(plan.legs, 4).surroundings
    if (arrival.type !== 'enclosed') throw new Error('No hold.')
    // Left over from before the flight was held at 18 °C: the engine would start from the flight’s air all the same.
    arrival.initialAirTempC = 33
    const airborne = at(plan.legs, 3)
    const sunny = {
      type: 'open-air' as const,
      shadePct: 40,
      rows: [{ minute: 0, airTempC: 17, relHumidityPct: 50, windMs: 9, solarWm2: 400 }],
    }
    arrival.outside = sunny
    if (airborne.surroundings.type === 'controlled') airborne.surroundings.outside = sunny
    const { legs } = scenarioOf(plan)
    expect(at(legs, 4).surroundings).toMatchObject({
      initialAirTempC: 18,
      outside: { shadePct: 40, series: [{ windMs: 0, solarWm2: 400 }] },
    })
    expect(at(legs, 3).surroundings).toMatchObject({
      outside: { shadePct: 0, series: [{ windMs: 0, solarWm2: 0 }] },
    })
  })

  it('gives no depth to bedding that is not there, nor a coat to a snake', () => {
    const plan = glasgowToMuscat()
    at(plan.crates, 0).bedding = { material: 'none', depthMm: 40, wetPct: 50 }
    Object.assign(at(plan.animals, 0), {
      profileKey: 'ball-python',
      massKg: 1.5,
      coat: { depthMm: 12, clipped: true, wetPct: 30 },
    })
    const crate = at(scenarioOf(plan).crates, 0)
    expect(crate.bedding).toEqual({ material: 'none', depthMm: 0, wetPct: 0 })
    expect(at(crate.occupants, 0).coat).toEqual({ wetPct: 30 })
  })

  it('counts weather from departure and holds its last row past every delay and what is looked at beyond', () => {
    const plan = glasgowToMuscat()
    const ramp = at(plan.legs, 1)
    ramp.surroundings = {
      type: 'open-air',
      shadePct: 0,
      rows: [
        { minute: 0, airTempC: 15, relHumidityPct: 60, windMs: 2, solarWm2: null },
        { minute: 30, airTempC: 17, relHumidityPct: 55, windMs: 3, solarWm2: 400 },
      ],
    }
    const air = at(scenarioOf(plan).legs, 1).surroundings
    const worst = plan.legs.reduce((sum, { delayWorstMin }) => sum + delayWorstMin, 0)
    expect(
      air.type === 'open-air' &&
        air.series.map(({ minute, airTempC, solarWm2 }) => [minute, airTempC, solarWm2]),
    ).toEqual([
      [160, 15, 0],
      [190, 17, 400],
      [160 + 50 + worst + 300, 17, 400],
    ])
  })

  it('takes only the species rows the animals name', () => {
    expect(Object.keys(scenario.profiles ?? {})).toEqual(['dog'])
    const plan = glasgowToMuscat()
    at(plan.animals, 0).flags = ['snub-nosed']
    expect(Object.keys(scenarioOf(plan).profiles ?? {})).toEqual(['dog', 'snub-nosed-dog'])
  })

  it('tells when it was fed, and when water is offered', () => {
    const plan = glasgowToMuscat()
    Object.assign(at(plan.animals, 0), {
      lastFedLocal: '2026-06-09T05:20',
      lastWateredLocal: '2026-06-09T08:50',
    })
    at(plan.legs, 0).stops = [
      { minute: 90, kind: 'water' },
      { minute: 60, kind: 'look' },
    ]
    const animal = at(at(scenarioOf(plan).crates, 0).occupants, 0)
    expect(animal).toMatchObject({ hoursSinceFed: 4, waterOfferedMin: [-30, 90] })
  })

  it('counts a meal in an hour that came twice from the first of the two', () => {
    const plan = glasgowToMuscat()
    plan.legs = [at(plan.legs, 0)]
    // 01:30 first comes at 00:30 UTC, in summer time; 06:00 in winter is 06:00 UTC.
    Object.assign(at(plan.legs, 0), { startLocal: '2026-10-25T06:00', endLocal: '2026-10-25T08:00' })
    at(plan.animals, 0).lastFedLocal = '2026-10-25T01:30'
    expect(at(at(scenarioOf(plan).crates, 0).occupants, 0).hoursSinceFed).toBe(5.5)
  })

  it('carries what was given to whoever judges it, and nothing where nothing was', () => {
    const given = (medicines: string) => {
      const plan = glasgowToMuscat()
      at(plan.animals, 0).medicines = medicines
      return at(at(scenarioOf(plan).crates, 0).occupants, 0).medicines
    }
    expect([given('Carprofen 50 mg'), given('None'), given('')]).toEqual([
      'Carprofen 50 mg',
      undefined,
      undefined,
    ])
  })

  it('leaves no meal out in silence', () => {
    const plan = glasgowToMuscat()
    at(plan.animals, 0).lastWateredLocal = '2026-06-09T10:00'
    expect(() => scenarioOf(plan)).toThrow(RangeError)
  })

  it('makes no scenario of a plan with a hole in it', () => {
    const plan = glasgowToMuscat()
    at(plan.animals, 0).massKg = null
    expect(() => scenarioOf(plan)).toThrow(RangeError)
  })
})

describe('activity nobody watched', () => {
  const { legs } = glasgowToMuscat()
  it('is alert at loading, on the ramp and behind shut doors on the ground, resting elsewhere', () => {
    expect(Object.values(activityByLeg(legs, { crateTrained: true, temperament: 'calm' }))).toEqual([
      'alert',
      'alert',
      'alert',
      'resting',
      'alert',
      'resting',
    ])
  })
  it.each([
    { crateTrained: false, temperament: 'calm' as const },
    { crateTrained: true, temperament: 'anxious' as const },
  ])('is distressed there for an animal that is %o', (animal) => {
    const activity = Object.values(activityByLeg(legs, animal))
    expect(activity.filter((one) => one === 'distressed')).toHaveLength(4)
    expect(activity.filter((one) => one === 'resting')).toHaveLength(2)
  })
})

describe('the plan hash', () => {
  const before = hashOf(glasgowToMuscat())
  const changed = (change: (plan: Plan) => void) => {
    const plan = glasgowToMuscat()
    change(plan)
    return hashOf(plan) !== before
  }
  it.each<[string, (plan: Plan) => void]>([
    ['a name', (p) => (at(p.animals, 0).name = 'Moss')],
    ['an identification', (p) => (at(p.animals, 0).identification = 'Chip 1')],
    ['a breed note', (p) => (at(p.animals, 0).breedNote = 'Collie')],
    ['an age', (p) => (at(p.animals, 0).ageDays = 900)],
    ['a flag', (p) => at(p.animals, 0).flags.push('elderly')],
    ['medicines', (p) => (at(p.animals, 0).medicines = 'Gabapentin')],
    ['the last examination', (p) => (at(p.animals, 0).examinedOn = '2026-06-01')],
    ['a temperament', (p) => (at(p.animals, 0).temperament = 'anxious')],
    ['a crate’s letter', (p) => (at(p.crates, 0).letter = 'B')],
    ['an opening', (p) => (at(at(p.crates, 0).openings, 0).howMany = 5)],
    ['a carrier', (p) => (at(p.legs, 3).carrier = 'Skerrow')],
    ['a party in charge', (p) => (at(p.legs, 3).partyInCharge = 'Somebody else')],
    ['the last place', (p) => (at(p.legs, 5).toPlaceId = 3)],
    ['a delay', (p) => (at(p.legs, 0).delayWorstMin += 5)],
    ['a purpose', (p) => (p.purpose = 'private')],
    ['a typed air', (p) => Object.assign(at(p.legs, 3).surroundings, { airTempC: 19 })],
  ])('changes with %s', (_name, change) => {
    expect(changed(change)).toBe(true)
  })
  it.each<[string, (plan: Plan) => void]>([
    ['a telephone', (p) => (at(p.legs, 0).partyTelephone = '+44 141 496 0999')],
    ['a driver', (p) => (at(p.legs, 0).driverId = 7)],
    ['a note', (p) => (at(p.legs, 0).note = 'Ring the bell twice.')],
    ['a handling note', (p) => (p.handlingNote = 'Carry level.')],
    ['an e-mail', (p) => (p.consignee.email = 'a@example.org')],
  ])('stays with %s', (_name, change) => {
    expect(changed(change)).toBe(false)
  })
})

it('tells any minute on both clocks', () => {
  const journey = {
    departureMs: Date.UTC(2026, 5, 9, 8, 20),
    departureZone: 'Europe/London',
    arrivalZone: 'Asia/Muscat',
  }
  const { departure, arrival } = bothLocalTimes(journey, 600)
  expect([departure.text, arrival.text]).toEqual([
    'Tue 9 Jun, 19:20 BST (UTC+1)',
    'Tue 9 Jun, 22:20 GST (UTC+4)',
  ])
})
