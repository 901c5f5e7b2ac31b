import 'server-only'
import type { HistoryLine } from '@/lib/views/desk-page'
import { models } from '@/models'
import { deskMoment } from '../firm'

const MOST = 60

/** What happened to one consignment, newest first: its own lines of the audit trail. */
export async function historyLines(consignmentId: number): Promise<HistoryLine[]> {
  const events = await models.AuditEvent.findAll({
    where: { consignmentId },
    attributes: ['id', 'at', 'actorId', 'verb', 'note'],
    include: [{ association: 'actor', attributes: ['name'] }],
    order: [['id', 'DESC']],
    limit: MOST,
  })
  return events.map((event) => ({
    id: event.id,
    at: deskMoment(event.at),
    who: event.actor?.name ?? 'Steadfold',
    verb: event.verb,
    note: event.note,
    refused: event.verb.endsWith('.refused'),
  }))
}
