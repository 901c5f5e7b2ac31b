import { describe, expect, it } from 'vitest'
import {
  dewPointC,
  humidityRatio,
  latentHeatJKg,
  moistDensityKgM3,
  moistEnthalpyJKg,
  pressureAtAltitudePa,
  ratioFromWetBulb,
  saturationDensityKgM3,
  saturationPressurePa,
  wetBulbC,
} from '@/lib/thermal/psychrometrics'
import { saturatedVapour, vapourOf } from '@/lib/thermal/saturation'
import { readTable } from '../truth/read-table'

const within = (value: number, expected: number, share: number) =>
  expect(Math.abs(value / expected - 1)).toBeLessThanOrEqual(share)

describe('moist air against printed tables', () => {
  it.each(readTable<{ tempC: number; pressurePa: number; source: string }>('saturation-pressure'))(
    'saturation pressure at $tempC °C is $pressurePa Pa within 0.03 % ($source)',
    ({ tempC, pressurePa }) => within(saturationPressurePa(tempC), pressurePa, 3e-4),
  )

  it.each(readTable<{ altitudeM: number; pressurePa: number; source: string }>('standard-atmosphere'))(
    'pressure at $altitudeM m is $pressurePa Pa within 1 Pa ($source)',
    ({ altitudeM, pressurePa }) => {
      expect(Math.abs(pressureAtAltitudePa(altitudeM) - pressurePa)).toBeLessThanOrEqual(1)
    },
  )

  it('cabin altitude of 2438 m is 75.3 kPa within 5 Pa (ICAO standard atmosphere)', () => {
    expect(Math.abs(pressureAtAltitudePa(2438) - 75266)).toBeLessThanOrEqual(5)
  })

  it('humidity ratio of 3169.7 Pa at 95461 Pa is 0.0213604 (ASHRAE 2017 ch. 1, as psychrolib tests it)', () => {
    within(humidityRatio(3169.7, 95461), 0.0213603998047487, 1e-6)
  })

  it('saturated air at 25 °C holds 0.020173 and 76504 J/kg (ASHRAE 2017 ch. 1 table 2)', () => {
    const ratio = humidityRatio(saturationPressurePa(25), 101325)
    within(ratio, 0.020173, 5e-3)
    within(moistEnthalpyJKg(25, ratio), 76504, 1e-2)
  })

  it('30 °C with 0.02 kg/kg carries 81316 J/kg, and weighs 1.08412 kg/m³ at 95461 Pa (psychrolib)', () => {
    within(moistEnthalpyJKg(30, 0.02), 81316, 3e-4)
    within(moistDensityKgM3(30, 0.02, 95461), 1.08411986348219, 3e-4)
  })

  it('40 °C with a wet bulb of 20 °C holds 0.0065 kg/kg (ASHRAE 2017 ch. 1 example 1)', () => {
    expect(Math.abs(ratioFromWetBulb(40, 20, 101325) - 0.0065)).toBeLessThanOrEqual(1e-4)
  })

  it('wet bulb of 25 °C 50 % is 17.9–18.0 °C, of 27.1 °C 66.4 % 22.3–22.4 °C; dew point of 31.6 °C 59.6 % 22.78 °C (pythermalcomfort)', () => {
    expect(Math.abs(wetBulbC(25, 0.5, 101325) - 17.95)).toBeLessThanOrEqual(0.1)
    expect(Math.abs(wetBulbC(27.1, 0.664, 101325) - 22.35)).toBeLessThanOrEqual(0.1)
    expect(Math.abs(dewPointC(31.6, 0.596) - 22.78)).toBeLessThanOrEqual(0.1)
  })

  it.each([
    [0, 2500.9],
    [25, 2441.7],
    [35, 2417.9],
    [40, 2406.0],
  ])('heat of vaporisation at %d °C is %d kJ/kg within 0.1 % (IAPWS steam tables, memory)', (tempC, kJKg) =>
    within(latentHeatJKg(tempC), kJKg * 1000, 1e-3),
  )

  it.each([
    [20, 17.29],
    [37, 43.88],
    [40, 51.09],
  ])(
    'saturated vapour at %d °C weighs %d g/m³ within 0.2 % (ideal gas on the ASHRAE pressure)',
    (tempC, gM3) => within(saturationDensityKgM3(tempC) * 1000, gM3, 2e-3),
  )

  it('refuses a temperature outside the range of the formula', () => {
    expect(() => saturationPressurePa(-120)).toThrow(/−100 to 200/)
  })
})

describe('the saturation table of the integrator', () => {
  it('agrees with the formula it is built from to 1e-8 over −60 to 120 °C', () => {
    for (let t = -60; t <= 120; t += 0.0613) {
      // The ice and water branches meet with a kink at 0 °C.
      within(saturatedVapour(t), saturationDensityKgM3(t), Math.abs(t) < 0.3 ? 5e-4 : 1e-8)
    }
  })

  it('never lets vapour exceed saturation, and is 0 for dry air', () => {
    const full = saturatedVapour(25)
    expect(vapourOf(0, full)).toBe(0)
    for (let share = 0; share < 3; share += 0.05)
      expect(vapourOf(share * full, full)).toBeLessThanOrEqual(full)
    within(vapourOf(0.5 * full, full), 0.5 * full, 1e-4)
  })
})
