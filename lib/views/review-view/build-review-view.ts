import { crateMark } from '@/lib/planning/crate-mark'
import { earlySignsOf } from '@/lib/species/early-signs'
import { STATE_WORDS } from '@/lib/states/consignment'
import { crateStamp } from '../crate-stamp'
import { overrideInFull } from '../override-words'
import type { ReviewCrate, ReviewView, SignedApproval, SignerView } from '../review'
import type { SheetView } from '../sheet'
import type { SheetFacts } from '../sheet-view/facts'
import { buildSheetView } from '../sheet-view/build-sheet-view'

/** A decision as stored, with what became of it. */
export interface DecisionFact {
  approvalId: number
  revision: number
  crateId: string
  /** As it was signed, whatever the plan calls it since. */
  crateMark: string
  decision: SignedApproval['decision']
  statement: string
  reasons: string
  examined: boolean
  signerName: string
  registrationNumber: string
  registrationCountry: string
  registrationExpiresOn: string
  signedAtMs: number
  voidedAtMs: number | null
  voidedReason: string
  withdrawn: boolean
  conditionCount: number
  earlySigns: readonly string[]
}

export interface ReviewFacts {
  sheet: SheetFacts
  /** The crate to open, by id or letter; one that is not in the plan opens the first that waits. */
  chosenCrateId: string | null
  signer: SignerView
  decisions: readonly DecisionFact[]
  /** The journey has started: nothing can be taken back. */
  travelling: boolean
}

/** One crate set-up under review, with everything that is signed on it. Null where the plan has no crate. */
export function buildReviewView(facts: ReviewFacts): ReviewView | null {
  const sheet = buildSheetView(facts.sheet)
  const crates = facts.sheet.plan.crates.map((plan): ReviewCrate => {
    const animals = sheet.animals.filter(({ crateId }) => crateId === plan.id)
    return {
      crateId: plan.id,
      letter: plan.letter,
      mark: crateMark(facts.sheet.consignment.mark, plan.letter),
      plan,
      animals,
      stamp: crateStamp(animals),
      decision: decisionOn(plan.id, facts),
      earlySigns: earlySignsIn(plan.occupants, facts.sheet),
    }
  })
  const chosen =
    crates.find(({ crateId, letter }) => [crateId, letter].includes(facts.chosenCrateId ?? '')) ??
    crates.find(({ decision }) => decision === 'waiting') ??
    crates[0]
  if (chosen === undefined) return null
  const approvals = facts.decisions.map((decision) => signedApproval(decision, facts, sheet))
  return {
    sheet,
    crates,
    chosen,
    subjects: (facts.sheet.assessment?.result.findings ?? []).map((finding) => ({
      crateId: finding.crateId ?? null,
      animalId: finding.animalId ?? null,
      words: overrideInFull(finding, facts.sheet.plan),
    })),
    signer: facts.signer,
    signed: newestFirst(approvals.filter(({ voidedAt }) => voidedAt === null)),
    voided: newestFirst(approvals.filter(({ voidedAt }) => voidedAt !== null)),
    closedWords: closedWords(facts, chosen),
  }
}

function earlySignsIn(occupants: readonly string[], { plan }: SheetFacts): string[] {
  const aboard = plan.animals.filter(({ id }) => occupants.includes(id))
  return [...new Set(aboard.flatMap(({ profileKey }) => earlySignsOf(profileKey)))]
}

function decisionOn(crateId: string, { decisions, sheet }: ReviewFacts): ReviewCrate['decision'] {
  const standing = decisions.filter((one) => one.crateId === crateId && one.voidedAtMs === null)
  if (standing.some(({ decision }) => decision !== 'returned')) return 'approved'
  return sheet.consignment.state === 'returned' && standing.length > 0 ? 'returned' : 'waiting'
}

function signedApproval(
  fact: DecisionFact,
  { sheet: facts, travelling }: ReviewFacts,
  sheet: SheetView,
): SignedApproval {
  const zone = facts.firm.zone
  const overrides = sheet.overrides.filter(
    ({ vetName, signedAt }) => vetName === fact.signerName && signedAt.ms === fact.signedAtMs,
  )
  return {
    approvalId: fact.approvalId,
    revision: fact.revision,
    crateMarks: [fact.crateMark],
    decision: fact.decision,
    meaning: meaningOf(fact),
    statement: fact.statement,
    reasons: fact.reasons,
    examined: fact.examined,
    signerName: fact.signerName,
    registration: fact.registrationNumber,
    country: fact.registrationCountry,
    expiresOn: fact.registrationExpiresOn,
    signedAt: { ms: fact.signedAtMs, zone },
    voidedAt: fact.voidedAtMs === null ? null : { ms: fact.voidedAtMs, zone },
    voidedReason: fact.voidedReason,
    withdrawn: fact.withdrawn,
    overrides,
    earlySigns: [...fact.earlySigns],
    withdrawable: fact.voidedAtMs === null && fact.decision !== 'returned' && !travelling,
  }
}

function meaningOf({ decision, conditionCount }: DecisionFact): string {
  switch (decision) {
    case 'approved':
      return 'Approved'
    case 'approved_with_conditions':
      return `Approved with ${conditionCount} ${conditionCount === 1 ? 'condition' : 'conditions'}`
    case 'returned':
      return 'Returned to the desk'
  }
}

function closedWords({ sheet, signer }: ReviewFacts, chosen: ReviewCrate): string {
  const { state } = sheet.consignment
  if (state !== 'in_review')
    return `This consignment is ${STATE_WORDS[state].toLowerCase()}: there is nothing to decide.`
  if (chosen.decision === 'approved') return `Crate ${chosen.mark} is signed.`
  if (sheet.assessment === null || sheet.assessment.outOfDate)
    return 'The assessment is out of date: the desk assesses again first.'
  return signer.cannot
}

function newestFirst(approvals: SignedApproval[]): SignedApproval[] {
  return [...approvals].sort((a, b) => b.signedAt.ms - a.signedAt.ms || b.approvalId - a.approvalId)
}
