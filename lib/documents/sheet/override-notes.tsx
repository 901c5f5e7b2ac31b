import { View } from '@react-pdf/renderer'
import type { FixedBlock } from '@/lib/documents/flow'
import { lineCount } from '@/lib/documents/fonts'
import { CONTENT_WIDTH } from '@/lib/documents/parts/paper'
import { Bold, INK, px, Words } from '@/lib/documents/parts/words'
import { bodyTemp, dayTime, withUnit } from '@/lib/views/format'
import type { OverrideView } from '@/lib/views/sheet'

/** Who overrode what, and why: stands beside the stamp wherever the stamp stands. */
export function overrideNotes(overrides: OverrideView[]): FixedBlock[] {
  if (overrides.length === 0) return []
  const texts = overrides.map((override) => ({
    bold: `Overridden: ${override.findingWords}.`,
    text: detail(override),
  }))
  const lines = texts.reduce(
    (sum, { bold, text }) => sum + lineCount(`${bold} ${text}`, 'text', 600, 12, CONTENT_WIDTH - 18),
    0,
  )
  return [
    {
      height: lines * 15 + 17,
      element: (
        <View
          key="overrides"
          style={{
            borderWidth: px(1.5),
            borderColor: INK.ink,
            paddingHorizontal: px(8),
            paddingVertical: px(4),
            marginBottom: px(6),
          }}
        >
          {texts.map(({ bold, text }, index) => (
            <Words key={index} size={12} line={15}>
              <Bold>{bold}</Bold> {text}
            </Words>
          ))}
        </View>
      ),
    },
  ]
}

function detail({ vetName, reason, signedAt, minutesPast, worstBodyC }: OverrideView): string {
  const figures = [
    minutesPast === null ? '' : `${withUnit(minutesPast, 'min')} past`,
    worstBodyC === null ? '' : `body to ${bodyTemp(worstBodyC, 'c')}`,
  ].filter(Boolean)
  const signedFor = figures.length === 0 ? '' : ` Signed for ${figures.join(', ')}.`
  return `${vetName}, ${dayTime(signedAt.ms, signedAt.zone)}: ${reason}${reason.endsWith('.') ? '' : '.'}${signedFor}`
}
