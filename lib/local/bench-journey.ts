import { createRequire } from 'node:module'
import { catalogueValues } from '@/lib/species'
import type { Scenario, Variant } from '@/lib/thermal'
import { buildLeg } from '@/lib/thermal/build-leg'
import { stateIn } from '@/lib/thermal/dense'
import { load, save } from '@/lib/thermal/exchange'
import { journeyOf } from '@/lib/thermal/journey'
import type { Layout } from '@/lib/thermal/layout'
import { legModelOf, type LegModel } from '@/lib/thermal/leg-model'
import { rightHandSide } from '@/lib/thermal/right-hand-side'
import { integrate, tolerances } from '@/lib/thermal/rosenbrock'
import { NUMERICS, restore } from '@/lib/thermal/simulate'
import { storeOf } from '@/lib/thermal/store'

/*
 * The same journey through the same equations by either of two solvers: ours, or odex, Hairer's extrapolation code for
 * equations that are not stiff. Both give body and air of every crate at every minute.
 */

export interface Course {
  /** Time in the solver alone. */
  milliseconds: number
  /** Evaluations of the equations: right-hand sides, and for ours those of a Jacobian's columns besides. */
  evaluations: number
  /** °C by leg, minute and animal; °C by leg, minute and crate. */
  bodyC: Map<string, number>
  airC: Map<string, number>
}

/** Changes `y` and `sums` to those at the leg's end and tells the states at every whole minute; returns the evaluations. */
export type Solver = (
  model: LegModel,
  y: Float64Array,
  sums: Float64Array,
  tell: (minute: number, stateAt: (index: number) => number) => void,
) => number

/** The whole journey on time. Throws where the solver loses it: never a figure that is not finite. */
export function travel(scenario: Scenario, variant: Variant, solver: Solver): Course {
  const journey = journeyOf(scenario, { variant, profiles: catalogueValues })
  const store = storeOf(undefined)
  const course: Course = { milliseconds: 0, evaluations: 0, bodyC: new Map(), airC: new Map() }
  journey.legs.forEach((leg, index) => {
    const [fromS, toS] = [minuteS(journey.startsMin[index]), minuteS(journey.startsMin[index + 1])]
    const model = legModelOf(buildLeg(journey, store, index, fromS, toS, undefined))
    const { layout } = model
    const y = new Float64Array(layout.size)
    const sums = new Float64Array(layout.sums)
    load(layout, store, y, sums)
    const began = performance.now()
    course.evaluations += solver(model, y, sums, (minute, stateAt) => {
      for (const { box, at, animals } of layout.blocks) {
        course.airC.set(`${leg.id} ${minute} ${box.id}`, stateAt(at))
        for (const slot of animals) course.bodyC.set(`${leg.id} ${minute} ${slot.body.id}`, stateAt(slot.at))
      }
    })
    course.milliseconds += performance.now() - began
    if (!y.every(Number.isFinite)) throw new Error(`Leg ${leg.id} ends in figures that are not finite.`)
    save(layout, y, sums, store)
    if (leg.outOfCrate) restore(model, store)
  })
  return course
}

/** Largest difference over all minutes, °C; NaN where a minute is missing or not a figure. */
export function gapOf(course: Course, reference: Course): { bodyC: number; airC: number } {
  return { bodyC: largest(course.bodyC, reference.bodyC), airC: largest(course.airC, reference.airC) }
}

/** Ours, all tolerances times `looseness`. */
export function ours(looseness: number): Solver {
  const numerics = {
    ...NUMERICS,
    relTol: NUMERICS.relTol * looseness,
    absTolK: NUMERICS.absTolK * looseness,
    absTolKgM3: NUMERICS.absTolKgM3 * looseness,
    absTolPpm: NUMERICS.absTolPpm * looseness,
  }
  return (model, y, sums, tell) => {
    const counts = { accepted: 0, rejected: 0, rightHandSides: 0, jacobians: 0 }
    let next = nextMinute(model.fromS)
    integrate(model, y, sums, numerics, counts, (step) => {
      for (; next * 60 <= step.toS + 1e-6; next++) {
        const x = (next * 60 - step.fromS) / (step.toS - step.fromS)
        tell(next, (index) => stateIn(step, index, x))
      }
      return true
    })
    return counts.rightHandSides + counts.jacobians * (1 + model.layout.size)
  }
}

export interface OdexSettings {
  /** Times the tolerances ours works with, state by state. */
  looseness: number
  /** Longest step, s; 0: as long as it likes. */
  longestStepS: number
  /** Evaluations after which it is given up. */
  atMost?: number
}

/** The part of odex that is used here. */
interface Odex {
  Solver: new (size: number) => {
    absoluteTolerance: number[]
    relativeTolerance: number
    maxStepSize: number
    maxSteps: number
    initialStepSize: number
    denseOutput: boolean
    denseComponents: number[]
    solve(
      rates: (s: number, y: number[]) => number[],
      fromS: number,
      y: number[],
      toS: number,
      onStep: (
        count: number,
        fromS: number,
        toS: number,
        y: number[],
        inside: (index: number, s: number) => number,
      ) => void,
    ): { y: number[]; outcome: number }
  }
}

/**
 * odex. It takes no notice of NaN: left alone it steps past the fastest time constant, and ends in NaN without a word or
 * never ends. A rate that is not a figure is therefore told to it as a huge one, at which it goes back and takes a shorter step.
 */
export function odex({ looseness, longestStepS, atMost = Infinity }: OdexSettings): Solver {
  const { Solver: OdexSolver } = createRequire(import.meta.url)('odex') as Odex
  return (model, y, sums, tell) => {
    const { layout, stops } = model
    const solver = new OdexSolver(layout.size)
    solver.absoluteTolerance = Array.from(tolerances(model, NUMERICS), (each) => each * looseness)
    solver.relativeTolerance = NUMERICS.relTol * looseness
    solver.maxStepSize = longestStepS
    solver.maxSteps = 1e8
    solver.initialStepSize = 0.01
    solver.denseOutput = true
    solver.denseComponents = temperatures(layout)
    const rates = new Float64Array(layout.size)
    let evaluations = 0
    let next = nextMinute(model.fromS)
    let from = model.fromS
    for (const { s: to } of stops) {
      model.setSwitches(from, y)
      const state = Float64Array.from(y)
      const solved = solver.solve(
        (s, given) => {
          evaluations += 1
          if (evaluations > atMost) throw new Error(`given up after ${atMost} evaluations`)
          state.set(given)
          rightHandSide(model, s, state, rates, sums)
          return Array.from(rates, (rate) => (Number.isFinite(rate) ? rate : 1e30))
        },
        from,
        [...y],
        to,
        (count, _fromS, toS, _y, inside) => {
          // The first call tells the start.
          for (; count > 1 && next * 60 <= toS + 1e-6; next++) {
            const s = next * 60
            tell(next, (index) => inside(index, s))
          }
        },
      )
      if (solved.outcome !== 0) throw new Error('odex did not reach the end.')
      y.set(solved.y)
      from = to
    }
    return evaluations
  }
}

function largest(of: ReadonlyMap<string, number>, reference: ReadonlyMap<string, number>): number {
  if (of.size !== reference.size || of.size === 0) return NaN
  // Math.max keeps a NaN.
  return [...reference].reduce(
    (most, [key, value]) => Math.max(most, Math.abs((of.get(key) ?? NaN) - value)),
    0,
  )
}

function temperatures({ blocks }: Layout): number[] {
  return blocks.flatMap(({ at, animals }) => [at, ...animals.map((slot) => slot.at)])
}

function nextMinute(fromS: number): number {
  return Math.floor(fromS / 60 + 1e-9) + 1
}

function minuteS(minute: number | undefined): number {
  return (minute ?? NaN) * 60
}
