import 'server-only'
import { Op } from 'sequelize'
import type { Transaction } from 'sequelize'
import { models } from '@/models'
import type { Approval, Consignment } from '@/models'

/** Approvals that stand for the working plan, by crate: of this plan hash, not void. */
export async function signedCrates(
  tx: Transaction | undefined,
  row: Pick<Consignment, 'id' | 'planHash'>,
): Promise<Map<string, Approval>> {
  if (row.planHash === null) return new Map()
  const approvals = await models.Approval.findAll({
    where: {
      consignmentId: row.id,
      planHash: row.planHash,
      voidedAt: null,
      decision: { [Op.ne]: 'returned' },
    },
    include: [{ association: 'overrides' }],
    order: ['id'],
    transaction: tx ?? null,
  })
  return new Map(approvals.map((approval) => [approval.crateRef, approval]))
}

/** The plan's own ids of the crates, in order. */
export async function crateRefs(tx: Transaction, consignmentId: number): Promise<string[]> {
  const crates = await models.Crate.findAll({
    where: { consignmentId },
    attributes: ['ref'],
    order: ['position'],
    transaction: tx,
  })
  return crates.map(({ ref }) => ref)
}
