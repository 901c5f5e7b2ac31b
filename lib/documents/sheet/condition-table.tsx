import { View } from '@react-pdf/renderer'
import type { TableBlock } from '@/lib/documents/flow'
import { lineCount } from '@/lib/documents/fonts'
import { type Column, Ledger, LEDGER_HEAD, type LedgerRow, Ordinal } from '@/lib/documents/parts/ledger'
import { CONTENT_WIDTH, Heading } from '@/lib/documents/parts/paper'
import { Bold, Words } from '@/lib/documents/parts/words'
import type { ConditionView } from '@/lib/views/sheet'

const WIDTH = { number: 26, leg: 42, asked: 124, answer: 222 }
const TEXT = CONTENT_WIDTH - WIDTH.number - WIDTH.leg - WIDTH.asked - WIDTH.answer
const COLUMNS: Column[] = [
  { head: 'No.', width: WIDTH.number },
  { head: 'Leg', width: WIDTH.leg },
  { head: 'What must be so', width: TEXT },
  { head: 'Asked of', width: WIDTH.asked },
  { head: 'Confirmed', width: WIDTH.answer },
]

/** Conditions with who confirmed; one that nobody confirmed says "Not yet" in bold. */
export function conditionTable(conditions: ConditionView[], remark: string): TableBlock[] {
  if (conditions.length === 0) return []
  return [
    {
      around: 28 + LEDGER_HEAD + 3,
      rows: conditions.map(conditionRow),
      draw: (rows, continued) => (
        <View key={`conditions-${rows[0]?.key ?? ''}`}>
          <Heading remark={continued ? 'continued' : remark}>Conditions</Heading>
          <Ledger columns={COLUMNS} rows={rows} />
        </View>
      ),
    },
  ]
}

function conditionRow(condition: ConditionView): LedgerRow {
  const { text, askedOf, answerWords, legWords } = condition
  const lines = Math.max(
    lineCount(text, 'text', 400, 11, TEXT - 10.5),
    lineCount(askedOf, 'text', 400, 11, WIDTH.asked - 10.5),
    lineCount(answerWords, 'text', 600, 11, WIDTH.answer - 10.5),
    lineCount(legWords, 'text', 400, 11, WIDTH.leg - 12),
  )
  return {
    key: condition.conditionId,
    height: 8.5 + 12.5 * lines,
    cells: [
      <Ordinal key="n">{condition.number}</Ordinal>,
      small(legWords),
      small(text),
      small(askedOf),
      <Answer key="a" condition={condition} />,
    ],
  }
}

const small = (text: string) => (
  <Words size={11} line={12.5}>
    {text}
  </Words>
)

function Answer({ condition: { answer, answerWords, kept } }: { condition: ConditionView }) {
  const [first = '', ...rest] = answerWords.split(/(?<=\.) /)
  const stands = answer === 'waiting' || answer === 'refused' || kept === 'broken'
  return (
    <Words size={11} line={12.5}>
      {stands ? <Bold>{first}</Bold> : first}
      {rest.length > 0 ? ` ${rest.join(' ')}` : ''}
    </Words>
  )
}
