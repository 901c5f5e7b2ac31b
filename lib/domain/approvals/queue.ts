import 'server-only'
import { Op, col, fn } from 'sequelize'
import type { Actor } from '@/lib/policies/actor'
import type { ReviewQueueRow } from '@/lib/views/review'
import { buildQueueRows } from '@/lib/views/review-view/build-queue-rows'
import type { QueueCrate, QueueFinding } from '@/lib/views/review-view/build-queue-rows'
import { models } from '@/models'
import type { Approval, Consignment, Crate } from '@/models'
import { authorize } from '../authorize'
import { FIRM_ZONE, deskMoment } from '../firm'

const LONGEST_QUEUE = 100

/**
 * The crate set-ups that wait for a vet, in order of leaving; those of the same consignment already signed stand beside.
 * A handful of queries however long the queue is: a page that stays open asks for it twice a minute.
 */
export async function reviewQueue(actor: Actor): Promise<ReviewQueueRow[]> {
  authorize(actor, 'approval.queue')
  const rows = await models.Consignment.findAll({
    where: { state: 'in_review', departsAt: { [Op.ne]: null } },
    order: ['departsAt', 'id'],
    limit: LONGEST_QUEUE,
  })
  if (rows.length === 0) return []
  const [crates, approvals, findings, refused, species] = await Promise.all([
    cratesOf(rows),
    approvalsOf(rows),
    findingsOf(rows),
    refusedPlans(rows),
    speciesNames(),
  ])
  return rows.flatMap((row) =>
    buildQueueRows({
      consignmentId: row.id,
      mark: row.mark,
      fromPlace: row.fromPlaceName ?? '',
      toPlace: row.toPlaceName ?? '',
      leaves: { ms: row.departsAt?.getTime() ?? 0, zone: row.departsZone ?? FIRM_ZONE },
      outOfDate: row.outOfDate,
      findings: row.assessmentId === null ? null : (findings.get(row.assessmentId) ?? []),
      refused: refused.has(planKey(row)),
      crates: crates
        .filter(({ consignmentId }) => consignmentId === row.id)
        .map((crate) => queueCrate(crate, row, approvals, species)),
    }),
  )
}

const idsOf = (rows: readonly Consignment[]) => rows.map(({ id }) => id)
const planKey = (of: { id: number; planHash: string | null }) => `${of.id} ${of.planHash ?? ''}`

function cratesOf(rows: readonly Consignment[]): Promise<Crate[]> {
  return models.Crate.findAll({
    where: { consignmentId: idsOf(rows) },
    attributes: ['id', 'consignmentId', 'ref', 'letter'],
    include: [
      {
        association: 'occupants',
        include: [{ association: 'animal', attributes: ['ref', 'name', 'breedNote', 'profileKey'] }],
      },
    ],
    order: ['consignmentId', 'position', ['occupants', 'position', 'ASC']],
  })
}

function approvalsOf(rows: readonly Consignment[]): Promise<Approval[]> {
  return models.Approval.findAll({
    where: { consignmentId: idsOf(rows), voidedAt: null, decision: { [Op.ne]: 'returned' } },
    attributes: ['consignmentId', 'crateRef', 'planHash', 'signedAt'],
  })
}

/** What was found, by assessment: one line for each status about an animal or a crate, with the least margin. */
async function findingsOf(rows: readonly Consignment[]): Promise<Map<number, QueueFinding[]>> {
  const counted = (await models.Finding.findAll({
    where: {
      assessmentId: rows.flatMap(({ assessmentId }) => assessmentId ?? []),
      status: { [Op.ne]: 'note' },
    },
    attributes: [
      'assessmentId',
      'status',
      ['animal_ref', 'animalId'],
      ['crate_ref', 'crateId'],
      [fn('MIN', col('margin_outside_air_c')), 'marginOutsideAirC'],
    ],
    group: ['assessment_id', 'status', 'animal_ref', 'crate_ref'],
    raw: true,
  })) as unknown as (QueueFinding & { assessmentId: number })[]
  const byAssessment = new Map<number, QueueFinding[]>()
  for (const { assessmentId, marginOutsideAirC, ...finding } of counted) {
    const least = marginOutsideAirC === null ? null : Number(marginOutsideAirC)
    const known = byAssessment.get(assessmentId) ?? []
    byAssessment.set(assessmentId, [...known, { ...finding, marginOutsideAirC: least }])
  }
  return byAssessment
}

/** Plans of which somebody refused a condition that a rule or a narrow margin asks for. */
async function refusedPlans(rows: readonly Consignment[]): Promise<Set<string>> {
  const refused = await models.Condition.findAll({
    where: { consignmentId: idsOf(rows), answer: 'refused', origin: { [Op.ne]: 'vet' } },
    attributes: ['consignmentId', 'planHash'],
  })
  return new Set(refused.map(({ consignmentId, planHash }) => planKey({ id: consignmentId, planHash })))
}

/** What each species is called by its newest row. */
async function speciesNames(): Promise<Map<string, string>> {
  const rows = await models.SpeciesProfile.findAll({
    attributes: ['key', 'commonName', 'version'],
    order: ['version'],
  })
  return new Map(rows.map(({ key, commonName }) => [key, commonName]))
}

function queueCrate(
  crate: Crate,
  row: Consignment,
  approvals: readonly Approval[],
  species: ReadonlyMap<string, string>,
): QueueCrate {
  const approval = approvals.find(
    (one) => one.consignmentId === row.id && one.crateRef === crate.ref && one.planHash === row.planHash,
  )
  return {
    crateId: crate.ref,
    letter: crate.letter,
    animals: (crate.occupants ?? []).flatMap(({ animal }) =>
      animal === undefined
        ? []
        : [
            {
              animalId: animal.ref,
              name: animal.name,
              breedNote: animal.breedNote,
              speciesName: species.get(animal.profileKey) ?? animal.profileKey,
            },
          ],
    ),
    signed: approval === undefined ? null : deskMoment(approval.signedAt),
  }
}
