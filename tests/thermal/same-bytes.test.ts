import { describe, expect, it } from 'vitest'
import { resultHash } from './result-hash'
import { readScenario, scenarioNames } from './scenarios'

describe('the same document gives the same bytes', () => {
  it.each(scenarioNames)('%s: again, with crates in another order', { timeout: 120_000 }, (name) => {
    const scenario = readScenario(name)
    const hash = resultHash(scenario)
    const turned = JSON.parse(
      JSON.stringify({ ...scenario, crates: [...scenario.crates].reverse() }),
    ) as typeof scenario
    expect(resultHash(turned)).toBe(hash)
  })
})
