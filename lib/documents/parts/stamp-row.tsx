import { View } from '@react-pdf/renderer'
import type { FixedBlock } from '@/lib/documents/flow'
import { lineCount } from '@/lib/documents/fonts'
import type { Stamp } from '@/lib/views/sheet'
import { CONTENT_WIDTH } from './paper'
import { stampWidth, VerdictStamp } from './stamp'
import { px, Words } from './words'

/** The one large stamp of a paper, with what decides it in words beside it. */
export function stampRow({
  stamp,
  headline,
  headlineMore,
}: {
  stamp: Stamp
  headline: string
  headlineMore: string[]
}): FixedBlock {
  const width = CONTENT_WIDTH - stampWidth(stamp, 'L') - 18
  const lines = [headline, ...headlineMore].reduce(
    (sum, text, index) => sum + lineCount(text, 'text', index === 0 ? 600 : 400, 13, width - 2),
    0,
  )
  const height = Math.max(62, lines * 16.5)
  return {
    height: height + 18,
    element: (
      <View
        key="stamp"
        style={{ flexDirection: 'row', alignItems: 'center', marginVertical: px(9), height: px(height) }}
      >
        <VerdictStamp stamp={stamp} scale="L" />
        <View style={{ width: px(width), marginLeft: px(16) }}>
          <Words size={13} line={16.5} weight={600}>
            {headline}
          </Words>
          {headlineMore.map((text, index) => (
            <Words key={index} size={13} line={16.5}>
              {text}
            </Words>
          ))}
        </View>
      </View>
    ),
  }
}
