import { Section } from '@/components/ui/section'
import { Notice } from '@/components/ui/notice'
import type { ActionResult } from '@/lib/errors'
import type { WithdrawApproval } from '@/lib/schemas/approval'
import { dayTime } from '@/lib/views/format'
import type { ReviewView, SignedApproval } from '@/lib/views/review'
import { SignedFacts } from './signed-facts'
import { Withdraw } from './withdraw'

/** Approvals that a change of the plan ended, said plainly above everything. */
export function VoidedNotice({ view }: { view: ReviewView }) {
  const ended = view.voided.filter((approval) => !view.signed.some((one) => sameCrates(one, approval)))
  if (ended.length === 0) return null
  return (
    <Notice
      className="mb-4"
      title={ended.length === 1 ? 'An approval was ended' : `${ended.length} approvals were ended`}
    >
      <ul className="list-none">
        {ended.map((approval) => (
          <li key={approval.approvalId}>
            <b className="crate">{approval.crateMarks.join(', ')}</b>, signed by {approval.signerName} for
            revision {approval.revision}: {approval.withdrawn ? 'withdrawn' : 'voided'}
            {approval.voidedAt && ` ${dayTime(approval.voidedAt.ms, approval.voidedAt.zone)}`}.{' '}
            {approval.voidedReason}
          </li>
        ))}
      </ul>
    </Notice>
  )
}

/** Everything signed on this consignment: what stands, with a way to take it back, then what was ended. */
export function SignedPart({
  view,
  withdraw,
  requestIds,
}: {
  view: ReviewView
  withdraw: (input: WithdrawApproval) => Promise<ActionResult<unknown>>
  /** By approval. */
  requestIds: Record<number, string>
}) {
  if (view.signed.length + view.voided.length === 0) return null
  return (
    <Section id="signed" title="Signed" words="as it was signed, for good">
      <div className="grid gap-4 wide:grid-cols-2">
        {bySignature([...view.signed, ...view.voided]).map((approvals) => (
          <SignedFacts
            key={approvals[0].approvalId}
            approval={{ ...approvals[0], crateMarks: approvals.flatMap((one) => one.crateMarks).sort() }}
            act={approvals
              .filter((one) => one.withdrawable)
              .map((one) => (
                <Withdraw
                  key={one.approvalId}
                  approval={one}
                  action={withdraw}
                  requestId={requestIds[one.approvalId] ?? ''}
                />
              ))}
          />
        ))}
      </div>
    </Section>
  )
}

function sameCrates(a: SignedApproval, b: SignedApproval): boolean {
  return a.crateMarks.join() === b.crateMarks.join()
}

/** One signature may cover several crates; each crate's approval is ended by itself. */
function bySignature(approvals: readonly SignedApproval[]): [SignedApproval, ...SignedApproval[]][] {
  const groups = new Map<string, [SignedApproval, ...SignedApproval[]]>()
  for (const approval of approvals) {
    const { signerName, signedAt, decision, reasons, voidedAt, withdrawn } = approval
    const key = JSON.stringify([signerName, signedAt.ms, decision, reasons, voidedAt?.ms, withdrawn])
    const group = groups.get(key)
    if (group) group.push(approval)
    else groups.set(key, [approval])
  }
  return [...groups.values()]
}
