import 'server-only'
import { transaction } from '@/lib/db/transaction'
import { isSteadfoldError } from '@/lib/errors'
import type { FieldIssue } from '@/lib/errors'
import type { ReleaseReadiness } from '@/lib/views/desk-page'
import { models } from '@/models'
import type { Consignment } from '@/models'
import { currentAssessment } from '../consignments/current-assessment'
import { deskMoment } from '../firm'
import { releaseObstacles } from './obstacles'

/** What a release would be refused for now, so that the page can say it before anybody presses. */
export async function releaseReadiness(row: Consignment, now: Date): Promise<ReleaseReadiness> {
  return { obstacles: await obstaclesOf(row, now), oldestAir: await oldestAir(row.id) }
}

function obstaclesOf(row: Consignment, now: Date): Promise<FieldIssue[]> {
  return transaction(async (tx) => {
    try {
      return await releaseObstacles(tx, row, await currentAssessment(tx, row), now)
    } catch (error) {
      if (!isSteadfoldError(error)) throw error
      return [{ path: 'assessment', message: error.message }]
    }
  })
}

async function oldestAir(consignmentId: number) {
  const legs = await models.Leg.findAll({ where: { consignmentId }, attributes: ['airEnteredAt'] })
  const times = legs.flatMap(({ airEnteredAt }) => airEnteredAt?.getTime() ?? [])
  return times.length === 0 ? null : deskMoment(new Date(Math.min(...times)))
}
