import { sha256 } from '@noble/hashes/sha2.js'
import { bytesToHex, utf8ToBytes } from '@noble/hashes/utils.js'
import { assess } from '@/lib/rules/assess'
import { SHIPPED_ROWS } from '@/lib/rules/shipped-rows'
import { prepare } from '@/lib/rules/subject'
import { type Scenario, VARIANTS, gather, schedulesOf, simulate } from '@/lib/thermal'

/** What is compared: every track of every variant on the first and last schedule, and whole assessments. */
export function hashTracks(scenario: Scenario): string {
  const prepared = prepare(scenario, SHIPPED_ROWS)
  const ids = schedulesOf(prepared.scenario).map(({ id }) => id)
  const scheduleIds = [...new Set([ids[0] ?? 'on-time', ids.at(-1) ?? 'on-time'])]
  const runs = scheduleIds.flatMap((scheduleId) =>
    VARIANTS.map((variant) =>
      simulate(prepared.scenario, {
        variant,
        scheduleId,
        profiles: prepared.profiles,
        limits: prepared.limits,
      }),
    ),
  )
  return hash({ ...gather(runs), extremes: runs.map(({ extremes }) => extremes) })
}

export function hashAssessment(scenario: Scenario): string {
  return hash(assess(scenario, SHIPPED_ROWS))
}

function hash(document: unknown): string {
  return bytesToHex(sha256(utf8ToBytes(JSON.stringify(document))))
}
