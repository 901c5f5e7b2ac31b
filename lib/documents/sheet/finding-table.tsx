import { View } from '@react-pdf/renderer'
import type { TableBlock } from '@/lib/documents/flow'
import { lineCount } from '@/lib/documents/fonts'
import { type Column, Ledger, LEDGER_HEAD, type LedgerRow, Ordinal } from '@/lib/documents/parts/ledger'
import { CONTENT_WIDTH, Heading } from '@/lib/documents/parts/paper'
import { Bold, Words } from '@/lib/documents/parts/words'
import { counted } from '@/lib/views/format'
import type { FindingView } from '@/lib/views/sheet'

const WIDTH = { number: 26, basis: 60, who: 66, gives: 87, spare: 84, status: 114 }
const ASKED =
  CONTENT_WIDTH - WIDTH.number - WIDTH.basis - WIDTH.who - WIDTH.gives - WIDTH.spare - WIDTH.status
const COLUMNS: Column[] = [
  { head: 'No.', width: WIDTH.number },
  { head: 'Basis', width: WIDTH.basis },
  { head: 'Who, leg', width: WIDTH.who },
  { head: 'What is asked, where from', width: ASKED },
  { head: 'Plan gives', width: WIDTH.gives },
  { head: 'To spare', width: WIDTH.spare },
  { head: 'Status', width: WIDTH.status },
]

/** Rows of a finding that was met and decides nothing may stay off the paper; the others are never left out. */
const MET_SHOWN = 6

/** The findings that decide, that ask for something, or that nobody could answer; and how many others there are. */
export function findingTable(findings: FindingView[]): TableBlock[] {
  const shown = shownFindings(findings)
  if (shown.length === 0) return []
  const left = findings.length - shown.length
  const remark =
    left === 0
      ? `all ${counted(findings.length, 'finding')}`
      : `${shown.length} of ${findings.length}; ${left} that were met stand on the page only`
  return [
    {
      around: 28 + LEDGER_HEAD + 3,
      rows: shown.map(findingRow),
      draw: (rows, continued) => (
        <View key={`findings-${rows[0]?.key ?? ''}`}>
          <Heading remark={continued ? 'continued' : remark}>Findings</Heading>
          <Ledger columns={COLUMNS} rows={rows} />
        </View>
      ),
    },
  ]
}

/** Everything but findings met and notes; of those, the ones that decide and the narrowest few. */
export function shownFindings(findings: FindingView[]): FindingView[] {
  let met = 0
  return findings.filter(({ status, decides }) => {
    if (decides || (status !== 'met' && status !== 'note')) return true
    met += 1
    return status === 'met' && met <= MET_SHOWN
  })
}

function findingRow(finding: FindingView): LedgerRow {
  // The head says "Who, leg".
  const who = finding.whoLegWords.replace(/, legs? /, ', ')
  const source = [finding.citation, finding.sourceWords].filter(Boolean).join(', ')
  const status = [finding.statusBold, finding.statusWords].filter(Boolean).join(' ')
  const lines = Math.max(
    lineCount(finding.asked, 'text', 400, 10.5, ASKED - 13) +
      (source === '' ? 0 : lineCount(source, 'text', 400, 10, ASKED - 13)),
    lineCount(status, 'text', 600, 10.5, WIDTH.status - 13),
    lineCount(who, 'text', 400, 10.5, WIDTH.who - 13),
    lineCount(finding.givesWords, 'text', 400, 10.5, WIDTH.gives - 13),
    lineCount(finding.spareWords, 'text', 400, 10.5, WIDTH.spare - 13),
  )
  return {
    key: `${finding.number}`,
    height: Math.max(20, 2 + 12 * lines),
    cells: [
      <Ordinal key="n" size={13}>
        {finding.number}
      </Ordinal>,
      small(finding.basisWords),
      small(who),
      <Words key="a" size={10.5} line={12}>
        {finding.asked}
        {source === '' ? '' : `\n${source}`}
      </Words>,
      small(finding.givesWords),
      small(finding.spareWords),
      <Words key="s" size={10.5} line={12}>
        {finding.statusBold === '' ? null : <Bold>{`${finding.statusBold} `}</Bold>}
        {finding.statusWords}
      </Words>,
    ],
  }
}

const small = (text: string) => (
  <Words size={10.5} line={12}>
    {text}
  </Words>
)
