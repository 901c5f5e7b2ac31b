import type { Verdict } from '@/lib/rules/result'
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
    },
  }
}

function crateChart(charts: SheetCharts, chart: AnimalChart): SheetCharts['crates'][number] | undefined {
  const own = charts.crates.filter((crate) => crate.crateId === chart.crateId)
  return own.find((crate) => crate.variant === chart.deciding?.variant) ?? own[0]
}

/** A label for each leg that is NO-GO on a body limit, worst first, else for the narrowest GO WITH CONDITIONS; three at most. */
function callouts(
  charts: SheetCharts,
  chart: AnimalChart,
  legs: readonly ChartLeg[],
  unit: TempUnit,
): Callout[] {
  const bad = byRoom(legs, 'no-go')
  const chosen = bad.length > 0 ? bad.slice(0, 3) : byRoom(legs, 'conditional').slice(0, 1)
  return chosen.flatMap((leg) => callout(charts, chart, leg, unit) ?? [])
}

function byRoom(legs: readonly ChartLeg[], verdict: Verdict): ChartLeg[] {
  return legs
    .filter((leg) => leg.head?.verdict === verdict && leg.head.minutes !== null)
    .sort((a, b) => (a.head?.minutes ?? 0) - (b.head?.minutes ?? 0))
}

function callout(charts: SheetCharts, chart: AnimalChart, leg: ChartLeg, unit: TempUnit): Callout | null {
  const { deciding, limits } = chart
  if (!deciding || !leg.head || leg.head.minutes === null) return null
  // Effort, law and carrier's rules decide legs too, but have no place on a scale of body temperature.
  if (!/alarm|critical/.test(leg.head.limitWords)) return null
  const samples = stretchOf(deciding.minutes, deciding.bodyC, leg.startMin, leg.endMin)
  const sign = leg.head.limitWords.includes('low') ? -1 : 1
  const worst = extreme(samples, sign)
  if (!worst) return null
  const side = sign === 1 ? 'high' : 'low'
  const past = passed(samples, limits, sign)
  const at = past ?? worst
  const zone = zoneAt(charts.zones, at.minute)
  const ms = charts.departureMs + at.minute * 60_000
  return {
    verdict: leg.head.verdict === 'no-go' ? 'no-go' : 'conditional',
    minute: at.minute,
    tempC: at.value,
    figure: minutesToSpare(leg.head.minutes),
    title: past
      ? `Leg ${leg.ordinal}: passes ${past.name} ${side}`
      : `Leg ${leg.ordinal}: ${leg.head.limitWords} is nearest`,
    text: past
      ? `from ${clock(ms, zone)} ${zoneName(ms, zone)}`
      : `at ${clock(ms, zone)} ${zoneName(ms, zone)}${leg.head.bodyC === null ? '' : `, body ${bodyMargin(leg.head.bodyC, unit)}`}`,
  }
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
