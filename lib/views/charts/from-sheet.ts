import { bodyMargin, clock, minutesToSpare, zoneName } from '../format'
import type { TempUnit } from '../preferences'
import type { AnimalChart, BodyLimits, LegCell, LegView, SheetCharts, SheetView } from '../sheet'
import { excursions } from './channel'
import { zoneAt } from './ruler'
import { extreme, stretchOf } from './series'
import type { Callout, ChartLeg, CorridorInput, HeatTrack } from './types'

/** The corridor of one animal of a sheet; null where the sheet was loaded without its tracks. */
export function corridorFromSheet(
  view: Pick<SheetView, 'animals' | 'legs' | 'charts'>,
  animalId: string,
  unit: TempUnit,
  dark: CorridorInput['dark'] = [],
): CorridorInput | null {
  const { charts } = view
  const chart = charts?.animals.find((each) => each.animalId === animalId)
  const column = view.animals.findIndex((each) => each.animalId === animalId)
  if (!charts || !chart) return null
  const legs = charts.legs.map((leg) => {
    const row = view.legs.find((each) => each.legId === leg.legId)
    return chartLeg(leg, row ? shortName(row) : null, row?.cells[column] ?? null)
  })
  const crate = crateChart(charts, chart)
  return {
    animalName: chart.name,
    departureMs: charts.departureMs,
    endMin: charts.endMin,
    zones: charts.zones,
    legs,
    limits: legs.map(() => chart.limits),
    typical: chart.typical,
    deciding: chart.deciding && { ...chart.deciding, words: `${chart.deciding.variant}, decides` },
    spread: null,
    crateAir: crate ? { minutes: crate.minutes, tempC: crate.airTempC } : null,
    outsideAir: null,
    extreme: chart.deciding?.variant === 'cold-prone' ? 'coldest' : 'hottest',
    callouts: callouts(charts, chart, legs, unit),
    dark,
    unit,
  }
}

/** The heat balance of one animal of a sheet, with the legs it runs over. */
export function ledgerFromSheet(
  view: Pick<SheetView, 'charts'>,
  animalId: string,
): { heat: HeatTrack; legs: ChartLeg[]; endMin: number } | null {
  const heat = view.charts?.animals.find((each) => each.animalId === animalId)?.heat
  return view.charts && heat
    ? { heat, legs: view.charts.legs.map((leg) => chartLeg(leg, null, null)), endMin: view.charts.endMin }
    : null
}

const KIND_NAMES: Record<LegView['kind'], string> = {
  road: 'Road',
  shed: 'Shed',
  ramp: 'Ramp',
  flight: 'Flight',
  sea: 'Sea',
  rail: 'Rail',
  border: 'Border post',
  rest: 'Rest',
}

const PHASE_NAMES = {
  'doors-shut-departure': 'Shut, stand',
  airborne: 'Airborne',
  'doors-shut-arrival': 'Shut, arrival',
} as const

/** A leg's name as it fits a head of 113 px. */
export function shortName({ kind, flightPhase }: Pick<LegView, 'kind' | 'flightPhase'>): string {
  return flightPhase ? PHASE_NAMES[flightPhase] : KIND_NAMES[kind]
}

function chartLeg(leg: SheetCharts['legs'][number], name: string | null, cell: LegCell | null): ChartLeg {
  return {
    legId: leg.legId,
    ordinal: leg.ordinal,
    name: name ?? leg.title.split(',')[0] ?? leg.title,
    pattern: leg.pattern,
    startMin: leg.startMin,
    endMin: leg.endMin,
    head: cell && {
      verdict: cell.verdict,
      minutes: cell.margin.minutes,
      outsideAirC: cell.margin.outsideAirC,
      bodyC: cell.margin.bodyC,
      limitWords: cell.limitWords,
      decidedWords: cell.decidedWords,
    },
  }
}

function crateChart(charts: SheetCharts, chart: AnimalChart): SheetCharts['crates'][number] | undefined {
  const own = charts.crates.filter((crate) => crate.crateId === chart.crateId)
  return own.find((crate) => crate.variant === chart.deciding?.variant) ?? own[0]
}

/**
 * Labels for where the deciding track first passes the alarm and first passes the critical limit; where it passes none, for
 * the leg with least room.
 */
function callouts(
  charts: SheetCharts,
  chart: AnimalChart,
  legs: readonly ChartLeg[],
  unit: TempUnit,
): Callout[] {
  const body = legs.filter((leg) => leg.head?.minutes != null && /alarm|critical/.test(leg.head.limitWords))
  const passing = body
    .flatMap((leg) => callout(charts, chart, leg, unit))
    .filter((each) => each.passes !== null)
  const first = ['critical', 'alarm'].flatMap((name) => passing.find((each) => each.passes === name) ?? [])
  if (first.length > 0) return first.map((each) => each.label)
  const bad = body.filter((leg) => leg.head?.verdict === 'no-go' || leg.head?.verdict === 'conditional')
  const [narrowest] = bad.sort((a, b) => (a.head?.minutes ?? 0) - (b.head?.minutes ?? 0))
  return narrowest ? callout(charts, chart, narrowest, unit).map((each) => each.label) : []
}

function callout(
  charts: SheetCharts,
  chart: AnimalChart,
  leg: ChartLeg,
  unit: TempUnit,
): { passes: string | null; label: Callout }[] {
  const { deciding, limits } = chart
  if (!deciding || !leg.head || leg.head.minutes === null) return []
  const samples = stretchOf(deciding.minutes, deciding.bodyC, leg.startMin, leg.endMin)
  const sign = leg.head.limitWords.includes('low') ? -1 : 1
  const worst = extreme(samples, sign)
  if (!worst) return []
  const side = sign === 1 ? 'high' : 'low'
  const past = passed(samples, limits, sign)
  const at = past ?? worst
  const zone = zoneAt(charts.zones, at.minute)
  const ms = charts.departureMs + at.minute * 60_000
  const time = `${clock(ms, zone)} ${zoneName(ms, zone)}`
  const body = leg.head.bodyC === null ? '' : `, body ${bodyMargin(leg.head.bodyC, unit)}`
  const label: Callout = {
    verdict: leg.head.verdict === 'no-go' ? 'no-go' : 'conditional',
    minute: at.minute,
    tempC: at.value,
    figure: minutesToSpare(leg.head.minutes),
    title: past
      ? `Leg ${leg.ordinal}: passes ${past.name} ${side}`
      : `Leg ${leg.ordinal}: ${leg.head.limitWords} is nearest`,
    text: past ? `from ${time}` : `at ${time}${body}`,
  }
  return [{ passes: past?.name ?? null, label }]
}

/** Where the deciding track first passes the outer limit it passes at all. */
function passed(
  samples: readonly { minute: number; value: number }[],
  limits: BodyLimits,
  sign: 1 | -1,
): { minute: number; value: number; name: string } | null {
  const lines = [
    { name: 'critical', limitC: sign === 1 ? limits.criticalHighC : limits.criticalLowC },
    { name: 'alarm', limitC: sign === 1 ? limits.alarmHighC : limits.alarmLowC },
  ]
  for (const { name, limitC } of lines) {
    const first = excursions(samples, limitC, sign)[0]?.[0]
    if (first) return { ...first, name }
  }
  return null
}
