import { beforeEach, describe, expect, it } from 'vitest'
import { recordAssessment } from '@/lib/domain/assessments/record'
import { assessConsignment } from '@/lib/domain/consignments/assess'
import { createConsignment } from '@/lib/domain/consignments/create'
import { readPlan } from '@/lib/domain/consignments/read-plan'
import { saveConsignment } from '@/lib/domain/consignments/save'
import type { PlanConflict } from '@/lib/domain/consignments/save'
import { models } from '@/models'
import { emptyTables } from '../support/db'
import { NOW, act, approved, assessed, foundWell, later, refusal, released, saved, world } from './world'
import type { World } from './world'

let place: World
beforeEach(async () => {
  await emptyTables()
  place = await world()
})

const load = (id: number) => models.Consignment.findByPk(id, { rejectOnEmpty: true })

describe('a new consignment', () => {
  it('keeps the plan as it was typed, with a mark, figures for the board and words to be found by', async () => {
    const { consignmentId, mark } = await saved(place, NOW)
    const row = await load(consignmentId)
    expect(mark).toMatch(/^\d{4}$/)
    expect(await readPlan(row)).toEqual(place.plan)
    expect(row.planHash).toMatch(/^[0-9a-f]{64}$/)
    // 10:00 on the clock at Balfron in June is 09:00 UTC.
    expect(row.departsAt?.toISOString()).toBe('2026-06-10T09:00:00.000Z')
    expect(row.animalsSummary).toBe('2 × dog')
    const words = await models.ConsignmentWord.findAll({ where: { consignmentId } })
    expect(words.map(({ word }) => word)).toEqual(expect.arrayContaining([mark, 'moss', 'balfron', 'collie']))
  })

  it('is made once however often the button is pressed, also at the same moment', async () => {
    const input = { ...act(), plan: place.plan }
    const create = () => createConsignment(place.as('dispatcher'), input, NOW)
    const [first, second] = await Promise.all([create(), create()])
    const third = await create()
    expect(second).toEqual(first)
    expect(third).toEqual(first)
    expect(await models.Consignment.count()).toBe(1)
  })

  it('gives every open consignment its own mark', async () => {
    const made = await Promise.all(
      Array.from({ length: 6 }, () =>
        createConsignment(place.as('dispatcher'), { ...act(), plan: place.plan }, NOW),
      ),
    )
    expect(new Set(made.map(({ mark }) => mark)).size).toBe(6)
  })

  it.each(['vet', 'driver', 'shipper', 'admin'] as const)(
    'is refused to a %s, and the refusal is written down',
    async (person) => {
      const promise = createConsignment(place.as(person), { ...act(), plan: place.plan }, NOW)
      expect(await refusal(promise)).toMatchObject({ code: 'not_allowed' })
      expect(await models.Consignment.count()).toBe(0)
      expect(await models.AuditEvent.count({ where: { verb: 'consignment.create.refused' } })).toBe(1)
    },
  )

  it('is refused where it points to what is not there, all at once', async () => {
    const plan = structuredClone(place.plan)
    plan.shipperId = 999_999
    plan.legs.forEach((leg) => (leg.driverId = place.people.vet.id))
    plan.crates.forEach((crate) => (crate.occupants = [plan.animals[0]?.id ?? '']))
    const { code, issues } = await refusal(createConsignment(place.as('dispatcher'), { ...act(), plan }, NOW))
    expect(code).toBe('invalid')
    expect(issues.map(({ path }) => path)).toEqual([
      'shipperId',
      'crates.1.occupants',
      'legs.0.driverId',
      'legs.1.driverId',
    ])
  })
})

describe('saving', () => {
  it('refuses the second of two editors with both versions, and overwrites nothing', async () => {
    const { consignmentId, version } = await saved(place, NOW)
    const theirs = { ...place.plan, handlingNote: 'Carry level.' }
    const mine = { ...place.plan, handlingNote: 'Carry gently.' }
    await saveConsignment(
      place.as('otherDispatcher'),
      { ...act(), consignmentId, version, plan: theirs },
      later(5),
    )
    const error = await refusal(
      saveConsignment(place.as('dispatcher'), { ...act(), consignmentId, version, plan: mine }, later(6)),
    )
    expect(error.code).toBe('conflict')
    const { yours, meanwhile } = error.details as unknown as PlanConflict
    expect(yours.handlingNote).toBe('Carry gently.')
    expect(meanwhile).toEqual({ plan: theirs, version: 2, by: 'N. Adeyemi-Ross', atMs: later(5).getTime() })
    expect((await readPlan(await load(consignmentId))).handlingNote).toBe('Carry level.')
  })

  it('lets one of two editors at the same moment win', async () => {
    const { consignmentId, version } = await saved(place, NOW)
    const save = (who: 'dispatcher' | 'otherDispatcher') =>
      saveConsignment(
        place.as(who),
        { ...act(), consignmentId, version, plan: { ...place.plan, handlingNote: who } },
        NOW,
      )
    const results = await Promise.allSettled([save('dispatcher'), save('otherDispatcher')])
    expect(results.map(({ status }) => status).sort()).toEqual(['fulfilled', 'rejected'])
    expect((await load(consignmentId)).version).toBe(2)
  })

  it('answers a second press of the same save with the first answer', async () => {
    const { consignmentId, version } = await saved(place, NOW)
    const input = { ...act(), consignmentId, version, plan: { ...place.plan, handlingNote: 'Once.' } }
    const first = await saveConsignment(place.as('dispatcher'), input, NOW)
    expect(await saveConsignment(place.as('dispatcher'), input, later(1))).toEqual(first)
    expect((await load(consignmentId)).version).toBe(2)
  })

  it('does not lend one person’s request to another', async () => {
    const input = { ...act(), plan: place.plan }
    await createConsignment(place.as('dispatcher'), input, NOW)
    expect(await refusal(createConsignment(place.as('otherDispatcher'), input, NOW))).toMatchObject({
      code: 'invalid',
    })
  })

  it('says nothing of a consignment to those who may not see it', async () => {
    const { consignmentId, version } = await saved(place, NOW)
    const input = { ...act(), consignmentId, version, plan: place.plan }
    expect(await refusal(saveConsignment(place.as('otherShipper'), input, NOW))).toMatchObject({
      code: 'not_found',
    })
    expect(await refusal(saveConsignment(place.as('driver'), { ...input, ...act() }, NOW))).toMatchObject({
      code: 'not_found',
    })
    expect(await refusal(saveConsignment(place.as('shipper'), { ...input, ...act() }, NOW))).toMatchObject({
      code: 'not_allowed',
    })
    expect(await refusal(saveConsignment(place.as('vet'), { ...input, ...act() }, NOW))).toMatchObject({
      code: 'not_allowed',
    })
  })

  it('voids what was signed when the plan changes, and says so', async () => {
    const { consignmentId } = await approved(place, NOW)
    const row = await load(consignmentId)
    const plan = structuredClone(place.plan)
    plan.animals.forEach((animal) => (animal.massKg = 20))
    const answer = await saveConsignment(
      place.as('dispatcher'),
      { ...act(), consignmentId, version: row.version, plan },
      later(30),
    )
    expect(answer).toMatchObject({ state: 'draft', revision: 1 })
    expect(answer.voided).toBe('The plan was changed: 2 approvals by S. Halloway-Odu are void.')
    const approvals = await models.Approval.findAll({ where: { consignmentId } })
    expect(approvals.every(({ voidedAt, withdrawn }) => voidedAt !== null && !withdrawn)).toBe(true)
    expect((await load(consignmentId)).outOfDate).toBe(true)
  })

  it('leaves signatures alone where only a telephone or a driver changes', async () => {
    const { consignmentId } = await approved(place, NOW)
    const row = await load(consignmentId)
    const plan = structuredClone(place.plan)
    plan.legs.forEach((leg) => (leg.partyTelephone = '+44 141 496 0999'))
    const first = plan.legs[0]
    if (first) first.driverId = place.people.otherDriver.id
    const answer = await saveConsignment(
      place.as('dispatcher'),
      { ...act(), consignmentId, version: row.version, plan },
      later(30),
    )
    expect(answer).toMatchObject({ state: 'approved', voided: null })
    expect(await models.Approval.count({ where: { consignmentId, voidedAt: null } })).toBe(2)
  })

  it('starts the next revision of a released plan while the old one stays in force', async () => {
    const { consignmentId } = await released(place, NOW)
    const before = await load(consignmentId)
    const plan = structuredClone(place.plan)
    plan.animals.forEach((animal) => (animal.massKg = 20))
    const answer = await saveConsignment(
      place.as('dispatcher'),
      { ...act(), consignmentId, version: before.version, plan },
      later(30),
    )
    expect(answer).toMatchObject({ state: 'draft', revision: 2, voided: null })
    const row = await load(consignmentId)
    expect(row).toMatchObject({
      inForceRevision: 1,
      inForceState: 'released',
      assessmentId: null,
      verdict: null,
    })
    expect(await models.Document.count({ where: { consignmentId, state: 'current' } })).toBe(2)
    expect(await models.Approval.count({ where: { consignmentId, voidedAt: null } })).toBe(2)
  })

  it('ends an assessment that is still running, and keeps the figures of the last one as out of date', async () => {
    const { consignmentId, version } = await saved(place, NOW)
    await assessed(place, consignmentId, NOW)
    const heavier = (massKg: number) => {
      const plan = structuredClone(place.plan)
      plan.animals.forEach((animal) => (animal.massKg = massKg))
      return plan
    }
    await saveConsignment(
      place.as('dispatcher'),
      { ...act(), consignmentId, version, plan: heavier(21) },
      later(9),
    )
    expect(await load(consignmentId)).toMatchObject({ state: 'draft', outOfDate: true, verdict: 'go' })
    const { assessmentId } = await assessConsignment(
      place.as('dispatcher'),
      { ...act(), consignmentId },
      later(10),
    )
    const next = { ...act(), consignmentId, version: version + 1, plan: heavier(22) }
    await saveConsignment(place.as('dispatcher'), next, later(11))
    expect(await models.Assessment.findByPk(assessmentId)).toMatchObject({ status: 'superseded' })
    expect(await recordAssessment({ assessmentId, result: foundWell(place.plan) }, later(12))).toBe(
      'superseded',
    )
    expect(await load(consignmentId)).toMatchObject({ state: 'draft' })
  })
})
