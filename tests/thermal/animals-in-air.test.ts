import { describe, expect, it, vi } from 'vitest'
import type { ProfileValues } from '@/lib/thermal'
import { catalogueValues } from '@/lib/species'
import { readTable } from '../truth/read-table'
import { saturationPressurePa } from '@/lib/thermal/psychrometrics'
import { lastHolding, rowLike, standing } from './pen'

vi.setConfig({ testTimeout: 60_000 })

describe('animals in steady air against published trials', () => {
  it.each(
    readTable<{ airTempC: number; totalWKg: number; sensibleWKg: number; source: string }>('chicks-in-boxes'),
  )(
    'chicks at $airTempC °C give off $totalWKg W/kg, $sensibleWKg of it sensible, within 10 % ($source)',
    ({ airTempC, totalWKg, sensibleWKg }) => {
      const chick = standing(
        { profile: 'day-old-chick', massKg: 0.04, count: 100 },
        { airTempC, relHumidityPct: 40 },
        480,
      )
      expect(Math.abs(chick.totalW / 0.04 / totalWKg - 1)).toBeLessThanOrEqual(0.1)
      expect(Math.abs(chick.sensibleW / 0.04 / sensibleWKg - 1)).toBeLessThanOrEqual(0.1)
    },
  )

  it.each(
    readTable<{ profile: string; massKg: number; totalW: number; source: string }>('laboratory-animals'),
  )(
    '$profile of $massKg kg at rest: three quarters of the day mean of $totalW W, within 10 % ($source; Besch & Woods 1977)',
    ({ profile, massKg, totalW }) => {
      const animal = standing({ profile, massKg }, { airTempC: 23, relHumidityPct: 50 }, 600)
      expect(Math.abs(animal.totalW / (0.75 * totalW) - 1)).toBeLessThanOrEqual(0.1)
    },
  )

  it('dog of 10.3 kg at 23 °C: 47.2 W, 30.7 sensible, 16.5 latent; within 10, 10 and 25 % (ASHRAE laboratory animals, memory)', () => {
    const dog = standing({ profile: 'dog', massKg: 10.3 }, { airTempC: 23, relHumidityPct: 50 }, 600)
    expect(Math.abs(dog.totalW / 47.2 - 1)).toBeLessThanOrEqual(0.1)
    expect(Math.abs(dog.sensibleW / 30.7 - 1)).toBeLessThanOrEqual(0.1)
    expect(Math.abs(dog.latentW / 16.5 - 1)).toBeLessThanOrEqual(0.25)
  })

  it('horses over 5–25 °C: 142 W/m² ± 25 %, slope −1.2…−3.5 W/m²K, lower critical −5…10 °C (Morgan 1997/98)', () => {
    const skinM2 = 6.3
    const at = (airTempC: number) =>
      standing({ profile: 'horse', massKg: 500 }, { airTempC, relHumidityPct: 50, airSpeedMs: 0.2 }, 720)
    const stays = [5, 10, 15, 20, 25].map(at)
    const mean = stays.reduce((sum, stay) => sum + stay.totalW, 0) / stays.length / skinM2
    expect(Math.abs(mean / 142 - 1)).toBeLessThanOrEqual(0.25)
    const slope = ((stays[4]?.sensibleW ?? 0) - (stays[0]?.sensibleW ?? 0)) / 20 / skinM2
    expect(slope).toBeGreaterThan(-3.5)
    expect(slope).toBeLessThan(-1.2)
    expect(at(-5).coldPct).toBeGreaterThan(5)
    expect(at(10).coldPct).toBeLessThan(5)
  })

  it('adult dog at 5 °C makes 1.5 to 2 times the heat it makes at 22 °C (+80 %, homeothermy in dogs)', () => {
    const basal = rowLike('dog', (row) => {
      row.metabolism.activityAtRest = 1
      return row
    })
    const heat = (airTempC: number) =>
      standing({ profile: 'dog', massKg: 11 }, { airTempC, relHumidityPct: 50 }, 480, { profiles: basal })
        .totalW
    expect(heat(5) / heat(22)).toBeGreaterThan(1.5)
    expect(heat(5) / heat(22)).toBeLessThan(2)
  })

  it('puppies: the younger, the faster they cool at 5 °C; adults do not (homeothermy in dogs)', () => {
    const core = (ageDays: number, massKg: number) =>
      standing({ profile: 'dog', massKg, ageDays }, { airTempC: 5, relHumidityPct: 50 }, 60).coreC
    const cores = [core(3, 0.5), core(15, 0.9), core(24, 1.4), core(1000, 11)]
    for (let i = 1; i < cores.length; i++) expect(cores[i]).toBeGreaterThan(cores[i - 1] ?? NaN)
    expect(cores[0]).toBeLessThan(37)
    expect(cores[1]).toBeLessThan(38.2)
    expect(cores[3]).toBeGreaterThan(38)
  })

  it('a double coat of 50 mm takes a quiet sled dog below −20 °C before it makes extra heat (Gerth et al. 2010; Scholander 1950, memory)', () => {
    const basal = rowLike('dog', (row) => {
      row.metabolism.activityAtRest = 1.3
      row.conductance = { model: 'line', line: 'mammal', minMultiple: 0.55, maxMultiple: 2 }
      row.coat.depthMm = 50
      return row
    })
    const stay = standing({ profile: 'dog', massKg: 30 }, { airTempC: -20, relHumidityPct: 70 }, 480, {
      profiles: basal,
    })
    expect(stay.coldPct).toBeLessThan(12)
  })

  it('set-point less lower critical temperature scales with mass^0.15…0.22 (204 mammals, Riek & Geiser 2013: 0.19)', () => {
    const masses = [0.02, 0.2, 2, 20, 200]
    const gaps = masses.map((massKg) => {
      const coat = { depthMm: 10 * Math.cbrt(massKg / 10) }
      const plain = rowLike('dog', (row) => {
        row.metabolism.activityAtRest = 1
        row.conductance = { model: 'line', line: 'mammal', minMultiple: 1, maxMultiple: 3 }
        row.coat.depthMm = coat.depthMm
        row.altricial = false
        return row
      })
      const lower = -lastHolding(-38, 30, (minusC) => {
        const stay = standing({ profile: 'dog', massKg }, { airTempC: -minusC, relHumidityPct: 50 }, 720, {
          profiles: plain,
        })
        return stay.coldPct < 2
      })
      return 38.7 - lower
    })
    const x = masses.map(Math.log)
    const y = gaps.map(Math.log)
    const mean = (values: number[]) => values.reduce((sum, value) => sum + value, 0) / values.length
    const slope =
      x.reduce((sum, xi, i) => sum + (xi - mean(x)) * ((y[i] ?? 0) - mean(y)), 0) /
      x.reduce((sum, xi) => sum + (xi - mean(x)) ** 2, 0)
    expect(slope).toBeGreaterThanOrEqual(0.15)
    expect(slope).toBeLessThanOrEqual(0.22)
  })
})

describe('species that ship no row, run to test the engine on animals it was not written for', () => {
  const budgerigar: ProfileValues = {
    ...(catalogueValues['pigeon'] as ProfileValues),
    setPointC: 38,
    metabolism: { line: 'bird', activityAtRest: 0.95, maxOverBasal: 6, q10: 2, respiratoryQuotient: 0.8 },
    conductance: { model: 'line', line: 'bird', minMultiple: 1.05, maxMultiple: 3.2 },
    respiration: { oxygenExtraction: 0.25, pantingMultiple: 11, pantingCost: 0.25, exhaled: 'small' },
    skin: { wettednessBase: 0.03, wettednessMax: 0.05 },
    bands: { vasomotor: [-0.6, 4], cold: [-2.5, -0.3], pant: [2.2, 5.6], wet: [2.2, 5.6] },
    limits: { criticalLowC: 34, alarmLowC: 36, alarmHighC: 43.5, criticalHighC: 45 },
  }

  it.each(
    readTable<{ airTempC: number; oxygenMlGH: number; bodyTempC: number; source: string }>('budgerigars'),
  )(
    'budgerigar of 33.7 g at $airTempC °C takes up $oxygenMlGH mL/g h at $bodyTempC °C; ±15 % to 31 °C, ±50 % above, ±1.5 K ($source)',
    ({ airTempC, oxygenMlGH, bodyTempC }) => {
      // Air held 16.7 mmHg of water, less in the cold (memory); stays short enough that thirst plays no part.
      const relHumidityPct = Math.min(60, (100 * 2226) / saturationPressurePa(airTempC))
      const bird = standing(
        { profile: 'budgerigar', massKg: 0.0337, posture: 'standing' },
        { airTempC, relHumidityPct },
        60,
        { profiles: { budgerigar } },
      )
      const taken = bird.totalW / ((33.7 * 20.1) / 3600)
      expect(Math.abs(taken / oxygenMlGH - 1)).toBeLessThanOrEqual(airTempC < 31 ? 0.15 : 0.5)
      expect(Math.abs(bird.coreC - bodyTempC)).toBeLessThanOrEqual(1.5)
    },
  )

  it.each(
    readTable<{ airTempC: number; relHumidityPct: number; wetBulbC: number; source: string }>('wet-frogs'),
  )(
    'a wet frog at $airTempC °C and $relHumidityPct % reaches $wetBulbC °C within 1 K ($source)',
    ({ airTempC, relHumidityPct, wetBulbC }) => {
      const frog: ProfileValues = {
        ...(catalogueValues['ball-python'] as ProfileValues),
        bodyPlan: 'lizard',
        skin: { wettednessBase: 1, wettednessMax: 1 },
      }
      const stay = standing(
        { profile: 'frog', massKg: 0.03, posture: 'standing' },
        { airTempC, relHumidityPct, airSpeedMs: 1.5 },
        240,
        { profiles: { frog } },
      )
      expect(Math.abs(stay.coreC - wetBulbC)).toBeLessThanOrEqual(1)
    },
  )
})
