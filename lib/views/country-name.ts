const NAMES = new Intl.DisplayNames(['en-GB'], { type: 'region' })

/** "United Kingdom" of "GB"; what is no code stands as it is. */
export function countryName(code: string): string {
  return /^[A-Z]{2}$/.test(code) ? (NAMES.of(code) ?? code) : code
}
