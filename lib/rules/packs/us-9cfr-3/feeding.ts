import type { Finding } from '../../result'
import type { Subject } from '../../subject'
import { minutes, scheduleWords } from '../../wording'
import type { LawView } from '../pack'
import { lawFinding } from './finding'
import { FOUR_MONTHS_DAYS } from './sources'

const HOUR_MIN = 60
const WATER_EVERY_MIN = 12 * HOUR_MIN
const FOOD_EVERY_MIN = 24 * HOUR_MIN
const FOOD_YOUNG_EVERY_MIN = 12 * HOUR_MIN

/**
 * Longest time between food, and between water, from the last before delivery to the arrival, on the slowest schedule.
 * Animals taken out at a rest stop are fed and watered there. What nobody stated is unknown.
 */
export function feedingFindings(view: LawView, subject: Subject): Finding[] {
  const { animal } = subject
  const everyMin =
    animal.ageDays !== undefined && animal.ageDays < FOUR_MONTHS_DAYS ? FOOD_YOUNG_EVERY_MIN : FOOD_EVERY_MIN
  const fedMin = animal.hoursSinceFed === undefined ? undefined : -animal.hoursSinceFed * HOUR_MIN
  const watered = animal.waterOfferedMin?.filter((minute) => minute <= 0) ?? []
  const wateredMin = watered.length === 0 ? undefined : Math.max(...watered)
  return [
    interval(view, subject, 'food', everyMin, fedMin, animal.foodOfferedMin ?? []),
    interval(view, subject, 'water', WATER_EVERY_MIN, wateredMin, animal.waterOfferedMin ?? []),
  ]
}

function interval(
  view: LawView,
  subject: Subject,
  what: 'food' | 'water',
  everyMin: number,
  lastMin: number | undefined,
  offered: readonly number[],
): Finding {
  const asked = `${what === 'food' ? 'Food' : 'Water'} at least every ${everyMin / HOUR_MIN} hours, counted from the last before delivery.`
  const shared = { side: 'high' as const, limit: everyMin, unit: 'min', asked }
  if (lastMin === undefined)
    return lawFinding(view, what, subject, {
      ...shared,
      status: 'unknown',
      note: `When ${what} was last offered before departure is not stated.`,
    })
  const gaps = view.base.schedules.map(({ id, legStartMin }) => ({
    id,
    ...longestGap(view, subject, legStartMin, lastMin, offered),
  }))
  const worst = gaps.reduce((held, gap) => (gap.gapMin > held.gapMin ? gap : held), {
    id: 'on-time',
    gapMin: 0,
    fromMin: 0,
  })
  const status = worst.gapMin > everyMin ? 'breach' : 'met'
  return lawFinding(view, what, subject, {
    ...shared,
    status,
    value: worst.gapMin,
    scheduleId: worst.id,
    ...(status === 'breach' && { minute: worst.fromMin + everyMin }),
    note: `Longest without ${what}: ${minutes(Math.ceil(worst.gapMin))}, ${scheduleWords(worst.id)}.`,
  })
}

function longestGap(
  view: LawView,
  { firstLeg, lastLeg }: Subject,
  starts: readonly number[],
  lastMin: number,
  offered: readonly number[],
): { gapMin: number; fromMin: number } {
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
