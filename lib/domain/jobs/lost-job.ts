import 'server-only'
import type { Transaction } from 'sequelize'
import { z } from 'zod'
import type { Job } from '@/models'
import { failAssessment } from '../assessments/record'

const assessPayload = z.object({ assessmentId: z.number().int().positive() })

/**
 * A job has ended and will not be done: says so where people wait for it, in the transaction that ends it. An assessment
 * is marked as failed, so that it can be asked for again; a release is told by its job alone.
 */
export async function tellOfLostJob(
  tx: Transaction,
  { kind, payload }: Pick<Job, 'kind' | 'payload'>,
  { message, forPeople }: { message: string; forPeople: boolean },
  now: Date,
): Promise<void> {
  if (kind !== 'assess') return
  const about = assessPayload.safeParse(payload)
  if (!about.success) return
  const { assessmentId } = about.data
  const error = { code: 'unavailable', message: forPeople ? message : BROKE_OFF }
  await failAssessment(tx, { assessmentId, error, ...(!forPeople && { cause: message }) }, now)
}

const BROKE_OFF =
  'The assessment broke off each time it was tried. Ask for it again; if it breaks off once more, tell whoever looks after this installation.'
