import { Model } from 'sequelize'
import type { CreationOptional, InferAttributes, InferCreationAttributes, Sequelize } from 'sequelize'
import { z } from 'zod'
import { json, key, moment, oneOf, optional, smallCount, text, withDefault } from './columns'

export const JOB_STATES = ['queued', 'running', 'done', 'failed'] as const
export type JobState = (typeof JOB_STATES)[number]

export const jobProgressSchema = z.object({ stage: z.string(), done: z.number(), total: z.number() })
export type JobProgress = z.infer<typeof jobProgressSchema>

/** Work for the worker process. */
export class Job extends Model<InferAttributes<Job>, InferCreationAttributes<Job>> {
  declare id: CreationOptional<number>
  declare kind: string
  declare payload: Record<string, unknown>
  /** At most one row holds a key; whoever ends the job clears it. */
  declare dedupeKey: string | null
  declare state: CreationOptional<JobState>
  declare attempts: CreationOptional<number>
  declare runAfter: Date
  declare leaseUntil: Date | null
  declare leasedBy: string | null
  declare lastError: string | null
  declare progress: JobProgress | null
  declare createdAt: CreationOptional<Date>
  declare updatedAt: CreationOptional<Date>
}

export function initJob(sequelize: Sequelize): typeof Job {
  return Job.init(
    {
      id: key(),
      kind: text(40),
      payload: json('payload', z.record(z.string(), z.unknown())),
      dedupeKey: optional(text(120)),
      state: withDefault(oneOf(JOB_STATES), 'queued'),
      attempts: withDefault(smallCount(), 0),
      runAfter: moment(),
      leaseUntil: optional(moment()),
      leasedBy: optional(text(80)),
      lastError: optional(text(2000)),
      progress: optional(json('progress', jobProgressSchema)),
      createdAt: moment(),
      updatedAt: moment(),
    },
    { sequelize, modelName: 'Job', tableName: 'jobs' },
  )
}
