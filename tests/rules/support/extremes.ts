import type { BaseRuns, NamedRun } from '@/lib/rules/base-runs'
import type { LegExtremes, Run, Variant } from '@/lib/thermal'

/** One leg of an animal at ease; a test changes the one figure it is about. */
export function extremes(parts: Partial<LegExtremes> = {}): LegExtremes {
  return {
    animalId: 'bess',
    crateId: 'a',
    legId: 'road',
    fromMin: 0,
    toMin: 120,
    peakCoreC: 38.9,
    peakCoreMin: 60,
    lowestCoreC: 38.5,
    lowestCoreMin: 10,
    crossedMin: {},
    minutesPast: { criticalLow: 0, alarmLow: 0, alarmHigh: 0, criticalHigh: 0 },
    coldEffort: { maxPct: 0, maxMin: 0, longestOver40Min: 0, longestOver60Min: 0 },
    heatEffort: { maxPct: 0, maxMin: 0, longestOver40Min: 0, longestOver60Min: 0 },
    waterLossPctMass: 0.5,
    crateAirMinC: 19,
    crateAirMaxC: 21,
    crateAirMeanC: 20,
    crateHumidityMaxPct: 60,
    crateHumidityMeanPct: 55,
    co2MaxPpm: 900,
    co2OverMin: { over5000: 0, over15000: 0, over30000: 0 },
    outsideAirMinC: 19,
    outsideAirMaxC: 20,
    outsideAirMeanC: 19.5,
    outsideHumidityMeanPct: 50,
    ...parts,
  }
}

interface Given {
  scheduleId?: string
  typical?: Partial<LegExtremes>
  heat?: Partial<LegExtremes>
  cold?: Partial<LegExtremes>
  warmer?: Partial<LegExtremes>
  colder?: Partial<LegExtremes>
}

/** Base runs of one leg, as an engine might have given them on each schedule named. */
export function baseRuns(...given: Given[]): BaseRuns {
  const named = (
    variant: Variant,
    { scheduleId = 'on-time' }: Given,
    parts: Partial<LegExtremes> = {},
  ): NamedRun => ({ scheduleId, variant, run: runOf(variant, scheduleId, extremes(parts)) })
  return {
    schedules: given.map(({ scheduleId = 'on-time' }) => ({ id: scheduleId, legStartMin: [0, 120] })),
    planned: given.flatMap((one) => [
      named('typical', one, one.typical),
      named('heat-prone', one, one.heat),
      named('cold-prone', one, one.cold),
    ]),
    warmer: given.map((one) => named('heat-prone', one, one.warmer)),
    colder: given.map((one) => named('cold-prone', one, one.colder)),
  }
}

function runOf(variant: Variant, scheduleId: string, one: LegExtremes): Run {
  return {
    variant,
    schedule: { id: scheduleId, legStartMin: [0, 120] },
    crates: [],
    animals: [],
    compartments: [],
    extremes: [one],
    snapshots: [],
    waypoints: [],
    finalState: { variant, crates: [], animals: [], compartments: [] },
    closure: { maxResidualW: 0, energyErrorPct: 0, accumulatorError: 0, waterError: 0 },
    steps: { accepted: 0, rejected: 0, rightHandSides: 0, jacobians: 0 },
  }
}
