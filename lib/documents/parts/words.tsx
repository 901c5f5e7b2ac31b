import { Text } from '@react-pdf/renderer'
import type { Style } from '@react-pdf/stylesheet'
import type { ReactNode } from 'react'
import { COLOURS, FACES, type FaceName } from '@/lib/tokens'

/** Black on white; violet is left to signatures. */
export const INK = COLOURS.paper

/** Paper is designed in CSS pixels of 1/96 inch; the renderer counts points. */
export const px = (pixels: number): number => pixels * 0.75

export interface WordsProps {
  size?: number
  line?: number
  weight?: 400 | 600 | 700 | 800
  face?: FaceName
  style?: Style
  children: ReactNode
}

/** Height of a line of each face by its own metrics (ascent and descent of the files in fonts/pdf), in em. */
const FACE_HEIGHT: Record<FaceName, number> = { head: 1.2, text: 1.3, fig: 1.3, crate: 1.574 }

/**
 * Text in one of the four faces, sizes in pixels. Figures of the text face are set to one width. The renderer hangs a line
 * from its top, and drops lines that don't fit: a text never shrinks, and it is moved so that the line stands in the middle of its height, as on a page.
 */
export function Words({ size = 11, line, weight = 400, face = 'text', style = {}, children }: WordsProps) {
  const high = line ?? Math.round(size * 1.25)
  const top = px((high - FACE_HEIGHT[face] * size) / 2)
  return (
    <Text style={{ ...typeset(size, high, weight, face), top, flexShrink: 0, ...style }}>{children}</Text>
  )
}

/** The same as a style, for text inside text. */
export function typeset(size: number, line: number, weight: 400 | 600 | 700 | 800, face: FaceName): Style {
  return {
    fontFamily: FACES[face].family,
    fontSize: px(size),
    fontWeight: weight,
    lineHeight: line / size,
    ...(face === 'text' ? { fontFeatureSettings: { tnum: 1 } as never } : {}),
  }
}

/** Bold words inside a sentence. */
export function Bold({ children, weight = 600 }: { children: ReactNode; weight?: 600 | 700 }) {
  return <Text style={{ fontWeight: weight }}>{children}</Text>
}

/** A figure with its unit in the mono face; the space is drawn narrow, so that "39.4 °C" holds together. */
export function Figure({
  children,
  size,
  line,
  weight = 400,
  tight = 0.28,
  style = {},
}: Omit<WordsProps, 'children' | 'face'> & { children: string; tight?: number }) {
  const parts = children.split(/[ \u00a0]/)
  const narrow = { letterSpacing: -px((size ?? 11) * tight) }
  return (
    <Words
      size={size ?? 11}
      weight={weight}
      face="fig"
      style={style}
      {...(line === undefined ? {} : { line })}
    >
      {parts.map((part, index) => [
        index > 0 ? (
          <Text key={index} style={narrow}>
            {'\u00a0'}
          </Text>
        ) : null,
        part,
      ])}
    </Words>
  )
}

/** A crate mark or consignment mark, stencilled. */
export function Mark({
  size,
  line,
  children,
  style = {},
}: {
  size: number
  line?: number
  children: string
  style?: Style
}) {
  return (
    <Words size={size} line={line ?? size} face="crate" style={style}>
      {children}
    </Words>
  )
}
