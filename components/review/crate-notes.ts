import type { PlanCrate } from '@/lib/schemas/plan'

const MATERIAL: Record<PlanCrate['wallMaterial'], string> = {
  plywood: 'Plywood',
  plastic: 'Plastic',
  fibreboard: 'Fibreboard',
  'metal-mesh': 'Metal mesh',
  'insulated-foam': 'Insulated foam',
}

/** What the drawing of a crate can't show. */
export function crateNotes(crate: PlanCrate): string[] {
  const { material, depthMm, wetPct } = crate.bedding
  return [
    `${MATERIAL[crate.wallMaterial]} ${crate.wallThicknessMm} mm, rim ${crate.rimMm} mm`,
    material === 'none'
      ? 'No bedding'
      : `${material.replaceAll('-', ' ')} ${depthMm} mm${wetPct > 0 ? `, ${wetPct} % wet` : ''}`.replace(
          /^./,
          (first) => first.toUpperCase(),
        ),
    crate.waterContainerL === null ? 'Water container not said' : `Water ${crate.waterContainerL} L`,
    `Floor on ${crate.floorOnto}`,
  ]
}
