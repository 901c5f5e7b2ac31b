import { describe, expect, it } from 'vitest'
import { overrideRefusal } from '@/lib/rules/body-findings'
import { judgeBody } from '@/lib/rules/body-judgement'
import { crateFindings } from '@/lib/rules/crate-findings'
import { SHIPPED_ROWS } from '@/lib/rules/shipped-rows'
import { prepare } from '@/lib/rules/subject'
import type { LegExtremes } from '@/lib/thermal'
import { baseRuns } from './support/extremes'
import { beagle, crateOf, legOf, scenarioOf } from './support/worlds'

/* Each threshold of the house, both sides, on figures set by hand: what the engine would have to say for it to matter. */

const leg = legOf('road', { durationMin: 120 })

function subjectOf() {
  const [subject] = prepare(
    scenarioOf({ legs: [leg], crates: [crateOf('a', [beagle('bess')])] }),
    SHIPPED_ROWS,
  ).subjects
  if (subject === undefined) throw new Error('Nobody aboard.')
  return subject
}

const statusOf = (rule: string, heat: Partial<LegExtremes>) =>
  crateFindings(subjectOf(), leg, [leg], baseRuns({ heat })).find((finding) => finding.rule === rule)

describe('carbon dioxide', () => {
  const over = (over5000: number, over15000 = 0, over30000 = 0) =>
    statusOf('carbon-dioxide', { co2MaxPpm: 31_000, co2OverMin: { over5000, over15000, over30000 } })

  it.each([
    [59, 0, 0, 'met'],
    [60, 0, 0, 'condition'],
    [90, 29, 0, 'condition'],
    [90, 30, 0, 'breach'],
    [90, 30, 1, 'breach'],
  ] as const)('%d min over 5,000, %d over 15,000, %d over 30,000: %s', (a, b, c, status) => {
    expect(over(a, b, c)?.status).toBe(status)
  })

  it('15,000 may be overridden, 30,000 never', () => {
    expect(over(90, 30, 0)?.overridable).toBe(true)
    expect(over(90, 30, 1)?.overridable).toBe(false)
  })
})

describe('water lost', () => {
  it.each([
    [4.99, 'met'],
    [5, 'condition'],
    [7.99, 'condition'],
    [8, 'breach'],
  ] as const)('%d %% of mass: %s', (waterLossPctMass, status) => {
    expect(statusOf('water-loss', { waterLossPctMass })?.status).toBe(status)
  })
})

describe('air in the crate', () => {
  it('at the ceiling it is kept, above it is a breach of the house', () => {
    const { airHighC } = subjectOf()
    expect(statusOf('house-air-ceiling', { crateAirMaxC: airHighC })?.status).toBe('met')
    expect(statusOf('house-air-ceiling', { crateAirMaxC: airHighC + 0.01 })).toMatchObject({
      status: 'breach',
      basis: 'house',
    })
  })

  it('and the floor likewise', () => {
    const { airLowC } = subjectOf()
    expect(statusOf('house-air-floor', { crateAirMinC: airLowC })?.status).toBe('met')
    expect(statusOf('house-air-floor', { crateAirMinC: airLowC - 0.01 })?.status).toBe('breach')
  })
})

describe('cold effort', () => {
  const effort = (parts: Partial<LegExtremes['coldEffort']>) =>
    judgeBody(
      subjectOf(),
      leg,
      'low',
      baseRuns({
        cold: { coldEffort: { maxPct: 0, maxMin: 0, longestOver40Min: 0, longestOver60Min: 0, ...parts } },
      }),
    )

  it.each([
    ['39 %', { maxPct: 39 }, 'met'],
    ['40 %', { maxPct: 40 }, 'condition'],
    ['75 % for 59 minutes', { maxPct: 75, longestOver60Min: 59 }, 'condition'],
    ['60 % for an hour on end', { maxPct: 60, longestOver60Min: 60, breachMin: 60 }, 'breach'],
  ] as const)('%s: %s', (_, parts, status) => {
    expect(effort(parts).map(({ limit, status: found }) => [limit.rule, found])).toEqual([
      ['cold-effort', status],
    ])
  })
})

describe('body limits', () => {
  const high = (parts: Partial<LegExtremes>, side: 'heat' | 'cold' = 'heat') =>
    judgeBody(subjectOf(), leg, 'high', baseRuns({ [side]: parts }))
  const past = (alarmHigh: number, criticalHigh = 0) => ({
    criticalLow: 0,
    alarmLow: 0,
    alarmHigh,
    criticalHigh,
  })

  it('critical where passed, else alarm, else the alarm that would be met first', () => {
    expect(high({ peakCoreC: 39.7 }).map(({ limit, status }) => [limit.rule, status])).toEqual([
      ['core-alarm-high', 'met'],
    ])
    expect(
      high({ peakCoreC: 39.8, crossedMin: { alarmHigh: 40 }, minutesPast: past(12) }).map(
        ({ limit, status, minutesPast }) => [limit.rule, status, minutesPast],
      ),
    ).toEqual([['core-alarm-high', 'breach', 12]])
    expect(
      high({
        peakCoreC: 40.6,
        crossedMin: { alarmHigh: 40, criticalHigh: 60 },
        minutesPast: past(50, 30),
      }).map(({ limit, minutesPast }) => [limit.rule, minutesPast]),
    ).toEqual([['core-critical-high', 30]])
  })

  it('the worse of the two prone animals decides, whichever it is', () => {
    expect(
      high({ peakCoreC: 39.8, crossedMin: { alarmHigh: 40 }, minutesPast: past(5) }, 'cold')[0],
    ).toMatchObject({ status: 'breach', variant: 'cold-prone' })
  })

  it('the typical animal never does', () => {
    const base = baseRuns({ typical: { peakCoreC: 41, crossedMin: { alarmHigh: 10, criticalHigh: 20 } } })
    expect(judgeBody(subjectOf(), leg, 'high', base)[0]?.status).toBe('met')
  })

  it('any schedule can break it, and the farthest body is what an override is signed for', () => {
    const base = baseRuns(
      { scheduleId: 'on-time' },
      {
        scheduleId: 'typical',
        heat: { peakCoreC: 39.9, crossedMin: { alarmHigh: 40 }, minutesPast: past(30) },
      },
      {
        scheduleId: 'worst:road',
        heat: { peakCoreC: 40.1, crossedMin: { alarmHigh: 50 }, minutesPast: past(20) },
      },
    )
    expect(judgeBody(subjectOf(), leg, 'high', base)[0]).toMatchObject({
      status: 'breach',
      scheduleId: 'worst:road',
      minutesPast: 30,
      worstBodyC: 40.1,
    })
  })
})

describe('who may not override', () => {
  it('nobody, where the journey 3 °C warmer passes critical', () => {
    const lost = baseRuns({ warmer: { crossedMin: { criticalHigh: 70 } } })
    expect(overrideRefusal('bess', ['road'], 'high', lost)).toMatch(/3 °C warmer/)
    expect(overrideRefusal('bess', ['road'], 'low', lost)).toBeUndefined()
    expect(
      overrideRefusal('bess', ['road'], 'high', baseRuns({ warmer: { crossedMin: { alarmHigh: 70 } } })),
    ).toBeUndefined()
  })

  it('and a finding without a side is refused by either', () => {
    const heat = { waterLossPctMass: 9 }
    const at = (base: ReturnType<typeof baseRuns>) =>
      crateFindings(subjectOf(), leg, [leg], base).find(({ rule }) => rule === 'water-loss')
    expect(at(baseRuns({ heat }))).toMatchObject({ status: 'breach', overridable: true })
    expect(at(baseRuns({ heat, colder: { crossedMin: { criticalLow: 90 } } }))).toMatchObject({
      overridable: false,
      overrideRefusedBecause: expect.stringMatching(/3 °C colder/),
    })
  })
})

describe('notes', () => {
  it('humidity, heat effort and the thermoneutral zone are told of the typical animal, as notes only', () => {
    const typical = {
      crateHumidityMaxPct: 71,
      heatEffort: { maxPct: 60, maxMin: 5, longestOver40Min: 0, longestOver60Min: 0 },
    }
    const notes = crateFindings(subjectOf(), leg, [leg], baseRuns({ typical })).filter(
      ({ status }) => status === 'note',
    )
    expect(notes.map(({ rule }) => rule).sort()).toEqual(['heat-effort', 'humidity', 'thermoneutral-zone'])
  })

  it('none of them where all is well', () => {
    const notes = crateFindings(
      subjectOf(),
      leg,
      [leg],
      baseRuns({
        typical: {
          crateHumidityMaxPct: 70,
          crateHumidityMeanPct: 30,
          coldEffort: { maxPct: 5, maxMin: 0, longestOver40Min: 0, longestOver60Min: 0 },
        },
      }),
    ).filter(({ status }) => status === 'note')
    expect(notes).toEqual([])
  })
})
