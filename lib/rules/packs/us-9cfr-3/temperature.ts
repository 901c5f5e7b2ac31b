import type { Finding } from '../../result'
import { type AirPoint, type Span, TOLERANCE_MIN, longestBy, spansBeyond, totalBy } from '../../clock'
import { outsideAir } from '../../outside-air'
import { type Subject, isAboard } from '../../subject'
import { fahrenheit, minutes, scheduleWords } from '../../wording'
import type { Side } from '../../base-runs'
import type { LawView } from '../pack'
import { acclimatedFloorF } from './acclimation'
import { lawFinding } from './finding'
import { type LegalPlace, legalPlace } from './places'
import type { SourceKey } from './sources'

interface TemperatureRule {
  source: SourceKey
  place: LegalPlace
  /** Breach when the air is beyond a limit for longer than this. */
  clockMin: number
  /** The acclimation certificate lets the low limit drop here. */
  acclimates: boolean
}

/** 45 and 85 °F with the °C the text prints beside them: the two do not agree in the last digit. */
const LOW = { f: 45, printedC: 7.2 }
const HIGH = { f: 85, printedC: 29.5 }

const RULES: readonly TemperatureRule[] = [
  { source: 'surface', place: 'surface', clockMin: 240, acclimates: false },
  { source: 'holding', place: 'holding', clockMin: 240, acclimates: true },
  { source: 'moving', place: 'moving', clockMin: 45, acclimates: true },
]

/** Air outside the crate against 45 and 85 °F, by the clock of each place, on every schedule. */
export function temperatureFindings(
  view: LawView,
  subject: Subject,
  legIndexes: readonly number[],
): Finding[] {
  return legIndexes.flatMap((index) => {
    const leg = view.scenario.legs[index]
    const rule = RULES.find(({ place }) => leg !== undefined && place === legalPlace(leg))
    if (leg === undefined || rule === undefined) return []
    return (['high', 'low'] as const).map((side) => {
      const readings = view.base.schedules.map(({ id }) =>
        readLeg(view, subject, rule, side, index, id, legIndexes),
      )
      return lawFinding(view, rule.source, subject, { ...worst(readings), legId: leg.id, side })
    })
  })
}

type Reading = Pick<
  Finding,
  'status' | 'scheduleId' | 'limit' | 'value' | 'unit' | 'minute' | 'asked' | 'note'
>

const STATUS_ORDER: readonly Finding['status'][] = ['breach', 'judgement', 'met']

function worst(readings: readonly Reading[]): Reading {
  const [first, ...others] = readings
  if (first === undefined) throw new RangeError('A journey has at least one schedule.')
  return others.reduce(
    (held, one) => (STATUS_ORDER.indexOf(one.status) < STATUS_ORDER.indexOf(held.status) ? one : held),
    first,
  )
}

function readLeg(
  view: LawView,
  subject: Subject,
  rule: TemperatureRule,
  side: Side,
  index: number,
  scheduleId: string,
  legIndexes: readonly number[],
): Reading {
  const starts = view.base.schedules.find(({ id }) => id === scheduleId)?.legStartMin ?? []
  const fromMin = starts[index] ?? 0
  const toMin = starts[index + 1] ?? fromMin
  const points = chain(view, subject, rule.place, index, legIndexes).flatMap((one) =>
    legPoints(view, one, scheduleId, side),
  )
  const own = points.filter(({ minute }) => minute >= fromMin && minute <= toMin).map(({ tempC }) => tempC)
  const valueF = inFahrenheit(side === 'high' ? Math.max(...own) : Math.min(...own))
  const limit = side === 'high' ? { ...HIGH, acclimated: false } : lowLimit(view, subject, rule)
  const limitC = inCelsius(limit.f)
  const strictC = side === 'high' ? Math.max(limitC, limit.printedC) : Math.min(limitC, limit.printedC)
  const looseC = side === 'high' ? Math.min(limitC, limit.printedC) : Math.max(limitC, limit.printedC)
  const both = spansBeyond(points, side, strictC)
  const either = spansBeyond(points, side, looseC)
  const asked = `Air outside the crate ${side === 'high' ? 'not above' : 'not below'} ${fahrenheit(limit.f)} for more than ${minutes(rule.clockMin)}${limit.acclimated ? ', as the acclimation certificate states' : ''}.`
  const shared = { scheduleId, limit: limit.f, value: valueF, unit: '°F', asked }
  const heat = `${fahrenheit(valueF)} outside the crate, ${scheduleWords(scheduleId, view.scenario.legs)}`
  const over = longestBy(both, fromMin, toMin)
  if (over > rule.clockMin + TOLERANCE_MIN)
    return {
      ...shared,
      status: 'breach',
      minute: passedAt(both, fromMin, rule.clockMin),
      note: `${heat}: ${minutes(Math.ceil(over))} in a row beyond the limit.`,
    }
  const borderline = longestBy(either, fromMin, toMin)
  if (borderline > rule.clockMin + TOLERANCE_MIN)
    return {
      ...shared,
      status: 'judgement',
      minute: passedAt(either, fromMin, rule.clockMin),
      note: `${heat}: borderline, past the limit in one unit and not in the other. Check with the authority.`,
    }
  const total = totalBy(both, toMin)
  if (over > 0 && total > rule.clockMin + TOLERANCE_MIN)
    return {
      ...shared,
      status: 'judgement',
      note: `${heat}: ${minutes(Math.ceil(total))} beyond the limit in all, though never ${minutes(rule.clockMin)} in a row. Whether the text counts minutes in a row is not settled: check with the authority.`,
    }
  return {
    ...shared,
    status: 'met',
    note:
      over > 0
        ? `${heat}: ${minutes(Math.ceil(over))} in a row beyond the limit, which is allowed.`
        : `${heat}.`,
  }
}

/** Legs in one piece on which the animal stays in the same legal place: the clock runs on through all of them. */
function chain(
  { scenario }: LawView,
  subject: Subject,
  place: LegalPlace,
  index: number,
  legIndexes: readonly number[],
): number[] {
  const belongs = (one: number) => {
    const leg = scenario.legs[one]
    return (
      leg !== undefined && legIndexes.includes(one) && isAboard(subject, one) && legalPlace(leg) === place
    )
  }
  let first = index
  while (belongs(first - 1)) first -= 1
  let last = index
  while (belongs(last + 1)) last += 1
  return Array.from({ length: last - first + 1 }, (_, offset) => first + offset)
}

function legPoints({ scenario, base }: LawView, index: number, scheduleId: string, side: Side): AirPoint[] {
  const leg = scenario.legs[index]
  return leg === undefined ? [] : outsideAir(base, leg, index, scheduleId, side)
}

/** A certificate's minimum replaces 45 °F where the section lets it; its °C is computed, the paper states °F or °C itself. */
function lowLimit(view: LawView, subject: Subject, { acclimates }: TemperatureRule) {
  const floorF = acclimates ? acclimatedFloorF(view, subject) : undefined
  if (floorF === undefined || floorF >= LOW.f) return { ...LOW, acclimated: false }
  return { f: floorF, printedC: inCelsius(floorF), acclimated: true }
}

function passedAt(spans: readonly Span[], sinceMin: number, clockMin: number): number | undefined {
  const span = spans.find(({ fromMin, toMin }) => toMin > sinceMin && toMin - fromMin > clockMin)
  return span === undefined ? undefined : Math.max(sinceMin, span.fromMin + clockMin)
}

export function inFahrenheit(tempC: number): number {
  return tempC * 1.8 + 32
}

export function inCelsius(tempF: number): number {
  return (tempF - 32) / 1.8
}
