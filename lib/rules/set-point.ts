import { controlOf } from '@/lib/planning/climate-control'
import type { ClimateControl } from '@/lib/planning/climate-control'
import type { Leg, Scenario } from '@/lib/thermal'
import { type BaseRuns, PRONE, type Side, worstBy } from './base-runs'
import type { Finding } from './result'
import { degrees, minutes, scheduleWords } from './wording'

/** A machine is given this long to bring the air to its set-point. [judgement] */
const PULL_DOWN_MIN = 30
/** Further from its set-point than this, a space isn't held at it: twice what a good thermostat swings. [judgement] */
const HELD_WITHIN_C = 2

/**
 * Where the computed air of a space leaves the set-point its machine has: too few watts, or off for a while. A note,
 * because what it does to the animals stands in their own findings.
 */
export function setPointFindings(scenario: Scenario, base: BaseRuns): Finding[] {
  return scenario.legs.flatMap((leg, index) => {
    const machine = leg.surroundings.type === 'enclosed' ? leg.surroundings.conditioning : undefined
    if (machine === undefined) return []
    return drivenSides(machine).flatMap((side) => {
      const worst = furthest(leg, index, side, machine.setPointC, base)
      return worst === undefined ? [] : [notHeld(scenario, leg, side, machine.setPointC, worst)]
    })
  })
}

function drivenSides(machine: ClimateControl): Side[] {
  switch (controlOf(machine)) {
    case 'both':
      return ['high', 'low']
    case 'cooling':
      return ['high']
    case 'heating':
      return ['low']
    case 'none':
      return []
  }
}

interface Furthest {
  tempC: number
  pastC: number
  scheduleId: string
}

/** The air furthest past the set-point on any schedule whose minutes were kept; undefined while it is held. */
function furthest(
  leg: Leg,
  legIndex: number,
  side: Side,
  setPointC: number,
  base: BaseRuns,
): Furthest | undefined {
  const points = base.planned
    .filter(({ variant }) => variant === PRONE[side])
    .flatMap(({ scheduleId, run }) => {
      const starts = base.schedules.find(({ id }) => id === scheduleId)?.legStartMin ?? []
      const fromMin = (starts[legIndex] ?? 0) + PULL_DOWN_MIN
      const track = run.compartments.find(({ legId }) => legId === leg.id)
      return (track?.minutes ?? []).flatMap((minute, at) => {
        const tempC = track?.airTempC[at]
        if (tempC === undefined || minute < fromMin) return []
        return [{ tempC, pastC: side === 'high' ? tempC - setPointC : setPointC - tempC, scheduleId }]
      })
    })
  const worst = worstBy(points, ({ pastC }) => pastC)
  return worst !== undefined && worst.pastC > HELD_WITHIN_C ? worst : undefined
}

function notHeld(
  { legs }: Scenario,
  leg: Leg,
  side: Side,
  setPointC: number,
  { tempC, scheduleId }: Furthest,
): Finding {
  const way = side === 'high' ? 'up to' : 'down to'
  return {
    rule: 'set-point-not-held',
    basis: 'house',
    status: 'note',
    legId: leg.id,
    side,
    scheduleId,
    limit: setPointC,
    value: tempC,
    unit: '°C',
    asked: `Air of the space ${side === 'high' ? 'cooled' : 'heated'} to ${degrees(setPointC)}.`,
    note: `The machine does not hold its set-point: computed air ${way} ${degrees(tempC)} after the first ${minutes(PULL_DOWN_MIN)} (${scheduleWords(scheduleId, legs)}).`,
    sourceTag: 'judgement',
    overridable: false,
  }
}
