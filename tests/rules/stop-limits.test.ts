import { describe, expect, it } from 'vitest'
import { toScenario } from '@/lib/planning/to-scenario'
import { assess } from '@/lib/rules/assess'
import { SHIPPED_ROWS } from '@/lib/rules/shipped-rows'
import { parseScenario } from '@/lib/schemas/scenario'
import { catalogueValues } from '@/lib/species'
import { holdLegAt, lengthenLeg, simulate, withDelays } from '@/lib/thermal'
import { rexHome } from '@/seeders/demo/consignments/rex-home'
import { profiles, places, world } from '../seeders/support/demo-knowledge'

/** A thin-coated cat in a van without heating: past its cold effort, far from its critical limit. */
const parsed = parseScenario(toScenario(rexHome.plan(world), { mark: '2417', places, profiles }))
if (!parsed.ok) throw new Error(JSON.stringify(parsed.issues))
const { scenario } = parsed
const result = assess(scenario, SHIPPED_ROWS)
const [stop] = result.stopLimits

/** Whether the cold-prone cat keeps its critical limit to the worst end and an hour more, held at this air from the start. */
function keepsCritical(airTempC: number): boolean {
  const longer = lengthenLeg(withDelays(scenario, 'worst:leg-1'), 'leg-1', 60)
  const run = simulate(holdLegAt(longer, 'leg-1', { airTempC, relHumidityPct: 75 }), {
    variant: 'cold-prone',
    profiles: catalogueValues,
    tracks: false,
  })
  return run.extremes.every(({ crossedMin }) => crossedMin.criticalLow === undefined)
}

describe('a stop limit that an override moves', () => {
  it('is given only where a vet may override', () => {
    const finding = result.findings.find(({ status }) => status === 'breach')
    expect(finding).toMatchObject({ rule: 'cold-effort', overridable: true })
    expect(stop?.ifOverridden?.aboveC).toBeUndefined()
    expect(stop?.ifOverridden?.belowC).toBeLessThan(stop?.belowC ?? -99)
  })

  it('lies three whole degrees inside the air that just keeps the critical limit', () => {
    const belowC = stop?.ifOverridden?.belowC ?? Number.NaN
    expect(keepsCritical(belowC - 3)).toBe(true)
    expect(keepsCritical(belowC - 4)).toBe(false)
  })

  it('lies below the air the plan was signed for', () => {
    expect(stop?.ifOverridden?.belowC).toBeLessThan(12)
  })
})
