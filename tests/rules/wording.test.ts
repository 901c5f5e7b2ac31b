import { describe, expect, it } from 'vitest'
import { assess } from '@/lib/rules/assess'
import { conditionsOf } from '@/lib/rules/conditions'
import { SHIPPED_ROWS } from '@/lib/rules/shipped-rows'
import { legWords, rowWords, scheduleWords } from '@/lib/rules/wording'
import { beagle, usContext, crateOf, legOf, openAirAt, scenarioOf, vanIn } from './support/worlds'

/* Ids and keys are for the engine: what people read names legs by their place and kind, species by their name. */

const LEGS = [
  legOf('zq-1', { kind: 'road' }),
  legOf('zq-2', { kind: 'ramp' }),
  legOf('zq-3', { kind: 'flight', flightPhase: 'doors-shut-departure' }),
  legOf('zq-4', { kind: 'flight', flightPhase: 'airborne' }),
  legOf('zq-5', { kind: 'border' }),
]

describe('words for a schedule', () => {
  it.each([
    ['on-time', 'on time'],
    ['typical', 'all typical delays'],
    ['worst:zq-1', 'worst delay of leg 1 (road)'],
    ['worst:zq-2', 'worst delay of leg 2 (ramp)'],
    ['worst:zq-3', 'worst delay of leg 3 (doors shut)'],
    ['worst:zq-4', 'worst delay of leg 4 (airborne)'],
    ['worst:zq-5', 'worst delay of leg 5 (border post)'],
  ])('%s: %s', (id, words) => expect(scheduleWords(id, LEGS)).toBe(words))

  it('a leg that is not there has no name, not even its id', () => {
    expect(legWords('zq-9', LEGS)).toBe('a leg')
  })
})

it('a species row is called by its name', () => {
  expect(rowWords({ profile: 'snub-nosed-dog', version: 2 })).toBe('Species row snub-nosed dog, version 2')
  expect(rowWords({ profile: 'day-old-chick', version: 1 })).toBe('Species row day-old chick, version 1')
})

it('no text of an assessment holds an id or a key', () => {
  const hot = openAirAt(41, { shadePct: 0 })
  const place = { fromCountry: 'US', toCountry: 'US' }
  const scenario = scenarioOf({
    context: usContext(),
    legs: [
      legOf('zq-van', {
        durationMin: 90,
        surroundings: vanIn(hot),
        place,
        delay: { typicalMin: 10, worstMin: 60 },
      }),
      legOf('zq-ramp', {
        kind: 'ramp',
        durationMin: 40,
        surroundings: hot,
        place,
        attended: false,
        delay: { typicalMin: 10, worstMin: 90 },
      }),
    ],
    crates: [crateOf('zq-crate', [{ ...beagle('zq-dog'), flags: ['snub-nosed', 'juvenile'], ageDays: 40 }])],
  })
  const result = assess(scenario, SHIPPED_ROWS)
  const texts = result.findings.flatMap(({ note, asked, citation = '', overrideRefusedBecause = '' }) => [
    note,
    asked,
    citation,
    overrideRefusedBecause,
  ])
  texts.push(...conditionsOf(result, scenario, {}).map(({ text }) => text))
  expect(texts.some((text) => text.includes('worst delay of leg 2 (ramp)'))).toBe(true)
  expect(texts.some((text) => text.includes('Species row snub-nosed dog'))).toBe(true)
  // Our ids, keys of profiles, and names written as a program writes them.
  const key = /zq-|snub-nosed-dog|worst:|\b[a-z]+[a-z]*[A-Z][a-z]+|\bundefined\b|\bNaN\b/
  expect(texts.filter((text) => key.test(text))).toEqual([])
}, 60_000)
