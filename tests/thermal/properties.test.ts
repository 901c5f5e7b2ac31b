import fc from 'fast-check'
import { describe, expect, it } from 'vitest'
import { catalogueValues } from '@/lib/species'
import { VARIANTS, type Face } from '@/lib/thermal'
import { first, pen, run } from './pen'

const profiles = Object.keys(catalogueValues)
const openings = fc.array(
  fc.record({
    face: fc.constantFrom<Face>('front', 'back', 'left', 'right', 'top'),
    areaM2: fc.double({ min: 0, max: 0.04, noNaN: true }),
    meshOpenPct: fc.double({ min: 20, max: 100, noNaN: true }),
    blockedPct: fc.double({ min: 0, max: 100, noNaN: true }),
  }),
  { maxLength: 4 },
)

describe('whatever is asked', () => {
  it(
    'gives finite figures or a typed error, from −40 to 60 °C, dry to saturated, sealed to open',
    { timeout: 60_000 },
    () => {
      fc.assert(
        fc.property(
          fc.constantFrom(...profiles),
          fc.constantFrom(...VARIANTS),
          fc.double({ min: -40, max: 60, noNaN: true }),
          fc.double({ min: 0, max: 100, noNaN: true }),
          fc.double({ min: 0, max: 12, noNaN: true }),
          fc.double({ min: 70, max: 104, noNaN: true }),
          fc.double({ min: 0, max: 1, noNaN: true }),
          openings,
          fc.integer({ min: 0, max: 100 }),
          (profile, variant, airTempC, relHumidityPct, airSpeedMs, pressureKPa, size, holes, wetPct) => {
            const row = catalogueValues[profile]
            if (!row) throw new Error('No row.')
            const massKg = row.massMinKg * Math.pow(row.massMaxKg / row.massMinKg, size)
            const scenario = pen(
              { profile, massKg, coat: { wetPct } },
              { airTempC, relHumidityPct, airSpeedMs },
              180,
            )
            const leg = first(scenario.legs)
            leg.pressureKPa = pressureKPa
            const side = Math.cbrt(massKg * 0.012)
            Object.assign(first(scenario.crates), {
              form: 'crate',
              lengthM: side,
              widthM: side,
              heightM: side,
              openings: holes.map((hole) => ({ ...hole, areaM2: Math.min(hole.areaM2, 0.5 * side * side) })),
              bedding: { material: 'straw', depthMm: 20, wetPct },
            })
            const { animals, crates, closure } = run(scenario, { variant })
            const figures = [
              ...animals.flatMap((a) => [...a.coreTempC, ...a.skinTempC, ...a.heat.metabolismW]),
            ]
            expect(figures.every(Number.isFinite)).toBe(true)
            for (const crate of crates) {
              expect(crate.relHumidityPct.every((humidity) => humidity >= 0 && humidity <= 100.0001)).toBe(
                true,
              )
              expect(crate.co2Ppm.every((ppm) => ppm > 0)).toBe(true)
            }
            expect(closure.accumulatorError).toBeLessThanOrEqual(1e-9)
          },
        ),
        { numRuns: 60, seed: 2417 },
      )
    },
  )
})
