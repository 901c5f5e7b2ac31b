/** Figures as findings spell them: one decimal, a true minus sign, the unit. Rounding here is for eyes only. */
export function degrees(tempC: number): string {
  return `${signed(tempC, 1)} °C`
}

export function fahrenheit(tempF: number): string {
  return `${signed(tempF, 1)} °F`
}

export function percent(value: number): string {
  return `${signed(value, 0)} %`
}

export function minutes(value: number): string {
  return `${signed(value, 0)} min`
}

export function signed(value: number, decimals: number): string {
  const text = value.toFixed(decimals)
  const bare = text.startsWith('-') ? text.slice(1) : text
  return text.startsWith('-') && Number(bare) !== 0 ? `−${bare}` : bare
}

/** "A", "A and B", "A, B and C". */
export function list(names: readonly string[]): string {
  const last = names.at(-1) ?? ''
  return names.length < 2 ? last : `${names.slice(0, -1).join(', ')} and ${last}`
}

/** Words for a schedule: "on time", "all typical delays", "worst delay of leg ramp-1". */
export function scheduleWords(scheduleId: string): string {
  if (scheduleId === 'on-time') return 'on time'
  if (scheduleId === 'typical') return 'all typical delays'
  return `worst delay of leg ${scheduleId.slice('worst:'.length)}`
}

/** Code-point order: the same in every engine and locale. */
export function compare(a: string, b: string): number {
  return a < b ? -1 : a > b ? 1 : 0
}
