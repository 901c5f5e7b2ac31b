import type { Verdict } from '@/lib/rules/result'
import type { ChartLeg, CorridorInput, HeatTrack } from '@/lib/views/charts/types'

/*
 * An invented journey, Glasgow to Muscat, nine legs, whose tracks run through points set by hand: it only has to look like
 * a journey. Leg 7 passes the critical limit, leg 6 the alarm limit.
 */

type Row = [
  name: string,
  pattern: ChartLeg['pattern'],
  minutes: number,
  verdict: Verdict,
  spare: number,
  air: number,
  body: number,
  limit: string,
]
const ROWS: Row[] = [
  ['Road', 'van', 165, 'go', 210, 5, 0.9, 'alarm'],
  ['Shed', 'shed', 175, 'go', 240, 7, 0.9, 'alarm'],
  ['Ramp', 'ramp', 35, 'go', 46, 4, 0.6, 'alarm'],
  ['Shut, stand', 'hold', 25, 'conditional', 18, 3, 0.3, 'alarm'],
  ['Airborne', 'hold', 445, 'conditional', 150, 4, 0.4, 'alarm low'],
  ['Shut, arrival', 'hold', 20, 'no-go', -9, -7, -0.4, 'alarm'],
  ['Ramp', 'ramp', 30, 'no-go', -16, -9, -0.5, 'critical'],
  ['Border post', 'customs', 325, 'no-go', -12, -5, -0.5, 'critical'],
  ['Road', 'van', 165, 'go', 80, 4, 0.5, 'alarm'],
]

export const DEPARTURE_MS = Date.UTC(2026, 5, 9, 8, 20)

export const legs: ChartLeg[] = ROWS.map(
  ([name, pattern, minutes, verdict, spare, air, body, limitWords], index) => {
    const startMin = ROWS.slice(0, index).reduce((sum, row) => sum + row[2], 0)
    return {
      legId: `leg-${index + 1}`,
      ordinal: index + 1,
      name,
      pattern,
      startMin,
      endMin: startMin + minutes,
      head: { verdict, minutes: spare, outsideAirC: air, bodyC: body, limitWords, decidedWords: '' },
    }
  },
)

export const endMin = legs.at(-1)?.endMin ?? 0

const limits = { criticalLowC: 36, alarmLowC: 37.2, alarmHighC: 39.4, criticalHighC: 40.2 }

const DECIDING: [number, number][] = [
  [0, 38.4],
  [60, 38.3],
  [165, 38.22],
  [340, 38.2],
  [372, 38.5],
  [400, 38.74],
  [440, 38.64],
  [520, 38.5],
  [700, 38.5],
  [845, 38.62],
  [860, 39.2],
  [880, 39.75],
  [895, 40.45],
  [910, 40.42],
  [960, 39.6],
  [1050, 38.95],
  [1220, 38.7],
  [1300, 38.6],
  [1385, 38.5],
]
const CRATE: [number, number][] = [
  [0, 20],
  [40, 22],
  [165, 23],
  [340, 23],
  [345, 24],
  [375, 25.5],
  [400, 26],
  [430, 22],
  [520, 20],
  [845, 20.5],
  [850, 26],
  [865, 33],
  [895, 35],
  [900, 34],
  [930, 30],
  [1000, 28],
  [1220, 28],
  [1230, 30],
  [1300, 27],
  [1385, 26],
]
const OUTSIDE: [number, number][] = [
  [0, 16],
  [164, 18],
  [165, 19],
  [340, 19],
  [341, 18],
  [845, 18],
  [846, 31],
  [865, 31],
  [866, 33],
  [895, 33],
  [896, 26],
  [1220, 25],
  [1221, 31],
  [1250, 24],
  [1385, 24],
]

const minutes = Array.from({ length: endMin + 1 }, (_, minute) => minute)

export const input: CorridorInput = {
  animalName: 'Bramble',
  departureMs: DEPARTURE_MS,
  endMin,
  zones: [
    { zone: 'Europe/London', fromMin: 0 },
    { zone: 'Asia/Muscat', fromMin: 845 },
  ],
  legs,
  limits: legs.map(() => limits),
  typical: { minutes, bodyC: minutes.map((minute) => along(DECIDING, minute) - 0.18) },
  deciding: {
    minutes,
    bodyC: minutes.map((minute) => along(DECIDING, minute)),
    words: 'heat-prone, decides',
  },
  spread: null,
  crateAir: { minutes, tempC: minutes.map((minute) => along(CRATE, minute)) },
  outsideAir: { minutes, tempC: minutes.map((minute) => along(OUTSIDE, minute)) },
  extreme: 'hottest',
  callouts: [
    {
      verdict: 'no-go',
      minute: 889,
      tempC: 40.2,
      figure: '−16 min',
      title: 'Leg 7: passes critical high',
      text: 'from 03:09 GST',
    },
  ],
  dark: [{ fromMin: 675, toMin: 985 }],
  unit: 'c',
}

const metabolismW = minutes.map((minute) => 24 + 8 * bump(minute, 885, 60) + 3 * bump(minute, 390, 50))
const conductionW = minutes.map(() => -1)
const convectionW = minutes.map((minute) => -9 + 5 * bump(minute, 885, 70))
const radiationW = minutes.map((minute) => -8 + 4.5 * bump(minute, 885, 70))
const evaporationW = minutes.map((minute) => -6 - 5 * bump(minute, 930, 90))
export const heat: HeatTrack = {
  minutes,
  metabolismW,
  conductionW,
  convectionW,
  radiationW,
  evaporationW,
  storageW: minutes.map((_, index) =>
    [metabolismW, conductionW, convectionW, radiationW, evaporationW].reduce(
      (sum, row) => sum + (row[index] ?? 0),
      0,
    ),
  ),
}

function along(points: [number, number][], minute: number): number {
  const after = points.findIndex(([at]) => at >= minute)
  const [t1, v1] = points[after] ?? points.at(-1) ?? [0, 0]
  const [t0, v0] = points[Math.max(0, after - 1)] ?? [t1, v1]
  return t1 === t0 ? v1 : v0 + ((v1 - v0) * (minute - t0)) / (t1 - t0)
}

function bump(minute: number, centre: number, width: number): number {
  return Math.exp(-(((minute - centre) / width) ** 2))
}
