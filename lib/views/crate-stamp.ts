import { worstOf } from '@/lib/rules/verdicts'
import type { Verdict } from '@/lib/rules/result'
import type { AnimalView, Stamp } from './sheet'

/** The stamp of one crate: the worst of the animals in it, with the most conditions any of them holds on. */
export function crateStamp(animals: readonly Pick<AnimalView, 'stamp'>[]): Stamp {
  const stamps = animals.map(({ stamp }) => stamp)
  const verdicts = stamps.flatMap(({ verdict }): Verdict[] => (verdict === 'none' ? [] : [verdict]))
  const whole = stamps.length > 0 && verdicts.length === stamps.length
  return {
    verdict: whole ? worstOf(verdicts) : 'none',
    conditions: Math.max(0, ...stamps.map(({ conditions }) => conditions)),
    outOfDate: stamps.some(({ outOfDate }) => outOfDate),
  }
}
