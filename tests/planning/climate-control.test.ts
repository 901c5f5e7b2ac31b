import { describe, expect, it } from 'vitest'
import { checklistItems } from '@/lib/planning/checklist'
import { offeredSurroundings } from '@/lib/planning/offers'
import { reasonsNotAssessable } from '@/lib/planning/reasons'
import { toScenario } from '@/lib/planning/to-scenario'
import type { Plan, PlanSurroundings } from '@/lib/schemas/plan'
import { FLIGHT_PHASES, LEG_KINDS } from '@/lib/schemas/plan'
import { journeyOf } from '@/lib/views/sheet-view/journey'
import { PLACES, PROFILES, glasgowToMuscat } from './plan'

type Machine = NonNullable<Extract<PlanSurroundings, { type: 'enclosed' }>['conditioning']>

/** The journey to Muscat with a machine in the van of its first leg: 17 °C outside, set-point 18 °C. */
function withMachine(coolingW: number | null, heatingW: number | null): Plan {
  const plan = glasgowToMuscat()
  const leg = plan.legs[0]
  if (leg?.surroundings.type !== 'enclosed') throw new Error('The first leg is no van.')
  leg.surroundings.conditioning = { setPointC: 18, coolingW, heatingW } satisfies Machine
  return plan
}
const reasonsOf = (plan: Plan) => reasonsNotAssessable(plan, { places: PLACES, profiles: PROFILES })
const scenarioOf = (plan: Plan) => toScenario(plan, { mark: '2417', places: PLACES, profiles: PROFILES })
const airOf = (plan: Plan) => journeyOf(plan, PLACES, 'Europe/London')[0]?.air
const itemsOf = (plan: Plan) => {
  const [leg] = plan.legs
  if (leg === undefined) throw new Error('The plan has no leg.')
  return checklistItems(plan, leg, 7, []).map(({ text }) => text)
}

describe('a set-point nobody gave the watts for', () => {
  it.each([
    [null, null, 'coolingW'],
    [0, 0, 'coolingW'],
    [0, null, 'heatingW'],
    [null, 0, 'coolingW'],
  ])('holds the assessment at %s W of cooling and %s W of heating', (coolingW, heatingW, field) => {
    const plan = withMachine(coolingW, heatingW)
    expect(reasonsOf(plan)).toEqual([
      {
        path: `legs.0.surroundings.conditioning.${field}`,
        message:
          'Leg 1 (road) has a set-point but no cooling or heating capacity: put its watts, or untick the set-point.',
      },
    ])
    expect(() => scenarioOf(plan)).toThrow(RangeError)
  })

  it.each([
    [3_000, null, 'heatingW', /heating is not given.*0 where it cannot heat/],
    [null, 3_000, 'coolingW', /cooling is not given.*0 where it cannot cool/],
  ])('asks for the other side too: %s and %s', (coolingW, heatingW, field, message) => {
    const [reason, ...more] = reasonsOf(withMachine(coolingW, heatingW))
    expect(more).toEqual([])
    expect(reason?.path).toBe(`legs.0.surroundings.conditioning.${field}`)
    expect(reason?.message).toMatch(message)
  })

  it('is never said to be held in a draft', () => {
    const plan = withMachine(null, null)
    expect(airOf(plan)?.words).toBe('outside 17\u00a0°C')
    expect(itemsOf(plan).filter((text) => text.includes('set-point'))).toEqual([])
  })

  it('no leg of any kind is offered a set-point, so none is assumed', () => {
    const offered = LEG_KINDS.flatMap((kind) =>
      [null, ...FLIGHT_PHASES].map((phase) => offeredSurroundings(kind, phase)),
    )
    expect(
      offered.flatMap((air) => (air.type === 'enclosed' ? [air.conditioning] : [])).length,
    ).toBeGreaterThan(0)
    for (const air of offered) if (air.type === 'enclosed') expect(air.conditioning).toBeNull()
  })
})

describe('a machine says what it can do and no more', () => {
  it.each([
    [3_000, 2_000, 'van set to 18\u00a0°C', 18, 18, 'Climate control runs, set-point 18 °C.'],
    // Cooling alone leaves the van at the 17 °C that it is outside.
    [
      3_000,
      0,
      'van cooled to at most 18\u00a0°C',
      17,
      18,
      'Cooling runs (there is no heating), set-point 18 °C.',
    ],
    [
      0,
      2_000,
      'van heated to at least 18\u00a0°C',
      18,
      18,
      'Heating runs (there is no cooling), set-point 18 °C.',
    ],
  ])('%d W of cooling, %d W of heating: %s', (coolingW, heatingW, words, minC, maxC, item) => {
    const plan = withMachine(coolingW, heatingW)
    expect(reasonsOf(plan)).toEqual([])
    expect(airOf(plan)).toEqual({ words, minC, maxC })
    expect(itemsOf(plan)).toContain(item)
    expect(scenarioOf(plan).legs[0]?.surroundings).toMatchObject({
      conditioning: { setPointC: 18, coolingW, heatingW },
    })
  })
})
