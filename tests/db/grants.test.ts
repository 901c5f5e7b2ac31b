import { QueryTypes } from 'sequelize'
import { describe, expect, test } from 'vitest'
import { database } from '@/lib/db/connection'
import { GRANTS } from '@/lib/local/grants.mjs'
import { models } from '@/models'
import { withEmptyTables } from '../support/db'
import { make } from '../support/factories'

withEmptyTables()

/** ER_TABLEACCESS_DENIED_ERROR and ER_COLUMNACCESS_DENIED_ERROR. */
const DENIED = { parent: { errno: expect.toBeOneOf([1142, 1143]) as number } }

describe('the application’s account, on the real server', () => {
  test('is the one the tests use', async () => {
    const [row] = await database().query<{ me: string }>('SELECT CURRENT_USER() AS me', {
      type: QueryTypes.SELECT,
    })
    expect(row?.me).toBe('steadfold_app@127.0.0.1')
  })

  test('adds to the audit trail but neither alters nor removes a row', async () => {
    const event = await make.auditEvent({ note: 'As it was.' })
    await expect(event.update({ note: 'As it suits.' })).rejects.toMatchObject(DENIED)
    await expect(event.destroy()).rejects.toMatchObject(DENIED)
    await expect(database().query('DELETE FROM audit_events')).rejects.toMatchObject(DENIED)
    await expect(database().query('TRUNCATE TABLE audit_events')).rejects.toMatchObject(DENIED)
    expect((await models.AuditEvent.findByPk(event.id))?.note).toBe('As it was.')
  })

  test('changes the state of a document but not a byte of it', async () => {
    const document = await make.document()
    await document.update({
      state: 'void',
      voidedReason: 'The plan has changed.',
      stateChangedAt: new Date(),
    })
    await expect(document.update({ sha256: 'f'.repeat(64) })).rejects.toMatchObject(DENIED)
    await expect(document.update({ bytes: Buffer.from('other') })).rejects.toMatchObject(DENIED)
    await expect(document.destroy()).rejects.toMatchObject(DENIED)
  })

  test('voids an approval but cannot rewrite what was signed', async () => {
    const approval = await make.approval()
    await approval.update({ voidedAt: new Date(), voidedReason: 'The plan has changed.' })
    for (const forged of [
      { decision: 'returned' as const },
      { statement: 'I have examined the animal.' },
      { examined: true },
      { planHash: 'f'.repeat(64) },
      { signerName: 'Somebody else' },
    ]) {
      await expect(approval.update(forged)).rejects.toMatchObject(DENIED)
    }
    await expect(approval.destroy()).rejects.toMatchObject(DENIED)
  })

  test.each([
    ['snapshots', 'kind'],
    ['species_profiles', 'common_name'],
    ['findings', 'rule'],
    ['overrides', 'reason'],
    ['assessment_tracks', 'body'],
    ['acknowledgements', 'at'],
    ['checklist_entries', 'kind'],
    ['change_requests', 'text'],
  ])('cannot alter or empty %s', async (table, column) => {
    await expect(database().query(`UPDATE ${table} SET ${column} = ${column}`)).rejects.toMatchObject(DENIED)
    await expect(database().query(`DELETE FROM ${table}`)).rejects.toMatchObject(DENIED)
  })

  test.each(['users', 'consignments', 'assessments', 'documents', 'shippers'])(
    'cannot remove from %s',
    async (table) => {
      await expect(database().query(`DELETE FROM ${table}`)).rejects.toMatchObject(DENIED)
    },
  )

  test('cannot change the schema', async () => {
    await expect(database().query('CREATE TABLE x (y INT)')).rejects.toMatchObject(DENIED)
    await expect(database().query('DROP TABLE jobs')).rejects.toMatchObject(DENIED)
  })

  test('locks rows it may alter only in part', async () => {
    const { consignmentId } = await make.approval()
    await database().transaction(async (tx) => {
      const rows = await models.Approval.findAll({ where: { consignmentId }, lock: true, transaction: tx })
      expect(rows).toHaveLength(1)
    })
  })
})

test('every table has its line of rights, and no line is for a table that is not there', async () => {
  const rows = await database().query<{ name: string }>(
    'SELECT table_name AS name FROM information_schema.tables WHERE table_schema = DATABASE()',
    { type: QueryTypes.SELECT },
  )
  expect(rows.map(({ name }) => name).sort()).toEqual(Object.keys(GRANTS).sort())
})
