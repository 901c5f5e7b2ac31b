import fc from 'fast-check'
import { describe, expect, it } from 'vitest'
import {
  type EffectiveInput,
  type SignedOverride,
  effectiveVerdict,
  isOverridable,
  signedFigures,
  whyOverrideEnds,
} from '@/lib/rules/effective-verdict'
import type { Finding } from '@/lib/rules/result'
import { decide } from '@/lib/rules/verdicts'
import { aFinding, anyFinding } from './support/findings'

const PASSAGE = { animalId: 'otto', crateId: 'a', legIds: ['van', 'ramp'] }

function assessmentOf(findings: Finding[]): EffectiveInput['assessment'] {
  return { findings, verdicts: decide(findings, [PASSAGE]).verdicts, animals: [{ id: 'otto', crateId: 'a' }] }
}

function overrideOf(finding: Finding, parts: Partial<SignedOverride> = {}): SignedOverride {
  return {
    rule: finding.rule,
    animalId: finding.animalId ?? null,
    legId: finding.legId ?? null,
    reason: 'Seen on the ramp with shade and water',
    signedBy: 'Dr R. Example',
    signedAtMs: 0,
    ...signedFigures(finding),
    ...parts,
  }
}

const alarm = aFinding({
  rule: 'core-alarm-high',
  status: 'breach',
  limitKind: 'alarm',
  side: 'high',
  overridable: true,
  minutesPast: 12,
  worstBodyC: 39.9,
})

describe('an override by a vet', () => {
  it('turns the stamp into go with conditions and says who did it', () => {
    const by = overrideOf(alarm)
    const effective = effectiveVerdict({
      assessment: assessmentOf([alarm]),
      approvals: [{ crateId: 'a', overrides: [by] }],
      conditions: [],
    })
    expect(effective.verdict.verdict).toBe('conditional')
    expect(effective.overridden).toEqual([{ findingIndex: 0, by }])
    expect(effective.ended).toEqual([])
  })

  it('of air, water or carbon dioxide ends beyond the figure it was signed for', () => {
    const gas = aFinding({
      rule: 'carbon-dioxide',
      status: 'breach',
      limitKind: 'other',
      overridable: true,
      minutesPast: 40,
      value: 16_000,
      unit: 'ppm',
    })
    const floor = aFinding({
      rule: 'house-air-floor',
      basis: 'house',
      status: 'breach',
      side: 'low',
      overridable: true,
      value: 4.5,
      unit: '°C',
    })
    expect(whyOverrideEnds(gas, overrideOf(gas))).toBeUndefined()
    expect(whyOverrideEnds({ ...gas, value: 29_000 }, overrideOf(gas))).toContain('signed for 16000.0')
    expect(whyOverrideEnds({ ...gas, minutesPast: 41 }, overrideOf(gas))).toContain('41 minutes')
    expect(whyOverrideEnds({ ...floor, value: 5 }, overrideOf(floor))).toBeUndefined()
    expect(whyOverrideEnds({ ...floor, value: 4.4 }, overrideOf(floor))).toContain('signed for 4.5')
  })

  it.each<[string, Partial<SignedOverride>, boolean]>([
    ['at the minutes it was signed for', { minutesPast: 12 }, true],
    ['a minute beyond them', { minutesPast: 11 }, false],
    ['at the body temperature it was signed for', { worstBodyC: 39.9 }, true],
    ['a hundredth beyond it', { worstBodyC: 39.89 }, false],
    ['without any body temperature', { worstBodyC: null }, false],
  ])('%s', (_, signed, holds) => {
    const effective = effectiveVerdict({
      assessment: assessmentOf([alarm]),
      approvals: [{ crateId: 'a', overrides: [overrideOf(alarm, signed)] }],
      conditions: [],
    })
    expect(effective.verdict.verdict).toBe(holds ? 'conditional' : 'no-go')
    expect(effective.ended).toHaveLength(holds ? 0 : 1)
  })

  it('on the cold side a colder body is beyond', () => {
    const cold = { ...alarm, rule: 'core-alarm-low', side: 'low' as const, worstBodyC: 36.8 }
    const verdictFor = (worstBodyC: number) =>
      effectiveVerdict({
        assessment: assessmentOf([cold]),
        approvals: [{ crateId: 'a', overrides: [overrideOf(cold, { worstBodyC })] }],
        conditions: [],
      }).verdict.verdict
    expect([verdictFor(36.8), verdictFor(36.9)]).toEqual(['conditional', 'no-go'])
  })

  it('reaches only the crate it was signed on', () => {
    const effective = effectiveVerdict({
      assessment: assessmentOf([alarm]),
      approvals: [{ crateId: 'b', overrides: [overrideOf(alarm)] }],
      conditions: [],
    })
    expect(effective.verdict.verdict).toBe('no-go')
  })

  it('is refused where the journey 3 °C warmer passes critical', () => {
    const refused = {
      ...alarm,
      overridable: false,
      overrideRefusedBecause: 'The journey 3 °C warmer passes the critical limit.',
    }
    expect(isOverridable(refused)).toBe(false)
    const effective = effectiveVerdict({
      assessment: assessmentOf([refused]),
      approvals: [{ crateId: 'a', overrides: [overrideOf(refused)] }],
      conditions: [],
    })
    expect(effective.verdict.verdict).toBe('no-go')
    expect(effective.ended[0]?.because).toMatch(/3 °C warmer/)
  })

  it('can never lift critical, law or carrier, whatever the findings and overrides say', () => {
    const absolute = anyFinding
      .map((finding): Finding => ({ ...finding, status: 'breach', overridable: true }))
      .filter(({ basis, limitKind }) => basis === 'law' || basis === 'carrier' || limitKind === 'critical')
    fc.assert(
      fc.property(fc.array(anyFinding, { maxLength: 6 }), absolute, (others, finding) => {
        const findings = [...others, finding]
        const overrides = findings.map((one) =>
          overrideOf(one, { minutesPast: 1_000, worstBodyC: one.side === 'low' ? 0 : 100 }),
        )
        const effective = effectiveVerdict({
          assessment: assessmentOf(findings),
          approvals: [{ crateId: 'a', overrides }],
          conditions: [],
        })
        expect(effective.verdict.verdict).toBe('no-go')
      }),
    )
  })

  it('leaves the assessment as it was', () => {
    const assessment = assessmentOf([alarm])
    const before = JSON.stringify(assessment)
    effectiveVerdict({
      assessment,
      approvals: [{ crateId: 'a', overrides: [overrideOf(alarm)] }],
      conditions: [],
    })
    expect(JSON.stringify(assessment)).toBe(before)
  })
})

describe('conditions', () => {
  const kept = aFinding({ marginOutsideAirC: 8 })
  const condition = {
    origin: 'vet' as const,
    crateId: 'a',
    legId: 'ramp',
    text: 'Water on arrival',
    answer: null,
  }

  it('a vet’s condition makes its leg conditional, and no other', () => {
    const { verdicts } = effectiveVerdict({
      assessment: assessmentOf([kept]),
      approvals: [],
      conditions: [condition],
    })
    expect(verdicts.map(({ legId, verdict }) => [legId, verdict])).toEqual([
      ['van', 'go'],
      ['ramp', 'conditional'],
    ])
  })

  it('one that was refused stops the leg', () => {
    const { verdicts } = effectiveVerdict({
      assessment: assessmentOf([kept]),
      approvals: [],
      conditions: [{ ...condition, answer: 'refused' }],
    })
    expect(verdicts.map(({ verdict }) => verdict)).toEqual(['go', 'no-go'])
  })

  it('a confirmed narrow-margin condition changes nothing: the finding already says it', () => {
    const narrow = { ...condition, origin: 'narrow_margin' as const, answer: 'confirmed' as const }
    expect(
      effectiveVerdict({ assessment: assessmentOf([kept]), approvals: [], conditions: [narrow] }).verdict
        .verdict,
    ).toBe('go')
  })
})
