import 'server-only'
import type { Transaction } from 'sequelize'
import { z } from 'zod'
import { planSchema } from '@/lib/schemas/plan'
import type { Consignment } from '@/models'
import { keepSnapshot, readSnapshot } from '../snapshot'

/**
 * A released revision as it went out: the plan with the names of its places, whatever becomes of them later. Drivers,
 * shippers and the road act on this, never on the rows of the plan being worked on.
 */
export const releasedPlanSchema = z.object({
  schema: z.literal('steadfold/released-plan@1'),
  mark: z.string(),
  revision: z.number().int(),
  planHash: z.string(),
  assessmentId: z.number().int(),
  plan: planSchema,
  places: z.array(
    z.object({
      id: z.number().int(),
      name: z.string(),
      kind: z.string(),
      country: z.string(),
      zone: z.string(),
      latitudeDeg: z.number(),
      longitudeDeg: z.number(),
    }),
  ),
})
export type ReleasedPlan = z.infer<typeof releasedPlanSchema>

export function keepReleasedPlan(tx: Transaction, released: ReleasedPlan): Promise<string> {
  return keepSnapshot(tx, 'plan', released)
}

/** The revision in force, or null while none is. */
export async function planInForce(
  row: Pick<Consignment, 'inForceSnapshotHash'>,
  tx?: Transaction,
): Promise<ReleasedPlan | null> {
  if (row.inForceSnapshotHash === null) return null
  return releasedPlanSchema.parse(await readSnapshot(row.inForceSnapshotHash, tx))
}
