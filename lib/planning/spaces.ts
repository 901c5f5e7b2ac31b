import type { PlanLeg } from '@/lib/schemas/plan'

/**
 * Where the air of an enclosed space comes from as its leg begins: its own (what was typed, else the air outside), carried
 * over from the leg before in the same space, or left by a flight whose hold was kept at a set-point.
 */
export type AirStart = 'own' | 'carried' | 'flight'

/** The legs may still be half typed. */
export function airStart(legs: readonly PlanLeg[], index: number): AirStart {
  const leg = legs[index]
  const before = legs[index - 1]
  if (leg?.surroundings.type !== 'enclosed' || before === undefined) return 'own'
  if (leg.kind === 'flight' && before.kind === 'flight' && before.surroundings.type === 'controlled')
    return 'flight'
  return inSpace(before, leg.surroundings.spaceName) ? 'carried' : 'own'
}

/**
 * Index of the first of the neighbouring legs that share this leg's space. A van that comes back two flights later is
 * another van, whatever it is called.
 */
export function firstInSpace(legs: readonly PlanLeg[], index: number): number {
  const air = legs[index]?.surroundings
  let first = index
  while (air?.type === 'enclosed' && inSpace(legs[first - 1], air.spaceName)) first -= 1
  return first
}

/** Spaces without a name are each their own. */
function inSpace(leg: PlanLeg | undefined, spaceName: string): boolean {
  return spaceName !== '' && leg?.surroundings.type === 'enclosed' && leg.surroundings.spaceName === spaceName
}
