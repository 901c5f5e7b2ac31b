import { Cell, Head, Ledger, RowHead } from '@/components/ui/ledger'
import { enduranceMinutes, localTime } from '@/lib/views/format'
import type { EnduranceView } from '@/lib/views/sheet'

const KIND_WORDS: Record<EnduranceView['kind'], string> = {
  climate: 'Heating and cooling fail',
  ventilation: 'Fans and vents close',
  stays: 'The leg just goes on',
}

/** If something fails at the worst moment of a leg: minutes until the animal meets its alarm and its critical limit. */
export function EnduranceTable({
  endurance,
  name,
}: {
  endurance: readonly EnduranceView[]
  name: (animalId: string) => string
}) {
  if (endurance.length === 0) return <p className="text-mute">No endurance was run for this plan.</p>
  return (
    <Ledger caption="Endurance: minutes to a limit after a failure at the worst moment of the leg">
      <thead>
        <tr>
          <Head>Leg</Head>
          <Head>Animal</Head>
          <Head>What fails</Head>
          <Head>Worst at</Head>
          <Head numeric>To alarm</Head>
          <Head numeric>To critical</Head>
        </tr>
      </thead>
      <tbody>
        {endurance.map((row) => (
          <tr key={`${row.legId} ${row.animalId} ${row.kind}`}>
            <RowHead className="font-head text-sub font-bold">{row.ordinal}</RowHead>
            <Cell>
              <span className="crate mr-1.5">{row.crateLetter}</span>
              {name(row.animalId)}
            </Cell>
            <Cell>{KIND_WORDS[row.kind]}</Cell>
            <Cell className="whitespace-nowrap">
              {row.worstAt === null ? 'not known' : localTime(row.worstAt.ms, row.worstAt.zone)}
            </Cell>
            <Cell numeric>{enduranceMinutes(row.toAlarmMin)}</Cell>
            <Cell numeric>{enduranceMinutes(row.toCriticalMin)}</Cell>
          </tr>
        ))}
      </tbody>
    </Ledger>
  )
}
