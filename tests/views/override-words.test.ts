import { describe, expect, it } from 'vitest'
import type { Finding } from '@/lib/rules/result'
import { approvalStatement } from '@/lib/schemas/approval-statement'
import { findingInFull, overrideInFull } from '@/lib/views/override-words'

/* A signature names what it covers and what it goes against in full: the firm's own rule, no outside source. */

const plan = {
  animals: [
    { id: 'animal-1', name: 'Otto' },
    { id: 'animal-2', name: 'Juno' },
  ],
  crates: [
    { id: 'crate-1', letter: 'D', occupants: ['animal-1'] },
    { id: 'crate-2', letter: 'E', occupants: [] },
  ],
  legs: [
    { id: 'leg-1', kind: 'road', flightPhase: null },
    { id: 'leg-2', kind: 'flight', flightPhase: 'airborne' },
  ],
} as unknown as Parameters<typeof findingInFull>[1]

const finding = (more: Partial<Finding>): Finding => ({
  rule: 'core-alarm-high',
  basis: 'physiology',
  status: 'breach',
  asked: 'Body at most 39.7 °C, alarm limit.',
  note: '',
  sourceTag: 'judgement',
  overridable: true,
  ...more,
})
const plain = (words: string) => words.replaceAll('\u00a0', ' ')

describe('a finding in full', () => {
  it.each([
    [{ animalId: 'animal-1', legId: 'leg-2' }, 'Otto (D), leg 2 (airborne)'],
    [{ animalId: 'animal-1', crateId: 'crate-1' }, 'Otto (D)'],
    [{ animalId: 'animal-2', legId: 'leg-1' }, 'Juno, leg 1 (road)'],
    [{ crateId: 'crate-2', legId: 'leg-1' }, 'crate E, leg 1 (road)'],
    [{ legId: 'leg-1' }, 'leg 1 (road)'],
  ])('%o', (about, words) => {
    expect(plain(findingInFull(finding(about), plan))).toBe(`Body at most 39.7 °C, alarm limit, ${words}`)
  })

  it('carries the figures a signature is given for, where there are any', () => {
    const about = { animalId: 'animal-1', legId: 'leg-1' }
    expect(plain(overrideInFull(finding({ ...about, minutesPast: 12, worstBodyC: 39.9 }), plan))).toBe(
      'Body at most 39.7 °C, alarm limit, Otto (D), leg 1 (road): 12 min past, body to 39.9 °C',
    )
    expect(plain(overrideInFull(finding(about), plan))).toBe(
      'Body at most 39.7 °C, alarm limit, Otto (D), leg 1 (road)',
    )
  })
})

describe('a statement', () => {
  it('names each crate and each finding overridden', () => {
    expect(
      approvalStatement({
        examined: false,
        crateMarks: ['2441-A', '2441-B', '2441-D'],
        overridden: ['Body at most 39.7 °C, alarm limit, Otto (D)', 'Water lost under 8 % of body mass'],
      }),
    ).toBe(
      'I approve the crate set-ups 2441-A, 2441-B and 2441-D on the facts shown. I override by name: (1) Body at most 39.7 °C, alarm limit, Otto (D); (2) Water lost under 8 % of body mass. I have not examined the animal. This is not a certificate of fitness to travel.',
    )
  })

  it('says nothing of overriding where nothing is, nor of examining before it is answered', () => {
    expect(approvalStatement({ examined: null, crateMarks: ['2441-A'], overridden: [] })).toBe(
      'I approve the crate set-up 2441-A on the facts shown. This is not a certificate of fitness to travel.',
    )
  })
})
