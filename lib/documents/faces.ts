import path from 'node:path'
import * as fontkit from 'fontkit'
import { type FaceName, PAPER_FONTS } from '@/lib/tokens'

/*
 * The files of the paper's faces, each read once in a process, and what one document may do with them.
 */

export type PaperFont = (typeof PAPER_FONTS)[number]
export type FontFile = ReturnType<typeof open>

const shared = globalThis as { steadfoldPaperFonts?: Map<string, FontFile> }

/** The face in upright letters, as its file has it. */
export function faceFile(face: FaceName, weight: PaperFont['weight']): FontFile {
  const found = PAPER_FONTS.find(
    (font) => font.face === face && font.weight === weight && font.style === 'normal',
  )
  if (!found) throw new Error(`There is no paper font for ${face} ${weight}.`)
  return fontFile(found)
}

/** A face's file, parsed once. */
export function fontFile({ file }: PaperFont): FontFile {
  const fonts = (shared.steadfoldPaperFonts ??= new Map())
  const known = fonts.get(file)
  if (known) return known
  const font = open(file)
  fonts.set(file, font)
  return font
}

export function fontPath({ file }: Pick<PaperFont, 'file'>): string {
  return path.join(process.cwd(), 'fonts', 'pdf', file)
}

/**
 * A face for one document: the file's tables, with glyphs of its own. The library keeps each glyph with the letter it was
 * first asked for, and embedding a letter made of parts (i is ı and a dot) asks for the parts without a letter: in a later
 * document ı has none and is left out, “Şırnak” came out as “ırnak”.
 *
 * Words set before in the document are not set again, and the caller's features are copied: the library writes all it
 * has switched on into them, and the next words would ask for that.
 */
export function forOneDocument(file: FontFile): FontFile {
  if (!('_glyphs' in file)) throw new Error('The font library keeps its glyphs elsewhere than it did.')
  const face = Object.create(file, { _glyphs: { value: {} } }) as FontFile
  const set = new Map<string, ReturnType<FontFile['layout']>>()
  face.layout = (text, features, ...more) => {
    const key = JSON.stringify([text, features, more])
    const known = set.get(key)
    if (known) return known
    const own = Array.isArray(features) ? [...features] : features && { ...features }
    const run = file.layout.call(face, text, own, ...more)
    set.set(key, run)
    return run
  }
  return face
}

function open(file: string) {
  const font = fontkit.openSync(fontPath({ file }))
  if (!('layout' in font)) throw new Error(`${file} is a collection, not one font.`)
  // The renderer compares all names of two faces as text at each run of letters.
  Object.defineProperty(namesOf(font), 'toJSON', { value: () => file })
  return font
}

function namesOf(font: object): object {
  const records =
    'name' in font &&
    typeof font.name === 'object' &&
    font.name &&
    'records' in font.name &&
    font.name.records
  if (typeof records !== 'object' || records === null) throw new Error('A paper font has no names.')
  return records
}
