import { describe, expect, it } from 'vitest'
import { judgements } from '@/lib/rules/judgements'
import { SHIPPED_ROWS } from '@/lib/rules/shipped-rows'
import { prepare } from '@/lib/rules/subject'
import { catalogue } from '@/lib/species'
import { AGE_MARKS } from '@/lib/species/ages'
import { type Animal, type Leg, schedulesOf } from '@/lib/thermal'
import { beagle, crateOf, legOf, openAirAt, pug, roomAt, scenarioOf, vanIn } from './support/worlds'

/** What a person is asked to judge, without running the engine: none of it depends on a figure computed. */
function asked(animal: Animal, legs: Leg[] = [legOf('road', { surroundings: roomAt(18) })]) {
  const { scenario, subjects } = prepare(scenarioOf({ legs, crates: [crateOf('a', [animal])] }), SHIPPED_ROWS)
  const base = { schedules: schedulesOf(scenario), planned: [], warmer: [], colder: [] }
  return judgements(scenario, subjects, base).map(({ rule, status }) => {
    expect(status).toBe('judgement')
    return rule
  })
}

describe('an animal a vet must judge', () => {
  it('a grown dog in health is none', () => expect(asked(beagle('bess'))).toEqual([]))

  it.each([
    [
      'a snub-nosed dog by its species',
      beagle('a', { profile: 'snub-nosed-dog', massKg: 8 }),
      'flag-snub-nosed',
    ],
    ['a snub-nosed dog by its flag', beagle('a', { flags: ['snub-nosed'] }), 'flag-snub-nosed'],
    ['a pug with both', pug('a'), 'flag-snub-nosed'],
    ['a sick one', beagle('a', { flags: ['ill'] }), 'flag-ill'],
    ['a pregnant one', beagle('a', { flags: ['pregnant'] }), 'flag-pregnant'],
    ['one of 15 weeks', beagle('a', { ageDays: 111 }), 'flag-juvenile'],
    ['one of 8 years', beagle('a', { ageDays: 2_922 }), 'flag-elderly'],
    ['one that was given something', beagle('a', { medicines: 'Carprofen 50 mg' }), 'medicines'],
  ])('%s', (_, animal, rule) => expect(asked(animal)).toEqual([rule]))

  it.each([112, 2_921])('not by its age at %d days, nor where nobody gave it', (ageDays) => {
    expect(asked(beagle('a', { ageDays }))).toEqual([])
    expect(asked(beagle('a', { ageDays: undefined }))).toEqual([])
  })

  it('once, where its age and a tick say the same', () => {
    expect(asked(beagle('a', { ageDays: 4_000, flags: ['elderly'] }))).toEqual(['flag-elderly'])
  })

  it('by age with the same weakened breath that the flag gives', () => {
    const flagsOf = (animal: Animal) =>
      prepare(scenarioOf({ legs: [legOf('road')], crates: [crateOf('a', [animal])] }), SHIPPED_ROWS)
        .subjects[0]?.animal.flags
    expect(flagsOf(beagle('a', { ageDays: 4_000 }))).toEqual(flagsOf(beagle('a', { flags: ['elderly'] })))
  })
})

it('every age mark names a species there is, with a source, young before old', () => {
  for (const [key, { youngUnderDays, oldFromDays }] of Object.entries(AGE_MARKS)) {
    expect(Object.keys(catalogue)).toContain(key)
    for (const mark of [youngUnderDays, oldFromDays]) if (mark) expect(mark.source.length).toBeGreaterThan(10)
    expect(youngUnderDays?.value ?? 0).toBeLessThan(oldFromDays?.value ?? Infinity)
  }
})

describe('sun', () => {
  const glasgow = { latitudeDeg: 55.9, longitudeDeg: -4.4 }
  /** From 09:20 in June unless told otherwise; at 55.9° north the sun is down at 00:30. */
  const road = (sun: number, solarApertureM2: number, shadePct = 0) =>
    legOf('road', {
      place: glasgow,
      surroundings: vanIn(
        openAirAt(18, {
          shadePct,
          series: [{ minute: 0, airTempC: 18, relHumidityPct: 50, windMs: 1, solarWm2: sun }],
        }),
        { solarApertureM2 },
      ),
    })

  it('is missed by day in the open and through glass, and nowhere else', () => {
    expect(asked(beagle('a'), [road(0, 1)])).toEqual(['sun-missing'])
    expect(asked(beagle('a'), [road(300, 1)])).toEqual([])
    expect(asked(beagle('a'), [road(0, 1, 100)])).toEqual([])
    expect(asked(beagle('a'), [road(0, 0)])).toEqual([])
  })

  it('typed for a space without glass is not left out in silence', () => {
    expect(asked(beagle('a'), [road(300, 0)])).toEqual(['sun-not-counted'])
  })
})
