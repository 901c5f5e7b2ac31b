import { approvalStatement } from '@/lib/schemas/approval-statement'
import type { FindingView } from '@/lib/views/sheet'

/** What is about to be signed: the statement word for word, and the crates, conditions and findings it goes with. */
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
  overridden: readonly FindingView[]
}) {
  return (
    <div className="mt-1 text-small">
      <p>
        {examined === ''
          ? approvalStatement({ examined: false }).split('. ')[0]
          : approvalStatement({ examined: examined === 'yes' })}
        {examined === '' && '. The statement goes on with your answer below.'}
      </p>
      <dl className="mt-1.5 grid grid-cols-[auto_1fr] gap-x-3 gap-y-0.5">
        <dt className="text-mute">Crates</dt>
        <dd className="crate m-0">{marks.join(', ') || 'none'}</dd>
        <dt className="text-mute">Conditions</dt>
        <dd className="m-0">{conditionCount === 0 ? 'none' : conditionCount}</dd>
        <dt className="text-mute">Overridden</dt>
        <dd className="m-0">
          {overridden.length === 0 ? 'nothing' : null}
          {overridden.map((finding) => (
            <span key={finding.number} className="block">
              {finding.asked} ({finding.whoLegWords})
            </span>
          ))}
        </dd>
      </dl>
    </div>
  )
}
