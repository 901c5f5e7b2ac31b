/**
 * What people type for a figure: decimal point or comma, true minus or hyphen, spaces between groups. Empty is null; what
 * can't be read comes back as typed, so that the schema's message can name it.
 */
export function parseFigure(typed: unknown): number | null | string {
  if (typeof typed === 'number') return typed
  if (typed === null || typed === undefined) return null
  const text = String(typed)
  const plain = text
    .replace(/[\s\u00a0\u202f]/g, '')
    .replace(/[\u2212\u2013]/, '-')
    .replace(',', '.')
  if (plain === '') return null
  return /^[+-]?(\d+\.?\d*|\.\d+)$/.test(plain) ? Number(plain) : text
}

/** A figure as a field shows it: no grouping, decimal point, at most `decimals`. */
export function figureText(value: unknown, decimals = 6): string {
  if (typeof value !== 'number' || !Number.isFinite(value)) return typeof value === 'string' ? value : ''
  return String(Number(value.toFixed(decimals))).replace('-', '\u2212')
}
