import { QueryTypes } from 'sequelize'
import { describe, expect, test } from 'vitest'
import { database } from '@/lib/db/connection'
import { models } from '@/models'
import { cast } from '../support/cast'
import { asOwner, withEmptyTables } from '../support/db'
import { AT, make, sha256 } from '../support/factories'

withEmptyTables()

describe('what is stored comes back', () => {
  test('figures of a plan to the last bit', async () => {
    // 0.1 + 0.2 and 1/3 have no short decimal form; 5e-3 is the lightest animal the form takes.
    for (const massKg of [0.1 + 0.2, 1 / 3, 5e-3, 1_499.9999999999998, 31]) {
      const { id } = await make.animal({ massKg, coatDepthMm: massKg })
      const read = await models.Animal.findByPk(id)
      expect([read?.massKg, read?.coatDepthMm]).toEqual([massKg, massKg])
    }
  })

  test('margins and coordinates as the figure that was meant', async () => {
    const consignment = await make.consignment({ marginOutsideAirC: -2.5, marginBodyC: 0.123 })
    const place = await make.place({ latitude: -55.98765, longitude: 179.99999 })
    await Promise.all([consignment.reload(), place.reload()])
    expect([consignment.marginOutsideAirC, consignment.marginBodyC]).toEqual([-2.5, 0.123])
    expect([place.latitude, place.longitude]).toEqual([-55.98765, 179.99999])
  })

  test('a leg’s surroundings and stops, whole', async () => {
    const surroundings = {
      type: 'open-air' as const,
      rows: [{ minute: 0, airTempC: 41.5, relHumidityPct: 20, windMs: 1, solarWm2: 0 }],
      shadePct: 100,
    }
    const { id } = await make.leg({ kind: 'ramp', surroundings, stops: [{ minute: 10, kind: 'look' }] })
    const leg = await models.Leg.findByPk(id)
    expect(leg?.surroundings).toEqual(surroundings)
    expect(leg?.stops).toEqual([{ minute: 10, kind: 'look' }])
  })

  test('names with any letter, and a file with any byte', async () => {
    const animal = await make.animal({ name: 'Żółć 🐕 Łódź' })
    expect((await models.Animal.findByPk(animal.id))?.name).toBe('Żółć 🐕 Łódź')
    const bytes = Buffer.from(Array.from({ length: 1024 }, (_, index) => index % 256))
    const document = await make.document({ bytes })
    const read = await models.Document.unscoped().findByPk(document.id)
    expect(read?.bytes.equals(bytes)).toBe(true)
    expect((await models.Document.findByPk(document.id))?.get()).not.toHaveProperty('bytes')
  })

  test('a row of another shape is refused when it is read, by the column’s name', async () => {
    const { id } = await make.leg()
    await database().query(`UPDATE legs SET surroundings = '{"type":"vacuum"}' WHERE id = ${id}`)
    const leg = await models.Leg.findByPk(id)
    expect(() => leg?.surroundings).toThrow('surroundings')
  })

  test('one row of everything the factories make', async () => {
    const made = Object.entries(make).map(
      ([name, one]) => [name, one as () => Promise<{ isNewRecord: boolean }>] as const,
    )
    for (const [name, one] of made) expect((await one()).isNewRecord, name).toBe(false)
  })
})

describe('marks', () => {
  test('two open consignments cannot share one', async () => {
    await make.consignment({ mark: '2417' })
    await expect(make.consignment({ mark: '2417' })).rejects.toMatchObject({ parent: { errno: 1062 } })
  })

  test.each(['delivered', 'stopped', 'cancelled'] as const)(
    'a %s consignment gives its mark back',
    async (state) => {
      const first = await make.consignment({ mark: '2417' })
      await first.update({ state })
      const second = await make.consignment({ mark: '2417' })
      expect(await models.Consignment.findAll({ where: { openMark: '2417' } })).toMatchObject([
        { id: second.id },
      ])
    },
  )

  test('so does one whose revision in force has arrived while a later one was being drawn', async () => {
    const { hash } = await make.snapshot()
    const inForce = { inForceRevision: 1, inForceSnapshotHash: hash }
    const first = await make.consignment({ mark: '2417', revision: 2, ...inForce, inForceState: 'under_way' })
    await expect(make.consignment({ mark: '2417' })).rejects.toMatchObject({ parent: { errno: 1062 } })
    await first.update({ inForceState: 'delivered' })
    await expect(make.consignment({ mark: '2417' })).resolves.toBeDefined()
  })

  test('are four digits', async () => {
    await expect(make.consignment({ mark: '24A7' })).rejects.toMatchObject({ parent: { errno: 4025 } })
  })
})

describe('what the database itself refuses', () => {
  test('an animal in two crates', async () => {
    const animal = await make.animal()
    const [one, other] = [await make.crate(), await make.crate()]
    await models.Occupant.create({ animalId: animal.id, crateId: one.id, position: 0 })
    const twice = models.Occupant.create({ animalId: animal.id, crateId: other.id, position: 0 })
    await expect(twice).rejects.toMatchObject({ parent: { errno: 1062 } })
  })

  test('a shipper’s user without a shipper, and anybody else with one', async () => {
    const row = { name: 'X', email: 'x@example.org', passwordHash: '-' }
    await expect(models.User.create({ ...row, role: 'shipper' })).rejects.toMatchObject({
      parent: { errno: 4025 },
    })
    const { id: shipperId } = await make.shipper()
    await expect(models.User.create({ ...row, role: 'vet', shipperId })).rejects.toMatchObject({
      parent: { errno: 4025 },
    })
  })

  test('an address twice, however it is written', async () => {
    await make.user({ email: 'i.quennell@example.org' })
    await expect(make.user({ email: 'I.Quennell@Example.org' })).rejects.toMatchObject({
      parent: { errno: 1062 },
    })
  })

  test('half a document', async () => {
    await expect(make.document({ sizeBytes: 3 })).rejects.toMatchObject({ parent: { errno: 4025 } })
  })

  test('an override without a reason', async () => {
    await expect(make.override({ reason: '  ' })).rejects.toMatchObject({ parent: { errno: 4025 } })
  })

  test('the same request doing the same verb twice, while rows without a request may repeat', async () => {
    const requestId = '7f9c2ba4-e88f-4a6e-9d2a-0f3b1d3f8a11'
    await make.auditEvent({ requestId })
    await expect(make.auditEvent({ requestId })).rejects.toMatchObject({ parent: { errno: 1062 } })
    await make.auditEvent({ requestId, verb: 'assessment.request' })
    await make.auditEvent()
    await make.auditEvent()
    expect(await models.AuditEvent.count()).toBe(4)
  })

  test('an entry of the checklist sent twice', async () => {
    const { clientId } = await make.checklistEntry()
    await expect(make.checklistEntry({ clientId })).rejects.toMatchObject({ parent: { errno: 1062 } })
  })
})

test('a consignment comes with its plan in one question', async () => {
  const leg = await make.leg({ driverId: (await cast()).driver.id, fromPlaceId: (await make.place()).id })
  const { id: crateId } = await make.crate({ consignmentId: leg.consignmentId })
  const animal = await make.animal({ consignmentId: leg.consignmentId })
  await make.opening({ crateId })
  await models.Occupant.create({ animalId: animal.id, crateId, position: 0 })
  const consignment = await models.Consignment.findByPk(leg.consignmentId, {
    include: [
      'shipper',
      'animals',
      { association: 'crates', include: ['openings', { association: 'occupants', include: ['animal'] }] },
      { association: 'legs', include: ['fromPlace', 'toPlace', 'driver'] },
    ],
  })
  expect(consignment?.legs?.[0]?.driver?.name).toBe('C. Bellweather')
  expect(consignment?.legs?.[0]?.toPlace).toBeNull()
  expect(consignment?.crates?.[0]?.openings).toHaveLength(1)
  expect(consignment?.crates?.[0]?.occupants?.[0]?.animal?.name).toBe('Perdita')
})

test('words find a consignment by their beginning, along the key', async () => {
  const { id } = await make.consignment()
  await models.ConsignmentWord.bulkCreate(
    ['balfron', 'balloch', 'żółw'].map((word) => ({ word, consignmentId: id })),
  )
  const sql = "SELECT consignment_id FROM consignment_words WHERE word LIKE 'balf%'"
  expect(await database().query(sql, { type: QueryTypes.SELECT })).toEqual([{ consignment_id: id }])
  const [plan] = await database().query<{ key: string }>(`EXPLAIN ${sql}`, { type: QueryTypes.SELECT })
  expect(plan?.key).toBe('PRIMARY')
})

test('the board’s first pages are read along an index, not sorted', async () => {
  const { shipperId, createdBy } = await make.consignment()
  await asOwner((owner) =>
    owner.query(
      `INSERT INTO consignments (mark, shipper_id, purpose, parties, created_by, created_at, updated_at, departs_at, margin_min)
         SELECT LPAD(seq, 4, '0'), ${shipperId}, 'private', '{}', ${createdBy}, NOW(3), NOW(3), NOW(3) + INTERVAL seq MINUTE, seq
           FROM seq_1_to_1500`,
    ),
  )
  for (const column of ['departs_at', 'updated_at', 'margin_rising', 'margin_falling', 'mark']) {
    const [plan] = await database().query<{ Extra: string | null; key: string | null }>(
      `EXPLAIN SELECT id FROM consignments ORDER BY ${column}, id LIMIT 50`,
      { type: QueryTypes.SELECT },
    )
    expect(plan?.key, column).not.toBeNull()
    expect(plan?.Extra ?? '', column).not.toContain('filesort')
  }
})

test('the cast has everybody once, under low numbers', async () => {
  const people = await cast()
  expect(people.vet).toMatchObject({ role: 'vet', registrationNumber: 'VR 40 817', shipperId: null })
  expect(people.shipper).toMatchObject({ role: 'shipper', shipperId: 12 })
  expect(Object.values(people).every(({ id }) => id < 1000)).toBe(true)
  expect(await models.User.count()).toBe(Object.keys(people).length)
  expect(people.vet.registrationCheckedBy).toBe(people.admin.id)
  expect(sha256('').length).toBe(64)
  expect(AT.getTime()).toBeLessThan(Date.parse('2027-01-01'))
})
