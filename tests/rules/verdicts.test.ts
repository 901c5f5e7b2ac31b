import fc from 'fast-check'
import { describe, expect, it } from 'vitest'
import type { Finding } from '@/lib/rules/result'
import { decide, weightOf, worstOf } from '@/lib/rules/verdicts'
import { aFinding, anyFinding } from './support/findings'

const OTTO = { animalId: 'otto', crateId: 'a', legIds: ['van', 'ramp'] }

function ottoOn(findings: Finding[], legId = 'ramp') {
  return decide(findings, [OTTO]).verdicts.find((verdict) => verdict.legId === legId)
}

describe('what one finding makes of a leg', () => {
  it.each([
    [{ status: 'breach' }, 'no-go'],
    [{ status: 'condition', marginOutsideAirC: 9 }, 'conditional'],
    [{ status: 'judgement' }, 'conditional'],
    [{ status: 'unknown' }, 'conditional'],
    [{ status: 'met', marginOutsideAirC: 2.5 }, 'conditional'],
    [{ status: 'met', marginOutsideAirC: 3 }, 'go'],
    [{ status: 'met' }, 'go'],
    [{ status: 'note', marginOutsideAirC: 0 }, 'go'],
  ] as const)('%o → %s', (parts, verdict) => {
    expect(weightOf(aFinding(parts))).toBe(verdict)
  })
})

describe('the finding that decides', () => {
  const breach = (rule: string, parts: Partial<Finding>) => aFinding({ rule, status: 'breach', ...parts })
  const inOrder: Finding[] = [
    breach('core-critical-high', { basis: 'physiology', limitKind: 'critical', marginOutsideAirC: -1 }),
    breach('us-law', { basis: 'law' }),
    breach('carrier', { basis: 'carrier' }),
    breach('core-alarm-high', { basis: 'physiology', limitKind: 'alarm', marginOutsideAirC: -9 }),
    breach('standard', { basis: 'standard' }),
    breach('house', { basis: 'house' }),
    aFinding({ rule: 'narrow', status: 'met', marginOutsideAirC: 1 }),
    aFinding({ rule: 'less-narrow', status: 'met', marginOutsideAirC: 2 }),
    aFinding({ rule: 'b-judgement', status: 'judgement', marginMin: 3 }),
    aFinding({ rule: 'a-judgement', status: 'judgement', marginMin: 30 }),
    aFinding({ rule: 'wide', status: 'met', marginOutsideAirC: 4 }),
    aFinding({ rule: 'wider', status: 'met', marginOutsideAirC: 5 }),
  ]

  it('goes breach by kind, then least margin in outside air, in minutes, then name', () => {
    for (let first = 0; first < inOrder.length; first += 1) {
      const rest = inOrder.slice(first).reverse()
      const decided = ottoOn(rest)?.decidedBy
      expect(rest[decided ?? -1]?.rule).toBe(inOrder[first]?.rule)
    }
  })

  it('cold effort ranks with alarm: the smaller margin decides', () => {
    const findings = [
      breach('core-alarm-high', { basis: 'physiology', limitKind: 'alarm', marginOutsideAirC: -2 }),
      breach('cold-effort', { basis: 'physiology', limitKind: 'cold-effort', marginOutsideAirC: -3 }),
    ]
    expect(findings[ottoOn(findings)?.decidedBy ?? -1]?.rule).toBe('cold-effort')
  })
})

describe('whose verdict a finding touches', () => {
  it('a finding without a leg counts for the animal, not for a leg', () => {
    const { verdicts, animalVerdicts, verdict } = decide(
      [aFinding({ status: 'judgement', legId: undefined })],
      [OTTO],
    )
    expect(verdicts.map((one) => one.verdict)).toEqual(['go', 'go'])
    expect(animalVerdicts[0]?.verdict).toBe('conditional')
    expect(verdict.verdict).toBe('conditional')
  })

  it('another animal’s finding changes the consignment, not this animal', () => {
    const bess = { animalId: 'bess', crateId: 'b', legIds: ['ramp'] }
    const decided = decide([aFinding({ status: 'breach', animalId: 'bess', crateId: 'b' })], [OTTO, bess])
    expect(decided.animalVerdicts.map(({ verdict }) => verdict)).toEqual(['go', 'no-go'])
    expect(decided.verdict.verdict).toBe('no-go')
  })

  it('a finding without an animal touches all aboard', () => {
    const bess = { animalId: 'bess', crateId: 'b', legIds: ['ramp'] }
    const { verdicts } = decide(
      [aFinding({ status: 'unknown', animalId: undefined, crateId: undefined })],
      [OTTO, bess],
    )
    expect(
      verdicts
        .filter(({ verdict }) => verdict === 'conditional')
        .map(({ animalId, legId }) => `${animalId} ${legId}`),
    ).toEqual(['otto ramp', 'bess ramp'])
  })
})

describe('for any findings', () => {
  const some = fc.array(anyFinding, { maxLength: 12 })

  it('a note never changes a verdict', () => {
    fc.assert(
      fc.property(some, anyFinding, (findings, extra) => {
        const without = decide(findings, [OTTO])
        const withNote = decide([...findings, { ...extra, status: 'note' }], [OTTO])
        expect(withNote).toEqual(without)
      }),
    )
  })

  it('one more finding never makes anything better', () => {
    fc.assert(
      fc.property(some, anyFinding, (findings, extra) => {
        const before = decide(findings, [OTTO])
        const after = decide([...findings, extra], [OTTO])
        before.verdicts.forEach(({ verdict }, index) =>
          expect(worstOf([verdict, after.verdicts[index]?.verdict ?? 'go'])).toBe(
            after.verdicts[index]?.verdict,
          ),
        )
        expect(worstOf([before.verdict.verdict, after.verdict.verdict])).toBe(after.verdict.verdict)
      }),
    )
  })

  it('their order does not matter', () => {
    fc.assert(
      fc.property(some, fc.integer(), (findings, seed) => {
        const turned = [...findings]
          .sort((a, b) => ((a.rule.length * 31 + seed) % 7) - ((b.rule.length * 31 + seed) % 7))
          .reverse()
        const rank = (list: Finding[], at?: number) => (at === undefined ? undefined : { ...list[at] })
        const [one, two] = [decide(findings, [OTTO]), decide(turned, [OTTO])]
        expect(two.verdict.verdict).toBe(one.verdict.verdict)
        const [a, b] = [rank(findings, one.verdict.decidedBy), rank(turned, two.verdict.decidedBy)]
        expect([b?.rule, b?.status, b?.marginOutsideAirC, b?.marginMin]).toEqual([
          a?.rule,
          a?.status,
          a?.marginOutsideAirC,
          a?.marginMin,
        ])
      }),
    )
  })

  it('animal and consignment take the worst of their parts', () => {
    fc.assert(
      fc.property(some, (findings) => {
        const { verdicts, animalVerdicts, verdict } = decide(findings, [OTTO])
        const animal = animalVerdicts[0]?.verdict ?? 'go'
        expect(worstOf([animal, ...verdicts.map((one) => one.verdict)])).toBe(animal)
        expect(worstOf([verdict.verdict, animal])).toBe(verdict.verdict)
      }),
    )
  })
})
