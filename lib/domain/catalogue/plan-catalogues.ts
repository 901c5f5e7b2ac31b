import 'server-only'
import type { CrateModelPlan } from '@/lib/planning/new-plan'
import type { ProfileInForce } from '@/lib/planning/reasons'
import type { Actor } from '@/lib/policies/actor'
import type { PlanPlace } from '@/lib/schemas/plan'
import { models } from '@/models'
import { authorize } from '../authorize'
import { allPlaces, profilesInForce } from './knowledge'

export interface PlanCatalogues {
  places: PlanPlace[]
  species: ProfileInForce[]
  shippers: { id: number; name: string }[]
  drivers: { id: number; name: string }[]
  crateModels: { id: number; name: string; plan: CrateModelPlan }[]
}

/** Everything a plan is chosen from: places, species rows in force, shippers, drivers and crate models in use. */
export async function planCatalogues(actor: Actor): Promise<PlanCatalogues> {
  authorize(actor, 'shipper.list')
  authorize(actor, 'place.list')
  const [places, species, shippers, drivers, crateModels] = await Promise.all([
    allPlaces(),
    profilesInForce(),
    models.Shipper.findAll({ attributes: ['id', 'name'], order: ['name'] }),
    models.User.findAll({
      where: { role: 'driver', disabledAt: null },
      attributes: ['id', 'name'],
      order: ['name', 'id'],
    }),
    models.CrateModel.findAll({ where: { active: true }, order: ['name'] }),
  ])
  return {
    places,
    species,
    shippers: shippers.map(({ id, name }) => ({ id, name })),
    drivers: drivers.map(({ id, name }) => ({ id, name })),
    crateModels: crateModels.map(({ id, name, spec }) => ({ id, name, plan: spec })),
  }
}
