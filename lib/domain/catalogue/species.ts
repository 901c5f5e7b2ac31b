import 'server-only'
import { SteadfoldError } from '@/lib/errors'
import type { Actor } from '@/lib/policies/actor'
import { profileValues } from '@/lib/species'
import type { Profile } from '@/lib/species'
import type { SpeciesRow, SpeciesView } from '@/lib/views/species'
import { buildSpeciesView, limitsOf } from '@/lib/views/species'
import { models } from '@/models'
import type { SpeciesProfile } from '@/models'
import { authorize } from '../authorize'
import { deskMoment } from '../firm'

/** The species rows in force, by name, with their four limits or the reason why nothing can be assessed with them. */
export async function listSpecies(actor: Actor): Promise<SpeciesRow[]> {
  authorize(actor, 'species.read')
  const versions = await models.SpeciesProfile.findAll({
    order: [
      ['commonName', 'ASC'],
      ['key', 'ASC'],
      ['version', 'DESC'],
    ],
  })
  const latest = versions.filter((row, index) => versions.findIndex(({ key }) => key === row.key) === index)
  return latest.map(speciesRow)
}

/** One species row in force: each figure with its source and how far it can be trusted, and its earlier versions. */
export async function loadSpecies(actor: Actor, { key }: { key: string }): Promise<SpeciesView> {
  authorize(actor, 'species.read')
  const versions = await models.SpeciesProfile.findAll({ where: { key }, order: [['version', 'DESC']] })
  const [latest] = versions
  if (latest === undefined) throw new SteadfoldError('not_found', 'There is no such species row.')
  return buildSpeciesView(
    speciesRow(latest),
    latest.profile,
    versions.map(({ version, createdAt }) => ({ version, since: deskMoment(createdAt) })),
  )
}

function speciesRow(row: SpeciesProfile): SpeciesRow {
  const { profile } = row
  return {
    key: row.key,
    commonName: row.commonName,
    scientificName: row.scientificName,
    version: row.version,
    since: deskMoment(row.createdAt),
    bodyPlan: profile.bodyPlan,
    limits: limitsOf(profile),
    refused: refusalOf(profile),
  }
}

/** Why nothing can be assessed with this row; empty where it can. */
function refusalOf(profile: Profile): string {
  try {
    profileValues(profile)
    return ''
  } catch (error) {
    return error instanceof Error ? error.message : String(error)
  }
}
