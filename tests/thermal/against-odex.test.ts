import { createRequire } from 'node:module'
import { describe, expect, it } from 'vitest'
import { rightHandSide, type Scenario } from '@/lib/thermal'
import { integrate } from '@/lib/thermal/rosenbrock'
import { NUMERICS } from '@/lib/thermal/simulate'
import { firstLeg } from './one-leg'
import { readScenario } from './scenarios'

/** The part of odex (Hairer's extrapolation code, not stiff) used here. */
interface Odex {
  Solver: new (n: number) => {
    absoluteTolerance: number
    relativeTolerance: number
    maxStepSize: number
    initialStepSize: number
    maxSteps: number
    solve(
      f: (x: number, y: number[]) => number[],
      from: number,
      y: number[],
      to: number,
    ): { y: number[]; outcome: number; nEval: number }
  }
}
const { Solver } = createRequire(import.meta.url)('odex') as Odex

describe('our solver against an independent one at tight tolerance', () => {
  it.each([
    ['pug-on-a-hot-ramp', 'heat-prone', 120],
    ['chicks-in-a-van', 'typical', 60],
    ['wet-dog-in-the-wind', 'cold-prone', 90],
    ['van-that-loses-its-cooling', 'typical', 95],
  ] as const)(
    '%s, %s: core and air within 0.02 °C after %d min',
    { timeout: 60_000 },
    (name, variant, minutes) => {
      const scenario = firstMinutes(readScenario(name), minutes)
      const ours = firstLeg(scenario, { variant })
      integrate(ours.model, ours.y, ours.sums, NUMERICS, counts(), () => true)

      const theirs = firstLeg(scenario, { variant })
      const { layout, fromS, toS, stops } = theirs.model
      const dq = new Float64Array(layout.sums)
      const solver = new Solver(layout.size)
      solver.absoluteTolerance = 1e-9
      solver.relativeTolerance = 1e-9
      solver.initialStepSize = 0.01
      // It is not made for stiff equations and returns NaN without a word when its step outgrows the fastest time constant.
      solver.maxStepSize = 2
      solver.maxSteps = 1e7
      let y = [...theirs.y]
      let at = fromS
      for (const { s } of stops) {
        theirs.model.setSwitches(at, Float64Array.from(y))
        const solved = solver.solve(
          (x, state) => {
            const dy = new Float64Array(layout.size)
            rightHandSide(theirs.model, x, Float64Array.from(state), dy, dq)
            return [...dy]
          },
          at,
          y,
          s,
        )
        y = solved.y
        at = s
      }
      expect(at).toBe(toS)
      expect(y.every(Number.isFinite)).toBe(true)
      for (const block of layout.blocks) {
        for (const index of [
          block.at,
          block.at + 1,
          ...block.animals.flatMap((slot) => [slot.at, slot.at + 1]),
        ]) {
          expect(Math.abs((ours.y[index] ?? NaN) - (y[index] ?? NaN))).toBeLessThanOrEqual(0.02)
        }
      }
    },
  )
})

function firstMinutes(scenario: Scenario, minutes: number): Scenario {
  const [leg] = scenario.legs
  if (!leg) throw new Error('No leg.')
  return { ...scenario, legs: [{ ...leg, durationMin: minutes }] }
}

const counts = () => ({ accepted: 0, rejected: 0, rightHandSides: 0, jacobians: 0 })
