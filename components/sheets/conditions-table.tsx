import type { ReactNode } from 'react'
import { Cell, Head, Ledger, RowHead } from '@/components/ui/ledger'
import type { ConditionView } from '@/lib/views/sheet'

/** What must be so for the verdict to hold, of whom it was asked, and what they answered. */
export function ConditionsTable({
  conditions,
  act,
}: {
  conditions: readonly ConditionView[]
  /** What the reader may do with a condition that waits. */
  act?: (condition: ConditionView) => ReactNode
}) {
  if (conditions.length === 0) return <p className="text-mute">The verdict rests on no condition.</p>
  return (
    <Ledger caption="Conditions" folds>
      <thead>
        <tr>
          <Head>No.</Head>
          <Head>Leg</Head>
          <Head>What must be so</Head>
          <Head>Asked of</Head>
          <Head>Confirmed</Head>
        </tr>
      </thead>
      <tbody>
        {conditions.map((condition) => (
          <tr key={condition.conditionId}>
            <RowHead inline className="font-head text-sub font-bold">
              {condition.number}
            </RowHead>
            <Cell label="Leg" inline className="whitespace-nowrap">
              {condition.legWords}
            </Cell>
            <Cell>{condition.text}</Cell>
            <Cell label="Asked of">{condition.askedOf}</Cell>
            <Cell label="Confirmed" attention={condition.answer === 'refused' || condition.kept === 'broken'}>
              <Answer condition={condition} />
              {condition.answer === 'waiting' && act && <span className="block">{act(condition)}</span>}
            </Cell>
          </tr>
        ))}
      </tbody>
    </Ledger>
  )
}

function Answer({ condition: { answer, answerWords, kept } }: { condition: ConditionView }) {
  return (
    <>
      {answer === 'waiting' || answer === 'refused' ? <b>{answerWords}</b> : answerWords}
      {kept !== null && <b>{kept === 'kept' ? '. Kept' : '. Broken'}</b>}
    </>
  )
}
