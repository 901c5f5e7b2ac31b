import { describe, expect, it } from 'vitest'
import { mergePlans } from '@/components/plan/merge-plans'
import { emptyPlan, newAnimal, newCrate, newLeg, newOpening } from '@/lib/planning/new-plan'
import type { Plan } from '@/lib/schemas/plan'

function plan(): Plan {
  const made = emptyPlan(1)
  made.animals = [{ ...newAnimal(made), name: 'Moss' }]
  made.crates = [{ ...newCrate(made, null), occupants: ['animal-1'], openings: [] }]
  made.legs = [newLeg(made, 'road')]
  made.legs.push(newLeg(made, 'shed'))
  return made
}

function changed(change: (plan: Plan) => void): Plan {
  const made = plan()
  change(made)
  return made
}

function item<T>(list: readonly T[], index: number): T {
  const found = list[index]
  if (found === undefined) throw new Error(`There is no row ${index}.`)
  return found
}

describe('two people save the same plan', () => {
  it('takes what only one of them changed, on either side', () => {
    const mine = changed((one) => void (one.consignor.name = 'Croy Kennels'))
    const theirs = changed((one) => void (one.consignee.name = 'Wadi Sahm'))
    const { plan: merged, conflicts, taken } = mergePlans(plan(), mine, theirs)
    expect(conflicts).toEqual([])
    expect([merged.consignor.name, merged.consignee.name]).toEqual(['Croy Kennels', 'Wadi Sahm'])
    expect(taken).toEqual([{ path: 'consignee.name', before: '', after: 'Wadi Sahm' }])
  })

  it('puts one field with two values before a person, and shows mine until then', () => {
    const mine = changed((one) => void (item(one.crates, 0).bedding.depthMm = 20))
    const theirs = changed((one) => void (item(one.crates, 0).bedding.depthMm = 40))
    const { plan: merged, conflicts } = mergePlans(plan(), mine, theirs)
    expect(conflicts).toEqual([{ path: 'crates.0.bedding.depthMm', mine: 20, theirs: 40 }])
    expect(merged.crates[0]?.bedding.depthMm).toBe(20)
  })

  it('asks nothing where both typed the same', () => {
    const both = changed((one) => void (item(one.animals, 0).massKg = 12))
    expect(mergePlans(plan(), both, structuredClone(both)).conflicts).toEqual([])
  })

  it('keeps rows both added, each under an id of its own, and each animal in its crate', () => {
    const add = (name: string) =>
      changed((one) => {
        one.animals.push({ ...newAnimal(one), name })
        one.crates.push({
          ...newCrate(one, null),
          id: `crate-${name.toLowerCase()}`,
          occupants: ['animal-2'],
        })
      })
    const { plan: merged, conflicts } = mergePlans(plan(), add('Fern'), add('Reed'))
    expect(conflicts).toEqual([])
    const names = new Map(merged.animals.map(({ id, name }) => [id, name]))
    expect([...names.values()].sort()).toEqual(['Fern', 'Moss', 'Reed'])
    expect(names.size).toBe(3)
    for (const { id, occupants } of merged.crates.slice(1)) {
      expect(occupants.map((one) => names.get(one)?.toLowerCase())).toEqual([id.replace('crate-', '')])
    }
  })

  it('keeps a leg that one took out and the other changed, and drops one that nobody changed', () => {
    const without = changed((one) => void one.legs.pop())
    const noted = changed((one) => void (item(one.legs, 1).note = 'Door 4'))
    expect(mergePlans(plan(), without, noted).plan.legs.map(({ note }) => note)).toEqual(['', 'Door 4'])
    expect(mergePlans(plan(), noted, without).plan.legs.map(({ note }) => note)).toEqual(['', 'Door 4'])
    expect(mergePlans(plan(), without, plan()).plan.legs).toHaveLength(1)
    expect(mergePlans(plan(), plan(), without).plan.legs).toHaveLength(1)
  })

  it('treats surroundings of another kind as one thing', () => {
    const mine = changed((one) => {
      item(one.legs, 1).surroundings = {
        type: 'controlled',
        airTempC: 18,
        relHumidityPct: 60,
        airSpeedMs: 0.1,
        outside: null,
      }
    })
    const theirs = changed((one) => {
      item(one.legs, 1).surroundings = {
        type: 'open-air',
        shadePct: 0,
        rows: [{ minute: 0, airTempC: 9, relHumidityPct: 80, windMs: 3, solarWm2: 0 }],
      }
    })
    expect(mergePlans(plan(), mine, theirs).conflicts.map(({ path }) => path)).toEqual([
      'legs.1.surroundings',
    ])
  })

  it('merges openings row by row', () => {
    const start = changed((one) => void (item(one.crates, 0).openings = [newOpening(item(one.crates, 0))]))
    const mine = structuredClone(start)
    item(item(mine.crates, 0).openings, 0).blockedPct = 50
    const theirs = structuredClone(start)
    item(item(theirs.crates, 0).openings, 0).meshOpenPct = 70
    const { plan: merged, conflicts } = mergePlans(start, mine, theirs)
    expect(conflicts).toEqual([])
    expect(merged.crates[0]?.openings[0]).toMatchObject({ blockedPct: 50, meshOpenPct: 70 })
  })
})
