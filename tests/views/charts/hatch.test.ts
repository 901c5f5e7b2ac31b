import fc from 'fast-check'
import { describe, expect, it } from 'vitest'
import { hatch } from '@/lib/views/charts/hatch'
import type { Box } from '@/lib/views/charts/marks'
import type { SurroundingsPattern } from '@/lib/views/sheet'

const PATTERNS: SurroundingsPattern[] = ['van', 'shed', 'ramp', 'hold', 'customs', 'sea', 'rail', 'rest']
const boxes = fc.record({
  x: fc.integer({ min: 0, max: 900 }),
  y: fc.integer({ min: 0, max: 600 }),
  width: fc.integer({ min: 12, max: 240 }),
  height: fc.integer({ min: 12, max: 160 }),
})

describe('walls of surroundings', () => {
  it.each(PATTERNS)('%s: every line ends inside its box', (pattern) => {
    fc.assert(
      fc.property(boxes, (box) => {
        const lines = segments(hatch(pattern, box).d)
        expect(lines.length).toBeGreaterThan(0)
        const outside = lines.filter(
          ([x1, y1, x2, y2]) =>
            ![x1, x2].every((x) => between(x, box.x, box.x + box.width)) ||
            ![y1, y2].every((y) => between(y, box.y, box.y + box.height)),
        )
        expect(outside).toEqual([])
      }),
      { numRuns: 60 },
    )
  })

  it.each(['van', 'customs', 'hold', 'ramp'] as const)(
    '%s: neighbours run on, because lines count from the picture',
    (pattern) => {
      fc.assert(
        fc.property(boxes, fc.integer({ min: 5, max: 100 }), (box, shift) => {
          const keys = new Set(family(pattern, box))
          const beside = family(pattern, { ...box, x: box.x + shift })
          const whole = new Set(family(pattern, { ...box, width: box.width + shift }))
          expect([...keys, ...beside].filter((key) => !whole.has(key))).toEqual([])
        }),
        { numRuns: 60 },
      )
    },
  )

  it('differ from one another', () => {
    const box = { x: 0, y: 0, width: 96, height: 60 }
    expect(new Set(PATTERNS.map((pattern) => hatch(pattern, box).d)).size).toBe(PATTERNS.length)
  })

  it('are finer on paper', () => {
    const box = { x: 0, y: 0, width: 100, height: 100 }
    expect(segments(hatch('hold', box, { scale: 0.8 }).d).length).toBeGreaterThan(
      segments(hatch('hold', box).d).length,
    )
  })
})

/** What names a line whatever its length: x + y, x − y, x, or a dot's own place. */
function family(pattern: 'van' | 'customs' | 'hold' | 'ramp', box: Box): string[] {
  return segments(hatch(pattern, box).d).map(([x1, y1, x2, y2]) => {
    if (pattern === 'hold') return `x${round(x1)}`
    if (pattern === 'ramp') return `dot${round(x1)},${round(y1)}`
    return (x2 - x1) * (y2 - y1) < 0 ? `sum${round(x1 + y1)}` : `gap${round(x1 - y1)}`
  })
}

function segments(d: string): [number, number, number, number][] {
  return [
    ...d.matchAll(/M(-?[\d.]+) (-?[\d.]+)(?:L(-?[\d.]+) (-?[\d.]+)|H(-?[\d.]+)|V(-?[\d.]+)|h\.01)/g),
  ].map((match) => {
    const [x1, y1, lx, ly, h, v] = match
      .slice(1)
      .map((part) => (part === undefined ? undefined : Number(part)))
    return [x1 ?? 0, y1 ?? 0, lx ?? h ?? x1 ?? 0, ly ?? v ?? y1 ?? 0]
  })
}

function between(value: number, low: number, high: number): boolean {
  return value >= low - 0.06 && value <= high + 0.06
}

function round(value: number): number {
  return Math.round(value)
}
