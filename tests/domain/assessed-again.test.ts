import { beforeEach, describe, expect, it } from 'vitest'
import { approveCrates } from '@/lib/domain/approvals/approve'
import { returnCrates } from '@/lib/domain/approvals/return'
import { recordAssessment } from '@/lib/domain/assessments/record'
import { planningKnowledge } from '@/lib/domain/catalogue/knowledge'
import { assessConsignment } from '@/lib/domain/consignments/assess'
import { judgePlan } from '@/lib/domain/consignments/judge-plan'
import { saveConsignment } from '@/lib/domain/consignments/save'
import { readSnapshot } from '@/lib/domain/snapshot'
import { planSchema } from '@/lib/schemas/plan'
import { models } from '@/models'
import { emptyTables } from '../support/db'
import { NOW, act, approved, breach, foundWell, inReview, later, refusal, signature, world } from './world'
import type { World } from './world'

let place: World
beforeEach(async () => {
  await emptyTables()
  place = await world()
})

const load = (id: number) => models.Consignment.findByPk(id, { rejectOnEmpty: true })
const standing = (consignmentId: number) =>
  models.Approval.count({ where: { consignmentId, decision: 'approved', voidedAt: null } })

/** An admin puts a new version of the dog’s row in force: nothing assessed before speaks of it. */
async function newDogRow() {
  const old = await models.SpeciesProfile.findOne({ where: { key: 'dog' }, rejectOnEmpty: true })
  const { id: _id, ...values } = old.get({ plain: true })
  const createdBy = place.people.admin.id
  await models.SpeciesProfile.create({ ...values, version: values.version + 1, createdBy })
}

const again = (consignmentId: number) =>
  assessConsignment(place.as('dispatcher'), { ...act(), consignmentId }, later(6))

describe('a species row that moves on', () => {
  it('holds a signature back until the plan is assessed again, and never a return', async () => {
    const { consignmentId } = await inReview(place, NOW)
    await newDogRow()
    const sign = async () => approveCrates(place.as('vet'), await signature(place, consignmentId), later(5))
    expect(await refusal(sign())).toMatchObject({ code: 'out_of_date' })
    const { assessmentId } = await again(consignmentId)
    await recordAssessment({ assessmentId, result: foundWell(place.plan) }, later(7))
    expect(await load(consignmentId)).toMatchObject({ state: 'in_review', holder: 'vet' })
    expect(await sign()).toMatchObject({ state: 'approved' })
  })

  it('lets the vet send the plan back meanwhile', async () => {
    const { consignmentId } = await inReview(place, NOW)
    await newDogRow()
    const back = { ...act(), consignmentId, crateIds: ['crate-1'], reason: 'Assess it again first.' }
    expect(await returnCrates(place.as('vet'), back, later(5))).toMatchObject({ state: 'returned' })
  })

  it('leaves what is approved approved where the new run is no worse', async () => {
    const { consignmentId } = await approved(place, NOW)
    await newDogRow()
    const { assessmentId } = await again(consignmentId)
    await recordAssessment({ assessmentId, result: foundWell(place.plan) }, later(7))
    expect(await load(consignmentId)).toMatchObject({ state: 'approved', outOfDate: false })
    expect(await standing(consignmentId)).toBe(2)
  })

  it('takes the approval away where the new run is worse, and gives the plan back to the desk', async () => {
    const { consignmentId } = await approved(place, NOW)
    await newDogRow()
    const { assessmentId } = await again(consignmentId)
    await recordAssessment({ assessmentId, result: foundWell(place.plan, [breach(place.plan)]) }, later(7))
    expect(await load(consignmentId)).toMatchObject({
      state: 'assessed',
      holder: 'dispatcher',
      verdict: 'no-go',
    })
    expect(await standing(consignmentId)).toBe(1)
  })
})

describe('the plan an assessment was made of', () => {
  it('is kept under its hash, and gives the plan hash that was signed, whatever the plan becomes', async () => {
    const { consignmentId, version, mark } = await approved(place, NOW)
    const signed = await load(consignmentId)
    const plan = structuredClone(place.plan)
    plan.animals.forEach((animal) => (animal.name = `${animal.name} the second`))
    await saveConsignment(place.as('dispatcher'), { ...act(), consignmentId, version, plan }, later(30))
    expect((await load(consignmentId)).planHash).not.toBe(signed.planHash)
    const { planSnapshotHash } = await models.Assessment.findByPk(signed.assessmentId ?? 0, {
      rejectOnEmpty: true,
    })
    const kept = (await readSnapshot(planSnapshotHash ?? '')) as { plan: unknown; planHash: string }
    const keptPlan = planSchema.parse(kept.plan)
    expect(keptPlan.animals.map(({ name }) => name)).toEqual(place.plan.animals.map(({ name }) => name))
    const judged = judgePlan(keptPlan, mark, await planningKnowledge(keptPlan))
    expect(judged.assessable && judged.planHash).toBe(signed.planHash)
  })
})
