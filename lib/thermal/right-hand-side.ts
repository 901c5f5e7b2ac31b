import { evaluateAnimal } from './animal'
import { rateCompartment } from './compartment'
import { prepareBox, rateBox, type BoxSums, type Outer } from './crate'
import { SPACE_STATES, type Block, type Layout, type Slot } from './layout'
import type { LegModel } from './leg-model'

/*
 * The differential equations of one leg. Split so that the Jacobian can move one animal, or one crate, without evaluating the others.
 */

/** Rates of all states and integrals at `s` seconds from departure. */
export function rightHandSide(
  model: LegModel,
  s: number,
  y: Float64Array,
  dy: Float64Array,
  dq: Float64Array,
): void {
  model.setTime(s)
  loadOuter(model, y)
  clearLoads(model)
  for (const block of model.layout.blocks) {
    rateBlock(model, block, y, dy, dq)
    addLoad(model, block)
  }
  rateSpaces(model, y, dy)
}

/** The air around the crates: the innermost enclosed space, or the weather. */
export function loadOuter(model: LegModel, y: Float64Array): void {
  const inner = model.layout.spaces[0]
  if (!inner) return
  const { outer } = model
  outer.airTempC = y[inner.at] as number
  outer.surfaceTempC = y[inner.at + 1] as number
  outer.deckTempC = outer.surfaceTempC
  outer.waterKgM3 = y[inner.at + 2] as number
  outer.co2Ppm = y[inner.at + 3] as number
  outer.speedMs = inner.space.crateAirSpeedMs
}

/** A whole crate: its air, every animal in it, its own rates. */
export function rateBlock(
  model: LegModel,
  block: Block,
  y: Float64Array,
  dy: Float64Array,
  dq: Float64Array,
): void {
  prepareBlock(model.outer, block, y)
  const { sums } = block.box
  clearSums(sums)
  for (const slot of block.animals) {
    rateAnimal(block, slot, y)
    addAnimal(sums, slot, 1)
    writeAnimal(slot, dy, dq)
  }
  rateOwn(model.outer, block, sums, y, dy, dq)
}

export function prepareBlock(outer: Outer, block: Block, y: Float64Array): void {
  prepareBox(block.box, outer, y, block.at)
}

export function rateAnimal(block: Block, slot: Slot, y: Float64Array): void {
  evaluateAnimal(slot.body, block.box.air, y, slot.at)
}

export function addAnimal(sums: BoxSums, slot: Slot, sign: number): void {
  const { flux } = slot.body
  const times = sign * slot.body.count
  sums.toAirW += times * flux.toAirW
  sums.toWallW += times * flux.toWallW
  sums.toSurroundW += times * flux.toSurroundW
  sums.toFloorW += times * flux.toFloorW
  sums.vapourKgS += times * flux.vapourKgS
  sums.co2M3S += times * flux.co2M3S
}

export function writeAnimal(slot: Slot, dy: Float64Array, dq: Float64Array): void {
  const { flux } = slot.body
  const { at, sumsAt } = slot
  dy[at] = flux.coreRate
  dy[at + 1] = flux.shellRate
  dy[at + 2] = flux.lossRate
  dy[at + 3] = flux.pantRate
  if (slot.size > 4) dy[at + 4] = flux.coatRate
  dq[sumsAt] = flux.metabolismW
  dq[sumsAt + 1] = flux.conductionW
  dq[sumsAt + 2] = flux.convectionW
  dq[sumsAt + 3] = flux.radiationW
  dq[sumsAt + 4] = flux.evaporationW
}

/** The crate's own rows, given what its animals give. */
export function rateOwn(
  outer: Outer,
  block: Block,
  sums: BoxSums,
  y: Float64Array,
  dy: Float64Array,
  dq: Float64Array,
): void {
  const { at, sumsAt, box } = block
  rateBox(box, outer, sums, y, at)
  const { rates } = box
  dy[at] = rates.air
  dy[at + 1] = rates.wall
  dy[at + 2] = rates.bed
  dy[at + 3] = rates.water
  dy[at + 4] = rates.co2
  dy[at + 5] = rates.bedWater
  dq[sumsAt] = rates.waterGiven
  dq[sumsAt + 1] = rates.waterVented
  dq[sumsAt + 2] = rates.waterCondensed
}

/** Rates of the enclosed spaces, inside out: each gives the next what it loses. */
export function rateSpaces(model: LegModel, y: Float64Array, dy: Float64Array): void {
  const { spaces } = model.layout
  for (let i = 0; i < spaces.length; i++) {
    const { space, at } = spaces[i] as Layout['spaces'][number]
    const around = outsideOf(model, i, y)
    rateCompartment(
      space,
      around,
      y[at] as number,
      y[at + 1] as number,
      y[at + 2] as number,
      y[at + 3] as number,
    )
    dy[at] = space.rates.air
    dy[at + 1] = space.rates.mass
    dy[at + 2] = space.rates.water
    dy[at + 3] = space.rates.co2
    const next = spaces[i + 1]?.space.load
    if (next) {
      next.airW = space.rates.outAirW
      next.massW = space.rates.outMassW
      next.waterKgS = space.rates.outWaterKgS
      next.co2M3S = space.rates.outCo2M3S
    }
  }
}

function outsideOf(model: LegModel, index: number, y: Float64Array): Outer {
  const next = model.layout.spaces[index + 1]
  if (!next) return model.boundary
  const { between } = model
  const at = model.layout.borderAt + SPACE_STATES * (index + 1)
  between.airTempC = y[at] as number
  between.surfaceTempC = y[at + 1] as number
  between.deckTempC = between.surfaceTempC
  between.waterKgM3 = y[at + 2] as number
  between.co2Ppm = y[at + 3] as number
  between.speedMs = next.space.crateAirSpeedMs
  return between
}

export function clearLoads(model: LegModel): void {
  const load = model.layout.spaces[0]?.space.load
  if (!load) return
  load.airW = 0
  load.massW = 0
  load.waterKgS = 0
  load.co2M3S = 0
}

function addLoad(model: LegModel, block: Block): void {
  const load = model.layout.spaces[0]?.space.load
  if (!load) return
  const { rates } = block.box
  load.airW += rates.outAirW
  load.massW += rates.outMassW
  load.waterKgS += rates.outWaterKgS
  load.co2M3S += rates.outCo2M3S
}

export function clearSums(sums: BoxSums): void {
  sums.toAirW = 0
  sums.toWallW = 0
  sums.toSurroundW = 0
  sums.toFloorW = 0
  sums.vapourKgS = 0
  sums.co2M3S = 0
}
