import { describe, expect, it } from 'vitest'
import { integrate } from '@/lib/thermal/rosenbrock'
import { NUMERICS } from '@/lib/thermal/simulate'
import { firstLeg } from './one-leg'
import { readScenario } from './scenarios'

/** Integrates the first leg; from evaluation `lostFrom` on the first of two crates gives no figures, the other goes on. */
function run(lostFrom: number): { evaluations: number; allFinite: boolean } {
  const { model, y, sums } = firstLeg(readScenario('pigeons-in-open-mesh'))
  const [first, second] = model.layout.blocks
  if (first === undefined || second === undefined) throw new Error('The journey has two crates.')
  const setTime = model.setTime.bind(model)
  let evaluations = 0
  let allFinite = true
  model.setTime = (s) => {
    evaluations += 1
    setTime(s)
    if (evaluations >= lostFrom) first.box.sunOnWallW = NaN
  }
  const counts = { accepted: 0, rejected: 0, rightHandSides: 0, jacobians: 0 }
  integrate(model, y, sums, NUMERICS, counts, ({ y1, f1 }) => {
    allFinite &&= y1.every(Number.isFinite) && f1.every(Number.isFinite)
    return allFinite
  })
  return { evaluations, allFinite }
}

describe('a figure lost in one crate', () => {
  it('ends the run with an error, at whichever evaluation it is lost and whatever the crates after it do', () => {
    const { evaluations, allFinite } = run(Infinity)
    expect(allFinite).toBe(true)
    expect(evaluations).toBeGreaterThan(50)
    for (let lostFrom = 1; lostFrom <= evaluations; lostFrom++)
      expect(() => run(lostFrom), `evaluation ${lostFrom}`).toThrow(
        expect.objectContaining({ code: 'not_converged' }),
      )
  })
})
