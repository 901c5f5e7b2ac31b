import { expect, it } from 'vitest'
import { missingLetters } from '@/lib/documents/fonts'
import { lettersNotOnPaper } from '@/lib/schemas/paper-letters'

/** Every code point of the first two planes that is a letter by itself. */
const LETTERS = Array.from({ length: 0x20000 }, (_, point) => point)
  .filter((point) => (point < 0xd800 || point > 0xdfff) && (point & 0xffff) < 0xfffe)
  .map((point) => String.fromCodePoint(point))

it('the list of letters a form knows is that of the font files, letter for letter', () => {
  const text = missingLetters(LETTERS.join(''), 'text')
  expect(text.length).toBeGreaterThan(100_000)
  expect(lettersNotOnPaper(LETTERS.join(''))).toEqual(text)

  const title = new Set([...text, ...missingLetters(LETTERS.join(''), 'head')])
  expect(new Set(lettersNotOnPaper(LETTERS.join(''), 'title'))).toEqual(title)
})
