import { Model } from 'sequelize'
import type {
  CreationOptional,
  InferAttributes,
  InferCreationAttributes,
  NonAttribute,
  Sequelize,
} from 'sequelize'
import { z } from 'zod'
import type { Verdict } from '@/lib/rules/result'
import { VERDICTS } from './consignment'
import type { Finding } from './finding'
import { count, hash, json, key, link, moment, oneOf, optional, text, withDefault } from './columns'

export const ASSESSMENT_STATUSES = ['queued', 'running', 'done', 'failed', 'superseded'] as const
export type AssessmentStatus = (typeof ASSESSMENT_STATUSES)[number]

export const assessmentErrorSchema = z.looseObject({ code: z.string(), message: z.string() })
export type AssessmentError = z.infer<typeof assessmentErrorSchema>

/** One run of the engine over one scenario. What it found never changes. */
export class Assessment extends Model<InferAttributes<Assessment>, InferCreationAttributes<Assessment>> {
  declare id: CreationOptional<number>
  declare consignmentId: number
  declare revision: number
  declare planHash: string
  declare inputHash: string
  /** The snapshot that was run. */
  declare scenarioHash: string
  /** The plan it was made of, with its places, as a snapshot. */
  declare planSnapshotHash: CreationOptional<string | null>
  declare status: CreationOptional<AssessmentStatus>
  declare stage: CreationOptional<string>
  declare doneCount: CreationOptional<number>
  declare totalCount: CreationOptional<number>
  declare engineVersion: string
  declare rulesVersion: string
  declare profileVersions: Record<string, number>
  declare resultHash: string | null
  declare verdict: Verdict | null
  declare error: AssessmentError | null
  declare requestedBy: number
  declare requestedAt: Date
  declare startedAt: Date | null
  declare finishedAt: Date | null

  declare findings?: NonAttribute<Finding[]>
}

export function initAssessment(sequelize: Sequelize): typeof Assessment {
  return Assessment.init(
    {
      id: key(),
      consignmentId: link(),
      revision: count(),
      planHash: hash(),
      inputHash: hash(),
      scenarioHash: hash(),
      planSnapshotHash: optional(hash()),
      status: withDefault(oneOf(ASSESSMENT_STATUSES), 'queued'),
      stage: withDefault(text(60), ''),
      doneCount: withDefault(count(), 0),
      totalCount: withDefault(count(), 0),
      engineVersion: text(40),
      rulesVersion: text(40),
      profileVersions: json('profileVersions', z.record(z.string(), z.number())),
      resultHash: optional(hash()),
      verdict: optional(oneOf(VERDICTS)),
      error: optional(json('error', assessmentErrorSchema)),
      requestedBy: link(),
      requestedAt: moment(),
      startedAt: optional(moment()),
      finishedAt: optional(moment()),
    },
    { sequelize, modelName: 'Assessment', tableName: 'assessments', timestamps: false },
  )
}
