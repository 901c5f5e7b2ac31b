import { beforeEach, describe, expect, it } from 'vitest'
import { answerCondition } from '@/lib/domain/consignments/answer-condition'
import { approveCrates } from '@/lib/domain/approvals/approve'
import { cancelConsignment } from '@/lib/domain/consignments/cancel'
import { confirmAir } from '@/lib/domain/consignments/confirm-air'
import { deliverConsignment, departConsignment, stopConsignment } from '@/lib/domain/consignments/depart'
import { planInForce } from '@/lib/domain/consignments/plan-in-force'
import { readPlan } from '@/lib/domain/consignments/read-plan'
import { saveConsignment } from '@/lib/domain/consignments/save'
import { submitConsignment } from '@/lib/domain/consignments/submit'
import { prepareRelease } from '@/lib/domain/release/prepare'
import type { PreparedRelease } from '@/lib/domain/release/prepare'
import { recordRelease } from '@/lib/domain/release/record'
import { releaseConsignment } from '@/lib/domain/release/release'
import { models } from '@/models'
import { emptyTables } from '../support/db'
import {
  NOW,
  act,
  approved,
  assessed,
  inReview,
  later,
  recordPapers,
  refusal,
  released,
  signature,
  world,
} from './world'
import type { World } from './world'

let place: World
beforeEach(async () => {
  await emptyTables()
  place = await world()
})

const load = (id: number) => models.Consignment.findByPk(id, { rejectOnEmpty: true })
const HOUR = 60

/** Papers of a few bytes: what is sealed into them is tested elsewhere. */
const issuedOf = ({ manifest }: PreparedRelease) => ({
  papers: [
    {
      kind: 'manifest' as const,
      code: manifest.documentCode ?? '',
      bytes: Buffer.from(`%PDF-1.7 ${manifest.documentCode}`),
      pages: 1,
      view: {},
    },
  ],
  letter: { to: 'j.strand@example.org', subject: 'Manifest', text: 'Attached.', html: '<p>Attached.</p>' },
})

describe('release', () => {
  const release = (consignmentId: number, now = NOW) =>
    releaseConsignment(place.as('dispatcher'), { ...act(), consignmentId }, now)

  it('queues the papers once, and is recorded once', async () => {
    const { consignmentId } = await approved(place, NOW)
    await release(consignmentId)
    await release(consignmentId)
    const jobs = await models.Job.findAll({ where: { kind: 'release' } })
    expect(jobs).toHaveLength(1)
    const prepared = await prepareRelease(jobs[0]?.payload, NOW)
    expect(prepared).toMatchObject({
      shipperEmail: 'j.strand@example.org',
      releasedBy: { name: 'I. Quennell' },
    })
    expect(prepared?.manifest.documentCode).toMatch(/^[A-HJ-NP-Z2-9]{8}$/)
    expect(prepared?.sheet.documentCode).not.toBe(prepared?.manifest.documentCode)
    expect(await recordPapers(place, consignmentId, NOW)).toMatchObject({
      documentIds: [expect.any(Number), expect.any(Number)],
    })
    expect(await recordPapers(place, consignmentId, later(1))).toBe('already')
    expect(await prepareRelease(jobs[0]?.payload, later(1))).toBeNull()
    const row = await load(consignmentId)
    expect(row).toMatchObject({
      state: 'released',
      inForceState: 'released',
      inForceRevision: 1,
      holder: 'driver',
    })
    expect((await planInForce(row))?.plan).toEqual(place.plan)
    expect(await models.OutboxMessage.findAll({ where: { subject: 'Manifest' } })).toMatchObject([
      { toAddress: 'j.strand@example.org', state: 'waiting' },
    ])
  })

  it.each(['vet', 'driver', 'shipper', 'admin'] as const)('is refused to a %s', async (person) => {
    const { consignmentId } = await approved(place, NOW)
    const promise = releaseConsignment(place.as(person), { ...act(), consignmentId }, NOW)
    expect(['not_allowed', 'not_found']).toContain((await refusal(promise)).code)
    expect(await models.Job.count({ where: { kind: 'release' } })).toBe(0)
  })

  it('is refused before everything is signed', async () => {
    const { consignmentId } = await inReview(place, NOW)
    expect(await refusal(release(consignmentId))).toMatchObject({ code: 'wrong_state' })
  })

  it('needs air of at most 12 hours for legs that start within 48, and a fresh look puts it right', async () => {
    const { consignmentId } = await approved(place, NOW)
    expect(await release(consignmentId, later(12 * HOUR))).toEqual({ releasing: true })
    const error = await refusal(release(consignmentId, later(12 * HOUR + 1)))
    expect(error.code).toBe('refused')
    expect(error.issues.map(({ path }) => path)).toEqual(['legs.0.air', 'legs.1.air'])
    const look = { ...act(), consignmentId, legIds: [] }
    expect(await confirmAir(place.as('dispatcher'), look, later(13 * HOUR))).toEqual({ legs: 2 })
    expect(await release(consignmentId, later(13 * HOUR))).toEqual({ releasing: true })
    expect(await load(consignmentId)).toMatchObject({ state: 'approved', outOfDate: false })
    expect(await refusal(confirmAir(place.as('vet'), { ...look, ...act() }, NOW))).toMatchObject({
      code: 'not_allowed',
    })
  })

  it('is refused once the departure is past', async () => {
    const { consignmentId } = await approved(place, NOW)
    const after = new Date('2026-06-10T09:00:00Z')
    const error = await refusal(release(consignmentId, after))
    expect(error.issues.map(({ path }) => path)).toContain('legs.0.startLocal')
  })

  it('waits for conditions of parties outside, and for good where one was refused', async () => {
    const { consignmentId } = await inReview(place, NOW)
    const conditions = [
      { text: 'Shed held at 18 °C.', legId: 'leg-2', party: '' },
      { text: 'Read the air at loading.', legId: 'leg-1', party: '' },
    ]
    await approveCrates(place.as('vet'), await signature(place, consignmentId, { conditions }), NOW)
    const waiting = await refusal(release(consignmentId))
    expect(waiting.issues).toHaveLength(1)
    expect(waiting.issues[0]?.message).toContain(
      '“Shed held at 18 °C.” (leg 2, asked of Skerrow Air Cargo) is not confirmed',
    )
    const condition = await models.Condition.findOne({ where: { legRef: 'leg-2' }, rejectOnEmpty: true })
    const answer = {
      ...act(),
      conditionId: condition.id,
      answer: 'confirmed' as const,
      how: 'telephone' as const,
      answeredBy: 'D. Aird',
      note: '',
    }
    expect(await refusal(answerCondition(place.as('vet'), { ...answer, ...act() }, NOW))).toMatchObject({
      code: 'not_allowed',
    })
    expect(await answerCondition(place.as('dispatcher'), answer, NOW)).toEqual({ answer: 'confirmed' })
    expect(await answerCondition(place.as('dispatcher'), answer, NOW)).toEqual({ answer: 'confirmed' })
    const again = { ...answer, ...act(), answer: 'refused' as const }
    expect(await refusal(answerCondition(place.as('dispatcher'), again, NOW))).toMatchObject({
      code: 'wrong_state',
    })
    expect(await release(consignmentId)).toEqual({ releasing: true })
  })

  it('looks again when the papers are recorded: a plan saved meanwhile is not released', async () => {
    const { consignmentId } = await approved(place, NOW)
    const row = await load(consignmentId)
    await release(consignmentId)
    const job = await models.Job.findOne({ where: { kind: 'release' }, rejectOnEmpty: true })
    const plan = structuredClone(place.plan)
    plan.animals.forEach((animal) => (animal.massKg = 20))
    await saveConsignment(
      place.as('dispatcher'),
      { ...act(), consignmentId, version: row.version, plan },
      NOW,
    )
    expect(await refusal(prepareRelease(job.payload, NOW))).toMatchObject({ code: 'wrong_state' })
    expect(await models.Document.count()).toBe(0)
  })

  it('records nothing where a telephone was saved while the papers were made, and prepares again', async () => {
    const { consignmentId } = await approved(place, NOW)
    const row = await load(consignmentId)
    await release(consignmentId)
    const job = await models.Job.findOne({ where: { kind: 'release' }, rejectOnEmpty: true })
    const first = await prepareRelease(job.payload, NOW)
    if (first === null) throw new Error('It is not released yet.')

    const plan = structuredClone(place.plan)
    plan.emergencyContact.telephone = '+44 7700 900999'
    const save = { ...act(), consignmentId, version: row.version, plan }
    await saveConsignment(place.as('dispatcher'), save, NOW)
    // The plan hash is what it was: nothing that was assessed or signed has changed.
    expect(await load(consignmentId)).toMatchObject({ state: 'approved', planHash: row.planHash })

    expect(await recordRelease(first, issuedOf(first), NOW)).toBe('changed')
    expect(await models.Document.count()).toBe(0)
    expect(await load(consignmentId)).toMatchObject({ state: 'approved', inForceState: null })

    const second = await prepareRelease(job.payload, NOW)
    if (second === null) throw new Error('It is not released yet.')
    expect(await recordRelease(second, issuedOf(second), NOW)).toMatchObject({
      documentIds: [expect.any(Number)],
    })
    const kept = (await planInForce(await load(consignmentId)))?.plan
    expect(kept?.emergencyContact.telephone).toBe('+44 7700 900999')
    expect(second.manifest.plan).toEqual(kept)
  })

  it('records nothing where an answer to a condition came while the papers were made', async () => {
    const { consignmentId } = await inReview(place, NOW)
    const conditions = [{ text: 'Read the air at loading.', legId: 'leg-1', party: '' }]
    await approveCrates(place.as('vet'), await signature(place, consignmentId, { conditions }), NOW)
    await release(consignmentId)
    const job = await models.Job.findOne({ where: { kind: 'release' }, rejectOnEmpty: true })
    const prepared = await prepareRelease(job.payload, NOW)
    if (prepared === null) throw new Error('It is not released yet.')
    const { id: conditionId } = await models.Condition.findOne({ rejectOnEmpty: true })
    const answer = { answer: 'confirmed', how: 'telephone', answeredBy: 'D. Aird', note: '' } as const
    await answerCondition(place.as('dispatcher'), { ...act(), conditionId, ...answer }, NOW)
    expect(await recordRelease(prepared, issuedOf(prepared), NOW)).toBe('changed')
  })

  it('replaces the revision in force, supersedes its papers and ends its approvals', async () => {
    const { consignmentId } = await released(place, NOW)
    const row = await load(consignmentId)
    const plan = structuredClone(place.plan)
    plan.animals.forEach((animal) => (animal.massKg = 20))
    await saveConsignment(
      place.as('dispatcher'),
      { ...act(), consignmentId, version: row.version, plan },
      NOW,
    )
    const next = { ...place, plan }
    await assessed(next, consignmentId, NOW)
    await submitConsignment(place.as('dispatcher'), { ...act(), consignmentId }, NOW)
    await approveCrates(place.as('vet'), await signature(next, consignmentId), NOW)
    await recordPapers(next, consignmentId, later(5))
    expect(await load(consignmentId)).toMatchObject({ revision: 2, inForceRevision: 2, state: 'released' })
    const papers = await models.Document.findAll({ order: ['id'] })
    expect(papers.map(({ revision, state }) => [revision, state])).toEqual([
      [1, 'superseded'],
      [1, 'superseded'],
      [2, 'current'],
      [2, 'current'],
    ])
    const ended = await models.Approval.findAll({ where: { revision: 1 } })
    expect(ended.every(({ voidedReason }) => voidedReason === 'Superseded by revision 2.')).toBe(true)
  })

  it('needs no second signature where the next revision changes nothing that was signed', async () => {
    const { consignmentId } = await released(place, NOW)
    const row = await load(consignmentId)
    const plan = structuredClone(place.plan)
    plan.legs.forEach((leg) => (leg.driverId = place.people.otherDriver.id))
    plan.legs.forEach((leg) => (leg.attended = leg.id === 'leg-1'))
    await saveConsignment(
      place.as('dispatcher'),
      { ...act(), consignmentId, version: row.version, plan },
      NOW,
    )
    await assessed({ ...place, plan }, consignmentId, NOW)
    const answer = await submitConsignment(place.as('dispatcher'), { ...act(), consignmentId }, NOW)
    expect(answer).toEqual({ state: 'approved' })
  })
})

describe('on the road', () => {
  const step = (consignmentId: number) => ({ ...act(), consignmentId, inPlaceOfDriver: '' })

  it('departs and is delivered by a driver named on it, each once', async () => {
    const { consignmentId } = await released(place, NOW)
    const go = step(consignmentId)
    expect(await departConsignment(place.as('driver'), go, later(60))).toEqual({ state: 'under_way' })
    expect(await departConsignment(place.as('driver'), go, later(61))).toEqual({ state: 'under_way' })
    const there = { ...step(consignmentId), receivedBy: 'D. Aird, Skerrow Air Cargo' }
    expect(await deliverConsignment(place.as('driver'), there, later(300))).toEqual({ state: 'delivered' })
    const row = await load(consignmentId)
    expect(row).toMatchObject({
      state: 'delivered',
      inForceState: 'delivered',
      openMark: null,
      holder: 'nobody',
    })
  })

  it('is nobody else’s: other drivers find nothing, a dispatcher says why', async () => {
    const { consignmentId } = await released(place, NOW)
    expect(await refusal(departConsignment(place.as('otherDriver'), step(consignmentId), NOW))).toMatchObject(
      { code: 'not_found' },
    )
    expect(await refusal(departConsignment(place.as('vet'), step(consignmentId), NOW))).toMatchObject({
      code: 'not_allowed',
    })
    expect(await refusal(departConsignment(place.as('dispatcher'), step(consignmentId), NOW))).toMatchObject({
      code: 'invalid',
    })
    const instead = { ...step(consignmentId), inPlaceOfDriver: 'His phone is dead.' }
    expect(await departConsignment(place.as('dispatcher'), instead, NOW)).toEqual({ state: 'under_way' })
    const line = await models.AuditEvent.findOne({
      where: { verb: 'consignment.depart' },
      rejectOnEmpty: true,
    })
    expect(line.note).toBe('In the driver’s place: His phone is dead.')
  })

  it('breaks off with the reason and where the animals are', async () => {
    const { consignmentId } = await released(place, NOW)
    const stop = {
      ...step(consignmentId),
      reason: 'Bridge closed.',
      whereAnimalsAre: 'In the van at Milngavie.',
    }
    expect(await refusal(stopConsignment(place.as('driver'), stop, NOW))).toMatchObject({
      code: 'wrong_state',
    })
    await departConsignment(place.as('driver'), step(consignmentId), NOW)
    expect(await stopConsignment(place.as('driver'), { ...stop, ...act() }, NOW)).toEqual({
      state: 'stopped',
    })
    expect((await load(consignmentId)).stoppedReason).toContain('In the van at Milngavie.')
  })

  it('acts on the revision in force: a draft of the next is set aside and the plan that travels is back', async () => {
    const { consignmentId } = await released(place, NOW)
    const row = await load(consignmentId)
    const plan = structuredClone(place.plan)
    plan.handlingNote = 'Of the next revision.'
    plan.animals.forEach((animal) => (animal.massKg = 20))
    await saveConsignment(
      place.as('dispatcher'),
      { ...act(), consignmentId, version: row.version, plan },
      NOW,
    )
    await departConsignment(place.as('driver'), step(consignmentId), later(60))
    const after = await load(consignmentId)
    expect(after).toMatchObject({ state: 'under_way', revision: 1, inForceRevision: 1, verdict: 'go' })
    expect(await readPlan(after)).toEqual(place.plan)
    const late = { ...act(), consignmentId, version: after.version, plan }
    expect(await refusal(saveConsignment(place.as('dispatcher'), late, later(61)))).toMatchObject({
      code: 'wrong_state',
    })
  })

  it('cannot be cancelled, only stopped', async () => {
    const { consignmentId } = await released(place, NOW)
    await departConsignment(place.as('driver'), step(consignmentId), NOW)
    const cancel = { ...act(), consignmentId, reason: 'Too late.' }
    expect(await refusal(cancelConsignment(place.as('dispatcher'), cancel, NOW))).toMatchObject({
      code: 'wrong_state',
    })
  })
})

describe('cancelling', () => {
  it('voids the papers and frees the mark', async () => {
    const { consignmentId } = await released(place, NOW)
    const cancel = { ...act(), consignmentId, reason: 'Owner keeps them.' }
    expect(await refusal(cancelConsignment(place.as('shipper'), cancel, NOW))).toMatchObject({
      code: 'not_allowed',
    })
    expect(await cancelConsignment(place.as('dispatcher'), { ...cancel, ...act() }, NOW)).toEqual({
      state: 'cancelled',
    })
    expect(await load(consignmentId)).toMatchObject({
      state: 'cancelled',
      openMark: null,
      inForceState: null,
    })
    expect(await models.Document.count({ where: { state: 'void' } })).toBe(2)
  })
})
