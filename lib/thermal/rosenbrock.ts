import { SteadfoldError } from '../errors'
import { arrowFactors, setFactors, solveArrow } from './arrow'
import { jacobianOf, jacobianWork, setJacobian, type BlockJacobian } from './jacobian'
import type { Block } from './layout'
import type { LegModel } from './leg-model'
import { rightHandSide } from './right-hand-side'
import type { Numerics, StepCounts } from './run'
import { stepRoot, TABLEAU } from './tableau'

/** Both ends of one accepted step, for dense output. Arrays are reused: read, never keep. */
export interface Step {
  fromS: number
  toS: number
  y0: Float64Array
  y1: Float64Array
  f0: Float64Array
  f1: Float64Array
  /** Integrals and their rates. */
  sums0: Float64Array
  sums1: Float64Array
  q0: Float64Array
  q1: Float64Array
}

const FIRST_STEP_S = 10
const SHORTEST_STEP_S = 1e-7
const SAFETY = 0.9

/**
 * Integrates one leg from `model.fromS` to `model.toS`, changing `y` and `sums` in place, with exact stops at every switch and corner of
 * the weather. L-stable Rosenbrock method with error control on every state; integrals ride along through their own rows, so heat in
 * equals heat stored to round-off. `onStep` may return false to end early. Returns the second reached.
 */
export function integrate(
  model: LegModel,
  y: Float64Array,
  sums: Float64Array,
  numerics: Numerics,
  counts: StepCounts,
  onStep: (step: Step) => boolean,
): number {
  const { layout } = model
  const { size } = layout
  const stages = TABLEAU.stages
  const vector = () => new Float64Array(size)
  const integrals = () => new Float64Array(layout.sums)
  const jacobian = jacobianOf(layout)
  const work = jacobianWork(layout)
  const factors = arrowFactors(layout)
  const k = Array.from({ length: stages }, vector)
  const kq = Array.from({ length: stages }, integrals)
  const f = vector()
  const q = integrals()
  const ft = vector()
  const qt = integrals()
  const stage = vector()
  const qs = integrals()
  const tolerance = tolerances(model, numerics)
  const step: Step = {
    fromS: model.fromS,
    toS: model.fromS,
    y0: vector(),
    y1: y,
    f0: vector(),
    f1: f,
    sums0: integrals(),
    sums1: sums,
    q0: integrals(),
    q1: q,
  }

  let s = model.fromS
  let h = FIRST_STEP_S
  for (const { s: stop, jump } of model.stops) {
    model.setSwitches(s, y)
    rightHandSide(model, s, y, f, q)
    counts.rightHandSides++
    while (s < stop) {
      setJacobian(model, s, y, jacobian, work)
      counts.jacobians++
      if (!model.steady) setTimeDerivative(s, stop)
      let rejected = false
      for (;;) {
        const remaining = stop - s
        // Two even steps rather than a full one and a sliver.
        const last = h >= remaining * (1 - 1e-9)
        const tried = last ? remaining : h > 0.5 * remaining ? 0.5 * remaining : h
        const error = attempt(tried)
        const finite = error >= 0 && error < Infinity
        if (finite && error <= 1) {
          accept(last ? stop : s + tried)
          const growth = SAFETY / Math.max(1e-3, stepRoot(error))
          const next = tried * Math.min(rejected ? 1 : 6, Math.max(0.2, growth))
          // A step cut short by a stop says nothing against the longer one it was cut from.
          h = last && tried < h ? Math.max(h, next) : next
          h = Math.min(h, numerics.maxStepS)
          break
        }
        rejected = true
        counts.rejected++
        h = tried * (finite ? Math.max(0.1, SAFETY / stepRoot(error)) : 0.1)
        if (!(h > SHORTEST_STEP_S)) throw stuck(model, s)
      }
      if (!onStep(step)) return s
      if (counts.accepted + counts.rejected > numerics.maxSteps) throw stuck(model, s)
    }
    if (jump) h = Math.min(h, FIRST_STEP_S)
  }
  return s

  /** Rates' change with time alone, by a forward difference that stays inside the stretch. */
  function setTimeDerivative(at: number, stop: number): void {
    const delta = Math.min(1, 0.5 * (stop - at))
    rightHandSide(model, at + delta, y, ft, qt)
    counts.rightHandSides++
    for (let i = 0; i < size; i++) ft[i] = ((ft[i] as number) - (f[i] as number)) / delta
    for (let i = 0; i < layout.sums; i++) qt[i] = ((qt[i] as number) - (q[i] as number)) / delta
  }

  /** Tries a step of `tried` seconds; the new state lies in `stage`, the new integrals in `qs`. Returns the scaled error. */
  function attempt(tried: number): number {
    const perGamma = 1 / (tried * TABLEAU.gamma)
    if (!setFactors(factors, layout, jacobian, perGamma)) return Infinity
    for (let n = 0; n < stages; n++) {
      const kn = k[n] as Float64Array
      const kqn = kq[n] as Float64Array
      if (n > 0) {
        combine(stage, y, TABLEAU.a[n] as readonly number[], k, n)
        rightHandSide(model, s + (TABLEAU.alpha[n] as number) * tried, stage, kn, kqn)
        counts.rightHandSides++
      } else {
        kn.set(f)
        kqn.set(q)
      }
      const c = TABLEAU.c[n] as readonly number[]
      for (let m = 0; m < n; m++) {
        addScaled(kn, k[m] as Float64Array, (c[m] as number) / tried)
        addScaled(kqn, kq[m] as Float64Array, (c[m] as number) / tried)
      }
      const gammaN = (TABLEAU.gammas[n] as number) * tried
      if (!model.steady && gammaN !== 0) {
        addScaled(kn, ft, gammaN)
        addScaled(kqn, qt, gammaN)
      }
      solveArrow(factors, layout, jacobian, kn)
      carryIntegrals(kn, kqn, 1 / perGamma)
    }
    combine(stage, y, TABLEAU.m, k, stages)
    combine(qs, sums, TABLEAU.m, kq, stages)
    return errorOf()
  }

  /** Rows of the integrals: they feed nothing back, so their part of the linear system is a product. */
  function carryIntegrals(kn: Float64Array, kqn: Float64Array, hGamma: number): void {
    const { border, borderAt } = layout
    for (let b = 0; b < layout.blocks.length; b++) {
      const { at, size: n, sumsAt, sumsSize } = layout.blocks[b] as Block
      const { sums: rows, sumsFromBorder } = jacobian.blocks[b] as BlockJacobian
      for (let i = 0; i < sumsSize; i++) {
        let sum = kqn[sumsAt + i] as number
        for (let j = 0; j < n; j++) sum += (rows[i * n + j] as number) * (kn[at + j] as number)
        for (let j = 0; j < border; j++) {
          sum += (sumsFromBorder[i * border + j] as number) * (kn[borderAt + j] as number)
        }
        kqn[sumsAt + i] = sum * hGamma
      }
    }
  }

  function errorOf(): number {
    let worst = 0
    for (let i = 0; i < size; i++) {
      // The embedded solution differs by the last stage alone.
      const error = (k[stages - 1] as Float64Array)[i] as number
      const scale =
        (tolerance[i] as number) +
        numerics.relTol * Math.max(Math.abs(y[i] as number), Math.abs(stage[i] as number))
      const ratio = Math.abs(error) / scale
      if (ratio > worst) worst = ratio
      // A figure lost in one crate is not made good by the next.
      else if (!(ratio >= 0)) return NaN
    }
    return worst
  }

  function accept(reached: number): void {
    step.fromS = s
    step.toS = reached
    step.y0.set(y)
    step.f0.set(f)
    step.sums0.set(sums)
    step.q0.set(q)
    y.set(stage)
    sums.set(qs)
    s = reached
    counts.accepted++
    rightHandSide(model, s, y, f, q)
    counts.rightHandSides++
    // What lies inside the step is drawn from these rates.
    if (!f.every(Number.isFinite)) throw stuck(model, s)
  }
}

function combine(
  into: Float64Array,
  y: Float64Array,
  weights: readonly number[],
  k: readonly Float64Array[],
  upTo: number,
): void {
  into.set(y)
  for (let m = 0; m < upTo; m++) {
    const weight = weights[m] as number
    if (weight !== 0) addScaled(into, k[m] as Float64Array, weight)
  }
}

function addScaled(into: Float64Array, from: Float64Array, factor: number): void {
  if (factor === 0) return
  for (let i = 0; i < into.length; i++) into[i] = (into[i] as number) + factor * (from[i] as number)
}

/** Absolute tolerance of each state, in its own unit. */
export function tolerances(model: LegModel, numerics: Numerics): Float64Array {
  const { layout } = model
  const { absTolK, absTolKgM3, absTolPpm } = numerics
  const all = new Float64Array(layout.size)
  for (const block of layout.blocks) {
    all.set([absTolK, absTolK, absTolK, absTolKgM3, absTolPpm, 1e-3], block.at)
    for (const { body, at, size } of block.animals) {
      all.set([absTolK, absTolK, 1e-5 * body.massKg, 0.05], at)
      if (size > 4) all[at + 4] = 1e-4
    }
  }
  for (const { at } of layout.spaces) all.set([absTolK, absTolK, absTolKgM3, absTolPpm], at)
  return all
}

function stuck(model: LegModel, s: number): SteadfoldError {
  const minute = Math.floor(s / 60)
  return new SteadfoldError(
    'not_converged',
    `The simulation does not converge on leg "${model.leg.id}" at minute ${minute}.`,
    {
      details: { legId: model.leg.id, minute },
    },
  )
}
