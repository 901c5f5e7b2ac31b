import { Model } from 'sequelize'
import type { InferAttributes, InferCreationAttributes, Sequelize } from 'sequelize'
import { z } from 'zod'
import type { Basis, FindingStatus, LimitKind, Finding as RuleFinding } from '@/lib/rules/result'
import { decimal, figure, json, link, oneOf, optional, smallCount, text, whole, yesNo } from './columns'

export const BASES: readonly Basis[] = ['law', 'standard', 'carrier', 'house', 'physiology']
export const FINDING_STATUSES: readonly FindingStatus[] = [
  'met',
  'note',
  'condition',
  'breach',
  'judgement',
  'unknown',
]
export const LIMIT_KINDS: readonly LimitKind[] = ['critical', 'alarm', 'cold-effort', 'other']

/** One finding of an assessment. */
export class Finding extends Model<InferAttributes<Finding>, InferCreationAttributes<Finding>> {
  declare assessmentId: number
  /** Its place in the assessment: what an override or a verdict points to. */
  declare ordinal: number
  declare rule: string
  declare basis: Basis
  declare status: FindingStatus
  declare side: 'high' | 'low' | null
  declare limitKind: LimitKind | null
  declare animalRef: string | null
  declare crateRef: string | null
  declare legRef: string | null
  declare marginMin: number | null
  declare marginOutsideAirC: number | null
  declare marginBodyC: number | null
  declare minute: number | null
  declare overridable: boolean
  /** The finding as the rules gave it. */
  declare body: RuleFinding
}

export function initFinding(sequelize: Sequelize): typeof Finding {
  return Finding.init(
    {
      assessmentId: { ...link(), primaryKey: true },
      ordinal: { ...smallCount(), primaryKey: true },
      rule: text(80),
      basis: oneOf(BASES),
      status: oneOf(FINDING_STATUSES),
      side: optional(oneOf(['high', 'low'])),
      limitKind: optional(oneOf(LIMIT_KINDS)),
      animalRef: optional(text(24)),
      crateRef: optional(text(24)),
      legRef: optional(text(24)),
      marginMin: optional(whole()),
      marginOutsideAirC: optional(decimal('marginOutsideAirC', 5, 1)),
      marginBodyC: optional(decimal('marginBodyC', 6, 3)),
      minute: optional(figure()),
      overridable: yesNo(),
      body: json('body', z.looseObject({ rule: z.string(), note: z.string() })),
    },
    { sequelize, modelName: 'Finding', tableName: 'findings', timestamps: false },
  )
}
