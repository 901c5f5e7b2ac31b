import { stateIn } from './dense'
import type { Block, Slot } from './layout'
import type { LegModel } from './leg-model'
import type { Step } from './rosenbrock'
import type { EffortExtremes, LegExtremes } from './run'
import { saturatedVapour, vapourOf } from './saturation'
import type { CoreLimits } from './scenario'
import { smoothstep } from './smooth'

/*
 * Watches every animal at most a minute apart, from the step's cubic: nothing is evaluated again. Runs in a row go on across legs.
 */

/** What the watch remembers of one animal between legs. */
export interface Memory {
  past: { alarm: boolean; critical: boolean }
  runsMin: {
    cold40: number
    cold60: number
    heat40: number
    heat60: number
    co2a: number
    co2b: number
    co2c: number
  }
}

export interface Watch {
  slot: Slot
  block: Block
  memory: Memory
  limits: CoreLimits | undefined
  extremes: LegExtremes
  /** Sums for the means, weighted by minutes. */
  means: {
    minutes: number
    crateAir: number
    crateHumidity: number
    outsideAir: number
    outsideHumidity: number
  }
  lastMin: number
  lastCoreC: number
}

export function freshMemory(): Memory {
  return {
    past: { alarm: false, critical: false },
    runsMin: { cold40: 0, cold60: 0, heat40: 0, heat60: 0, co2a: 0, co2b: 0, co2c: 0 },
  }
}

export function watchOf(
  block: Block,
  slot: Slot,
  legId: string,
  memory: Memory,
  limits: CoreLimits | undefined,
  start: Sample,
): Watch {
  const effort = (): EffortExtremes => ({
    maxPct: 0,
    maxMin: start.minute,
    longestOver40Min: 0,
    longestOver60Min: 0,
  })
  const watch: Watch = {
    slot,
    block,
    memory,
    limits,
    extremes: {
      animalId: slot.body.id,
      crateId: block.box.id,
      legId,
      fromMin: start.minute,
      toMin: start.minute,
      peakCoreC: start.coreC,
      peakCoreMin: start.minute,
      lowestCoreC: start.coreC,
      lowestCoreMin: start.minute,
      crossedMin: {},
      minutesPast: { criticalLow: 0, alarmLow: 0, alarmHigh: 0, criticalHigh: 0 },
      coldEffort: effort(),
      heatEffort: effort(),
      waterLossPctMass: 0,
      crateAirMinC: start.crateAirC,
      crateAirMaxC: start.crateAirC,
      crateAirMeanC: start.crateAirC,
      crateHumidityMaxPct: 0,
      crateHumidityMeanPct: 0,
      co2MaxPpm: start.co2Ppm,
      co2OverMin: { over5000: 0, over15000: 0, over30000: 0 },
      outsideAirMinC: start.outsideAirC,
      outsideAirMaxC: start.outsideAirC,
      outsideAirMeanC: start.outsideAirC,
      outsideHumidityMeanPct: 0,
    },
    means: { minutes: 0, crateAir: 0, crateHumidity: 0, outsideAir: 0, outsideHumidity: 0 },
    lastMin: start.minute,
    lastCoreC: start.coreC,
  }
  enterPast(watch, start)
  see(watch, start)
  return watch
}

/** What is looked at, at one moment. */
export interface Sample {
  minute: number
  coreC: number
  lostKg: number
  crateAirC: number
  crateHumidityPct: number
  co2Ppm: number
  outsideAirC: number
  outsideHumidityPct: number
}

export function freshSample(): Sample {
  return {
    minute: 0,
    coreC: 0,
    lostKg: 0,
    crateAirC: 0,
    crateHumidityPct: 0,
    co2Ppm: 0,
    outsideAirC: 0,
    outsideHumidityPct: 0,
  }
}

/** The part of a sample that a crate's animals share. */
export function setCrateSample(sample: Sample, model: LegModel, block: Block, step: Step, x: number): void {
  sample.minute = (step.fromS + x * (step.toS - step.fromS)) / 60
  const inner = model.layout.spaces[0]
  if (inner) {
    sample.outsideAirC = stateIn(step, inner.at, x)
    sample.outsideHumidityPct = humidityPct(stateIn(step, inner.at + 2, x), sample.outsideAirC)
  } else {
    model.setTime(sample.minute * 60)
    sample.outsideAirC = model.boundary.airTempC
    sample.outsideHumidityPct = humidityPct(model.boundary.waterKgM3, sample.outsideAirC)
  }
  if (block.box.outOfCrate) {
    sample.crateAirC = sample.outsideAirC
    sample.crateHumidityPct = sample.outsideHumidityPct
    sample.co2Ppm = inner ? stateIn(step, inner.at + 3, x) : model.boundary.co2Ppm
  } else {
    sample.crateAirC = stateIn(step, block.at, x)
    sample.crateHumidityPct = humidityPct(stateIn(step, block.at + 3, x), sample.crateAirC)
    sample.co2Ppm = stateIn(step, block.at + 4, x)
  }
}

export function setAnimalSample(sample: Sample, slot: Slot, step: Step, x: number): void {
  sample.coreC = stateIn(step, slot.at, x)
  sample.lostKg = stateIn(step, slot.at + 2, x)
}

export function humidityPct(waterKgM3: number, tempC: number): number {
  const full = saturatedVapour(tempC)
  return (100 * vapourOf(waterKgM3, full)) / full
}

/** Takes one more sample into account. */
export function look(watch: Watch, sample: Sample): void {
  const minutes = sample.minute - watch.lastMin
  cross(watch, sample)
  see(watch, sample)
  const { means, extremes, memory } = watch
  means.minutes += minutes
  means.crateAir += minutes * sample.crateAirC
  means.crateHumidity += minutes * sample.crateHumidityPct
  means.outsideAir += minutes * sample.outsideAirC
  means.outsideHumidity += minutes * sample.outsideHumidityPct
  const { body } = watch.slot
  const errorK = sample.coreC - body.setPointC
  const cold = body.endotherm ? 100 * (1 - smoothstep(body.bands.cold[0], body.bands.cold[1], errorK)) : 0
  const heat = body.endotherm ? heatEffortPct(body.bands, errorK) : 0
  const runs = memory.runsMin
  runs.cold40 = cold >= 40 ? runs.cold40 + minutes : 0
  runs.cold60 = cold >= 60 ? runs.cold60 + minutes : 0
  runs.heat40 = heat >= 40 ? runs.heat40 + minutes : 0
  runs.heat60 = heat >= 60 ? runs.heat60 + minutes : 0
  runs.co2a = sample.co2Ppm > 5000 ? runs.co2a + minutes : 0
  runs.co2b = sample.co2Ppm > 15000 ? runs.co2b + minutes : 0
  runs.co2c = sample.co2Ppm > 30000 ? runs.co2c + minutes : 0
  keepEffort(extremes.coldEffort, cold, sample.minute, runs.cold40, runs.cold60)
  keepEffort(extremes.heatEffort, heat, sample.minute, runs.heat40, runs.heat60)
  const over = extremes.co2OverMin
  over.over5000 = Math.max(over.over5000, runs.co2a)
  over.over15000 = Math.max(over.over15000, runs.co2b)
  over.over30000 = Math.max(over.over30000, runs.co2c)
  if (body.endotherm && extremes.runawayFromMin === undefined && errorK > body.heldErrorK) {
    extremes.runawayFromMin = sample.minute
  }
  watch.lastMin = sample.minute
  watch.lastCoreC = sample.coreC
}

export function heatEffortPct(
  bands: { pant: readonly [number, number]; wet: readonly [number, number] },
  errorK: number,
): number {
  return (
    100 *
    Math.max(smoothstep(bands.pant[0], bands.pant[1], errorK), smoothstep(bands.wet[0], bands.wet[1], errorK))
  )
}

export function finish(watch: Watch): LegExtremes {
  const { means, extremes } = watch
  if (means.minutes > 0) {
    extremes.crateAirMeanC = means.crateAir / means.minutes
    extremes.crateHumidityMeanPct = means.crateHumidity / means.minutes
    extremes.outsideAirMeanC = means.outsideAir / means.minutes
    extremes.outsideHumidityMeanPct = means.outsideHumidity / means.minutes
  }
  extremes.toMin = watch.lastMin
  return extremes
}

function see({ extremes, slot }: Watch, sample: Sample): void {
  if (sample.coreC > extremes.peakCoreC) {
    extremes.peakCoreC = sample.coreC
    extremes.peakCoreMin = sample.minute
  }
  if (sample.coreC < extremes.lowestCoreC) {
    extremes.lowestCoreC = sample.coreC
    extremes.lowestCoreMin = sample.minute
  }
  extremes.waterLossPctMass = Math.max(extremes.waterLossPctMass, (100 * sample.lostKg) / slot.body.massKg)
  extremes.crateAirMinC = Math.min(extremes.crateAirMinC, sample.crateAirC)
  extremes.crateAirMaxC = Math.max(extremes.crateAirMaxC, sample.crateAirC)
  extremes.crateHumidityMaxPct = Math.max(extremes.crateHumidityMaxPct, sample.crateHumidityPct)
  extremes.co2MaxPpm = Math.max(extremes.co2MaxPpm, sample.co2Ppm)
  extremes.outsideAirMinC = Math.min(extremes.outsideAirMinC, sample.outsideAirC)
  extremes.outsideAirMaxC = Math.max(extremes.outsideAirMaxC, sample.outsideAirC)
}

const MARKS = [
  ['alarmHigh', 'alarmHighC', 1, 'alarm'],
  ['criticalHigh', 'criticalHighC', 1, 'critical'],
  ['alarmLow', 'alarmLowC', -1, 'alarm'],
  ['criticalLow', 'criticalLowC', -1, 'critical'],
] as const

function enterPast({ limits, extremes, memory }: Watch, start: Sample): void {
  if (!limits) return
  for (const [key, field, side, level] of MARKS) {
    if (side * (start.coreC - limits[field]) <= 0) continue
    extremes.crossedMin[key] = start.minute
    memory.past[level] = true
  }
}

/** Crossings between the last sample and this one, on a straight line: within a second or two of the true moment. */
function cross(watch: Watch, sample: Sample): void {
  const { limits, extremes, memory, lastCoreC, lastMin } = watch
  if (!limits) return
  const low = limits.alarmLowC
  const high = limits.alarmHighC
  const { coreC } = sample
  if (lastCoreC >= low && lastCoreC <= high && coreC >= low && coreC <= high) return
  const minutes = sample.minute - lastMin
  for (const [key, field, side, level] of MARKS) {
    const before = side * (lastCoreC - limits[field])
    const after = side * (sample.coreC - limits[field])
    if (before <= 0 && after <= 0) continue
    const share = before <= 0 ? -before / (after - before) : before / Math.max(before - after, 1e-12)
    if (after > 0) {
      extremes.crossedMin[key] ??= lastMin + share * minutes
      memory.past[level] = true
    }
    const past = before > 0 && after > 0 ? 1 : before <= 0 ? 1 - share : share
    extremes.minutesPast[key] += past * minutes
  }
}

function keepEffort(
  effort: EffortExtremes,
  pct: number,
  minute: number,
  over40: number,
  over60: number,
): void {
  if (pct > effort.maxPct) {
    effort.maxPct = pct
    effort.maxMin = minute
  }
  effort.longestOver40Min = Math.max(effort.longestOver40Min, over40)
  effort.longestOver60Min = Math.max(effort.longestOver60Min, over60)
  if (effort.breachMin === undefined && over60 >= 60) effort.breachMin = minute
}
