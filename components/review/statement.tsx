import { approvalStatement } from '@/lib/schemas/approval-statement'

/** What is about to be signed, word for word: it names the crates and every finding that is overridden. */
export function Statement({
  examined,
  marks,
  conditionCount,
  overridden,
}: {
  /** Empty: not answered yet, so that sentence is not shown as signed. */
  examined: string
  marks: readonly string[]
  conditionCount: number
  /** Each in full, in the order of the assessment. */
  overridden: readonly string[]
}) {
  const answer = examined === '' ? null : examined === 'yes'
  return (
    <div className="mt-1 text-small">
      <p>{approvalStatement({ examined: answer, crateMarks: marks, overridden })}</p>
      {answer === null && (
        <p className="mt-1 text-mute">Your answer below, whether you have examined, goes into it.</p>
      )}
      <dl className="mt-1.5 grid grid-cols-[auto_1fr] gap-x-3 gap-y-0.5">
        <dt className="text-mute">Conditions</dt>
        <dd className="m-0">{conditionCount === 0 ? 'none' : conditionCount}</dd>
        <dt className="text-mute">Overridden</dt>
        <dd className="m-0">{overridden.length === 0 ? 'nothing' : overridden.length}</dd>
      </dl>
    </div>
  )
}
