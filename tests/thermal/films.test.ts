import { describe, expect, it } from 'vitest'
import { airDensityKgM3, conductivityWmK, vapourDiffusivityM2S, viscosityPaS } from '@/lib/thermal/air'
import { wetCoatFactor } from '@/lib/thermal/coat'
import {
  churchillBernstein,
  churchillChu,
  filmLength,
  filmWm2K,
  mitchellWm2K,
  setFilm,
} from '@/lib/thermal/convection'
import { cbrt } from '@/lib/thermal/elementary'
import { panelUWm2K, WALLS } from '@/lib/thermal/materials'
import { enclosureExchangeW, radiantFilmWm2K } from '@/lib/thermal/radiation'
import { boundaryResistanceSM } from '@/lib/thermal/skin'
import { meshLoss, stackFlowM3S } from '@/lib/thermal/ventilation'

const within = (value: number, expected: number, share: number) =>
  expect(Math.abs(value / expected - 1)).toBeLessThanOrEqual(share)

describe('films and resistances', () => {
  it('dry air at 30 °C and 1 bar: ρ 1.1492, μ 1.8664e-5, D 2.729e-5, k 0.02636 (DRYAIR, TrenchR)', () => {
    within(airDensityKgM3(30, 100), 1.1492, 5e-4)
    within(viscosityPaS(30), 1.8664e-5, 5e-4)
    within(vapourDiffusivityM2S(30, 100), 2.729e-5, 5e-4)
    within(conductivityWmK(30), 0.02636, 5e-4)
  })

  it.each([
    ['cylinder', 9.936],
    ['sphere', 16.11],
    ['frog', 18.44],
    ['lizardOnSurface', 12.52],
  ] as const)(
    'forced film of a %s at 0.5 m/s and 50 mm is %d W/m²K (Mitchell 1976 as TrenchR runs it)',
    (shape, h) => within(mitchellWm2K(shape, 0.5, 0.05, 0.0257, 1.53e-5), h, 1e-3),
  )

  it('Churchill–Bernstein at Re 6071, Pr 0.70: Nu 40.6 (Incropera example 7.4, memory)', () => {
    within(churchillBernstein(6071, 0.7), 40.6, 1e-2)
  })

  it('Churchill–Chu at Ra 5.07e6, Pr 0.697: Nu 23.3 (Incropera example 9.4, memory)', () => {
    within(churchillChu(5.07e6, 0.697), 23.3, 2e-2)
  })

  it('film of an animal goes over to free convection in still air: Nu = 2 + 0.60 Gr^¼ Pr^⅓ (NicheMapR eq. 84)', () => {
    const film = { forced: 0, free: 0, still: 0 }
    setFilm(film, 20, 1e-4, 101.325)
    const lengthM = 0.2
    const kinematic = viscosityPaS(20) / airDensityKgM3(20, 101.325)
    const grashof = (9.80665 * 10 * lengthM ** 3) / (293.15 * kinematic ** 2)
    const nusselt = 2 + 0.6 * grashof ** 0.25 * cbrt(0.71)
    within(filmWm2K(film, filmLength(lengthM), 10), (nusselt * conductivityWmK(20)) / lengthM, 1e-3)
  })

  it('long-wave film is 6.32 at 35/25 °C and 6.26 at 38/20 °C; −0.97 % off the fourth powers at 60/0 °C (NicheMapR)', () => {
    within(radiantFilmWm2K(35, 25, 1), 6.32, 1e-3)
    within(radiantFilmWm2K(38, 20, 1), 6.26, 1.5e-3)
    const exact = enclosureExchangeW(
      { areaM2: 1, tempC: 60, emissivity: 1 },
      { areaM2: 1e9, tempC: 0, emissivity: 1 },
    )
    const linear = radiantFilmWm2K(60, 0, 1) * 60
    expect((100 * (linear - exact)) / exact).toBeCloseTo(-0.97, 1)
  })

  it('grey body of 0.55 m² at 33 °C in 1.6 m² at 25 °C gives off 26.0 W (two-surface enclosure)', () => {
    within(
      enclosureExchangeW(
        { areaM2: 0.55, tempC: 33, emissivity: 0.98 },
        { areaM2: 1.6, tempC: 25, emissivity: 0.9 },
      ),
      26.0,
      2e-3,
    )
  })

  it('boundary resistance to vapour at h 20 is 55.8 s/m (Spotila et al. 1992 as TrenchR runs it)', () => {
    within(boundaryResistanceSM(1200, 20), 55.8, 1e-3)
  })

  it.each([
    ['plywood', 6, 3.44, 4.67],
    ['plastic', 3, 3.91, 5.59],
  ] as const)(
    '%s of %d mm: U %d indoors and %d in wind (CIBSE Guide A surface films)',
    (wall, mm, indoors, wind) => {
      within(panelUWm2K(mm, WALLS[wall].conductivityWmK, 8.3, 8.3), indoors, 2e-3)
      within(panelUWm2K(mm, WALLS[wall].conductivityWmK, 8.3, 23), wind, 2e-3)
    },
  )

  it('mesh of half free area: loss 1.65 (Idelchik, memory)', () => {
    within(meshLoss(0.5), 1.65, 1e-3)
  })

  it.each([
    [2, 1.686, 1.15],
    [5, 2.667, 1.88],
    [10, 3.771, 2.8],
  ])(
    'stack flow through 0.02 m² at %d K: %d L/s with Cd 0.6, %d with 0.40 + 0.0045 ΔT (ASHRAE 1997, 25.13)',
    (k, fixed, sliding) => {
      within(stackFlowM3S(0.6, 0.02, 0.15, k, 298) * 1000, fixed, 2e-3)
      within(stackFlowM3S(0.4 + 0.0045 * k, 0.02, 0.15, k, 298) * 1000, sliding, 5e-3)
    },
  )

  it('a soaked coat keeps 0.2–0.3 of its resistance, a wetted one 0.4–0.6 (rain-soaked coats, memory)', () => {
    expect(wetCoatFactor(0.6)).toBeGreaterThanOrEqual(0.2)
    expect(wetCoatFactor(0.6)).toBeLessThanOrEqual(0.3)
    expect(wetCoatFactor(0.2)).toBeGreaterThanOrEqual(0.4)
    expect(wetCoatFactor(0.2)).toBeLessThanOrEqual(0.6)
  })
})
