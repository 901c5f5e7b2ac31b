import 'server-only'
import { Op } from 'sequelize'
import type { Actor } from '@/lib/policies/actor'
import type { ReviewQueueRow } from '@/lib/views/review'
import { buildQueueRows } from '@/lib/views/review-view/build-queue-rows'
import { models } from '@/models'
import { authorize } from '../authorize'
import { sheetFacts } from '../consignments/sheet-facts'

const LONGEST_QUEUE = 100

/** The crate set-ups that wait for a vet, in order of leaving; those of the same consignment already signed stand beside. */
export async function reviewQueue(actor: Actor, now: Date): Promise<ReviewQueueRow[]> {
  authorize(actor, 'approval.queue')
  const rows = await models.Consignment.findAll({
    where: { state: 'in_review', departsAt: { [Op.ne]: null } },
    order: ['departsAt', 'id'],
    limit: LONGEST_QUEUE,
  })
  const queue: ReviewQueueRow[] = []
  for (const row of rows) {
    queue.push(...buildQueueRows(await sheetFacts(row, { which: 'working', tracks: false, now })))
  }
  return queue
}
