import { beforeEach, describe, expect, it } from 'vitest'
import { listAudit } from '@/lib/domain/audit/list'
import {
  consignmentStatus,
  loadConsignment,
  loadPlanEditor,
  loadSheetFacts,
} from '@/lib/domain/consignments/load'
import { listConsignments } from '@/lib/domain/consignments/list'
import { listUsers } from '@/lib/domain/users/list'
import { userQuerySchema } from '@/lib/schemas/administration'
import { auditQuerySchema } from '@/lib/schemas/audit'
import { BOARD_SORTS, boardQueryOf, boardQuerySchema } from '@/lib/schemas/board'
import { buildSheetView } from '@/lib/views/sheet-view/build-sheet-view'
import { models } from '@/models'
import { emptyTables } from '../support/db'
import { make } from '../support/factories'
import { NOW, approved, inReview, refusal, released, saved, world } from './world'
import type { World } from './world'

let place: World
beforeEach(async () => {
  await emptyTables()
  place = await world()
})

const board = (person: Parameters<World['as']>[0], query: object = {}) =>
  listConsignments(place.as(person), boardQuerySchema.parse(query))

describe('the board', () => {
  it('shows a consignment with figures, signatures and whose move it is', async () => {
    const { consignmentId } = await approved(place, NOW)
    const { rows, counts } = await board('dispatcher')
    expect(rows).toMatchObject([
      {
        id: consignmentId,
        state: 'approved',
        from: 'Balfron Lodge Kennels',
        to: 'Glasgow Airport animal shed',
        animals: '2 × dog',
        shipper: 'J. Strand-Ekdahl',
        leaves: { ms: Date.UTC(2026, 5, 10, 9), zone: 'Europe/London' },
        verdict: 'go',
        marginOutsideAirC: 9,
        holder: 'dispatcher',
        signed: 2,
        crates: 2,
      },
    ])
    expect(counts).toEqual({ approved: 1 })
  })

  it('is scoped: a shipper lists own ones, a driver has runs instead', async () => {
    await saved(place, NOW)
    expect((await board('shipper')).rows).toHaveLength(1)
    expect((await board('otherShipper')).rows).toEqual([])
    expect(await refusal(board('driver'))).toMatchObject({ code: 'not_allowed' })
  })

  it('finds by the beginnings of words, all of them, and takes signs as signs', async () => {
    const { mark } = await saved(place, NOW)
    for (const find of ['moss', 'MOS', 'balf coll', mark, `${mark} corrie`]) {
      expect((await board('vet', { find })).rows, find).toHaveLength(1)
    }
    for (const find of ['ossmoss', 'moss wyvern', '%', '_oss', "x' OR '1'='1"]) {
      expect((await board('vet', { find })).rows.length, find).toBe(find === '%' ? 1 : 0)
    }
  })

  it('filters by state, verdict and holder, and leaves closed ones out unless asked', async () => {
    await inReview(place, NOW)
    await saved(place, NOW)
    await make.consignment({ state: 'delivered' })
    expect((await board('vet', { state: ['in_review'] })).rows).toHaveLength(1)
    expect((await board('vet', { holder: 'vet' })).rows).toHaveLength(1)
    expect((await board('vet', { verdict: ['go'] })).rows).toHaveLength(1)
    expect((await board('vet', { verdict: ['none', 'go'] })).rows).toHaveLength(2)
    expect((await board('vet')).rows).toHaveLength(2)
    expect((await board('vet', { closed: true })).rows).toHaveLength(3)
  })

  it.each(BOARD_SORTS.flatMap((sort) => [false, true].map((descending) => ({ sort, descending }))))(
    'pages without a gap or a repeat, %o',
    async ({ sort, descending }) => {
      const shipperId = (await make.shipper()).id
      const createdBy = place.people.dispatcher.id
      const rows = Array.from({ length: 23 }, (_, n) => ({
        mark: String(2000 + ((n * 7) % 23)),
        shipperId,
        createdBy,
        purpose: 'private' as const,
        parties: {
          consignor: { name: '', address: '', telephone: '', email: '' },
          consignee: { name: '', address: '', telephone: '', email: '' },
          emergencyContact: { name: '', telephone: '' },
        },
        // Ties and gaps on purpose: several leave at one minute, some have no departure and no margin yet.
        departsAt: n % 5 === 0 ? null : new Date(NOW.getTime() + (n % 4) * 3_600_000),
        marginOutsideAirC: n % 4 === 0 ? null : (n % 3) - 1.5,
      }))
      await models.Consignment.bulkCreate(rows as never)
      const query = { sort, descending, limit: 4 }
      const whole = (await board('vet', { ...query, limit: 200 })).rows.map(({ id }) => id)
      const paged: number[] = []
      let after: string | null = null
      do {
        const page: Awaited<ReturnType<typeof board>> = await board('vet', { ...query, after })
        paged.push(...page.rows.map(({ id }) => id))
        after = page.after
      } while (after !== null)
      expect(whole).toHaveLength(23)
      expect(paged).toEqual(whole)
      if (sort === 'margin') {
        const margins = (await board('vet', { ...query, limit: 200 })).rows.map(
          ({ marginOutsideAirC }) => marginOutsideAirC,
        )
        expect(margins.slice(0, 17)).not.toContain(null)
      }
    },
  )

  it('reads its question from the address and forgives nonsense', () => {
    const search = new URLSearchParams(
      'find=moss&state=draft&state=approved&sort=margin&descending=1&limit=999&holder=cat',
    )
    expect(boardQueryOf(search)).toMatchObject({
      find: 'moss',
      state: ['draft', 'approved'],
      sort: 'margin',
      descending: true,
      limit: 50,
      holder: null,
    })
  })

  it('shows the first page for a key somebody made up', async () => {
    await saved(place, NOW)
    for (const after of ['{}', '["x; DROP TABLE users", "1"]', 'nonsense']) {
      expect((await board('vet', { after })).rows).toHaveLength(1)
    }
  })
})

describe('opening', () => {
  it('a consignment says what may be done now; strangers find nothing', async () => {
    const { consignmentId } = await approved(place, NOW)
    expect((await loadConsignment(place.as('dispatcher'), { consignmentId })).acts).toEqual([
      'save',
      'assess',
      'release',
      'cancel',
    ])
    expect((await loadConsignment(place.as('vet'), { consignmentId })).acts).toEqual([])
    expect(await refusal(loadConsignment(place.as('otherShipper'), { consignmentId }))).toMatchObject({
      code: 'not_found',
    })
    expect(await refusal(loadConsignment(place.as('vet'), { consignmentId: 999_999 }))).toMatchObject({
      code: 'not_found',
    })
    expect(await consignmentStatus(place.as('vet'), { consignmentId })).toMatchObject({
      assessment: { status: 'done' },
      releasing: false,
    })
  })

  it('the editor brings plan, reasons, catalogues and who typed the air', async () => {
    const { consignmentId } = await saved(place, NOW)
    const editor = await loadPlanEditor(place.as('dispatcher'), { consignmentId })
    expect(editor.plan).toEqual(place.plan)
    expect(editor.reasons).toEqual([])
    expect(editor.profiles.map(({ key }) => key)).toContain('snub-nosed-dog')
    expect(editor.drivers.map(({ name }) => name)).not.toContain('P. Tolland')
    expect(editor.airStamps).toEqual([
      { legId: 'leg-1', atMs: NOW.getTime(), by: 'I. Quennell' },
      { legId: 'leg-2', atMs: NOW.getTime(), by: 'I. Quennell' },
    ])
    expect(await refusal(loadPlanEditor(place.as('shipper'), { consignmentId }))).toMatchObject({
      code: 'not_found',
    })
    expect(await refusal(loadPlanEditor(place.as('vet'), { consignmentId: null }))).toMatchObject({
      code: 'not_allowed',
    })
    expect((await loadPlanEditor(place.as('dispatcher'), { consignmentId: null })).plan).toBeNull()
  })

  it('the sheet is built from what is stored; a shipper gets the revision in force only', async () => {
    const { consignmentId } = await released(place, NOW)
    const ask = { consignmentId, which: 'working' as const, tracks: true }
    const sheet = buildSheetView(await loadSheetFacts(place.as('vet'), ask, NOW))
    expect(sheet).toMatchObject({
      revision: 1,
      state: 'released',
      stamp: { verdict: 'go', outOfDate: false },
    })
    const draft = await saved(place, NOW)
    const own = loadSheetFacts(place.as('shipper'), { ...ask, consignmentId: draft.consignmentId }, NOW)
    expect(await refusal(own)).toMatchObject({ code: 'not_found' })
  })
})

describe('the admin’s lists', () => {
  it('the audit trail pages newest first, filters, and is nobody else’s', async () => {
    const { consignmentId } = await approved(place, NOW)
    const ask = (query: object) => listAudit(place.as('admin'), auditQuerySchema.parse(query))
    const all = await ask({})
    expect(all.rows.map(({ verb }) => verb)).toEqual([
      'approval.approve',
      'consignment.submit',
      'assessment.record',
      'consignment.assess',
      'consignment.create',
    ])
    const first = await ask({ limit: 2 })
    const second = await ask({ limit: 2, before: first.before })
    expect([...first.rows, ...second.rows].map(({ id }) => id)).toEqual(
      all.rows.slice(0, 4).map(({ id }) => id),
    )
    expect((await ask({ verb: 'consignment.' })).rows).toHaveLength(3)
    expect((await ask({ actorId: place.people.vet.id })).rows).toHaveLength(1)
    expect((await ask({ consignmentId, from: '2026-06-09', to: '2026-06-09' })).rows).toHaveLength(5)
    expect((await ask({ to: '2026-06-08' })).rows).toEqual([])
    expect(await refusal(listAudit(place.as('dispatcher'), auditQuerySchema.parse({})))).toMatchObject({
      code: 'not_allowed',
    })
  })

  it('people are listed without their passwords', async () => {
    const { rows, total } = await listUsers(place.as('admin'), userQuerySchema.parse({}))
    expect(total).toBe(11)
    expect(JSON.stringify(rows)).not.toContain('argon2')
    expect(rows.find(({ name }) => name === 'P. Tolland')?.offSince).not.toBeNull()
    expect(await refusal(listUsers(place.as('vet'), userQuerySchema.parse({})))).toMatchObject({
      code: 'not_allowed',
    })
  })
})
