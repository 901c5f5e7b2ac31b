import { beforeEach, describe, expect, it } from 'vitest'
import { approveCrates } from '@/lib/domain/approvals/approve'
import { answerCondition } from '@/lib/domain/consignments/answer-condition'
import { downloadDocument } from '@/lib/domain/documents/download'
import { verifyCode, verifyFile } from '@/lib/domain/documents/verify'
import { acknowledgeDocument } from '@/lib/domain/portal/acknowledge'
import { askChange } from '@/lib/domain/portal/ask-change'
import { listOwnConsignments } from '@/lib/domain/portal/list'
import { loadOwnConsignment } from '@/lib/domain/portal/load'
import { cancelConsignment } from '@/lib/domain/consignments/cancel'
import { models } from '@/models'
import { emptyTables } from '../support/db'
import { NOW, act, inReview, later, recordPapers, refusal, released, saved, signature, world } from './world'
import type { World } from './world'

let place: World
beforeEach(async () => {
  await emptyTables()
  place = await world()
})

const manifestOf = (consignmentId: number) =>
  models.Document.unscoped().findOne({ where: { consignmentId, kind: 'manifest' }, rejectOnEmpty: true })
const visitor = { ip: '198.51.100.4' }

describe('checking a paper without signing in', () => {
  it('says what a code is worth, and nothing of animals, parties or route', async () => {
    const { consignmentId, mark } = await released(place, NOW)
    const { code, planHash } = await manifestOf(consignmentId)
    const typed = `${code.slice(0, 4).toLowerCase()}-${code.slice(4)} `
    const view = await verifyCode(visitor, { code: typed }, later(1))
    expect(view).toMatchObject({
      state: 'current',
      by: 'code',
      paper: { kind: 'manifest', revision: 1, planHashStart: planHash.slice(0, 16) },
    })
    const told = JSON.stringify(view)
    for (const secret of ['Moss', 'Balfron', 'Skerrow', 'Strand', planHash])
      expect(told).not.toContain(secret)
    expect(told).not.toContain(`"${mark}"`)
    await cancelConsignment(
      place.as('dispatcher'),
      { ...act(), consignmentId, reason: 'Called off.' },
      later(2),
    )
    expect(await verifyCode(visitor, { code }, later(3))).toMatchObject({ state: 'void' })
    expect(await verifyCode(visitor, { code: 'ZZZZ-ZZZZ' }, later(3))).toMatchObject({
      state: 'unknown',
      paper: null,
    })
    expect(await verifyCode(visitor, { code: 'rubbish' }, later(3))).toMatchObject({
      state: 'unknown',
      code: null,
    })
  })

  it('compares a file to the last byte', async () => {
    const { consignmentId } = await released(place, NOW)
    const { bytes, code } = await manifestOf(consignmentId)
    expect(await verifyFile(visitor, bytes, NOW)).toMatchObject({ state: 'current', by: 'file' })
    const claiming = Buffer.concat([
      bytes,
      Buffer.from(` /Keywords (Document code ${code.slice(0, 4)}-${code.slice(4)})`),
    ])
    expect(await verifyFile(visitor, claiming, NOW)).toMatchObject({ state: 'not-as-issued' })
    expect(await verifyFile(visitor, Buffer.from('%PDF-1.4 of another firm'), NOW)).toMatchObject({
      state: 'unknown',
    })
    expect(await refusal(verifyFile(visitor, Buffer.from('hello'), NOW))).toMatchObject({ code: 'invalid' })
  })

  it('allows 20 attempts in 10 minutes from one place', async () => {
    for (let turn = 0; turn < 20; turn += 1) await verifyCode(visitor, { code: 'ZZZZ-ZZZZ' }, NOW)
    expect(await refusal(verifyCode(visitor, { code: 'ZZZZ-ZZZZ' }, later(9)))).toMatchObject({
      code: 'throttled',
    })
    expect(await verifyCode({ ip: '198.51.100.5' }, { code: 'ZZZZ-ZZZZ' }, NOW)).toMatchObject({
      state: 'unknown',
    })
    expect(await verifyCode(visitor, { code: 'ZZZZ-ZZZZ' }, later(10.1))).toMatchObject({ state: 'unknown' })
  })
})

describe('downloading', () => {
  it.each([
    ['dispatcher', true],
    ['vet', true],
    ['admin', true],
    ['driver', true],
    ['shipper', true],
    ['otherDriver', false],
    ['otherShipper', false],
  ] as const)('a manifest by %s: %s, and it is written down', async (person, may) => {
    const { consignmentId } = await released(place, NOW)
    const { id, bytes } = await manifestOf(consignmentId)
    const get = downloadDocument(place.as(person), { documentId: id }, NOW)
    if (may) expect((await get).bytes.equals(bytes)).toBe(true)
    else expect(await refusal(get)).toMatchObject({ code: 'not_found' })
    expect(await models.AuditEvent.count({ where: { verb: 'document.download' } })).toBe(may ? 1 : 0)
  })
})

describe('a shipper', () => {
  it('sees own consignments and nobody else’s', async () => {
    const { consignmentId } = await saved(place, NOW)
    expect((await listOwnConsignments(place.as('shipper'))).map((row) => row.consignmentId)).toEqual([
      consignmentId,
    ])
    expect(await listOwnConsignments(place.as('otherShipper'))).toEqual([])
    expect((await loadOwnConsignment(place.as('shipper'), { consignmentId }, NOW)).view).toBeNull()
    expect(await refusal(loadOwnConsignment(place.as('otherShipper'), { consignmentId }, NOW))).toMatchObject(
      { code: 'not_found' },
    )
    expect(await refusal(loadOwnConsignment(place.as('dispatcher'), { consignmentId }, NOW))).toMatchObject({
      code: 'not_allowed',
    })
  })

  it('reads the released journey without other parties’ names and telephones', async () => {
    const { consignmentId } = await released(place, NOW)
    const { view } = await loadOwnConsignment(place.as('shipper'), { consignmentId }, NOW)
    expect(view).toMatchObject({
      revision: 1,
      stamp: { verdict: 'go' },
      acknowledgement: { revision: 1, done: null },
    })
    const told = JSON.stringify(view)
    for (const name of ['Skerrow', '0433', 'Bellweather']) expect(told).not.toContain(name)
  })

  it('reads on which legs and from when each condition must be so, and when it was confirmed', async () => {
    const { consignmentId } = await inReview(place, NOW)
    const conditions = [
      { text: 'Shed held at 18 °C.', legId: 'leg-2', party: '' },
      { text: 'No food on the way.', legId: null, party: 'Skerrow Air Cargo' },
    ]
    await approveCrates(place.as('vet'), await signature(place, consignmentId, { conditions }), NOW)
    for (const { id } of await models.Condition.findAll({ order: ['id'] })) {
      const answer = { answer: 'confirmed', answeredBy: 'D. Aird', how: 'writing', note: '' } as const
      await answerCondition(place.as('dispatcher'), { ...act(), conditionId: id, ...answer }, later(40))
    }
    await recordPapers(place, consignmentId, later(50))
    const { view } = await loadOwnConsignment(place.as('shipper'), { consignmentId }, later(60))
    const confirmed = {
      answer: 'confirmed',
      party: 'the handler',
      answeredAt: { ms: later(40).getTime(), zone: 'Europe/London' },
    }
    // 10:00 and 11:00 on the clock at Balfron and Glasgow in June.
    const at = (time: string) => ({ ms: Date.parse(`2026-06-10T${time}:00+01:00`), zone: 'Europe/London' })
    expect(view?.conditions).toMatchObject([
      { text: 'No food on the way.', whereWords: 'Whole journey', from: at('10:00'), ...confirmed },
      { text: 'Shed held at 18 °C.', whereWords: 'Leg 2', from: at('11:00'), ...confirmed },
    ])
    expect(JSON.stringify(view)).not.toMatch(/Skerrow|Aird/)
  })

  it('acknowledges the manifest in force once', async () => {
    const { consignmentId } = await released(place, NOW)
    const { id: documentId } = await manifestOf(consignmentId)
    const input = { ...act(), documentId }
    expect(
      await refusal(acknowledgeDocument(place.as('otherShipper'), { ...act(), documentId }, NOW)),
    ).toMatchObject({ code: 'not_found' })
    expect(
      await refusal(acknowledgeDocument(place.as('dispatcher'), { ...act(), documentId }, NOW)),
    ).toMatchObject({ code: 'not_allowed' })
    expect(await acknowledgeDocument(place.as('shipper'), input, NOW)).toEqual({ acknowledged: true })
    expect(await acknowledgeDocument(place.as('shipper'), input, NOW)).toEqual({ acknowledged: true })
    expect(await acknowledgeDocument(place.as('shipper'), { ...act(), documentId }, NOW)).toEqual({
      acknowledged: true,
    })
    expect(await models.Acknowledgement.count()).toBe(1)
    const { view } = await loadOwnConsignment(place.as('shipper'), { consignmentId }, NOW)
    expect(view?.acknowledgement?.done).toMatchObject({ who: 'J. Strand-Ekdahl' })
  })

  it('asks for a change, which is kept and mailed to the desk once', async () => {
    const { consignmentId } = await saved(place, NOW)
    const input = { ...act(), consignmentId, subject: 'Later, please', text: 'Two days <later> & by night.' }
    expect(await refusal(askChange(place.as('otherShipper'), { ...input, ...act() }, NOW))).toMatchObject({
      code: 'not_found',
    })
    expect(await refusal(askChange(place.as('vet'), { ...input, ...act() }, NOW))).toMatchObject({
      code: 'not_allowed',
    })
    await askChange(place.as('shipper'), input, NOW)
    await askChange(place.as('shipper'), input, NOW)
    expect(await models.ChangeRequest.count()).toBe(1)
    const [mail, ...more] = await models.OutboxMessage.findAll()
    expect(more).toEqual([])
    expect(mail).toMatchObject({ toAddress: 'desk@corran.example' })
    expect(mail?.subject).toMatch(/^\d{4}: change asked for, Later, please$/)
    for (const part of [mail?.html, mail?.text]) {
      expect(part).toContain('Balfron Lodge Kennels to Glasgow Airport animal shed, 2 × dog')
      expect(part).toContain(`/consignments/${consignmentId}`)
    }
    expect(mail?.html).toContain('“Two days &lt;later&gt; &amp; by night.”')
    expect(mail?.text).toContain('“Two days <later> & by night.”')
  })
})
