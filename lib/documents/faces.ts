import path from 'node:path'
import * as fontkit from 'fontkit'
import { type FaceName, PAPER_FONTS } from '@/lib/tokens'

/*
 * The files of the paper's faces, each read once in a process, and what one document may do with them.
 */

export type PaperFont = (typeof PAPER_FONTS)[number]
export type FontFile = fontkit.Font & { set: Map<string, fontkit.GlyphRun>; _glyphs: object }

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
 * The file with no memory of an earlier document. The library keeps each glyph with the letter it was first asked for, and
 * embedding a letter made of parts (i is ı and a dot) asks for the parts without a letter: in a later document ı has none
 * and is left out, “Şırnak” came out as “ırnak”.
 */
export function forNextDocument(font: PaperFont): FontFile {
  const file = fontFile(font)
  file._glyphs = {}
  file.set.clear()
  return file
}

function open(file: string): FontFile {
  const font = fontkit.openSync(fontPath({ file }))
  if (!('layout' in font) || !('_glyphs' in font))
    throw new Error(`${file} is not one font as the library keeps it.`)
  // The renderer compares all names of two faces as text at each run of letters.
  Object.defineProperty(namesOf(font), 'toJSON', { value: () => file })
  const set = new Map<string, fontkit.GlyphRun>()
  const layout = font.layout.bind(font)
  return Object.assign(font, {
    set,
    _glyphs: {},
    /** Words set before are not set again; features are copied, for the library writes all it switched on into them. */
    layout: (...[text, features, ...more]: Parameters<typeof layout>) => {
      const key = JSON.stringify([text, features, more])
      const known = set.get(key)
      if (known) return known
      const run = layout(text, Array.isArray(features) ? [...features] : features && { ...features }, ...more)
      set.set(key, run)
      return run
    },
  })
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
