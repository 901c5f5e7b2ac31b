import { crateMark } from '@/lib/planning/crate-mark'
import type { ApprovalView } from '../sheet'
import type { ApprovalFact, SheetFacts } from './facts'

/** The signatures in force, one for each though it may cover several crates, in order of time. */
export function approvalViews({
  approvals,
  plan,
  consignment,
  firm,
}: Pick<SheetFacts, 'approvals' | 'plan' | 'consignment' | 'firm'>): ApprovalView[] {
  const signed = new Map<string, ApprovalFact[]>()
  for (const row of approvals.filter(({ inForce, decision }) => inForce && decision !== 'returned')) {
    const key = JSON.stringify([row.signerName, row.signedAtMs, row.statement])
    signed.set(key, [...(signed.get(key) ?? []), row])
  }
  return [...signed.values()].flatMap((group) => {
    const [approval] = group
    if (approval === undefined) return []
    const letters = group
      .flatMap(({ crateId }) => plan.crates.find(({ id }) => id === crateId)?.letter ?? [])
      .sort()
    return [
      {
        vetName: approval.signerName,
        registration: approval.registrationNumber,
        registrationCountry: approval.registrationCountry,
        registrationExpires: approval.registrationExpiresOn,
        checkedWords: approval.checkedWords,
        signedAt: { ms: approval.signedAtMs, zone: firm.zone },
        crateMarks: letters.map((letter) => crateMark(consignment.mark, letter)),
        statement: approval.statement,
        examined: approval.examined,
        envelopeWords: '',
      },
    ]
  })
}
