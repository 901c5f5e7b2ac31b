import { Font } from '@react-pdf/renderer'
import { FACES, type FaceName, PAPER_FONTS } from '@/lib/tokens'
import { faceFile, fontPath, forNextDocument, type PaperFont } from './faces'

/*
 * The paper's faces: full TrueType files, one for each weight. Subset files put other letters in place of those they lack
 * without a word, so glyphs are asked of the very file that is drawn with.
 */

/** Makes the faces known to the renderer for one document: to be called before each. Words are never split at a line's end. */
export function registerFreshFonts(): void {
  const known = Font.getRegisteredFonts()
  for (const { family } of Object.values(FACES)) delete known[family]
  for (const font of PAPER_FONTS) {
    const { family } = FACES[font.face]
    Font.register({ family, fontWeight: font.weight, fontStyle: font.style, src: fontPath(font) })
    const source = known[family]?.sources.at(-1)
    if (source === undefined) throw new Error(`The renderer did not take ${font.file}.`)
    source.data = forNextDocument(font)
    source.loadResultPromise = Promise.resolve()
  }
  Font.registerHyphenationCallback((word) => [word])
}

/** Letters of a text that a face cannot show. Any weight of a face has the same letters, so one is asked. */
export function missingLetters(text: string, face: FaceName): string[] {
  const font = faceFile(face, face === 'head' ? 700 : 400)
  const letters = new Set([...text.normalize('NFC')])
  return [...letters].filter((letter) => {
    const point = letter.codePointAt(0) ?? 0
    return letter !== '\n' && !font.hasGlyphForCodePoint(point)
  })
}

/** Width of one line of text, in the unit of `size`. */
export function textWidth(text: string, face: FaceName, weight: PaperFont['weight'], size: number): number {
  const font = faceFile(face, weight)
  const features: Record<string, boolean> = face === 'text' ? { tnum: true } : {}
  return (font.layout(text, features).advanceWidth / font.unitsPerEm) * size
}

/** How many lines a text takes in a width, broken at spaces only. */
export function lineCount(
  text: string,
  face: FaceName,
  weight: PaperFont['weight'],
  size: number,
  width: number,
): number {
  let lines = 1
  let used = 0
  const space = textWidth(' ', face, weight, size)
  for (const word of text.split(/[ \n]+/)) {
    const wide = textWidth(word, face, weight, size)
    if (used > 0 && used + space + wide > width) {
      lines += 1
      used = wide
    } else used += (used > 0 ? space : 0) + wide
  }
  return lines
}
