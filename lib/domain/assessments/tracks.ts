import 'server-only'
import { createHash } from 'node:crypto'
import { promisify } from 'node:util'
import { gunzip, gzip } from 'node:zlib'
import canonicalize from 'canonicalize'
import type { Transaction } from 'sequelize'
import type { Assessment } from '@/lib/rules/result'
import { models } from '@/models'

/** The long arrays of an assessment, kept apart from its findings. */
export type Tracks = Pick<Assessment, 'crates' | 'animals' | 'compartments'>

export interface PackedTracks {
  body: Buffer
  /** SHA-256 of the canonical text before it is packed. */
  sha256: string
}

/** Tracks as gzipped canonical JSON, three decimals: a hundredth of what a logger can tell, at a tenth of the size. */
export async function packTracks({ crates, animals, compartments }: Tracks): Promise<PackedTracks> {
  const rounded: unknown = JSON.parse(JSON.stringify({ crates, animals, compartments }, threeDecimals))
  const text = canonicalize(rounded) ?? ''
  return {
    body: await promisify(gzip)(text),
    sha256: createHash('sha256').update(text, 'utf8').digest('hex'),
  }
}

/** The tracks of an assessment; null while it has none. */
export async function readTracks(assessmentId: number, tx?: Transaction): Promise<Tracks | null> {
  const row = await models.AssessmentTrack.findByPk(assessmentId, { transaction: tx ?? null })
  if (row === null) return null
  const tracks: unknown = JSON.parse((await promisify(gunzip)(row.body)).toString('utf8'))
  return tracks as Tracks
}

function threeDecimals(_key: string, value: unknown): unknown {
  return typeof value === 'number' ? Math.round(value * 1000) / 1000 : value
}
