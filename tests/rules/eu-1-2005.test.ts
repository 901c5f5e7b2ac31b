import { describe, expect, it } from 'vitest'
import { packFindings } from '@/lib/rules/packs'
import type { Finding } from '@/lib/rules/result'
import { SHIPPED_ROWS } from '@/lib/rules/shipped-rows'
import { prepare } from '@/lib/rules/subject'
import { type Animal, schedulesOf } from '@/lib/thermal'
import { beagle, crateOf, legOf, roomAt, scenarioOf } from './support/worlds'

function findingsOf(countries: [string, string], animals: Animal[], durationMin = 60, tempC = 20): Finding[] {
  const legs = [
    legOf('road', {
      durationMin,
      surroundings: roomAt(tempC),
      place: { fromCountry: countries[0], toCountry: countries[1] },
    }),
  ]
  const given = scenarioOf({
    legs,
    crates: [crateOf('a', animals)],
    context: { jurisdictions: [], carriers: [], papers: [], purpose: 'commercial' },
  })
  const { scenario, subjects } = prepare(given, SHIPPED_ROWS)
  const base = { schedules: schedulesOf(scenario), planned: [], warmer: [], colder: [] }
  return packFindings({
    scenario,
    context: given.context ?? { jurisdictions: [], carriers: [], papers: [], purpose: 'commercial' },
    subjects,
    base,
    holdsWithMargin: () => true,
  })
}

const statusOf = (findings: Finding[], rule: string, animalId?: string) =>
  findings.find((finding) => finding.rule === rule && finding.animalId === (animalId ?? finding.animalId))
    ?.status

describe('Regulation (EC) No 1/2005, dogs and cats', () => {
  it('water: 8 h kept, 8 h 1 min past what memory says, which the US rules would allow', () => {
    const at = (durationMin: number) =>
      statusOf(
        findingsOf(['FR', 'DE'], [beagle('bess', { waterOfferedMin: [0] })], durationMin),
        'eu-1-2005-water',
      )
    expect([at(480), at(481)]).toEqual(['met', 'judgement'])
    expect(
      statusOf(
        findingsOf(['US', 'US'], [beagle('bess', { waterOfferedMin: [0] })], 481),
        'us-9cfr-3.17a-water',
      ),
    ).toBe('met')
  })

  it('age: 55 days breaks it, 56 does not, and with a grown female a person judges', () => {
    const pup = (ageDays: number) => beagle('pup', { ageDays, massKg: 3 })
    expect(statusOf(findingsOf(['FR', 'FR'], [pup(55)]), 'eu-1-2005-young')).toBe('breach')
    expect(statusOf(findingsOf(['FR', 'FR'], [pup(56)]), 'eu-1-2005-young')).toBe('met')
    expect(
      statusOf(
        findingsOf(['FR', 'FR'], [pup(55), beagle('dam', { sex: 'female' })]),
        'eu-1-2005-young',
        'pup',
      ),
    ).toBe('judgement')
  })

  it('the 5 to 30 °C of farm journeys never decides for a dog', () => {
    const findings = findingsOf(['FR', 'FR'], [beagle('bess')], 600, 34)
    expect(findings.filter(({ status }) => status === 'breach')).toEqual([])
    expect(findings.some(({ unit }) => unit === '°C')).toBe(false)
  })

  it('a leg out of Great Britain is read by the text kept there', () => {
    const rules = findingsOf(['GB', 'FR'], [beagle('bess')]).map(({ rule }) => rule)
    expect(rules).toContain('gb-1-2005-water')
    expect(rules).toContain('eu-1-2005-water')
    expect(rules.some((rule) => rule.startsWith('us-'))).toBe(false)
    expect(rules.some((rule) => rule.startsWith('law-not-held'))).toBe(false)
  })
})
