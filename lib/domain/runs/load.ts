import 'server-only'
import type { Actor } from '@/lib/policies/actor'
import { actsNow } from '@/lib/policies/acts'
import type { ChecklistView, EntryView } from '@/lib/views/checklist'
import { buildChecklistView } from '@/lib/views/checklist-view/build-checklist-view'
import { models } from '@/models'
import type { ChecklistEntry } from '@/models'
import { authorize } from '../authorize'
import { sheetFacts } from '../consignments/sheet-facts'
import { findConsignment } from '../consignments/visible'

/** The checklist of one run: the driver's own legs, and what was written down so far on them. */
export async function loadRun(
  actor: Actor,
  { consignmentId }: { consignmentId: number },
  now: Date,
): Promise<ChecklistView> {
  authorize(actor, 'run.list')
  const { row, facts } = await findConsignment(actor, consignmentId)
  const entries = await models.ChecklistEntry.findAll({
    where: { consignmentId, revision: row.inForceRevision ?? 0 },
    order: ['at', 'id'],
  })
  const manifest = await models.Document.findOne({
    where: { consignmentId, kind: 'manifest', state: 'current' },
    attributes: ['code'],
    order: [['id', 'DESC']],
  })
  const acts = actsNow(actor, facts, row)
  return buildChecklistView({
    sheet: await sheetFacts(row, { which: 'in-force', tracks: false, now }),
    driver: actor,
    entries: entries.map(entryView),
    documentCode: manifest?.code ?? null,
    may: {
      depart: acts.includes('depart'),
      deliver: acts.includes('deliver'),
      stop: acts.includes('stop'),
    },
  })
}

function entryView(entry: ChecklistEntry): EntryView {
  return {
    clientId: entry.clientId,
    legId: entry.legRef,
    itemKey: entry.itemKey,
    kind: entry.kind,
    atMs: entry.at.getTime(),
    place: entry.place,
    value: isRecord(entry.value) ? entry.value : {},
    alive: entry.alive,
    dead: entry.dead,
    short: entry.short,
  }
}

function isRecord(value: unknown): value is Record<string, unknown> {
  return typeof value === 'object' && value !== null && !Array.isArray(value)
}
