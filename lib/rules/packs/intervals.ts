import type { Subject } from '../subject'
import type { LawView } from './pack'

export interface Gap {
  scheduleId: string
  /** Minutes without, and the minute of the journey since which. */
  gapMin: number
  fromMin: number
}

/** Last food, or water, before departure as a minute (negative), and what is offered on the way; undefined: nobody stated it. */
export function lastBefore({ animal }: Subject, what: 'food' | 'water'): number | undefined {
  if (what === 'food') return animal.hoursSinceFed === undefined ? undefined : -animal.hoursSinceFed * 60
  const before = animal.waterOfferedMin?.filter((minute) => minute <= 0) ?? []
  return before.length === 0 ? undefined : Math.max(...before)
}

/**
 * Longest time without, from the last before delivery to the arrival, on the slowest schedule. An animal taken out of its
 * crate at a rest is fed and watered there.
 */
export function longestWithout(
  view: LawView,
  subject: Subject,
  what: 'food' | 'water',
  lastMin: number,
): Gap {
  const offered = (what === 'food' ? subject.animal.foodOfferedMin : subject.animal.waterOfferedMin) ?? []
  const gaps = view.base.schedules.map(({ id, legStartMin }) => ({
    scheduleId: id,
    ...longestGap(view, subject, legStartMin, lastMin, offered),
  }))
  return gaps.reduce((held, gap) => (gap.gapMin > held.gapMin ? gap : held), {
    scheduleId: 'on-time',
    gapMin: 0,
    fromMin: lastMin,
  })
}

function longestGap(
  view: LawView,
  { firstLeg, lastLeg }: Subject,
  starts: readonly number[],
  lastMin: number,
  offered: readonly number[],
) {
  const arrivalMin = starts[lastLeg + 1] ?? 0
  const rests = view.scenario.legs.flatMap((leg, index) =>
    leg.outOfCrate && index >= firstLeg && index <= lastLeg
      ? [starts[index] ?? 0, starts[index + 1] ?? 0]
      : [],
  )
  const moments = [
    lastMin,
    ...[...offered, ...rests].filter((minute) => minute > lastMin && minute < arrivalMin),
    arrivalMin,
  ].sort((a, b) => a - b)
  return moments.reduce(
    (held, minute, index) => {
      const fromMin = moments[index - 1] ?? minute
      return minute - fromMin > held.gapMin ? { gapMin: minute - fromMin, fromMin } : held
    },
    { gapMin: 0, fromMin: lastMin },
  )
}
