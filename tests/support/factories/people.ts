import { newCrate } from '@/lib/planning/new-plan'
import { guineaPig } from '@/lib/species/guinea-pig'
import { models } from '@/models'
import { next, orMake, stored } from './given'
import type { Given } from './given'

export async function shipper(given: Given<'Shipper'> = {}) {
  const n = next()
  return stored(models.Shipper, {
    accountNo: String(1000 + (n % 9000)),
    name: `Shipper ${n}`,
    email: `shipper${n}@example.org`,
    telephone: '+44 141 496 0207',
    address: '3 Mill Brae, Balfron',
    ...given,
  })
}

export async function user(given: Given<'User'> = {}) {
  const n = next()
  const role = given.role ?? 'dispatcher'
  return stored(models.User, {
    email: `${role}${n}@example.org`,
    name: `${role} ${n}`,
    passwordHash: 'none',
    ...given,
    role,
    shipperId: role === 'shipper' ? await orMake(given.shipperId, shipper) : null,
  })
}

export async function place(given: Given<'Place'> = {}) {
  return stored(models.Place, {
    name: `Freight shed ${next()}`,
    kind: 'depot',
    country: 'GB',
    zone: 'Europe/London',
    latitude: 55.86,
    longitude: -4.43,
    ...given,
  })
}

export async function speciesProfile(given: Given<'SpeciesProfile'> = {}) {
  const profile = given.profile ?? { ...guineaPig, key: `guinea-pig-${next()}` }
  const { key, version, commonName, scientificName } = profile
  return stored(models.SpeciesProfile, {
    key,
    version,
    commonName,
    scientificName,
    profile,
    ...given,
    createdBy: await orMake(given.createdBy, () => user({ role: 'admin' })),
  })
}

export async function crateModel(given: Given<'CrateModel'> = {}) {
  const {
    id: _id,
    letter: _letter,
    crateModelId: _model,
    occupants: _inside,
    ...spec
  } = newCrate({ crates: [] }, null)
  return stored(models.CrateModel, { name: `Model ${next()}`, spec, ...given })
}
