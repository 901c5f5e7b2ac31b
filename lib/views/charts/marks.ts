import type { ColourName, RampName } from '@/lib/tokens'

/*
 * A picture as a list of marks: the page draws them as SVG (components/charts/marks.tsx), the paper as PDF shapes. Both get
 * the same geometry; only the inks behind the names differ. y runs downwards, units are px at the size drawn.
 */

export type ChartInk = ColourName | RampName | `${RampName}t` | 'none'
export type ChartFace = 'text' | 'fig' | 'head' | 'crate'

export interface Look {
  fill?: ChartInk
  fillOpacity?: number
  stroke?: ChartInk
  strokeWidth?: number
  strokeOpacity?: number
  dash?: readonly number[]
  roundCap?: boolean
}

export interface PathMark extends Look {
  kind: 'path'
  d: string
}

export interface RectMark extends Look {
  kind: 'rect'
  x: number
  y: number
  width: number
  height: number
}

export interface CircleMark extends Look {
  kind: 'circle'
  x: number
  y: number
  r: number
}

export interface TextMark {
  kind: 'text'
  x: number
  /** Baseline. */
  y: number
  text: string
  face: ChartFace
  size: number
  weight: 400 | 600 | 700 | 800
  ink: ChartInk
  anchor: 'start' | 'middle' | 'end'
}

export type Mark = PathMark | RectMark | CircleMark | TextMark

/** A picture with the size it was drawn for; it is never scaled, it is drawn again. */
export interface Picture {
  width: number
  height: number
  marks: Mark[]
}

export interface Box {
  x: number
  y: number
  width: number
  height: number
}

export interface Point {
  x: number
  y: number
}

export function path(d: string, look: Look): PathMark {
  return { kind: 'path', d, ...look }
}

export function rect(box: Box, look: Look): RectMark {
  return {
    kind: 'rect',
    x: coord(box.x),
    y: coord(box.y),
    width: coord(Math.max(0, box.width)),
    height: coord(Math.max(0, box.height)),
    ...look,
  }
}

export function circle(x: number, y: number, r: number, look: Look): CircleMark {
  return { kind: 'circle', x: coord(x), y: coord(y), r, ...look }
}

export function line(from: Point, to: Point, look: Look): PathMark {
  return path(`M${at(from)}L${at(to)}`, look)
}

export interface TextLook {
  face?: ChartFace
  size?: number
  weight?: TextMark['weight']
  ink?: ChartInk
  anchor?: TextMark['anchor']
}

/** Words at a baseline. 12 px text in ink, from the left, unless told otherwise. */
export function words(x: number, y: number, text: string, look: TextLook = {}): TextMark {
  return {
    kind: 'text',
    x: coord(x),
    y: coord(y),
    text,
    face: look.face ?? 'text',
    size: look.size ?? 12,
    weight: look.weight ?? (look.face === 'head' ? 700 : 400),
    ink: look.ink ?? 'ink',
    anchor: look.anchor ?? 'start',
  }
}

/** "M…L…" through points; empty for fewer than two. */
export function through(points: readonly Point[]): string {
  return points.length < 2 ? '' : `M${points.map(at).join('L')}`
}

/** Coordinates carry one decimal: a tenth of a pixel can't be seen, and two machines agree on it. */
export function coord(value: number): number {
  return Math.round(value * 10) / 10 + 0
}

export function at(point: Point): string {
  return `${coord(point.x)} ${coord(point.y)}`
}
