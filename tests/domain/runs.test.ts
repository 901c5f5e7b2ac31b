import { randomUUID } from 'node:crypto'
import { beforeEach, describe, expect, it } from 'vitest'
import { listRuns } from '@/lib/domain/runs/list'
import { loadRun } from '@/lib/domain/runs/load'
import { storeEntries } from '@/lib/domain/runs/store-entries'
import { saveConsignment } from '@/lib/domain/consignments/save'
import { models } from '@/models'
import { emptyTables } from '../support/db'
import { NOW, act, approved, later, refusal, released, world } from './world'
import type { World } from './world'

let place: World
beforeEach(async () => {
  await emptyTables()
  place = await world()
})

const entry = (more: object = {}) => ({
  clientId: randomUUID(),
  legId: 'leg-1',
  itemKey: 'reading-start',
  kind: 'reading',
  atMs: later(70).getTime(),
  place: 'Balfron',
  value: { airTempC: { 'crate-1': 17, 'crate-2': 18 } },
  alive: null,
  dead: null,
  short: null,
  ...more,
})

describe('a driver’s runs', () => {
  it('are the released ones that name the driver, and are gone from nobody else’s sight because they never were in it', async () => {
    const { consignmentId } = await approved(place, NOW)
    expect(await listRuns(place.as('driver'), NOW)).toEqual([])
    expect(await refusal(loadRun(place.as('driver'), { consignmentId }, NOW))).toMatchObject({
      code: 'not_found',
    })
    const second = await released(place, NOW)
    const runs = await listRuns(place.as('driver'), NOW)
    expect(runs.map((run) => run.consignmentId)).toEqual([second.consignmentId])
    expect(runs[0]?.legs.map(({ ordinal }) => ordinal)).toEqual([1])
    expect(await listRuns(place.as('otherDriver'), NOW)).toEqual([])
    expect(await refusal(listRuns(place.as('dispatcher'), NOW))).toMatchObject({ code: 'not_allowed' })
    const other = loadRun(place.as('otherDriver'), { consignmentId: second.consignmentId }, NOW)
    expect(await refusal(other)).toMatchObject({ code: 'not_found' })
  })

  it('stay on the revision in force while the next is drafted for another driver', async () => {
    const { consignmentId } = await released(place, NOW)
    const row = await models.Consignment.findByPk(consignmentId, { rejectOnEmpty: true })
    const plan = structuredClone(place.plan)
    plan.legs.forEach((leg) => leg.attended && (leg.driverId = place.people.otherDriver.id))
    await saveConsignment(
      place.as('dispatcher'),
      { ...act(), consignmentId, version: row.version, plan },
      NOW,
    )
    expect(await listRuns(place.as('driver'), NOW)).toHaveLength(1)
    expect(await listRuns(place.as('otherDriver'), NOW)).toEqual([])
  })

  it('tell the driver what the plan says for when a leg can’t go on, and nothing where it says nothing', async () => {
    Object.assign(place.plan.legs[0] ?? {}, {
      lastPointOfReturn: 'The services',
      fallback: 'Kennels, all hours',
    })
    const { consignmentId } = await released(place, NOW)
    const view = await loadRun(place.as('driver'), { consignmentId }, NOW)
    expect(view.legs[0]?.notes).toEqual([
      { head: 'Last point of return', text: 'The services' },
      { head: 'If you can’t go on', text: 'Kennels, all hours' },
    ])
  })

  it('show own legs alone, with what to do and whom to ring', async () => {
    const { consignmentId } = await released(place, NOW)
    const view = await loadRun(place.as('driver'), { consignmentId }, NOW)
    expect(view.legs.map(({ legId }) => legId)).toEqual(['leg-1'])
    expect(view).toMatchObject({ revision: 1, mayDepart: true, mayDeliver: false })
    expect(view.legs[0]?.signs).toEqual([
      { crateLetter: 'A', text: 'Pants in A' },
      { crateLetter: 'B', text: 'Pants in B' },
    ])
    const keys = view.legs[0]?.items.map(({ key }) => key)
    expect(keys).toEqual(
      expect.arrayContaining(['openings-crate-1', 'set-point', 'reading-start', 'look-end', 'handover']),
    )
    expect(new Set(keys).size).toBe(keys?.length)
    expect(view.calls[0]?.who).toBe('the desk')
    const told = JSON.stringify(view)
    expect(told).not.toContain('Mill Brae')
  })
})

describe('entries from the road', () => {
  const send = (person: 'driver' | 'otherDriver' | 'dispatcher', consignmentId: number, entries: unknown[]) =>
    storeEntries(place.as(person), { consignmentId, entries }, later(80))

  it('are stored once, however often the queue is sent, also at the same moment', async () => {
    const { consignmentId } = await released(place, NOW)
    const queue = [entry(), entry({ kind: 'water', itemKey: 'water', value: { text: 'half a litre' } })]
    const ids = queue.map(({ clientId }) => clientId)
    const answers = await Promise.all([
      send('driver', consignmentId, queue),
      send('driver', consignmentId, queue),
    ])
    for (const answer of [...answers, await send('driver', consignmentId, queue)]) {
      expect(answer).toEqual({ stored: ids, refused: [] })
    }
    expect(await models.ChecklistEntry.count()).toBe(2)
    expect(await models.AuditEvent.count({ where: { verb: 'run.enter' } })).toBe(2)
    expect(
      (await loadRun(place.as('driver'), { consignmentId }, NOW)).entries
        .map(({ clientId }) => clientId)
        .sort(),
    ).toEqual([...ids].sort())
  })

  it('on a leg of somebody else are refused one by one, without holding up the rest', async () => {
    const { consignmentId } = await released(place, NOW)
    const good = entry()
    const queue = [
      entry({ legId: 'leg-2' }),
      entry({ legId: 'leg-99' }),
      entry({ value: { airTempC: { 'crate-1': 900 } } }),
      entry({ kind: 'handover', itemKey: 'handover', value: { to: '' } }),
      { clientId: 'no number at all' },
      good,
    ]
    const answer = await send('driver', consignmentId, queue)
    expect(answer.stored).toEqual([good.clientId])
    expect(answer.refused.map(({ message }) => message)).toEqual([
      'You may not do this.',
      'This leg is not in the revision in force.',
      'Air temperature 900 °C: put −50 to 70 °C.',
      'Say who received the crates.',
      'This entry has lost its number.',
    ])
  })

  it('are nobody else’s to make', async () => {
    const { consignmentId } = await released(place, NOW)
    expect(await refusal(send('otherDriver', consignmentId, [entry()]))).toMatchObject({ code: 'not_found' })
    expect((await send('dispatcher', consignmentId, [entry()])).refused).toHaveLength(1)
    const mine = entry()
    await send('driver', consignmentId, [mine])
    expect((await send('dispatcher', consignmentId, [mine])).stored).toEqual([])
  })

  it('count alive, dead and short at a hand-over', async () => {
    const { consignmentId } = await released(place, NOW)
    const handover = entry({
      kind: 'handover',
      itemKey: 'handover',
      value: { to: 'D. Aird' },
      place: 'Shed 2',
      alive: 2,
      dead: 0,
      short: 0,
    })
    expect((await send('driver', consignmentId, [handover])).stored).toHaveLength(1)
    expect(await models.ChecklistEntry.findOne()).toMatchObject({
      alive: 2,
      dead: 0,
      short: 0,
      place: 'Shed 2',
    })
    expect(await models.AuditEvent.count({ where: { verb: 'run.hand-over' } })).toBe(1)
  })
})
