import { Cell, Head, Ledger, Row, RowHead } from '@/components/ui/ledger'
import { corridorTable } from '@/lib/views/charts/table'
import type { CorridorInput } from '@/lib/views/charts/types'

/** The corridor's twin: every full hour, every change of leg and the narrowest moment of each. */
export function CorridorTable({ input }: { input: CorridorInput }) {
  const rows = corridorTable(input)
  return (
    <Ledger caption={`Body temperature of ${input.animalName}, room to the alarm limit and crate air`}>
      <thead>
        <tr>
          <Head>Time</Head>
          <Head>Leg</Head>
          <Head numeric>Typical</Head>
          <Head numeric>{input.deciding ? capital(input.deciding.words) : 'Deciding'}</Head>
          <Head numeric>To the nearer alarm limit</Head>
          <Head numeric>Crate air</Head>
        </tr>
      </thead>
      <tbody>
        {rows.map((row) => (
          <Row key={row.key}>
            <RowHead className="whitespace-nowrap">{row.time}</RowHead>
            <Cell>{row.leg}</Cell>
            <Cell numeric>{row.typical}</Cell>
            <Cell numeric>{row.deciding}</Cell>
            <Cell numeric>{row.toAlarm}</Cell>
            <Cell numeric>{row.crateAir}</Cell>
          </Row>
        ))}
      </tbody>
    </Ledger>
  )
}

function capital(words: string): string {
  return words.charAt(0).toUpperCase() + words.slice(1)
}
