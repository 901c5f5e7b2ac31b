import { describe, expect, it } from 'vitest'
import { prepare } from '@/lib/rules/subject'
import { US_9CFR_3 } from '@/lib/rules/packs/us-9cfr-3'
import { PACKS, packFindings } from '@/lib/rules/packs'
import { epochMs } from '@/lib/rules/packs/pack'
import type { Finding } from '@/lib/rules/result'
import { SHIPPED_ROWS } from '@/lib/rules/shipped-rows'
import {
  type Animal,
  type Leg,
  type Paper,
  type RuleContext,
  type Scenario,
  schedulesOf,
} from '@/lib/thermal'
import {
  DEPARTURE_MS,
  beagle,
  crateOf,
  legOf,
  openAirAt,
  pug,
  roomAt,
  scenarioOf,
  usContext,
} from './support/worlds'

/*
 * Thresholds of 9 CFR Part 3 Subpart A for dogs and cats, each looked at from both sides. Legs here name their air
 * themselves, so no simulation is needed: the law reads the air outside the crate.
 */

const celsius = (tempF: number) => (tempF - 32) / 1.8
const days = (count: number) => count * 86_400_000

interface World {
  legs: Leg[]
  animals?: Animal[]
  context?: Partial<RuleContext>
  departureMs?: number
  crate?: Parameters<typeof crateOf>[2]
  holdsWithMargin?: boolean
}

function findingsOf(
  {
    legs,
    animals = [beagle('bess')],
    context = {},
    departureMs = DEPARTURE_MS,
    crate,
    holdsWithMargin = true,
  }: World,
  all = false,
): Finding[] {
  const given: Scenario = scenarioOf({
    legs,
    crates: [crateOf('a', animals, crate)],
    context: usContext(context),
    departureMs,
  })
  const { scenario, subjects } = prepare(given, SHIPPED_ROWS)
  const base = { schedules: schedulesOf(scenario), planned: [], warmer: [], colder: [] }
  const view = {
    scenario,
    context: scenario.context ?? usContext(),
    subjects,
    base,
    holdsWithMargin: () => holdsWithMargin,
  }
  return all ? packFindings(view) : US_9CFR_3.evaluate(view)
}

function one(world: World, rule: string, side?: 'high' | 'low'): Finding {
  const found = findingsOf(world).find(
    (finding) => finding.rule === rule && (side === undefined || finding.side === side),
  )
  if (found === undefined) throw new Error(`No finding ${rule}.`)
  return found
}

const road = (tempF: number, durationMin: number) =>
  legOf('road', { durationMin, surroundings: roomAt(celsius(tempF)) })
const shed = (tempF: number, durationMin: number, id = 'shed') =>
  legOf(id, { kind: 'shed', durationMin, surroundings: roomAt(celsius(tempF)) })
const ramp = (tempF: number, durationMin: number) =>
  legOf('ramp', { kind: 'ramp', durationMin, surroundings: roomAt(celsius(tempF)) })

describe('temperature in a surface vehicle', () => {
  it.each([
    [86, 240, 'met'],
    [86, 241, 'breach'],
    [85, 600, 'met'],
    [44, 240, 'met'],
    [44, 241, 'breach'],
    [45, 600, 'met'],
  ] as const)('%d °F for %d min: %s', (tempF, durationMin, status) => {
    expect(
      one({ legs: [road(tempF, durationMin)] }, 'us-9cfr-3.16e-temperature', tempF > 60 ? 'high' : 'low')
        .status,
    ).toBe(status)
  })

  it.each([
    ['85.05 °F, above in °F and not above the printed 29.5 °C', 85.05, 'high', 'judgement'],
    ['85.2 °F, above in both', 85.2, 'high', 'breach'],
    ['44.98 °F, below in °F and not below the printed 7.2 °C', 44.98, 'low', 'judgement'],
    ['44.9 °F, below in both', 44.9, 'low', 'breach'],
  ] as const)('edge of two units: %s', (_, tempF, side, status) => {
    expect(one({ legs: [road(tempF, 300)] }, 'us-9cfr-3.16e-temperature', side).status).toBe(status)
  })

  it('the clock runs on from one road leg into the next', () => {
    const legs = [road(86, 130), { ...road(86, 130), id: 'road-2' }]
    const found = findingsOf({ legs }).filter(
      ({ rule, side }) => rule === 'us-9cfr-3.16e-temperature' && side === 'high',
    )
    expect(found.map(({ legId, status }) => [legId, status])).toEqual([
      ['road', 'met'],
      ['road-2', 'breach'],
    ])
    expect(found[1]?.minute).toBeCloseTo(240, 6)
  })

  it('is judged at the worst delay', () => {
    const legs = [{ ...road(86, 200), delay: { typicalMin: 0, worstMin: 41 } }]
    const found = one({ legs }, 'us-9cfr-3.16e-temperature', 'high')
    expect([found.status, found.scheduleId]).toEqual(['breach', 'worst:road'])
  })

  it('reads the text in °F and cites the number in force', () => {
    const now = one({ legs: [road(86, 241)] }, 'us-9cfr-3.16e-temperature', 'high')
    expect([now.limit, now.unit, now.citation, now.overridable]).toEqual([85, '°F', '9 CFR 3.16(e)', false])
    expect(now.value).toBeCloseTo(86, 6)
    const before = one(
      { legs: [road(86, 241)], departureMs: epochMs('2019-07-01') },
      'us-9cfr-3.16e-temperature',
      'high',
    )
    expect(before.citation).toBe('9 CFR 3.15(e)')
  })
})

describe('fans when the air reaches 85 °F', () => {
  it('at exactly 85 °F they are required, and that is no breach', () => {
    expect(one({ legs: [road(85, 60)] }, 'us-9cfr-3.16e-ventilation').status).toBe('condition')
    expect(one({ legs: [road(84.9, 60)] }, 'us-9cfr-3.16e-ventilation').status).toBe('met')
  })
})

describe('temperature in a holding area', () => {
  it('44 °F 3 h, 46 °F 5 min, 44 °F 3 h: never four hours in a row, but doubtful in all', () => {
    const legs = [shed(44, 180, 's1'), shed(46, 5, 's2'), shed(44, 180, 's3')]
    const found = findingsOf({ legs }).filter(
      ({ rule, side }) => rule === 'us-9cfr-3.19d-temperature' && side === 'low',
    )
    expect(found.map(({ legId, status }) => [legId, status])).toEqual([
      ['s1', 'met'],
      ['s2', 'met'],
      ['s3', 'judgement'],
    ])
    expect(found[2]?.note).toMatch(/360 min beyond the limit in all/)
  })

  it('without the pause it is a breach', () => {
    expect(one({ legs: [shed(44, 241)] }, 'us-9cfr-3.19d-temperature', 'low').status).toBe('breach')
  })
})

describe('moving between terminal and conveyance', () => {
  it.each([
    [86, 45, 'high', 'met'],
    [86, 46, 'high', 'breach'],
    [44, 45, 'low', 'met'],
    [44, 46, 'low', 'breach'],
  ] as const)('%d °F for %d min, %s: %s', (tempF, durationMin, side, status) => {
    expect(one({ legs: [ramp(tempF, durationMin)] }, 'us-9cfr-3.20a-temperature', side).status).toBe(status)
  })

  const certificate = (daysBefore: number): Paper => ({
    kind: 'acclimation-certificate',
    animalIds: ['bess'],
    issuedMs: DEPARTURE_MS - days(daysBefore),
    values: { minAirF: 35 },
  })

  it('a certificate of 10 days lowers the floor to what it states, one of 11 days is void', () => {
    const at = (tempF: number, age: number) =>
      one(
        { legs: [ramp(tempF, 60)], context: { papers: [certificate(age)] } },
        'us-9cfr-3.20a-temperature',
        'low',
      )
    expect([at(36, 10).status, at(36, 10).limit]).toEqual(['met', 35])
    expect(at(34, 10).status).toBe('breach')
    expect([at(36, 11).status, at(36, 11).limit]).toEqual(['breach', 45])
    expect(
      one({ legs: [ramp(36, 60)], context: { papers: [certificate(11)] } }, 'us-9cfr-3.14e-acclimation').note,
    ).toMatch(/void.*11 days/)
  })

  it('it never touches the high limit', () => {
    expect(
      one(
        { legs: [ramp(90, 50)], context: { papers: [certificate(5)] } },
        'us-9cfr-3.20a-temperature',
        'high',
      ).status,
    ).toBe('breach')
  })

  it('nor the cargo space of a vehicle', () => {
    expect(
      one(
        { legs: [road(36, 300)], context: { papers: [certificate(5)] } },
        'us-9cfr-3.16e-temperature',
        'low',
      ).status,
    ).toBe('breach')
  })
})

describe('aircraft, for which the text has no number', () => {
  const flight = legOf('flight', {
    kind: 'flight',
    flightPhase: 'airborne',
    durationMin: 300,
    surroundings: roomAt(15),
  })
  it('a note while the animal holds with 3 °C to spare, else a judgement', () => {
    expect(one({ legs: [flight] }, 'us-9cfr-3.16d-aircraft').status).toBe('note')
    expect(one({ legs: [flight], holdsWithMargin: false }, 'us-9cfr-3.16d-aircraft').status).toBe('judgement')
  })
})

describe('lodging with the carrier', () => {
  const legs = (shedMin: number) => [
    road(70, 60),
    shed(70, shedMin),
    legOf('flight', { kind: 'flight', flightPhase: 'airborne', surroundings: roomAt(15) }),
  ]
  const agreement: Paper = { kind: 'acceptance-agreement', animalIds: [], values: {} }

  it.each([
    [240, false, 'met'],
    [241, false, 'breach'],
    [241, true, 'met'],
    [360, true, 'met'],
    [361, true, 'breach'],
  ] as const)('%d min before departure, agreed %s: %s', (shedMin, agreed, status) => {
    expect(
      one({ legs: legs(shedMin), context: { papers: agreed ? [agreement] : [] } }, 'us-9cfr-3.14a-acceptance')
        .status,
    ).toBe(status)
  })
})

describe('food and water, counted from the last before delivery', () => {
  const world = (ageDays: number, gapMin: number): World => ({
    legs: [road(70, gapMin - 180)],
    animals: [beagle('bess', { ageDays, hoursSinceFed: 3, waterOfferedMin: [-180] })],
  })

  it.each([
    ['15 weeks', 105, 720, 'met'],
    ['15 weeks', 105, 721, 'breach'],
    ['16 weeks', 112, 721, 'met'],
    ['16 weeks', 112, 1_440, 'met'],
    ['16 weeks', 112, 1_441, 'breach'],
  ] as const)('food, %s, %d days old, %d min: %s', (_, ageDays, gapMin, status) => {
    expect(one(world(ageDays, gapMin), 'us-9cfr-3.17a-food').status).toBe(status)
  })

  it.each([
    [105, 720, 'met'],
    [105, 721, 'breach'],
    [1_400, 721, 'breach'],
  ] as const)('water, %d days old, %d min: %s', (ageDays, gapMin, status) => {
    expect(one(world(ageDays, gapMin), 'us-9cfr-3.17a-water').status).toBe(status)
  })

  it('a stop on the way starts the clock again', () => {
    const animals = [
      beagle('bess', { waterOfferedMin: [-180, 400], foodOfferedMin: [400], hoursSinceFed: 3 }),
    ]
    expect(one({ legs: [road(70, 1_000)], animals }, 'us-9cfr-3.17a-water').value).toBe(600)
  })

  it('what nobody stated is unknown', () => {
    const animals = [beagle('bess', { hoursSinceFed: undefined, waterOfferedMin: undefined })]
    expect(one({ legs: [road(70, 60)], animals }, 'us-9cfr-3.17a-food').status).toBe('unknown')
    expect(one({ legs: [road(70, 60)], animals }, 'us-9cfr-3.17a-water').status).toBe('unknown')
  })
})

describe('the crate', () => {
  const inch = 0.0254
  // Crate 40 × 27 × 30 in: four walls 4,020 in²; 14 % is 562.8 in².
  const box = (
    areas: Partial<Record<'front' | 'back' | 'left' | 'right', number>>,
    more: { rimMm?: number; sillHeightM?: number } = {},
  ): World => ({
    legs: [road(70, 60)],
    crate: {
      lengthM: 40 * inch,
      widthM: 27 * inch,
      heightM: 30 * inch,
      openings: (['front', 'back', 'left', 'right'] as const).flatMap((face) => {
        const squareInches = areas[face]
        return squareInches === undefined
          ? []
          : [
              {
                face,
                areaM2: squareInches * inch * inch,
                heightM: 10 * inch,
                sillHeightM: 15 * inch,
                rimMm: 20,
                meshOpenPct: 100,
                blockedPct: 0,
                ...more,
              },
            ]
      }),
    },
  })

  it('two long walls at 16 % each miss 14 % of all walls; they need 23.5 % each', () => {
    expect(one(box({ left: 192, right: 192 }), 'us-9cfr-3.15-openings').status).toBe('breach')
    expect(one(box({ left: 281.3, right: 281.3 }), 'us-9cfr-3.15-openings').status).toBe('breach')
    expect(one(box({ left: 281.5, right: 281.5 }), 'us-9cfr-3.15-openings').status).toBe('met')
  })

  it('the rule by face rests on memory and never breaks the law', () => {
    expect(one(box({ left: 600 }), 'us-9cfr-3.15-openings-by-face').status).toBe('judgement')
    expect(one(box({ left: 192, right: 192 }), 'us-9cfr-3.15-openings-by-face').status).toBe('met')
    expect(one(box({ left: 191, right: 192 }), 'us-9cfr-3.15-openings-by-face').status).toBe('judgement')
  })

  it('a third of the open area lies in the upper half', () => {
    expect(
      one(box({ left: 300, right: 300 }, { sillHeightM: 8.4 * inch }), 'us-9cfr-3.15-openings-upper-half')
        .status,
    ).toBe('met')
    expect(
      one(box({ left: 300, right: 300 }, { sillHeightM: 8.2 * inch }), 'us-9cfr-3.15-openings-upper-half')
        .status,
    ).toBe('breach')
    expect(
      one(box({ left: 300, right: 300 }, { sillHeightM: undefined }), 'us-9cfr-3.15-openings-upper-half')
        .status,
    ).toBe('unknown')
  })

  it.each([
    [18.9, 'breach'],
    [19, 'judgement'],
    [19.05, 'met'],
    [undefined, 'unknown'],
  ] as const)('rim %s mm: %s', (rimMm, status) => {
    expect(one(box({ left: 300, right: 300 }, { rimMm }), 'us-9cfr-3.15-rims').status).toBe(status)
  })
})

describe('how many to a crate', () => {
  const flight = legOf('flight', { kind: 'flight', flightPhase: 'airborne', surroundings: roomAt(15) })
  const pups = (count: number, ageDays: number, massKg: number) =>
    Array.from({ length: count }, (_, index) => beagle(`pup-${index}`, { ageDays, massKg }))

  it.each([
    ['one adult', pups(1, 1_400, 11), 'met'],
    ['two adults', pups(2, 1_400, 11), 'breach'],
    ['two pups of 181 days, 9 kg', pups(2, 181, 9), 'met'],
    ['two of 182 days', pups(2, 182, 9), 'breach'],
    ['two of 9.1 kg', pups(2, 100, 9.1), 'breach'],
    ['three pups', pups(3, 100, 4), 'breach'],
    ['two of unknown age', pups(2, 100, 4).map((pup) => ({ ...pup, ageDays: undefined })), 'unknown'],
  ] as const)('by air, %s: %s', (_, animals, status) => {
    expect(one({ legs: [flight], animals: [...animals] }, 'us-9cfr-3.15-numbers-air').status).toBe(status)
  })

  it('by surface four, from memory', () => {
    expect(
      one({ legs: [road(70, 60)], animals: pups(4, 100, 4) }, 'us-9cfr-3.15-numbers-surface').status,
    ).toBe('met')
    expect(
      one({ legs: [road(70, 60)], animals: pups(5, 100, 4) }, 'us-9cfr-3.15-numbers-surface').status,
    ).toBe('judgement')
  })

  it.each([
    [55, 'breach'],
    [56, 'met'],
    [undefined, 'unknown'],
  ] as const)('%s days old: %s', (ageDays, status) => {
    expect(
      one({ legs: [road(70, 60)], animals: [beagle('bess', { ageDays })] }, 'us-9cfr-2.130-age').status,
    ).toBe(status)
  })
})

describe('care', () => {
  it('looking in: at most four hours without one of ours', () => {
    const alone = (durationMin: number) =>
      one({ legs: [{ ...road(70, durationMin), attended: false }] }, 'us-9cfr-3.18a-observation').status
    expect([alone(240), alone(241)]).toEqual(['met', 'condition'])
  })

  it('a health certificate of 10 days holds, of 11 days does not, and a missing one is asked for', () => {
    const aged = (count: number) =>
      one(
        {
          legs: [road(70, 60)],
          context: {
            papers: [
              { kind: 'health-certificate', animalIds: [], issuedMs: DEPARTURE_MS - days(count), values: {} },
            ],
          },
        },
        'us-9cfr-2.78-health-certificate',
      ).status
    expect([aged(10), aged(11)]).toEqual(['met', 'condition'])
    expect(one({ legs: [road(70, 60)] }, 'us-9cfr-2.78-health-certificate').status).toBe('condition')
  })

  it('passing numbers is not enough for a snub-nosed animal', () => {
    expect(one({ legs: [road(70, 60)], animals: [pug('otto')] }, 'us-9cfr-2.131-handling').status).toBe(
      'judgement',
    )
    expect(findingsOf({ legs: [road(70, 60)] }).some(({ rule }) => rule === 'us-9cfr-2.131-handling')).toBe(
      false,
    )
  })

  it('cover below 50 °F in the open is advice from memory: a note', () => {
    const open = (tempF: number) => [legOf('ramp', { kind: 'ramp', surroundings: openAirAt(celsius(tempF)) })]
    expect(one({ legs: open(49) }, 'us-9cfr-3.20a3-cover').status).toBe('note')
    expect(findingsOf({ legs: open(50) }).some(({ rule }) => rule === 'us-9cfr-3.20a3-cover')).toBe(false)
  })
})

describe('whom the law reads', () => {
  const hot = [road(90, 300)]

  it('only legs that touch the country, unless its code was added by hand', () => {
    const legs = [
      { ...road(90, 300), place: { fromCountry: 'GB', toCountry: 'US' } },
      { ...road(90, 300), id: 'gb', place: { fromCountry: 'GB', toCountry: 'GB' } },
    ]
    const read = findingsOf({ legs, context: { jurisdictions: [] } }).filter(
      ({ rule }) => rule === 'us-9cfr-3.16e-temperature',
    )
    expect([...new Set(read.map(({ legId }) => legId))]).toEqual(['road'])
    expect(findingsOf({ legs: hot, context: { jurisdictions: [] } })).toEqual([])
  })

  it('on a private journey nothing is more than a note', () => {
    const found = findingsOf({ legs: hot, context: { purpose: 'private' } })
    expect([...new Set(found.map(({ status }) => status))].sort()).toEqual(['met', 'note'])
  })

  it('a species or a country no pack speaks of is said to be unknown', () => {
    const animals = [beagle('gus', { profile: 'guinea-pig', massKg: 0.9 })]
    expect(findingsOf({ legs: hot, animals }, true).map(({ rule, status }) => [rule, status])).toEqual([
      ['us-9cfr-3-species-not-held', 'unknown'],
    ])
    expect(
      findingsOf({ legs: hot, context: { jurisdictions: ['US', 'ZZ'] } }, true).some(
        ({ rule, status }) => rule === 'law-not-held-zz' && status === 'unknown',
      ),
    ).toBe(true)
  })

  it('what rests on memory never breaks the law in any pack', () => {
    const found = findingsOf({
      legs: [road(90, 300), ramp(30, 60), shed(30, 300)],
      animals: [
        pug('otto', { ageDays: 40, massKg: 3 }),
        beagle('bess', { ageDays: 30, massKg: 3 }),
        ...Array.from({ length: 4 }, (_, i) => beagle(`x${i}`)),
      ],
    })
    expect(found.some(({ sourceTag }) => sourceTag === 'memory')).toBe(true)
    expect(found.filter(({ sourceTag, status }) => sourceTag === 'memory' && status === 'breach')).toEqual([])
    expect(found.every(({ overridable }) => !overridable)).toBe(true)
    expect(PACKS.every(({ asOf }) => /^\d{4}-\d{2}-\d{2}$/.test(asOf))).toBe(true)
  })
})
