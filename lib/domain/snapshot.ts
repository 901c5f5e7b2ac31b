import 'server-only'
import { createHash } from 'node:crypto'
import canonicalize from 'canonicalize'
import type { Transaction } from 'sequelize'
import { SteadfoldError } from '@/lib/errors'
import { models } from '@/models'

export type SnapshotKind = 'scenario' | 'plan' | 'result' | 'sheet' | 'manifest'

/**
 * Keeps a plain document for good under the SHA-256 of its canonical form (RFC 8785) and gives that hash back. The same
 * document is kept once.
 */
export async function keepSnapshot(tx: Transaction, kind: SnapshotKind, document: unknown): Promise<string> {
  // Through plain JSON first: what is absent there must be absent here.
  const body = canonicalize(JSON.parse(JSON.stringify(document)))
  if (body === undefined) throw new SteadfoldError('invalid', 'There is nothing to keep.')
  const hash = createHash('sha256').update(body, 'utf8').digest('hex')
  const known = await models.Snapshot.findByPk(hash, { attributes: ['hash'], transaction: tx })
  if (known === null) {
    // Two at once write the same bytes: INSERT IGNORE lets the second find them written.
    await models.Snapshot.bulkCreate([{ hash, kind, body }], { ignoreDuplicates: true, transaction: tx })
  }
  return hash
}

/** The document under a hash, or null. Its bytes are checked against the hash: a snapshot that was altered is an error. */
export async function readSnapshot(hash: string, tx?: Transaction): Promise<unknown> {
  const row = await models.Snapshot.findByPk(hash, { transaction: tx ?? null })
  if (row === null) return null
  const actual = createHash('sha256').update(row.body, 'utf8').digest('hex')
  if (actual !== hash) throw new Error(`Snapshot ${hash} holds other bytes than it was kept with.`)
  const document: unknown = JSON.parse(row.body)
  return document
}
