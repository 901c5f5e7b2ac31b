import type { CrateOpening } from './crate'
import type { Box } from './marks'

/**
 * Where the openings of one row of the form stand on their face. Sizes and sill are as typed; how they are spread is not
 * typed, so they are spread evenly: side by side as far as they fit, then in rows. Several rows of the form share the
 * face's height from the top down, unless a sill says where they stand.
 */
export function openingBoxes(
  opening: CrateOpening,
  face: Box,
  pxPerCm: number,
  { index, of }: { index: number; of: number },
): Box[] {
  const width = Math.min(opening.widthCm * pxPerCm, face.width)
  const height = Math.min(opening.heightCm * pxPerCm, face.height)
  const most = Math.max(1, Math.min(opening.howMany, Math.floor((face.width * 0.94) / (width * 1.12))))
  const rows = Math.ceil(opening.howMany / most)
  const columns = Math.ceil(opening.howMany / rows)
  const room = roomFor(opening, face, pxPerCm, { index, of })
  const gapX = (face.width - columns * width) / (columns + 1)
  const gapY = Math.max(0, (room.height - rows * height) / (rows + (room.fromSill ? 0 : 1)))
  return Array.from({ length: opening.howMany }, (_, number) => {
    const row = Math.floor(number / columns)
    const inRow = Math.min(columns, opening.howMany - row * columns)
    const column = number % columns
    const indent = ((columns - inRow) * (width + gapX)) / 2
    const y = room.fromSill
      ? room.foot - height - row * (height + gapY)
      : room.top + gapY + row * (height + gapY)
    return { x: face.x + indent + gapX + column * (width + gapX), y: Math.max(face.y, y), width, height }
  })
}

function roomFor(
  opening: CrateOpening,
  face: Box,
  pxPerCm: number,
  { index, of }: { index: number; of: number },
): { top: number; foot: number; height: number; fromSill: boolean } {
  if (opening.sillHeightCm !== null && opening.face !== 'top') {
    const foot = face.y + face.height - opening.sillHeightCm * pxPerCm
    return { top: face.y, foot, height: foot - face.y, fromSill: true }
  }
  const height = face.height / of
  const top = face.y + index * height
  return { top, foot: top + height, height, fromSill: false }
}
