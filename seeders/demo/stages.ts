import { actorOf } from '@/lib/auth/sign-in'
import { approveCrates } from '@/lib/domain/approvals/approve'
import { returnCrates } from '@/lib/domain/approvals/return'
import { answerCondition } from '@/lib/domain/consignments/answer-condition'
import { assessConsignment } from '@/lib/domain/consignments/assess'
import { createConsignment } from '@/lib/domain/consignments/create'
import { deliverConsignment, departConsignment } from '@/lib/domain/consignments/depart'
import { readPlan } from '@/lib/domain/consignments/read-plan'
import { submitConsignment } from '@/lib/domain/consignments/submit'
import { releaseConsignment } from '@/lib/domain/release/release'
import type { Actor } from '@/lib/policies/actor'
import { earlySignsOf } from '@/lib/species/early-signs'
import { runNextJob } from '@/lib/workers/run-job'
import { plainAssessor } from '@/lib/workers/assessor'
import { models } from '@/models'
import type { DemoConsignment, DemoStage, DemoWorld } from './consignments/common'
import { DEMO_PASSWORD } from './people'
import { requestIdOf } from './request-id'

/** The stages in the order a consignment passes them. */
const WAY: readonly DemoStage[] = [
  'draft',
  'assessed',
  'in_review',
  'approved',
  'released',
  'under_way',
  'delivered',
]
const HOUR_MS = 3_600_000

/** Takes one demo consignment as far as its stage, through the verbs, at a moment in the past when it was prepared. */
export async function bringTo(demo: DemoConsignment, world: DemoWorld): Promise<void> {
  const before = await models.AuditEvent.findOne({ where: { requestId: requestIdOf(demo.key, 'create') } })
  if (before !== null && (await isThere(before.consignmentId, demo.stage))) return
  const prepared = new Date(world.now.getTime() - demo.preparedHoursAgo * HOUR_MS)
  const desk = await personOf(world, 'dispatcher')
  const ask = (act: string) => ({ consignmentId, requestId: requestIdOf(demo.key, act) })

  const plan = demo.plan(world)
  const { consignmentId } = await createConsignment(
    desk,
    { requestId: requestIdOf(demo.key, 'create'), plan },
    prepared,
  )
  if (!reaches(demo.stage, 'assessed')) return
  await assessConsignment(desk, ask('assess'), prepared)
  await workOff(prepared)
  if (!reaches(demo.stage, 'in_review')) return
  await submitConsignment(desk, ask('submit'), prepared)
  if (demo.stage === 'returned' || reaches(demo.stage, 'approved'))
    await decide(demo, world, consignmentId, prepared)
  if (!reaches(demo.stage, 'released')) return
  await confirmAll(desk, consignmentId, demo.key, prepared)
  await releaseConsignment(desk, ask('release'), prepared)
  await workOff(prepared)
  if (!reaches(demo.stage, 'under_way')) return
  const { departsAt, arrivesAt } = await models.Consignment.findByPk(consignmentId, { rejectOnEmpty: true })
  const inPlaceOfDriver = 'Told by telephone from the yard.'
  await departConsignment(desk, { ...ask('depart'), inPlaceOfDriver }, departsAt ?? world.now)
  if (!reaches(demo.stage, 'delivered')) return
  const receivedBy = 'Barn manager, in person'
  await deliverConsignment(desk, { ...ask('deliver'), inPlaceOfDriver, receivedBy }, arrivesAt ?? world.now)
}

function reaches(stage: DemoStage, step: DemoStage): boolean {
  const reached = stage === 'returned' ? 'in_review' : stage
  return WAY.indexOf(reached) >= WAY.indexOf(step)
}

async function isThere(consignmentId: number | null, stage: DemoStage): Promise<boolean> {
  if (consignmentId === null) return false
  const row = await models.Consignment.findByPk(consignmentId)
  // People may have taken it further or back since: the demo is theirs then.
  return row !== null && (row.state === stage || row.version > 1 || row.revision > 1)
}

async function decide(demo: DemoConsignment, world: DemoWorld, consignmentId: number, at: Date) {
  const vet = await personOf(world, 'vet')
  const row = await models.Consignment.findByPk(consignmentId, { rejectOnEmpty: true })
  const crates = await models.Crate.findAll({ where: { consignmentId }, order: ['position'] })
  const ask = {
    consignmentId,
    requestId: requestIdOf(demo.key, 'decide'),
    crateIds: crates.map(({ ref }) => ref),
  }
  if (demo.stage === 'returned') {
    await returnCrates(
      vet,
      { ...ask, crateIds: ask.crateIds.slice(0, 1), reason: demo.reasons ?? 'Look again.' },
      at,
    )
    return
  }
  await approveCrates(
    vet,
    {
      ...ask,
      planHash: row.planHash ?? '',
      password: DEMO_PASSWORD,
      examined: false,
      conditions: (demo.vetConditions ?? []).map((text) => ({
        text,
        legId: null,
        party: 'Corran Animal Couriers',
      })),
      earlySigns: await offeredSigns(consignmentId),
      overrides: [],
    },
    at,
  )
}

/** The demo's vet keeps every sign that is offered. */
async function offeredSigns(consignmentId: number) {
  const row = await models.Consignment.findByPk(consignmentId, { rejectOnEmpty: true })
  const plan = await readPlan(row)
  return plan.crates.flatMap(({ id, occupants }) =>
    plan.animals
      .filter((animal) => occupants.includes(animal.id))
      .flatMap(({ profileKey }) => earlySignsOf(profileKey).map((text) => ({ crateId: id, text }))),
  )
}

/** Every party asked has confirmed in writing. */
export async function confirmAll(desk: Actor, consignmentId: number, key: string, at: Date) {
  const waiting = await models.Condition.findAll({ where: { consignmentId, answer: null }, order: ['id'] })
  for (const [index, condition] of waiting.entries()) {
    await answerCondition(
      desk,
      {
        conditionId: condition.id,
        requestId: requestIdOf(key, 'confirm', index),
        answer: 'confirmed',
        how: 'writing',
        answeredBy: `Duty officer, ${condition.party || 'Corran Animal Couriers'}`,
        note: '',
      },
      at,
    )
  }
}

export async function workOff(at: Date) {
  const shift = { worker: 'demo', assessor: plainAssessor(), clock: () => at }
  while (await runNextJob(shift));
}

export async function personOf(world: DemoWorld, key: string): Promise<Actor> {
  const user = await models.User.findByPk(world.people[key] ?? 0, { include: 'shipper', rejectOnEmpty: true })
  return actorOf(user, null)
}
