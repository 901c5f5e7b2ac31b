import { ANIMAL_SUMS, BOX_SUMS, type Layout } from './layout'
import type { Store } from './store'

/** Store into the state vector of a leg. */
export function load(layout: Layout, store: Store, y: Float64Array, sums: Float64Array): void {
  for (const block of layout.blocks) {
    const crate = known(store.crates.get(block.box.id))
    y.set([crate.airC, crate.wallC, crate.bedC, crate.waterKgM3, crate.co2Ppm, crate.bedWaterKg], block.at)
    sums.set(crate.sums, block.sumsAt)
    for (const { body, at, size, sumsAt } of block.animals) {
      const animal = known(store.animals.get(body.id))
      y.set([animal.coreC, animal.shellC, animal.lostKg, animal.pantingMin], at)
      if (size > 4) y[at + 4] = animal.coatKgM2
      sums.set(animal.sums, sumsAt)
    }
  }
  for (const { space, at } of layout.spaces) {
    const state = known(store.spaces.get(space.id))
    y.set([state.airC, state.massC, state.waterKgM3, state.co2Ppm], at)
  }
}

/** State vector back into the store. */
export function save(layout: Layout, y: Float64Array, sums: Float64Array, store: Store): void {
  const at = (index: number) => y[index] as number
  for (const block of layout.blocks) {
    store.crates.set(block.box.id, {
      airC: at(block.at),
      wallC: at(block.at + 1),
      bedC: at(block.at + 2),
      waterKgM3: at(block.at + 3),
      co2Ppm: at(block.at + 4),
      bedWaterKg: at(block.at + 5),
      sums: [...sums.slice(block.sumsAt, block.sumsAt + BOX_SUMS)],
    })
    for (const slot of block.animals) {
      store.animals.set(slot.body.id, {
        coreC: at(slot.at),
        shellC: at(slot.at + 1),
        lostKg: at(slot.at + 2),
        pantingMin: at(slot.at + 3),
        coatKgM2: slot.size > 4 ? at(slot.at + 4) : 0,
        sums: [...sums.slice(slot.sumsAt, slot.sumsAt + ANIMAL_SUMS)],
      })
    }
  }
  for (const { space, at: i } of layout.spaces) {
    store.spaces.set(space.id, { airC: at(i), massC: at(i + 1), waterKgM3: at(i + 2), co2Ppm: at(i + 3) })
  }
}

function known<T>(state: T | undefined): T {
  if (state === undefined)
    throw new Error('A state is missing from the store: a leg was not built before it was loaded.')
  return state
}
