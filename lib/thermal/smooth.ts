/*
 * Everything the solver differentiates must be smooth: these replace min, max and if.
 */

/** Quintic step, 0 below `from`, 1 above `to`, twice continuously differentiable. */
export function smoothstep(from: number, to: number, x: number): number {
  const t = (x - from) / (to - from)
  if (t <= 0) return 0
  if (t >= 1) return 1
  return t * t * t * (t * (6 * t - 15) + 10)
}

/** max(x, 0), rounded over `width`; exceeds it by at most width/2. */
export function positivePart(x: number, width: number): number {
  return 0.5 * (x + Math.sqrt(x * x + width * width))
}

/** min(a, b), rounded over `width`; falls below it by at most width/2. */
export function smoothMin(a: number, b: number, width: number): number {
  const d = a - b
  return 0.5 * (a + b - Math.sqrt(d * d + width * width))
}

/** |x|, rounded over `width`; never below width. */
export function smoothAbs(x: number, width: number): number {
  return Math.sqrt(x * x + width * width)
}
