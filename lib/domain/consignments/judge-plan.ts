import 'server-only'
import { decidedFacts } from '@/lib/planning/decided-facts'
import { reasonsNotAssessable } from '@/lib/planning/reasons'
import type { PlanningKnowledge, Reason } from '@/lib/planning/reasons'
import { toScenario } from '@/lib/planning/to-scenario'
import { inputHash, planHash } from '@/lib/rules/hash'
import { RULES_VERSION } from '@/lib/rules/version'
import type { Plan } from '@/lib/schemas/plan'
import { parseScenario } from '@/lib/schemas/scenario'
import type { Scenario } from '@/lib/thermal/scenario'
import { ENGINE_VERSION } from '@/lib/thermal/version'

/** A plan seen as the engine will see it, or every reason why it cannot. */
export type JudgedPlan =
  | { assessable: false; reasons: Reason[] }
  | {
      assessable: true
      scenario: Scenario
      planHash: string
      inputHash: string
      profileVersions: Record<string, number>
    }

/** Turns a plan into its scenario and hashes with the places and species rows in force now. */
export function judgePlan(plan: Plan, mark: string, knowledge: PlanningKnowledge): JudgedPlan {
  const reasons = reasonsNotAssessable(plan, knowledge)
  if (reasons.length > 0) return { assessable: false, reasons }
  const parsed = parseScenario(toScenario(plan, { mark, ...knowledge }), {})
  // The engine's own check is the last word: what it refuses cannot be assessed, even if no reason above says so.
  if (!parsed.ok) return { assessable: false, reasons: parsed.issues }
  const { scenario } = parsed
  const profiles = scenario.profiles ?? {}
  const decided = { scenario, facts: decidedFacts(plan) }
  return {
    assessable: true,
    scenario,
    planHash: planHash(decided),
    inputHash: inputHash({
      ...decided,
      profiles,
      engineVersion: ENGINE_VERSION,
      rulesVersion: RULES_VERSION,
    }),
    profileVersions: Object.fromEntries(Object.entries(profiles).map(([key, { version }]) => [key, version])),
  }
}
