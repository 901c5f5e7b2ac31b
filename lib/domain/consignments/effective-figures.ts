import 'server-only'
import type { Transaction } from 'sequelize'
import { effectiveVerdict } from '@/lib/rules/effective-verdict'
import type { EffectiveVerdict, SignedOverride } from '@/lib/rules/effective-verdict'
import type { Finding } from '@/lib/rules/result'
import { narrowest } from '@/lib/views/sheet-view/words'
import type { Plan } from '@/lib/schemas/plan'
import { models } from '@/models'
import type { Approval, Consignment } from '@/models'
import { standingConditions } from '../assessments/conditions'
import type { StandingCondition } from '../assessments/conditions'
import { readResult } from '../assessments/read-result'
import type { AssessmentResult } from '../assessments/read-result'
import { signedCrates } from '../approvals/signed-crates'
import { readPlan } from './read-plan'
import { writeRow } from './write-row'

/** The verdict that counts, worked out from what is stored: see lib/rules/effective-verdict.ts. */
export function effectiveOf(
  result: AssessmentResult,
  plan: Plan,
  approvals: ReadonlyMap<string, Approval>,
  conditions: readonly StandingCondition[],
): EffectiveVerdict {
  const animals = plan.crates.flatMap((crate) => crate.occupants.map((id) => ({ id, crateId: crate.id })))
  return effectiveVerdict({
    assessment: { findings: result.findings, verdicts: result.verdicts, animals },
    approvals: [...approvals.values()].map((approval) => ({
      crateId: approval.crateRef,
      overrides: overridesOf(approval),
    })),
    conditions: conditions.flatMap(({ row, crateRefs }) =>
      (crateRefs ?? [null]).map((crateId) => ({
        origin: row.origin,
        crateId,
        legId: row.legRef,
        text: row.text,
        answer: row.answer,
      })),
    ),
  })
}

/** What an approval overrides, as the rules read it. */
export function overridesOf({ overrides = [], signerName, signedAt }: Approval): SignedOverride[] {
  return overrides.map((override) => ({
    rule: override.findingRule,
    animalId: override.animalRef,
    legId: override.legRef,
    reason: override.reason,
    minutesPast: override.minutesPast,
    worstBodyC: override.worstBodyC,
    worstValue: override.worstValue,
    signedBy: signerName,
    signedAtMs: signedAt.getTime(),
  }))
}

/** Puts the verdict that counts, and the finding that decides it, where the board reads them. */
export async function writeEffectiveVerdict(tx: Transaction, row: Consignment): Promise<void> {
  const assessment =
    row.assessmentId === null ? null : await models.Assessment.findByPk(row.assessmentId, { transaction: tx })
  const result = assessment === null ? null : await readResult(assessment, tx)
  if (result === null) return
  const plan = await readPlan(row, tx)
  const effective = effectiveOf(result, plan, await signedCrates(tx, row), await standingConditions(tx, row))
  const { verdict, decidedBy } = effective.verdict
  const finding = decidedBy === undefined ? undefined : effective.findings[decidedBy]
  const room = finding?.marginMin === undefined ? narrowest(effective.findings) : finding
  await writeRow(tx, row, {
    verdict,
    deciding: finding === undefined ? null : boardWords(finding, room, plan),
    marginMin: room?.marginMin ?? null,
    marginOutsideAirC: room?.marginOutsideAirC ?? null,
    marginBodyC: room?.marginBodyC ?? null,
  })
}

/** A law or a judgement that decides has no minutes: the smallest margin then is another finding's, named after it. */
function boardWords(finding: Finding, room: Finding | undefined, plan: Plan): string {
  const decides = decidingWords(finding, plan)
  if (room === undefined || room === finding) return decides
  return `${decides}; figures to ${decidingWords(room, plan)}`.slice(0, 300)
}

const LIMIT_WORDS = {
  critical: 'critical',
  alarm: 'alarm',
  'cold-effort': 'cold effort',
  other: 'limit',
} as const

/** "alarm, Bramble (A), leg 7": what decides, whose and where. */
function decidingWords(finding: Finding, plan: Plan): string {
  const kind = finding.basis === 'physiology' ? LIMIT_WORDS[finding.limitKind ?? 'other'] : finding.basis
  const side = finding.side === 'low' && finding.limitKind !== 'cold-effort' ? ' low' : ''
  const animal = plan.animals.find(({ id }) => id === finding.animalId)
  const crate = plan.crates.find(
    ({ id, occupants }) => id === finding.crateId || (animal !== undefined && occupants.includes(animal.id)),
  )
  const who = animal ? `${animal.name} (${crate?.letter ?? ''})` : crate ? `crate ${crate.letter}` : 'all'
  const leg = plan.legs.findIndex(({ id }) => id === finding.legId)
  return [`${kind}${side}`, who, ...(leg < 0 ? [] : [`leg ${leg + 1}`])].join(', ')
}
