import { Line, Rect, Svg, View } from '@react-pdf/renderer'
import { textWidth } from '@/lib/documents/fonts'
import { minutesToSpare } from '@/lib/views/format'
import type { Stamp } from '@/lib/views/sheet'
import { Figure, INK, px, Words } from './words'

/*
 * A stamp says its verdict by words, frame and fill: solid frame GO, broken frame with a count GO WITH CONDITIONS, a block
 * of ink NO-GO. Frames are drawn, because a dashed border has no dash of its own length on paper.
 */

type Scale = 'L' | 'S'

const SIZES = {
  L: { size: 30, height: 62, pad: 24, stroke: 4, dash: [13, 8], track: 0.045, countSize: 28, countPad: 16 },
  /** The long words take less height, so that a sentence still stands beside them. */
  LC: { size: 25, height: 58, pad: 22, stroke: 4, dash: [13, 8], track: 0.045, countSize: 28, countPad: 16 },
  S: { size: 10.5, height: 21, pad: 7, stroke: 1.5, dash: [5, 3], track: 0.02, countSize: 12, countPad: 6 },
} as const

export const STAMP_WORDS = { go: 'GO', conditional: 'GO WITH CONDITIONS', 'no-go': 'NO-GO' } as const

/** The verdict as a stamp; one L to a sheet. An old assessment's stamp is crossed by OUT OF DATE in its place. */
export function VerdictStamp({ stamp, scale }: { stamp: Stamp; scale: Scale }) {
  const { verdict, conditions, outOfDate } = stamp
  if (verdict === 'none') return <Words size={scale === 'L' ? 22 : 11}>Not assessed</Words>
  if (outOfDate) return <Framed words="OUT OF DATE" scale={scale} frame="dotted" count={null} />
  const frame = verdict === 'go' ? 'solid' : verdict === 'conditional' ? 'broken' : 'block'
  return (
    <Framed
      words={STAMP_WORDS[verdict]}
      scale={scale}
      frame={frame}
      count={verdict === 'conditional' && conditions > 0 ? conditions : null}
    />
  )
}

/** Width of a stamp in pixels, to plan what stands beside it. */
export function stampWidth({ verdict, conditions }: Stamp, scale: Scale): number {
  if (verdict === 'none') return 120
  return (
    wordsWidth(STAMP_WORDS[verdict], scale) +
    (verdict === 'conditional' && conditions > 0 ? countWidth(conditions, scale) : 0)
  )
}

type Frame = 'solid' | 'broken' | 'dotted' | 'block'

function Framed({
  words,
  scale,
  frame,
  count,
}: {
  words: string
  scale: Scale
  frame: Frame
  count: number | null
}) {
  const { size, height, stroke, dash, track, countSize } = SIZES[sizeOf(words, scale)]
  const wide = wordsWidth(words, scale)
  const more = count === null ? 0 : countWidth(count, scale)
  const line = frame === 'dotted' ? 1 : stroke
  const dashes =
    frame === 'broken'
      ? { strokeDasharray: `${dash[0]} ${dash[1]}` }
      : frame === 'dotted'
        ? { strokeDasharray: '1 3' }
        : {}
  const fill = frame === 'block' ? INK.ink : 'none'
  return (
    <View style={{ width: px(wide + more), height: px(height), flexDirection: 'row', alignItems: 'center' }}>
      <Svg
        viewBox={`0 0 ${wide + more} ${height}`}
        style={{ position: 'absolute', left: 0, top: 0, width: px(wide + more), height: px(height) }}
      >
        {frame === 'block' ? (
          <Rect x={0} y={0} width={wide} height={height} fill={fill} />
        ) : (
          <Rect
            x={line / 2}
            y={line / 2}
            width={wide + more - line}
            height={height - line}
            fill="none"
            stroke={INK.ink}
            strokeWidth={line}
            {...dashes}
          />
        )}
        {count === null ? null : (
          <Line
            x1={wide - line / 2}
            y1={line}
            x2={wide - line / 2}
            y2={height - line}
            stroke={INK.ink}
            strokeWidth={line}
            {...dashes}
          />
        )}
      </Svg>
      <View style={{ width: px(wide), alignItems: 'center' }}>
        <Words
          face="head"
          weight={800}
          size={size}
          line={size * 1.1}
          style={{
            letterSpacing: px(size * track),
            color: frame === 'block' ? INK['on-ink'] : INK.ink,
          }}
        >
          {words}
        </Words>
      </View>
      {count === null ? null : (
        <View style={{ width: px(more), alignItems: 'center' }}>
          <Words face="text" weight={600} size={countSize} line={countSize * 1.1}>
            {String(count)}
          </Words>
        </View>
      )}
    </View>
  )
}

function sizeOf(words: string, scale: Scale): keyof typeof SIZES {
  return scale === 'L' && words === STAMP_WORDS.conditional ? 'LC' : scale
}

function wordsWidth(words: string, scale: Scale): number {
  const { size, pad, track } = SIZES[sizeOf(words, scale)]
  return Math.ceil(textWidth(words, 'head', 800, size) + words.length * size * track + 2 * pad)
}

function countWidth(count: number, scale: Scale): number {
  const { countSize, countPad } = SIZES[sizeOf(STAMP_WORDS.conditional, scale)]
  return Math.ceil(textWidth(String(count), 'text', 600, countSize) + 2 * countPad)
}

export interface CellFrameProps {
  verdict: 'go' | 'conditional' | 'no-go'
  minutes: number | null
  width?: number
}

/** The number in its verdict's frame. Stands only where the words are on the same sheet. */
export function VerdictCell({ verdict, minutes, width = 58 }: CellFrameProps) {
  const height = 16
  const text = minutes === null ? '–' : minutesToSpare(minutes)
  return (
    <View style={{ width: px(width), height: px(height), alignItems: 'center', justifyContent: 'center' }}>
      <Svg
        viewBox={`0 0 ${width} ${height}`}
        style={{ position: 'absolute', left: 0, top: 0, width: px(width), height: px(height) }}
      >
        {verdict === 'no-go' ? (
          <Rect x={0} y={0} width={width} height={height} fill={INK.ink} />
        ) : (
          <Rect
            x={0.75}
            y={0.75}
            width={width - 1.5}
            height={height - 1.5}
            fill="none"
            stroke={INK.ink}
            strokeWidth={1.5}
            {...(verdict === 'conditional' ? { strokeDasharray: '4 2.5' } : {})}
          />
        )}
      </Svg>
      <Figure
        size={11}
        line={13}
        weight={verdict === 'no-go' ? 600 : 400}
        style={verdict === 'no-go' ? { color: INK['on-ink'] } : {}}
      >
        {text}
      </Figure>
    </View>
  )
}
