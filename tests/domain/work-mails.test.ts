import { beforeEach, describe, expect, it } from 'vitest'
import { approveCrates } from '@/lib/domain/approvals/approve'
import { returnCrates } from '@/lib/domain/approvals/return'
import { withdrawApproval } from '@/lib/domain/approvals/withdraw'
import { recordAssessment } from '@/lib/domain/assessments/record'
import { assessConsignment } from '@/lib/domain/consignments/assess'
import { saveConsignment } from '@/lib/domain/consignments/save'
import { submitConsignment } from '@/lib/domain/consignments/submit'
import { models } from '@/models'
import { emptyTables } from '../support/db'
import {
  NOW,
  act,
  approved,
  assessed,
  breach,
  foundWell,
  inReview,
  later,
  refusal,
  released,
  saved,
  signature,
  world,
} from './world'
import type { World } from './world'

let place: World
beforeEach(async () => {
  await emptyTables()
  place = await world()
})

/** The mails written so far, as [to, subject]. */
async function mails(subject: RegExp) {
  const all = await models.OutboxMessage.findAll({ order: ['id'] })
  return all.filter((mail) => subject.test(mail.subject))
}
const to = (rows: { toAddress: string }[]) => rows.map(({ toAddress }) => toAddress)
const plain = (text: string | undefined) => (text ?? '').replaceAll('\u00a0', ' ')

describe('sending for review', () => {
  it('mails every vet who may sign in, once however often the button is pressed', async () => {
    await models.User.update({ disabledAt: NOW }, { where: { id: place.people.uncheckedVet.id } })
    const { consignmentId, mark } = await saved(place, NOW)
    await assessed(place, consignmentId, NOW)
    const input = { ...act(), consignmentId }
    await Promise.all([0, 1].map(() => submitConsignment(place.as('dispatcher'), input, later(3))))
    await submitConsignment(place.as('dispatcher'), input, later(4))
    const sent = await mails(/waits for review/)
    expect(to(sent)).toEqual(['vet@example.org', 'otherVet@example.org'])
    // 10:00 on the clock at Balfron, where the journey begins.
    expect(plain(sent[0]?.subject)).toBe(`${mark}, revision 1 waits for review. Leaves Wed 10 Jun 10:00 BST`)
    expect(sent[0]).toMatchObject({ consignmentId, state: 'waiting', createdAt: later(3) })
    for (const part of [sent[0]?.html, sent[0]?.text]) {
      expect(part).toContain('I. Quennell sent revision 1 for review.')
      expect(part).toContain(`http://localhost:3000/review/${consignmentId}`)
    }
    expect(new Set(sent.map(({ messageId }) => messageId)).size).toBe(2)
  })

  it('writes no mail where it is refused, for want of an assessment or of the right', async () => {
    const { consignmentId } = await saved(place, NOW)
    await refusal(submitConsignment(place.as('dispatcher'), { ...act(), consignmentId }, NOW))
    await assessed(place, consignmentId, NOW, [breach(place.plan, { limitKind: 'critical' })])
    await refusal(submitConsignment(place.as('dispatcher'), { ...act(), consignmentId }, NOW))
    await refusal(submitConsignment(place.as('vet'), { ...act(), consignmentId }, NOW))
    expect(await models.OutboxMessage.count()).toBe(0)
  })
})

describe('returning', () => {
  const sendBack = async (consignmentId: number) => {
    const reason = 'Back face is blocked.'
    const input = { ...act(), consignmentId, crateIds: ['crate-2'], reason }
    await returnCrates(place.as('vet'), input, later(5))
    await returnCrates(place.as('vet'), input, later(6))
  }

  it('mails whoever sent it for review, with the vet’s own words', async () => {
    const { consignmentId, mark } = await inReview(place, NOW)
    await sendBack(consignmentId)
    const sent = await mails(/is returned/)
    expect(to(sent)).toEqual(['dispatcher@example.org'])
    expect(sent[0]?.subject).toBe(`${mark}, revision 1 is returned: ${mark}-B`)
    for (const part of [sent[0]?.html, sent[0]?.text]) {
      expect(part).toContain(`S. Halloway-Odu returned ${mark}-B.`)
      expect(part).toContain('“Back face is blocked.”')
      expect(part).toContain(`/consignments/${consignmentId}/plan`)
    }
  })

  it('mails all dispatchers where whoever sent it has left', async () => {
    const { consignmentId } = await inReview(place, NOW)
    await models.User.update({ disabledAt: NOW }, { where: { id: place.people.dispatcher.id } })
    await sendBack(consignmentId)
    expect(to(await mails(/is returned/))).toEqual(['otherDispatcher@example.org'])
  })
})

describe('an approval that no longer holds', () => {
  it('is told to each vet who signed, of that vet’s crates, and to the desk', async () => {
    const { consignmentId, mark, version } = await inReview(place, NOW)
    const one = await signature(place, consignmentId, { crateIds: ['crate-1'] })
    await approveCrates(place.as('vet'), one, NOW)
    const other = await signature(place, consignmentId, { crateIds: ['crate-2'] })
    await approveCrates(place.as('otherVet'), other, NOW)
    const plan = structuredClone(place.plan)
    plan.animals.forEach((animal) => (animal.massKg = 20))
    // The crates have other letters in the new plan: the mail says what was signed.
    plan.crates.forEach((crate) => (crate.letter = crate.letter === 'A' ? 'X' : 'Y'))
    const input = { ...act(), consignmentId, version, plan }
    await saveConsignment(place.as('otherDispatcher'), input, later(30))
    await saveConsignment(place.as('otherDispatcher'), input, later(31))
    const sent = await mails(/no longer holds/)
    expect(sent.map(({ toAddress, subject }) => [toAddress, subject])).toEqual([
      ['vet@example.org', `${mark}: approval of ${mark}-A no longer holds`],
      ['otherVet@example.org', `${mark}: approval of ${mark}-B no longer holds`],
      ['dispatcher@example.org', `${mark}: approval of ${mark}-A, ${mark}-B no longer holds`],
    ])
    for (const { text } of sent)
      expect(plain(text)).toContain('N. Adeyemi-Ross changed the plan after it was signed.')
  })

  it('is not told where only a telephone changes, nor where the signed revision stays in force', async () => {
    const { consignmentId, version } = await approved(place, NOW)
    const plan = structuredClone(place.plan)
    plan.legs.forEach((leg) => (leg.partyTelephone = '+44 141 496 0999'))
    await saveConsignment(place.as('dispatcher'), { ...act(), consignmentId, version, plan }, later(30))
    const next = await released(place, NOW)
    plan.animals.forEach((animal) => (animal.massKg = 20))
    await saveConsignment(place.as('dispatcher'), { ...act(), ...next, plan }, later(30))
    expect(await mails(/no longer holds/)).toEqual([])
  })

  it('is told to the desk and to the vet who signed where another vet withdraws it', async () => {
    const { consignmentId, mark } = await released(place, NOW)
    const [first, second] = await models.Approval.findAll({ where: { consignmentId }, order: ['id'] })
    const input = { ...act(), approvalId: first?.id ?? 0, reason: 'Carrier changed the hold.' }
    await withdrawApproval(place.as('otherVet'), input, later(9))
    await withdrawApproval(place.as('otherVet'), input, later(10))
    const sent = await mails(/no longer holds/)
    expect(to(sent)).toEqual(['vet@example.org', 'dispatcher@example.org'])
    expect(sent[0]?.subject).toBe(`${mark}: approval of ${mark}-A no longer holds`)
    expect(sent[0]?.text).toContain('T. Ilves-Marr withdrew it.')
    expect(sent[0]?.text).toContain('“Carrier changed the hold.”')

    const own = { ...act(), approvalId: second?.id ?? 0, reason: 'And the other.' }
    await withdrawApproval(place.as('vet'), own, later(20))
    expect(to(await mails(/no longer holds/)).slice(2)).toEqual(['dispatcher@example.org'])
  })
})

describe('a plan assessed again on other species rows', () => {
  /** Crate A is signed, crate B returned, and then the dog’s row gets a new version. */
  async function halfSigned() {
    const { consignmentId } = await inReview(place, NOW)
    const one = await signature(place, consignmentId, { crateIds: ['crate-1'] })
    await approveCrates(place.as('vet'), one, NOW)
    const back = { ...act(), consignmentId, crateIds: ['crate-2'], reason: 'Turn the crate round.' }
    await returnCrates(place.as('vet'), back, later(5))
    const old = await models.SpeciesProfile.findOne({ where: { key: 'dog' }, rejectOnEmpty: true })
    const { id: _id, ...values } = old.get({ plain: true })
    await models.SpeciesProfile.create({
      ...values,
      version: values.version + 1,
      createdBy: place.people.admin.id,
    })
    const again = { ...act(), consignmentId }
    const asked = await assessConsignment(place.as('dispatcher'), again, later(6))
    expect(asked.status).toBe('queued')
    return { consignmentId, assessmentId: asked.assessmentId }
  }
  const standing = (consignmentId: number) =>
    models.Approval.findAll({ where: { consignmentId, decision: 'approved', voidedAt: null } })

  it('voids what was signed for a better outcome, and says so', async () => {
    const { consignmentId, assessmentId } = await halfSigned()
    const result = foundWell(place.plan, [breach(place.plan)])
    await recordAssessment({ assessmentId, result }, later(7))
    expect(await standing(consignmentId)).toEqual([])
    const sent = await mails(/no longer holds/)
    expect(to(sent)).toEqual(['vet@example.org', 'dispatcher@example.org'])
    expect(sent[0]?.text).toContain('assessed again and came out worse than what was signed')
  })

  it('leaves standing what came out no worse, also where the other crate did', async () => {
    const { consignmentId, assessmentId } = await halfSigned()
    const other = breach(place.plan, { animalId: place.plan.animals[1]?.id ?? '' })
    await recordAssessment({ assessmentId, result: foundWell(place.plan, [other]) }, later(7))
    expect(await standing(consignmentId)).toHaveLength(1)
    expect(await mails(/no longer holds/)).toEqual([])
  })
})
