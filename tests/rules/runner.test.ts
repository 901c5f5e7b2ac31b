import { describe, expect, it } from 'vitest'
import { createRunner, extremesOf, type Runner, type Steps } from '@/lib/rules/runner'
import { SHIPPED_ROWS } from '@/lib/rules/shipped-rows'
import { prepare } from '@/lib/rules/subject'
import { type Run, simulate } from '@/lib/thermal'
import { nineLegs } from './support/nine-legs'

const prepared = prepare(nineLegs(), SHIPPED_ROWS)
const legIds = prepared.scenario.legs.map(({ id }) => id)
const { profiles, limits } = prepared

/** The run, and how many of them the progress counted on the way. */
function made(steps: Steps<Run>): { run: Run; counted: number } {
  for (let counted = 0; ; counted++) {
    const step = steps.next()
    if (step.done) return { run: step.value, counted }
  }
}

function agrees(runner: Runner, scheduleId: string, airShiftC: number, throughLegId: string) {
  const variant = airShiftC < 0 ? 'cold-prone' : 'heat-prone'
  const alone = simulate(prepared.scenario, {
    scheduleId,
    variant,
    airShiftC,
    tracks: false,
    profiles,
    limits,
  })
  const { run } = made(runner.journey({ scheduleId, variant, airShiftC, throughLegId }))
  for (const { animal } of prepared.subjects)
    expect(extremesOf(run, animal.id, throughLegId)).toEqual(extremesOf(alone, animal.id, throughLegId))
}

describe('a run that shares its way with others', () => {
  it('says of the leg asked for what a run of its own says', { timeout: 120_000 }, () => {
    const runner = createRunner(prepared)
    // Late legs before early ones, and further along a schedule that was begun already.
    const asked = [8, 2, 5, 0, 7].map((index) => legIds[index] ?? '')
    for (const legId of asked) agrees(runner, `worst:${legId}`, 4.5, legId)
    for (const legId of [...asked].reverse()) agrees(runner, 'worst:ramp-out', -6, legId)
    agrees(runner, 'on-time', 4.5, legIds[3] ?? '')
    agrees(runner, 'typical', 4.5, legIds[8] ?? '')
  })

  it('is counted once, however often it is taken further, and the way it shares not at all', () => {
    const runner = createRunner(prepared)
    const asked = { scheduleId: 'worst:air', variant: 'heat-prone', airShiftC: 2 } as const
    expect(made(runner.journey({ ...asked, throughLegId: 'air' })).counted).toBe(1)
    expect(made(runner.journey({ ...asked, throughLegId: 'air' })).counted).toBe(0)
    expect(made(runner.journey(asked)).counted).toBe(0)
    expect(runner.runs()).toBe(1)
  })
})
