import type { Models } from './index'

/** Who belongs to whom. Names are written out: class names are shortened in production bundles. */
export function associate(models: Models): void {
  const { Consignment, Animal, Crate, Occupant, Opening, Leg, Shipper, User, Place } = models
  const { Assessment, AssessmentTrack, Finding, Approval, Override, Condition } = models
  const { Document, Acknowledgement, ChangeRequest, ChecklistEntry, AuditEvent } = models

  User.belongsTo(Shipper, { as: 'shipper', foreignKey: 'shipperId' })

  Consignment.belongsTo(Shipper, { as: 'shipper', foreignKey: 'shipperId' })
  Consignment.hasMany(Animal, { as: 'animals', foreignKey: 'consignmentId' })
  Consignment.hasMany(Crate, { as: 'crates', foreignKey: 'consignmentId' })
  Consignment.hasMany(Leg, { as: 'legs', foreignKey: 'consignmentId' })
  Consignment.hasMany(Assessment, { as: 'assessments', foreignKey: 'consignmentId' })
  Consignment.belongsTo(Assessment, { as: 'assessment', foreignKey: 'assessmentId', constraints: false })
  Consignment.hasMany(Approval, { as: 'approvals', foreignKey: 'consignmentId' })
  Consignment.hasMany(Condition, { as: 'conditions', foreignKey: 'consignmentId' })
  Consignment.hasMany(Document, { as: 'documents', foreignKey: 'consignmentId' })
  Consignment.hasMany(ChecklistEntry, { as: 'checklistEntries', foreignKey: 'consignmentId' })

  Crate.hasMany(Opening, { as: 'openings', foreignKey: 'crateId' })
  Crate.hasMany(Occupant, { as: 'occupants', foreignKey: 'crateId' })
  Occupant.belongsTo(Animal, { as: 'animal', foreignKey: 'animalId' })

  Leg.belongsTo(Place, { as: 'fromPlace', foreignKey: 'fromPlaceId' })
  Leg.belongsTo(Place, { as: 'toPlace', foreignKey: 'toPlaceId' })
  Leg.belongsTo(User, { as: 'driver', foreignKey: 'driverId' })
  Leg.belongsTo(Consignment, { as: 'consignment', foreignKey: 'consignmentId' })

  Assessment.hasMany(Finding, { as: 'findings', foreignKey: 'assessmentId' })
  Assessment.hasOne(AssessmentTrack, { as: 'track', foreignKey: 'assessmentId' })
  Assessment.belongsTo(Consignment, { as: 'consignment', foreignKey: 'consignmentId' })

  Approval.hasMany(Override, { as: 'overrides', foreignKey: 'approvalId' })
  Approval.belongsTo(Assessment, { as: 'assessment', foreignKey: 'assessmentId' })
  Approval.belongsTo(Consignment, { as: 'consignment', foreignKey: 'consignmentId' })

  Document.belongsTo(Consignment, { as: 'consignment', foreignKey: 'consignmentId' })
  Document.hasOne(Acknowledgement, { as: 'acknowledgement', foreignKey: 'documentId' })
  Acknowledgement.belongsTo(User, { as: 'user', foreignKey: 'userId' })
  ChangeRequest.belongsTo(User, { as: 'user', foreignKey: 'userId' })
  ChecklistEntry.belongsTo(User, { as: 'user', foreignKey: 'userId' })
  AuditEvent.belongsTo(User, { as: 'actor', foreignKey: 'actorId' })
}
