import { expect, it } from 'vitest'
import { reasonsNotAssessable } from '@/lib/planning/reasons'
import { PLACES, PROFILES, glasgowToMuscat } from './plan'

const knowledge = { places: PLACES, profiles: PROFILES }

it('a letter the paper cannot show is a reason at its own field, by name', () => {
  const plan = glasgowToMuscat()
  const [animal] = plan.animals
  const [leg] = plan.legs
  if (animal === undefined || leg === undefined) throw new Error('Nothing there.')
  animal.name = 'Γαία'
  plan.consignee.name = 'Илья'
  plan.handlingNote = 'Ring first.\nIl-kelb jibża’.'
  leg.partyInCharge = 'Kennel\u200b'
  expect(reasonsNotAssessable(plan, knowledge)).toEqual([
    {
      path: 'consignee.name',
      message:
        '“Илья” holds “И”, “л”, “ь”, “я”, which the paper cannot show. Write it in Latin letters, as in the passport.',
    },
    {
      path: 'animals.0.name',
      message:
        '“Γαία” holds “Γ”, “α”, “ί”, which the paper cannot show. Write it in Latin letters, as in the passport.',
    },
    { path: 'legs.0.partyInCharge', message: expect.stringContaining('holds U+200B, which') as string },
  ])
})

it('a place whose name the paper cannot show is a reason where it is chosen', () => {
  const places = PLACES.map((place) => (place.id === 3 ? { ...place, name: 'مطار مسقط' } : place))
  const paths = reasonsNotAssessable(glasgowToMuscat(), { places, profiles: PROFILES }).map(
    ({ path }) => path,
  )
  expect(paths.length).toBeGreaterThan(0)
  expect(paths.every((path) => /^legs\.\d+\.(from|to)PlaceId$/.test(path))).toBe(true)
})

it('what stays off the papers may be written in any letters', () => {
  const plan = glasgowToMuscat()
  for (const leg of plan.legs)
    Object.assign(leg, { note: 'Позвонить', fallback: '犬', lastPointOfReturn: 'Ω' })
  expect(reasonsNotAssessable(plan, knowledge)).toEqual([])
})
