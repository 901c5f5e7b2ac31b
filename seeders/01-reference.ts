import 'server-only'
import canonicalize from 'canonicalize'
import { catalogue } from '@/lib/species'
import type { Profile } from '@/lib/species'
import { models } from '@/models'
import { CRATE_MODELS } from './crate-models'

/**
 * What every installation starts with: the shipped species rows and crate models. Safe anywhere and any number of times:
 * it adds what is missing and touches nothing else, so that what an admin has changed stays changed.
 */
export async function seed(): Promise<{ species: number; crateModels: number }> {
  let species = 0
  for (const profile of Object.values(catalogue)) if (await addProfile(profile)) species += 1
  let crateModels = 0
  for (const { name, spec } of CRATE_MODELS) {
    const [, created] = await models.CrateModel.findOrCreate({ where: { name }, defaults: { name, spec } })
    if (created) crateModels += 1
  }
  return { species, crateModels }
}

async function addProfile(profile: Profile): Promise<boolean> {
  const { key, version, commonName, scientificName } = profile
  const [row, created] = await models.SpeciesProfile.findOrCreate({
    where: { key, version },
    defaults: { key, version, commonName, scientificName, profile },
  })
  // A stored row explains the assessments made with it: other figures need another version.
  if (!created && canonicalize(row.profile) !== canonicalize(JSON.parse(JSON.stringify(profile)))) {
    throw new Error(
      `The shipped row “${key}” differs from the stored one but still calls itself version ${version}. Raise its version in lib/species.`,
    )
  }
  return created
}
