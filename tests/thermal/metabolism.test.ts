import { describe, expect, it } from 'vitest'
import { conductanceLineWK, ectothermHeatW, ectothermSlope, lineHeatW } from '@/lib/thermal/metabolism'
import { readTable } from '../truth/read-table'

const within = (value: number, expected: number, share: number) =>
  expect(Math.abs(value / expected - 1)).toBeLessThanOrEqual(share)

describe('metabolic lines', () => {
  it.each(readTable<{ animal: string; massKg: number; heatW: number; source: string }>('resting-heat'))(
    'Kleiber’s line puts a $animal of $massKg kg within −30…+45 % of $heatW W ($source)',
    ({ massKg, heatW }) => {
      const ratio = heatW / lineHeatW('kleiber', massKg)
      expect(ratio).toBeGreaterThan(0.7)
      expect(ratio).toBeLessThan(1.45)
    },
  )

  it.each([
    [0.021, 0.187],
    [10, 19.06],
    [70, 82.0],
    [500, 358],
  ])('70 kcal/d kg^0.75 at %d kg is %d W within 0.5 % (Kleiber 1947)', (massKg, heatW) =>
    within(lineHeatW('kleiber', massKg), heatW, 5e-3),
  )

  it('birds: 3.516 W at 1 kg (McKechnie & Wolf 2004)', () => {
    within(lineHeatW('bird', 1), 3.516, 1e-3)
  })

  it('day-old chicks: 77 kcal/d kg^0.75 (Xin & Harmon 1996)', () => {
    within(lineHeatW('chick', 1), (77 * 4184) / 86400, 2e-3)
  })

  it('squamates: 0.0551 W resting at 100 g and 30 °C, 0.348 × 1.38 W at 1.5 kg, Q10 2.40 (Andrews & Pough 1985)', () => {
    within(ectothermHeatW('squamate', 0.1, 30), 0.0551, 2e-3)
    within(ectothermHeatW('squamate', 1.5, 30), 0.348 * 1.38, 4e-3)
    within(Math.exp(10 * ectothermSlope('squamate')), 2.4, 2e-3)
    within(Math.exp(10 * ectothermSlope('boid')), 2.61, 1e-3)
  })

  it('0.760 g^-0.426 mL/g h K is 0.224 kg^0.574 W/K (Bradley & Deavers 1980)', () => {
    const published = (massKg: number) =>
      (0.76 * Math.pow(massKg * 1000, -0.426) * massKg * 1000 * 20.1) / 3600
    for (const massKg of [0.02, 1, 30]) within(conductanceLineWK('mammal', massKg), published(massKg), 5e-3)
  })

  it('birds of 33.7 g: 0.0267 W/K; budgerigars’ own slope is 0.0273 (Herreid & Kessel 1967; Weathers & Schoenbaechler 1976)', () => {
    within(conductanceLineWK('bird', 0.0337), 0.0267, 5e-3)
    within(conductanceLineWK('bird', 0.0337), 0.0273, 3e-2)
  })
})
