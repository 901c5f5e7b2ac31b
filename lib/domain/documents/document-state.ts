import 'server-only'
import type { Transaction } from 'sequelize'
import { models } from '@/models'

/** Takes back every paper of a consignment that still counts. The papers stay; only what they are worth changes. */
export async function voidDocuments(
  tx: Transaction,
  consignmentId: number,
  { at, reason, revision }: { at: Date; reason: string; revision?: number },
): Promise<number> {
  const [count] = await models.Document.update(
    { state: 'void', stateChangedAt: at, voidedReason: reason.slice(0, 500) },
    {
      where: { consignmentId, state: 'current', ...(revision === undefined ? {} : { revision }) },
      transaction: tx,
    },
  )
  return count
}

/** A new revision is out: papers of earlier ones are superseded. */
export async function supersedeDocuments(tx: Transaction, consignmentId: number, at: Date): Promise<number> {
  const [count] = await models.Document.update(
    { state: 'superseded', stateChangedAt: at },
    { where: { consignmentId, state: 'current' }, transaction: tx },
  )
  return count
}
