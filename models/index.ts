import 'server-only'
import type { Sequelize } from 'sequelize'
import { database } from '@/lib/db/connection'
import { initAcknowledgement } from './acknowledgement'
import { initAnimal } from './animal'
import { initApproval } from './approval'
import { initAssessment } from './assessment'
import { initAssessmentTrack } from './assessment-track'
import { initAuditEvent } from './audit-event'
import { initChangeRequest } from './change-request'
import { initChecklistEntry } from './checklist-entry'
import { initCondition } from './condition'
import { initConsignment } from './consignment'
import { initConsignmentWord } from './consignment-word'
import { initCrate } from './crate'
import { initCrateModel } from './crate-model'
import { initDocument } from './document'
import { initFinding } from './finding'
import { initJob } from './job'
import { initLeg } from './leg'
import { initOccupant } from './occupant'
import { initOpening } from './opening'
import { initOutboxMessage } from './outbox-message'
import { initOverride } from './override'
import { initPlace } from './place'
import { initShipper } from './shipper'
import { initSnapshot } from './snapshot'
import { initSpeciesProfile } from './species-profile'
import { initThrottleAttempt } from './throttle-attempt'
import { initThrottleKey } from './throttle-key'
import { initUser } from './user'
import { associate } from './associations'

/*
 * The registry of models. Use a class only through it (models.User.findByPk(…)): each bundle of the web server evaluates
 * the model files again, and the classes of a second evaluation are not connected. Types may be imported freely.
 */
export type { Acknowledgement } from './acknowledgement'
export type { Animal } from './animal'
export type { Approval } from './approval'
export type { Assessment } from './assessment'
export type { AssessmentTrack } from './assessment-track'
export type { AuditEvent } from './audit-event'
export type { ChangeRequest } from './change-request'
export type { ChecklistEntry } from './checklist-entry'
export type { Condition } from './condition'
export type { Consignment } from './consignment'
export type { ConsignmentWord } from './consignment-word'
export type { Crate } from './crate'
export type { CrateModel } from './crate-model'
export type { Document } from './document'
export type { Finding } from './finding'
export type { Job } from './job'
export type { Leg } from './leg'
export type { Occupant } from './occupant'
export type { Opening } from './opening'
export type { OutboxMessage } from './outbox-message'
export type { Override } from './override'
export type { Place } from './place'
export type { Shipper } from './shipper'
export type { Snapshot } from './snapshot'
export type { SpeciesProfile } from './species-profile'
export type { ThrottleAttempt } from './throttle-attempt'
export type { ThrottleKey } from './throttle-key'
export type { User } from './user'

export type Models = ReturnType<typeof initModels>

const shared = globalThis as { steadfoldModels?: Models }

/** All models of this process, connected to its one database; making them opens no connection. */
export const models: Models = (shared.steadfoldModels ??= initModels(database()))

function initModels(sequelize: Sequelize) {
  const registry = {
    Acknowledgement: initAcknowledgement(sequelize),
    Animal: initAnimal(sequelize),
    Approval: initApproval(sequelize),
    Assessment: initAssessment(sequelize),
    AssessmentTrack: initAssessmentTrack(sequelize),
    AuditEvent: initAuditEvent(sequelize),
    ChangeRequest: initChangeRequest(sequelize),
    ChecklistEntry: initChecklistEntry(sequelize),
    Condition: initCondition(sequelize),
    Consignment: initConsignment(sequelize),
    ConsignmentWord: initConsignmentWord(sequelize),
    Crate: initCrate(sequelize),
    CrateModel: initCrateModel(sequelize),
    Document: initDocument(sequelize),
    Finding: initFinding(sequelize),
    Job: initJob(sequelize),
    Leg: initLeg(sequelize),
    Occupant: initOccupant(sequelize),
    Opening: initOpening(sequelize),
    OutboxMessage: initOutboxMessage(sequelize),
    Override: initOverride(sequelize),
    Place: initPlace(sequelize),
    Shipper: initShipper(sequelize),
    Snapshot: initSnapshot(sequelize),
    SpeciesProfile: initSpeciesProfile(sequelize),
    ThrottleAttempt: initThrottleAttempt(sequelize),
    ThrottleKey: initThrottleKey(sequelize),
    User: initUser(sequelize),
  }
  associate(registry)
  return registry
}
