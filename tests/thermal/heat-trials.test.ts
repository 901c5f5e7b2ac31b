import { describe, expect, it, vi } from 'vitest'
import type { Variant } from '@/lib/thermal'
import { readTable } from '../truth/read-table'
import { first, lastHolding, peakCore, pen, run } from './pen'

vi.setConfig({ testTimeout: 60_000 })

const beagle = { profile: 'dog', massKg: 11 }
const ENDPOINT_C = 42.2

describe('heat trials of dogs', () => {
  it.each(
    readTable<{ airTempC: number; relHumidityPct: number; source: string }>('beagles-six-hours').filter(
      ({ airTempC }) => [29.4, 35.0, 40.6].includes(airTempC),
    ),
  )(
    'six hours at $airTempC °C: the heat-prone dog keeps 42.2 °C up to within 15 % of $relHumidityPct % ($source)',
    ({ airTempC, relHumidityPct }) => {
      const limit = lastHolding(
        1,
        99,
        (humidity) =>
          peakCore(beagle, { airTempC, relHumidityPct: humidity }, 360, { variant: 'heat-prone' }) <=
          ENDPOINT_C,
      )
      expect(Math.abs(limit - relHumidityPct)).toBeLessThanOrEqual(15)
      // On the safe side of the published line.
      expect(limit).toBeLessThanOrEqual(relHumidityPct)
    },
  )

  it('the six-hour limit falls as the air warms, at every step (FAA AM-87/8)', () => {
    const limits = [29.4, 32.2, 35, 37.8, 40.6].map((airTempC) =>
      lastHolding(
        1,
        99,
        (humidity) => peakCore(beagle, { airTempC, relHumidityPct: humidity }, 360) <= ENDPOINT_C,
      ),
    )
    for (let i = 1; i < limits.length; i++) expect(limits[i]).toBeLessThan(limits[i - 1] ?? NaN)
  })

  it.each([
    ['heat-prone', 28.8, 30.5],
    ['typical', 29.3, 31.5],
  ] as const)(
    '+1.1 K within two hours at 50 %%: the %s dog between %d and %d °C (Besch 1984: none under 28.4, all from 32.6)',
    (variant: Variant, low, high) => {
      const onset = lastHolding(
        20,
        40,
        (airTempC) => peakCore(beagle, { airTempC, relHumidityPct: 50 }, 120, { variant }) <= 38.7 + 1.1,
      )
      expect(onset).toBeGreaterThanOrEqual(low)
      expect(onset).toBeLessThanOrEqual(high)
    },
  )

  it('large short-haired dogs, 54.4 °C for 30 min, 15 and 35 %: 39.8–42 °C, the wetter the warmer, none died (FAA AM-77/8)', () => {
    for (const variant of ['typical', 'heat-prone'] as const) {
      const [dry = NaN, wet = NaN] = [15, 35].map((relHumidityPct) =>
        peakCore({ profile: 'dog', massKg: 25 }, { airTempC: 54.4, relHumidityPct }, 30, { variant }),
      )
      expect(dry).toBeGreaterThan(39.8)
      expect(wet).toBeGreaterThanOrEqual(dry)
      expect(wet).toBeLessThan(42)
    }
  })

  it('a pug on a ramp at 33 °C passes alarm within half an hour and critical within three quarters (judgement the product rests on)', () => {
    const ramp = pen({ profile: 'snub-nosed-dog', massKg: 8.4 }, { airTempC: 33, relHumidityPct: 50 }, 120)
    const { crossedMin } = first(run(ramp, { variant: 'heat-prone', tracks: false }).extremes)
    expect(crossedMin.alarmHigh).toBeLessThan(30)
    expect(crossedMin.criticalHigh).toBeLessThan(45)
    expect(crossedMin.criticalHigh).toBeGreaterThan(crossedMin.alarmHigh ?? NaN)
  })

  it('a snub nose never comes out better than a plain one, from −10 to 40 °C, dry or wet', () => {
    for (let airTempC = -10; airTempC <= 40; airTempC += 5) {
      for (const relHumidityPct of [30, 80]) {
        const peak = (profile: string) =>
          peakCore({ profile, massKg: 9 }, { airTempC, relHumidityPct }, 240, { variant: 'heat-prone' })
        expect(peak('snub-nosed-dog')).toBeGreaterThanOrEqual(peak('dog') - 0.005)
      }
    }
  })

  it('a dog flagged snub-nosed runs on the snub-nosed row', () => {
    const air = { airTempC: 32, relHumidityPct: 60 }
    const flagged = peakCore({ profile: 'dog', massKg: 9, flags: ['snub-nosed'] }, air, 120)
    expect(flagged).toBe(peakCore({ profile: 'snub-nosed-dog', massKg: 9 }, air, 120))
    expect(flagged).toBeGreaterThan(peakCore({ profile: 'dog', massKg: 9 }, air, 120))
  })

  it('a runaway is reported, stays finite and goes on to the end', () => {
    const oven = pen({ profile: 'dog', massKg: 9 }, { airTempC: 45, relHumidityPct: 90 }, 600)
    const track = first(run(oven).animals)
    expect(track.runawayFromMin).toBeGreaterThan(0)
    expect(track.minutes[track.minutes.length - 1]).toBe(600)
    expect(track.coreTempC.every(Number.isFinite)).toBe(true)
  })
})
