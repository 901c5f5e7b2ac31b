import { Cell, Head, Ledger, RowHead } from '@/components/ui/ledger'
import { enduranceMinutes, localTime, MINUTES_SHOWN } from '@/lib/views/format'
import type { EnduranceView } from '@/lib/views/sheet'
import { legsInWords } from '@/lib/views/sheet-view/words'

const KINDS = ['climate', 'ventilation', 'stays'] as const
type Kind = EnduranceView['kind']
const KIND_WORDS: Record<Kind, string> = {
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
  const short = KINDS.filter((kind) => own.some((row) => row.kind === kind && isShort(row)))
  return (
    <>
      {KINDS.filter((kind) => !short.includes(kind)).map((kind) => (
        <p key={kind} className="mb-1.5">
          <b>{KIND_WORDS[kind]}</b>: {longWords(own.filter((row) => row.kind === kind))}
        </p>
      ))}
      {short.length > 0 && <ShortTable own={own} kinds={short} name={name} />}
      <p className="mt-1.5 text-small text-mute">
        Unknown: nothing is there to fail, or the plan does not say what the air would then do.
      </p>
    </>
  )
}

/** A kind of failure that meets a limit within four hours on some leg. */
function ShortTable({
  own,
  kinds,
  name,
}: {
  own: readonly EnduranceView[]
  kinds: readonly Kind[]
  name: string
}) {
  const legs = [...new Map(own.map(({ legId, ordinal }) => [legId, ordinal]))]
  return (
    <Ledger
      caption={`Endurance of ${name}: minutes to alarm and to critical after a failure at the worst moment of the leg`}
    >
      <thead>
        <tr>
          <Head rowSpan={2}>Leg</Head>
          {kinds.map((kind) => (
            <Head key={kind} colSpan={2} scope="colgroup" className="!border-b-0">
              {KIND_WORDS[kind]}
            </Head>
          ))}
        </tr>
        <tr>
          {kinds.flatMap((kind) => [
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
            {kinds.flatMap((kind) => {
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

function isShort({ toAlarmMin, toCriticalMin }: EnduranceView): boolean {
  return [toAlarmMin, toCriticalMin].some((minutes) => minutes !== null && minutes < MINUTES_SHOWN)
}

/** "240+ min on legs 1, 4 and 5; unknown on legs 2 and 3." */
function longWords(rows: readonly EnduranceView[]): string {
  const known = rows.filter(({ toAlarmMin }) => toAlarmMin !== null)
  const unknown = rows.filter((row) => !known.includes(row))
  const on = (some: readonly EnduranceView[]) => legsInWords(some.map(({ ordinal }) => ordinal))
  const words = [
    known.length === 0 ? '' : `${enduranceMinutes(MINUTES_SHOWN)} on ${on(known)}`,
    unknown.length === 0 ? '' : `unknown on ${on(unknown)}`,
  ]
  return `${words.filter(Boolean).join('; ')}.`
}

function worstWords(row: EnduranceView | undefined): string | undefined {
  if (row === undefined || row.worstAt === null) return undefined
  return `Worst at ${localTime(row.worstAt.ms, row.worstAt.zone)}`
}
