import { describe, expect, it } from 'vitest'
import { assess } from '@/lib/rules/assess'
import { partsOfStage } from '@/lib/rules/progress'
import type { Assessment, Finding } from '@/lib/rules/result'
import { SHIPPED_ROWS } from '@/lib/rules/shipped-rows'
import type { Scenario } from '@/lib/thermal'
import {
  beagle,
  crateOf,
  legOf,
  openAirAt,
  pug,
  roomAt,
  scenarioOf,
  usContext,
  vanIn,
} from './support/worlds'

/*
 * Whole assessments on the real engine. What they expect is what published trials and the trade say of such animals in
 * such air, not figures read off this program.
 */

const run = (scenario: Scenario): Assessment => assess(scenario, SHIPPED_ROWS)

const deciding = (assessment: Assessment, legId: string): Finding | undefined =>
  assessment.findings[assessment.verdicts.find((one) => one.legId === legId)?.decidedBy ?? -1]

const find = (assessment: Assessment, rule: string, legId?: string) =>
  assessment.findings.find(
    (finding) => finding.rule === rule && (legId === undefined || finding.legId === legId),
  )

describe('a beagle at 18 °C in moving air', () => {
  const scenario = scenarioOf({
    legs: [legOf('road', { durationMin: 180, surroundings: roomAt(18) })],
    crates: [crateOf('a', [beagle('bess')])],
  })
  const assessment = run(scenario)

  it('may go, with at least 3 °C to spare on both sides', () => {
    expect(assessment.verdict.verdict).toBe('go')
    const margins = assessment.findings.flatMap(({ marginOutsideAirC }) => marginOutsideAirC ?? [])
    expect(margins).toHaveLength(2)
    expect(Math.min(...margins)).toBeGreaterThanOrEqual(3)
  })

  it('names the limit on each side: alarm above, effort of keeping warm below', () => {
    expect(find(assessment, 'core-alarm-high')).toMatchObject({
      status: 'met',
      limit: 39.7,
      unit: '°C',
      marginMin: 240,
    })
    expect(find(assessment, 'cold-effort')).toMatchObject({
      status: 'met',
      limit: 60,
      unit: '%',
      marginMin: 240,
    })
  })

  it('holds its margin where the beagles of the trials hold: alarm not before 27 °C and not after 33 °C', () => {
    const warmest = 18 + (find(assessment, 'core-alarm-high')?.marginOutsideAirC ?? 0)
    expect(warmest).toBeGreaterThanOrEqual(27)
    expect(warmest).toBeLessThanOrEqual(33)
  })

  it('gives stop limits around the planned air, in whole degrees', () => {
    const [stop] = assessment.stopLimits
    expect(Number.isInteger(stop?.aboveC)).toBe(true)
    expect(stop?.aboveC).toBeGreaterThan(18)
    expect(stop?.belowC).toBeLessThan(18)
  })

  it('says that no rules were evaluated, and that a failure of this air is unknown', () => {
    expect(assessment.rulesEvaluated).toBe(false)
    expect(assessment.findings.some(({ basis }) => basis === 'law')).toBe(false)
    const climate = assessment.endurance.find(({ kind }) => kind === 'climate')
    expect([climate?.toAlarmMin, climate?.toCriticalMin]).toEqual([null, null])
  })

  it('is the same to the byte when made again', () => {
    expect(JSON.stringify(run(scenario))).toBe(JSON.stringify(assessment))
  })

  it('does not depend on the order of animals in the document', () => {
    const two = (ids: string[]) =>
      run({ ...scenario, crates: ids.map((id) => crateOf(id, [beagle(`dog-${id}`)])) })
    const [one, other] = [two(['a', 'b']), two(['b', 'a'])]
    expect(other.inputHash).toBe(one.inputHash)
    expect(other.findings).toEqual(one.findings)
    expect(other.verdicts).toEqual(one.verdicts)
  })
})

describe('a pug on a ramp at 33 °C', () => {
  const ramp = (durationMin: number, worstMin: number) =>
    run(
      scenarioOf({
        legs: [
          legOf('van', { durationMin: 60, surroundings: roomAt(18) }),
          legOf('ramp', {
            kind: 'ramp',
            durationMin,
            surroundings: openAirAt(33),
            delay: { typicalMin: 0, worstMin },
          }),
        ],
        crates: [crateOf('a', [pug('otto', { activityByLeg: { ramp: 'alert' } })])],
      }),
    )

  it('is no-go at an hour, by a limit of the body, on the ramp', () => {
    const assessment = ramp(60, 0)
    expect(assessment.verdict.verdict).toBe('no-go')
    expect(deciding(assessment, 'ramp')).toMatchObject({
      basis: 'physiology',
      status: 'breach',
      side: 'high',
      variant: 'heat-prone',
    })
    expect(deciding(assessment, 'ramp')?.marginMin).toBeLessThan(0)
    expect(deciding(assessment, 'ramp')?.marginOutsideAirC).toBeLessThan(0)
  })

  it('critical is never open to an override', () => {
    const critical = find(ramp(120, 0), 'core-critical-high')
    expect(critical).toMatchObject({ status: 'breach', overridable: false })
  })

  it('a worst delay alone makes it so: the plan on time is judged at its worst', () => {
    const assessment = ramp(10, 90)
    expect(deciding(assessment, 'ramp')).toMatchObject({ status: 'breach', scheduleId: 'worst:ramp' })
    expect(assessment.animals.some(({ scheduleId }) => scheduleId === 'worst:ramp')).toBe(true)
  })

  it('tells the leg before that it has no minute to spare', () => {
    expect(find(ramp(60, 0), 'core-alarm-high', 'van')?.marginMin).toBe(0)
  })
})

describe('a small dog in the cold', () => {
  const at = (airTempC: number, durationMin = 240) =>
    run(
      scenarioOf({
        legs: [
          legOf('shed', { kind: 'shed', durationMin, surroundings: roomAt(airTempC, { airSpeedMs: 0.2 }) }),
        ],
        crates: [crateOf('a', [beagle('pip', { massKg: 3 })])],
      }),
    )

  it('loses by effort long before its core falls', () => {
    const assessment = at(-10)
    const effort = find(assessment, 'cold-effort')
    expect(effort?.status).toBe('breach')
    expect(assessment.verdict.verdict).toBe('no-go')
    expect(find(assessment, 'core-critical-low')).toBeUndefined()
  })

  it('an hour in a row is what counts: half an hour of the same air is no breach', () => {
    expect(find(at(-10, 30), 'cold-effort')?.status).not.toBe('breach')
  })
})

describe('a hold with its doors shut and no fresh air known', () => {
  const hold = vanIn(openAirAt(30), {
    volumeM3: 3,
    ventilationM3h: undefined,
    leakageM3h: 1,
    heatTransferWK: 20,
    solarApertureM2: 0,
    crateAirSpeedMs: 0.05,
  })
  const assessment = run(
    scenarioOf({
      legs: [
        legOf('doors', {
          kind: 'flight',
          flightPhase: 'doors-shut-departure',
          durationMin: 240,
          surroundings: hold,
          attended: false,
        }),
      ],
      crates: [crateOf('a', [beagle('bess', { massKg: 25 }), beagle('finn', { massKg: 25 })])],
    }),
  )

  it('asks for the carrier’s figure', () => {
    expect(find(assessment, 'ventilation-unknown', 'doors')?.status).toBe('judgement')
  })

  it('finds the carbon dioxide of two large dogs', () => {
    // 25 kg at 2 × Kleiber gives some 75 W, 14 litres of CO2 an hour each: 28 L/h into 3 m³ is 9,000 ppm an hour.
    expect(find(assessment, 'carbon-dioxide')?.status).toBe('breach')
  })

  it('is no-go', () => {
    expect(assessment.verdict.verdict).toBe('no-go')
  })
})

describe('a van whose cooling fails in the heat', () => {
  const assessment = run(
    scenarioOf({
      legs: [
        legOf('road', {
          durationMin: 120,
          surroundings: vanIn(openAirAt(36), {
            conditioning: { setPointC: 18, coolingW: 4_000, heatingW: 2_000 },
          }),
        }),
      ],
      crates: [crateOf('a', [beagle('bess')])],
    }),
  )

  it('goes well while it works, and lasts minutes, not hours, without', () => {
    expect(find(assessment, 'core-alarm-high')?.status).toBe('met')
    const climate = assessment.endurance.find(({ kind }) => kind === 'climate')
    expect(climate?.toAlarmMin).toBeLessThan(240)
    expect(climate?.toCriticalMin).toBeGreaterThanOrEqual(climate?.toAlarmMin ?? Infinity)
    expect(assessment.endurance.find(({ kind }) => kind === 'stays')?.toAlarmMin).toBe(240)
  })
})

describe('a van with too small a machine', () => {
  const at = (coolingW: number, heatingW: number, outsideC: number) =>
    run(
      scenarioOf({
        legs: [
          legOf('road', {
            durationMin: 180,
            surroundings: vanIn(openAirAt(outsideC), {
              solarApertureM2: 0,
              conditioning: { setPointC: 18, coolingW, heatingW },
            }),
          }),
        ],
        crates: [crateOf('a', [beagle('bess')])],
      }),
    ).findings.filter(({ rule }) => rule === 'set-point-not-held')

  it('says that 18 °C is not held, and how far off it is', () => {
    // 45 W/K of walls and 66 m³/h of air at 0.34 Wh/m³K are 67 W/K: 400 W hold 30 °C at best when it is 36 °C outside.
    const [finding, ...more] = at(400, 2_000, 36)
    expect(more).toEqual([])
    expect(finding).toMatchObject({ status: 'note', side: 'high', limit: 18, legId: 'road' })
    expect(finding?.value).toBeGreaterThan(30)
    expect(finding?.value).toBeLessThan(37)
  })

  it('says nothing where it holds, nor of a side it has no machine for', () => {
    expect(at(4_000, 2_000, 36)).toEqual([])
    expect(at(4_000, 0, 2)).toEqual([])
    expect(at(0, 300, 2).map(({ side }) => side)).toEqual(['low'])
  })
})

describe('air conditioning as the law asks for it at 85 °F', () => {
  it.each([
    [3_000, 0, 'met'],
    [0, 3_000, 'condition'],
  ])(
    '%d W of cooling, %d W of heating in a van that nothing ventilates: %s',
    (coolingW, heatingW, status) => {
      const surroundings = vanIn(openAirAt(40), {
        ventilationM3h: undefined,
        conditioning: { setPointC: 18, coolingW, heatingW },
      })
      const assessment = run(
        scenarioOf({
          legs: [legOf('road', { durationMin: 40, surroundings })],
          crates: [crateOf('a', [beagle('bess')])],
          context: usContext(),
        }),
      )
      expect(find(assessment, 'us-9cfr-3.16e-ventilation')?.status).toBe(status)
    },
  )
})

describe('what a vet made tighter', () => {
  it('decides in place of the species row', () => {
    const legs = [legOf('road', { durationMin: 60, surroundings: roomAt(20) })]
    const crates = [crateOf('a', [beagle('bess')])]
    const tighter = run(
      scenarioOf({ legs, crates, limits: [{ scope: 'bess', coreAlarmHighC: 38.5, reason: 'heart murmur' }] }),
    )
    expect(find(tighter, 'core-alarm-high')).toMatchObject({ limit: 38.5, status: 'breach' })
  })

  it('an air ceiling of the house is read in the crate, and can be widened', () => {
    const world = (airHighC: number) =>
      run(
        scenarioOf({
          legs: [legOf('road', { durationMin: 60, surroundings: roomAt(20) })],
          crates: [crateOf('a', [beagle('bess')])],
          limits: [{ scope: 'a', airHighC, reason: 'short coat' }],
        }),
      )
    expect(find(world(18), 'house-air-ceiling')?.status).toBe('breach')
    expect(find(world(40), 'house-air-ceiling')).toMatchObject({ status: 'met', limit: 40 })
  })
})

describe('rules with the plan', () => {
  it('are evaluated where the plan says whose they are, with their citation, on top of the body', () => {
    const legs = [
      legOf('road', {
        durationMin: 300,
        surroundings: roomAt(29.8),
        place: { fromCountry: 'US', toCountry: 'US' },
      }),
    ]
    const assessment = run(
      scenarioOf({
        legs,
        crates: [crateOf('a', [beagle('bess')])],
        context: usContext({ jurisdictions: [] }),
      }),
    )
    expect(assessment.rulesEvaluated).toBe(true)
    expect(find(assessment, 'us-9cfr-3.16e-temperature', 'road')).toMatchObject({
      status: 'breach',
      basis: 'law',
      citation: '9 CFR 3.16(e)',
      overridable: false,
    })
  })

  it('the law reads the computed air of a van, on its worst delay', () => {
    const van = vanIn(openAirAt(31), { ventilationM3h: 20, solarApertureM2: 0 })
    const legs = [
      legOf('road', { durationMin: 200, surroundings: van, delay: { typicalMin: 0, worstMin: 120 } }),
    ]
    const assessment = run(
      scenarioOf({ legs, crates: [crateOf('a', [beagle('bess')])], context: usContext() }),
    )
    expect(find(assessment, 'us-9cfr-3.16e-temperature', 'road')).toMatchObject({
      status: 'breach',
      scheduleId: 'worst:road',
    })
  })

  it('a sedated animal does not fly without the carrier’s written consent', () => {
    const legs = [
      legOf('air', { kind: 'flight', flightPhase: 'airborne', durationMin: 60, surroundings: roomAt(16) }),
    ]
    const crates = [crateOf('a', [beagle('bess', { flags: ['sedated'] })])]
    const consent = { kind: 'carrier-consent', animalIds: ['bess'], values: {} }
    const without = run(scenarioOf({ legs, crates, context: usContext() }))
    const withIt = run(scenarioOf({ legs, crates, context: usContext({ papers: [consent] }) }))
    expect([
      find(without, 'carrier-sedated-by-air')?.status,
      find(withIt, 'carrier-sedated-by-air')?.status,
    ]).toEqual(['breach', 'met'])
    expect(find(without, 'flag-sedated')?.status).toBe('judgement')
  })
})

describe('progress and stopping', () => {
  const scenario = scenarioOf({
    legs: [legOf('road', { surroundings: roomAt(18) })],
    crates: [crateOf('a', [beagle('bess')])],
  })

  it('tells how far it has come, never backwards', () => {
    const seen: number[] = []
    assess(scenario, SHIPPED_ROWS, {
      onProgress: ({ done, total }) => void (seen.push(done), expect(total).toBeGreaterThanOrEqual(done)),
    })
    expect(seen).toEqual([...seen].sort((a, b) => a - b))
    expect(seen.length).toBeGreaterThan(10)
  })

  it('names the leg or the schedule in hand, each in its turn', () => {
    const two = scenarioOf({
      legs: [
        legOf('road', { surroundings: roomAt(18), delay: { typicalMin: 0, worstMin: 10 } }),
        legOf('shed', { kind: 'shed', surroundings: roomAt(18) }),
      ],
      crates: [crateOf('a', [beagle('bess')])],
    })
    const stages: string[] = []
    assess(two, SHIPPED_ROWS, {
      onProgress: ({ stage }) => void (stages.at(-1) === stage || stages.push(stage)),
    })
    expect(stages).toEqual([
      'Typical and prone animals, schedule 1 of 2',
      'Typical and prone animals, schedule 2 of 2',
      'Margins, leg 1 of 2',
      'Margins, leg 2 of 2',
      'Endurance and stop limits, leg 1 of 2',
      'Endurance and stop limits, leg 2 of 2',
    ])
    expect(stages.map(partsOfStage)).toEqual(stages.map((_, index) => ({ done: index % 2, of: 2 })))
    expect(partsOfStage('Starting')).toBeNull()
  })

  it('stops when asked, without a verdict', () => {
    expect(() => assess(scenario, SHIPPED_ROWS, { shouldStop: () => true })).toThrow(/stopped/)
  })
})

describe('a profile that cannot be used', () => {
  it('without limits is refused, never assessed', () => {
    const scenario = scenarioOf({ legs: [legOf('road')], crates: [crateOf('a', [beagle('bess')])] })
    const row = SHIPPED_ROWS.dog
    if (row === undefined) throw new Error('The catalogue has no dog.')
    const { limits: _limits, ...values } = row.values
    expect(() => assess(scenario, { dog: { version: 1, values } })).toThrow(/cannot be assessed/)
  })
})
