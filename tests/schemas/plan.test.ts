import { describe, expect, it } from 'vitest'
import { planSchema, savePlanSchema } from '@/lib/schemas/plan'
import { CRATE_MODELS } from '../../seeders/crate-models'
import { newCrate } from '@/lib/planning/new-plan'
import { glasgowToMuscat } from '../planning/plan'

const sent = (plan: unknown) =>
  savePlanSchema.safeParse({
    consignmentId: null,
    version: null,
    requestId: '2f74c0b2-ba82-4cfa-9035-2b1fcfbf8fd2',
    plan,
  })
const issuesOf = (plan: unknown) =>
  (sent(plan).error?.issues ?? []).map(({ path, message }) => `${path.join('.')}: ${message}`)

describe('what a plan may not say', () => {
  it.each([
    ['crates', 'packs', [{ kind: 'ice', massKg: 1 }]],
    ['crates', 'medium', 'water'],
    ['animals', 'hoursSinceFed', 3],
    ['animals', 'acclimatedToC', 2],
    ['legs', 'speedKmh', 80],
  ] as const)('%s have no %s, and none is dropped in silence', (part, field, value) => {
    const plan = glasgowToMuscat()
    Object.assign(plan[part][0] ?? {}, { [field]: value })
    expect(issuesOf(plan)).toEqual([
      `plan.${part}.0.${field}: “${field}” is not a field of a plan: nothing would count it, so it is refused.`,
    ])
    // A plan kept long ago stays readable all the same.
    expect(planSchema.safeParse(plan).success).toBe(true)
  })

  it('says what is wrong with a field it knows at that field', () => {
    const plan = glasgowToMuscat()
    Object.assign(plan.crates[0] ?? {}, { wallThicknessMm: 900 })
    expect(issuesOf(plan)).toEqual([
      'plan.crates.0.wallThicknessMm: Wall thickness 900 mm: put 0.5 to 100 mm.',
    ])
  })
})

it('takes a plan as the form makes it, whatever crate model stands in it', () => {
  const plan = glasgowToMuscat()
  expect(issuesOf(plan)).toEqual([])
  for (const { spec } of CRATE_MODELS) {
    const made = { ...glasgowToMuscat() }
    made.crates = [{ ...newCrate({ crates: [] }, { id: 1, plan: spec }), occupants: ['animal-1'] }]
    expect(issuesOf(made)).toEqual([])
  }
})
