import type { Step } from './rosenbrock'

/*
 * Values between the ends of a step: the cubic through both values and both rates, and its slope. Heat terms are the slope of their
 * own integral's cubic, so that what is drawn adds up to what was integrated, over every step.
 */

/** `x` runs from 0 at the start of the step to 1 at its end. */
export function cubic(
  v0: number,
  v1: number,
  rate0: number,
  rate1: number,
  spanS: number,
  x: number,
): number {
  const a = rate0 * spanS
  const b = rate1 * spanS
  const d = v1 - v0
  return v0 + x * (a + x * (3 * d - 2 * a - b + x * (a + b - 2 * d)))
}

export function cubicSlope(
  v0: number,
  v1: number,
  rate0: number,
  rate1: number,
  spanS: number,
  x: number,
): number {
  const a = rate0 * spanS
  const b = rate1 * spanS
  const d = v1 - v0
  return (a + x * (2 * (3 * d - 2 * a - b) + x * 3 * (a + b - 2 * d))) / spanS
}

export function stateIn(step: Step, index: number, x: number): number {
  return cubic(
    step.y0[index] as number,
    step.y1[index] as number,
    step.f0[index] as number,
    step.f1[index] as number,
    step.toS - step.fromS,
    x,
  )
}

/** Rate of change of a state inside the step, per second. */
export function slopeIn(step: Step, index: number, x: number): number {
  return cubicSlope(
    step.y0[index] as number,
    step.y1[index] as number,
    step.f0[index] as number,
    step.f1[index] as number,
    step.toS - step.fromS,
    x,
  )
}

/** Rate of an integral (a heat term, W) inside the step. */
export function rateIn(step: Step, index: number, x: number): number {
  return cubicSlope(
    step.sums0[index] as number,
    step.sums1[index] as number,
    step.q0[index] as number,
    step.q1[index] as number,
    step.toS - step.fromS,
    x,
  )
}
