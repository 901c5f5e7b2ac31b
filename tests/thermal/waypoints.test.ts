import { describe, expect, it } from 'vitest'
import { catalogueValues } from '@/lib/species'
import { simulate, stateAt, VARIANTS, type Run, type SimulateOptions } from '@/lib/thermal'
import { readScenario, scenarioNames } from './scenarios'

const SLOW = { timeout: 120_000 }

/** All of a run that anybody reads. */
function told({ waypoints, ...run }: Run): string {
  expect(waypoints.length).toBeGreaterThan(0)
  return JSON.stringify(run)
}

describe('a run that goes on from a waypoint', () => {
  it.each(scenarioNames)('%s: comes to the same bytes as one from the departure', SLOW, (name) => {
    const scenario = readScenario(name)
    for (const variant of VARIANTS) {
      for (const more of [
        { tracks: true, scheduleId: 'typical' },
        { tracks: false, airShiftC: 5, snapshotEveryMin: 10 },
      ]) {
        const options: SimulateOptions = { variant, profiles: catalogueValues, waypoints: true, ...more }
        const whole = simulate(scenario, options)
        for (const from of whole.waypoints.slice(0, -1))
          expect(told(simulate(scenario, { ...options, from }))).toBe(told(whole))
      }
    }
  })

  it('ends behind the leg asked for, and another takes it further', () => {
    const scenario = readScenario('python-by-air')
    const options = { variant: 'typical', profiles: catalogueValues, waypoints: true, tracks: false } as const
    const whole = simulate(scenario, options)
    const [first, second] = scenario.legs
    if (first === undefined || second === undefined) throw new Error('The journey has four legs.')
    const part = simulate(scenario, { ...options, throughLegId: first.id })
    expect(new Set(part.extremes.map(({ legId }) => legId))).toEqual(new Set([first.id]))
    const from = part.waypoints.at(-1)
    if (from === undefined) throw new Error('No waypoint was kept.')
    const further = simulate(scenario, { ...options, from, throughLegId: second.id })
    const upTo = whole.extremes.filter(({ legId }) => legId === first.id || legId === second.id)
    expect(further.extremes).toEqual(upTo)
  })

  it('takes the way of another schedule from the leg that is late there', () => {
    const scenario = readScenario('reference-two-days')
    const late = scenario.legs[4]
    if (late === undefined) throw new Error('The journey has eight legs.')
    const options = { variant: 'heat-prone', profiles: catalogueValues, waypoints: true } as const
    const stem = simulate(scenario, {
      ...options,
      scheduleId: 'typical',
      throughLegId: scenario.legs[3]?.id ?? '',
    })
    const from = stem.waypoints.at(-1)
    if (from === undefined) throw new Error('No waypoint was kept.')
    const scheduleId = `worst:${late.id}`
    expect(told(simulate(scenario, { ...options, scheduleId, from }))).toBe(
      told(simulate(scenario, { ...options, scheduleId })),
    )
  })
})

describe('what a leg leaves behind is its state alone', () => {
  it.each(['cats-on-a-winter-night', 'reference-two-days', 'python-by-air'])(
    '%s: each leg begun from the stored state goes as it went, in the dark after the sun too',
    SLOW,
    (name) => {
      const scenario = readScenario(name)
      const options = { variant: 'cold-prone', profiles: catalogueValues } as const
      const whole = simulate(scenario, options)
      for (const minute of whole.schedule.legStartMin.slice(1, -1)) {
        const begun = simulate(scenario, { ...options, start: stateAt(whole, minute) })
        for (const { id, minutes, coreTempC } of begun.animals) {
          const track = whole.animals.find((animal) => animal.id === id)
          const at = track?.minutes.indexOf(minutes[0] ?? NaN) ?? -1
          expect(track?.coreTempC.slice(at)).toEqual(coreTempC)
        }
      }
    },
  )
})
