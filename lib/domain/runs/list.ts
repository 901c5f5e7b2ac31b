import 'server-only'
import { Op } from 'sequelize'
import type { Actor } from '@/lib/policies/actor'
import type { RunRow } from '@/lib/views/checklist'
import { buildRunRow } from '@/lib/views/checklist-view/build-run-row'
import { models } from '@/models'
import { authorize } from '../authorize'
import { sheetFacts } from '../consignments/sheet-facts'
import { visibleConsignments } from '../consignments/visible'

/** A driver's own runs that are released or under way, by the time they leave. */
export async function listRuns(actor: Actor, now: Date): Promise<RunRow[]> {
  authorize(actor, 'run.list')
  const rows = await models.Consignment.findAll({
    where: { [Op.and]: [visibleConsignments(actor), { inForceState: ['released', 'under_way'] }] },
    order: ['departsAt', 'id'],
    limit: 100,
  })
  const runs: RunRow[] = []
  for (const row of rows) {
    const entries = await models.ChecklistEntry.findAll({
      where: { consignmentId: row.id, kind: 'close_leg' },
      attributes: ['kind', 'legRef'],
    })
    const facts = await sheetFacts(row, { which: 'in-force', tracks: false, now })
    const closed = entries.map(({ kind, legRef }) => ({ kind, legId: legRef }))
    runs.push(buildRunRow(facts, actor.id, row.animalsSummary, closed))
  }
  return runs
}
