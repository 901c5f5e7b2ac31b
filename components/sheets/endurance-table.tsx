import { Cell, Head, Ledger, RowHead } from '@/components/ui/ledger'
import { enduranceMinutes, localTime } from '@/lib/views/format'
import type { EnduranceView } from '@/lib/views/sheet'

const KINDS = ['climate', 'ventilation', 'stays'] as const
const KIND_WORDS: Record<EnduranceView['kind'], string> = {
  climate: 'Heating and cooling fail',
  ventilation: 'Fans and vents close',
  stays: 'The leg just goes on',
}

/** If something fails at the worst moment of a leg: minutes until this animal meets its alarm and its critical limit. */
export function EnduranceTable({
  endurance,
  animalId,
  name,
}: {
  endurance: readonly EnduranceView[]
  animalId: string
  name: string
}) {
  const own = endurance.filter((row) => row.animalId === animalId)
  if (own.length === 0) return <p className="text-mute">No endurance was run for {name}.</p>
  const legs = [...new Map(own.map(({ legId, ordinal }) => [legId, ordinal]))]
  return (
    <Ledger
      caption={`Endurance of ${name}: minutes to alarm and to critical after a failure at the worst moment of the leg`}
    >
      <thead>
        <tr>
          <Head rowSpan={2}>Leg</Head>
          {KINDS.map((kind) => (
            <Head key={kind} colSpan={2} scope="colgroup" className="!border-b-0">
              {KIND_WORDS[kind]}
            </Head>
          ))}
        </tr>
        <tr>
          {KINDS.flatMap((kind) => [
            <Head key={`${kind} alarm`} numeric className="!font-normal">
              to alarm
            </Head>,
            <Head key={`${kind} critical`} numeric className="!font-normal">
              to critical
            </Head>,
          ])}
        </tr>
      </thead>
      <tbody>
        {legs.map(([legId, ordinal]) => (
          <tr key={legId}>
            <RowHead className="font-head text-sub font-bold">{ordinal}</RowHead>
            {KINDS.flatMap((kind) => {
              const row = own.find((one) => one.legId === legId && one.kind === kind)
              return [
                <Cell key={`${kind} alarm`} numeric title={worstWords(row)}>
                  {enduranceMinutes(row?.toAlarmMin ?? null)}
                </Cell>,
                <Cell key={`${kind} critical`} numeric title={worstWords(row)}>
                  {enduranceMinutes(row?.toCriticalMin ?? null)}
                </Cell>,
              ]
            })}
          </tr>
        ))}
      </tbody>
    </Ledger>
  )
}

function worstWords(row: EnduranceView | undefined): string | undefined {
  if (row === undefined || row.worstAt === null) return undefined
  return `Worst at ${localTime(row.worstAt.ms, row.worstAt.zone)}`
}
