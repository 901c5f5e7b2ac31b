import { createHash } from 'node:crypto'

/** A request id made from what is asked, so that seeding again asks for the same and nothing happens twice. */
export function requestIdOf(...parts: readonly (string | number)[]): string {
  const hex = createHash('sha256').update(parts.join('\u0000')).digest('hex')
  return `${hex.slice(0, 8)}-${hex.slice(8, 12)}-4${hex.slice(13, 16)}-8${hex.slice(17, 20)}-${hex.slice(20, 32)}`
}
