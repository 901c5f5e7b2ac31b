import path from 'node:path'
import { Font } from '@react-pdf/renderer'
import * as fontkit from 'fontkit'
import { FACES, type FaceName, PAPER_FONTS } from '@/lib/tokens'

/*
 * The paper's faces: full TrueType files, one for each weight. Subset files put other letters in place of those they lack
 * without a word, so glyphs are asked of the very file that is drawn with.
 */

type Weight = (typeof PAPER_FONTS)[number]['weight']
type FontFile = ReturnType<typeof open>

const shared = globalThis as { steadfoldPaperFonts?: Map<string, FontFile> }

/**
 * Makes the faces known to the renderer, opened anew: to be called before each document. Embedding a letter made of parts
 * (i is ı and a dot) leaves the parts in the font's cache without a character of their own, and every later document of
 * the process then drops its ı: “Şırnak” came out as “ırnak”. Words are never split at a line's end.
 */
export function registerFreshFonts(): void {
  const known = Font.getRegisteredFonts()
  for (const { family } of Object.values(FACES)) delete known[family]
  for (const { face, weight, style, file } of PAPER_FONTS) {
    Font.register({ family: FACES[face].family, fontWeight: weight, fontStyle: style, src: fontPath(file) })
  }
  Font.registerHyphenationCallback((word) => [word])
}

/** Letters of a text that a face cannot show. Any weight of a face has the same letters, so one is asked. */
export function missingLetters(text: string, face: FaceName): string[] {
  const font = fontOf(face, face === 'head' ? 700 : 400)
  const letters = new Set([...text.normalize('NFC')])
  return [...letters].filter((letter) => {
    const point = letter.codePointAt(0) ?? 0
    return letter !== '\n' && !font.hasGlyphForCodePoint(point)
  })
}

/** Width of one line of text, in the unit of `size`. */
export function textWidth(text: string, face: FaceName, weight: Weight, size: number): number {
  const font = fontOf(face, weight)
  const features: Record<string, boolean> = face === 'text' ? { tnum: true } : {}
  return (font.layout(text, features).advanceWidth / font.unitsPerEm) * size
}

/** How many lines a text takes in a width, broken at spaces only. */
export function lineCount(text: string, face: FaceName, weight: Weight, size: number, width: number): number {
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

function fontOf(face: FaceName, weight: Weight): FontFile {
  const found = PAPER_FONTS.find(
    (font) => font.face === face && font.weight === weight && font.style === 'normal',
  )
  if (!found) throw new Error(`There is no paper font for ${face} ${weight}.`)
  const fonts = (shared.steadfoldPaperFonts ??= new Map())
  const known = fonts.get(found.file)
  if (known) return known
  const font = open(found.file)
  fonts.set(found.file, font)
  return font
}

function open(file: string) {
  const font = fontkit.openSync(fontPath(file))
  if (!('layout' in font)) throw new Error(`${file} is a collection, not one font.`)
  return font
}

function fontPath(file: string): string {
  return path.join(process.cwd(), 'fonts', 'pdf', file)
}
