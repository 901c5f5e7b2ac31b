import { Cell, Head, Ledger } from '@/components/ui/ledger'
import type { HistoryLine } from '@/lib/views/desk-page'
import { dayDate, localTime } from '@/lib/views/format'
import { verbWords } from './history-words'

/** Lines that stand open; older ones fold away. */
const NEWEST = 8

/** The consignment's own lines of the audit trail, newest first. */
export function HistoryPart({ history }: { history: readonly HistoryLine[] }) {
  if (history.length === 0) return <p className="text-mute">Nothing is written down yet.</p>
  const runs = runsOf(history)
  const older = runs.slice(NEWEST)
  return (
    <>
      <HistoryTable caption="History, newest first" runs={runs.slice(0, NEWEST)} />
      {older.length > 0 && (
        <details className="mt-2">
          <summary className="link inline-block max-desk:min-h-11">
            {older.length === 1 ? '1 line before that' : `${older.length} lines before that`}
          </summary>
          <div className="mt-2">
            <HistoryTable caption="Earlier history" runs={older} />
          </div>
        </details>
      )}
    </>
  )
}

/** The same act of the same person several times within a minute: ten answers written down in one go are one line. */
interface Run {
  line: HistoryLine
  times: number
}

function runsOf(history: readonly HistoryLine[]): Run[] {
  const runs: Run[] = []
  for (const line of history) {
    const last = runs.at(-1)
    if (last && sameAct(last.line, line)) last.times += 1
    else runs.push({ line, times: 1 })
  }
  return runs
}

function sameAct(a: HistoryLine, b: HistoryLine): boolean {
  const near = Math.abs(a.at.ms - b.at.ms) < 60_000
  return near && a.who === b.who && a.verb === b.verb && a.note === b.note && a.refused === b.refused
}

function HistoryTable({ caption, runs }: { caption: string; runs: readonly Run[] }) {
  return (
    <Ledger caption={caption} folds>
      <thead>
        <tr>
          <Head className="w-[14rem]">When</Head>
          <Head className="w-[16rem]">Who</Head>
          <Head>What</Head>
        </tr>
      </thead>
      <tbody>
        {runs.map(({ line, times }) => (
          <tr key={line.id}>
            <Cell inline className="whitespace-nowrap text-small">
              {dayDate(line.at.ms, line.at.zone)}, {localTime(line.at.ms, line.at.zone)}
            </Cell>
            <Cell inline>{line.who}</Cell>
            <Cell attention={line.refused}>
              {verbWords(line)}
              {times > 1 && `, ${times} times`}
              {line.note && <span className="block text-small text-mute">{line.note}</span>}
            </Cell>
          </tr>
        ))}
      </tbody>
    </Ledger>
  )
}
