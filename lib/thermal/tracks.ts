import { rateIn, slopeIn, stateIn } from './dense'
import { heatEffortPct, humidityPct } from './extremes'
import type { Block, Slot } from './layout'
import type { LegModel } from './leg-model'
import type { AnimalTrack, CompartmentTrack, CrateTrack } from './result'
import type { Step } from './rosenbrock'
import type { Variant } from './scenario'
import { smoothstep } from './smooth'

/** Collects the tracks of one run at the spacing asked for. */
export interface Tracks {
  crates: Map<string, CrateTrack>
  animals: Map<string, AnimalTrack>
  spaces: CompartmentTrack[]
  /** Next moment to write, s. */
  nextS: number
}

export function freshTracks(nextS: number): Tracks {
  return { crates: new Map(), animals: new Map(), spaces: [], nextS }
}

/** Writes every output moment that falls into this step; the last moment of a run is written by `force`. */
export function writeTracks(
  tracks: Tracks,
  model: LegModel,
  step: Step,
  key: { variant: Variant; scheduleId: string; spacingS: number; flows0: Float64Array; force: boolean },
): void {
  const span = step.toS - step.fromS
  if (step.fromS === model.fromS) meetAtBoundary(tracks, model, step)
  while (tracks.nextS <= step.toS + 1e-6) {
    const x = Math.min(1, Math.max(0, (tracks.nextS - step.fromS) / span))
    writeMoment(tracks, model, step, key, tracks.nextS / 60, x)
    tracks.nextS += key.spacingS
  }
  const written = tracks.nextS - key.spacingS
  if (key.force && written < step.toS - 1e-6) writeMoment(tracks, model, step, key, step.toS / 60, 1)
}

/**
 * Heat terms may jump where one leg meets the next (the animals are let out, the pressure falls). The moment in common then carries the
 * mean of both sides, so that a quadrature over the track still adds up.
 */
function meetAtBoundary(tracks: Tracks, model: LegModel, step: Step): void {
  for (const block of model.layout.blocks) {
    for (const slot of block.animals) {
      const track = tracks.animals.get(slot.body.id)
      const last = track ? track.minutes.length - 1 : -1
      if (!track || last < 0 || Math.abs((track.minutes[last] as number) * 60 - step.fromS) > 1e-6) continue
      HEAT_TERMS.forEach((term, n) => {
        const terms = track.heat[term]
        const after = n < 5 ? rateIn(step, slot.sumsAt + n, 0) : storageIn(slot, step, 0)
        terms[last] = 0.5 * ((terms[last] as number) + after)
      })
    }
  }
}

const HEAT_TERMS = [
  'metabolismW',
  'conductionW',
  'convectionW',
  'radiationW',
  'evaporationW',
  'storageW',
] as const

function storageIn({ body, at }: Slot, step: Step, x: number): number {
  return body.coreHeatJK * slopeIn(step, at, x) + body.shellHeatJK * slopeIn(step, at + 1, x)
}

function writeMoment(
  tracks: Tracks,
  model: LegModel,
  step: Step,
  key: { variant: Variant; scheduleId: string; flows0: Float64Array },
  minute: number,
  x: number,
): void {
  model.layout.blocks.forEach((block, index) => {
    writeCrate(crateTrack(tracks, block, key), block, step, minute, x, key.flows0[index] as number)
    for (const slot of block.animals)
      writeAnimalTrack(animalTrack(tracks, block, slot, key), slot, step, minute, x)
  })
  const inner = model.layout.spaces[0]
  if (!inner) return
  let track = tracks.spaces[tracks.spaces.length - 1]
  if (!track || track.legId !== model.leg.id) {
    track = {
      legId: model.leg.id,
      compartmentId: inner.space.id,
      variant: key.variant,
      scheduleId: key.scheduleId,
      minutes: [],
      airTempC: [],
      relHumidityPct: [],
      co2Ppm: [],
    }
    tracks.spaces.push(track)
  }
  const airC = stateIn(step, inner.at, x)
  track.minutes.push(minute)
  track.airTempC.push(airC)
  track.relHumidityPct.push(humidityPct(stateIn(step, inner.at + 2, x), airC))
  track.co2Ppm.push(stateIn(step, inner.at + 3, x))
}

function writeCrate(
  track: CrateTrack,
  block: Block,
  step: Step,
  minute: number,
  x: number,
  flow0: number,
): void {
  const airC = stateIn(step, block.at, x)
  const flow = flow0 + x * (block.box.flowM3S - flow0)
  track.minutes.push(minute)
  track.airTempC.push(airC)
  track.relHumidityPct.push(humidityPct(stateIn(step, block.at + 3, x), airC))
  track.co2Ppm.push(stateIn(step, block.at + 4, x))
  track.airChangesPerHour.push((3600 * flow) / block.box.airVolumeM3)
  track.wallTempC.push(stateIn(step, block.at + 1, x))
}

function writeAnimalTrack(track: AnimalTrack, slot: Slot, step: Step, minute: number, x: number): void {
  const { body, at, sumsAt } = slot
  const coreC = stateIn(step, at, x)
  const errorK = coreC - body.setPointC
  track.minutes.push(minute)
  track.coreTempC.push(coreC)
  track.skinTempC.push(stateIn(step, at + 1, x))
  HEAT_TERMS.forEach((term, n) => {
    track.heat[term].push(n < 5 ? rateIn(step, sumsAt + n, x) : storageIn(slot, step, x))
  })
  track.waterLossPctMass.push((100 * stateIn(step, at + 2, x)) / body.massKg)
  const { bands } = body
  track.effort.coldPct.push(body.endotherm ? 100 * (1 - smoothstep(bands.cold[0], bands.cold[1], errorK)) : 0)
  track.effort.heatPct.push(body.endotherm ? heatEffortPct(bands, errorK) : 0)
  if (body.endotherm && track.runawayFromMin === undefined && errorK > body.heldErrorK)
    track.runawayFromMin = minute
}

function crateTrack(tracks: Tracks, block: Block, key: { variant: Variant; scheduleId: string }): CrateTrack {
  const { id } = block.box
  let track = tracks.crates.get(id)
  if (!track) {
    track = {
      id,
      variant: key.variant,
      scheduleId: key.scheduleId,
      minutes: [],
      airTempC: [],
      relHumidityPct: [],
      co2Ppm: [],
      airChangesPerHour: [],
      wallTempC: [],
    }
    tracks.crates.set(id, track)
  }
  return track
}

function animalTrack(
  tracks: Tracks,
  block: Block,
  slot: Slot,
  key: { variant: Variant; scheduleId: string },
): AnimalTrack {
  const { id } = slot.body
  let track = tracks.animals.get(id)
  if (!track) {
    track = {
      id,
      crateId: block.box.id,
      variant: key.variant,
      scheduleId: key.scheduleId,
      minutes: [],
      coreTempC: [],
      skinTempC: [],
      heat: {
        metabolismW: [],
        conductionW: [],
        convectionW: [],
        radiationW: [],
        evaporationW: [],
        storageW: [],
      },
      waterLossPctMass: [],
      effort: { coldPct: [], heatPct: [] },
    }
    tracks.animals.set(id, track)
  }
  return track
}
