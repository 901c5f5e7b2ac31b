import { xAt, yInside } from './frame'
import type { TempFrame, TimeFrame } from './frame'
import { hiding, overlap } from './labels'
import type { Placed } from './labels'
import { circle, line, rect, words } from './marks'
import type { Box, Mark, Point } from './marks'
import { textWidth } from './text-width'
import type { Callout, Track } from './types'

/** Freight labels pasted on the wall, each with a leader to its point; three at most. */
export function calloutMarks(
  time: TimeFrame,
  temp: TempFrame,
  callouts: readonly Callout[],
  taken: Box[],
  tracks: readonly Track[] = [],
  lineYs: readonly number[] = [],
  critical?: { lowC: number; highC: number },
): Placed {
  const placed: Placed = { marks: [], taken: [] }
  const leaders: [Point, Point][] = []
  for (const callout of [...callouts].slice(0, 3).sort((a, b) => a.minute - b.minute)) {
    const point = { x: xAt(time, callout.minute), y: yInside(temp, callout.tempC) }
    const size = calloutSize(callout)
    const hides = (spot: Box) =>
      hiding(time, temp, spot, tracks, lineYs, critical) +
      (taken.some((other) => strikes(edgeOf(spot, point), point, other)) ? 150 : 0) +
      (leaders.some(([from, to]) => crosses(from, to, edgeOf(spot, point), point)) ? 400 : 0)
    const box = freeSpot(time, temp, point, size, [...taken, ...placed.taken], hides)
    if (!box) continue
    placed.taken.push(box)
    leaders.push([edgeOf(box, point), point])
    placed.marks.push(...leader(box, point), ...calloutBox(callout, box, size.block))
    placed.marks.push(circle(point.x, point.y, 4.5, { fill: 'sheet', stroke: 'ink', strokeWidth: 1.5 }))
  }
  return placed
}

function calloutSize(callout: Callout): { width: number; height: number; block: number } {
  const head = callout.verdict === 'no-go' ? 'NO-GO' : 'GO WITH CONDITIONS'
  const block = Math.max(84, textWidth(head, 'head', 13, 800) * 1.05 + 20)
  const lines = Math.max(textWidth(callout.title, 'text', 12, 600), textWidth(callout.text, 'text', 12))
  return { width: block + lines + 22, height: 46, block }
}

function calloutBox(callout: Callout, box: Box, block: number): Mark[] {
  const solid = callout.verdict === 'no-go'
  const ink = solid ? 'on-ink' : 'ink'
  const middle = box.x + block / 2
  return [
    rect(box, {
      fill: 'sheet',
      stroke: 'ink',
      strokeWidth: solid ? 1.5 : 2,
      dash: solid ? undefined : [6, 4],
    }),
    ...(solid ? [rect({ ...box, width: block }, { fill: 'ink' })] : []),
    words(middle, box.y + 20, solid ? 'NO-GO' : 'GO WITH CONDITIONS', {
      face: 'head',
      size: 13,
      weight: 800,
      ink,
      anchor: 'middle',
    }),
    words(middle, box.y + 37, callout.figure, { face: 'fig', size: 13, ink, anchor: 'middle' }),
    words(box.x + block + 10, box.y + 19, callout.title, { weight: 600 }),
    words(box.x + block + 10, box.y + 36, callout.text),
  ]
}

/** From the box's nearest edge to the point, over a paper halo. */
function leader(box: Box, point: Point): Mark[] {
  const from = edgeOf(box, point)
  return [
    line(from, point, { stroke: 'sheet', strokeWidth: 5 }),
    line(from, point, { stroke: 'ink', strokeWidth: 1.5 }),
  ]
}

function edgeOf(box: Box, point: Point): Point {
  return {
    x: Math.min(box.x + box.width, Math.max(box.x, point.x)),
    y: Math.min(box.y + box.height, Math.max(box.y, point.y)),
  }
}

function crosses(a: Point, b: Point, c: Point, d: Point): boolean {
  const turn = (p: Point, q: Point, r: Point) =>
    Math.sign((q.x - p.x) * (r.y - p.y) - (q.y - p.y) * (r.x - p.x))
  return turn(a, b, c) !== turn(a, b, d) && turn(c, d, a) !== turn(c, d, b)
}

/** True where a leader would run through a label. */
function strikes(from: Point, to: Point, box: Box): boolean {
  return [0.2, 0.4, 0.6, 0.8].some((share) => {
    const x = from.x + share * (to.x - from.x)
    const y = from.y + share * (to.y - from.y)
    return x > box.x && x < box.x + box.width && y > box.y && y < box.y + box.height
  })
}

/** The free spot nearest the point: along the top and the foot of the picture, then anywhere. */
function freeSpot(
  time: TimeFrame,
  temp: TempFrame,
  point: Point,
  { width, height }: { width: number; height: number },
  taken: readonly Box[],
  hides: (box: Box) => number,
): Box | null {
  const rows = [temp.top + 8, temp.foot - height - 8]
  for (let y = temp.top + 8; y <= temp.foot - height - 8; y += 14) rows.push(y)
  let best: { box: Box; cost: number } | null = null
  for (const y of rows) {
    for (let x = time.x0 + 8; x + width <= time.x1 - 8; x += 16) {
      const box = { x, y, width, height }
      const gapX = Math.max(x - point.x, point.x - x - width, 0)
      const gapY = Math.max(y - point.y, point.y - y - height, 0)
      if (gapX + gapY < 14 || taken.some((other) => overlap(box, other))) continue
      const cost = Math.abs(gapX - 46) + Math.abs(gapY - 20) + hides(box)
      if (!best || cost < best.cost) best = { box, cost }
    }
  }
  return best?.box ?? null
}
