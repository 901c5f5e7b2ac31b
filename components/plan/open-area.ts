import type { PlanCrate, PlanOpening } from '@/lib/schemas/plan'

/** What an opening row leaves free for air, cm²: mesh and what blocks it taken off. Unreadable figures count as nothing. */
export function openCm2(opening: PlanOpening): number {
  const { widthCm, heightCm, howMany, meshOpenPct, blockedPct } = opening
  const area = widthCm * heightCm * howMany * (meshOpenPct / 100) * (1 - blockedPct / 100)
  return Number.isFinite(area) && area > 0 ? area : 0
}

/** The face an opening lies in, cm²; null while the crate has no size. */
export function wallCm2(
  { lengthCm, widthCm, heightCm }: Pick<PlanCrate, 'lengthCm' | 'widthCm' | 'heightCm'>,
  face: PlanOpening['face'],
): number | null {
  if (!isFigure(lengthCm) || !isFigure(widthCm) || !isFigure(heightCm)) return null
  switch (face) {
    case 'front':
    case 'back':
      return widthCm * heightCm
    case 'left':
    case 'right':
      return lengthCm * heightCm
    case 'top':
      return lengthCm * widthCm
  }
}

/** Open share of the four sides, %; null while the crate has no size. */
export function openSidesPct(crate: PlanCrate): number | null {
  const walls = (['front', 'back', 'left', 'right'] as const).map((face) => wallCm2(crate, face))
  const wholeCm2 = walls.reduce<number>((sum, area) => sum + (area ?? 0), 0)
  if (walls.includes(null) || wholeCm2 === 0) return null
  const openedCm2 = crate.openings
    .filter(({ face }) => face !== 'top')
    .reduce((sum, opening) => sum + openCm2(opening), 0)
  return (openedCm2 / wholeCm2) * 100
}

/** While somebody types, a figure may be text that cannot be read yet. */
function isFigure(value: unknown): value is number {
  return typeof value === 'number' && Number.isFinite(value)
}
