import type { Finding } from '../../result'
import type { Subject } from '../../subject'
import { minutes, scheduleWords } from '../../wording'
import { lastBefore, longestWithout } from '../intervals'
import type { LawView } from '../pack'
import { lawFinding } from './finding'
import { FOUR_MONTHS_DAYS } from './sources'

const HOUR_MIN = 60
const WATER_EVERY_MIN = 12 * HOUR_MIN
const FOOD_EVERY_MIN = 24 * HOUR_MIN
const FOOD_YOUNG_EVERY_MIN = 12 * HOUR_MIN

/** Food every 24 hours, 12 under sixteen weeks, and water every 12. */
export function feedingFindings(view: LawView, subject: Subject): Finding[] {
  const { ageDays } = subject.animal
  const isYoung = ageDays !== undefined && ageDays < FOUR_MONTHS_DAYS
  return [
    interval(view, subject, 'food', isYoung ? FOOD_YOUNG_EVERY_MIN : FOOD_EVERY_MIN),
    interval(view, subject, 'water', WATER_EVERY_MIN),
  ]
}

function interval(view: LawView, subject: Subject, what: 'food' | 'water', everyMin: number): Finding {
  const asked = `${what === 'food' ? 'Food' : 'Water'} at least every ${everyMin / HOUR_MIN} hours, counted from the last before delivery.`
  const shared = { side: 'high' as const, limit: everyMin, unit: 'min', asked }
  const lastMin = lastBefore(subject, what)
  if (lastMin === undefined)
    return lawFinding(view, what, subject, {
      ...shared,
      status: 'unknown',
      note: `When ${what} was last offered before departure is not stated.`,
    })
  const { gapMin, fromMin, scheduleId } = longestWithout(view, subject, what, lastMin)
  const breached = gapMin > everyMin
  return lawFinding(view, what, subject, {
    ...shared,
    status: breached ? 'breach' : 'met',
    value: gapMin,
    scheduleId,
    ...(breached && { minute: fromMin + everyMin }),
    note: `Longest without ${what}: ${minutes(Math.ceil(gapMin))}, ${scheduleWords(scheduleId, view.scenario.legs)}.`,
  })
}
