import { describe, expect, it } from 'vitest'
import { cbrt, cos, exp, ln, pow, sin } from '@/lib/thermal/elementary'

/** Distance in units of the last place of the larger value. */
function ulps(a: number, b: number): number {
  if (a === b) return 0
  const size = Math.max(Math.abs(a), Math.abs(b))
  return Math.abs(a - b) / (2 ** Math.floor(Math.log2(size)) * 2 ** -52)
}

const spread = (from: number, to: number) =>
  Array.from({ length: 4001 }, (_, i) => from + ((to - from) * i) / 4000)

describe('elementary functions', () => {
  it.each([
    ['exp', exp, Math.exp, spread(-60, 60)],
    ['ln', ln, Math.log, spread(1e-6, 4000)],
    ['cbrt', cbrt, Math.cbrt, spread(-3000, 3000)],
    ['sin', sin, Math.sin, spread(-50, 50)],
    ['cos', cos, Math.cos, spread(-50, 50)],
    ['pow 0.6', (x: number) => pow(x, 0.6), (x: number) => Math.pow(x, 0.6), spread(1e-3, 1e5)],
  ])('%s stays within 2 units of the last place of the engine’s own', (_name, ours, engine, points) => {
    const worst = Math.max(...points.map((x) => ulps(ours(x), engine(x))))
    expect(worst).toBeLessThanOrEqual(2)
  })

  it('gives what every table prints', () => {
    expect(ulps(exp(1), 2.718281828459045)).toBeLessThanOrEqual(1)
    expect(ulps(ln(10), 2.302585092994046)).toBeLessThanOrEqual(1)
    expect(cbrt(27)).toBe(3)
    expect(pow(2, 10)).toBe(1024)
    expect(sin(0)).toBe(0)
    expect(cos(0)).toBe(1)
  })
})
