import { beforeEach, describe, expect, it } from 'vitest'
import { approveCrates } from '@/lib/domain/approvals/approve'
import { loadReview } from '@/lib/domain/approvals/load-review'
import { reviewQueue } from '@/lib/domain/approvals/queue'
import { answerCondition } from '@/lib/domain/consignments/answer-condition'
import { database } from '@/lib/db/connection'
import type { Finding } from '@/lib/rules/result'
import { models } from '@/models'
import { emptyTables } from '../support/db'
import { NOW, act, breach, inReview, met, signature, world } from './world'
import type { World } from './world'

let place: World
beforeEach(async () => {
  await emptyTables()
  place = await world()
})

describe('the queue', () => {
  const other = () => place.plan.animals[1]?.id ?? ''
  it.each<[string, () => Finding[]]>([
    ['all well', () => []],
    ['a breach of one animal', () => [breach(place.plan)]],
    ['a condition on the other', () => [breach(place.plan, { status: 'condition', animalId: other() })]],
    ['a narrow margin', () => [{ ...met(other(), 'leg-2'), marginOutsideAirC: 2.5 }]],
    ['a judgement about a crate', () => [aboutCrate({ status: 'judgement', crateId: 'crate-2' })]],
    ['something unknown about all', () => [aboutCrate({ status: 'unknown' })]],
    ['a note', () => [aboutCrate({ status: 'note', crateId: 'crate-1' })]],
  ])('says of each crate what its review says: %s', async (_words, found) => {
    const { consignmentId } = await inReview(place, NOW, found())
    await expectSameVerdicts(consignmentId, 2)
  })

  it('leaves the verdict out once a crate is signed, and tells the other’s as before', async () => {
    const { consignmentId } = await inReview(place, NOW, [breach(place.plan)])
    const conditions = [{ text: 'Shed held at 18 °C.', legId: 'leg-2', party: '' }]
    const overrides = [{ findingIndex: 0, reason: 'Short, and I ride along.' }]
    const one = await signature(place, consignmentId, { crateIds: ['crate-1'], conditions, overrides })
    await approveCrates(place.as('vet'), one, NOW)
    const [first] = await reviewQueue(place.as('vet'))
    expect(first).toMatchObject({ decision: 'approved', stamp: null, signed: { ms: NOW.getTime() } })
    await expectSameVerdicts(consignmentId, 1)
  })

  it('says NO-GO of every crate that waits where a party refused what a narrow margin asks', async () => {
    const { consignmentId } = await inReview(place, NOW, [
      { ...met(other(), 'leg-2'), marginOutsideAirC: 2.5 },
    ])
    const asked = await models.Condition.findOne({ where: { consignmentId }, rejectOnEmpty: true })
    const answer = { answer: 'refused', answeredBy: 'Duty officer', how: 'telephone', note: '' } as const
    const input = { ...act(), conditionId: asked.id, ...answer }
    await answerCondition(place.as('dispatcher'), input, NOW)
    await expectSameVerdicts(consignmentId, 2)
    expect((await reviewQueue(place.as('vet')))[0]?.stamp?.verdict).toBe('no-go')
    // The board hears of it too.
    expect(await models.Consignment.findByPk(consignmentId)).toMatchObject({ verdict: 'no-go' })
  })

  it('marks what is out of date, and asks the database no more often when it is long', async () => {
    const { consignmentId } = await inReview(place, NOW)
    await models.Consignment.update({ outOfDate: true }, { where: { id: consignmentId } })
    await expectSameVerdicts(consignmentId, 2)
    const short = await queriesOf(() => reviewQueue(place.as('vet')))
    for (let more = 0; more < 3; more += 1) await inReview(place, NOW)
    const long = await queriesOf(() => reviewQueue(place.as('vet')))
    expect((await reviewQueue(place.as('vet'))).length).toBe(8)
    expect(long).toBe(short)
  })

  /** The sheet behind the review page is the measure: it works the verdict out from everything that is stored. */
  async function expectSameVerdicts(consignmentId: number, waiting: number) {
    const rows = (await reviewQueue(place.as('vet'))).filter(({ decision }) => decision === 'waiting')
    const view = await loadReview(place.as('vet'), { consignmentId, crateId: null }, NOW)
    const stamps = view.crates
      .filter(({ decision }) => decision === 'waiting')
      .map(({ mark, stamp: { verdict, outOfDate } }) => ({ mark, verdict, outOfDate }))
    expect(stamps).toHaveLength(waiting)
    expect(
      rows.map(({ crateMark, stamp }) => ({
        mark: crateMark,
        verdict: stamp?.verdict,
        outOfDate: stamp?.outOfDate,
      })),
    ).toEqual(stamps)
    expect(rows[0]).toMatchObject({ leaves: view.sheet.leaves })
    expect(rows[0]?.words).toMatch(/, Border collie\. Balfron Lodge Kennels to Glasgow Airport animal shed$/)
  }

  function aboutCrate(more: Partial<Finding>): Finding {
    const { animalId: _animal, legId: _leg, marginOutsideAirC: _margin, ...rest } = met('', '')
    return { ...rest, rule: 'about-crate', limitKind: 'other', ...more }
  }

  async function queriesOf(work: () => Promise<unknown>): Promise<number> {
    let count = 0
    database().addHook('beforeQuery', 'count', () => {
      count += 1
    })
    await work()
    database().removeHook('beforeQuery', 'count')
    return count
  }
})
