import { readFileSync } from 'node:fs'
import path from 'node:path'
import { fileURLToPath } from 'node:url'

const folder = path.dirname(fileURLToPath(import.meta.url))

/** Rows of a table in this folder: numbers where every row of a column is one, else words. */
export function readTable<T extends Record<string, string | number>>(name: string): T[] {
  const [head = '', ...lines] = readFileSync(path.join(folder, `${name}.csv`), 'utf8')
    .trim()
    .split('\n')
  const columns = head.split(',')
  return lines.map((line) => {
    const cells = line.split(',')
    if (cells.length !== columns.length) throw new Error(`${name}.csv: "${line}" has ${cells.length} cells.`)
    return Object.fromEntries(
      columns.map((column, i) => {
        const cell = cells[i] ?? ''
        return [column, cell !== '' && Number.isFinite(Number(cell)) ? Number(cell) : cell]
      }),
    ) as T
  })
}
