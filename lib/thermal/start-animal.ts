import { evaluateAnimal } from './animal'
import type { Body } from './body'
import { coatWaterKgM2 } from './coat'
import { prepareBox, type Box, type Outer } from './crate'
import type { Animal, Crate } from './scenario'
import { saturatedVapour } from './saturation'
import type { Store } from './store'

/** Animals come from housing, not from the ramp: air between these, 50 % relative humidity (judgement). */
const HOUSING_C = [15, 25] as const

/**
 * First state of an animal: core as given, or the set-point, or (reptiles) the crate's air; the shell where it is in balance
 * with that core in the air of housing, since a guess off by 2 K would move a small animal's core by a third of a degree within the hour.
 */
export function startAnimal(
  store: Store,
  crate: Crate,
  animal: Animal | undefined,
  body: Body,
  box: Box,
  around: Outer,
): void {
  if (store.animals.has(body.id)) return
  const inside = store.crates.get(crate.id)
  if (!inside) return
  const coreC = animal?.bodyTempC ?? (body.endotherm ? body.setPointC : inside.airC)
  const coatKgM2 = coatWaterKgM2(animal?.coat)
  const housingC = Math.min(HOUSING_C[1], Math.max(HOUSING_C[0], inside.airC))
  const housing = { ...around, airTempC: housingC, surfaceTempC: housingC, deckTempC: housingC }
  const crateState = [housingC, housingC, housingC, 0.5 * saturatedVapour(housingC), 420, 0]
  prepareBox(box, housing, Float64Array.from(crateState), 0)
  const y = Float64Array.from([coreC, coreC, 0, 0, coatKgM2])
  let low = Math.min(coreC, housingC) - 15
  let high = Math.max(coreC, housingC) + 15
  for (let i = 0; i < 40; i++) {
    const shellC = 0.5 * (low + high)
    y[1] = shellC
    evaluateAnimal(body, box.air, y, 0)
    if (body.flux.shellRate > 0) low = shellC
    else high = shellC
  }
  const shellC = 0.5 * (low + high)
  store.animals.set(body.id, { coreC, shellC, lostKg: 0, pantingMin: 0, coatKgM2, sums: [0, 0, 0, 0, 0] })
}
