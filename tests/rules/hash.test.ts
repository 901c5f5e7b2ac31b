import { createHash } from 'node:crypto'
import { describe, expect, it } from 'vitest'
import { type DecidedFacts, canonicalText, digest, inputHash, planHash } from '@/lib/rules/hash'
import { SHIPPED_ROWS } from '@/lib/rules/shipped-rows'
import type { Scenario } from '@/lib/thermal'
import { beagle, crateOf, legOf, openAirAt, scenarioOf, usContext } from './support/worlds'

const facts: DecidedFacts = {
  animals: [
    {
      id: 'bess',
      name: 'Bess',
      identification: '900 000 000 000 001',
      breedNote: 'beagle',
      medicines: '',
      lastExamination: '2026-06-01 Dr R. Example',
    },
  ],
  legs: [{ id: 'ramp', carrier: 'Skerrow', partyInCharge: 'Skerrow ramp' }],
}

const base = (): Scenario =>
  scenarioOf({
    legs: [
      legOf('ramp', { kind: 'ramp', surroundings: openAirAt(24, { source: 'forecast', issuedAtMs: 1_000 }) }),
      legOf('van'),
    ],
    crates: [crateOf('a', [beagle('bess')]), crateOf('b', [beagle('finn')])],
    context: usContext(),
  })

const inputOf = (scenario: Scenario, versions = {}) =>
  inputHash({ scenario, facts, profiles: SHIPPED_ROWS, engineVersion: '1', rulesVersion: '1', ...versions })

describe('the canonical form', () => {
  it('hashes as SHA-256 of its UTF-8 bytes, as Node’s own does', () => {
    const document = { name: 'Łódź', air: [1.5, -0, 1e21], legs: [{ id: 'b' }, { id: 'a' }] }
    expect(digest(document)).toBe(createHash('sha256').update(canonicalText(document), 'utf8').digest('hex'))
    expect(canonicalText(document)).toBe('{"air":[1.5,0,1e+21],"legs":[{"id":"b"},{"id":"a"}],"name":"Łódź"}')
  })

  it('does not tell absent from undefined, −0 from 0, nor one order of a set from another', () => {
    expect(digest({ a: 0, b: undefined })).toBe(digest({ a: -0 }))
    expect(digest({ crates: [{ id: 'b' }, { id: 'a' }] })).toBe(
      digest({ crates: [{ id: 'a' }, { id: 'b' }] }),
    )
    expect(digest({ flags: ['ill', 'elderly'] })).toBe(digest({ flags: ['elderly', 'ill'] }))
  })

  it('tells one order of legs from another: the journey is its order', () => {
    expect(digest({ legs: [{ id: 'a' }, { id: 'b' }] })).not.toBe(
      digest({ legs: [{ id: 'b' }, { id: 'a' }] }),
    )
  })

  it('refuses what is not a number', () => {
    expect(() => digest({ air: NaN })).toThrow(/not a finite number/)
  })
})

describe('plan hash and input hash', () => {
  const planned = planHash({ scenario: base(), facts })

  it.each<[string, (scenario: Scenario) => Scenario, boolean, boolean]>([
    ['a set-point people typed', (it) => ({ ...it, departureMs: it.departureMs + 60_000 }), true, true],
    [
      'a crate mark',
      (it) => ({ ...it, crates: it.crates.map((crate) => ({ ...crate, mark: `${crate.mark}x` })) }),
      true,
      true,
    ],
    [
      'a limit a vet set',
      (it) => ({ ...it, limits: [{ scope: 'bess', coreAlarmHighC: 39, reason: 'old' }] }),
      true,
      true,
    ],
    ['the purpose', (it) => ({ ...it, context: usContext({ purpose: 'research' }) }), true, true],
    ['typed weather', (it) => withWeather(it, { source: 'typed', airTempC: 25 }), true, true],
    ['fetched weather', (it) => withWeather(it, { source: 'forecast', airTempC: 25 }), false, true],
    [
      'when the forecast was issued',
      (it) => withWeather(it, { source: 'forecast', airTempC: 24, issuedAtMs: 2_000 }),
      false,
      true,
    ],
    [
      'a paper',
      (it) => ({
        ...it,
        context: usContext({ papers: [{ kind: 'health-certificate', animalIds: [], values: {} }] }),
      }),
      false,
      true,
    ],
    ['the spacing of tracks', (it) => ({ ...it, outputStepS: 120 }), false, true],
    ['the order of crates', (it) => ({ ...it, crates: [...it.crates].reverse() }), false, false],
  ])('%s: plan %s, input %s', (_, change, plan, input) => {
    expect(planHash({ scenario: change(base()), facts }) !== planned).toBe(plan)
    expect(inputOf(change(base())) !== inputOf(base())).toBe(input)
  })

  it.each<[string, (it: DecidedFacts) => DecidedFacts]>([
    [
      'a medicine',
      (it) => ({ ...it, animals: it.animals.map((animal) => ({ ...animal, medicines: 'carprofen' })) }),
    ],
    [
      'the carrier of a leg',
      (it) => ({ ...it, legs: it.legs.map((leg) => ({ ...leg, carrier: 'Another' })) }),
    ],
  ])('%s changes both', (_, change) => {
    expect(planHash({ scenario: base(), facts: change(facts) })).not.toBe(planned)
  })

  it.each(['engineVersion', 'rulesVersion'])('a new %s changes the input only', (version) => {
    expect(inputOf(base(), { [version]: '2' })).not.toBe(inputOf(base()))
  })

  it('a species row counts only where an animal of it travels', () => {
    const [dog, cat] = [SHIPPED_ROWS.dog, SHIPPED_ROWS.cat]
    if (dog === undefined || cat === undefined) throw new Error('The catalogue lacks dog or cat.')
    expect(inputOf(base(), { profiles: { ...SHIPPED_ROWS, cat: { ...cat, version: 99 } } })).toBe(
      inputOf(base()),
    )
    expect(inputOf(base(), { profiles: { ...SHIPPED_ROWS, dog: { ...dog, version: 99 } } })).not.toBe(
      inputOf(base()),
    )
  })
})

function withWeather(
  scenario: Scenario,
  { airTempC, ...parts }: { source: 'typed' | 'forecast'; airTempC: number; issuedAtMs?: number },
): Scenario {
  return {
    ...scenario,
    legs: scenario.legs.map((leg) =>
      leg.id === 'ramp'
        ? { ...leg, surroundings: openAirAt(airTempC, { issuedAtMs: 1_000, ...parts }) }
        : leg,
    ),
  }
}
