import { randomUUID } from 'node:crypto'
import { gzipSync } from 'node:zlib'
import { models } from '@/models'
import { AT, next, orMake, sha256, stored } from './given'
import type { Given } from './given'
import { user } from './people'
import { consignment } from './plan'

export async function snapshot(given: Given<'Snapshot'> = {}) {
  const body = given.body ?? JSON.stringify({ n: next() })
  return stored(models.Snapshot, { kind: 'scenario', ...given, body, hash: given.hash ?? sha256(body) })
}

export async function assessment(given: Given<'Assessment'> = {}) {
  return stored(models.Assessment, {
    revision: 1,
    planHash: sha256('plan'),
    inputHash: sha256('input'),
    engineVersion: '0',
    rulesVersion: '0',
    profileVersions: { dog: 1 },
    requestedAt: AT,
    ...given,
    consignmentId: await orMake(given.consignmentId, consignment),
    requestedBy: await orMake(given.requestedBy, user),
    scenarioHash: given.scenarioHash ?? (await snapshot()).hash,
  })
}

export async function assessmentTrack(given: Given<'AssessmentTrack'> = {}) {
  return stored(models.AssessmentTrack, {
    body: gzipSync('{}'),
    ...given,
    assessmentId: await orMake(given.assessmentId, assessment),
  })
}

export async function finding(given: Given<'Finding'> = {}) {
  const rule = given.rule ?? 'core-alarm-high'
  return stored(models.Finding, {
    ordinal: 0,
    basis: 'physiology',
    status: 'met',
    overridable: true,
    body: {
      rule,
      basis: 'physiology',
      status: 'met',
      note: 'Stays inside.',
      asked: '',
      sourceTag: 'judgement',
      overridable: true,
    },
    ...given,
    rule,
    assessmentId: await orMake(given.assessmentId, assessment),
  })
}

export async function approval(given: Given<'Approval'> = {}) {
  const consignmentId = await orMake(given.consignmentId, consignment)
  return stored(models.Approval, {
    revision: 1,
    crateRef: 'crate-1',
    planHash: sha256('plan'),
    decision: 'approved',
    conditions: [],
    examined: false,
    statement: 'On the facts shown.',
    signerName: 'S. Halloway-Odu',
    registrationNumber: 'VR 40 817',
    registrationCountry: 'GB',
    registrationExpiresOn: '2027-03-31',
    signedAt: AT,
    ...given,
    consignmentId,
    assessmentId: await orMake(given.assessmentId, () => assessment({ consignmentId })),
    signerId: await orMake(given.signerId, () => user({ role: 'vet' })),
  })
}

export async function override(given: Given<'Override'> = {}) {
  return stored(models.Override, {
    findingRule: 'core-alarm-high',
    reason: 'Short, and watched throughout.',
    minutesPast: 4,
    worstBodyC: 40.1,
    ...given,
    approvalId: await orMake(given.approvalId, approval),
  })
}

export async function condition(given: Given<'Condition'> = {}) {
  return stored(models.Condition, {
    revision: 1,
    planHash: sha256('plan'),
    origin: 'narrow_margin',
    party: 'Skerrow Air Cargo',
    text: 'Hold set-point 18 °C and ventilation on, confirmed in writing.',
    ours: false,
    askedAt: AT,
    ...given,
    consignmentId: await orMake(given.consignmentId, consignment),
  })
}

export async function document(given: Given<'Document'> = {}) {
  const bytes = given.bytes ?? Buffer.from(`%PDF-1.7 ${next()}`)
  return models.Document.create({
    revision: 1,
    kind: 'manifest',
    code: code(next()),
    planHash: sha256('plan'),
    viewHash: sha256('view'),
    pageCount: 1,
    madeAt: AT,
    ...given,
    bytes,
    sha256: given.sha256 ?? sha256(bytes),
    sizeBytes: given.sizeBytes ?? bytes.length,
    consignmentId: await orMake(given.consignmentId, consignment),
    madeBy: await orMake(given.madeBy, user),
  })
}

export async function job(given: Given<'Job'> = {}) {
  return stored(models.Job, { kind: 'assess', payload: {}, runAfter: AT, ...given })
}

export async function outboxMessage(given: Given<'OutboxMessage'> = {}) {
  return stored(models.OutboxMessage, {
    messageId: `<${randomUUID()}@corran.example>`,
    toAddress: 'j.strand@example.org',
    subject: 'Manifest 2417',
    text: 'The manifest is attached.',
    html: '<p>The manifest is attached.</p>',
    attachments: [],
    nextAttemptAt: AT,
    ...given,
  })
}

export async function checklistEntry(given: Given<'ChecklistEntry'> = {}) {
  return stored(models.ChecklistEntry, {
    clientId: randomUUID(),
    revision: 1,
    legRef: 'leg-1',
    itemKey: 'look',
    kind: 'tick',
    at: AT,
    value: {},
    receivedAt: AT,
    ...given,
    consignmentId: await orMake(given.consignmentId, consignment),
    userId: await orMake(given.userId, () => user({ role: 'driver' })),
  })
}

export async function auditEvent(given: Given<'AuditEvent'> = {}) {
  return stored(models.AuditEvent, { at: AT, verb: 'consignment.save', subjectType: 'consignment', ...given })
}

/** Eight characters of the alphabet of document codes, different for each number. */
function code(n: number): string {
  const letters = 'ABCDEFGHJKLMNPQRSTUVWXYZ23456789'
  return Array.from(
    { length: 8 },
    (_, place) => letters[Math.floor(n / letters.length ** place) % letters.length],
  ).join('')
}
