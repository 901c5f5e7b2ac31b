import 'server-only'
import { Op } from 'sequelize'
import type { WhereOptions } from 'sequelize'
import { ROLES } from '@/lib/policies/actor'
import type { Actor, Role } from '@/lib/policies/actor'
import type { AuditQuery } from '@/lib/schemas/audit'
import type { AuditRow } from '@/lib/views/administration'
import { models } from '@/models'
import type { AuditEvent } from '@/models'
import { authorize } from '../authorize'
import { deskMoment } from '../firm'

export interface AuditLines {
  rows: AuditRow[]
  /** Give it as `before` for the next lines; null at the end. */
  before: number | null
}

/** The audit trail, newest first, a page at a time. */
export async function listAudit(actor: Actor, query: AuditQuery): Promise<AuditLines> {
  authorize(actor, 'audit.list')
  const events = await models.AuditEvent.findAll({
    where: whereOf(query),
    include: [{ association: 'actor', attributes: ['name'] }],
    order: [['id', 'DESC']],
    limit: query.limit + 1,
  })
  const shown = events.slice(0, query.limit)
  const marks = await marksOf(shown)
  return {
    rows: shown.map((event) => auditRow(event, marks)),
    before: events.length > query.limit ? (shown.at(-1)?.id ?? null) : null,
  }
}

function whereOf({
  actorId,
  consignmentId,
  verb,
  refused,
  from,
  to,
  before,
}: AuditQuery): WhereOptions<AuditEvent> {
  const verbs = [
    ...(verb === '' ? [] : [{ verb: { [Op.startsWith]: verb } }]),
    ...(refused ? [{ verb: { [Op.endsWith]: '.refused' } }] : []),
  ]
  return {
    ...(actorId === null ? {} : { actorId }),
    ...(consignmentId === null ? {} : { consignmentId }),
    ...(before === null ? {} : { id: { [Op.lt]: before } }),
    [Op.and]: [
      ...verbs,
      ...(from === null ? [] : [{ at: { [Op.gte]: new Date(`${from}T00:00:00.000Z`) } }]),
      ...(to === null ? [] : [{ at: { [Op.lte]: new Date(`${to}T23:59:59.999Z`) } }]),
    ],
  }
}

async function marksOf(events: readonly AuditEvent[]): Promise<Map<number, string>> {
  const ids = [...new Set(events.flatMap(({ consignmentId }) => consignmentId ?? []))]
  const rows = await models.Consignment.findAll({ where: { id: ids }, attributes: ['id', 'mark'] })
  return new Map(rows.map(({ id, mark }) => [id, mark]))
}

function auditRow(event: AuditEvent, marks: ReadonlyMap<number, string>): AuditRow {
  const { consignmentId, actorRole } = event
  return {
    id: event.id,
    at: deskMoment(event.at),
    who: event.actor?.name ?? (actorRole === null ? 'Nobody signed in' : 'Unknown'),
    role: isRole(actorRole) ? actorRole : null,
    verb: event.verb,
    subject: event.subjectId === null ? event.subjectType : `${event.subjectType} ${event.subjectId}`,
    mark: consignmentId === null ? null : (marks.get(consignmentId) ?? null),
    consignmentId,
    from: event.ip ?? '',
    note: event.note,
    before: event.before,
    after: event.after,
    refused: event.verb.endsWith('.refused'),
  }
}

function isRole(role: string | null): role is Role {
  return role !== null && (ROLES as readonly string[]).includes(role)
}
