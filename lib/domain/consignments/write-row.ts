import 'server-only'
import type { Transaction } from 'sequelize'
import { SteadfoldError } from '@/lib/errors'
import { models } from '@/models'
import type { Consignment } from '@/models'

/** Writes to the row as it was read and to no later one: a version that has moved on meanwhile is a `conflict`. */
export async function writeRow(
  tx: Transaction,
  row: Consignment,
  values: Parameters<typeof models.Consignment.update>[0],
): Promise<void> {
  const where = { id: row.id, version: row.version }
  const [count] = await models.Consignment.update(values, { where, transaction: tx })
  if (count === 0)
    throw new SteadfoldError('conflict', 'Somebody else has just changed this consignment. Load it again.')
  await row.reload({ transaction: tx })
}
