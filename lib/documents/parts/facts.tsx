import { View } from '@react-pdf/renderer'
import { lineCount } from '@/lib/documents/fonts'
import { INK, px, Words } from './words'

export interface Fact {
  caption: string
  /** First line, bold where it is a name. */
  value: string
  bold?: boolean
  more?: string[]
}

/** Boxed facts with corner captions, in rows of columns that share their edges. */
export function Facts({ widths, rows }: { widths: number[]; rows: Fact[][] }) {
  return (
    <View style={{ borderWidth: px(1.5), borderTopWidth: 0, borderColor: INK.ink }}>
      {rows.map((row, index) => (
        <View
          key={index}
          style={{
            flexDirection: 'row',
            ...(index > 0 ? { borderTopWidth: px(1), borderTopColor: INK.rule } : {}),
          }}
        >
          {row.map((fact, at) => (
            <View
              key={at}
              style={{
                width: px(widths[at] ?? 100),
                paddingTop: px(2),
                paddingBottom: px(4),
                paddingHorizontal: px(7),
                ...(at > 0 ? { borderLeftWidth: px(1), borderLeftColor: INK.rule } : {}),
              }}
            >
              <Words size={10.5} line={13} style={{ color: INK.mute }}>
                {fact.caption}
              </Words>
              <Words size={12} line={15} weight={fact.bold ? 600 : 400}>
                {fact.value}
              </Words>
              {(fact.more ?? []).map((line, number) => (
                <Words key={number} size={11} line={14}>
                  {line}
                </Words>
              ))}
            </View>
          ))}
        </View>
      ))}
    </View>
  )
}

/** Height of the boxed facts in pixels. */
export function factsHeight(widths: number[], rows: Fact[][]): number {
  const factHeight = ({ value, more = [] }: Fact, width: number) =>
    15 * lineCount(value, 'text', 600, 12, width) +
    14 * more.reduce((sum, line) => sum + lineCount(line, 'text', 400, 11, width), 0)
  return rows.reduce(
    (sum, row) => sum + 20 + Math.max(...row.map((fact, at) => factHeight(fact, (widths[at] ?? 100) - 16))),
    2,
  )
}
