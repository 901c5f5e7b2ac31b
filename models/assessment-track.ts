import { Model } from 'sequelize'
import type { InferAttributes, InferCreationAttributes, Sequelize } from 'sequelize'
import { bytes, link } from './columns'

/** The tracks of an assessment: gzipped canonical JSON. */
export class AssessmentTrack extends Model<
  InferAttributes<AssessmentTrack>,
  InferCreationAttributes<AssessmentTrack>
> {
  declare assessmentId: number
  declare body: Buffer
}

export function initAssessmentTrack(sequelize: Sequelize): typeof AssessmentTrack {
  return AssessmentTrack.init(
    {
      assessmentId: { ...link(), primaryKey: true },
      body: bytes(),
    },
    { sequelize, modelName: 'AssessmentTrack', tableName: 'assessment_tracks', timestamps: false },
  )
}
