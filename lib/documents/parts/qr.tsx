import QRCode from 'qrcode'
import { path, type Picture, rect } from '@/lib/views/charts/marks'

/** Clear modules drawn round the square; the page keeps two more free. */
const QUIET = 2

/** The modules of a QR code at error correction M, row by row; true is ink. */
export function qrModules(text: string): boolean[][] {
  const { modules } = QRCode.create(text, { errorCorrectionLevel: 'M' })
  return Array.from({ length: modules.size }, (_, row) =>
    Array.from({ length: modules.size }, (_unused, column) => modules.get(row, column) === 1),
  )
}

/** A QR code as one path of whole modules, so that no hairline opens between them. */
export function qrPicture(text: string, size: number): Picture {
  const modules = qrModules(text)
  const unit = size / (modules.length + 2 * QUIET)
  const d = modules
    .flatMap((row, y) =>
      runsOf(row).map(
        ([from, length]) =>
          `M${at(from, unit)} ${at(y, unit)}h${round(length * unit)}v${round(unit)}h${round(-length * unit)}z`,
      ),
    )
    .join('')
  return {
    width: size,
    height: size,
    marks: [rect({ x: 0, y: 0, width: size, height: size }, { fill: 'sheet' }), path(d, { fill: 'ink' })],
  }
}

/** Stretches of ink in a row: where each begins and how long it is. */
function runsOf(row: boolean[]): [number, number][] {
  const runs: [number, number][] = []
  row.forEach((inked, index) => {
    if (!inked) return
    const last = runs.at(-1)
    if (last && last[0] + last[1] === index) last[1] += 1
    else runs.push([index, 1])
  })
  return runs
}

function at(module: number, unit: number): number {
  return round((module + QUIET) * unit)
}

function round(value: number): number {
  return Math.round(value * 1000) / 1000
}
