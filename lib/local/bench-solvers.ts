import type { Scenario, Variant } from '@/lib/thermal'
import { type Course, gapOf, odex, type OdexSettings, ours, travel } from './bench-journey'

/** One setting of a solver: how far it is from the reference, and how long it takes. */
export interface Point {
  /** Tolerances as a multiple of those ours works with: "× 1", or "× 1 to × 0.1" where a point lies between two. */
  tolerances: string
  /** What its steps were held to; empty: nothing. */
  bound: string
  bodyC: number
  airC: number
  milliseconds: number
  evaluations: number
}

export interface Comparison {
  ours: Point
  /** The quickest odex that is as near to the reference; between two tolerances by a straight line in logarithms. */
  theirs: Point
}

/** Far tighter than either is compared at: as long a step again changes the body by less than 1e-7 °C. */
const REFERENCE: OdexSettings = { looseness: 1e-6, longestStepS: 5 }
const OUR_LOOSENESS = [10, 1, 0.1]
const THEIR_LOOSENESS = [10, 1, 0.1, 0.01]
/**
 * 0: as long as it likes. Crate air follows its surroundings in seconds, so its steps end up near 40 s by themselves; a bound
 * there spares it the steps it would take back.
 */
const LONGEST_STEPS_S = [0, 40, 20]

export interface Findings {
  comparisons: Comparison[]
  /** Settings at which odex lost the journey, with what it said. */
  lost: string[]
}

/** How long each solver takes for the same journey at the same error of body temperature. `repeats`: the least time counts. */
export function compareSolvers(scenario: Scenario, variant: Variant, repeats = 2): Findings {
  const reference = travel(scenario, variant, odex(REFERENCE))
  const lost: string[] = []
  const series = LONGEST_STEPS_S.map((longestStepS) =>
    THEIR_LOOSENESS.flatMap((looseness) => {
      // A setting that needs more than the reference is none, and a loose one may never end.
      const atMost = reference.evaluations
      const settings = {
        tolerances: `× ${looseness}`,
        bound: longestStepS === 0 ? '' : `, steps to ${longestStepS} s`,
      }
      try {
        return [
          measured(settings, reference, repeats, () =>
            travel(scenario, variant, odex({ looseness, longestStepS, atMost })),
          ),
        ]
      } catch (error) {
        lost.push(
          `tolerances ${settings.tolerances}${settings.bound}: ${error instanceof Error ? error.message : String(error)}`,
        )
        return []
      }
    }),
  )
  const comparisons = OUR_LOOSENESS.flatMap((looseness) => {
    const own = measured({ tolerances: `× ${looseness}`, bound: '' }, reference, 5 * repeats, () =>
      travel(scenario, variant, ours(looseness)),
    )
    const theirs = quickestAt(own.bodyC, series)
    return theirs === undefined ? [] : [{ ours: own, theirs }]
  })
  return { comparisons, lost }
}

/** Writes the comparison down, two lines for each tolerance of ours. */
export function printFindings({ comparisons, lost }: Findings, print: (line: string) => void): void {
  for (const { ours: own, theirs } of comparisons) {
    print(`ours ${words(own)}`)
    print(`odex ${words(theirs)}: ${(theirs.milliseconds / own.milliseconds).toFixed(1)} times as long`)
  }
  for (const line of lost) print(`odex lost the journey, ${line}`)
}

function words({ tolerances, bound, milliseconds, bodyC, airC }: Point): string {
  const time = `${milliseconds.toFixed(1)} ms`.padStart(9)
  return `${time}, body within ${bodyC.toExponential(1)} °C, air ${airC.toExponential(1)} °C (tolerances ${tolerances}${bound})`
}

function measured(
  settings: Pick<Point, 'tolerances' | 'bound'>,
  reference: Course,
  repeats: number,
  run: () => Course,
): Point {
  let course = run()
  let { milliseconds } = course
  for (let i = 1; i < repeats; i++) {
    course = run()
    milliseconds = Math.min(milliseconds, course.milliseconds)
  }
  return { ...settings, milliseconds, evaluations: course.evaluations, ...gapOf(course, reference) }
}

function quickestAt(bodyC: number, series: readonly Point[][]): Point | undefined {
  const able = series.flatMap((points) => [
    ...points.filter((point) => point.bodyC <= bodyC),
    ...between(bodyC, points),
  ])
  return able.reduce<Point | undefined>(
    (best, point) => (best === undefined || point.milliseconds < best.milliseconds ? point : best),
    undefined,
  )
}

/** Where a series of tightening tolerances passes the error asked for. */
function between(bodyC: number, points: readonly Point[]): Point[] {
  return points.flatMap((loose, index) => {
    const tight = points[index + 1]
    if (tight === undefined || !(loose.bodyC > bodyC && bodyC > tight.bodyC)) return []
    const share = Math.log(loose.bodyC / bodyC) / Math.log(loose.bodyC / tight.bodyC)
    const at = (figure: 'milliseconds' | 'airC' | 'evaluations') =>
      loose[figure] * Math.pow(tight[figure] / loose[figure], share)
    return [
      {
        tolerances: `${loose.tolerances} to ${tight.tolerances}`,
        bound: loose.bound,
        bodyC,
        airC: at('airC'),
        milliseconds: at('milliseconds'),
        evaluations: Math.round(at('evaluations')),
      },
    ]
  })
}
