import { describe, expect, it } from 'vitest'
import { PlanProblems, problemsOf } from '@/components/plan/plan-problems'
import { emptyPlan, newAnimal, newCrate, newLeg } from '@/lib/planning/new-plan'
import type { Plan } from '@/lib/schemas/plan'

const KNOWLEDGE = { places: [], profiles: [] }

function plan(): Plan {
  const made = emptyPlan(1)
  made.animals = [{ ...newAnimal(made), name: 'Moss' }]
  made.crates = [newCrate(made, null)]
  made.legs = [newLeg(made, 'ramp')]
  return made
}

function item<T>(list: readonly T[], index: number): T {
  const found = list[index]
  if (found === undefined) throw new Error(`There is no row ${index}.`)
  return found
}

describe('what keeps a plan from being assessed', () => {
  it('tells a figure that cannot be read by its field, and still tells the rest', () => {
    const typed = plan()
    item(typed.crates, 0).bedding.depthMm = 'thick' as never
    const problems = problemsOf(typed, KNOWLEDGE)
    expect(problems.find(({ path }) => path === 'crates.0.bedding.depthMm')).toMatchObject({ kind: 'form' })
    expect(problems.some(({ path }) => path === 'consignor.name')).toBe(true)
  })

  it('survives every kind of unreadable typing', () => {
    const typed = plan()
    item(typed.animals, 0).massKg = 'x' as never
    item(typed.legs, 0).startLocal = 'soon'
    item(typed.legs, 0).delayWorstMin = null as never
    item(typed.crates, 0).lengthCm = 'y' as never
    expect(problemsOf(typed, KNOWLEDGE).filter(({ kind }) => kind === 'form')).toHaveLength(4)
  })

  it('leaves empty fields in peace until somebody asks to assess', () => {
    const problems = new PlanProblems()
    problems.set(problemsOf(plan(), KNOWLEDGE))
    expect(problems.at('consignor.name')).toBeUndefined()
    expect(problems.all().length).toBeGreaterThan(3)
    problems.ask()
    expect(problems.at('consignor.name')).toBe('The consignor has no name.')
  })
})
