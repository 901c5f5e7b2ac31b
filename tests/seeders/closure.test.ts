import { describe, expect, it } from 'vitest'
import { reasonsNotAssessable } from '@/lib/planning/reasons'
import { toScenario } from '@/lib/planning/to-scenario'
import { parseScenario } from '@/lib/schemas/scenario'
import { catalogueValues } from '@/lib/species'
import { simulate, VARIANTS } from '@/lib/thermal'
import { DEMO_CONSIGNMENTS } from '@/seeders/demo/consignments'
import { places, profiles, world } from './support/demo-knowledge'

/*
 * Conservation of energy on every journey of the demo that can be assessed: heat in minus heat stored over heat turned
 * over, recomputed from the reported minute track, at most 0.1 per cent. First law of thermodynamics; no other source.
 */
describe('closure on the demo', () => {
  const assessable = DEMO_CONSIGNMENTS.filter(({ stage }) => stage !== 'draft')
  it.each(assessable.map((demo) => [demo.key, demo] as const))(
    '%s keeps its energy within 0.1 %%',
    (_key, demo) => {
      const plan = demo.plan(world)
      expect(reasonsNotAssessable(plan, { places, profiles })).toEqual([])
      const parsed = parseScenario(toScenario(plan, { mark: '2417', places, profiles }))
      if (!parsed.ok) throw new Error(JSON.stringify(parsed.issues))
      for (const variant of VARIANTS) {
        const run = simulate(parsed.scenario, { variant, profiles: catalogueValues, tracks: true })
        expect(run.closure.energyErrorPct).toBeLessThanOrEqual(0.1)
        expect(run.closure.accumulatorError).toBeLessThan(1e-9)
      }
    },
  )

  it('the draft says what stands in the way', () => {
    const draft = DEMO_CONSIGNMENTS.find(({ stage }) => stage === 'draft')
    expect(draft && reasonsNotAssessable(draft.plan(world), { places, profiles }).length).toBeGreaterThan(3)
  })
})
