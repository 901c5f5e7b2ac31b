import { describe, expect, it } from 'vitest'
import { reasonsNotAssessable } from '@/lib/planning/reasons'
import { emptyPlan, newAnimal, newCrate, newFlight, newLeg } from '@/lib/planning/new-plan'
import type { Plan, PlanLeg } from '@/lib/schemas/plan'
import { planSchema } from '@/lib/schemas/plan'
import { PLACES, PROFILES, glasgowToMuscat } from './plan'

const knowledge = { places: PLACES, profiles: PROFILES }

/** The reasons after one change to a plan that has none. */
function after(change: (plan: Plan) => void) {
  const plan = glasgowToMuscat()
  change(plan)
  return reasonsNotAssessable(plan, knowledge)
}
const leg = (plan: Plan, index: number): PlanLeg => {
  const found = plan.legs[index]
  if (found === undefined) throw new Error(`The plan has no leg ${index + 1}.`)
  return found
}
const only = <T>(items: T[]): T => {
  const [first] = items
  if (first === undefined) throw new Error('Nothing there.')
  return first
}

it('a whole plan has no reason against it', () => {
  expect(reasonsNotAssessable(glasgowToMuscat(), knowledge)).toEqual([])
})

it('an empty plan says everything at once', () => {
  expect(reasonsNotAssessable(emptyPlan(1), knowledge).map(({ path }) => path)).toEqual([
    'consignor.name',
    'consignee.name',
    'emergencyContact.name',
    'emergencyContact.telephone',
    'animals',
    'crates',
    'legs',
  ])
})

describe('each single fault is one reason, at its place', () => {
  const faults: [string, (plan: Plan) => void, string, RegExp][] = [
    [
      'no mass',
      (p) => (only(p.animals).massKg = null),
      'animals.0.massKg',
      /Corrie has no mass: put .* kg for dog/,
    ],
    [
      'a mass outside the row',
      (p) => (only(p.animals).massKg = 900),
      'animals.0.massKg',
      /Corrie, mass 900 kg: put/,
    ],
    ['no species', (p) => (only(p.animals).profileKey = ''), 'animals.0.profileKey', /no species/],
    [
      'a species that is not there',
      (p) => (only(p.animals).profileKey = 'wyvern'),
      'animals.0.profileKey',
      /“wyvern”/,
    ],
    [
      'a pug on the plain dog’s row',
      (p) => (only(p.animals).breedNote = 'Pug cross'),
      'animals.0.breedNote',
      /pug is a snub-nosed breed/,
    ],
    [
      'a sedative that stands only in a note',
      (p) => (only(p.animals).medicines = 'Trazodone 100 mg at 08:00, Dr. A. Vane'),
      'animals.0.medicines',
      /“trazodone” stands under medicines. Set the flag sedated/,
    ],
    [
      'sedated with nothing said of it',
      (p) => only(p.animals).flags.push('sedated'),
      'animals.0.medicines',
      /put drug, dose, time and prescriber/,
    ],
    [
      'sedated with “none” said of it',
      (p) => Object.assign(only(p.animals), { flags: ['sedated'], medicines: 'None.' }),
      'animals.0.medicines',
      /put drug, dose, time and prescriber/,
    ],
    [
      'fed after it left',
      (p) => (only(p.animals).lastFedLocal = '2026-06-09T09:21'),
      'animals.0.lastFedLocal',
      /Corrie, last fed: 2026-06-09 09:21 lies after the journey leaves/,
    ],
    [
      'watered last year',
      (p) => (only(p.animals).lastWateredLocal = '2025-06-09T09:21'),
      'animals.0.lastWateredLocal',
      /more than 7 days before the journey leaves/,
    ],
    [
      'fed on a day that isn’t there',
      (p) => (only(p.animals).lastFedLocal = '2026-02-30T09:00'),
      'animals.0.lastFedLocal',
      /“2026-02-30 09:00” is not a date and a time/,
    ],
    [
      'an animal in no crate',
      (p) => p.animals.push({ ...newAnimal(p), name: 'Tansy', profileKey: 'rabbit', massKg: 2.6 }),
      'animals.1',
      /Tansy is in no crate/,
    ],
    [
      'a crate without a size',
      (p) => (only(p.crates).heightCm = null),
      'crates.0.heightCm',
      /Crate A has no inside height/,
    ],
    [
      'a closed crate',
      (p) => (only(p.crates).openings = []),
      'crates.0.openings',
      /closed and has no opening/,
    ],
    [
      'every opening blocked',
      (p) => only(p.crates).openings.forEach((o) => (o.blockedPct = 100)),
      'crates.0.openings',
      /every opening is blocked/,
    ],
    [
      'an opening wider than its face',
      (p) => (only(only(p.crates).openings).widthCm = 80),
      'crates.0.openings.0.widthCm',
      /80 cm wide, its face \(front\) 65 cm/,
    ],
    [
      'an opening above the roof',
      (p) => (only(only(p.crates).openings).sillHeightCm = 74),
      'crates.0.openings.0.heightCm',
      /reaches 78 cm/,
    ],
    [
      'openings that add up to more than the face',
      (p) => (only(only(p.crates).openings).howMany = 60),
      'crates.0.openings',
      /add up to 12000 cm², the face has 4875 cm²/,
    ],
    [
      'a gap between legs',
      (p) => (leg(p, 1).startLocal = '2026-06-09T12:10'),
      'legs.1.startLocal',
      /10 min between the end of leg 1 .* belong to no leg/,
    ],
    [
      'an overlap',
      (p) => (leg(p, 1).startLocal = '2026-06-09T11:50'),
      'legs.1.startLocal',
      /starts 10 min before/,
    ],
    [
      'a leg that starts elsewhere',
      (p) => (leg(p, 5).fromPlaceId = 4),
      'legs.5.fromPlaceId',
      /starts at Wadi Sahm Sanctuary, but leg 5 .* ends at Muscat Airport/,
    ],
    [
      'no air',
      (p) =>
        (leg(p, 3).surroundings = {
          type: 'controlled',
          airTempC: null,
          relHumidityPct: 40,
          airSpeedMs: 0.05,
          outside: null,
        }),
      'legs.3.surroundings.airTempC',
      /has no air temperature/,
    ],
    ['nobody to ring', (p) => (leg(p, 1).partyTelephone = ''), 'legs.1.partyTelephone', /has no telephone/],
    ['nobody in charge', (p) => (leg(p, 1).partyInCharge = ''), 'legs.1.partyInCharge', /nobody is named/],
    ['ours, but nobody', (p) => (leg(p, 0).attended = true), 'legs.0.driverId', /nobody is named/],
    [
      'delays the wrong way round',
      (p) => (leg(p, 0).delayTypicalMin = 90),
      'legs.0.delayWorstMin',
      /shorter than the typical one/,
    ],
    [
      'a stop after the end',
      (p) => leg(p, 0).stops.push({ minute: 200, kind: 'look' }),
      'legs.0.stops.0.minute',
      /the leg lasts 160 min/,
    ],
    [
      'out of the crate on the ramp',
      (p) => (leg(p, 1).outOfCrate = true),
      'legs.1.outOfCrate',
      /only on a rest stop/,
    ],
  ]
  it.each(faults)('%s', (_name, change, path, message) => {
    const reasons = after(change)
    expect(reasons.map((reason) => reason.path)).toEqual([path])
    expect(only(reasons).message).toMatch(message)
  })
})

describe('the clock', () => {
  it('refuses an hour that never was, and one that comes twice until somebody chooses', () => {
    const missing = after((plan) => {
      leg(plan, 0).startLocal = '2026-03-29T01:30'
    })
    expect(missing.map(({ path }) => path)).toContain('legs.0.startLocal')
    expect(missing.find(({ path }) => path === 'legs.0.startLocal')?.message).toContain(
      'never shows 2026-03-29 01:30, it goes from GMT (UTC) to BST (UTC+1) there. The next time it shows is 2026-03-29 02:00.',
    )
    const doubled = (offset: number | null) =>
      after((plan) => {
        plan.legs = [leg(plan, 0)]
        Object.assign(leg(plan, 0), {
          startLocal: '2026-10-25T01:30',
          startOffsetMin: offset,
          endLocal: '2026-10-25T04:00',
        })
      })
    expect(only(doubled(null)).message).toContain('Choose BST (UTC+1) or GMT (UTC)')
    expect(doubled(60)).toEqual([])
    expect(doubled(0)).toEqual([])
  })

  it('counts durations across zones: arriving “before” leaving by the clock can be right', () => {
    // Muscat 13:10 is London 10:10: half an hour before it left.
    const reasons = after((plan) => {
      plan.legs = [leg(plan, 3)]
      Object.assign(leg(plan, 0), {
        kind: 'road',
        flightPhase: null,
        startLocal: '2026-06-09T10:40',
        endLocal: '2026-06-09T13:10',
      })
    })
    expect(only(reasons)).toEqual({ path: 'legs.0.endLocal', message: 'Leg 1 (road) ends before it starts.' })
  })
})

describe('a flight', () => {
  it('is offered as three legs and may not leave the ground out', () => {
    expect(newFlight({ legs: [] }).map(({ flightPhase }) => flightPhase)).toEqual([
      'doors-shut-departure',
      'airborne',
      'doors-shut-arrival',
    ])
    const reasons = after((plan) => {
      plan.legs = [leg(plan, 3)]
    })
    expect(reasons.map(({ path }) => path)).toEqual(['legs.0.flightPhase'])
  })
})

describe('medicines', () => {
  it.each(['', 'None', 'no medicines', 'No sedatives given', 'Not sedated', 'Carprofen 50 mg daily'])(
    'let “%s” stand without the flag',
    (medicines) => expect(after((p) => (only(p.animals).medicines = medicines))).toEqual([]),
  )
  it('let a sedative stand with the flag: the carrier’s rule then speaks', () => {
    const reasons = after((p) =>
      Object.assign(only(p.animals), { flags: ['sedated'], medicines: 'Acepromazine 20 mg, 08:00, A. Vane' }),
    )
    expect(reasons).toEqual([])
  })
})

describe('a last meal on a night the clocks change', () => {
  const at = (lastFedLocal: string, startLocal: string, endLocal: string) =>
    after((plan) => {
      plan.legs = [leg(plan, 0)]
      Object.assign(leg(plan, 0), { startLocal, endLocal })
      only(plan.animals).lastFedLocal = lastFedLocal
    })
  it('in the hour that never was is refused', () => {
    const [reason] = at('2027-03-28T01:30', '2027-03-28T06:00', '2027-03-28T08:00')
    expect(reason?.path).toBe('animals.0.lastFedLocal')
    expect(reason?.message).toContain(
      'never shows 2027-03-28 01:30, it goes from GMT (UTC) to BST (UTC+1) there. The next time it shows is 2027-03-28 02:00',
    )
  })
  it('in the hour that comes twice is taken', () => {
    expect(at('2026-10-25T01:30', '2026-10-25T06:00', '2026-10-25T08:00')).toEqual([])
  })
})

it('an animal in two crates and two letters alike are said', () => {
  const reasons = after((plan) => {
    plan.crates.push({ ...only(plan.crates), id: 'crate-2' })
  })
  expect(reasons.map(({ path }) => path)).toEqual(['animals.0', 'crates.1.letter'])
  expect(only(reasons).message).toBe('Corrie is entered 2 times: in Crate A and in Crate A.')
})

it('a species row without four limits cannot judge', () => {
  const rows = PROFILES.map((row) => {
    const { limits: _limits, ...values } = row.values
    return row.key === 'dog' ? { ...row, values } : row
  })
  const reasons = reasonsNotAssessable(glasgowToMuscat(), { places: PLACES, profiles: rows })
  expect(only(reasons).message).toContain('no alarm and critical limits')
})

it('new parts pass the schema of the form', () => {
  const plan = emptyPlan(1)
  plan.animals.push({ ...newAnimal(plan), name: 'A' })
  plan.crates.push(newCrate(plan, null))
  for (const kind of ['road', 'shed', 'ramp', 'sea', 'rail', 'border', 'rest'] as const)
    plan.legs.push(newLeg(plan, kind))
  plan.legs.push(...newFlight(plan))
  expect(planSchema.safeParse(plan).error).toBeUndefined()
  expect(new Set(plan.legs.map(({ id }) => id)).size).toBe(plan.legs.length)
})
