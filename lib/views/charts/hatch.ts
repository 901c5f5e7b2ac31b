import type { SurroundingsPattern } from '../sheet'
import { coord, path, rect } from './marks'
import type { Box, Mark, PathMark } from './marks'

export interface HatchOptions {
  /** 1 on a screen, 0.8 on paper. */
  scale?: number
}

/**
 * The wall of one leg: its surroundings' pattern as real lines cut at the box's edge. Lines are counted from the picture's
 * origin, not from the box, so that neighbours of one kind run on; an SVG pattern would come out of a PDF blurred.
 */
export function hatch(pattern: SurroundingsPattern, box: Box, { scale = 1 }: HatchOptions = {}): PathMark {
  const dots = pattern === 'ramp'
  return path(DRAW[pattern](box, scale), {
    fill: 'none',
    stroke: 'rule',
    strokeWidth: dots ? 2.4 * scale : scale < 1 ? 0.8 : 1,
    roundCap: dots || undefined,
  })
}

/** Band, hatching and, where asked, a frame: the small window on a leg's surroundings. */
export function swatch(pattern: SurroundingsPattern, box: Box, options: HatchOptions = {}): Mark[] {
  return [
    rect(box, { fill: 'band' }),
    hatch(pattern, box, options),
    rect(
      { x: box.x + 0.5, y: box.y + 0.5, width: box.width - 1, height: box.height - 1 },
      { fill: 'none', stroke: 'ink', strokeWidth: 1 },
    ),
  ]
}

const STEP = {
  van: 7,
  board: 5.5,
  joint: 46,
  dot: 8,
  rib: 5,
  cross: 9,
  wave: 6,
  sleeper: 6,
  rail: 9,
  straw: 6,
}

const DRAW: Record<SurroundingsPattern, (box: Box, scale: number) => string> = {
  van: (box, scale) => falling(box, STEP.van * scale),
  customs: (box, scale) => falling(box, STEP.cross * scale) + rising(box, STEP.cross * scale),
  hold: (box, scale) =>
    multiples(box.x, box.x + box.width, STEP.rib * scale)
      .map((x) => `M${coord(x)} ${coord(box.y)}V${coord(box.y + box.height)}`)
      .join(''),
  shed: boards,
  ramp: dots,
  sea: waves,
  rail: rails,
  rest: straws,
}

/** Lines x + y = k · step, cut by the box: the van's pattern, and what is blocked in a crate. */
export function falling(box: Box, step: number): string {
  const right = box.x + box.width
  const foot = box.y + box.height
  return multiples(box.x + box.y, right + foot, step)
    .map((sum) =>
      segment(
        Math.min(right, sum - box.y),
        Math.max(box.y, sum - right),
        Math.max(box.x, sum - foot),
        Math.min(foot, sum - box.x),
      ),
    )
    .join('')
}

/** x − y = k · step. */
function rising(box: Box, step: number): string {
  const right = box.x + box.width
  const foot = box.y + box.height
  return multiples(box.x - foot, right - box.y, step)
    .map((gap) =>
      segment(
        Math.max(box.x, gap + box.y),
        Math.max(box.y, box.x - gap),
        Math.min(right, gap + foot),
        Math.min(foot, right - gap),
      ),
    )
    .join('')
}

/** Long boards: a joint every 46, offset by half a board from row to row. */
function boards(box: Box, scale: number): string {
  const step = STEP.board * scale
  const joint = STEP.joint * scale
  const right = box.x + box.width
  const foot = box.y + box.height
  const courses = multiples(box.y, foot, step).map((y) => `M${coord(box.x)} ${coord(y)}H${coord(right)}`)
  const joints = multiples(box.y - step, foot, step).flatMap((y) => {
    const offset = Math.round(y / step) % 2 === 0 ? 0 : joint / 2
    const from = Math.max(box.y, y)
    const to = Math.min(foot, y + step)
    if (to - from < 0.05) return []
    return multiples(box.x - offset, right - offset, joint)
      .filter((x) => x + offset > box.x && x + offset < right)
      .map((x) => `M${coord(x + offset)} ${coord(from)}V${coord(to)}`)
  })
  return courses.join('') + joints.join('')
}

/** Dots no nearer the edge than their own radius: a cut dot reads as a dash. */
function dots(box: Box, scale: number): string {
  const step = STEP.dot * scale
  const rim = 1.5 * scale
  return multiples(box.y + rim, box.y + box.height - rim, step / 2)
    .flatMap((y) => {
      const offset = Math.round((y / step) * 2) % 2 === 0 ? 0 : step / 2
      return multiples(box.x + rim - offset, box.x + box.width - rim - offset, step).map(
        (x) => `M${coord(x + offset)} ${coord(y)}h.01`,
      )
    })
    .join('')
}

function waves(box: Box, scale: number): string {
  const step = STEP.wave * scale
  const rise = 2 * scale
  return multiples(box.y - rise, box.y + box.height + rise, step * 1.25)
    .flatMap((y) =>
      multiples(box.x - step, box.x + box.width + step, step).map((x) => {
        const up = Math.round(x / step) % 2 === 0
        return clipped(box, x, y + (up ? rise : -rise), x + step, y + (up ? -rise : rise))
      }),
    )
    .join('')
}

function rails(box: Box, scale: number): string {
  const step = STEP.rail * scale
  const half = 2.5 * scale
  const lines = multiples(box.y, box.y + box.height, step).map(
    (y) => `M${coord(box.x)} ${coord(y)}H${coord(box.x + box.width)}`,
  )
  const sleepers = multiples(box.y - half, box.y + box.height + half, step).flatMap((y) =>
    multiples(box.x, box.x + box.width, STEP.sleeper * scale).map((x) =>
      clipped(box, x, y - half, x, y + half),
    ),
  )
  return lines.join('') + sleepers.join('')
}

function straws(box: Box, scale: number): string {
  const step = STEP.straw * scale
  return multiples(box.y, box.y + box.height, step)
    .flatMap((y) => {
      const offset = Math.round(y / step) % 2 === 0 ? 0 : step * 1.5
      return multiples(box.x - step * 3, box.x + box.width, step * 3).map((x) =>
        clipped(box, x + offset, y, x + offset + step, y),
      )
    })
    .join('')
}

/** Multiples of a step inside [from, to]. */
function multiples(from: number, to: number, step: number): number[] {
  const first = Math.ceil(from / step - 1e-9)
  const last = Math.floor(to / step + 1e-9)
  return last < first ? [] : Array.from({ length: last - first + 1 }, (_, index) => (first + index) * step)
}

function segment(x1: number, y1: number, x2: number, y2: number): string {
  return Math.abs(x1 - x2) + Math.abs(y1 - y2) < 0.2
    ? ''
    : `M${coord(x1)} ${coord(y1)}L${coord(x2)} ${coord(y2)}`
}

/** The part of a segment inside the box (Liang and Barsky's parametric clipping, 1984). */
function clipped(box: Box, x1: number, y1: number, x2: number, y2: number): string {
  let from = 0
  let to = 1
  const edges: [number, number][] = [
    [x1 - x2, x1 - box.x],
    [x2 - x1, box.x + box.width - x1],
    [y1 - y2, y1 - box.y],
    [y2 - y1, box.y + box.height - y1],
  ]
  for (const [towards, room] of edges) {
    if (towards === 0) {
      if (room < 0) return ''
      continue
    }
    const share = room / towards
    if (towards < 0) from = Math.max(from, share)
    else to = Math.min(to, share)
  }
  if (from >= to) return ''
  return segment(x1 + from * (x2 - x1), y1 + from * (y2 - y1), x1 + to * (x2 - x1), y1 + to * (y2 - y1))
}
