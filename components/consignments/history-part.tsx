import { Cell, Head, Ledger } from '@/components/ui/ledger'
import type { HistoryLine } from '@/lib/views/desk-page'
import { dayDate, localTime } from '@/lib/views/format'

const VERB_WORDS: Record<string, string> = {
  'consignment.create': 'Began the consignment',
  'consignment.save': 'Saved the plan',
  'consignment.assess': 'Asked for an assessment',
  'assessment.record': 'Assessed',
  'assessment.fail': 'The assessment stopped',
  'consignment.submit': 'Sent it to the vet',
  'approval.approve': 'Signed',
  'approval.return': 'Returned it',
  'approval.withdraw': 'Withdrew an approval',
  'consignment.release': 'Asked for the release',
  'consignment.released': 'Released',
  'consignment.depart': 'Departed',
  'consignment.deliver': 'Delivered',
  'consignment.stop': 'Broke the journey off',
  'consignment.cancel': 'Cancelled',
  'consignment.confirm-air': 'Said that the air still holds',
  'consignment.confirm-condition': 'Wrote down an answer to a condition',
  'consignment.record-instruction': 'Wrote down an instruction',
  'consignment.acknowledge': 'Acknowledged',
  'consignment.ask-change': 'Asked for a change',
  'document.download': 'Opened a paper',
}

/** The consignment's own lines of the audit trail, newest first. */
export function HistoryPart({ history }: { history: readonly HistoryLine[] }) {
  if (history.length === 0) return <p className="text-mute">Nothing is written down yet.</p>
  return (
    <Ledger caption="History, newest first">
      <thead>
        <tr>
          <Head>When</Head>
          <Head>Who</Head>
          <Head>What</Head>
        </tr>
      </thead>
      <tbody>
        {history.map((line) => (
          <tr key={line.id}>
            <Cell className="whitespace-nowrap text-small">
              {dayDate(line.at.ms, line.at.zone)}, {localTime(line.at.ms, line.at.zone)}
            </Cell>
            <Cell>{line.who}</Cell>
            <Cell attention={line.refused}>
              {verbWords(line)}
              {line.note && <span className="block text-small text-mute">{line.note}</span>}
            </Cell>
          </tr>
        ))}
      </tbody>
    </Ledger>
  )
}

function verbWords({ verb, refused }: HistoryLine): string {
  const plain = verb.replace(/\.refused$/, '')
  const words = VERB_WORDS[plain] ?? plain.replace('.', ', ').replaceAll('-', ' ')
  return refused ? `Refused: ${words.charAt(0).toLowerCase()}${words.slice(1)}` : words
}
