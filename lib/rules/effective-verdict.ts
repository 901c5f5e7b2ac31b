import type { Assessment, Finding } from './result'
import { type Passage, type Verdicts, decide } from './verdicts'

/** A finding a vet overrode by name, with the figures it was signed for. */
export interface SignedOverride {
  rule: string
  animalId: string | null
  legId: string | null
  reason: string
  minutesPast: number
  worstBodyC: number | null
  /** Of a finding without a body temperature (air, water, carbon dioxide): its own figure. */
  worstValue: number | null
  signedBy: string
  signedAtMs: number
}

/** An approval in force; void and withdrawn ones are not handed in. */
export interface ApprovalInForce {
  crateId: string
  overrides: readonly SignedOverride[]
}

/** A condition as recorded. A vet's own makes its crate's legs conditional; one refused means they cannot go. */
export interface RecordedCondition {
  origin: 'narrow_margin' | 'rule' | 'vet'
  /** The crate of the approval it belongs to, or null: all. */
  crateId: string | null
  legId: string | null
  text: string
  answer: 'confirmed' | 'refused' | null
}

export interface Overridden {
  findingIndex: number
  by: SignedOverride
}

export interface EffectiveVerdict extends Verdicts {
  /** The assessment's findings as they count now, same order: overridden ones are conditions, vet's conditions stand behind. */
  findings: Finding[]
  overridden: Overridden[]
  /** Overrides that hold no longer, and why. */
  ended: { by: SignedOverride; because: string }[]
}

export interface EffectiveInput {
  assessment: Pick<Assessment, 'findings' | 'verdicts'> & {
    animals: readonly { id: string; crateId: string }[]
  }
  approvals: readonly ApprovalInForce[]
  conditions: readonly RecordedCondition[]
}

/**
 * The verdict that counts: the stored assessment, which never changes, with what vets have overridden and what has been
 * asked. Every screen, paper and mail takes this one. Critical, law and carrier findings cannot be lifted by any input.
 */
export function effectiveVerdict({ assessment, approvals, conditions }: EffectiveInput): EffectiveVerdict {
  const passages = passagesOf(assessment)
  const overridden: Overridden[] = []
  const ended: EffectiveVerdict['ended'] = []
  for (const { crateId, overrides } of approvals)
    for (const by of overrides) {
      const matching = indexesOf(assessment.findings, by, crateId, passages)
      if (matching.length === 0) ended.push({ by, because: 'The finding is no longer in breach.' })
      for (const findingIndex of matching) {
        const because = whyOverrideEnds(assessment.findings[findingIndex], by)
        if (because === undefined) overridden.push({ findingIndex, by })
        else ended.push({ by, because })
      }
    }
  const lifted = new Set(overridden.map(({ findingIndex }) => findingIndex))
  const findings = [
    ...assessment.findings.map((finding, index): Finding =>
      lifted.has(index) ? { ...finding, status: 'condition' } : finding,
    ),
    ...conditions
      .filter(({ origin, answer }) => origin === 'vet' || answer === 'refused')
      .map(conditionFinding),
  ]
  return { findings, overridden, ended, ...decide(findings, passages) }
}

/** Whether a vet may override this finding at all. */
export function isOverridable(finding: Finding): boolean {
  const absolute = finding.basis === 'law' || finding.basis === 'carrier' || finding.limitKind === 'critical'
  return finding.overridable && finding.status === 'breach' && !absolute
}

/** What an override of this finding is signed for. */
export function signedFigures({
  minutesPast = 0,
  worstBodyC,
  value,
}: Finding): Pick<SignedOverride, 'minutesPast' | 'worstBodyC' | 'worstValue'> {
  const worstValue = worstBodyC === undefined ? (value ?? null) : null
  return { minutesPast, worstBodyC: worstBodyC ?? null, worstValue }
}

/** Why an override holds no longer for this finding of a later run; undefined where it does. */
export function whyOverrideEnds(finding: Finding | undefined, by: SignedOverride): string | undefined {
  if (finding === undefined || !isOverridable(finding))
    return finding?.overrideRefusedBecause ?? 'This finding can no longer be overridden.'
  const { minutesPast, worstBodyC, worstValue } = signedFigures(finding)
  if (minutesPast > by.minutesPast)
    return `Now ${minutesPast} minutes past the limit; signed for ${by.minutesPast}.`
  if (worstBodyC !== null && isBeyond(worstBodyC, by.worstBodyC, finding.side))
    return `Now ${worstBodyC.toFixed(2)} °C; signed for ${by.worstBodyC?.toFixed(2) ?? 'no body temperature'}.`
  if (worstValue !== null && isBeyond(worstValue, by.worstValue, finding.side))
    return `Now ${worstValue.toFixed(1)} ${finding.unit ?? ''}; signed for ${by.worstValue?.toFixed(1) ?? 'no figure'}.`
  return undefined
}

function isBeyond(now: number, signed: number | null, side: Finding['side']): boolean {
  return signed === null || (side === 'low' ? now < signed : now > signed)
}

/** An override reaches only findings of the crate it was signed on. */
function indexesOf(
  findings: readonly Finding[],
  by: SignedOverride,
  crateId: string,
  passages: readonly Passage[],
): number[] {
  const inCrate = ({ animalId, crateId: own }: Finding) =>
    (own ?? passages.find((passage) => passage.animalId === animalId)?.crateId ?? crateId) === crateId
  return findings.flatMap((finding, index) => {
    const named =
      finding.rule === by.rule &&
      (finding.animalId ?? null) === by.animalId &&
      (finding.legId ?? null) === by.legId
    return named && finding.status === 'breach' && inCrate(finding) ? [index] : []
  })
}

function conditionFinding({ crateId, legId, text, answer }: RecordedCondition): Finding {
  const refused = answer === 'refused'
  return {
    rule: refused ? 'condition-refused' : 'vet-condition',
    basis: 'house',
    status: refused ? 'breach' : 'condition',
    ...(crateId !== null && { crateId }),
    ...(legId !== null && { legId }),
    asked: text,
    note: refused
      ? 'Whoever was asked refused this condition.'
      : 'Asked by the vet who approved the crate set-up.',
    sourceTag: 'judgement',
    overridable: false,
  }
}

function passagesOf({ verdicts, animals }: EffectiveInput['assessment']): Passage[] {
  const ids = [...new Set(verdicts.map(({ animalId }) => animalId))]
  return ids.map((animalId) => ({
    animalId,
    crateId: animals.find(({ id }) => id === animalId)?.crateId ?? '',
    legIds: verdicts.filter((verdict) => verdict.animalId === animalId).map(({ legId }) => legId),
  }))
}
