import { SteadfoldError } from '../errors'
import { buildLeg } from './build-leg'
import { closureOf, holdStart } from './closure'
import { stateIn } from './dense'
import { load, save } from './exchange'
import {
  finish,
  freshMemory,
  freshSample,
  look,
  setAnimalSample,
  setCrateSample,
  watchOf,
  type Watch,
} from './extremes'
import { journeyOf, type Journey } from './journey'
import { legModelOf, type LegModel } from './leg-model'
import { integrate, type Step } from './rosenbrock'
import type { Numerics, Run, SimulateOptions } from './run'
import type { CoreLimits, InitialState, Leg, Scenario } from './scenario'
import { shiftAir, startsOf, withDelays } from './schedule'
import { initialStateOf, storeOf, type Store } from './store'
import { freshTracks, writeTracks } from './tracks'
import { carriedFrom, waypointOf, type Carried, type Waypoint } from './waypoint'

/** Chosen so that core stays within 0.005 °C and crate air within 0.02 °C of a solution a thousand times tighter. */
export const NUMERICS: Numerics = {
  relTol: 1e-4,
  absTolK: 2e-3,
  absTolKgM3: 1e-5,
  absTolPpm: 5,
  maxStepS: 3600,
  maxSteps: 200_000,
}

/** Samples for extremes stand at most this far apart. */
const SAMPLE_S = 60

/**
 * One run: every animal in one variant, on one schedule. Pure: the same scenario gives the same bytes everywhere.
 * Throws `not_converged` (details: legId, minute), `refused` (a profile not in force) or `invalid` (an unknown leg or schedule).
 */
export function simulate(scenario: Scenario, options: SimulateOptions): Run {
  const scheduleId = options.scheduleId ?? 'on-time'
  const planned = shiftAir(withDelays(scenario, scheduleId), options.airShiftC ?? 0)
  const journey = journeyOf(planned, options)
  const arrivalMin = journey.startsMin[journey.legs.length] as number
  const startMin = options.start?.minute ?? 0
  const untilMin = Math.min(arrivalMin, options.untilMin ?? arrivalMin)
  if (!(untilMin > startMin))
    throw new SteadfoldError('invalid', `Nothing to simulate between minutes ${startMin} and ${untilMin}.`)
  const run: Running = {
    journey,
    options,
    numerics: { ...NUMERICS, ...options.numerics },
    scheduleId,
    spacingS: planned.outputStepS,
    ...(options.from
      ? carriedFrom(options.from, options.tracks !== false, scheduleId)
      : departing(planned, options, startMin)),
    nextSnapshotMin: startMin,
    untilS: untilMin * 60,
    over: false,
    waypoints: [],
  }
  for (let index = options.from?.nextLeg ?? 0; index < journey.legs.length && !run.over; index++) {
    const fromS = Math.max(run.reachedS, (journey.startsMin[index] as number) * 60)
    const endS = (journey.startsMin[index + 1] as number) * 60
    const toS = Math.min(run.untilS, endS)
    if (toS - fromS > 1e-6) runLeg(run, index, fromS, toS)
    if (options.waypoints && !run.over && run.untilS >= endS)
      run.waypoints.push(waypointOf(run, index + 1, options.tracks !== false, scheduleId))
    if (journey.legs[index]?.id === options.throughLegId) break
  }
  return resultOf(run)
}

function departing(planned: Scenario, options: SimulateOptions, startMin: number): Carried {
  return {
    store: storeOf(options.start?.state ?? initialFor(planned, options)),
    memories: new Map(),
    tracks: freshTracks(firstOutputS(startMin, planned.outputStepS)),
    extremes: [],
    snapshots: [],
    held: { animals: new Map(), crates: new Map(), residualW: 0 },
    counts: { accepted: 0, rejected: 0, rightHandSides: 0, jacobians: 0 },
    reachedS: startMin * 60,
  }
}

interface Running extends Carried {
  journey: Journey
  options: SimulateOptions
  numerics: Numerics
  scheduleId: string
  spacingS: number
  nextSnapshotMin: number
  untilS: number
  over: boolean
  waypoints: Waypoint[]
}

function runLeg(run: Running, index: number, fromS: number, toS: number): void {
  const { journey, store, options } = run
  const leg = journey.legs[index] as Leg
  const model = legModelOf(buildLeg(journey, store, index, fromS, toS, options.failure))
  const { layout } = model
  const y = new Float64Array(layout.size)
  const sums = new Float64Array(layout.sums)
  load(layout, store, y, sums)
  holdStart(run.held, layout, y, sums)
  run.snapshots.push({ minute: fromS / 60, state: initialStateOf(store, journey.variant, fromS / 60) })
  if (options.snapshotEveryMin) run.nextSnapshotMin = fromS / 60 + options.snapshotEveryMin
  const flows0 = new Float64Array(layout.blocks.length)
  let watches: Watch[] | undefined

  run.reachedS = integrate(model, y, sums, run.numerics, run.counts, (step) => {
    if (!watches) {
      watches = startWatches(run, model, step)
      layout.blocks.forEach(({ box }, i) => (flows0[i] = box.flowM3S))
    }
    lookThrough(model, watches, step)
    if (options.tracks !== false) {
      const force = step.toS >= run.untilS - 1e-6
      writeTracks(run.tracks, model, step, {
        variant: journey.variant,
        scheduleId: run.scheduleId,
        spacingS: run.spacingS,
        flows0,
        force,
      })
    }
    if (options.snapshotEveryMin) takeSnapshots(run, model, step, options.snapshotEveryMin)
    layout.blocks.forEach(({ box }, i) => (flows0[i] = box.flowM3S))
    run.over = options.stopOncePast !== undefined && allPast(watches, options.stopOncePast)
    return !run.over
  })
  save(layout, y, sums, store)
  if (leg.outOfCrate && run.reachedS >= toS) restore(model, store)
  for (const watch of watches ?? []) run.extremes.push(finish(watch))
}

function startWatches(run: Running, model: LegModel, step: Step): Watch[] {
  const sample = freshSample()
  const limits = run.options.limits
  const watches = model.layout.blocks.flatMap((block) => {
    setCrateSample(sample, model, block, step, 0)
    return block.animals.map((slot) => {
      const { id } = slot.body
      const memory = run.memories.get(id) ?? freshMemory()
      run.memories.set(id, memory)
      setAnimalSample(sample, slot, step, 0)
      const own: CoreLimits | undefined = limits?.[id] ?? slot.body.limits
      return watchOf(block, slot, model.leg.id, memory, own, sample)
    })
  })
  return watches.sort((a, b) => (a.extremes.animalId < b.extremes.animalId ? -1 : 1))
}

function lookThrough(model: LegModel, watches: readonly Watch[], step: Step): void {
  const count = Math.max(1, Math.ceil((step.toS - step.fromS) / SAMPLE_S))
  const sample = freshSample()
  for (let i = 1; i <= count; i++) {
    const x = i / count
    for (const block of model.layout.blocks) {
      setCrateSample(sample, model, block, step, x)
      for (const watch of watches) {
        if (watch.block !== block) continue
        setAnimalSample(sample, watch.slot, step, x)
        look(watch, sample)
      }
    }
  }
  // The moment of the step's end, for whatever reads the model next.
  model.setTime(step.toS)
}

function takeSnapshots(run: Running, model: LegModel, step: Step, everyMin: number): void {
  const endMin = step.toS / 60
  while (run.nextSnapshotMin <= endMin + 1e-9) {
    const x = (run.nextSnapshotMin * 60 - step.fromS) / (step.toS - step.fromS)
    const { layout } = model
    const y = new Float64Array(layout.size)
    for (let i = 0; i < layout.size; i++) y[i] = stateIn(step, i, x)
    const copy: Store = {
      crates: new Map(run.store.crates),
      animals: new Map(run.store.animals),
      spaces: new Map(run.store.spaces),
    }
    save(layout, y, step.sums1, copy)
    const { variant } = run.journey
    run.snapshots.push({
      minute: run.nextSnapshotMin,
      state: initialStateOf(copy, variant, run.nextSnapshotMin),
    })
    run.nextSnapshotMin += everyMin
  }
}

function allPast(watches: readonly Watch[], level: 'alarm' | 'critical'): boolean {
  return watches.length > 0 && watches.every((watch) => watch.memory.past[level])
}

/** A rest out of the crate gives back water and breath. */
export function restore(model: LegModel, store: Store): void {
  for (const block of model.layout.blocks) {
    for (const { body } of block.animals) {
      const animal = store.animals.get(body.id)
      if (animal) store.animals.set(body.id, { ...animal, lostKg: 0, pantingMin: 0 })
    }
  }
}

function initialFor(scenario: Scenario, options: SimulateOptions): InitialState | undefined {
  return scenario.initial?.find((state) => state.variant === options.variant)
}

function firstOutputS(startMin: number, spacingS: number): number {
  return Math.ceil((startMin * 60) / spacingS - 1e-9) * spacingS
}

function resultOf(run: Running): Run {
  const { journey, store, tracks } = run
  const minute = run.reachedS / 60
  const finalState = initialStateOf(store, journey.variant, minute)
  run.snapshots.push({ minute, state: finalState })
  const animals = sortById([...tracks.animals.values()])
  return {
    variant: journey.variant,
    schedule: { id: run.scheduleId, legStartMin: startsOf(journey.legs) },
    crates: sortById([...tracks.crates.values()]),
    animals,
    compartments: tracks.spaces,
    extremes: run.extremes,
    snapshots: run.snapshots,
    waypoints: run.waypoints,
    finalState,
    closure: closureOf(run.held, store, journey, animals),
    steps: run.counts,
  }
}

function sortById<T extends { id: string }>(tracks: T[]): T[] {
  return tracks.sort((a, b) => (a.id < b.id ? -1 : a.id > b.id ? 1 : 0))
}
