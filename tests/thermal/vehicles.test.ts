import { describe, expect, it, vi } from 'vitest'
import type { EnclosedSpace, OpenAir, Scenario } from '@/lib/thermal'
import { readTable } from '../truth/read-table'
import { first, pen, run } from './pen'

vi.setConfig({ testTimeout: 60_000 })

const outside = (airTempC: number, solarWm2: number): OpenAir => ({
  type: 'open-air',
  series: [{ minute: 0, airTempC, relHumidityPct: 50, windMs: 2, solarWm2 }],
  shadePct: 0,
  groundAlbedo: 0.2,
  windHeightM: 10,
})

function inside(space: Omit<EnclosedSpace, 'type' | 'outside'>, air: OpenAir, minutes: number): Scenario {
  const scenario = pen(
    { profile: 'ball-python', massKg: 0.05 },
    { airTempC: 20, relHumidityPct: 50 },
    minutes,
  )
  const box = { form: 'crate' as const, lengthM: 0.3, widthM: 0.2, heightM: 0.2 }
  return {
    ...scenario,
    crates: [{ ...first(scenario.crates), ...box }],
    legs: [{ ...first(scenario.legs), surroundings: { type: 'enclosed', ...space, outside: air } }],
  }
}

describe('enclosed spaces against measurements', () => {
  // The cars are not described in the source; these inputs are chosen openly and prove no coefficient.
  const car = {
    volumeM3: 3,
    heatTransferWK: 38,
    interiorMassKJK: 45,
    leakageM3h: 3,
    solarApertureM2: 1.8,
    solarTransmittance: 0.7,
    crateAirSpeedMs: 0.05,
    initialAirTempC: 30,
  }
  it.each(readTable<{ minute: number; riseK: number; source: string }>('parked-cars'))(
    'a parked car (38 W/K, 45 kJ/K, 1.8 m² of glass, 800 W/m²) stands $riseK K over outside after $minute min, within 15 % ($source)',
    ({ minute, riseK }) => {
      const [track] = run(inside(car, outside(30, 800), 60)).compartments
      const rise = (track?.airTempC[minute] ?? NaN) - 30
      expect(Math.abs(rise / riseK - 1)).toBeLessThanOrEqual(0.15)
    },
  )

  it('cracked windows hardly help: 30 m³/h more air takes less than a quarter off the rise (McLaren, Null & Quinn 2005)', () => {
    const rise = (leakageM3h: number) =>
      (first(run(inside({ ...car, leakageM3h }, outside(30, 800), 60)).compartments).airTempC[60] ?? NaN) - 30
    expect(rise(33) / rise(3)).toBeGreaterThan(0.75)
    expect(rise(33)).toBeLessThan(rise(3))
  })

  it('three horses in a vented container stand 3–7 K over the hold (4.8–5.1 K: Thornton 2000)', () => {
    const scenario = pen(
      { profile: 'horse', massKg: 500, count: 3 },
      { airTempC: 16, relHumidityPct: 60 },
      360,
    )
    const leg = first(scenario.legs)
    const hold = leg.surroundings
    const container: Scenario = {
      ...scenario,
      crates: [{ ...first(scenario.crates), form: 'stall', lengthM: 2.8, widthM: 2.2, heightM: 2 }],
      legs: [
        {
          ...leg,
          surroundings: {
            type: 'enclosed',
            volumeM3: 16,
            heatTransferWK: 90,
            interiorMassKJK: 300,
            ventilationM3h: 500,
            leakageM3h: 50,
            solarApertureM2: 0,
            solarTransmittance: 0,
            crateAirSpeedMs: 0.2,
            outside: hold,
          },
        },
      ],
    }
    const { airTempC } = first(run(container).compartments)
    const rise = (airTempC[airTempC.length - 1] ?? NaN) - 16
    expect(rise).toBeGreaterThan(3)
    expect(rise).toBeLessThan(7)
  })

  it('a thermostat with capacity holds its set-point, and without it does not', () => {
    const van = {
      ...car,
      volumeM3: 12,
      interiorMassKJK: 150,
      heatTransferWK: 45,
      leakageM3h: 66,
      solarApertureM2: 1,
    }
    const at = (coolingW: number) =>
      first(
        run(
          inside(
            { ...van, conditioning: { setPointC: 18, coolingW, heatingW: 1000 } },
            outside(34, 700),
            240,
          ),
        ).compartments,
      ).airTempC[240] ?? NaN
    expect(Math.abs(at(3000) - 18)).toBeLessThan(0.6)
    expect(at(300)).toBeGreaterThan(30)
  })

  it('CO2 of a 47 W dog in a sealed 0.4 m³ box rises 1.84 % in an hour (respiratory exchange, RQ 0.8)', () => {
    const scenario = pen({ profile: 'dog', massKg: 10.3 }, { airTempC: 25, relHumidityPct: 50 }, 60)
    Object.assign(first(scenario.crates), { form: 'crate', lengthM: 1, widthM: 0.8, heightM: 0.5 })
    const result = run(scenario, { numerics: {} })
    const [co2 = NaN] = result.crates.map((crate) => (crate.co2Ppm[60] ?? NaN) - 420)
    const meanW = first(result.animals).heat.metabolismW.reduce((sum, w) => sum + w, 0) / 61
    // Diffusion at 0.3 air changes an hour is let out: 1.84 % × (1 − e^−0.3)/0.3 of it stays.
    const expected = 18400 * (meanW / 47.2) * (0.4 / 0.3897) * ((1 - Math.exp(-0.3)) / 0.3)
    expect(Math.abs(co2 / expected - 1)).toBeLessThanOrEqual(0.05)
  })
})
