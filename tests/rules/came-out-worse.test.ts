import { describe, expect, it } from 'vitest'
import { cameOutWorse } from '@/lib/rules/came-out-worse'
import type { SignedCrate } from '@/lib/rules/came-out-worse'
import type { SignedOverride } from '@/lib/rules/effective-verdict'
import type { Finding } from '@/lib/rules/result'
import { decide } from '@/lib/rules/verdicts'
import { aFinding } from './support/findings'

/* A new input hash alone voids a signature only where the outcome is worse: the product's own rule, no outside source. */

const PASSAGES = [
  { animalId: 'otto', crateId: 'a', legIds: ['van', 'ramp'] },
  { animalId: 'bess', crateId: 'b', legIds: ['van', 'ramp'] },
]
const outcome = (...findings: Finding[]) => ({ findings, ...decide(findings, PASSAGES) })
const crate = (...overrides: SignedOverride[]): SignedCrate => ({
  crateId: 'a',
  occupants: ['otto'],
  overrides,
})

const met = aFinding({ rule: 'core-alarm-high', status: 'met', animalId: 'otto', marginOutsideAirC: 9 })
const alarm = aFinding({
  rule: 'core-alarm-high',
  status: 'breach',
  limitKind: 'alarm',
  side: 'high',
  overridable: true,
  animalId: 'otto',
  legId: 'ramp',
  minutesPast: 12,
  worstBodyC: 39.9,
})
const {
  animalId: _animal,
  crateId: _crate,
  legId: _leg,
  ...ABOUT_ALL
} = aFinding({
  rule: 'papers',
  status: 'breach',
})
const override: SignedOverride = {
  rule: alarm.rule,
  animalId: 'otto',
  legId: 'ramp',
  reason: 'Short, and watched throughout.',
  minutesPast: 12,
  worstBodyC: 39.9,
  worstValue: null,
  signedBy: 'Dr R. Example',
  signedAtMs: 0,
}

describe('a later run of the same plan', () => {
  it.each<[string, boolean, Finding[], Finding[], SignedOverride[]]>([
    ['the same', false, [met], [met], []],
    ['better', false, [alarm], [met], []],
    ['a lower verdict', true, [met], [{ ...met, marginOutsideAirC: 2 }], []],
    ['a breach that was none', true, [met], [alarm], []],
    ['a second breach under the same verdict', true, [alarm], [alarm, { ...alarm, legId: 'van' }], []],
    ['a breach of the other crate', false, [met], [met, { ...alarm, animalId: 'bess', crateId: 'b' }], []],
    ['a breach that is about all', true, [met], [met, ABOUT_ALL], []],
    ['an override inside its figures', false, [alarm], [alarm], [override]],
    ['an override a minute beyond them', true, [alarm], [{ ...alarm, minutesPast: 13 }], [override]],
    ['an override a hundredth beyond them', true, [alarm], [{ ...alarm, worstBodyC: 39.91 }], [override]],
  ])('%s: worse is %s', (_words, worse, signed, later, overrides) => {
    expect(cameOutWorse(crate(...overrides), outcome(...signed), outcome(...later))).toBe(worse)
  })
})
