import { readFileSync } from 'node:fs'
import { createRequire } from 'node:module'
import path from 'node:path'
import { catalogueValues } from '@/lib/species'
import { simulate, VARIANTS, type Scenario } from '@/lib/thermal'
import { buildLeg } from '@/lib/thermal/build-leg'
import { load } from '@/lib/thermal/exchange'
import { journeyOf } from '@/lib/thermal/journey'
import { legModelOf, type LegModel } from '@/lib/thermal/leg-model'
import { rightHandSide } from '@/lib/thermal/right-hand-side'
import { integrate } from '@/lib/thermal/rosenbrock'
import { NUMERICS } from '@/lib/thermal/simulate'
import { storeOf } from '@/lib/thermal/store'

/** The part of odex, Hairer's extrapolation code for equations that are not stiff, that is used here. */
interface Odex {
  Solver: new (n: number) => {
    absoluteTolerance: number
    relativeTolerance: number
    maxStepSize: number
    maxSteps: number
    initialStepSize: number
    solve(f: (x: number, y: number[]) => number[], from: number, y: number[], to: number): { y: number[] }
  }
}

const REFERENCE = 'tests/thermal/scenarios/reference-two-days.json'
const REPEATS = 20
const LEG_MIN = 120

/**
 * Prints how long one variant of the reference consignment takes (48 h, eight legs, four crates, six animals), and how much longer a
 * general solver needs for the same equations to the same accuracy.
 */
export function benchThermal(print: (line: string) => void = console.log): void {
  const scenario = JSON.parse(readFileSync(path.resolve(REFERENCE), 'utf8')) as Scenario
  for (const variant of VARIANTS) {
    for (const tracks of [false, true]) {
      const once = () => simulate(scenario, { variant, profiles: catalogueValues, tracks })
      for (let i = 0; i < 5; i++) once()
      const milliseconds = timed(() => {
        for (let i = 0; i < REPEATS; i++) once()
      })
      const { steps } = once()
      const per = (milliseconds / REPEATS).toFixed(1)
      print(
        `${variant}, ${tracks ? 'minute tracks' : 'no tracks'}: ${per} ms a run, ${steps.accepted} steps (${steps.rejected} rejected)`,
      )
    }
  }
  const first = scenario.legs[0]
  if (!first) throw new Error('The reference consignment has no leg.')
  const leg = { ...scenario, legs: [{ ...first, durationMin: LEG_MIN, events: [] }] }
  const exact = odexEnd(leg, 1e-10, 0.5)
  const { milliseconds: ours, gapK } = best(() => ourEnd(leg), exact)
  const theirs = best(() => odexEnd(leg, 1e-4, 5), exact)
  print(`first two hours, ours: ${ours.toFixed(1)} ms, within ${gapK.toExponential(1)} °C`)
  print(
    `first two hours, odex at 1e-4: ${theirs.milliseconds.toFixed(1)} ms, within ${theirs.gapK.toExponential(1)} °C`,
  )
  print(`ratio ${(theirs.milliseconds / ours).toFixed(0)} : 1`)
}

interface End {
  y: number[]
  temperatures: number[]
}

function best(solve: () => End, exact: End): { milliseconds: number; gapK: number } {
  let end = solve()
  let milliseconds = Infinity
  for (let i = 0; i < 5; i++) {
    milliseconds = Math.min(
      milliseconds,
      timed(() => {
        end = solve()
      }),
    )
  }
  const gapK = Math.max(
    ...exact.temperatures.map((at) => Math.abs((end.y[at] ?? NaN) - (exact.y[at] ?? NaN))),
  )
  return { milliseconds, gapK }
}

function ourEnd(scenario: Scenario): End {
  const { model, y, sums } = start(scenario)
  integrate(
    model,
    y,
    sums,
    NUMERICS,
    { accepted: 0, rejected: 0, rightHandSides: 0, jacobians: 0 },
    () => true,
  )
  return { y: [...y], temperatures: temperaturesOf(model) }
}

function odexEnd(scenario: Scenario, tolerance: number, longestStepS: number): End {
  const { Solver } = createRequire(import.meta.url)('odex') as Odex
  const { model, y: first, sums } = start(scenario)
  const solver = new Solver(model.layout.size)
  solver.absoluteTolerance = tolerance
  solver.relativeTolerance = tolerance
  // Without a bound it steps over the fastest time constant and returns NaN without a word.
  solver.maxStepSize = longestStepS
  solver.initialStepSize = 0.01
  solver.maxSteps = 1e8
  const dy = new Float64Array(model.layout.size)
  let y = [...first]
  let at = model.fromS
  for (const { s } of model.stops) {
    model.setSwitches(at, Float64Array.from(y))
    const rates = (x: number, state: number[]) => {
      rightHandSide(model, x, Float64Array.from(state), dy, sums)
      return [...dy]
    }
    y = solver.solve(rates, at, y, s).y
    at = s
  }
  return { y, temperatures: temperaturesOf(model) }
}

function start(scenario: Scenario): { model: LegModel; y: Float64Array; sums: Float64Array } {
  const journey = journeyOf(scenario, { variant: 'typical', profiles: catalogueValues })
  const store = storeOf(undefined)
  const model = legModelOf(buildLeg(journey, store, 0, 0, LEG_MIN * 60, undefined))
  const y = new Float64Array(model.layout.size)
  const sums = new Float64Array(model.layout.sums)
  load(model.layout, store, y, sums)
  model.setSwitches(0, y)
  return { model, y, sums }
}

function temperaturesOf({ layout }: LegModel): number[] {
  return layout.blocks.flatMap((block) => [
    block.at,
    block.at + 1,
    ...block.animals.flatMap((slot) => [slot.at, slot.at + 1]),
  ])
}

function timed(work: () => void): number {
  const from = performance.now()
  work()
  return performance.now() - from
}
