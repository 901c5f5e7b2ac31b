import { describe, expect, it } from 'vitest'
import { fieldWords, ownerWords } from '@/components/plan/field-words'
import { withoutOwner } from '@/components/plan/reason-words'
import { figuresUnder } from '@/components/plan/ruler-layout'
import { glasgowToMuscat } from '../../planning/plan'

describe('a reason beside the link to its field', () => {
  const plan = glasgowToMuscat()
  const told = (path: string, message: string) => {
    const words = fieldWords(plan, path)
    return `${words}: ${withoutOwner(message, words, ownerWords(plan, path))}`
  }
  it.each([
    ['legs', 'No leg is entered.', 'Legs: No leg is entered.'],
    ['animals', 'No animal is entered.', 'Animals: No animal is entered.'],
    ['animals.0', 'Corrie is in no crate.', 'Corrie: is in no crate.'],
    [
      'legs.3.partyTelephone',
      'Leg 4 (flight): none of ours is present.',
      'Leg 4, telephone: none of ours is present.',
    ],
    [
      'legs.0.startLocal',
      'Leg 1 (road), start: “x” is not a date and a time.',
      'Leg 1, start: “x” is not a date and a time.',
    ],
    [
      'legs.1.surroundings.rows.1.airTempC',
      'Leg 2 (ramp) weather row 2 has no air temperature.',
      'Leg 2, weather row 2, air temperature: has no air temperature.',
    ],
  ])('%s is told once', (path, message, words) => expect(told(path, message)).toBe(words))
})

describe('numbers of narrow legs under the ruler', () => {
  const leg = (index: number, fromPx: number, toPx: number) => ({ index, fromPx, toPx })

  it('stand under their legs, and wide legs hold their own', () => {
    expect(figuresUnder([leg(0, 0, 200), leg(1, 200, 210)], 22)).toEqual([
      { index: 1, atPx: 205, legPx: 205 },
    ])
  })

  it('keep clear of one another', () => {
    const under = figuresUnder([leg(0, 100, 104), leg(1, 104, 110), leg(2, 110, 114)], 22)
    expect(under.map(({ atPx }) => atPx)).toEqual([102, 124, 146])
  })
})
