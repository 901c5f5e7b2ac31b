/*
 * Document codes: eight characters read aloud over a telephone, so without I, O, 0 and 1. 32 letters make 40 bits; the
 * verification page throttles guesses, and a code opens nothing but the state of a paper.
 */

export const CODE_ALPHABET = 'ABCDEFGHJKLMNPQRSTUVWXYZ23456789'
export const CODE_LENGTH = 8

/** A code from eight random bytes; 256 is a multiple of 32, so every letter is equally likely. */
export function documentCode(random: Uint8Array): string {
  if (random.length < CODE_LENGTH) throw new RangeError(`A document code needs ${CODE_LENGTH} random bytes.`)
  return Array.from(random.slice(0, CODE_LENGTH), (byte) => CODE_ALPHABET[byte % 32] ?? '').join('')
}

/** "R4XT96KW" as it is printed: "R4XT-96KW". */
export function printedCode(code: string): string {
  return `${code.slice(0, 4)}-${code.slice(4)}`
}

/** What somebody typed, as a code; null where it cannot be one. Spaces, dashes and case do not count. */
export function typedCode(typed: string): string | null {
  const code = typed.replace(/[\s\u2010-\u2015-]/g, '').toUpperCase()
  const known = [...code].every((letter) => CODE_ALPHABET.includes(letter))
  return code.length === CODE_LENGTH && known ? code : null
}
