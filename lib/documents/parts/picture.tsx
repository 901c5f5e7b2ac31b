import { Circle, Path, Rect, Svg, Text } from '@react-pdf/renderer'
import type { ReactElement } from 'react'
import type { Look, Mark, Picture, TextMark } from '@/lib/views/charts/marks'
import { textWidth } from '@/lib/documents/fonts'
import { FACES } from '@/lib/tokens'
import { INK, px } from './words'

/** A picture of lib/views/charts in the paper's inks, at the size it was drawn for. */
export function PaperPicture({ picture: { width, height, marks } }: { picture: Picture }) {
  return (
    <Svg viewBox={`0 0 ${width} ${height}`} style={{ width: px(width), height: px(height), flexShrink: 0 }}>
      {marks.flatMap((mark, index) => drawn(mark, index))}
    </Svg>
  )
}

function drawn(mark: Mark, key: number): ReactElement[] {
  switch (mark.kind) {
    case 'path':
      return mark.d === '' ? [] : [<Path key={key} d={mark.d} {...inks(mark)} />]
    case 'rect':
      return [
        <Rect key={key} x={mark.x} y={mark.y} width={mark.width} height={mark.height} {...inks(mark)} />,
      ]
    case 'circle':
      return [<Circle key={key} cx={mark.x} cy={mark.y} r={mark.r} {...inks(mark)} />]
    case 'text':
      return spoken(mark, key)
  }
}

function inks({ fill, fillOpacity, stroke, strokeWidth, strokeOpacity, dash, roundCap }: Look) {
  return {
    fill: colour(fill ?? 'none'),
    ...(fillOpacity === undefined ? {} : { fillOpacity }),
    ...(stroke === undefined ? {} : { stroke: colour(stroke), strokeWidth: strokeWidth ?? 1 }),
    ...(strokeOpacity === undefined ? {} : { strokeOpacity }),
    ...(dash === undefined ? {} : { strokeDasharray: dash.join(' ') }),
    ...(roundCap === true ? { strokeLinecap: 'round' as const } : {}),
  }
}

/** Charts on paper use the inks only; a ramp swatch never comes here. */
function colour(ink: string): string {
  return ink in INK ? INK[ink as keyof typeof INK] : ink === 'none' ? 'none' : INK.ink
}

/** Mono figures are set word by word, so that their spaces are narrow; all other text as it is. */
function spoken(mark: TextMark, key: number): ReactElement[] {
  const words = mark.face === 'fig' ? mark.text.split(/[ \u00a0]/) : [mark.text]
  const gap = 0.352 * mark.size
  const widths = words.map((word) => textWidth(word, mark.face, mark.weight, mark.size))
  const total = widths.reduce((sum, width) => sum + width, 0) + gap * (words.length - 1)
  let x = mark.x - (mark.anchor === 'middle' ? total / 2 : mark.anchor === 'end' ? total : 0)
  return words.map((word, index) => {
    const at = x
    x += (widths[index] ?? 0) + gap
    return (
      <Text key={`${key}-${index}`} x={at} y={mark.y} fill={colour(mark.ink)} style={lettering(mark)}>
        {word}
      </Text>
    )
  })
}

function lettering({ face, size, weight }: TextMark) {
  return {
    fontFamily: FACES[face].family,
    fontSize: size,
    fontWeight: weight,
    ...(face === 'text' ? { fontFeatureSettings: { tnum: 1 } as never } : {}),
  }
}
