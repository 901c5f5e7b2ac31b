import 'server-only'
import type { Transaction } from 'sequelize'
import type { FieldIssue } from '@/lib/errors'
import type { Finding } from '@/lib/rules/result'
import type { Plan } from '@/lib/schemas/plan'
import { models } from '@/models'
import type { Assessment, Consignment } from '@/models'
import { signedCrates } from '../approvals/signed-crates'
import { holdsRelease, standingConditions } from '../assessments/conditions'
import { readResult } from '../assessments/read-result'
import { absoluteBreaches } from '../consignments/current-assessment'
import type { CurrentAssessment } from '../consignments/current-assessment'
import { effectiveOf } from '../consignments/effective-figures'

const HOUR_MS = 3_600_000
/** Legs that start this soon need fresh air figures, and this old they may be. */
export const AIR_NEEDED_FOR_MS = 48 * HOUR_MS
export const AIR_OLDEST_MS = 12 * HOUR_MS

/** Everything that stands in the way of a release, all at once; none means it may go. */
export async function releaseObstacles(
  tx: Transaction,
  row: Consignment,
  { assessment, findings, plan }: CurrentAssessment,
  now: Date,
): Promise<FieldIssue[]> {
  return [
    ...departureObstacles(row, now),
    ...(await verdictObstacles(tx, row, { assessment, findings, plan })),
    ...(await signatureObstacles(tx, row, plan)),
    ...(await conditionObstacles(tx, row, plan)),
    ...(await airObstacles(tx, row, now)),
  ]
}

function departureObstacles(row: Consignment, now: Date): FieldIssue[] {
  const obstacles: FieldIssue[] = []
  if (row.inForceState === 'under_way') {
    obstacles.push({
      path: 'state',
      message: 'An earlier revision is under way: it cannot be replaced on the road.',
    })
  }
  if (row.departsAt === null || row.departsAt.getTime() <= now.getTime()) {
    obstacles.push({
      path: 'legs.0.startLocal',
      message: 'The departure is past: put a later one and assess again.',
    })
  }
  return obstacles
}

async function verdictObstacles(
  tx: Transaction,
  row: Consignment,
  { assessment, findings, plan }: { assessment: Assessment; findings: Finding[]; plan: Plan },
): Promise<FieldIssue[]> {
  const absolute = absoluteBreaches(findings)
  if (absolute.length > 0) {
    return absolute.map(({ rule, note }) => ({
      path: `findings.${rule}`,
      message: `Nobody can release this: ${note}`,
    }))
  }
  const result = await readResult(assessment, tx)
  if (result === null) return [{ path: 'assessment', message: 'The assessment has no result.' }]
  const effective = effectiveOf(result, plan, await signedCrates(tx, row), await standingConditions(tx, row))
  if (effective.verdict.verdict !== 'no-go') return []
  const decides = effective.findings[effective.verdict.decidedBy ?? -1]
  return [
    { path: 'verdict', message: `The verdict is NO-GO: ${decides?.note ?? 'a breach is not overridden.'}` },
  ]
}

async function signatureObstacles(tx: Transaction, row: Consignment, plan: Plan): Promise<FieldIssue[]> {
  const signed = await signedCrates(tx, row)
  return plan.crates
    .filter(({ id }) => !signed.has(id))
    .map(({ letter }) => ({
      path: `crates.${letter}`,
      message: `Crate ${letter} is not signed for this plan.`,
    }))
}

async function conditionObstacles(tx: Transaction, row: Consignment, plan: Plan): Promise<FieldIssue[]> {
  const conditions = await standingConditions(tx, row)
  return conditions.filter(holdsRelease).map(({ row: condition }) => {
    const leg = plan.legs.findIndex(({ id }) => id === condition.legRef)
    const where = leg < 0 ? 'the whole journey' : `leg ${leg + 1}`
    const answer = condition.answer === 'refused' ? 'was refused' : 'is not confirmed'
    const party = condition.party === '' ? 'the party in charge' : condition.party
    return {
      path: `conditions.${condition.id}`,
      message: `“${condition.text}” (${where}, asked of ${party}) ${answer}.`,
    }
  })
}

async function airObstacles(tx: Transaction, row: Consignment, now: Date): Promise<FieldIssue[]> {
  const legs = await models.Leg.findAll({
    where: { consignmentId: row.id },
    order: ['position'],
    transaction: tx,
  })
  return legs.flatMap((leg, index) => {
    const soon = leg.startsAt !== null && leg.startsAt.getTime() - now.getTime() <= AIR_NEEDED_FOR_MS
    const ageMs = leg.airEnteredAt === null ? Infinity : now.getTime() - leg.airEnteredAt.getTime()
    if (!soon || ageMs <= AIR_OLDEST_MS) return []
    const age = Number.isFinite(ageMs) ? `is ${Math.floor(ageMs / HOUR_MS)} h old` : 'has no date'
    return [
      {
        path: `legs.${index}.air`,
        message: `The air of leg ${index + 1} ${age}: it starts within 48 h, so look again and confirm or change it.`,
      },
    ]
  })
}
