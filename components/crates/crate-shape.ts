import type { PlanCrate } from '@/lib/schemas/plan'
import type { CrateShape } from '@/lib/views/charts/crate'

/** A crate of the plan as it can be drawn; null while a size is missing. */
export function crateShape(
  crate: PlanCrate,
  mark: string,
  animalCm: number | null = null,
): CrateShape | null {
  const { lengthCm, widthCm, heightCm } = crate
  if (lengthCm === null || widthCm === null || heightCm === null) return null
  return {
    mark,
    lengthCm,
    widthCm,
    heightCm,
    openings: crate.openings,
    waterContainerL: crate.waterContainerL,
    animalCm,
  }
}
