import { describe, expect, it, vi } from 'vitest'
import { catalogueValues } from '@/lib/species'
import {
  endure,
  holdLegAt,
  lengthenLeg,
  schedulesOf,
  shiftAir,
  simulate,
  stateAt,
  withDelays,
  type Scenario,
} from '@/lib/thermal'
import { first, pen, run } from './pen'
import { readScenario } from './scenarios'

vi.setConfig({ testTimeout: 60_000 })

const reference = readScenario('reference-two-days')
const short = readScenario('van-that-loses-its-cooling')

describe('schedules', () => {
  it('on time, all typical, then each leg at its worst; equal ones once', () => {
    const ids = schedulesOf(reference).map(({ id }) => id)
    expect(ids.slice(0, 3)).toEqual(['on-time', 'typical', 'worst:collect'])
    expect(ids).not.toContain('worst:cruise')
  })

  it('a delay lengthens its leg and moves every later one', () => {
    const worst = withDelays(reference, 'worst:collect')
    expect(worst.legs[0]?.durationMin).toBe(240)
    expect(worst.legs[1]?.durationMin).toBe(260)
    const schedule = schedulesOf(reference).find(({ id }) => id === 'worst:collect')
    expect(schedule?.legStartMin.slice(0, 3)).toEqual([0, 240, 500])
  })

  it('refuses a schedule or leg that does not exist', () => {
    expect(() => withDelays(reference, 'worst:nowhere')).toThrow(/nowhere/)
    expect(() => withDelays(reference, 'sometimes')).toThrow(/sometimes/)
    expect(() => lengthenLeg(reference, 'nowhere', 5)).toThrow(/nowhere/)
  })
})

describe('other air', () => {
  it('moves every air, surface and set-point and leaves relative humidity', () => {
    const warmer = shiftAir(reference, 3)
    const [van, shed] = warmer.legs.map((leg) => leg.surroundings)
    expect(shed).toMatchObject({ airTempC: 21, surfaceTempC: 21, relHumidityPct: 60 })
    expect(van).toMatchObject({ conditioning: { setPointC: 21 } })
    const outside = van?.type === 'enclosed' && van.outside.type === 'open-air' ? van.outside : undefined
    const before = first(reference.legs).surroundings
    const planned =
      before.type === 'enclosed' && before.outside.type === 'open-air' ? before.outside : undefined
    expect(outside?.series[0]?.airTempC).toBeCloseTo((planned?.series[0]?.airTempC ?? NaN) + 3, 6)
  })

  it('warmer air gives a warmer core at the end, colder a colder', () => {
    const peak = (airShiftC: number) =>
      Math.max(...run(short, { tracks: false, airShiftC }).extremes.map((extreme) => extreme.peakCoreC))
    expect(peak(3)).toBeGreaterThan(peak(0))
    expect(peak(0)).toBeGreaterThan(peak(-3))
  })

  it('holds one leg at a steady air', () => {
    const held = holdLegAt(reference, 'ramp-out', { airTempC: 31, relHumidityPct: 40 })
    const extremes = run(held, { tracks: false, untilMin: 460 }).extremes.filter(
      ({ legId }) => legId === 'ramp-out',
    )
    for (const { outsideAirMinC, outsideAirMaxC } of extremes) {
      expect(outsideAirMinC).toBe(31)
      expect(outsideAirMaxC).toBe(31)
    }
  })
})

describe('starting again', () => {
  it('from a stored state reaches what the whole run reached', () => {
    const whole = run(short, { snapshotEveryMin: 10 })
    for (const minute of [50, 120, 240]) {
      const rest = run(short, { start: stateAt(whole, minute) })
      for (const animal of whole.animals) {
        const again = rest.animals.find(({ id }) => id === animal.id)
        const gap = Math.abs(last(animal.coreTempC) - last(again?.coreTempC ?? []))
        expect(gap).toBeLessThan(0.01)
      }
    }
  })

  it('from a final state as `initial` carries on where it ended', () => {
    const cut: Scenario = { ...short, legs: short.legs.slice(0, 1) }
    const { finalState } = run(cut)
    const onwards = run({ ...short, legs: short.legs.slice(1), initial: [finalState] })
    const whole = run(short)
    for (const animal of whole.animals) {
      const again = onwards.animals.find(({ id }) => id === animal.id)
      expect(Math.abs(last(animal.coreTempC) - last(again?.coreTempC ?? []))).toBeLessThan(0.01)
    }
  })

  it('a crate that boards later has no track before, one that leaves none after', () => {
    const { crates } = run(readScenario('guinea-pigs-join-and-leave'))
    const minutes = (id: string) => crates.find((crate) => crate.id === id)?.minutes ?? []
    expect(last(minutes('a'))).toBe(270)
    expect(minutes('b')[0]).toBeGreaterThan(89)
    expect(last(minutes('c'))).toBe(390)
  })
})

describe('when something fails', () => {
  const whole = run(reference, { variant: 'heat-prone', snapshotEveryMin: 10, tracks: false, untilMin: 1500 })
  const ask = (kind: 'climate' | 'ventilation' | 'stays', legId: string, minute: number) =>
    endure(reference, whole, { kind, legId, minute, variant: 'heat-prone', profiles: catalogueValues })

  it('says nothing where surroundings are held by others and name no outside', () => {
    expect(ask('climate', 'lodge', 300)).toBeUndefined()
    expect(ask('stays', 'lodge', 300)).toBeDefined()
  })

  it('doors shut on stand, unknown ventilation: the pug is past both limits, the collie keeps its alarm to the horizon', () => {
    const endured = ask('stays', 'stand', 460) ?? []
    const of = (id: string) => endured.find(({ animalId }) => animalId === id)
    expect(of('pug')).toMatchObject({ toAlarmMin: 0, toCriticalMin: 0 })
    expect(of('collie')?.toAlarmMin).toBeUndefined()
    // A rabbit on its way: the alarm first, the critical limit minutes later.
    expect(of('doe')?.toCriticalMin).toBeGreaterThan(of('doe')?.toAlarmMin ?? NaN)
  })

  it('a van that loses its cooling warms; one that loses its air turns stale', () => {
    const van = { ...short, legs: short.legs.map((leg) => ({ ...leg, events: [] })) }
    const air = (kind?: 'climate' | 'ventilation') => {
      const failure = kind && { failure: { kind, fromMin: 60 } }
      const { extremes } = run(van, { tracks: false, untilMin: 200, ...failure })
      return first(extremes)
    }
    expect(air('climate').outsideAirMaxC).toBeGreaterThan(air().outsideAirMaxC + 5)
    expect(air('ventilation').co2MaxPpm).toBeGreaterThan(air().co2MaxPpm + 300)
  })

  it('a held space that names its outside drifts to it', () => {
    const scenario = pen({ profile: 'cat', massKg: 4 }, { airTempC: 20, relHumidityPct: 50 }, 180)
    const leg = first(scenario.legs)
    if (leg.surroundings.type !== 'controlled') throw new Error('A pen is held.')
    leg.surroundings.outside = {
      type: 'open-air',
      series: [{ minute: 0, airTempC: 36, relHumidityPct: 40, windMs: 2, solarWm2: 0 }],
      shadePct: 0,
      groundAlbedo: 0.2,
      windHeightM: 10,
    }
    const { outsideAirMaxC } = first(run(scenario, { failure: { kind: 'climate', fromMin: 30 } }).extremes)
    expect(outsideAirMaxC).toBeGreaterThan(35.5)
    expect(outsideAirMaxC).toBeLessThanOrEqual(36)
  })

  it('a run that cannot converge says on which leg and at which minute', () => {
    try {
      simulate(short, { variant: 'typical', profiles: catalogueValues, numerics: { maxSteps: 5 } })
      expect.unreachable()
    } catch (error) {
      expect(error).toMatchObject({
        code: 'not_converged',
        details: { legId: 'road', minute: expect.any(Number) },
      })
    }
  })

  it('an animal whose profile is not in force is refused', () => {
    const scenario = pen({ profile: 'yeti', massKg: 80 }, { airTempC: 0, relHumidityPct: 50 }, 60)
    expect(() => run(scenario)).toThrow(/No species profile "yeti"/)
  })
})

function last(values: readonly number[]): number {
  return values[values.length - 1] ?? NaN
}
