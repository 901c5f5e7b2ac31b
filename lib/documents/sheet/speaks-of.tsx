import { View } from '@react-pdf/renderer'
import type { FixedBlock } from '@/lib/documents/flow'
import { lineCount } from '@/lib/documents/fonts'
import { CONTENT_WIDTH, Heading } from '@/lib/documents/parts/paper'
import { Bold, Figure, INK, px, Words } from '@/lib/documents/parts/words'
import { dayDateYear, localTime } from '@/lib/views/format'
import type { SheetView } from '@/lib/views/sheet'

const HALF = (CONTENT_WIDTH - 20) / 2
const LABEL = 78
const THIRD = (CONTENT_WIDTH - 36) / 3

/** What the sheet was made from, and what it is not. */
export function speaksOf(view: SheetView): FixedBlock[] {
  const assessed =
    view.assessed === null
      ? 'Not assessed'
      : `${dayDateYear(view.assessed.ms, view.assessed.zone)}, ${localTime(view.assessed.ms, view.assessed.zone)}, by ${view.assessedBy}`
  const right: [string, string][] = [
    ['Assessed', assessed],
    ['Weather', view.weatherWords],
    ['Versions', view.versionWords],
    ['Runs', view.runWords],
  ]
  const rightLines = right.reduce(
    (sum, [, words]) => sum + lineCount(words, 'text', 400, 10.5, HALF - LABEL - 6),
    0,
  )
  const factsHeight = Math.max(4 * 13 + 8, rightLines * 13 + 4)
  const cautionLines = Math.max(
    ...view.cautions.map(({ bold, text }) => lineCount(`${bold} ${text}`, 'text', 600, 10.5, THIRD)),
  )
  return [
    {
      height: 28 + 6 + factsHeight + 10 + cautionLines * 13,
      element: (
        <View key="speaks">
          <Heading>What this sheet speaks of</Heading>
          <View
            style={{
              flexDirection: 'row',
              borderTopWidth: px(1.5),
              borderTopColor: INK.ink,
              paddingTop: px(4),
              height: px(factsHeight + 6),
            }}
          >
            <View style={{ width: px(HALF), marginRight: px(20) }}>
              <HashLine label="Plan hash" hash={view.planHash} />
              <HashLine label="Input hash" hash={view.inputHash} />
            </View>
            <View style={{ width: px(HALF) }}>
              {right.map(([label, words]) => (
                <View key={label} style={{ flexDirection: 'row' }}>
                  <Words size={10.5} line={13} style={{ width: px(LABEL) }}>
                    {label}
                  </Words>
                  <Words size={10.5} line={13} style={{ width: px(HALF - LABEL) }}>
                    {words}
                  </Words>
                </View>
              ))}
            </View>
          </View>
          <View
            style={{
              flexDirection: 'row',
              borderTopWidth: px(0.75),
              borderTopColor: INK.rule,
              marginTop: px(5),
              paddingTop: px(4),
            }}
          >
            {view.cautions.map(({ bold, text }, index) => (
              <Words
                key={index}
                size={10.5}
                line={13}
                style={{ width: px(THIRD), marginRight: px(index < 2 ? 18 : 0) }}
              >
                {bold === '' ? null : <Bold>{`${bold} `}</Bold>}
                {text}
              </Words>
            ))}
          </View>
        </View>
      ),
    },
  ]
}

/** 64 hexadecimal letters in groups of eight, on two lines or one. */
export function HashLine({
  label,
  hash,
  size = 10,
  labelWidth = LABEL,
  perLine = 4,
}: {
  label: string
  hash: string
  size?: number
  labelWidth?: number
  perLine?: number
}) {
  const groups = hash.match(/.{1,8}/g) ?? []
  const lines = [groups.slice(0, perLine), groups.slice(perLine)]
    .map((line) => line.join(' '))
    .filter(Boolean)
  return (
    <View style={{ flexDirection: 'row', marginBottom: px(3) }}>
      <Words size={10.5} line={13} style={{ width: px(labelWidth) }}>
        {label}
      </Words>
      <View>
        {(lines.length === 0 ? ['none'] : lines).map((line, index) => (
          <Figure key={index} size={size} line={13} tight={0.1}>
            {line}
          </Figure>
        ))}
      </View>
    </View>
  )
}
