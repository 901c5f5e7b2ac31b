import { count, figure, percent, withUnit } from '../format'
import { falling } from './hatch'
import { circle, line, path, rect, words } from './marks'
import type { Box, Mark, Picture } from './marks'
import { openingBoxes } from './crate-openings'
import { textWidth } from './text-width'

export type CrateFace = 'front' | 'back' | 'left' | 'right' | 'top'

export interface CrateOpening {
  face: CrateFace
  kind: 'door' | 'slats' | 'slots' | 'holes' | 'window'
  widthCm: number
  heightCm: number
  howMany: number
  sillHeightCm: number | null
  meshOpenPct: number
  blockedPct: number
}

/** A crate as typed: inside sizes, openings by face. */
export interface CrateShape {
  mark: string
  lengthCm: number
  widthCm: number
  heightCm: number
  openings: readonly CrateOpening[]
  waterContainerL: number | null
  /** Nose to rump of the longest animal inside, where it is known. */
  animalCm: number | null
}

export interface FaceShare {
  face: CrateFace
  openCm2: number
  faceCm2: number
  sharePct: number
  /** Share of the openings' own area that is blocked. */
  blockedPct: number
}

const SIDES: readonly CrateFace[] = ['left', 'front', 'right', 'back']
const FACE_WORDS: Record<CrateFace, string> = {
  left: 'Left',
  front: 'Front',
  right: 'Right',
  back: 'Back',
  top: 'Top',
}

/** Open area of a face after mesh and blocking, and its share of the face. */
export function faceShare(shape: CrateShape, face: CrateFace): FaceShare {
  const own = shape.openings.filter((opening) => opening.face === face)
  const faceCm2 = faceWidth(shape, face) * faceHeight(shape, face)
  const gross = sum(own.map((each) => each.widthCm * each.heightCm * each.howMany))
  const openCm2 = sum(
    own.map(
      (each) =>
        (each.widthCm * each.heightCm * each.howMany * each.meshOpenPct * (100 - each.blockedPct)) / 10_000,
    ),
  )
  const blocked = sum(
    own.map((each) => (each.widthCm * each.heightCm * each.howMany * each.blockedPct) / 100),
  )
  return {
    face,
    openCm2,
    faceCm2,
    sharePct: faceCm2 > 0 ? (100 * openCm2) / faceCm2 : 0,
    blockedPct: gross > 0 ? (100 * blocked) / gross : 0,
  }
}

/** The four sides together, as carriers and standards count them. */
export function sidesShare(shape: CrateShape): { openCm2: number; wallCm2: number; sharePct: number } {
  const shares = SIDES.map((face) => faceShare(shape, face))
  const openCm2 = sum(shares.map((each) => each.openCm2))
  const wallCm2 = sum(shares.map((each) => each.faceCm2))
  return { openCm2, wallCm2, sharePct: wallCm2 > 0 ? (100 * openCm2) / wallCm2 : 0 }
}

/** Four sides, floor and top to one scale from the typed figures; what is blocked is hatched in ink. */
export function crateDrawing(
  shape: CrateShape,
  { width, notes = [] }: { width: number; notes?: readonly string[] },
): Picture {
  const left = 34
  const gutter = 34
  // The width is 0 until the page was measured: nothing may then come out below nothing.
  const pxPerCm = Math.max(
    0.2,
    Math.min((width - left - gutter - 8) / (shape.lengthCm + shape.widthCm), 200 / shape.heightCm, 3),
  )
  const long = shape.lengthCm * pxPerCm
  const wide = shape.widthCm * pxPerCm
  const high = shape.heightCm * pxPerCm
  const second = left + long + gutter
  const rowTop = (index: number) => 22 + index * (high + 34)
  const floorTop = rowTop(2) + 22
  const place: [CrateFace, number, number][] = [
    ['left', left, rowTop(0)],
    ['front', second, rowTop(0)],
    ['right', left, rowTop(1)],
    ['back', second, rowTop(1)],
  ]
  const floor = { x: left, y: floorTop, width: long, height: wide }
  const top = { x: second, y: floorTop, width: wide, height: long }
  const hasTop = shape.openings.some((opening) => opening.face === 'top')
  // Notes stand beside the floor where they fit, else under it.
  const noteRoom = Math.max(...[totalWords(shape), ...notes].map((note) => textWidth(note, 'text', 13, 600)))
  const beside = !hasTop && second + noteRoom < width
  const notesX = beside ? second : left
  const notesY = beside ? floorTop + 8 : Math.max(floorTop + wide, hasTop ? floorTop + long : 0) + 24
  const marks: Mark[] = [
    ...place.flatMap(([face, x, y]) =>
      faceMarks(shape, face, { x, y, width: faceWidth(shape, face) * pxPerCm, height: high }, pxPerCm),
    ),
    ...upright(left - 12, rowTop(0), high, figure(shape.heightCm)),
    ...level(left, rowTop(1) + high + 14, long, withUnit(shape.lengthCm, 'cm')),
    ...level(second, rowTop(1) + high + 14, wide, withUnit(shape.widthCm, 'cm')),
    ...floorMarks(shape, floor, pxPerCm),
    ...(hasTop ? topMarks(shape, top, pxPerCm) : []),
    ...noteMarks(shape, notes, notesX, notesY),
  ]
  const noteFoot = notesY + (notes.length + 2) * 17
  return { width, height: Math.max(floorTop + wide, hasTop ? floorTop + long : 0, noteFoot) + 8, marks }
}

/** The drawing in a sentence. */
export function crateSummary(shape: CrateShape): string {
  const sides = SIDES.map(
    (face) => `${FACE_WORDS[face].toLowerCase()} ${percent(faceShare(shape, face).sharePct, 1)}`,
  )
  const total = sidesShare(shape)
  return `Crate ${shape.mark}, four sides and floor, to scale. Open: ${sides.join(', ')}; ${percent(total.sharePct, 1)} of the four sides.`
}

export function faceWidth(shape: CrateShape, face: CrateFace): number {
  return face === 'front' || face === 'back' ? shape.widthCm : face === 'top' ? shape.widthCm : shape.lengthCm
}

export function faceHeight(shape: CrateShape, face: CrateFace): number {
  return face === 'top' ? shape.lengthCm : shape.heightCm
}

function faceMarks(shape: CrateShape, face: CrateFace, box: Box, pxPerCm: number): Mark[] {
  const share = faceShare(shape, face)
  const name = FACE_WORDS[face]
  const open = percent(share.sharePct, 1)
  const blocked = blockedWords(share.blockedPct)
  const shown = [face === 'left' ? `${open} open` : open, blocked].filter(Boolean).join(', ')
  return [
    words(box.x, box.y - 6, name, { weight: 600 }),
    words(box.x + textWidth(name, 'text', 12, 600) + 4, box.y - 6, shown, { ink: 'mute' }),
    rect(box, { fill: 'band', stroke: 'ink', strokeWidth: 1.5 }),
    ...shape.openings
      .filter((opening) => opening.face === face)
      .flatMap((opening, index, own) =>
        openingBoxes(opening, box, pxPerCm, { index, of: own.length }).flatMap((hole) =>
          openingMarks(opening, hole),
        ),
      ),
  ]
}

/** One opening: paper, mesh where there is mesh, and its blocked part in ink from the left. */
function openingMarks(opening: CrateOpening, hole: Box): Mark[] {
  const blocked = { ...hole, width: (hole.width * opening.blockedPct) / 100 }
  return [
    rect(hole, { fill: 'sheet', stroke: 'ink', strokeWidth: opening.kind === 'door' ? 1.5 : 1 }),
    ...(opening.meshOpenPct < 100 && hole.width > 12 && hole.height > 12
      ? [path(mesh(hole), { stroke: 'rule', strokeWidth: 0.8 })]
      : []),
    ...(blocked.width > 1 ? [path(falling(blocked, 5.5), { stroke: 'ink', strokeWidth: 1 })] : []),
  ]
}

function mesh(box: Box): string {
  const step = 9
  let d = ''
  for (let x = box.x + step; x < box.x + box.width - 2; x += step)
    d += `M${px(x)} ${px(box.y)}V${px(box.y + box.height)}`
  for (let y = box.y + step; y < box.y + box.height - 2; y += step)
    d += `M${px(box.x)} ${px(y)}H${px(box.x + box.width)}`
  return d
}

function floorMarks(shape: CrateShape, box: Box, pxPerCm: number): Mark[] {
  const marks: Mark[] = [
    words(box.x, box.y - 6, 'Floor, lid off', { weight: 600 }),
    rect(box, { fill: 'sheet', stroke: 'ink', strokeWidth: 1.5 }),
  ]
  if (shape.animalCm !== null) {
    const long = Math.min(shape.animalCm * pxPerCm, box.width - 12)
    const x = box.x + (box.width - long) / 2
    marks.push(...level(x, box.y + box.height / 2, long, withUnit(shape.animalCm, 'cm')))
  }
  if (shape.waterContainerL !== null && shape.waterContainerL > 0) {
    const r = Math.min(9.5, box.height / 5)
    marks.push(
      circle(box.x + box.width - r - 6, box.y + r + 6, r, { fill: 'none', stroke: 'ink', strokeWidth: 1 }),
    )
    marks.push(
      words(
        box.x + box.width - 2 * r - 12,
        box.y + r + 10,
        `water ${withUnit(shape.waterContainerL, 'L', 1)}`,
        {
          anchor: 'end',
          ink: 'mute',
        },
      ),
    )
  }
  return marks
}

function topMarks(shape: CrateShape, box: Box, pxPerCm: number): Mark[] {
  return faceMarks(shape, 'top', box, pxPerCm)
}

function noteMarks(shape: CrateShape, notes: readonly string[], x: number, y: number): Mark[] {
  const total = sidesShare(shape)
  return [
    words(x, y, totalWords(shape), { weight: 600, size: 13 }),
    words(x, y + 17, `${count(Math.round(total.openCm2))} of ${count(Math.round(total.wallCm2))} cm²`),
    ...notes.map((note, index) => words(x, y + 34 + index * 17, note, { ink: 'mute' })),
  ]
}

function totalWords(shape: CrateShape): string {
  return `${percent(sidesShare(shape).sharePct, 1)} open on four sides`
}

function blockedWords(blockedPct: number): string {
  if (blockedPct < 0.5) return ''
  return Math.abs(blockedPct - 50) < 0.5 ? 'half blocked' : `${percent(blockedPct)} blocked`
}

/** A dimension lying, its figure in a gap of the line. */
function level(x: number, y: number, long: number, text: string): Mark[] {
  const room = textWidth(text, 'text', 12) + 10
  return [
    path(
      `M${px(x)} ${px(y)}H${px(x + long)}M${px(x)} ${px(y - 4)}V${px(y + 4)}M${px(x + long)} ${px(y - 4)}V${px(y + 4)}`,
      {
        stroke: 'ink',
        strokeWidth: 1,
      },
    ),
    rect({ x: x + (long - room) / 2, y: y - 8, width: room, height: 16 }, { fill: 'sheet' }),
    words(x + long / 2, y + 4, text, { anchor: 'middle' }),
  ]
}

function upright(x: number, y: number, long: number, text: string): Mark[] {
  const room = textWidth(text, 'text', 12) + 6
  return [
    line({ x, y }, { x, y: y + long }, { stroke: 'ink', strokeWidth: 1 }),
    line({ x: x - 4, y }, { x: x + 4, y }, { stroke: 'ink', strokeWidth: 1 }),
    line({ x: x - 4, y: y + long }, { x: x + 4, y: y + long }, { stroke: 'ink', strokeWidth: 1 }),
    rect({ x: x - room / 2, y: y + long / 2 - 9, width: room, height: 17 }, { fill: 'sheet' }),
    words(x, y + long / 2 + 4, text, { anchor: 'middle' }),
  ]
}

function sum(values: readonly number[]): number {
  return values.reduce((total, value) => total + value, 0)
}

function px(value: number): number {
  return Math.round(value * 10) / 10
}
