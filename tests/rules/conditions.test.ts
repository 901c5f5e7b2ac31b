import { describe, expect, it } from 'vitest'
import { conditionsOf } from '@/lib/rules/conditions'
import type { Finding, StopLimit } from '@/lib/rules/result'
import type { Leg } from '@/lib/thermal'
import { aFinding } from './support/findings'
import { beagle, crateOf, legOf, openAirAt, roomAt, scenarioOf, vanIn } from './support/worlds'

function conditions(legs: Leg[], findings: Finding[], stopLimits: StopLimit[] = []) {
  return conditionsOf(
    { findings, stopLimits },
    scenarioOf({ legs, crates: [crateOf('a', [beagle('otto')])] }),
    { ramp: 'Skerrow ramp', shed: 'Skerrow shed' },
  )
}

const narrow = (legId: string, parts: Partial<Finding> = {}) =>
  aFinding({ rule: 'core-alarm-high', legId, marginOutsideAirC: 2.5, marginMin: 20, side: 'high', ...parts })

describe('a narrow margin asks for something by itself', () => {
  it('with one of ours: a reading at the start and every 30 minutes, with the stop limit', () => {
    const [condition] = conditions(
      [legOf('shed', { kind: 'shed' })],
      [narrow('shed')],
      [{ animalId: 'otto', legId: 'shed', aboveC: 26, belowC: 8 }],
    )
    expect(condition).toMatchObject({
      number: 1,
      origin: 'narrow_margin',
      askedOf: 'ours',
      legIds: ['shed'],
      animalIds: ['otto'],
    })
    expect(condition?.text).toMatch(
      /at the start and every 30 minutes; stop limit \(above 26 °C, below 8 °C\)/,
    )
  })

  it('moving on the road: a display in the cab, readings at stops, or a stop each hour', () => {
    expect(conditions([legOf('road')], [narrow('road')])[0]?.text).toMatch(
      /display or alarm in the cab.*every stop.*stop each hour/,
    )
  })

  it('unattended: the party in charge confirms set-point and fresh air in writing', () => {
    const van = vanIn(openAirAt(24), {
      conditioning: { setPointC: 16, coolingW: 3_000, heatingW: 2_000 },
      ventilationM3h: 80,
    })
    const [condition] = conditions(
      [legOf('shed', { kind: 'shed', attended: false, surroundings: van })],
      [narrow('shed')],
    )
    expect(condition).toMatchObject({ askedOf: 'party-in-charge', party: 'Skerrow shed' })
    expect(condition?.text).toMatch(/16.0 °C.*80 m³\/h.*in writing/)
  })

  it.each([
    [3_000, 0, 'Cooled to at most 16.0 °C throughout. '],
    [0, 2_000, 'Heated to at least 16.0 °C throughout. '],
  ])(
    'with %d W of cooling and %d W of heating it asks for no more than the machine can',
    (coolingW, heatingW, words) => {
      const surroundings = vanIn(openAirAt(24), {
        conditioning: { setPointC: 16, coolingW, heatingW },
        ventilationM3h: 80,
      })
      const [condition] = conditions(
        [legOf('shed', { kind: 'shed', attended: false, surroundings })],
        [narrow('shed')],
      )
      expect(condition?.text).toBe(`${words}Fresh air 80 m³/h kept running. Confirmed in writing.`)
    },
  )

  it('in open air: the most minutes outside, shade, first off', () => {
    const leg = legOf('ramp', {
      kind: 'ramp',
      durationMin: 30,
      delay: { typicalMin: 5, worstMin: 15 },
      surroundings: openAirAt(30),
    })
    expect(conditions([leg], [narrow('ramp')]).map(({ text }) => text)).toContain(
      'At most 65 min in the open, in shade, and first off.',
    )
  })

  it('a margin of 3 °C asks for nothing', () => {
    expect(conditions([legOf('road')], [narrow('road', { marginOutsideAirC: 3 })])).toEqual([])
  })
})

describe('grouping', () => {
  it('the same words to the same party are one condition, numbered, with its legs in order', () => {
    const room = (id: string) => legOf(id, { kind: 'shed', attended: false, surroundings: roomAt(18) })
    const found = conditions(
      [room('one'), room('two')],
      [narrow('two'), narrow('one'), narrow('one', { animalId: 'bess' })],
    )
    expect(found).toHaveLength(1)
    expect(found[0]).toMatchObject({ number: 1, legIds: ['one', 'two'], animalIds: ['bess', 'otto'] })
  })

  it('a rule’s condition is asked in its own words with its citation', () => {
    const law = aFinding({
      rule: 'us-9cfr-2.78-health-certificate',
      basis: 'law',
      status: 'condition',
      legId: undefined,
      asked: 'Health certificate.',
      citation: '9 CFR 2.78(a)',
    })
    expect(conditions([legOf('road')], [law])[0]).toMatchObject({
      origin: 'rule',
      text: 'Health certificate. 9 CFR 2.78(a).',
      legIds: [],
      askedOf: 'ours',
    })
  })

  it('met and noted findings ask for nothing', () => {
    expect(
      conditions(
        [legOf('road')],
        [
          aFinding({ status: 'met', legId: 'road' }),
          aFinding({ status: 'note', legId: 'road', marginOutsideAirC: 0 }),
        ],
      ),
    ).toEqual([])
  })
})
