import type { Body } from './body'
import { exp } from './elementary'
import type { Journey } from './journey'
import { ACTIVITY_MULTIPLE } from './metabolism'
import type { Animal } from './scenario'

/** How far above (below) rest an animal is when a leg begins, as a share of resting heat, and how fast that fades. */
export interface Excitement {
  body: Body
  excess: number
  decayS: number
}

const NEVER = 1e12

/**
 * A word set for a leg counts from that leg's start and fades; what an earlier leg left fades on beneath it, and the larger counts.
 * Sleep does not fade. The cold-prone are always at rest.
 */
export function excitementOn(
  journey: Journey,
  animal: Animal | undefined,
  body: Body,
  firstLeg: number,
  legIndex: number,
  fromS: number,
): Excitement {
  const decayS = Math.max(1, (animal?.activityDecayMin ?? 45) * 60)
  if (!animal || journey.variant === 'cold-prone') return { body, excess: 0, decayS }
  let left = 0
  let asleep = false
  for (let index = firstLeg; index <= legIndex; index++) {
    const startS = (journey.startsMin[index] as number) * 60
    const untilS = index === legIndex ? fromS : (journey.startsMin[index + 1] as number) * 60
    const word =
      animal.activityByLeg?.[journey.legs[index]?.id ?? ''] ??
      (index === firstLeg ? animal.activity : undefined)
    asleep = word === undefined ? asleep : word === 'asleep'
    const set = word === undefined ? 0 : Math.max(0, ACTIVITY_MULTIPLE[word] - 1)
    left = Math.max(left, set) * exp(-(untilS - startS) / decayS)
  }
  if (asleep && left < 1e-3) return { body, excess: ACTIVITY_MULTIPLE.asleep - 1, decayS: NEVER }
  return { body, excess: left < 1e-6 ? 0 : left, decayS }
}
