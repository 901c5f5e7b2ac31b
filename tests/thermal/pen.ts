import { catalogueValues } from '@/lib/species'
import { simulate } from '@/lib/thermal'
import type { Animal, ProfileValues, Run, Scenario, SimulateOptions } from '@/lib/thermal'

/** Steady air, and how fast it moves. */
export interface Air {
  airTempC: number
  relHumidityPct: number
  airSpeedMs?: number
}

export type Subject = Partial<Animal> & Pick<Animal, 'profile' | 'massKg'>

/** One animal in a large open pen in steady air: the nearest thing to a climate chamber. */
export function pen(animal: Subject, air: Air, minutes: number): Scenario {
  return {
    schema: 'steadfold/scenario@1',
    departureMs: 0,
    outputStepS: 60,
    limits: [],
    legs: [
      {
        id: 'pen',
        kind: 'rest',
        durationMin: minutes,
        pressureKPa: 101.325,
        delay: { typicalMin: 0, worstMin: 0 },
        outOfCrate: false,
        attended: true,
        events: [],
        surroundings: {
          type: 'controlled',
          airTempC: air.airTempC,
          relHumidityPct: air.relHumidityPct,
          airSpeedMs: air.airSpeedMs ?? 0.1,
          surfaceTempC: air.airTempC,
          outsideCo2Ppm: 420,
        },
      },
    ],
    crates: [
      {
        id: 'pen',
        mark: 'A',
        form: 'pen',
        lengthM: 3,
        widthM: 3,
        heightM: 1,
        openings: [],
        byLeg: [],
        medium: 'air',
        floor: { material: 'plywood', thicknessMm: 12, onto: 'deck' },
        occupants: [
          { id: 'animal', count: 1, activity: 'resting', activityDecayMin: 45, flags: [], ...animal },
        ],
      },
    ],
  }
}

export function run(scenario: Scenario, options: Partial<SimulateOptions> = {}): Run {
  return simulate(scenario, { variant: 'typical', profiles: catalogueValues, ...options })
}

/** Peak core over a stay, °C. */
export function peakCore(
  animal: Subject,
  air: Air,
  minutes: number,
  options: Partial<SimulateOptions> = {},
): number {
  return first(run(pen(animal, air, minutes), { tracks: false, ...options }).extremes).peakCoreC
}

/** Where an animal stands at the end of a stay, W per animal. */
export function standing(animal: Subject, air: Air, minutes: number, options: Partial<SimulateOptions> = {}) {
  const track = first(run(pen(animal, air, minutes), options).animals)
  const last = (values: number[]) => values[values.length - 1] ?? NaN
  const { heat } = track
  return {
    coreC: last(track.coreTempC),
    totalW: last(heat.metabolismW),
    sensibleW: -(last(heat.conductionW) + last(heat.convectionW) + last(heat.radiationW)),
    latentW: -last(heat.evaporationW),
    coldPct: last(track.effort.coldPct),
    heatPct: last(track.effort.heatPct),
  }
}

/** The largest x between low and high at which `holds` still holds, assuming it holds below and fails above. */
export function lastHolding(low: number, high: number, holds: (x: number) => boolean, steps = 12): number {
  let a = low
  let b = high
  for (let i = 0; i < steps; i++) {
    const middle = 0.5 * (a + b)
    if (holds(middle)) a = middle
    else b = middle
  }
  return a
}

/** A shipped row with some figures changed. */
export function rowLike(
  key: string,
  change: (row: ProfileValues) => ProfileValues,
): Record<string, ProfileValues> {
  const row = catalogueValues[key]
  if (!row) throw new Error(`No row "${key}".`)
  return { ...catalogueValues, [key]: change(structuredClone(row)) }
}

export function first<T>(items: readonly T[]): T {
  const [item] = items
  if (item === undefined) throw new Error('Nothing there.')
  return item
}
