import type { PlanCatalogues } from '@/components/plan/plan-context'
import type { PlanEditor } from '@/lib/domain/consignments/load'

/** What the editor chooses from, and nothing else of what was loaded. */
export function cataloguesOf({
  places,
  profiles,
  shippers,
  drivers,
  crateModels,
}: PlanEditor): PlanCatalogues {
  return { places, species: profiles, shippers, drivers, crateModels }
}
