import { catalogueValues } from '@/lib/species'
import { buildLeg } from '@/lib/thermal/build-leg'
import { load } from '@/lib/thermal/exchange'
import { journeyOf } from '@/lib/thermal/journey'
import { legModelOf, type LegModel } from '@/lib/thermal/leg-model'
import { startsOf } from '@/lib/thermal/schedule'
import { storeOf } from '@/lib/thermal/store'
import type { Scenario, SimulateOptions } from '@/lib/thermal'

/** The first leg of a scenario taken out of `simulate`: its equations and its first state, for another solver to work on. */
export function firstLeg(
  scenario: Scenario,
  options: Partial<SimulateOptions> = {},
): { model: LegModel; y: Float64Array; sums: Float64Array } {
  const journey = journeyOf(scenario, { variant: 'typical', profiles: catalogueValues, ...options })
  const store = storeOf(undefined)
  const toS = (startsOf(scenario.legs)[1] ?? 0) * 60
  const model = legModelOf(buildLeg(journey, store, 0, 0, toS, undefined))
  const y = new Float64Array(model.layout.size)
  const sums = new Float64Array(model.layout.sums)
  load(model.layout, store, y, sums)
  model.setSwitches(0, y)
  return { model, y, sums }
}
