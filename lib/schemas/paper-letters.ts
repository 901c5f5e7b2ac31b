/*
 * What the paper's fonts can show, as ranges of code points, so that a form knows it without the font files. The tests read
 * the very files: tests/documents/paper-letters.test.ts.
 */

/** Letters of the text face, hexadecimal. */
const TEXT_FACE =
  '20-7e a0-ac ae-b4 b6-107 10a-113 116-11b 11e-123 126-127 12a-12b 12e-133 136-137 139-13e 141-148 150-155 158-15b 15e-165 16a-16b 16e-17e 192 218-21b 237 2c6-2c7 2c9 2d8-2dd 300-304 306-308 30a-30c 312 326-328 394 3a9 3bc 3c0 1e80-1e85 1e9e 1ef2-1ef3 2009 2013-2014 2018-201a 201c-201e 2020-2022 2026 2030 2039-203a 2044 20ac 20b9 2113 2122 212e 2202 220f 2211-2212 2215 2219-221a 221e 222b 2248 2260 2264-2265 25ca 266a'
/** Those of them that the head face, of titles and signatures, lacks. */
const NOT_IN_HEAD_FACE = '394 3a9 3bc 2009 20b9 2113 212e 2215 2219 266a'

const textFace = ranges(TEXT_FACE)
const notInHeadFace = ranges(NOT_IN_HEAD_FACE)

/** Letters of a text that no paper can show; `title` for what stands in a title or a signature as well. */
export function lettersNotOnPaper(text: string, set: 'text' | 'title' = 'text'): string[] {
  const letters = new Set(text.normalize('NFC'))
  return [...letters].filter((letter) => {
    const point = letter.codePointAt(0) ?? 0
    if (letter === '\n') return false
    return !within(textFace, point) || (set === 'title' && within(notInHeadFace, point))
  })
}

/** The sentence that says so, with the letters by name. */
export function notOnPaperWords(text: string, letters: readonly string[]): string {
  const named = letters.map((letter) =>
    letter.trim() === '' || /\p{C}/u.test(letter) ? codePoint(letter) : `“${letter}”`,
  )
  return `“${text}” holds ${named.join(', ')}, which the paper cannot show. Write it in Latin letters, as in the passport.`
}

type CodePoints = readonly (readonly [from: number, to: number])[]

function ranges(words: string): CodePoints {
  return words.split(' ').map((word) => {
    const [from = '', to = from] = word.split('-')
    return [Number.parseInt(from, 16), Number.parseInt(to, 16)]
  })
}

function within(set: CodePoints, point: number): boolean {
  return set.some(([from, to]) => point >= from && point <= to)
}

function codePoint(letter: string): string {
  return `U+${(letter.codePointAt(0) ?? 0).toString(16).toUpperCase().padStart(4, '0')}`
}
