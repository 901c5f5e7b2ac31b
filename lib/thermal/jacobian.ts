import type { BoxRates, BoxSums } from './crate'
import { type Block, type Layout, type Slot } from './layout'
import type { LegModel } from './leg-model'
import {
  addAnimal,
  clearLoads,
  clearSums,
  loadOuter,
  rateAnimal,
  rateBlock,
  rateOwn,
  rateSpaces,
  rightHandSide,
  writeAnimal,
} from './right-hand-side'

/*
 * The Jacobian by forward differences, block by block. An animal's column moves that animal alone and its crate's own rows; a
 * crate's column its own animals; a space's column every crate. Since rows and integrals come from the same evaluation, each column
 * keeps the linear invariants (heat in = heat stored) to round-off, and so does the solver.
 */
export interface Jacobian {
  blocks: BlockJacobian[]
  /** Border × border, row-major. */
  corner: Float64Array
}

export interface BlockJacobian {
  /** Size × size; integrals × size; border × size; size × border; integrals × border. Row-major. */
  own: Float64Array
  sums: Float64Array
  toBorder: Float64Array
  fromBorder: Float64Array
  sumsFromBorder: Float64Array
}

export interface JacobianWork {
  y: Float64Array
  f0: Float64Array
  q0: Float64Array
  f1: Float64Array
  q1: Float64Array
  out0: Float64Array
  /** A crate's sums without the animal that is moved, and with it moved. */
  rest: BoxSums
  sums: BoxSums
}

export function jacobianOf(layout: Layout): Jacobian {
  return {
    blocks: layout.blocks.map((block) => ({
      own: new Float64Array(block.size * block.size),
      sums: new Float64Array(block.sumsSize * block.size),
      toBorder: new Float64Array(layout.border * block.size),
      fromBorder: new Float64Array(block.size * layout.border),
      sumsFromBorder: new Float64Array(block.sumsSize * layout.border),
    })),
    corner: new Float64Array(layout.border * layout.border),
  }
}

export function jacobianWork(layout: Layout): JacobianWork {
  const vector = () => new Float64Array(layout.size)
  const integrals = () => new Float64Array(layout.sums)
  return {
    y: vector(),
    f0: vector(),
    q0: integrals(),
    f1: vector(),
    q1: integrals(),
    out0: new Float64Array(4 * layout.blocks.length),
    rest: noSums(),
    sums: noSums(),
  }
}

/** Steps of the differences, by what the state is: K, kg/m³, ppm, kg. */
const STEP_K = 1e-4
const STEP_WATER = 1e-7
const STEP_PPM = 1e-1
const STEP_KG = 1e-6
const STEP_MIN = 1e-3
const BOX_STEPS = [STEP_K, STEP_K, STEP_K, STEP_WATER, STEP_PPM, STEP_KG] as const
const ANIMAL_STEPS = [STEP_K, STEP_K, STEP_KG, STEP_MIN, STEP_KG] as const
/** CO2 and bedding water first: they are taken with the animals as the unmoved state left them. */
const BOX_ORDER = [4, 5, 0, 1, 2, 3] as const
const SPACE_STEPS = [STEP_K, STEP_K, STEP_WATER, STEP_PPM] as const

export function setJacobian(
  model: LegModel,
  s: number,
  y: Float64Array,
  jacobian: Jacobian,
  work: JacobianWork,
): void {
  const { layout } = model
  work.y.set(y)
  rightHandSide(model, s, work.y, work.f0, work.q0)
  layout.blocks.forEach((block, index) => holdOutflow(work.out0, 4 * index, block.box.rates))
  if (layout.border > 0) setSlowBorder(model, jacobian, work)
  for (let i = 0; i < layout.blocks.length; i++) {
    const block = layout.blocks[i] as Block
    const into = jacobian.blocks[i] as BlockJacobian
    for (const slot of block.animals) setAnimalColumns(model, block, i, slot, into, work)
    setBoxColumns(model, block, i, into, work)
  }
  if (layout.border > 0) setFastBorder(model, jacobian, work)
}

function setAnimalColumns(
  model: LegModel,
  block: Block,
  index: number,
  slot: Slot,
  into: BlockJacobian,
  work: JacobianWork,
): void {
  // Air around is still prepared for the unmoved state; the animal's own share of the crate's sums is taken out first.
  rateAnimal(block, slot, work.y)
  const quiet = slot.body.endotherm && slot.body.drive.pant === 0
  const base = block.box.sums
  const rest = work.rest
  const sums = work.sums
  copySums(rest, base)
  addAnimal(rest, slot, -1)
  for (let v = 0; v < slot.size; v++) {
    const column = slot.at - block.at + v
    if (quiet && (v === 2 || v === 3)) {
      clearColumn(block, into, model.layout, column)
      if (v === 3) into.own[column * block.size + column] = -1 / 7200
      continue
    }
    const step = ANIMAL_STEPS[v] as number
    const kept = work.y[slot.at + v] as number
    work.y[slot.at + v] = kept + step
    rateAnimal(block, slot, work.y)
    copySums(sums, rest)
    addAnimal(sums, slot, 1)
    copyRows(block, work)
    writeAnimal(slot, work.f1, work.q1)
    rateOwn(model.outer, block, sums, work.y, work.f1, work.q1)
    work.y[slot.at + v] = kept
    storeColumn(model, block, index, into, work, column, step)
  }
}

function setBoxColumns(
  model: LegModel,
  block: Block,
  index: number,
  into: BlockJacobian,
  work: JacobianWork,
): void {
  // CO2 and bedding water move nothing but the crate's own rows.
  for (const v of BOX_ORDER) {
    const step = BOX_STEPS[v] as number
    const kept = work.y[block.at + v] as number
    work.y[block.at + v] = kept + step
    if (v >= 4) {
      copyRows(block, work)
      rateOwn(model.outer, block, block.box.sums, work.y, work.f1, work.q1)
    } else {
      rateBlock(model, block, work.y, work.f1, work.q1)
    }
    work.y[block.at + v] = kept
    storeColumn(model, block, index, into, work, v, step)
  }
  clearSums(block.box.sums)
}

function noSums(): BoxSums {
  return { toAirW: 0, toWallW: 0, toSurroundW: 0, toFloorW: 0, vapourKgS: 0, co2M3S: 0 }
}

function copySums(into: BoxSums, from: BoxSums): void {
  into.toAirW = from.toAirW
  into.toWallW = from.toWallW
  into.toSurroundW = from.toSurroundW
  into.toFloorW = from.toFloorW
  into.vapourKgS = from.vapourKgS
  into.co2M3S = from.co2M3S
}

/** Water and CO2 of the innermost space, and all of a space around it: animals do not feel them within a step's difference. */
function setSlowBorder(model: LegModel, jacobian: Jacobian, work: JacobianWork): void {
  const { layout } = model
  const letOut = model.leg.outOfCrate
  for (let j = 2; j < layout.border; j++) {
    if (letOut && j < 4) continue
    const step = SPACE_STEPS[j % 4] as number
    const at = layout.borderAt + j
    const kept = work.y[at] as number
    work.y[at] = kept + step
    if (j < 4) {
      loadOuter(model, work.y)
      clearLoads(model)
      for (const block of layout.blocks) {
        copyRows(block, work)
        rateOwn(model.outer, block, block.box.sums, work.y, work.f1, work.q1)
        gatherLoad(model, block)
      }
    }
    rateSpaces(model, work.y, work.f1)
    work.y[at] = kept
    storeBorderColumn(layout, jacobian, work, j, step, j < 4)
    restore(model, work)
  }
}

function setFastBorder(model: LegModel, jacobian: Jacobian, work: JacobianWork): void {
  const { layout } = model
  const last = model.leg.outOfCrate ? 4 : 2
  for (let j = 0; j < last; j++) {
    const step = SPACE_STEPS[j] as number
    const at = layout.borderAt + j
    const kept = work.y[at] as number
    work.y[at] = kept + step
    loadOuter(model, work.y)
    clearLoads(model)
    for (const block of layout.blocks) {
      rateBlock(model, block, work.y, work.f1, work.q1)
      gatherLoad(model, block)
    }
    rateSpaces(model, work.y, work.f1)
    work.y[at] = kept
    storeBorderColumn(layout, jacobian, work, j, step, true)
  }
}

/** Puts back the loads of the unmoved state after a column of the border. */
function restore(model: LegModel, work: JacobianWork): void {
  loadOuter(model, work.y)
  clearLoads(model)
  const load = model.layout.spaces[0]?.space.load
  if (!load) return
  for (let i = 0; i < model.layout.blocks.length; i++) {
    load.airW += work.out0[4 * i] as number
    load.massW += work.out0[4 * i + 1] as number
    load.waterKgS += work.out0[4 * i + 2] as number
    load.co2M3S += work.out0[4 * i + 3] as number
  }
}

function gatherLoad(model: LegModel, block: Block): void {
  const load = model.layout.spaces[0]?.space.load
  if (!load) return
  const { rates } = block.box
  load.airW += rates.outAirW
  load.massW += rates.outMassW
  load.waterKgS += rates.outWaterKgS
  load.co2M3S += rates.outCo2M3S
}

function holdOutflow(out: Float64Array, at: number, rates: BoxRates): void {
  out[at] = rates.outAirW
  out[at + 1] = rates.outMassW
  out[at + 2] = rates.outWaterKgS
  out[at + 3] = rates.outCo2M3S
}

function copyRows(block: Block, work: JacobianWork): void {
  for (let i = block.at; i < block.at + block.size; i++) work.f1[i] = work.f0[i] as number
  for (let i = block.sumsAt; i < block.sumsAt + block.sumsSize; i++) work.q1[i] = work.q0[i] as number
}

function clearColumn(block: Block, into: BlockJacobian, layout: Layout, column: number): void {
  for (let i = 0; i < block.size; i++) into.own[i * block.size + column] = 0
  for (let i = 0; i < block.sumsSize; i++) into.sums[i * block.size + column] = 0
  for (let i = 0; i < layout.border; i++) into.toBorder[i * block.size + column] = 0
}

function storeColumn(
  model: LegModel,
  block: Block,
  index: number,
  into: BlockJacobian,
  work: JacobianWork,
  column: number,
  step: number,
): void {
  const { size, at, sumsAt, sumsSize } = block
  const per = 1 / step
  for (let i = 0; i < size; i++) {
    into.own[i * size + column] = ((work.f1[at + i] as number) - (work.f0[at + i] as number)) * per
  }
  for (let i = 0; i < sumsSize; i++) {
    into.sums[i * size + column] = ((work.q1[sumsAt + i] as number) - (work.q0[sumsAt + i] as number)) * per
  }
  const inner = model.layout.spaces[0]?.space
  if (!inner) return
  const { rates } = block.box
  const out = 4 * index
  into.toBorder[column] = ((rates.outAirW - (work.out0[out] as number)) * per) / inner.airHeatJK
  into.toBorder[size + column] = ((rates.outMassW - (work.out0[out + 1] as number)) * per) / inner.massHeatJK
  into.toBorder[2 * size + column] =
    ((rates.outWaterKgS - (work.out0[out + 2] as number)) * per) / inner.volumeM3
  into.toBorder[3 * size + column] =
    ((rates.outCo2M3S - (work.out0[out + 3] as number)) * per * 1e6) / inner.volumeM3
}

function storeBorderColumn(
  layout: Layout,
  jacobian: Jacobian,
  work: JacobianWork,
  j: number,
  step: number,
  reachesCrates: boolean,
): void {
  const per = 1 / step
  const { border, borderAt } = layout
  for (let i = 0; i < border; i++) {
    jacobian.corner[i * border + j] =
      ((work.f1[borderAt + i] as number) - (work.f0[borderAt + i] as number)) * per
  }
  for (let b = 0; b < layout.blocks.length; b++) {
    const { at, size, sumsAt, sumsSize } = layout.blocks[b] as Block
    const into = jacobian.blocks[b] as BlockJacobian
    for (let i = 0; i < size; i++) {
      const change = reachesCrates ? ((work.f1[at + i] as number) - (work.f0[at + i] as number)) * per : 0
      into.fromBorder[i * border + j] = change
    }
    for (let i = 0; i < sumsSize; i++) {
      const change = reachesCrates
        ? ((work.q1[sumsAt + i] as number) - (work.q0[sumsAt + i] as number)) * per
        : 0
      into.sumsFromBorder[i * border + j] = change
    }
  }
}
