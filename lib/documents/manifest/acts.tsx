import { View } from '@react-pdf/renderer'
import type { Block } from '@/lib/documents/flow'
import { lineCount } from '@/lib/documents/fonts'
import { type Column, Ledger, LEDGER_HEAD, type LedgerRow, Ordinal } from '@/lib/documents/parts/ledger'
import { CONTENT_WIDTH, Heading } from '@/lib/documents/parts/paper'
import { Figure, INK, px, Words } from '@/lib/documents/parts/words'
import type { CallView } from '@/lib/views/manifest'

const HALF = (CONTENT_WIDTH - 20) / 2

/** Handling in two columns, numbered down the left one and on down the right. */
export function handlingList(items: string[]): Block[] {
  if (items.length === 0) return []
  const lines = items.map((item) => lineCount(item, 'text', 400, 11.5, HALF - 22))
  const split = balance(lines)
  const columns = [items.slice(0, split), items.slice(split)]
  const tall = Math.max(
    sum(lines.slice(0, split)) * 14.5 + split * 4,
    sum(lines.slice(split)) * 14.5 + (items.length - split) * 4,
  )
  return [
    {
      height: 28 + tall + 14,
      element: (
        <View key="handling">
          <Heading>Handling</Heading>
          <View
            style={{
              flexDirection: 'row',
              borderTopWidth: px(1.5),
              borderBottomWidth: px(1.5),
              borderColor: INK.ink,
              paddingVertical: px(5),
            }}
          >
            {columns.map((column, at) => (
              <View
                key={at}
                style={{
                  width: px(HALF + (at === 0 ? 10 : 0)),
                  ...(at === 0
                    ? {}
                    : { paddingLeft: px(10), borderLeftWidth: px(0.75), borderLeftColor: INK.hair }),
                }}
              >
                {column.map((item, index) => (
                  <View key={index} style={{ flexDirection: 'row', marginVertical: px(2) }}>
                    <Words face="head" weight={700} size={13} line={15} style={{ width: px(18) }}>
                      {String(index + 1 + (at === 0 ? 0 : split))}
                    </Words>
                    <Words size={11.5} line={14.5} style={{ width: px(HALF - 20) }}>
                      {item}
                    </Words>
                  </View>
                ))}
              </View>
            ))}
          </View>
        </View>
      ),
    },
  ]
}

/** Where to cut, so that both columns are about as tall. */
function balance(lines: number[]): number {
  const half = sum(lines) / 2
  let used = 0
  const index = lines.findIndex((line) => {
    used += line
    return used >= half
  })
  return Math.max(1, index + 1)
}

function sum(values: number[]): number {
  return values.reduce((total, value) => total + value, 0)
}

const CALL = { number: 28, who: 232, telephone: 150, answer: 92 }
const PURPOSE = CONTENT_WIDTH - CALL.number - CALL.who - CALL.telephone - CALL.answer
const CALL_COLUMNS: Column[] = [
  { head: 'No.', width: CALL.number },
  { head: 'Who', width: CALL.who },
  { head: 'For', width: PURPOSE },
  { head: 'Telephone', width: CALL.telephone },
  { head: 'If no answer in', width: CALL.answer },
]

/** Whom to ring, in order. */
export function callTable(calls: CallView[]): Block {
  return {
    around: 28 + LEDGER_HEAD + 3,
    rows: calls.map((call): LedgerRow => {
      const lines = Math.max(
        lineCount(call.who, 'text', 600, 11, CALL.who - 12),
        lineCount(call.purpose, 'text', 400, 11, PURPOSE - 12),
      )
      return {
        key: String(call.number),
        height: 10 + 13.5 * lines,
        cells: [
          <Ordinal key="n">{call.number}</Ordinal>,
          <Words key="w" size={11} line={13.5} weight={call.number === 1 ? 600 : 400}>
            {call.who}
          </Words>,
          call.purpose,
          <Figure key="t" size={12.5} line={15}>
            {call.telephone === '' ? 'not given' : call.telephone}
          </Figure>,
          call.ifNoAnswer,
        ],
      }
    }),
    draw: (rows, continued) => (
      <View key={`calls-${rows[0]?.key ?? ''}`}>
        <Heading remark={continued ? 'continued' : 'at any hour'}>Ring in this order</Heading>
        <Ledger columns={CALL_COLUMNS} rows={rows} />
      </View>
    ),
  }
}

const HAND = { name: 150, time: 126, alive: 44, dead: 44, short: 44 }
const PLACE = 196
const SIGN = CONTENT_WIDTH - PLACE - Object.values(HAND).reduce((total, width) => total + width, 0)
const HAND_COLUMNS: Column[] = [
  { head: 'Place', width: PLACE },
  { head: 'Name, capitals', width: HAND.name },
  { head: 'Date, time, zone', width: HAND.time },
  { head: 'Alive', width: HAND.alive },
  { head: 'Dead', width: HAND.dead },
  { head: 'Short', width: HAND.short },
  { head: 'Signature', width: SIGN },
]

/** Handovers to be written by hand. */
export function handoverTable(places: string[]): Block {
  const named = places.length === 0 ? ['', ''] : places
  return {
    around: 28 + LEDGER_HEAD + 3,
    rows: named.map((place, index): LedgerRow => ({
      key: `handover-${index}`,
      height: Math.max(20, 6 + 13.5 * lineCount(place, 'text', 400, 11, PLACE - 12)),
      cells: [place, '', '', '', '', '', ''],
    })),
    draw: (rows, continued) => (
      <View key={rows[0]?.key ?? 'handovers'}>
        <Heading remark={continued ? 'continued' : 'written by hand, ink'}>Handovers</Heading>
        <Ledger columns={HAND_COLUMNS} rows={rows} />
      </View>
    ),
  }
}
