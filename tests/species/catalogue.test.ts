import { describe, expect, it } from 'vitest'
import {
  catalogue,
  catalogueValues,
  profileValues,
  snubNosedBreed,
  type Figure,
  type Profile,
} from '@/lib/species'

const rows = Object.values(catalogue)

describe('the shipped rows', () => {
  it('are these ten, keyed by plain English in kebab-case', () => {
    expect(Object.keys(catalogue).sort()).toEqual([
      'ball-python',
      'bearded-dragon',
      'cat',
      'day-old-chick',
      'dog',
      'guinea-pig',
      'horse',
      'pigeon',
      'rabbit',
      'snub-nosed-dog',
    ])
  })

  it.each(rows)('$key: every figure has a unit, a source and a confidence', (profile) => {
    const all = figuresOf(profile)
    expect(all.length).toBeGreaterThan(25)
    for (const figure of all) {
      expect(figure.source.length).toBeGreaterThan(2)
      expect(['sourced', 'fitted', 'memory', 'judgement']).toContain(figure.confidence)
    }
  })

  it.each(rows)('$key: four core limits in order, alarm at least 0.8 °C inside critical', ({ key }) => {
    const limits = catalogueValues[key]?.limits
    expect(limits).toBeDefined()
    if (!limits) return
    expect(limits.alarmLowC - limits.criticalLowC).toBeGreaterThanOrEqual(0.8)
    expect(limits.criticalHighC - limits.alarmHighC).toBeGreaterThanOrEqual(0.8 - 1e-9)
  })

  it.each(['dog', 'cat', 'rabbit', 'guinea-pig'])(
    '%s: critical lies at least 0.5 °C under the lowest median lethal temperature, 41.7 °C (Adolph 1947)',
    (key) => {
      expect(catalogueValues[key]?.limits?.criticalHighC).toBeLessThanOrEqual(41.7 - 0.5)
    },
  )

  it('dogs: at least 0.5 °C under the 41.0 °C at which working dogs have died of heat', () => {
    expect(catalogueValues['dog']?.limits?.criticalHighC).toBeLessThanOrEqual(40.5)
    expect(catalogueValues['snub-nosed-dog']?.limits?.criticalHighC).toBeLessThan(40.5)
  })

  it.each(rows)('$key: set-point lies inside alarm, air floor under air ceiling', (profile) => {
    const values = profileValues(profile)
    expect(values.airFloorC).toBeLessThan(values.airCeilingC)
    if (values.thermoregulation === 'ectotherm' || !values.limits) return
    expect(values.setPointC).toBeGreaterThan(values.limits.alarmLowC)
    expect(values.setPointC).toBeLessThan(values.limits.alarmHighC)
  })
})

describe('a row that cannot be assessed', () => {
  const dog = catalogue['dog'] as Profile

  it.each(['criticalLowC', 'alarmLowC', 'alarmHighC', 'criticalHighC'] as const)(
    'is refused without %s',
    (limit) => {
      const { [limit]: _gone, ...limits } = dog.limits
      expect(() => profileValues({ ...dog, limits })).toThrow(
        expect.objectContaining({ code: 'refused', message: expect.stringContaining('four core limits') }),
      )
    },
  )

  it('is refused with limits out of order', () => {
    const { alarmHighC, criticalHighC, ...low } = dog.limits
    const crossed = { ...low, alarmHighC: criticalHighC, criticalHighC: alarmHighC } as Profile['limits']
    expect(() => profileValues({ ...dog, limits: crossed })).toThrow(/not in order/)
  })
})

describe('breed notes', () => {
  it.each([
    ['Pug, fawn', 'pug'],
    ['French Bulldog x Beagle', 'french bulldog'],
    ['SHIH-TZU', 'shih-tzu'],
    ['cavapug', 'cavapug'],
  ])('"%s" names %s', (note, breed) => {
    expect(snubNosedBreed(note)?.replace('-', ' ')).toBe(breed.replace('-', ' '))
  })

  it.each(['Border collie', 'Pugnacious terrier', '', 'Boxers are no part of this'])(
    '"%s" names none',
    (note) => {
      expect(snubNosedBreed(note)).toBeNull()
    },
  )
})

function figuresOf(value: unknown): Figure<unknown>[] {
  if (typeof value !== 'object' || value === null || Array.isArray(value)) return []
  if ('confidence' in value && 'source' in value && 'unit' in value) return [value as Figure<unknown>]
  return Object.values(value).flatMap(figuresOf)
}
