import { describe, expect, it } from 'vitest'
import {
  flightAround,
  joinedNeighbour,
  stillOffered,
  withFlightAfter,
  withLegAfter,
  withoutLeg,
} from '@/components/plan/leg-edits'
import { rulerLayout } from '@/components/plan/ruler-layout'
import { newLeg } from '@/lib/planning/new-plan'
import type { PlanLeg } from '@/lib/schemas/plan'

function legs(): PlanLeg[] {
  const first = { ...newLeg({ legs: [] }, 'road'), toPlaceId: 2, endLocal: '2026-06-09T12:05' }
  return [first, newLeg({ legs: [first] }, 'shed')]
}

describe('changing the row of legs', () => {
  it('gives a leg in the middle an id nobody has and joins it to the one before', () => {
    const after = withLegAfter(legs(), 0, 'ramp')
    expect(after.map(({ kind }) => kind)).toEqual(['road', 'ramp', 'shed'])
    expect(new Set(after.map(({ id }) => id)).size).toBe(3)
    expect(after[1]).toMatchObject({ fromPlaceId: 2, startLocal: '2026-06-09T12:05' })
  })

  it('adds a flight as three legs and takes it out whole, whichever of them is in hand', () => {
    const flown = withFlightAfter(legs(), 0)
    expect(flown.map(({ flightPhase }) => flightPhase)).toEqual([
      null,
      'doors-shut-departure',
      'airborne',
      'doors-shut-arrival',
      null,
    ])
    for (const index of [1, 2, 3]) {
      expect(flightAround(flown, index)).toEqual([1, 3])
      expect(withoutLeg(flown, index).map(({ kind }) => kind)).toEqual(['road', 'shed'])
    }
  })

  it('tells two flights in a row apart', () => {
    const twice = withFlightAfter(withFlightAfter([], -1), 2)
    expect([flightAround(twice, 0), flightAround(twice, 4)]).toEqual([
      [0, 2],
      [3, 5],
    ])
  })

  it('moves a neighbour that met this end, and leaves one that did not', () => {
    const [road, shed] = legs() as [PlanLeg, PlanLeg]
    const later = { ...road, endLocal: '2026-06-09T12:30' }
    expect(joinedNeighbour([later, shed], 0, 'end', road)?.change).toMatchObject({
      startLocal: '2026-06-09T12:30',
    })
    const apart = { ...shed, startLocal: '2026-06-09T13:00' }
    expect(joinedNeighbour([later, apart], 0, 'end', road)).toBeNull()
  })

  it('marks offered figures until somebody types another', () => {
    const [road] = legs() as [PlanLeg]
    expect(stillOffered(road)).toContain('volume')
    if (road.surroundings.type !== 'enclosed') throw new Error('A road leg is offered a van.')
    const measured = { ...road, surroundings: { ...road.surroundings, volumeM3: 9 } }
    expect(stillOffered(measured)).not.toContain('volume')
  })
})

describe('the ruler', () => {
  const unknown = { kind: 'empty' } as const
  const timed = (startMs: number | null, endMs: number | null) => ({
    legId: '',
    from: null,
    to: null,
    start: unknown,
    end: unknown,
    startMs,
    endMs,
  })

  it('keeps true time, shows what belongs to no leg and what belongs to two', () => {
    const hour = 3_600_000
    const layout = rulerLayout(
      [timed(0, 2 * hour), timed(3 * hour, 5 * hour), timed(4 * hour, 10 * hour)],
      1_000,
    )
    expect(layout?.legs.map(({ fromPx, toPx }) => [fromPx, toPx])).toEqual([
      [0, 200],
      [300, 500],
      [400, 1_000],
    ])
    expect(layout?.gaps.map(({ minutes, overlap }) => [minutes, overlap])).toEqual([
      [60, false],
      [60, true],
    ])
  })

  it('says nothing while no leg has both its times, and names those that have not', () => {
    expect(rulerLayout([timed(0, null)], 500)).toBeNull()
    expect(rulerLayout([timed(0, 1), timed(null, 2)], 500)?.untimed).toEqual([1])
  })
})
