import type { PlanCrate } from '@/lib/schemas/plan'

/** The crate as typed, drawn to scale. */
export function CratePicture({ crate }: { crate: PlanCrate; mark: string | null }) {
  return <p className="text-small text-mute">Crate {crate.letter}</p>
}
