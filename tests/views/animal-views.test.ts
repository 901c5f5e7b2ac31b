import { expect, it } from 'vitest'
import type { Plan } from '@/lib/schemas/plan'
import { animalViews } from '@/lib/views/sheet-view/animals'
import type { AnimalContext } from '@/lib/views/sheet-view/animals'
import { glasgowToMuscat } from '../planning/plan'

/** What sheet, manifest and vet are told of the first animal of a plan nobody has assessed. */
function told(change: Partial<Plan['animals'][number]> = {}) {
  const plan = glasgowToMuscat()
  Object.assign(plan.animals[0] ?? {}, change)
  const facts = { plan, profiles: [], firm: { zone: 'Europe/London' } } as unknown as AnimalContext['facts']
  return animalViews({ facts, assessed: null, journey: [], conditionsOn: () => 0 })[0]
}

const examined = (change = {}) => told(change)?.examinedWords.replaceAll('\u00a0', ' ')

it('says by whom an animal was last examined, and on which day', () => {
  expect(examined()).toBe('')
  expect(examined({ examinedOn: '2026-06-07' })).toBe('Sun 7 Jun 2026')
  expect(examined({ examinedOn: '2026-06-07', examinedBy: 'A. Vane' })).toBe('Sun 7 Jun 2026 by A. Vane')
  expect(examined({ examinedBy: 'A. Vane' })).toBe('by A. Vane')
})

it('says what the activity of the run rests on', () => {
  expect(told()?.mannerWords).toBe('calm, crate-trained')
  expect(told({ temperament: 'anxious', crateTrained: false })?.mannerWords).toBe(
    'anxious, not crate-trained',
  )
  expect(told({ temperament: 'unknown' })?.mannerWords).toBe('temperament not known, crate-trained')
})
