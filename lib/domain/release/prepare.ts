import 'server-only'
import { randomBytes } from 'node:crypto'
import { z } from 'zod'
import { actorOf } from '@/lib/auth/sign-in'
import { transaction } from '@/lib/db/transaction'
import { documentCode } from '@/lib/documents/code'
import { SteadfoldError } from '@/lib/errors'
import type { Actor } from '@/lib/policies/actor'
import { nextState } from '@/lib/states/consignment'
import type { SheetFacts } from '@/lib/views/sheet-view/facts'
import { models } from '@/models'
import { currentAssessment } from '../consignments/current-assessment'
import { sheetFacts } from '../consignments/sheet-facts'
import { findConsignment } from '../consignments/visible'
import { releaseObstacles } from './obstacles'
import { notYet } from './release'

export const releasePayloadSchema = z.object({
  consignmentId: z.number().int().positive(),
  revision: z.number().int().positive(),
  planHash: z.string().length(64),
  actorId: z.number().int().positive(),
})
export type ReleaseTask = z.infer<typeof releasePayloadSchema>

/** A consignment as it was read: any write to it since shows in one of the two. */
export interface ReadAt {
  version: number
  updatedAt: Date
}

export interface PreparedRelease {
  task: ReleaseTask
  /** What the papers are made from was read then. */
  readAt: ReadAt
  releasedBy: Actor
  /** For the go/no-go sheet, with its own code. */
  sheet: SheetFacts
  /** For the manifest, with its own code. */
  manifest: SheetFacts
  shipperEmail: string
}

/**
 * What the papers of a release are made from, or null where it is released already. Throws where the consignment has moved
 * on or something now stands in the way: then there is nothing to render.
 */
export async function prepareRelease(payload: unknown, now: Date): Promise<PreparedRelease | null> {
  const task = releasePayloadSchema.parse(payload)
  const releasedBy = await releaser(task)
  const { row } = await findConsignment(releasedBy, task.consignmentId)
  if (row.inForceRevision === task.revision && row.inForceState !== null) return null
  if (
    nextState(row.state, 'release') === undefined ||
    row.revision !== task.revision ||
    row.planHash !== task.planHash
  ) {
    throw new SteadfoldError('wrong_state', 'The consignment has changed since the release was asked for.')
  }
  const obstacles = await transaction(async (tx) =>
    releaseObstacles(tx, row, await currentAssessment(tx, row), now),
  )
  if (obstacles.length > 0) throw notYet(obstacles)
  const shipper = await models.Shipper.findByPk(row.shipperId)
  // Both papers speak of the same: tracks are long, and are read once.
  const facts = await sheetFacts(row, { which: 'working', tracks: true, now })
  return {
    task,
    readAt: { version: row.version, updatedAt: row.updatedAt },
    releasedBy,
    sheet: { ...facts, documentCode: await freeCode() },
    manifest: { ...facts, documentCode: await freeCode() },
    shipperEmail: shipper?.email ?? '',
  }
}

/** Whoever asked for the release, as they are now: a closed account or another role releases nothing. */
export async function releaser({ actorId }: ReleaseTask): Promise<Actor> {
  const user = await models.User.findOne({ where: { id: actorId, disabledAt: null } })
  if (user === null)
    throw new SteadfoldError('not_allowed', 'Whoever asked for this release has no account any more.')
  return actorOf(user, null)
}

async function freeCode(): Promise<string> {
  for (;;) {
    const code = documentCode(randomBytes(8))
    if ((await models.Document.count({ where: { code } })) === 0) return code
  }
}
