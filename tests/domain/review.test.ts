import { beforeEach, describe, expect, it } from 'vitest'
import { approveCrates } from '@/lib/domain/approvals/approve'
import { approvalLines } from '@/lib/domain/approvals/lines'
import { loadReview } from '@/lib/domain/approvals/load-review'
import { reviewQueue } from '@/lib/domain/approvals/queue'
import { returnCrates } from '@/lib/domain/approvals/return'
import { withdrawApproval } from '@/lib/domain/approvals/withdraw'
import { recordAssessment } from '@/lib/domain/assessments/record'
import { assessConsignment } from '@/lib/domain/consignments/assess'
import { loadDeskPage } from '@/lib/domain/consignments/desk-page'
import { saveConsignment } from '@/lib/domain/consignments/save'
import { submitConsignment } from '@/lib/domain/consignments/submit'
import { approvalStatement } from '@/lib/schemas/approval-statement'
import { models } from '@/models'
import { emptyTables } from '../support/db'
import {
  NOW,
  act,
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

const load = (id: number) => models.Consignment.findByPk(id, { rejectOnEmpty: true })
const signers = ['dispatcher', 'driver', 'shipper', 'admin'] as const

describe('assessing', () => {
  it('keeps the scenario, queues one job, and records what was found once', async () => {
    const { consignmentId } = await saved(place, NOW)
    const ask = () => assessConsignment(place.as('dispatcher'), { ...act(), consignmentId }, NOW)
    const asked = await ask()
    expect(asked.status).toBe('queued')
    // Asked again while it waits: the same run, not a second one.
    expect(await ask()).toEqual(asked)
    expect(await models.Job.count({ where: { kind: 'assess' } })).toBe(1)
    const result = foundWell(place.plan)
    expect(await recordAssessment({ assessmentId: asked.assessmentId, result }, later(2))).toBe('recorded')
    expect(await recordAssessment({ assessmentId: asked.assessmentId, result }, later(3))).toBe('already')
    expect(await load(consignmentId)).toMatchObject({
      state: 'assessed',
      verdict: 'go',
      marginOutsideAirC: 9,
    })
    expect(await models.Finding.count()).toBe(4)
    expect((await ask()).status).toBe('done')
  })

  it('is refused with every reason at once where the plan cannot be assessed', async () => {
    const plan = structuredClone(place.plan)
    plan.consignee.name = ''
    plan.animals.forEach((animal) => (animal.massKg = null))
    const { consignmentId } = await saved({ ...place, plan }, NOW)
    const { code, issues } = await refusal(
      assessConsignment(place.as('dispatcher'), { ...act(), consignmentId }, NOW),
    )
    expect(code).toBe('invalid')
    expect(issues.map(({ path }) => path)).toEqual(['consignee.name', 'animals.0.massKg', 'animals.1.massKg'])
    expect(await models.Assessment.count()).toBe(0)
  })
})

describe('sending to the vet', () => {
  it('needs a finished assessment that is not out of date', async () => {
    const { consignmentId } = await saved(place, NOW)
    const submit = () => submitConsignment(place.as('dispatcher'), { ...act(), consignmentId }, NOW)
    expect(await refusal(submit())).toMatchObject({ code: 'wrong_state' })
    await assessed(place, consignmentId, NOW)
    await models.Consignment.update({ outOfDate: true }, { where: { id: consignmentId } })
    expect(await refusal(submit())).toMatchObject({ code: 'out_of_date' })
  })

  it.each([
    ['critical', { limitKind: 'critical' as const }],
    ['law', { basis: 'law' as const, limitKind: 'other' as const }],
    ['carrier', { basis: 'carrier' as const, limitKind: 'other' as const }],
    ['held absolute by the rules', { overridable: false }],
  ])('is refused for a breach that is %s, whatever the finding claims of itself', async (_kind, more) => {
    const { consignmentId } = await saved(place, NOW)
    await assessed(place, consignmentId, NOW, [breach(place.plan, { overridable: true, ...more })])
    expect(await load(consignmentId)).toMatchObject({ verdict: 'no-go' })
    const promise = submitConsignment(place.as('dispatcher'), { ...act(), consignmentId }, NOW)
    expect(await refusal(promise)).toMatchObject({ code: 'refused' })
    expect(await load(consignmentId)).toMatchObject({ state: 'assessed' })
  })
})

describe('a vet’s signature', () => {
  it('covers several crates, approves with the last, and keeps words and registration', async () => {
    const { consignmentId } = await inReview(place, NOW)
    const [first] = place.plan.crates
    const one = await signature(place, consignmentId, { crateIds: [first?.id ?? ''] })
    expect(await approveCrates(place.as('vet'), one, NOW)).toMatchObject({ state: 'in_review' })
    const rest = await signature(place, consignmentId, { crateIds: ['crate-2'], examined: false })
    expect(await approveCrates(place.as('otherVet'), rest, NOW)).toMatchObject({ state: 'approved' })
    const [a, b] = await models.Approval.findAll({ order: ['id'] })
    expect(a).toMatchObject({
      registrationNumber: 'VR 40 817',
      signerName: 'S. Halloway-Odu',
      examined: true,
    })
    expect(a?.statement).toContain('I have examined the animal')
    expect([a?.earlySigns, b?.earlySigns]).toEqual([['Pants in A'], ['Pants in B']])
    expect(b?.statement).toContain('I have not examined the animal')
    expect(b?.statement).toContain('not a certificate of fitness to travel')
  })

  it('signs once however often the button is pressed', async () => {
    const { consignmentId } = await inReview(place, NOW)
    const input = await signature(place, consignmentId)
    const answers = await Promise.all([0, 1].map(() => approveCrates(place.as('vet'), input, NOW)))
    expect(answers[0]).toEqual(answers[1])
    expect(await models.Approval.count()).toBe(2)
  })

  it.each(signers)('is refused to a %s', async (person) => {
    const { consignmentId } = await inReview(place, NOW)
    const promise = approveCrates(place.as(person), await signature(place, consignmentId), NOW)
    expect(['not_allowed', 'not_found']).toContain((await refusal(promise)).code)
    expect(await models.Approval.count()).toBe(0)
  })

  it('asks the password again, and counts wrong ones with those of the sign-in page', async () => {
    const { consignmentId } = await inReview(place, NOW)
    for (let turn = 0; turn < 6; turn += 1) {
      const wrong = await signature(place, consignmentId, { password: 'not this one' })
      expect(await refusal(approveCrates(place.as('vet'), wrong, NOW))).toMatchObject({
        code: 'invalid',
        issues: [{ path: 'password', message: 'This is not your password.' }],
      })
    }
    const right = await signature(place, consignmentId)
    expect(await refusal(approveCrates(place.as('vet'), right, NOW))).toMatchObject({ code: 'throttled' })
    expect(await models.Approval.count()).toBe(0)
  })

  it('needs a registration that an admin checked and that has not expired', async () => {
    const { consignmentId } = await inReview(place, NOW)
    const unchecked = approveCrates(place.as('uncheckedVet'), await signature(place, consignmentId), NOW)
    expect(await refusal(unchecked)).toMatchObject({ code: 'refused' })
    const afterwards = new Date('2027-04-01T00:00:00Z')
    const expired = approveCrates(place.as('vet'), await signature(place, consignmentId), afterwards)
    expect(await refusal(expired)).toMatchObject({
      code: 'refused',
      message: 'Your registration expired on 2027-03-31.',
    })
  })

  it('is refused on a plan that has moved on since the page was loaded', async () => {
    const { consignmentId } = await inReview(place, NOW)
    const stale = await signature(place, consignmentId, { planHash: 'a'.repeat(64) })
    expect(await refusal(approveCrates(place.as('vet'), stale, NOW))).toMatchObject({ code: 'out_of_date' })
  })

  it('overrides an alarm by name and with a reason, or is refused', async () => {
    const { consignmentId } = await inReview(place, NOW, [breach(place.plan)])
    expect(await load(consignmentId)).toMatchObject({ verdict: 'no-go', deciding: 'alarm, Moss (A), leg 1' })
    const silent = await signature(place, consignmentId)
    expect(await refusal(approveCrates(place.as('vet'), silent, NOW))).toMatchObject({ code: 'refused' })
    const named = await signature(place, consignmentId, {
      overrides: [{ findingIndex: 0, reason: 'Short, and I ride along with him.' }],
    })
    const shown = await loadReview(place.as('vet'), { consignmentId, crateId: null }, NOW)
    expect(await approveCrates(place.as('vet'), named, NOW)).toMatchObject({ state: 'approved' })
    expect(await models.Override.findAll()).toMatchObject([
      {
        findingRule: 'core-alarm-high',
        animalRef: 'animal-1',
        legRef: 'leg-1',
        minutesPast: 12,
        worstBodyC: 39.9,
      },
    ])
    expect(await load(consignmentId)).toMatchObject({ verdict: 'conditional' })
    // What the page showed is what is stored, word for word, on the approval of every crate it covers.
    const statement = approvalStatement({
      examined: true,
      crateMarks: shown.crates.map(({ mark }) => mark),
      overridden: [shown.subjects[0]?.words ?? ''],
    })
    const [mark] = shown.crates.map((crate) => crate.mark)
    expect(statement.replaceAll('\u00a0', ' ')).toBe(
      `I approve the crate set-ups ${mark} and ${mark?.replace('A', 'B')} on the facts shown. I override by name: Body at most 39.7 °C, alarm, Moss (A), leg 1 (road): 12 min past, body to 39.9 °C. I have examined the animal. This is not a certificate of fitness to travel.`,
    )
    const approvals = await models.Approval.findAll({ where: { consignmentId } })
    expect(approvals.map((approval) => approval.statement)).toEqual([statement, statement])
    const after = await loadDeskPage(place.as('dispatcher'), { consignmentId }, NOW)
    expect(after.sheet.approvals).toMatchObject([{ crateMarks: [mark, mark?.replace('A', 'B')], statement }])
    expect(after.approvals.map((line) => line.statement)).toEqual([statement, statement])
    expect(after.sheet.overrides).toMatchObject([
      { findingWords: 'Body at most 39.7 °C, alarm, Moss (A), leg 1 (road)' },
    ])
  })

  it.each([
    ['critical', { limitKind: 'critical' as const }],
    ['law', { basis: 'law' as const, limitKind: 'other' as const }],
    ['carrier', { basis: 'carrier' as const, limitKind: 'other' as const }],
    ['refused by the rules', { overridable: false, overrideRefusedBecause: '3 °C warmer passes critical.' }],
  ])('never overrides a finding that is %s', async (_kind, more) => {
    const { consignmentId } = await inReview(place, NOW)
    // Such a plan is never sent to a vet: put the breach there behind the desk’s back.
    const row = await load(consignmentId)
    const finding = breach(place.plan, { overridable: true, ...more })
    await models.Finding.create({
      assessmentId: row.assessmentId ?? 0,
      ordinal: 99,
      rule: finding.rule,
      basis: finding.basis,
      status: finding.status,
      overridable: finding.overridable,
      body: finding,
    })
    const input = await signature(place, consignmentId, {
      overrides: [{ findingIndex: 4, reason: 'I take it upon myself.' }],
    })
    const error = await refusal(approveCrates(place.as('vet'), input, NOW))
    expect(error).toMatchObject({ code: 'refused' })
    expect(error.message).toMatch(/^Nobody may override this/)
    expect(await models.Approval.count()).toBe(0)
  })

  it('puts conditions that hold release where none of ours is present', async () => {
    const { consignmentId } = await inReview(place, NOW)
    const input = await signature(place, consignmentId, {
      conditions: [
        { text: 'Shed held at 18 °C.', legId: 'leg-2', party: '' },
        { text: 'Read the air at loading.', legId: 'leg-1', party: '' },
      ],
    })
    await approveCrates(place.as('vet'), input, NOW)
    expect(await models.Condition.findAll({ order: ['id'] })).toMatchObject([
      { origin: 'vet', party: 'Skerrow Air Cargo', ours: false, legRef: 'leg-2' },
      { origin: 'vet', party: 'Corran Animal Couriers', ours: true, legRef: 'leg-1' },
    ])
    expect(await load(consignmentId)).toMatchObject({ verdict: 'conditional' })
  })
})

describe('returning and withdrawing', () => {
  it('returns the consignment with the reason, and it can be put right and sent again', async () => {
    const { consignmentId } = await inReview(place, NOW)
    const input = { ...act(), consignmentId, crateIds: ['crate-1'], reason: 'Back face is blocked.' }
    expect(await returnCrates(place.as('vet'), input, NOW)).toEqual({ state: 'returned' })
    expect(await returnCrates(place.as('vet'), input, NOW)).toEqual({ state: 'returned' })
    expect(await models.Approval.findAll()).toMatchObject([
      { decision: 'returned', reasons: 'Back face is blocked.' },
    ])
    await assessed(place, consignmentId, later(5)).catch(() => undefined)
    expect((await load(consignmentId)).state).toBe('assessed')
  })

  it.each(signers)('is not for a %s', async (person) => {
    const { consignmentId } = await inReview(place, NOW)
    const input = { ...act(), consignmentId, crateIds: ['crate-1'], reason: 'No.' }
    expect(['not_allowed', 'not_found']).toContain(
      (await refusal(returnCrates(place.as(person), input, NOW))).code,
    )
  })

  it('takes an approval back before the journey, and the manifest is void', async () => {
    const { consignmentId } = await released(place, NOW)
    const approval = await models.Approval.findOne({ where: { consignmentId }, rejectOnEmpty: true })
    const input = { ...act(), approvalId: approval.id, reason: 'Carrier changed the hold.' }
    expect(
      await refusal(withdrawApproval(place.as('dispatcher'), { ...input, ...act() }, later(9))),
    ).toMatchObject({
      code: 'not_allowed',
    })
    expect(await withdrawApproval(place.as('otherVet'), input, later(9))).toEqual({ state: 'returned' })
    expect(await withdrawApproval(place.as('otherVet'), input, later(10))).toEqual({ state: 'returned' })
    expect(await load(consignmentId)).toMatchObject({
      state: 'returned',
      inForceRevision: null,
      inForceState: null,
    })
    expect(await models.Document.count({ where: { state: 'void' } })).toBe(2)
    expect(await models.Approval.findByPk(approval.id)).toMatchObject({ withdrawn: true })
  })
})

describe('what the vet sees', () => {
  it('calls a decision by the mark it was signed under, whatever the plan calls the crate since', async () => {
    const { consignmentId, mark, version } = await inReview(place, NOW)
    await approveCrates(place.as('vet'), await signature(place, consignmentId), NOW)
    const plan = structuredClone(place.plan)
    plan.crates.forEach((crate) => (crate.letter = crate.letter === 'A' ? 'X' : 'Y'))
    plan.crates.pop()
    plan.animals.pop()
    await saveConsignment(place.as('dispatcher'), { ...act(), consignmentId, version, plan }, later(5))
    const lines = await approvalLines(await load(consignmentId))
    expect(lines.map(({ crateMark }) => crateMark)).toEqual([`${mark}-B`, `${mark}-A`])
    const view = await loadReview(place.as('vet'), { consignmentId, crateId: null }, NOW)
    expect(view.voided.map(({ crateMarks }) => crateMarks)).toEqual([[`${mark}-B`], [`${mark}-A`]])
  })

  it('lists crate set-ups that wait, and opens one with who may sign', async () => {
    const { consignmentId, mark } = await inReview(place, NOW)
    const queue = await reviewQueue(place.as('vet'))
    expect(queue.map(({ crateMark, decision }) => [crateMark, decision])).toEqual([
      [`${mark}-A`, 'waiting'],
      [`${mark}-B`, 'waiting'],
    ])
    const view = await loadReview(place.as('vet'), { consignmentId, crateId: 'crate-2' }, NOW)
    expect(view.chosen.mark).toBe(`${mark}-B`)
    expect(view.closedWords).toBe('')
    expect(view.signer).toMatchObject({ registration: 'VR 40 817', cannot: '' })
    const unchecked = await loadReview(place.as('uncheckedVet'), { consignmentId, crateId: null }, NOW)
    expect(unchecked.signer.cannot).not.toBe('')
    expect(await refusal(reviewQueue(place.as('dispatcher')))).toMatchObject({ code: 'not_allowed' })
  })
})
