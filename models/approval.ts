import { Model } from 'sequelize'
import type {
  CreationOptional,
  InferAttributes,
  InferCreationAttributes,
  NonAttribute,
  Sequelize,
} from 'sequelize'
import { z } from 'zod'
import { vetConditionSchema } from '@/lib/schemas/approval'
import type { Override } from './override'
import {
  count,
  day,
  fixedText,
  hash,
  json,
  key,
  link,
  longText,
  moment,
  oneOf,
  optional,
  text,
  withDefault,
  yesNo,
} from './columns'

export const APPROVAL_DECISIONS = ['approved', 'approved_with_conditions', 'returned'] as const
export type ApprovalDecision = (typeof APPROVAL_DECISIONS)[number]
export type ApprovalCondition = z.infer<typeof vetConditionSchema>

/** A vet's decision on one crate set-up, in the words and with the registration it was signed with. */
export class Approval extends Model<InferAttributes<Approval>, InferCreationAttributes<Approval>> {
  declare id: CreationOptional<number>
  declare consignmentId: number
  declare revision: number
  declare crateRef: string
  declare planHash: string
  declare assessmentId: number
  declare decision: ApprovalDecision
  declare conditions: ApprovalCondition[]
  /** Signs the driver is told to ring for. */
  declare earlySigns: CreationOptional<string[]>
  declare reasons: CreationOptional<string>
  declare examined: boolean
  declare statement: string
  declare signerId: number
  declare signerName: string
  declare registrationNumber: string
  declare registrationCountry: string
  declare registrationExpiresOn: string
  declare signedAt: Date
  declare voidedAt: Date | null
  declare voidedReason: string | null
  declare withdrawn: CreationOptional<boolean>

  declare overrides?: NonAttribute<Override[]>
}

export function initApproval(sequelize: Sequelize): typeof Approval {
  return Approval.init(
    {
      id: key(),
      consignmentId: link(),
      revision: count(),
      crateRef: text(24),
      planHash: hash(),
      assessmentId: link(),
      decision: oneOf(APPROVAL_DECISIONS),
      conditions: json('conditions', z.array(vetConditionSchema)),
      earlySigns: withDefault(json('earlySigns', z.array(z.string())), []),
      reasons: withDefault(text(2000), ''),
      examined: yesNo(),
      statement: longText(),
      signerId: link(),
      signerName: text(120),
      registrationNumber: text(40),
      registrationCountry: fixedText(2),
      registrationExpiresOn: day(),
      signedAt: moment(),
      voidedAt: optional(moment()),
      voidedReason: optional(text(500)),
      withdrawn: withDefault(yesNo(), false),
    },
    { sequelize, modelName: 'Approval', tableName: 'approvals', timestamps: false },
  )
}
