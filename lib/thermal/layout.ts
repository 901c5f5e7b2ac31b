import type { Body } from './body'
import type { Compartment } from './compartment'
import type { Box } from './crate'

/*
 * Where everything sits in the state vector of one leg. Crates are blocks (own six states, then their animals); enclosed spaces come last
 * and are all that couples the blocks, so the Jacobian is an arrow: dense blocks and a border.
 */
export const BOX_STATES = 6
export const ANIMAL_STATES = 4
export const SPACE_STATES = 4
/** Integrals kept beside the state: five heat terms an animal, three of water a crate. */
export const ANIMAL_SUMS = 5
export const BOX_SUMS = 3

export interface Block {
  box: Box
  at: number
  size: number
  sumsAt: number
  sumsSize: number
  animals: Slot[]
}

export interface Slot {
  body: Body
  at: number
  /** Four, or five with water on the coat. */
  size: number
  sumsAt: number
}

export interface Layout {
  blocks: Block[]
  spaces: { space: Compartment; at: number }[]
  /** States in all, where the border starts, and integrals in all. */
  size: number
  borderAt: number
  border: number
  sums: number
}

export function layoutOf(boxes: readonly Box[], spaces: readonly Compartment[]): Layout {
  let at = 0
  let sumsAt = 0
  const blocks = boxes.map((box): Block => {
    const start = at
    const sumsStart = sumsAt
    at += BOX_STATES
    sumsAt += BOX_SUMS
    const animals = box.bodies.map((body): Slot => {
      const slot = { body, at, size: ANIMAL_STATES + (body.coatMayBeWet ? 1 : 0), sumsAt }
      at += slot.size
      sumsAt += ANIMAL_SUMS
      return slot
    })
    return { box, at: start, size: at - start, sumsAt: sumsStart, sumsSize: sumsAt - sumsStart, animals }
  })
  const borderAt = at
  const placed = spaces.map((space, index) => ({ space, at: borderAt + SPACE_STATES * index }))
  const border = SPACE_STATES * spaces.length
  return { blocks, spaces: placed, size: borderAt + border, borderAt, border, sums: sumsAt }
}
