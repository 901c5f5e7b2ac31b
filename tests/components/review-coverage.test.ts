import { describe, expect, it } from 'vitest'
import { concernedIndexes, whyNotOverridable } from '@/components/review/override-words'
import { registrationTrouble } from '@/components/admin/registration-trouble'
import type { FindingView } from '@/lib/views/sheet'

const crate = (crateId: string, ...animalIds: string[]) => ({
  crateId,
  animals: animalIds.map((animalId) => ({ animalId })) as never,
})
const coverage = {
  crates: [crate('a', 'otto'), crate('b', 'juno')],
  subjects: [
    { crateId: null, animalId: 'otto' },
    { crateId: null, animalId: 'juno' },
    { crateId: 'b', animalId: null },
    { crateId: null, animalId: null },
  ],
}

describe('what one signature is about', () => {
  it('takes of a shared row only what concerns its crates', () => {
    expect(concernedIndexes({ indexes: [0, 1, 2, 3] }, coverage, ['a'])).toEqual([0, 3])
    expect(concernedIndexes({ indexes: [0, 1, 2, 3] }, coverage, ['b'])).toEqual([1, 2, 3])
    expect(concernedIndexes({ indexes: [0, 1, 2, 3] }, coverage, [])).toEqual([3])
  })

  it('leaves out an index the assessment does not have', () => {
    expect(concernedIndexes({ indexes: [9] }, coverage, ['a', 'b'])).toEqual([])
  })
})

describe('what nobody overrides', () => {
  const finding = (more: Partial<FindingView>) =>
    ({
      status: 'breach',
      basis: 'physiology',
      overridable: false,
      margin: { limitKind: 'other' },
      ...more,
    }) as FindingView

  it.each([
    ['Not possible: critical.', finding({ margin: { limitKind: 'critical' } as FindingView['margin'] })],
    ['Not possible: law.', finding({ basis: 'law' })],
    ['Not possible: the carrier’s own.', finding({ basis: 'carrier' })],
  ])('%s', (bold, one) => {
    expect(whyNotOverridable(one, false)?.bold).toBe(bold)
  })

  it('an alarm breach has a box, and one overridden for another crate has it again', () => {
    expect(whyNotOverridable(finding({ overridable: true }), false)).toBeNull()
    expect(whyNotOverridable(finding({ overridable: true, status: 'overridden' }), false)).toBeNull()
    expect(whyNotOverridable(finding({ overridable: true, status: 'overridden' }), true)?.bold).toBe(
      'Overridden.',
    )
  })
})

describe('a vet’s record in the list of users', () => {
  const record = (expiresOn: string, checked = true) => ({
    number: 'VR 1',
    country: 'GB',
    expiresOn,
    checked: checked ? { ms: 0, zone: 'UTC' } : null,
  })
  it.each([
    [null, 'no registration kept: can’t sign'],
    [record('2027-03-31', false), 'not checked by an admin: can’t sign'],
    [record('2026-06-08'), 'ended 2026-06-08: can’t sign'],
    [record('2026-06-09'), 'ends today'],
    [record('2026-06-10'), 'ends in 1 day'],
    [record('2026-08-08'), 'ends in 60 days'],
    [record('2026-08-09'), null],
  ])('%o', (registration, words) => {
    expect(registrationTrouble(registration, '2026-06-09')).toBe(words)
  })
})
